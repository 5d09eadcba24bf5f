package org.evendraft.store;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Optional;
import java.util.TimeZone;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestInstance;

/** Every contract of the store, to be run on each engine; the process runs in a zone that no database session has. */
@TestInstance(TestInstance.Lifecycle.PER_CLASS)
abstract class RepositoryContract
        implements PlatformContract,
                SoundingContract,
                ConditionContract,
                PlanContract,
                LoadPlanContract,
                IdempotencyContract,
                JobContract {
    private final TimeZone usualZone = TimeZone.getDefault();
    private Optional<Database> database = Optional.empty();

    /** Opens the database of the engine under test. */
    abstract Database open();

    @BeforeAll
    void openDatabase() {
        TimeZone.setDefault(TimeZone.getTimeZone("Pacific/Chatham"));
        database = Optional.of(open());
    }

    @AfterAll
    void closeDatabase() {
        database.ifPresent(Database::close);
        TimeZone.setDefault(usualZone);
    }

    @Override
    public Database database() {
        return database.orElseThrow();
    }

    @Test
    void healthTellsTheLastMigration() {
        assertThat(database().health()).isEqualTo(new Health(true, Optional.of("7")));
    }
}
