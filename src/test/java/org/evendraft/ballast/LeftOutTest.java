package org.evendraft.ballast;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatCode;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.evendraft.platform.Condition;
import org.evendraft.platform.FaultyDocumentException;
import org.evendraft.platform.PreparedPlatform;
import org.evendraft.platform.Pump;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Plans that leave tanks and pumps out: of a box barge with four tanks on each side, one pump and a spare one for each side. */
final class LeftOutTest {
    private static final int PAIRS = 4;
    /** Masses are carried in double precision through a few sums. */
    private static final double MASS = 1e-5;
    /** The proven gap allows this part between two answers to the same question. */
    private static final double GAP = 1e-3;

    /** 8000 t of lightship, eight tanks half full of 15 × 12 × 6 m and a load of 600 t, on 60 × 40 m. */
    private static final double DRAFT = (8000 + 4320 + 600) / 2400.0;

    private static BoxBarge barge() {
        return BoxBarge.withPairs(PAIRS)
                .pumpOnEachSide(PAIRS, 500)
                .pump("spare-P", 300, List.of("P1", "P2", "P3", "P4", Pump.SEA))
                .pump("spare-S", 300, List.of("S1", "S2", "S3", "S4", Pump.SEA))
                .load(600, 12, 9, 14);
    }

    private static String target(double draft, String leftOut) {
        return "{\"target\":{\"draft\":" + draft + ",\"tolerance\":{\"draft\":0.02,\"angle\":0.05}}" + leftOut + "}";
    }

    private static Plan plan(String leftOut) {
        return barge().plan(target(DRAFT, leftOut));
    }

    private static String named(String property, List<String> names) {
        return ",\"" + property + "\":[\"" + String.join("\",\"", names) + "\"]";
    }

    private static void conservesMass(Plan plan) {
        Map<String, Double> masses = new HashMap<>();
        plan.before().tanks().forEach(tank -> masses.put(tank.tank(), tank.mass()));
        for (Move move : plan.moves()) {
            masses.merge(move.from(), -move.mass(), Double::sum);
            masses.merge(move.to(), move.mass(), Double::sum);
        }
        plan.after().tanks().forEach(tank -> assertThat(masses.get(tank.tank())).isCloseTo(tank.mass(), within(MASS)));
    }

    @Test
    void lockingTanksThatThePlanWouldUseLeavesThemAloneAndIsNoCheaper() {
        Plan free = plan("");
        assertThat(free.feasible()).isTrue();
        assertThat(free.fills()).isNotEmpty();
        for (Plan.EndFill fill : free.fills()) {
            Plan locked = plan(named("lockedTanks", List.of(fill.tank())));
            assertThat(locked.fills()).extracting(Plan.EndFill::tank).doesNotContain(fill.tank());
            assertThat(locked.moves())
                    .allSatisfy(
                            move -> assertThat(List.of(move.from(), move.to())).doesNotContain(fill.tank()));
            assertThat(locked.feasible()).isTrue();
            assertThat(locked.cost()).isGreaterThanOrEqualTo(free.cost() * (1 - GAP));
            conservesMass(locked);
        }
    }

    @Test
    void aTankLockedForOnePlanGivesThePlanOfATankThatThePlatformLocks() {
        String tank = plan("").fills().get(0).tank();
        Plan byPlatform = barge().set(tank, "locked", true).plan(target(DRAFT, ""));
        assertThat(plan(named("lockedTanks", List.of(tank)))).isEqualTo(byPlatform);
    }

    @Test
    void lockingATankThatIsNotUsedChangesNothing() {
        Plan free = plan("");
        List<String> used = free.fills().stream().map(Plan.EndFill::tank).toList();
        String idle = List.of("P1", "P2", "P3", "P4", "S1", "S2", "S3", "S4").stream()
                .filter(tank -> !used.contains(tank))
                .findFirst()
                .orElseThrow();
        assertThat(plan(named("lockedTanks", List.of(idle))).cost()).isCloseTo(free.cost(), within(GAP * free.cost()));
    }

