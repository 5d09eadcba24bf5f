package org.evendraft.stability;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import org.evendraft.geometry.Vec3;
import org.evendraft.platform.PreparedPlatform;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Large inclinations, deck edge under water or bilge out of it, against an independent search in the plane: the section of a long
 * box is clipped by the waterline, the waterline placed by bisection on its area, and the height of G over B scanned over the angle.
 * Floating bodies rest where that height is least (principle of least potential energy; any textbook of mechanics).
 */
class PotentialEnergyTest {
    private static final double LENGTH = 200;
    private static final double BREADTH = 20;
    private static final double DEPTH = 10;
    private static final double SCAN = 0.05;

    /** Area and first moments (∫dA, ∫y dA, ∫z dA) of what lies under z = c − y·h in the section of the box. */
    private static double[] under(double c, double h) {
        double b = BREADTH / 2;
        double[][] corners = {{-b, 0}, {b, 0}, {b, DEPTH}, {-b, DEPTH}};
        List<double[]> wet = new ArrayList<>();
        for (int i = 0; i < 4; i++) {
            double[] p = corners[i];
            double[] q = corners[(i + 1) % 4];
            double hp = p[1] - c + p[0] * h;
            double hq = q[1] - c + q[0] * h;
            if (hp <= 0) {
                wet.add(p);
            }
            if (hp * hq < 0) {
                double s = hp / (hp - hq);
                wet.add(new double[] {p[0] + s * (q[0] - p[0]), p[1] + s * (q[1] - p[1])});
            }
        }
        double[] sums = new double[3];
        for (int i = 0; i < wet.size(); i++) {
            double[] p = wet.get(i);
            double[] q = wet.get((i + 1) % wet.size());
            double twice = p[0] * q[1] - q[0] * p[1];
            sums[0] += twice / 2;
            sums[1] += twice * (p[0] + q[0]) / 6;
            sums[2] += twice * (p[1] + q[1]) / 6;
        }
        return sums;
    }

    /** Height of G over B at an angle (m), the section's wet area given. */
    private static double energy(double degrees, double area, double gy, double gz) {
        double h = Math.tan(Math.toRadians(degrees));
        double low = -100;
        double high = 100;
        for (int i = 0; i < 60; i++) {
            double c = (low + high) / 2;
            if (under(c, h)[0] > area) {
                high = c;
            } else {
                low = c;
            }
        }
        double[] wet = under((low + high) / 2, h);
        double cos = Math.cos(Math.toRadians(degrees));
        return cos * ((gz - wet[2] / wet[0]) + h * (gy - wet[1] / wet[0]));
    }

    /** The angle of the local minimum reached downhill from an angle, refined by a parabola through three points (degrees). */
    private static double restFrom(double start, double area, double gy, double gz) {
        double at = start;
        while (Math.abs(at) < 60) {
            double here = energy(at, area, gy, gz);
            double up = energy(at + SCAN, area, gy, gz);
            double down = energy(at - SCAN, area, gy, gz);
            if (up >= here && down >= here) {
                return at + SCAN * (down - up) / (2 * (down - 2 * here + up));
            }
            at += up < down ? SCAN : -SCAN;
        }
        return at;
    }

    private static PreparedPlatform barge(double draft, double gy, double gz) {
        return Floaters.platform(
                List.of(Floaters.box("hull", -LENGTH / 2, LENGTH / 2, -BREADTH / 2, BREADTH / 2, 0, DEPTH)),
                1.025 * LENGTH * BREADTH * draft,
                new Vec3(0, gy, gz),
                List.of());
    }

    @ParameterizedTest
    @CsvSource({
        "6, -1.5, 5",
        "6, -2.4, 4",
        "6, -2.9, 3",
        "3, -2.9, 5",
        "3, 2.5, 6",
        "8, 0.7, 3",
        "5, 3.3, 4",
        "7, -1.9, 2"
    })
    void aHeeledBoxRestsWhereTheScanFindsTheLeastEnergy(double draft, double gy, double gz) {
        double expected = restFrom(0, BREADTH * draft, gy, gz);
        ConditionResult result = Evaluation.evaluate(barge(draft, gy, gz), Floaters.condition(List.of(), List.of()));
        assertThat(Math.abs(expected)).isBetween(7.0, 59.0);
        assertThat(result.floating().heelAngle()).isCloseTo(expected, within(0.01));
        assertThat(result.floating().trimAngle()).isCloseTo(0, within(1e-6));
    }

    /** Of the loaded cases above most heel beyond the deck edge or the bilge, where the wall-sided rule no longer holds. */
    @Test
    void theScanItselfAgreesWithTheWallSidedRuleWithinTheSides() {
        double off = 0.3;
        double angle = restFrom(0, BREADTH * 5, -off, 5);
        double t = Math.tan(Math.toRadians(angle));
        double bm = BREADTH * BREADTH / 12 / 5;
        assertThat(t * (2.5 + bm - 5 + bm * t * t / 2)).isCloseTo(off, within(1e-4));
    }

    /** Negative GM with the deck edge under: the position of least energy over the whole range, to starboard. */
    @ParameterizedTest
    @CsvSource({"5, 9.5", "5, 9.8", "6, 8.7", "4, 10.7"})
    void aDeeplyLollingBoxRestsInTheLowestPosition(double draft, double gz) {
        double best = 0;
        for (double start = 0; start <= 59; start += 1) {
            double rest = restFrom(start, BREADTH * draft, 0, gz);
            boolean within = rest < 59.9;
            if (within && energy(rest, BREADTH * draft, 0, gz) < energy(best, BREADTH * draft, 0, gz)) {
                best = rest;
            }
        }
        ConditionResult result = Evaluation.evaluate(barge(draft, 0, gz), Floaters.condition(List.of(), List.of()));
        assertThat(result.gm().transverse().corrected()).isNegative();
        assertThat(best).isGreaterThan(10);
        assertThat(result.floating().heelAngle()).isCloseTo(best, within(0.01));
        assertThat(result.floating().upright()).isFalse();
    }
}
