package org.evendraft.store;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.time.Instant;
import java.time.InstantSource;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.jdbi.v3.core.JdbiException;
import org.junit.jupiter.api.Test;

/** What holds of load plans on every engine. */
interface LoadPlanContract extends StoreContract {
    private LoadPlanRepository loadPlans() {
        return new LoadPlanRepository(Samples.AT_NOON, Samples::newId);
    }

    private StoredLoadPlan save(Instant now, NewLoadPlan plan) {
        return database()
                .inTransaction(
                        handle -> new LoadPlanRepository(InstantSource.fixed(now), Samples::newId).save(handle, plan));
    }

    private Optional<StoredLoadPlan> find(String platform, String id) {
        return database().read(handle -> loadPlans().find(handle, platform, id));
    }

    private static NewLoadPlan loadPlan(String platform, Optional<String> condition, Optional<Resumption> resumption) {
        List<StoredEvent> events = List.of(
                new StoredEvent(
                        1,
                        "aboard",
                        Optional.of("casing"),
                        OptionalDouble.of(12.5),
                        new StoredEvent.After(31_000, 18.5, 1.25, -0.5, 3.5, 4.5),
                        new StoredEvent.WorstFigures(1.5, -0.75, 2.5),
                        true,
                        120.5),
                new StoredEvent(
                        2,
                        "wind",
                        Optional.empty(),
                        OptionalDouble.empty(),
                        new StoredEvent.After(31_001, 18.6, 1.26, -0.6, 3.6, 4.6),
                        new StoredEvent.WorstFigures(1.6, -0.76, 2.6),
                        false,
                        0));
        return new NewLoadPlan(
                platform, 1, "lift", condition, resumption, "{\"events\":[]}", "{\"x\":1}", true, false, events);
    }

    private static NewLoadPlan loadPlan(String platform) {
        return loadPlan(platform, Optional.empty(), Optional.empty());
    }

    @Test
    default void aLoadPlanComesBackWithItsEvents() {
        String platform = Samples.storedPlatform(database());
        String condition = database()
                .inTransaction(handle -> new ConditionRepository(Samples.AT_NOON, Samples::newId)
                        .save(handle, Samples.condition(platform, "A"), Samples.result(Samples.NOON)))
                .id();
        StoredLoadPlan stored = save(Samples.NOON, loadPlan(platform, Optional.of(condition), Optional.empty()));
        assertThat(stored.createdAt()).isEqualTo(Samples.NOON);
        assertThat(find(platform, stored.id())).contains(stored);
        assertThat(find("another", stored.id())).isEmpty();
    }

    @Test
    default void aLoadPlanTellsWhichOneItGoesOnWith() {
        String platform = Samples.storedPlatform(database());
        String first = save(Samples.NOON, loadPlan(platform)).id();
        Optional<Resumption> from = Optional.of(new Resumption(first, 1));
        StoredLoadPlan next = save(Samples.NOON, loadPlan(platform, Optional.empty(), from));
        assertThat(find(platform, next.id()).orElseThrow().plan().resumption()).isEqualTo(from);
        assertThat(find(platform, first).orElseThrow().plan().resumption()).isEmpty();
    }

    @Test
    default void aPageOfLoadPlansIsNewestFirst() {
        String platform = Samples.storedPlatform(database());
        String first = save(Samples.NOON, loadPlan(platform)).id();
        String second = save(
                        Samples.NOON.plusSeconds(1),
                        loadPlan(platform, Optional.empty(), Optional.of(new Resumption(first, 0))))
                .id();
        save(Samples.NOON, loadPlan(Samples.storedPlatform(database())));
        Page<LoadPlanSummary> page =
                database().read(handle -> loadPlans().page(handle, platform, new PageRequest(1, 0)));
        assertThat(page.total()).isEqualTo(2);
        assertThat(page.items())
                .containsExactly(new LoadPlanSummary(
                        second, 1, "lift", Optional.of(first), true, false, Samples.NOON.plusSeconds(1)));
        assertThat(database()
                        .read(handle -> loadPlans().page(handle, platform, new PageRequest(1, 1)))
                        .items())
                .extracting(LoadPlanSummary::id)
                .containsExactly(first);
    }

    @Test
    default void aLoadPlanOfAnUnknownPlatformIsRefused() {
        assertThatThrownBy(() -> save(Samples.NOON, loadPlan("none"))).isInstanceOf(JdbiException.class);
    }
}
