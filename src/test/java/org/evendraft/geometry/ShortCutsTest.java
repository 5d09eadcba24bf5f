package org.evendraft.geometry;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.SplittableRandom;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;

/** Closed forms of prisms against clipping every triangle, which knows no prisms. */
class ShortCutsTest {
    private static final double TOLERANCE = 1e-10;

    /** A prism with sharp corners, its outline a star about some centre, so that it never crosses itself. */
    private static Solid prism(Axis axis, long seed) {
        SplittableRandom random = new SplittableRandom(seed);
        int corners = random.nextInt(3, 12);
        double p = random.nextDouble(-20, 20);
        double q = random.nextDouble(-20, 20);
        List<double[]> outline = new ArrayList<>();
        for (int i = 0; i < corners; i++) {
            double angle = 2 * Math.PI * (i + random.nextDouble(0.8)) / corners;
            double radius = random.nextDouble(1, 8);
            outline.add(new double[] {p + radius * Math.cos(angle), q + radius * Math.sin(angle)});
        }
        double from = random.nextDouble(-20, 20);
        return Solid.prism(axis, from, from + random.nextDouble(0.5, 15), outline, 0);
    }

    @Property(tries = 2000, seed = "20260612")
    void aPrismUnderAPlaneHasTheIntegralsOfItsTriangles(
            @ForAll Axis axis,
            @ForAll long seed,
            @ForAll @DoubleRange(min = 0, max = 1) double part,
            @ForAll @DoubleRange(min = -1.5, max = 1.5) double slopeX,
            @ForAll @DoubleRange(min = -1.5, max = 1.5) double slopeY) {
        Assembly space = Shapes.space(prism(axis, seed));
        Vec3 size = space.greatest().minus(space.least());
        Vec3 middle = space.least().plus(size.times(part));
        Plane plane = Plane.ofSlopes(middle.z() - slopeX * middle.x() - slopeY * middle.y(), slopeX, slopeY);
        Cut quick = space.below(plane);
        Cut plain = space.belowByTriangles(plane);
        double reach = space.least().norm() + space.greatest().norm();
        double volume = space.volume();
        assertThat(quick.volume()).isCloseTo(plain.volume(), within(TOLERANCE * volume));
        assertThat(quick.moment().minus(plain.moment()).norm()).isLessThan(TOLERANCE * volume * reach);
        double area = size.norm() * size.norm();
        assertThat(quick.area()).isCloseTo(plain.area(), within(TOLERANCE * area));
        SecondMoments a = quick.secondMoments();
        SecondMoments b = plain.secondMoments();
        double scale = area * reach * reach;
        assertThat(a.transverse()).isCloseTo(b.transverse(), within(TOLERANCE * scale));
        assertThat(a.longitudinal()).isCloseTo(b.longitudinal(), within(TOLERANCE * scale));
        assertThat(a.product()).isCloseTo(b.product(), within(TOLERANCE * scale));
    }
}