    @ParameterizedTest
    @ValueSource(strings = {"pump-P", "pump-S", "spare-P", "spare-S"})
    void aPumpThatIsOutMakesNoMoveAndThePlanIsNoFaster(String pump) {
        Plan all = plan("");
        Plan without = plan(named("pumpsOutOfService", List.of(pump)));
        assertThat(without.feasible()).isTrue();
        assertThat(without.moves()).isNotEmpty();
        assertThat(without.moves()).extracting(Move::pump).doesNotContain(pump);
        assertThat(without.cost()).isCloseTo(all.cost(), within(GAP * all.cost()));
        assertThat(without.durationMinutes()).isGreaterThanOrEqualTo(all.durationMinutes() - MASS);
        conservesMass(without);
    }

    /** The load stands to port; what stands upright again with the starboard pumps alone floats deeper, by more than the draft asked for. */
    @Test
    void withAllPumpsOfOneSideOutThePlanUsesTheOtherOrSaysThatItCannot() {
        String portOut = named("pumpsOutOfService", List.of("pump-P", "spare-P"));
        Plan cannot = plan(portOut);
        assertThat(cannot.feasible()).isFalse();
        assertThat(cannot.binding()).isNotEmpty();
        // 600 t at 9 m to port against about 340 t at 14 m to starboard, taken from the sea.
        Plan deeper = barge().plan("{\"target\":{\"draft\":" + (DRAFT + 0.15)
                + ",\"tolerance\":{\"draft\":0.05,\"angle\":0.2}}" + portOut + "}");
        assertThat(deeper.feasible()).isTrue();
        for (Plan plan : List.of(cannot, deeper)) {
            assertThat(plan.moves()).extracting(Move::pump).isSubsetOf("pump-S", "spare-S");
            assertThat(plan.fills()).extracting(Plan.EndFill::tank).allMatch(tank -> tank.startsWith("S"));
            conservesMass(plan);
        }
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                ",\"lockedTanks\":[\"P1\",\"P2\",\"P3\",\"P4\",\"S1\",\"S2\",\"S3\",\"S4\"]",
                ",\"pumpsOutOfService\":[\"pump-P\",\"pump-S\",\"spare-P\",\"spare-S\"]"
            })
    void withEverythingLeftOutNothingMovesAndWhatIsMissedIsTold(String leftOut) {
        Plan off = plan(leftOut);
        assertThat(off.feasible()).isFalse();
        assertThat(off.moves()).isEmpty();
        assertThat(off.binding()).extracting(Plan.Binding::limit).contains("target.heelAngle", "target.trimAngle");
        Plan on = BoxBarge.withPairs(PAIRS)
                .pumpOnEachSide(PAIRS, 500)
                .pump("spare-P", 300, List.of("P1", Pump.SEA))
                .pump("spare-S", 300, List.of("S1", Pump.SEA))
                .plan(target((8000 + 4320) / 2400.0, leftOut));
        assertThat(on.feasible()).isTrue();
        assertThat(on.moves()).isEmpty();
        // Eight tanks half full.
        assertThat(on.cost()).isEqualTo(8 * 20);
    }

    @Test
    void aTankThatHoldsNoSeaWaterIsNoFaultOnceItIsLocked() {
        PreparedPlatform prepared = barge().platform();
        Condition condition = barge().condition(prepared);
        Condition brackish = new Condition(
                "brackish", condition.mode(), 1.01, condition.freeSurface(), condition.fills(), condition.loads());
        List<String> port = List.of("P1", "P2", "P3", "P4");
        String half = target(DRAFT, named("lockedTanks", port));
        PlanRequest request = BoxBarge.request(half, prepared, brackish);
        assertThatThrownBy(() -> BallastPlanner.plan(prepared, brackish, request))
                .isInstanceOfSatisfying(
                        FaultyDocumentException.class,
                        e -> assertThat(e.faults())
                                .hasSize(PAIRS)
                                .allMatch(fault -> fault.detail().contains("tank S")));
        PlanRequest none = BoxBarge.request(
                target(DRAFT, named("lockedTanks", List.of("P1", "P2", "P3", "P4", "S1", "S2", "S3", "S4"))),
                prepared,
                brackish);
        assertThatCode(() -> BallastPlanner.plan(prepared, brackish, none)).doesNotThrowAnyException();
    }
}
