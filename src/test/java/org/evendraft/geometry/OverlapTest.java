package org.evendraft.geometry;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.evendraft.geometry.Shapes.box;
import static org.evendraft.geometry.Shapes.space;

import java.util.List;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import org.assertj.core.data.Percentage;
import org.junit.jupiter.api.Test;

class OverlapTest {
    private static final Percentage A_FEW_PERCENT = Percentage.withPercentage(3);

    private static Solid cylinder(Vec3 start, Vec3 end, double diameter) {
        return Solid.cylinder(start, end, diameter, diameter);
    }

    @Test
    void bodiesThatTouchHaveNothingInCommon() {
        Solid pontoon = box(-48, 48, 22, 36, 0, 8.5);
        List<double[]> square =
                List.of(new double[] {20, 22}, new double[] {32, 22}, new double[] {32, 34}, new double[] {20, 34});
        Solid column = Solid.prism(Axis.Z, 8.5, 29, square, 2.5);
        Solid brace = cylinder(new Vec3(26, 22, 11), new Vec3(26, -22, 11), 2);
        Solid slanting = cylinder(new Vec3(0, 0, 0), new Vec3(3, 4, 5), 1);
        Solid onItsEnd = cylinder(new Vec3(3, 4, 5), new Vec3(6, 8, 10), 2);
        assertThat(Overlap.volume(pontoon, column)).isZero();
        assertThat(Overlap.volume(column, brace)).isZero();
        assertThat(Overlap.volume(pontoon, brace)).isZero();
        assertThat(Overlap.volume(slanting, onItsEnd)).isZero();
    }

    @Property(tries = 60, seed = "20260612")
    void boxesHaveTheirCommonBox(
            @ForAll @DoubleRange(min = -6, max = 6) double dx,
            @ForAll @DoubleRange(min = -6, max = 6) double dy,
            @ForAll @DoubleRange(min = -6, max = 6) double dz) {
        double common = Math.max(0, 4 - Math.abs(dx)) * Math.max(0, 5 - Math.abs(dy)) * Math.max(0, 6 - Math.abs(dz));
        double found = Overlap.volume(box(0, 4, 0, 5, 0, 6), box(dx, dx + 4, dy, dy + 5, dz, dz + 6));
        assertThat(found).isCloseTo(common, within(1e-9 + 1e-9 * common));
    }

    @Property(tries = 40, seed = "20260612")
    void upturnedBoxesHaveTheirCommonPart(@ForAll @DoubleRange(min = 0.05, max = 1.4) double d) {
        List<double[]> diamond =
                List.of(new double[] {-1, 0}, new double[] {0, -1}, new double[] {1, 0}, new double[] {0, 1});
        Solid upright = Solid.prism(Axis.Z, 0, 3, diamond, 0);
        Solid corner = box(1 - d, 3, -2, 2, 1, 2);
        double common = d <= 1 ? d * d : 2 - (2 - d) * (2 - d);
        assertThat(Overlap.volume(upright, corner)).isCloseTo(common, A_FEW_PERCENT);
    }

    /** Two equal cylinders that cross at right angles share 16 r³/3 (Steinmetz's solid; Archimedes, The Method). */
    @Test
    void crossingCylindersShareTheSolidOfSteinmetz() {
        Solid one = cylinder(new Vec3(-5, 0, 0), new Vec3(5, 0, 0), 3);
        Solid other = cylinder(new Vec3(0, -6, 0), new Vec3(0, 6, 0), 3);
        assertThat(Overlap.volume(one, other)).isCloseTo(16 * 1.5 * 1.5 * 1.5 / 3, Percentage.withPercentage(0.5));
    }

    @Test
    void findsASmallCommonPartOfLargeBodies() {
        Solid hull = box(-100, 100, -30, 30, 0, 20);
        Solid pole = cylinder(new Vec3(99.5, 29.5, 19), new Vec3(140, 70, 60), 0.4);
        Solid inside = box(99.4, 99.6, 29.3, 29.4, 3, 4);
        assertThat(Overlap.volume(hull, pole)).isBetween(0.05, 0.5);
        assertThat(Overlap.volume(hull, inside)).isCloseTo(0.02, A_FEW_PERCENT);
    }

    @Test
    void capsOfFansThatOverlapWithOppositeSignsCancel() {
        List<double[]> horseshoe = List.of(
                new double[] {0, 0},
                new double[] {10, 0},
                new double[] {10, 10},
                new double[] {8, 10},
                new double[] {8, 2},
                new double[] {2, 2},
                new double[] {2, 10},
                new double[] {0, 10});
        Solid shoe = Solid.prism(Axis.Z, 0, 2, horseshoe, 0);
        assertThat(Overlap.volume(shoe, box(2.5, 7.5, 2.5, 9, 0.5, 1.5))).isCloseTo(0, within(1e-9));
        assertThat(Overlap.volume(shoe, box(1, 9, 4, 6, 0.5, 1.5))).isCloseTo(4, A_FEW_PERCENT);
        assertThat(Overlap.folded(shoe)).isCloseTo(0, within(1e-9));
    }

    @Test
    void tellsThePartOutside() {
        Assembly hull = new Assembly(List.of(
                new Assembly.Part(box(0, 20, 0, 10, 0, 5), false), new Assembly.Part(box(5, 10, 0, 10, 0, 5), true)));
        assertThat(Overlap.partOutside(space(box(11, 15, 2, 8, 0, 5)), hull)).isCloseTo(0, within(1e-9));
        assertThat(Overlap.partOutside(space(box(15, 25, 2, 8, 0, 5)), hull)).isCloseTo(0.5, within(0.02));
        assertThat(Overlap.partOutside(space(box(6, 9, 2, 8, 0, 5)), hull)).isCloseTo(1, within(1e-9));
        assertThat(Overlap.partOutside(space(box(12, 14, 2, 4, 4, 8)), hull)).isCloseTo(0.75, within(1e-9));
    }

    @Test
    void aMillionTrianglesAreMeasuredToo() {
        Solid ball = Solid.ofMesh(Shapes.sphere(5, 500));
        assertThat(ball.mesh().triangleCount()).isEqualTo(998_000);
        double half = 2 * Math.PI * 125 / 3;
        assertThat(Overlap.volume(ball, box(-6, 6, -6, 6, -6, 0))).isCloseTo(half, Percentage.withPercentage(0.5));
        assertThat(MeshDefects.of(ball.mesh().tidied())).isEmpty();
    }
}
