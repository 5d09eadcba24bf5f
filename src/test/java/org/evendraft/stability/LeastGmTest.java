package org.evendraft.stability;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import org.evendraft.geometry.Axis;
import org.evendraft.geometry.Solid;
import org.evendraft.geometry.Vec3;
import org.evendraft.platform.Body;
import org.evendraft.platform.Fill;
import org.evendraft.platform.PreparedPlatform;
import org.evendraft.platform.Tank;
import org.junit.jupiter.api.Test;

/**
 * The least GM over all horizontal axes on a hull and with a tank that have no symmetry, against a scan of GM axis by axis: second
 * moments of circles, π·d⁴/64 + A·e², and of right triangles, a³b/36 with product −a²b²/72 (elementary mechanics).
 */
class LeastGmTest {
    private static final double SEA = 1.025;
    /** x, y, diameter of vertical columns (m). */
    private static final double[][] COLUMNS = {{20, 14, 10}, {-18, 16, 7}, {-6, -20, 12}};

    private static final double DRAFT = 12;
    private static final double KG = 14;
    /** Legs of a right-angled tank along x and y from its corner (m). */
    private static final double LEG_X = 9;

    private static final double LEG_Y = 6;

    private static double area(double[] column) {
        return Math.PI * column[2] * column[2] / 4;
    }

    /** Second moment of the waterplane about an axis of direction a through the centre of flotation (m⁴). */
    private static double waterplane(double a) {
        double sum = 0;
        double first = 0;
        double total = 0;
        for (double[] c : COLUMNS) {
            double off = -c[0] * Math.sin(a) + c[1] * Math.cos(a);
            sum += Math.PI * Math.pow(c[2], 4) / 64 + area(c) * off * off;
            first += area(c) * off;
            total += area(c);
        }
        return sum - first * first / total;
    }

    /** Second moment of the tank's triangular surface about an axis of direction a through its centroid (m⁴). */
    private static double triangle(double a) {
        double longitudinal = Math.pow(LEG_X, 3) * LEG_Y / 36;
        double transverse = LEG_X * Math.pow(LEG_Y, 3) / 36;
        double product = -LEG_X * LEG_X * LEG_Y * LEG_Y / 72;
        double s = Math.sin(a);
        double c = Math.cos(a);
        return s * s * longitudinal - 2 * s * c * product + c * c * transverse;
    }

    private static ConditionResult evaluate(boolean slack, double density) {
        List<Body> hull = new ArrayList<>();
        double volume = 0;
        double x = 0;
        double y = 0;
        for (double[] c : COLUMNS) {
            hull.add(Floaters.cylinder("column", new Vec3(c[0], c[1], 0), new Vec3(c[0], c[1], 40), c[2]));
            volume += area(c) * DRAFT;
            x += area(c) * c[0] * DRAFT;
            y += area(c) * c[1] * DRAFT;
        }
        Solid wedge = Solid.prism(
                Axis.Z, 0, 4, List.of(new double[] {0, 0}, new double[] {LEG_X, 0}, new double[] {0, LEG_Y}), 0);
        Tank tank = Floaters.tank("T", Floaters.body("T", wedge));
        double liquid = slack ? LEG_X * LEG_Y / 2 * 2 * density : 0;
        double light = SEA * volume - liquid;
        double mass = SEA * volume;
        Vec3 wanted = new Vec3(x / volume, y / volume, KG).times(mass);
        Vec3 centre =
                wanted.minus(new Vec3(LEG_X / 3, LEG_Y / 3, 1).times(liquid)).times(1 / light);
        List<Fill> fills = slack ? List.of(new Fill("T", LEG_X * LEG_Y, density)) : List.of();
        return Evaluation.evaluate(
                Floaters.platform(hull, light, centre, List.of(tank)), Floaters.condition(fills, List.of()));
    }

    private static double volume() {
        double sum = 0;
        for (double[] c : COLUMNS) {
            sum += area(c) * DRAFT;
        }
        return sum;
    }

