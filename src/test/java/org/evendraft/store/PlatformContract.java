package org.evendraft.store;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.concurrent.ExecutionException;
import java.util.stream.IntStream;
import org.evendraft.platform.Platform;
import org.evendraft.platform.Purpose;
import org.evendraft.platform.Tank;
import org.junit.jupiter.api.Test;

/** What holds of platforms on every engine. */
interface PlatformContract extends StoreContract {
    int THREADS = 16;

    private PlatformRepository platforms() {
        return new PlatformRepository(Samples.AT_NOON);
    }

    private RevisionSaving save(String id, String document, OptionalInt expected) {
        return database().inTransaction(handle -> platforms().save(handle, Samples.platform(id), document, expected));
    }

    private Optional<StoredPlatform> latest(String id) {
        return database().read(handle -> platforms().findLatest(handle, id));
    }

    private Optional<StoredPlatform> revision(String id, int revision) {
        return database().read(handle -> platforms().find(handle, id, revision));
    }

    @Test
    default void everyRevisionStaysAsItWasPosted() {
        String id = Samples.newId();
        assertThat(save(id, "{ \"first\": 1 }", OptionalInt.empty())).isEqualTo(new RevisionSaving.Saved(1));
        assertThat(save(id, "{ \"second\": 2 }", OptionalInt.of(1))).isEqualTo(new RevisionSaving.Saved(2));

        StoredPlatform first = new StoredPlatform(id, 1, "Platform " + id, "{ \"first\": 1 }", Samples.NOON);
        StoredPlatform second = new StoredPlatform(id, 2, "Platform " + id, "{ \"second\": 2 }", Samples.NOON);
        assertThat(latest(id)).contains(second);
        assertThat(revision(id, 1)).contains(first);
        assertThat(revision(id, 2)).contains(second);
        assertThat(revision(id, 3)).isEmpty();
    }

    @Test
    default void aRevisionMadeFromAnOldOneIsRefusedAndNothingOfItIsStored() {
        String id = Samples.newId();
        assertThat(save(id, "{}", OptionalInt.of(3))).isEqualTo(new RevisionSaving.Stale(0));
        assertThat(latest(id)).isEmpty();
        assertThat(Samples.rows(database(), "SELECT id FROM platform WHERE id = :id", id))
                .isEmpty();

        save(id, "{}", OptionalInt.of(0));
        save(id, "{}", OptionalInt.empty());
        assertThat(save(id, "{}", OptionalInt.of(1))).isEqualTo(new RevisionSaving.Stale(2));
        assertThat(save(id, "{}", OptionalInt.of(0))).isEqualTo(new RevisionSaving.Stale(2));
        assertThat(Samples.rows(
                        database(), "SELECT revision FROM platform_revision WHERE platform_id = :id ORDER BY 1", id))
                .containsExactly("1", "2");
    }

    @Test
    default void tanksAndTheirTablesAreRows() {
        String id = Samples.newId();
        save(id, "{}", OptionalInt.empty());
        assertThat(Samples.rows(database(), "SELECT * FROM tank WHERE platform_id = :id ORDER BY ordinal", id))
                .containsExactly(
                        id + " 1 PB1 0 Tank PB1 BALLAST 1.025 0.97 0.98 0.01 0.99 true",
                        id + " 1 SB1 1 Tank SB1 FUEL 1.025 0.97 0.98 0.01 0.99 true");
        assertThat(Samples.rows(
                        database(), "SELECT * FROM tank_table_row WHERE platform_id = :id ORDER BY ordinal", id))
                .containsExactly(
                        id + " 1 PB1 0 0.0 0.0 1.0 2.0 3.0 0.0 0.0 0.0",
                        id + " 1 PB1 1 4.5 450.0 1.5 2.5 3.5 11.0 12.0 -13.0");
    }

    @Test
    default void aTankOfEveryPurposeCanBeStored() {
        String id = Samples.newId();
        List<Tank> tanks = Arrays.stream(Purpose.values())
                .map(purpose -> Samples.tank(purpose.name(), purpose, List.of()))
                .toList();
        Platform platform = Samples.platform(id, tanks);
        database().inTransaction(handle -> platforms().save(handle, platform, "{}", OptionalInt.empty()));
        assertThat(Samples.rows(database(), "SELECT purpose FROM tank WHERE platform_id = :id ORDER BY ordinal", id))
                .containsExactlyElementsOf(
                        Arrays.stream(Purpose.values()).map(Enum::name).toList());
    }

    @Test
    default void theListShowsTheCurrentRevisionOfEachPlatform() {
        String one = Samples.newId();
        String other = Samples.newId();
        save(one, "{}", OptionalInt.empty());
        save(one, "{}", OptionalInt.empty());
        database()
                .inTransaction(handle ->
                        platforms().save(handle, Samples.platform(other, List.of()), "{}", OptionalInt.empty()));
        List<PlatformSummary> list = database().read(handle -> platforms().list(handle));
        assertThat(list)
                .contains(
                        new PlatformSummary(one, "Platform " + one, 2, Samples.NOON, 2),
                        new PlatformSummary(other, "Platform " + other, 1, Samples.NOON, 0));
        assertThat(list).extracting(PlatformSummary::id).isSorted().doesNotHaveDuplicates();
    }

    @Test
    default void aDocumentOfTheGreatestSizeFits() {
        String id = Samples.newId();
        // 20 MB is the most that a request may carry; every fourth character takes two bytes in UTF-8.
        String document = "m³·t".repeat(20_000_000 / 6);
        save(id, document, OptionalInt.empty());
        String found = latest(id).orElseThrow().document();
        assertThat(found.equals(document)).isTrue();
    }

    @Test
    default void ofSimultaneousRevisionsWithTheSameExpectationOneWins()
            throws ExecutionException, InterruptedException {
        String id = Samples.newId();
        for (int expected = 0; expected < 3; expected++) {
            OptionalInt current = OptionalInt.of(expected);
            List<RevisionSaving> outcomes = Simultaneously.run(THREADS, i -> save(id, "{\"by\":" + i + "}", current));
            RevisionSaving saved = new RevisionSaving.Saved(expected + 1);
            assertThat(outcomes).containsOnlyOnce(saved);
            assertThat(outcomes)
                    .filteredOn(outcome -> !outcome.equals(saved))
                    .containsOnly(new RevisionSaving.Stale(expected + 1));
        }
    }

    @Test
    default void simultaneousRevisionsWithoutExpectationAreAllStored() throws ExecutionException, InterruptedException {
        String id = Samples.newId();
        List<RevisionSaving> outcomes = Simultaneously.run(THREADS, i -> save(id, "{}", OptionalInt.empty()));
        List<RevisionSaving> all = IntStream.rangeClosed(1, THREADS)
                .<RevisionSaving>mapToObj(RevisionSaving.Saved::new)
                .toList();
        assertThat(outcomes).containsExactlyInAnyOrderElementsOf(all);
    }

    @Test
    default void workThatThrowsLeavesNothingBehind() {
        String id = Samples.newId();
        assertThatThrownBy(() -> database().inTransaction(handle -> {
                    platforms().save(handle, Samples.platform(id), "{}", OptionalInt.empty());
                    throw new IllegalStateException("on purpose");
                }))
                .hasMessage("on purpose");
        assertThat(Samples.rows(database(), "SELECT id FROM platform WHERE id = :id", id))
                .isEmpty();
    }
}
