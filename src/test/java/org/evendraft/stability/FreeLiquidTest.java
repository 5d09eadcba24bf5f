package org.evendraft.stability;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import org.evendraft.geometry.Vec3;
import org.evendraft.platform.Body;
import org.evendraft.platform.Calibration.Inclined;
import org.evendraft.platform.Fill;
import org.evendraft.platform.PreparedPlatform;
import org.evendraft.platform.Tank;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Liquids in slack tanks, in the correction and in the exact position, against closed forms. */
class FreeLiquidTest {
    private static final double SEA = 1.025;

    private static ConditionResult barge(List<Tank> tanks, List<Fill> fills, double offCentre) {
        Body hull = Floaters.box("hull", -50, 50, -15, 15, 0, 16);
        PreparedPlatform platform = Floaters.platform(List.of(hull), 18_000, new Vec3(0, offCentre, 7), tanks);
        return Evaluation.evaluate(platform, Floaters.condition(fills, List.of()));
    }

    /**
     * Rectangular tank 20 × 12 m, ρ 1.025, half full: while the surface meets both side walls the liquid transfers
     * ρ·(l·b³/12)·sin φ·(1 + tan²φ/2), 520.578 t·m at 10° (geometry of the wedge; the free-surface moment's sine gives 512.610).
     */
    @Test
    void aRectangularTankTransfersTheMomentOfItsWedge() {
        Tank tank = Floaters.tank("T", Floaters.box("T", -10, 10, -6, 6, 0, 5));
        Tank table = LoadingsTest.tableTank("T", -10, 10, -6, 6, 0, 5);
        for (Tank t : List.of(tank, table)) {
            PreparedPlatform platform = Floaters.platform(
                    List.of(Floaters.box("hull", -50, 50, -15, 15, 0, 16)), 18_000, new Vec3(0, 0, 7), List.of(t));
            double heel = Math.toRadians(10);
            Inclined moved = platform.calibration("T").inclined(600, 0, -Math.tan(heel), Double.NaN);
            Vec3 shift = moved.moment().minus(new Vec3(0, 0, 1.25).times(600));
            double moment = SEA * (-shift.y() * Math.cos(heel) + shift.z() * Math.sin(heel));
            assertThat(moment).isCloseTo(520.578, within(1e-3));
        }
    }

    /**
     * The whole balance by the wall-sided rule (Derrett and Barrass, Ship Stability for Masters and Mates, 5th ed. 1999): G off by
     * y at angle φ, Δ·y·cos φ = Δ·(GM + BM·tan²φ/2)·sin φ − ρ·i·(1 + tan²φ/2)·sin φ.
     */
    @ParameterizedTest
    @ValueSource(doubles = {1, 5, 10, 15, 20})
    void theExactHeelBalancesHullAndLiquid(double angle) {
        Tank tank = Floaters.tank("T", Floaters.box("T", -10, 10, -6, 6, 0, 5));
        double mass = 18_000 + 600 * SEA;
        double t = Math.tan(Math.toRadians(angle));
        double volume = mass / SEA;
        double draft = volume / 3000;
        double bm = 225 / draft * 4 / 12;
        double kg = (18_000 * 7 + 600 * SEA * 1.25) / mass;
        double gm = draft / 2 + bm - kg;
        double inertia = 20 * Math.pow(12, 3) / 12;
        double off = (gm + bm * t * t / 2) * t - SEA * inertia / mass * (1 + t * t / 2) * t;
        ConditionResult result = barge(List.of(tank), List.of(new Fill("T", 600, SEA)), -off * mass / 18_000);
        assertThat(result.gm().transverse().solid()).isCloseTo(gm, within(1e-9));
        assertThat(result.gm().transverse().freeSurfaceCorrection()).isCloseTo(SEA * inertia / mass, within(1e-9));
        assertThat(result.floating().heelAngle()).isCloseTo(angle, within(1e-5));
        // Drafts to 1 mm: a wall-sided hull keeps its draft on the centreline.
        assertThat(result.floating().draft()).isCloseTo(draft, within(1e-6));
    }

    /** A tank known by a table lies as the same tank known by its shape while the surface meets its walls only. */
    @ParameterizedTest
    @CsvSource({"0.5, 0.5", "0.35, -0.4", "0.6, 0.05"})
    void aWallSidedTableLiesAsItsShape(double fraction, double off) {
        List<Fill> fills = List.of(new Fill("T", 20 * 12 * 8 * fraction, 1.2));
        ConditionResult byTable = barge(List.of(LoadingsTest.tableTank("T", 5, 25, -3, 9, 1, 9)), fills, off);
        ConditionResult byShape = barge(List.of(Floaters.tank("T", Floaters.box("T", 5, 25, -3, 9, 1, 9))), fills, off);
        assertThat(byTable.floating().heelAngle()).isCloseTo(byShape.floating().heelAngle(), within(1e-7));
        assertThat(byTable.floating().trimAngle()).isCloseTo(byShape.floating().trimAngle(), within(1e-7));
        assertThat(byTable.floating().draft()).isCloseTo(byShape.floating().draft(), within(1e-8));
        assertThat(byTable.gm().transverse().corrected())
                .isCloseTo(byShape.gm().transverse().corrected(), within(1e-9));
        assertThat(Math.abs(byShape.floating().heelAngle())).isGreaterThan(0.1);
    }

    /** n equal tanks side by side have 1/n² of the free-surface correction of one tank of their whole breadth (Derrett, chapter on slack tanks). */
    @ParameterizedTest
    @ValueSource(ints = {1, 2, 3, 4})
    void subdivisionDividesTheCorrectionByItsSquare(int n) {
        List<Tank> tanks = new ArrayList<>();
        List<Fill> fills = new ArrayList<>();
        double breadth = 24.0 / n;
        for (int i = 0; i < n; i++) {
            double y0 = -12 + i * breadth;
            tanks.add(Floaters.tank("T" + i, Floaters.box("T", -10, 10, y0, y0 + breadth, 0, 5)));
            fills.add(new Fill("T" + i, 20 * breadth * 2, SEA));
        }
        ConditionResult result = barge(tanks, fills, 0);
        double undivided = SEA * 20 * Math.pow(24, 3) / 12 / result.mass();
        assertThat(result.gm().transverse().freeSurfaceCorrection()).isCloseTo(undivided / (n * n), within(1e-9));
        // Lengthwise nothing is divided.
        double lengthwise = SEA * 24 * Math.pow(20, 3) / 12 / result.mass();
        assertThat(result.gm().longitudinal().freeSurfaceCorrection()).isCloseTo(lengthwise, within(1e-9));
        assertThat(result.mass()).isCloseTo(18_000 + 960 * SEA, within(1e-9));
    }
}
