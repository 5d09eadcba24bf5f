package org.evendraft.geometry;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;

/** A cut that is moved from space to space holds what a new one would, from any guess, with short cuts and without. */
class HeldCutTest {
    private static final double TOLERANCE = 1e-9;

    private static final Assembly BOX = Shapes.space(Shapes.box(3, 15, -4, 2, 1, 6));
    private static final Assembly MANY = Shapes.space(
            Shapes.box(-20, 20, 6, 12, 0, 4),
            Shapes.box(-20, 20, -12, -6, 0, 4),
            Solid.cylinder(new Vec3(0, -6, 2), new Vec3(0, 6, 2), 2, 2),
            Solid.prism(
                    Axis.Z,
                    4,
                    14,
                    List.of(new double[] {-3, -3}, new double[] {3, -3}, new double[] {3, 3}, new double[] {-3, 3}),
                    1));
    private static final Assembly PLAIN = BOX.byTriangles();

    @Property(tries = 1000, seed = "20261201")
    void aCutUsedBeforeIsAsGoodAsNew(
            @ForAll @DoubleRange(min = 0.01, max = 0.99) double part,
            @ForAll @DoubleRange(min = -1.5, max = 1.5) double slopeX,
            @ForAll @DoubleRange(min = -1.5, max = 1.5) double slopeY,
            @ForAll @DoubleRange(min = -60, max = 60) double guess) {
        Cut used = new Cut(Plane.ofSlopes(0, slopeX, slopeY));
        for (Assembly space : List.of(BOX, MANY, PLAIN, BOX)) {
            double volume = part * space.volume();
            space.hold(used, volume, guess);
            Cut fresh = space.below(used.plane());
            assertThat(used.volume()).isCloseTo(volume, within(1e-12 * space.volume()));
            assertThat(used.volume()).isEqualTo(fresh.volume());
            assertThat(used.moment()).isEqualTo(fresh.moment());
            assertThat(used.secondMoments()).isEqualTo(fresh.secondMoments());
            Cut unguessed = space.holding(volume, slopeX, slopeY, Double.NaN);
            assertThat(used.heightOverOrigin()).isCloseTo(unguessed.heightOverOrigin(), within(TOLERANCE));
        }
    }

    @Property(tries = 500, seed = "20261201")
    void withAndWithoutShortCutsABoxHoldsTheSame(
            @ForAll @DoubleRange(min = 0.01, max = 0.99) double part,
            @ForAll @DoubleRange(min = -1.5, max = 1.5) double slopeX,
            @ForAll @DoubleRange(min = -1.5, max = 1.5) double slopeY) {
        Cut quick = BOX.holding(part * BOX.volume(), slopeX, slopeY, Double.NaN);
        Cut plain = PLAIN.holding(part * BOX.volume(), slopeX, slopeY, Double.NaN);
        assertThat(quick.heightOverOrigin()).isCloseTo(plain.heightOverOrigin(), within(TOLERANCE));
        assertThat(quick.centroid().minus(plain.centroid()).norm()).isLessThan(TOLERANCE);
    }
}
