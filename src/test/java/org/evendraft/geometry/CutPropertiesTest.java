package org.evendraft.geometry;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import java.util.function.UnaryOperator;
import net.jqwik.api.Example;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.ShrinkingMode;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.IntRange;

/** Laws that every cut of every body obeys, whatever the formulas. */
class CutPropertiesTest {
    private static final double STEEPEST = 1.7;

    private static Assembly of(Solid... solids) {
        List<Assembly.Part> parts = new ArrayList<>();
        for (Solid solid : solids) {
            parts.add(new Assembly.Part(solid, false));
        }
        return new Assembly(parts);
    }

    private static Mesh anyBody(int seed) {
        Random random = new Random(seed);
        Vec3 centre = new Vec3(20 * random.nextGaussian(), 20 * random.nextGaussian(), 5 * random.nextGaussian());
        double size = 2 + 8 * random.nextDouble();
        return switch (seed % 3) {
            case 0 -> Meshes.convex(random, 4 + seed % 8, size, centre);
            case 1 ->
                Meshes.moved(
                        Solid.cylinder(Vec3.ZERO, new Vec3(1, 2, 3), 2, seed % 2)
                                .mesh(),
                        v -> v.times(size).plus(centre));
            default ->
                Meshes.moved(
                        SecondMethodTest.everyShape().parts().get(5).solid().mesh(), v -> v.plus(centre));
        };
    }

    private static Plane through(Solid solid, double part, double slopeX, double slopeY) {
        Assembly alone = of(solid);
        return alone.holding(part * alone.volume(), slopeX, slopeY, Double.NaN).plane();
    }

    @Property(tries = 100, seed = "31", shrinking = ShrinkingMode.OFF)
    void addingBodiesAddsTheirIntegrals(
            @ForAll @IntRange(max = 10_000) int seed,
            @ForAll @DoubleRange(min = 0.01, max = 0.99) double part,
            @ForAll @DoubleRange(min = -STEEPEST, max = STEEPEST) double slopeX,
            @ForAll @DoubleRange(min = -STEEPEST, max = STEEPEST) double slopeY) {
        Solid a = Solid.ofMesh(anyBody(seed));
        Solid b = Solid.ofMesh(anyBody(seed + 1));
        Plane plane = through(a, part, slopeX, slopeY);
        Cut of = of(a).below(plane);
        Cut other = of(b).below(plane);
        Cut both = of(a, b).below(plane);
        Cut without = new Assembly(List.of(new Assembly.Part(a, false), new Assembly.Part(b, true))).below(plane);
        double scale = a.volume() + b.volume();
        assertThat(both.volume()).isCloseTo(of.volume() + other.volume(), within(1e-12 * scale));
        assertThat(without.volume()).isCloseTo(of.volume() - other.volume(), within(1e-12 * scale));
        assertThat(both.moment().minus(of.moment()).minus(other.moment()).norm())
                .isLessThan(1e-10 * scale);
        assertThat(both.area()).isCloseTo(of.area() + other.area(), within(1e-10 * (1 + both.area())));
    }

    @Property(tries = 100, seed = "32", shrinking = ShrinkingMode.OFF)
    void movingABodyWithThePlaneMovesEveryCentroid(
            @ForAll @IntRange(max = 10_000) int seed,
            @ForAll @DoubleRange(min = 0.05, max = 0.95) double part,
            @ForAll @DoubleRange(min = -1, max = 1) double slopeX,
            @ForAll @DoubleRange(min = -1, max = 1) double slopeY,
            @ForAll @DoubleRange(min = -50, max = 50) double dx,
            @ForAll @DoubleRange(min = -50, max = 50) double dy,
            @ForAll @DoubleRange(min = -50, max = 50) double dz) {
        Mesh mesh = anyBody(seed);
        Vec3 move = new Vec3(dx, dy, dz);
        Solid moved = Solid.ofMesh(Meshes.moved(mesh, v -> v.plus(move)));
        Plane plane = through(Solid.ofMesh(mesh), part, slopeX, slopeY);
        Plane shifted = Plane.ofSlopes(plane.origin().z() + dz - slopeX * dx - slopeY * dy, slopeX, slopeY);
        Cut before = of(Solid.ofMesh(mesh)).below(plane);
        Cut after = of(moved).below(shifted);
        assertThat(after.volume()).isCloseTo(before.volume(), within(1e-10 * moved.volume()));
        assertThat(after.centroid().minus(before.centroid()).minus(move).norm()).isLessThan(1e-8);
        assertThat(after.sectionCentroid()
                        .minus(before.sectionCentroid())
                        .minus(move)
                        .norm())
                .isLessThan(1e-7);
        assertSameMoments(after.secondMoments(), before.secondMoments(), 1e-8);
    }

