package org.evendraft.stability;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import java.util.OptionalDouble;
import org.apache.commons.math3.analysis.integration.SimpsonIntegrator;
import org.evendraft.platform.Criterion.LimitAngle;
import org.evendraft.platform.Criterion.Measure;
import org.evendraft.platform.DamageCase;
import org.evendraft.platform.Opening.Closing;
import org.evendraft.platform.Situation;
import org.junit.jupiter.api.Test;

/** Greatest KG against closed forms of the wall-sided barge. */
class KgSearchTest {
    private static final double MILLIMETRE = 1e-3;

    private static KgLimit find(JudgedBarge barge, double wind, DamageCase... cases) {
        KgRequest request = new KgRequest(
                JudgedBarge.mode(OptionalDouble.of(wind)),
                List.of(JudgedBarge.DRAFT),
                OptionalDouble.empty(),
                1.025,
                OptionalDouble.empty(),
                List.of(cases));
        return AllowableKgCurve.find(barge.prepared(), request, Progress.UNWATCHED)
                .get(0);
    }

    /** 46 CFR 174.040: 0.05 m of GM, so KG = KM − 0.05 m. */
    @Test
    void leastGmAloneLeavesTheMetacentreLessTheBound() {
        JudgedBarge barge = new JudgedBarge().criterion(Situation.INTACT, Measure.LEAST_GM, 0.05, 0, LimitAngle.LESSER);
        KgLimit limit = find(barge, 0);
        assertThat(limit.allowableKg()).isCloseTo(JudgedBarge.KM - 0.05, within(1e-9));
        assertThat(limit.criterion()).isEqualTo("LEAST_GM");
        assertThat(limit.kmTransverse()).isCloseTo(JudgedBarge.KM, within(1e-9));
        assertThat(limit.displacement()).isCloseTo(JudgedBarge.MASS, within(1e-6));
    }

    /**
     * Area ratio K to the opening at θ: the wind's arms do not depend on KG, the righting arms' area is linear in it,
     * ∫sin φ·(KM + ½·BM·tan² φ) − KG·(1 − cos θ), so the limit has a closed form.
     */
    @Test
    void areaRatioSetsTheLimitOfItsClosedForm() {
        JudgedBarge barge = new JudgedBarge()
                .house(11, 15, 0, 1200, 0)
                .opening("vent S", -10, 8, Closing.NONE)
                .opening("vent P", 10, 8, Closing.NONE)
                .criterion(Situation.INTACT, Measure.AREA_RATIO, 1.3, 60, LimitAngle.DOWNFLOODING);
        KgLimit limit = find(barge, 60);
        double flooding = Math.atan(0.3);
        SimpsonIntegrator rule = new SimpsonIntegrator(1e-12, 1e-12, 3, 60);
        double keel = rule.integrate(1_000_000, phi -> JudgedBarge.gz(0, phi), 0, flooding);
        double wind = rule.integrate(1_000_000, phi -> JudgedBarge.windArm(60, 1200, 13, phi), 0, flooding);
        double expected = (keel - 1.3 * wind) / (1 - Math.cos(flooding));
        assertThat(limit.allowableKg()).isCloseTo(expected, within(MILLIMETRE + 2e-3));
        assertThat(limit.criterion()).isEqualTo("AREA_RATIO");
        assertThat(Objects.requireNonNull(limit.azimuth()) % 180).isCloseTo(0, within(1e-9));
        double width = Objects.requireNonNull(limit.breaksAt()) - Objects.requireNonNull(limit.allowableKg());
        assertThat(width).isBetween(0.0, MILLIMETRE);
    }

    /** With the bow open and no wind, KG for a given trim follows from the cubic of the wall-sided box (see DamageStabilityTest). */
    @Test
    void inclinationAfterDamageSetsTheLimitOfItsClosedForm() {
        JudgedBarge barge = new JudgedBarge()
                .compartment("bow", 40, 50, -10, 10, 1)
                .criterion(Situation.FLOODING, Measure.INCLINATION, 2.42, 0, LimitAngle.LESSER);
        DamageCase damage = new DamageCase("bow open", Situation.FLOODING, List.of("bow"));
        double t = Math.tan(Math.toRadians(2.42));
        double bm = 90.0 * 90 * 90 * 20 / 12 / 10_000;
        double expected = 10_000.0 / 1800 / 2 + bm * t * t / 2 - (5 - bm * t) / t;
        KgLimit limit = find(barge, 0, damage);
        assertThat(expected).isBetween(1.0, JudgedBarge.KM);
        assertThat(limit.allowableKg()).isCloseTo(expected, within(MILLIMETRE));
        assertThat(limit.damageCase()).isEqualTo("bow open");
        assertThat(limit.criterion()).isEqualTo("INCLINATION");
    }

    @Test
    void noKgHelpsWhatSinks() {
        JudgedBarge barge = new JudgedBarge()
                .compartment("most", -30, 40, -10, 10, 1)
                .criterion(Situation.COLLISION, Measure.INCLINATION, 17, 0, LimitAngle.LESSER);
        KgLimit limit = find(barge, 0, new DamageCase("most open", Situation.COLLISION, List.of("most")));
        assertThat(limit.allowableKg()).isNull();
        assertThat(limit.criterion()).isEqualTo("afloat");
        assertThat(limit.damageCase()).isEqualTo("most open");
    }

    @Test
    void progressRisesAndMayStopTheWork() {
        JudgedBarge barge =
                new JudgedBarge().criterion(Situation.INTACT, Measure.INCLINATION, 60, 0, LimitAngle.LESSER);
        KgRequest request = new KgRequest(
                JudgedBarge.mode(OptionalDouble.of(0)),
                List.of(4.0, 5.0),
                OptionalDouble.empty(),
                1.025,
                OptionalDouble.empty(),
                List.of());
        List<Double> seen = new ArrayList<>();
        AllowableKgCurve.find(barge.prepared(), request, (fraction, doing) -> seen.add(fraction));
        assertThat(seen).isSorted().hasSizeGreaterThan(10);
        assertThat(seen.get(seen.size() - 1)).isBetween(0.9, 1.0);
        Progress stop = (fraction, doing) -> {
            throw new StoppedException();
        };
        assertThatThrownBy(() -> AllowableKgCurve.find(barge.prepared(), request, stop))
                .isInstanceOf(StoppedException.class);
    }
}
