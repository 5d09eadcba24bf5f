package org.evendraft.store;

import java.sql.ResultSet;
import java.sql.SQLException;
import java.time.Instant;
import java.time.InstantSource;
import java.util.List;
import java.util.function.Supplier;
import org.jdbi.v3.core.Handle;
import org.jdbi.v3.core.statement.PreparedBatch;
import org.jdbi.v3.core.statement.Query;

/** Keeps readings of tanks; none is ever changed. Safe from many threads. */
public final class SoundingRepository {
    private static final String SELECT = """
            SELECT s.tank_id, s.taken_at, s.source, s.given, s.level, s.volume, s.mass, s.fraction, s.density,
                s.platform_revision, s.batch_id, b.recorded_at
            FROM sounding s JOIN sounding_batch b ON b.id = s.batch_id
            """;

    private final InstantSource clock;
    private final Supplier<String> ids;

    /**
     * @param clock tells when a batch is stored
     * @param ids makes the id of a batch, a UUID
     */
    public SoundingRepository(InstantSource clock, Supplier<String> ids) {
        this.clock = clock;
        this.ids = ids;
    }

    /**
     * Stores a batch in the order given.
     *
     * @param platformId the platform's id
     * @param revision the revision whose tanks and calibration the readings refer to
     * @param soundings the readings
     */
    public SoundingBatch save(Handle handle, String platformId, int revision, List<Sounding> soundings) {
        SoundingBatch batch = new SoundingBatch(ids.get(), InstantBinding.toMicros(clock.instant()));
        handle.createUpdate("""
                        INSERT INTO sounding_batch (id, platform_id, platform_revision, recorded_at)
                        VALUES (:id, :platform, :revision, :now)""")
                .bind("id", batch.id())
                .bind("platform", platformId)
                .bind("revision", revision)
                .bind("now", batch.recordedAt())
                .execute();
        Batch.insert(
                handle,
                """
                INSERT INTO sounding (batch_id, platform_id, platform_revision, tank_id, taken_at, given,
                    level, volume, mass, fraction, density, source)
                VALUES (:batch, :platform, :revision, :tank, :takenAt, :given,
                    :level, :volume, :mass, :fraction, :density, :source)""",
                soundings,
                (row, sounding) -> bind(
                        row.bind("batch", batch.id())
                                .bind("platform", platformId)
                                .bind("revision", revision),
                        sounding));
        return batch;
    }

    private static void bind(PreparedBatch row, Sounding sounding) {
        Sounding.Contents contents = sounding.contents();
        row.bind("tank", sounding.tank())
                .bind("takenAt", sounding.takenAt())
                .bind("source", sounding.source())
                .bind("given", contents.given().name())
                .bind("level", contents.level())
                .bind("volume", contents.volume())
                .bind("mass", contents.mass())
                .bind("fraction", contents.fraction())
                .bind("density", contents.density());
    }

    /**
     * The latest reading of every tank of a revision that has one, in the order of the platform's tanks; of several taken at the
     * same moment the one recorded last. Readings made under other revisions count.
     */
    public List<StoredSounding> latest(Handle handle, String platformId, int revision) {
        return handle.createQuery("""
                        SELECT s.tank_id, s.taken_at, s.source, s.given, s.level, s.volume, s.mass, s.fraction, s.density,
                            s.platform_revision, s.batch_id, b.recorded_at
                        FROM tank t
                        JOIN sounding s ON s.recorded_order = (
                            SELECT l.recorded_order FROM sounding l
                            WHERE l.platform_id = t.platform_id AND l.tank_id = t.id
                            ORDER BY l.taken_at DESC, l.recorded_order DESC LIMIT 1)
                        JOIN sounding_batch b ON b.id = s.batch_id
                        WHERE t.platform_id = :platform AND t.revision = :revision
                        ORDER BY t.ordinal""")
                .bind("platform", platformId)
                .bind("revision", revision)
                .map((row, context) -> sounding(row))
                .list();
    }

    /** The readings that a query asks for, latest first; of several taken at the same moment the one recorded last first. */
    public Page<StoredSounding> history(Handle handle, SoundingQuery query, PageRequest page) {
        String where = where(query);
        long total = bind(handle.createQuery("SELECT COUNT(*) FROM sounding s " + where), query)
                .mapTo(Long.class)
                .one();
        List<StoredSounding> items = bind(
                        handle.createQuery(SELECT + where
                                + " ORDER BY s.taken_at DESC, s.recorded_order DESC LIMIT :limit OFFSET :offset"),
                        query)
                .bind("limit", page.limit())
                .bind("offset", page.offset())
                .map((row, context) -> sounding(row))
                .list();
        return new Page<>(items, total);
    }

    private static String where(SoundingQuery query) {
        return "WHERE s.platform_id = :platform"
                + (query.tank().isPresent() ? " AND s.tank_id = :tank" : "")
                + (query.from().isPresent() ? " AND s.taken_at >= :from" : "")
                + (query.to().isPresent() ? " AND s.taken_at < :to" : "");
    }

    private static Query bind(Query statement, SoundingQuery query) {
        statement.bind("platform", query.platformId());
        query.tank().ifPresent(tank -> statement.bind("tank", tank));
        query.from().ifPresent(from -> statement.bind("from", from));
        query.to().ifPresent(to -> statement.bind("to", to));
        return statement;
    }

    private static StoredSounding sounding(ResultSet row) throws SQLException {
        Sounding.Contents contents = new Sounding.Contents(
                Sounding.Given.valueOf(row.getString("given")),
                row.getDouble("level"),
                row.getDouble("volume"),
                row.getDouble("mass"),
                row.getDouble("fraction"),
                row.getDouble("density"));
        Instant takenAt = InstantBinding.read(row, "taken_at");
        return new StoredSounding(
                new Sounding(row.getString("tank_id"), takenAt, row.getString("source"), contents),
                row.getInt("platform_revision"),
                row.getString("batch_id"),
                InstantBinding.read(row, "recorded_at"));
    }
}
