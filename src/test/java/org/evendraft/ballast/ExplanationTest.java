package org.evendraft.ballast;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.evendraft.platform.Condition;
import org.evendraft.platform.PreparedPlatform;
import org.evendraft.platform.Pump;
import org.junit.jupiter.api.Test;

/**
 * Sentences on moves, with figures by hand: a box barge of 60 × 40 m in fresh water, lightship 8000 t at a height of 6 m; heel m·y/(Δ·GM), trim
 * m·x/(Δ·GM), sinkage m/(ρ·A), as any textbook on ship stability has them.
 */
final class ExplanationTest {
    private static final String AS_IT_IS = "{\"target\":{\"draft\":3.4}}";

    /** Tanks of 10 × 10 m about (15, −15), (−15, 15), (0, 15), (0, −15) and (0, 0). */
    private static BoxBarge barge() {
        return new BoxBarge()
                .tank("SF", 10, 20, -20, -10)
                .tank("PA", -20, -10, 10, 20)
                .tank("PM", -5, 5, 10, 20)
                .tank("SM", -5, 5, -20, -10)
                .tank("CM", -5, 5, -5, 5)
                .pump("all", 500, List.of("SF", "PA", "PM", "SM", "CM", Pump.SEA));
    }

    private static String explained(BoxBarge barge, Transfer transfer) {
        PreparedPlatform prepared = barge.platform();
        Condition condition = barge.condition(prepared);
        Plant plant = new Plant(prepared, condition, BoxBarge.request(AS_IT_IS, prepared, condition));
        return new Explanation(plant, ExactState.of(plant.loaded()).orElseThrow()).of(transfer);
    }

    /**
     * Δ = 8240 t, T = 3.433 m, KG = (8000·6 + 240·1.2)/8240 = 5.860 m, free surface (10·10³/12)/8240 = 0.101 m; GM across 1.717 + 40²/(12·T) − KG −
     * 0.101 = 34.59 m, along 1.717 + 60²/(12·T) − KG − 0.101 = 83.13 m. Heel 240·15/(8240·34.59) = 0.72°, trim 240·15/(8240·83.13) = 0.30°, sinkage
     * 240/2400 = 0.10 m.
     */
    @Test
    void waterFromTheSeaIsToldAsByHand() {
        assertThat(explained(barge(), new Transfer(Pump.SEA, "SF", 240)))
                .isEqualTo(
                        "Takes 240.0 t from the sea into SF (starboard forward); by itself 0.72° of heel to starboard,"
                                + " 0.30° of trim by the bow, 0.10 m more draft.");
    }

    /** The same state left the other way, from the same state. */
    @Test
    void waterPumpedOverboardIsTheSameTheOtherWay() {
        assertThat(explained(barge().fill("SF", 0.4), new Transfer("SF", Pump.SEA, 240)))
                .isEqualTo("Pumps 240.0 t from SF (starboard forward) overboard; by itself 0.72° of heel to port,"
                        + " 0.30° of trim by the stern, 0.10 m less draft.");
    }

    /**
     * 60 t of 300 t over 30 m: Δ = 8300 t, T = 3.458 m, KG = (8000·6 + 240·1.2 + 60·0.3)/8300 = 5.820 m, two free surfaces 2·833/8300 = 0.201 m;
     * GM = 1.729 + 40²/(12·T) − KG − 0.201 = 34.26 m. Heel 60·30/(8300·34.26) = 0.36°.
     */
    @Test
    void waterMovedAcrossChangesTheHeelAlone() {
        assertThat(explained(barge().fill("PM", 0.5), new Transfer("PM", "SM", 60)))
                .isEqualTo(
                        "Moves 60.0 t from PM (port amidships) to SM (starboard amidships); by itself 0.36° of heel to"
                                + " starboard, no trim, the same draft.");
    }

    /** 120/2400 = 0.05 m. */
    @Test
    void waterInTheMiddleChangesTheDraftAlone() {
        assertThat(explained(barge(), new Transfer(Pump.SEA, "CM", 120)))
                .isEqualTo(
                        "Takes 120.0 t from the sea into CM (amidships on the centreline); by itself no heel, no trim,"
                                + " 0.05 m more draft.");
    }

    @Test
    void aTankAftToPortIsToldSo() {
        assertThat(explained(barge(), new Transfer(Pump.SEA, "PA", 240)))
                .contains("(port aft)", "0.72° of heel to port", "0.30° of trim by the stern");
    }

    /** 60 × 40 × 12 m float 28800 t: 28500 t and 600 t more are too much. */
    @Test
    void aMoveThatAloneWouldSinkThePlatformSaysSo() {
        assertThat(explained(barge().load(20500, 0, 0, 2), new Transfer(Pump.SEA, "CM", 600)))
                .endsWith("; by itself it would sink or capsize the platform.");
    }

    @Test
    void everyMoveOfAPlanIsExplainedFromThePlansStart() {
        Plan plan = barge().load(100, 0, 14, 14).plan("{\"target\":{\"draft\":3.5}}");
        assertThat(plan.feasible()).isTrue();
        assertThat(plan.moves()).isNotEmpty();
        assertThat(plan.moves())
                .allSatisfy(move -> assertThat(move.explanation())
                        .isEqualTo(explained(
                                barge().load(100, 0, 14, 14), new Transfer(move.from(), move.to(), move.mass()))));
    }
}
