package org.evendraft.store;

import java.sql.ResultSet;
import java.sql.SQLException;
import java.sql.Types;
import java.time.Instant;
import java.time.OffsetDateTime;
import java.time.ZoneOffset;
import java.time.temporal.ChronoUnit;
import java.util.Optional;
import org.jdbi.v3.core.argument.AbstractArgumentFactory;
import org.jdbi.v3.core.argument.Argument;
import org.jdbi.v3.core.config.ConfigRegistry;

/** Binds moments as times with an offset of zero, whatever the zones of the process and of the database session. */
final class InstantBinding extends AbstractArgumentFactory<Instant> {
    InstantBinding() {
        super(Types.TIMESTAMP_WITH_TIMEZONE);
    }

    @Override
    protected Argument build(Instant value, ConfigRegistry config) {
        return (position, statement, context) ->
                statement.setObject(position, toMicros(value).atOffset(ZoneOffset.UTC));
    }

    /** The moment as both engines keep it: they would round what is finer, each in its own way. */
    static Instant toMicros(Instant moment) {
        return moment.truncatedTo(ChronoUnit.MICROS);
    }

    /** Reads a column that is never null. */
    static Instant read(ResultSet row, String column) throws SQLException {
        return readOptional(row, column).orElseThrow(() -> new IllegalStateException(column + " is null"));
    }

    /** Reads a column that may be null. */
    static Optional<Instant> readOptional(ResultSet row, String column) throws SQLException {
        return Optional.ofNullable(row.getObject(column, OffsetDateTime.class)).map(OffsetDateTime::toInstant);
    }
}