    private static void assertLeast(ConditionResult result, double density) {
        double least = Double.POSITIVE_INFINITY;
        double at = 0;
        for (int i = 0; i < 18_000; i++) {
            double a = Math.toRadians(i / 100.0);
            double gm = gm(a, density);
            if (gm < least) {
                least = gm;
                at = i / 100.0;
            }
        }
        assertThat(result.gm().least().corrected()).isCloseTo(least, within(1e-4));
        assertThat(result.gm().least().azimuth()).isCloseTo(at, within(0.02));
        assertThat(result.gm().transverse().corrected()).isCloseTo(gm(0, density), within(1e-4));
        assertThat(result.gm().longitudinal().corrected()).isCloseTo(gm(Math.PI / 2, density), within(1e-4));
        // No symmetry: the weakest axis is neither of the two named ones.
        assertThat(at % 90).isBetween(5.0, 85.0);
        assertThat(least).isLessThan(Math.min(gm(0, density), gm(Math.PI / 2, density)) - 0.1);
    }

    private static double gm(double a, double density) {
        return DRAFT / 2 + waterplane(a) / volume() - KG - density * triangle(a) / (SEA * volume());
    }

    @Test
    void leastGmOfAnAsymmetricHullEqualsAScanOverAllAxes() {
        assertLeast(evaluate(false, 0), 0);
    }

    /** A liquid as heavy as need be for its product of inertia to turn the weakest axis visibly. */
    @Test
    void theProductOfAFreeSurfaceTurnsTheWeakestAxisTheRightWay() {
        double density = 3;
        ConditionResult result = evaluate(true, density);
        assertLeast(result, density);
        assertThat(result.gm().least().azimuth())
                .isNotCloseTo(evaluate(false, 0).gm().least().azimuth(), within(0.02));
        assertThat(result.gm().transverse().freeSurfaceCorrection())
                .isCloseTo(density * triangle(0) / result.mass(), within(1e-9));
        assertThat(result.gm().longitudinal().freeSurfaceCorrection())
                .isCloseTo(density * triangle(Math.PI / 2) / result.mass(), within(1e-9));
    }

    /** A small moment about the weakest axis turns the platform about that axis, by moment over Δ·GM: azimuth counts from x towards y. */
    @Test
    void aMomentAboutTheWeakestAxisTurnsThePlatformAboutIt() {
        ConditionResult still = evaluate(false, 0);
        double a = Math.toRadians(still.gm().least().azimuth());
        LoadedPlatform loaded = LoadedPlatform.of(platformWith(a, 0.001), Floaters.condition(List.of(), List.of()));
        Waterplane at = Evaluation.afloat(loaded).waterplane();
        assertThat(Math.tan(at.heelRad()) * Math.sin(a)).isCloseTo(Math.tan(at.trimRad()) * Math.cos(a), within(1e-7));
        double turn = Math.tan(at.heelRad()) * Math.cos(a) + Math.tan(at.trimRad()) * Math.sin(a);
        assertThat(turn).isCloseTo(0.001 / still.gm().least().corrected(), within(1e-6));
    }

    /** G moved by an arm so that its weight turns the platform about the azimuth by the right-hand rule: along (sin a, −cos a). */
    private static PreparedPlatform platformWith(double a, double arm) {
        List<Body> hull = new ArrayList<>();
        double x = 0;
        double y = 0;
        for (double[] c : COLUMNS) {
            hull.add(Floaters.cylinder("column", new Vec3(c[0], c[1], 0), new Vec3(c[0], c[1], 40), c[2]));
            x += area(c) * c[0] * DRAFT / volume();
            y += area(c) * c[1] * DRAFT / volume();
        }
        Vec3 g = new Vec3(x + arm * Math.sin(a), y - arm * Math.cos(a), KG);
        return Floaters.platform(hull, SEA * volume(), g, List.of());
    }
}
