package org.evendraft.store;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.time.Instant;
import java.time.InstantSource;
import java.util.List;
import java.util.Optional;
import org.jdbi.v3.core.JdbiException;
import org.junit.jupiter.api.Test;

/** What holds of plans on every engine. */
interface PlanContract extends StoreContract {
    private StoredPlan save(Instant now, NewPlan plan) {
        return database()
                .inTransaction(
                        handle -> new PlanRepository(InstantSource.fixed(now), Samples::newId).save(handle, plan));
    }

    private PlanRepository plans() {
        return new PlanRepository(Samples.AT_NOON, Samples::newId);
    }

    private Optional<StoredPlan> find(String condition, String id) {
        return database().read(handle -> plans().find(handle, condition, id));
    }

    private List<PlanSummary> list(String condition) {
        return database().read(handle -> plans().list(handle, condition));
    }

    private String storedCondition() {
        NewCondition condition = Samples.condition(Samples.storedPlatform(database()), "A");
        return database()
                .inTransaction(handle -> new ConditionRepository(Samples.AT_NOON, Samples::newId)
                        .save(handle, condition, Samples.result(Samples.NOON)))
                .id();
    }

    private NewPlan plan(String condition) {
        List<StoredMove> moves = List.of(
                new StoredMove(1, "PB1", "sea", 120, 117.1, "P-port-1", 0, 11.7),
                new StoredMove(2, "sea", "SB1", 60, 58.5, "P-starboard-1", 11.7, 17.6));
        return new NewPlan(condition, "{\"target\":{}}", "{\"feasible\":true}", true, 220.5, 180, moves);
    }

    @Test
    default void aPlanComesBackWithItsMoves() {
        String condition = storedCondition();
        NewPlan plan = plan(condition);
        StoredPlan stored = save(Samples.NOON, plan);
        assertThat(stored)
                .isEqualTo(new StoredPlan(
                        stored.id(),
                        condition,
                        plan.requestJson(),
                        plan.planJson(),
                        true,
                        220.5,
                        180,
                        plan.moves(),
                        Samples.NOON));
        assertThat(find(condition, stored.id())).contains(stored);
        assertThat(find("another", stored.id())).isEmpty();
    }

    @Test
    default void aPlanThatMeetsNothingIsKeptToo() {
        String condition = storedCondition();
        StoredPlan stored = save(Samples.NOON, new NewPlan(condition, "{}", "{}", false, 0, 0, List.of()));
        assertThat(find(condition, stored.id())).contains(stored);
    }

    @Test
    default void plansOfAConditionAreListedNewestFirst() {
        String condition = storedCondition();
        String first = save(Samples.NOON, plan(condition)).id();
        String second = save(Samples.NOON.plusSeconds(1), plan(condition)).id();
        save(Samples.NOON, plan(storedCondition()));
        assertThat(list(condition))
                .containsExactly(
                        new PlanSummary(second, true, 220.5, 180, Samples.NOON.plusSeconds(1)),
                        new PlanSummary(first, true, 220.5, 180, Samples.NOON));
    }

    @Test
    default void aPlanOfAnUnknownConditionIsRefused() {
        assertThatThrownBy(() -> save(Samples.NOON, plan("none"))).isInstanceOf(JdbiException.class);
    }
}
