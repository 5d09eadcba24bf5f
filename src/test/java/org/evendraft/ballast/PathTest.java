package org.evendraft.ballast;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.nio.charset.StandardCharsets;
import org.evendraft.platform.Condition;
import org.evendraft.platform.ConditionReader;
import org.evendraft.platform.Json;
import org.evendraft.platform.PlatformReader;
import org.evendraft.platform.PreparedPlatform;
import org.junit.jupiter.api.Test;

/** A box barge of 80 × 24 m in fresh water, 4000 t at z = 6 m, with one pressed-up tank of 20 × 22 × 4 m to be pumped out: by hand. */
class PathTest {
    private static final PreparedPlatform BARGE = PlatformReader.read(Json.parse(bytes("""
            { "id": "barge", "waterDensity": 1.0,
              "hull": { "bodies": [ { "name": "hull", "shape": "box", "min": [-40, -12, 0], "max": [40, 12, 8] } ] },
              "lightship": { "mass": 4000, "x": 0, "y": 0, "z": 6 },
              "tanks": [ { "id": "A", "purpose": "ballast", "leastPumpableFraction": 0.01,
                "bodies": [ { "name": "A", "shape": "box", "min": [-10, -11, 0], "max": [10, 11, 4] } ] } ],
              "pumps": [ { "id": "P", "rate": 100, "from": ["A"], "to": ["sea"] } ] }
            """)));

    private static final Condition FULL =
            ConditionReader.read(Json.parse(bytes("{ \"fills\": [ { \"tank\": \"A\", \"fraction\": 1.0 } ] }")), BARGE);

    /** Free-surface moment of the tank, l·b³/12 (t·m). */
    private static final double MOMENT = 20 * Math.pow(22, 3) / 12;

    private static byte[] bytes(String text) {
        return text.getBytes(StandardCharsets.UTF_8);
    }

    private static Plan plan(double leastGm) {
        String request = "{ \"target\": { \"draft\": 2.5416666, \"tolerance\": { \"draft\": 0.05, \"angle\": 0.1 } },"
                + " \"operationLimits\": { \"minGm\": { \"transverse\": " + leastGm + " } } }";
        return BallastPlanner.plan(BARGE, FULL, PlanRequestReader.read(Json.parse(bytes(request)), BARGE, FULL));
    }

    /** As soon as the pump starts the tank is slack: GM = KM − KG − ρi/Δ with 5760 t at a draft of 3 m. */
    @Test
    void worstGmIsThatOfTheMomentInWhichThePressedUpTankBecomesSlack() {
        double mass = 4000 + 1760;
        double kg = (4000 * 6 + 1760 * 2) / mass;
        double atRest = 1.5 + 24.0 * 24 / 36 - kg;
        Plan plan = plan(0.5);
        assertThat(plan.feasible()).isTrue();
        assertThat(plan.before().gm().transverse().corrected()).isCloseTo(atRest, within(1e-9));
        assertThat(plan.worst().gmTransverse().value()).isCloseTo(atRest - MOMENT / mass, within(1e-3));
        assertThat(plan.worst().gmTransverse().minute()).isCloseTo(0, within(0.01));
    }

    @Test
    void limitPassedOnTheWayBindsAndThePlanIsNotFeasible() {
        Plan plan = plan(9.75);
        assertThat(plan.feasible()).isFalse();
        assertThat(plan.binding()).singleElement().satisfies(binding -> {
            assertThat(binding.limit()).isEqualTo("operationLimits.minGm.transverse");
            assertThat(binding.bound()).isCloseTo(9.75, within(1e-9));
            assertThat(binding.lack())
                    .isCloseTo(9.75 - plan.worst().gmTransverse().value(), within(1e-9));
        });
        assertThat(plan.warnings()).anyMatch(w -> w.contains("transverse GM") && w.contains("minute 0.0"));
    }
}
