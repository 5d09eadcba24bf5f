package org.evendraft.geometry;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;

/** Parts of a rounded outline on either side of a line: they make up the whole, and equal those of a fine polygon. */
class HalfPlaneTest {
    private static final double ROUNDING = 1e-12;
    /** Edges of 0.25° stand within r·step²/12 of the arc, under 1e-5 m here; the polygon has the arcs' own area. */
    private static final double TESSELLATION = 1e-4;

    private static final Outline ROUNDED = Outline.polygon(
            List.of(new double[] {0, 0}, new double[] {9, 1}, new double[] {8, 7}, new double[] {4, 4.5}, new double[] {
                -1, 6
            }),
            0.8);
    private static final Outline SHARP = Outline.polygon(ROUNDED.tessellated(), 0);

    private static AreaMoments inside(Outline outline, double c, double angle, double side) {
        HalfPlane half = new HalfPlane(side * c, side * Math.cos(angle), side * Math.sin(angle));
        outline.addTo(half);
        return half.moments();
    }

    private static void assertSame(AreaMoments found, AreaMoments expected, double tolerance) {
        double scale = ROUNDED.whole().pp() + ROUNDED.whole().qq();
        assertThat(found.area()).isCloseTo(expected.area(), within(tolerance * scale));
        assertThat(found.p()).isCloseTo(expected.p(), within(tolerance * scale));
        assertThat(found.q()).isCloseTo(expected.q(), within(tolerance * scale));
        assertThat(found.pp()).isCloseTo(expected.pp(), within(tolerance * scale));
        assertThat(found.pq()).isCloseTo(expected.pq(), within(tolerance * scale));
        assertThat(found.qq()).isCloseTo(expected.qq(), within(tolerance * scale));
    }

    @Property(tries = 2000, seed = "20261201")
    void bothSidesOfALineMakeUpTheWhole(
            @ForAll @DoubleRange(min = -6, max = 6) double c, @ForAll @DoubleRange(min = -4, max = 4) double angle) {
        AreaMoments sum = inside(ROUNDED, c, angle, 1).plus(inside(ROUNDED, c, angle, -1));
        assertSame(sum, ROUNDED.whole(), ROUNDING);
    }

    @Property(tries = 2000, seed = "20261201")
    void anOutlineWithArcsHasTheMomentsOfAFinePolygon(
            @ForAll @DoubleRange(min = -6, max = 6) double c, @ForAll @DoubleRange(min = -4, max = 4) double angle) {
        double toCentroid = Math.cos(angle) * SHARP.centroidP() + Math.sin(angle) * SHARP.centroidQ();
        AreaMoments polygon = inside(SHARP, c + toCentroid, angle, 1).about(SHARP.centroidP(), SHARP.centroidQ());
        assertSame(inside(ROUNDED, c, angle, 1), polygon, TESSELLATION);
    }
}
