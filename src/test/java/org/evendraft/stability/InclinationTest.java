package org.evendraft.stability;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Random;
import org.evendraft.geometry.Vec3;
import org.evendraft.platform.Condition;
import org.evendraft.platform.Fill;
import org.evendraft.platform.PreparedPlatform;
import org.evendraft.platform.Tank;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The derivatives of the potential energy against central differences of it, and on even keel against the metacentric heights. */
class InclinationTest {
    private static final double STEP = 1e-4;
    private static final LoadedPlatform LOPSIDED = lopsidedBarge();

    record Case(String name, LoadedPlatform loaded, Slopes at) {
        @Override
        public String toString() {
            return name + " " + at;
        }
    }

    static List<Case> cases() {
        Random random = new Random(11);
        return random.doubles(12, -0.25, 0.25)
                .boxed()
                .flatMap(heel -> {
                    Slopes at = new Slopes(heel, 0.25 * (2 * random.nextDouble() - 1));
                    return List.of(
                            new Case("barge", LOPSIDED, at),
                            new Case("twin pontoon", LoadingsTest.twinPontoon(random.nextInt(100)), at),
                            new Case("OC4", LoadingsTest.oc4(random.nextInt(100)), at))
                            .stream();
                })
                .toList();
    }

    /** A barge with two slack tanks of unlike liquids and a weight off every axis. */
    private static LoadedPlatform lopsidedBarge() {
        List<Tank> tanks = List.of(
                Floaters.tank("A", Floaters.box("A", -20, 10, 2, 12, 0, 6)),
                LoadingsTest.tiltedTank("B", new Vec3(20, -8, 2)));
        PreparedPlatform platform = Floaters.platform(
                List.of(Floaters.box("hull", -50, 50, -15, 15, 0, 14)), 20_000, new Vec3(1, 0.5, 9), tanks);
        Condition condition = Floaters.condition(
                List.of(new Fill("A", 800, 1.025), new Fill("B", 60, 2.1)),
                List.of(LoadingsTest.load(500, 20, -6, 16)));
        return LoadedPlatform.of(platform, condition);
    }

    @ParameterizedTest
    @MethodSource("cases")
    void gradientAndHessianEqualDifferencesOfTheEnergy(Case c) {
        Inclination here = Inclination.upright(c.loaded).at(c.at);
        Inclination heelUp = here.moved(new Slopes(STEP, 0));
        Inclination heelDown = here.moved(new Slopes(-STEP, 0));
        Inclination trimUp = here.moved(new Slopes(0, STEP));
        Inclination trimDown = here.moved(new Slopes(0, -STEP));
        EnergyAtSlopes e = here.energy();
        double byHeel = (heelUp.energy().value() - heelDown.energy().value()) / (2 * STEP);
        double byTrim = (trimUp.energy().value() - trimDown.energy().value()) / (2 * STEP);
        double scale = 1 + Math.abs(e.byHeelTwice()) + Math.abs(e.byTrimTwice());
        assertThat(e.gradient().heel()).isCloseTo(byHeel, within(1e-6 * scale));
        assertThat(e.gradient().trim()).isCloseTo(byTrim, within(1e-6 * scale));
        Slopes byHeelTwice = difference(heelUp, heelDown);
        Slopes byTrimTwice = difference(trimUp, trimDown);
        assertThat(e.byHeelTwice()).isCloseTo(byHeelTwice.heel(), within(2e-4 * scale));
        assertThat(e.byTrimTwice()).isCloseTo(byTrimTwice.trim(), within(2e-4 * scale));
        assertThat(e.byHeelAndTrim()).isCloseTo(byHeelTwice.trim(), within(2e-4 * scale));
        assertThat(byHeelTwice.trim()).isCloseTo(byTrimTwice.heel(), within(2e-4 * scale));
    }

    private static Slopes difference(Inclination up, Inclination down) {
        return up.energy().gradient().plus(down.energy().gradient().times(-1)).times(1 / (2 * STEP));
    }

    /** On even keel the Hessian is the matrix of corrected metacentric heights (domain definition), signs of the products as well. */
    @ParameterizedTest
    @MethodSource("cases")
    void onEvenKeelTheHessianIsTheMatrixOfMetacentricHeights(Case c) {
        EnergyAtSlopes e = Inclination.upright(c.loaded).energy();
        ConditionResult.Gm gm = c.loaded.evenKeel().gm();
        assertThat(e.byHeelTwice()).isCloseTo(gm.transverse().corrected(), within(1e-8));
        assertThat(e.byTrimTwice()).isCloseTo(gm.longitudinal().corrected(), within(1e-8));
        assertThat(e.leastCurvature()).isCloseTo(gm.least().corrected(), within(1e-8));
        Vec3 off = c.loaded.centreOfGravity().minus(c.loaded.evenKeel().centreOfBuoyancy());
        assertThat(e.gradient().heel()).isCloseTo(off.y(), within(1e-8));
        assertThat(e.gradient().trim()).isCloseTo(-off.x(), within(1e-8));
        double a = Math.toRadians(gm.least().azimuth());
        double along = e.byHeelTwice() * Math.cos(a) * Math.cos(a)
                + 2 * e.byHeelAndTrim() * Math.cos(a) * Math.sin(a)
                + e.byTrimTwice() * Math.sin(a) * Math.sin(a);
        assertThat(along).isCloseTo(gm.least().corrected(), within(1e-8));
    }
}