    /** The part under a plane and the part over it, found by turning body and plane upside down, make the whole. */
    @Property(tries = 100, seed = "33", shrinking = ShrinkingMode.OFF)
    void immersedAndDryPartMakeTheWhole(
            @ForAll @IntRange(max = 10_000) int seed,
            @ForAll @DoubleRange(min = 0.01, max = 0.99) double part,
            @ForAll @DoubleRange(min = -STEEPEST, max = STEEPEST) double slopeX,
            @ForAll @DoubleRange(min = -STEEPEST, max = STEEPEST) double slopeY) {
        Mesh mesh = anyBody(seed);
        Solid whole = Solid.ofMesh(mesh);
        UnaryOperator<Vec3> flip = v -> new Vec3(v.x(), -v.y(), -v.z());
        Plane plane = through(whole, part, slopeX, slopeY);
        Cut wet = of(whole).below(plane);
        Cut dry = of(Solid.ofMesh(Meshes.moved(mesh, flip)))
                .below(Plane.ofSlopes(-plane.origin().z(), -slopeX, slopeY));
        assertThat(wet.volume() + dry.volume()).isCloseTo(whole.volume(), within(1e-10 * whole.volume()));
        Vec3 moments = wet.moment().plus(flip.apply(dry.moment()));
        assertThat(moments.minus(whole.centroid().times(whole.volume())).norm()).isLessThan(1e-8 * whole.volume());
        assertThat(dry.area()).isCloseTo(wet.area(), within(1e-10 * (1 + wet.area())));
    }

    @Property(tries = 100, seed = "34", shrinking = ShrinkingMode.OFF)
    void turningBodyAndPlaneAboutTheVerticalTurnsTheSecondMoments(
            @ForAll @IntRange(max = 10_000) int seed,
            @ForAll @DoubleRange(min = 0.05, max = 0.95) double part,
            @ForAll @DoubleRange(min = -1, max = 1) double slopeX,
            @ForAll @DoubleRange(min = -1, max = 1) double slopeY,
            @ForAll @DoubleRange(min = -3.1, max = 3.1) double angle) {
        Mesh mesh = anyBody(seed);
        UnaryOperator<Vec3> turn = Meshes.rotation(new Vec3(0, 0, 1), angle);
        Plane plane = through(Solid.ofMesh(mesh), part, slopeX, slopeY);
        Vec3 slope = turn.apply(new Vec3(slopeX, slopeY, 0));
        Cut before = of(Solid.ofMesh(mesh)).below(plane);
        Cut after = of(Solid.ofMesh(Meshes.moved(mesh, turn)))
                .below(Plane.ofSlopes(plane.origin().z(), slope.x(), slope.y()));
        assertThat(after.volume()).isCloseTo(before.volume(), within(1e-10 * (1 + before.volume())));
        assertThat(after.centroid().minus(turn.apply(before.centroid())).norm()).isLessThan(1e-8);
        SecondMoments m = before.projectedSecondMoments();
        double c = Math.cos(angle);
        double s = Math.sin(angle);
        // Rotation of axes: x' = c·x − s·y, y' = s·x + c·y.
        SecondMoments turned = new SecondMoments(
                s * s * m.longitudinal() + 2 * s * c * m.product() + c * c * m.transverse(),
                c * c * m.longitudinal() - 2 * s * c * m.product() + s * s * m.transverse(),
                s * c * (m.longitudinal() - m.transverse()) + (c * c - s * s) * m.product());
        assertSameMoments(after.projectedSecondMoments(), turned, 1e-8);
    }

