package org.evendraft.store;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.time.Duration;
import java.time.Instant;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import org.jdbi.v3.core.JdbiException;
import org.junit.jupiter.api.Test;

/** What holds of soundings on every engine. */
interface SoundingContract extends StoreContract {
    private SoundingRepository soundings() {
        return new SoundingRepository(Samples.AT_NOON, Samples::newId);
    }

    private Sounding sounding(String tank, Instant takenAt, String source) {
        Sounding.Contents contents = new Sounding.Contents(Sounding.Given.LEVEL, 2.5, 250, 256.25, 0.55, 1.025);
        return new Sounding(tank, takenAt, source, contents);
    }

    private SoundingBatch save(String platform, Sounding... batch) {
        return database().inTransaction(handle -> soundings().save(handle, platform, 1, List.of(batch)));
    }

    private List<StoredSounding> latest(String platform, int revision) {
        return database().read(handle -> soundings().latest(handle, platform, revision));
    }

    private List<String> latestSources(String platform, int revision) {
        return latest(platform, revision).stream()
                .map(stored -> stored.sounding().source())
                .toList();
    }

    private Page<String> history(
            String platform, Optional<String> tank, Optional<Instant> from, Optional<Instant> to, PageRequest page) {
        SoundingQuery query = new SoundingQuery(platform, tank, from, to);
        return database()
                .read(handle -> soundings().history(handle, query, page))
                .map(stored -> stored.sounding().source());
    }

    @Test
    default void aReadingComesBackAsItWasGiven() {
        String platform = Samples.storedPlatform(database());
        for (Sounding.Given given : Sounding.Given.values()) {
            Sounding.Contents contents = new Sounding.Contents(given, 2.5, 250, 256.25, 0.55, 1.025);
            Sounding sounding = new Sounding("PB1", Samples.NOON, "gauge ½", contents);
            SoundingBatch batch = save(platform, sounding);
            assertThat(batch.recordedAt()).isEqualTo(Samples.NOON);
            assertThat(latest(platform, 1)).containsExactly(new StoredSounding(sounding, 1, batch.id(), Samples.NOON));
        }
    }

    @Test
    default void theLatestOfATankIsTheOneTakenLastAndOfEqualsTheOneRecordedLast() {
        String platform = Samples.storedPlatform(database());
        Instant later = Samples.NOON.plusSeconds(60);
        save(platform, sounding("SB1", later, "s, old"), sounding("PB1", later, "p, first"));
        save(platform, sounding("PB1", later, "p, second"), sounding("PB1", later, "p, third"));
        save(platform, sounding("PB1", Samples.NOON, "p, late report of an earlier reading"));
        save(platform, sounding("SB1", later.plusNanos(1000), "s, a microsecond later"));
        assertThat(latestSources(platform, 1)).containsExactly("p, third", "s, a microsecond later");
    }

    @Test
    default void aNewRevisionKeepsTheReadingsOfTanksItStillHas() {
        String platform = Samples.storedPlatform(database());
        save(platform, sounding("PB1", Samples.NOON, "p"), sounding("SB1", Samples.NOON, "s"));
        database()
                .inTransaction(handle -> new PlatformRepository(Samples.AT_NOON)
                        .save(
                                handle,
                                Samples.platform(
                                        platform,
                                        Samples.platform(platform).tanks().subList(1, 2)),
                                "{}",
                                OptionalInt.empty()));
        assertThat(latestSources(platform, 2)).containsExactly("s");
        assertThat(latestSources(platform, 1)).containsExactly("p", "s");
    }

    @Test
    default void platformsDoNotSeeEachOthersReadings() {
        String platform = Samples.storedPlatform(database());
        String other = Samples.storedPlatform(database());
        save(platform, sounding("PB1", Samples.NOON, "mine"));
        save(other, sounding("PB1", Samples.NOON.plusSeconds(1), "other's"));
        assertThat(latestSources(platform, 1)).containsExactly("mine");
    }

    @Test
    default void historyIsByTankAndIntervalAndPaged() {
        String platform = Samples.storedPlatform(database());
        for (int hour = 0; hour < 5; hour++) {
            Instant takenAt = Samples.NOON.plus(Duration.ofHours(hour));
            save(platform, sounding("PB1", takenAt, "p" + hour), sounding("SB1", takenAt, "s" + hour));
        }
        Optional<Instant> from = Optional.of(Samples.NOON.plus(Duration.ofHours(1)));
        Optional<Instant> to = Optional.of(Samples.NOON.plus(Duration.ofHours(4)));
        PageRequest all = new PageRequest(100, 0);
        assertThat(history(platform, Optional.of("PB1"), from, to, all))
                .isEqualTo(new Page<>(List.of("p3", "p2", "p1"), 3));
        assertThat(history(platform, Optional.empty(), from, Optional.empty(), new PageRequest(3, 2)))
                .isEqualTo(new Page<>(List.of("s3", "p3", "s2"), 8));
        assertThat(history(platform, Optional.empty(), Optional.empty(), from, all))
                .isEqualTo(new Page<>(List.of("s0", "p0"), 2));
        assertThat(history(platform, Optional.of("none"), from, to, all)).isEqualTo(new Page<>(List.of(), 0));
    }

    @Test
    default void ofABatchWithAnUnknownTankNothingIsStored() {
        String platform = Samples.storedPlatform(database());
        assertThatThrownBy(() -> save(
                        platform, sounding("PB1", Samples.NOON, "good"), sounding("none", Samples.NOON, "unknown")))
                .isInstanceOf(JdbiException.class);
        assertThat(history(platform, Optional.empty(), Optional.empty(), Optional.empty(), new PageRequest(10, 0))
                        .total())
                .isZero();
    }

    @Test
    default void momentsSurviveAnyZoneOfProcessAndSession() {
        String platform = Samples.storedPlatform(database());
        // These two moments have the same local time in the zone of the test's process, whose clocks go back between
        // them.
        List<Instant> moments = List.of(Instant.parse("2026-04-04T14:15:00Z"), Instant.parse("2026-04-04T13:15:00Z"));
        List<Instant> found = database().jdbi().withHandle(handle -> {
            handle.execute("SET TIME ZONE 'America/St_Johns'");
            List<Sounding> batch = moments.stream()
                    .map(moment -> sounding("PB1", moment, "gauge"))
                    .toList();
            handle.useTransaction(inside -> soundings().save(inside, platform, 1, batch));
            SoundingQuery query =
                    new SoundingQuery(platform, Optional.empty(), Optional.of(moments.get(1)), Optional.empty());
            Page<StoredSounding> page = soundings().history(handle, query, new PageRequest(10, 0));
            handle.execute("SET TIME ZONE LOCAL");
            return page.map(stored -> stored.sounding().takenAt()).items();
        });
        assertThat(found).isEqualTo(moments);
    }
}