    /** However body and plane are turned together in space, volume, area and the section's principal moments stay. */
    @Property(tries = 100, seed = "35", shrinking = ShrinkingMode.OFF)
    void turningBodyAndPlaneInSpaceChangesNothingButDirections(
            @ForAll @IntRange(max = 10_000) int seed,
            @ForAll @DoubleRange(min = 0.05, max = 0.95) double part,
            @ForAll @DoubleRange(min = -0.3, max = 0.3) double slopeX,
            @ForAll @DoubleRange(min = -0.3, max = 0.3) double slopeY,
            @ForAll @DoubleRange(min = -0.9, max = 0.9) double angle) {
        Mesh mesh = anyBody(seed);
        Random random = new Random(seed);
        UnaryOperator<Vec3> turn =
                Meshes.rotation(new Vec3(random.nextGaussian(), random.nextGaussian(), random.nextGaussian()), angle);
        Plane plane = through(Solid.ofMesh(mesh), part, slopeX, slopeY);
        Vec3 n = turn.apply(plane.normal());
        Vec3 at = turn.apply(plane.origin());
        Plane turned = Plane.ofSlopes(at.dot(n) / n.z(), -n.x() / n.z(), -n.y() / n.z());
        Cut before = of(Solid.ofMesh(mesh)).below(plane);
        Cut after = of(Solid.ofMesh(Meshes.moved(mesh, turn))).below(turned);
        assertThat(after.volume()).isCloseTo(before.volume(), within(1e-9 * (1 + before.volume())));
        assertThat(after.centroid().minus(turn.apply(before.centroid())).norm()).isLessThan(1e-7);
        assertThat(after.area()).isCloseTo(before.area(), within(1e-9 * (1 + before.area())));
        SecondMoments a = after.secondMoments();
        SecondMoments b = before.secondMoments();
        double trace = b.transverse() + b.longitudinal();
        assertThat(a.transverse() + a.longitudinal()).isCloseTo(trace, within(1e-8 * trace));
        assertThat(determinant(a)).isCloseTo(determinant(b), within(1e-8 * trace * trace));
    }

    @Property(tries = 200, seed = "36", shrinking = ShrinkingMode.OFF)
    void secondMomentsArePositiveSemidefinite(
            @ForAll @IntRange(max = 10_000) int seed,
            @ForAll @DoubleRange(min = 0.01, max = 0.99) double part,
            @ForAll @DoubleRange(min = -STEEPEST, max = STEEPEST) double slopeX,
            @ForAll @DoubleRange(min = -STEEPEST, max = STEEPEST) double slopeY) {
        Solid solid = Solid.ofMesh(anyBody(seed));
        Cut cut = of(solid).below(through(solid, part, slopeX, slopeY));
        for (SecondMoments m : List.of(cut.secondMoments(), cut.projectedSecondMoments())) {
            assertThat(m.transverse()).isPositive();
            assertThat(m.longitudinal()).isPositive();
            assertThat(determinant(m)).isGreaterThan(0);
        }
    }

    /** The volume asked for comes back whatever the slopes, within 1e-12 of the whole. */
    @Property(tries = 400, seed = "37", shrinking = ShrinkingMode.OFF)
    void thePlaneHoldingAVolumeHoldsIt(
            @ForAll @DoubleRange(min = 0, max = 1) double part,
            @ForAll @DoubleRange(min = -STEEPEST, max = STEEPEST) double slopeX,
            @ForAll @DoubleRange(min = -STEEPEST, max = STEEPEST) double slopeY,
            @ForAll @DoubleRange(min = -100, max = 100) double guess) {
        Assembly all = SecondMethodTest.everyShape();
        double target = part * all.volume();
        for (double from : new double[] {guess, Double.NaN}) {
            Cut cut = all.holding(target, slopeX, slopeY, from);
            assertThat(cut.volume()).isCloseTo(target, within(1e-12 * all.volume()));
            assertThat(all.below(cut.plane()).volume()).isEqualTo(cut.volume());
        }
    }

    @Example
    void aVolumeOutsideTheBodyIsRefused() {
        Assembly box = of(Solid.box(Vec3.ZERO, new Vec3(1, 1, 1)));
        for (double volume : new double[] {-1e-9, 1 + 1e-9, Double.NaN}) {
            assertThatThrownBy(() -> box.holding(volume, 0, 0, Double.NaN))
                    .isInstanceOf(IllegalArgumentException.class);
        }
        assertThat(box.holding(1, 0.3, 0.2, Double.NaN).volume()).isCloseTo(1, within(1e-12));
        assertThat(box.holding(0, 0.3, 0.2, Double.NaN).volume()).isCloseTo(0, within(1e-12));
    }

    private static double determinant(SecondMoments m) {
        return m.transverse() * m.longitudinal() - m.product() * m.product();
    }

    private static void assertSameMoments(SecondMoments a, SecondMoments b, double part) {
        double scale = part * (b.transverse() + b.longitudinal());
        assertThat(a.transverse()).isCloseTo(b.transverse(), within(scale));
        assertThat(a.longitudinal()).isCloseTo(b.longitudinal(), within(scale));
        assertThat(a.product()).isCloseTo(b.product(), within(scale));
    }
}
