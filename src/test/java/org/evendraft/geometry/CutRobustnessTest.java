package org.evendraft.geometry;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Planes in awkward places: in faces, through vertices, along edges, steep, far away; and a very large mesh. */
class CutRobustnessTest {

    private static Assembly of(Solid solid) {
        return new Assembly(List.of(new Assembly.Part(solid, false)));
    }

    private static Assembly steps() {
        return new Assembly(List.of(
                new Assembly.Part(Solid.box(new Vec3(-50, -10, 0), new Vec3(50, 10, 8)), false),
                new Assembly.Part(Solid.box(new Vec3(-6, -6, 8), new Vec3(6, 6, 30)), false),
                new Assembly.Part(
                        Solid.prism(
                                Axis.X,
                                -50,
                                50,
                                List.of(new double[] {20, 0}, new double[] {30, 0}, new double[] {30, 8}, new double[] {
                                    20, 8
                                }),
                                2),
                        false),
                new Assembly.Part(Solid.cylinder(new Vec3(30, 0, 8), new Vec3(30, 0, 20), 8, 8), false)));
    }

    /** What lies in the plane counts as under it: a plane in a deck is the limit from above. */
    @ParameterizedTest
    @ValueSource(doubles = {0, 8, 20, 30})
    void aPlaneInAFlatFaceIsTheLimitFromAbove(double draft) {
        Assembly hull = steps();
        Cut at = hull.below(Plane.ofSlopes(draft, 0, 0));
        Cut above = hull.below(Plane.ofSlopes(draft + 1e-9, 0, 0));
        Cut under = hull.below(Plane.ofSlopes(draft - 1e-9, 0, 0));
        assertThat(at.volume()).isCloseTo(above.volume(), within(1e-5));
        assertThat(at.volume()).isCloseTo(under.volume(), within(1e-5));
        assertThat(at.area()).isCloseTo(above.area(), within(0.05));
        assertThat(at.secondMoments().transverse())
                .isCloseTo(
                        above.secondMoments().transverse(),
                        within(1e-4 * (1 + above.secondMoments().transverse())));
        SecondMethodTest.sameCuts(hull, at.plane(), 2e-5);
    }

    @Test
    void onBothSidesOfADeckTheSectionJumpsAndTheVolumeDoesNot() {
        Assembly hull = steps();
        Cut under = hull.below(Plane.ofSlopes(8 - 1e-9, 0, 0));
        Cut above = hull.below(Plane.ofSlopes(8 + 1e-9, 0, 0));
        assertThat(under.area()).isCloseTo(100 * 20 + 100 * 6, within(0.5));
        assertThat(above.area()).isCloseTo(144 + Math.PI * 16, within(1e-6));
        assertThat(above.volume()).isCloseTo(under.volume(), within(1e-5));
    }

    /** Slopes that carry the plane through vertices and along edges of a box: fast way, triangles and both limits agree. */
    @ParameterizedTest
    @CsvSource({"4, 0, 0.4", "4, 0, -0.4", "4, 0.08, 0", "0, 0.08, 0.4", "4, 0.08, 0.4", "8, 0.16, 0.8", "4, -0.08, 0.4"
    })
    void planesThroughVerticesAndAlongEdgesAreLimitsFromBothSides(double draft, double slopeX, double slopeY) {
        Assembly box = of(Solid.box(new Vec3(-50, -10, 0), new Vec3(50, 10, 8)));
        Plane plane = Plane.ofSlopes(draft, slopeX, slopeY);
        SecondMethodTest.sameCuts(box, plane, 1e-10);
        Cut at = box.below(plane);
        for (double aside : new double[] {-1e-10, 1e-10}) {
            Cut near = box.below(Plane.ofSlopes(draft + aside, slopeX, slopeY));
            assertThat(near.volume()).isCloseTo(at.volume(), within(1e-6));
            assertThat(near.area()).isCloseTo(at.area(), within(1e-5));
            assertThat(near.secondMoments().transverse())
                    .isCloseTo(at.secondMoments().transverse(), within(1e-2));
            assertThat(near.secondMoments().longitudinal())
                    .isCloseTo(at.secondMoments().longitudinal(), within(1e-2));
        }
    }

    /** A box standing on a corner, its body diagonal vertical: the plane half-way up cuts a regular hexagon. */
    @Test
    void aCubeOnItsCornerIsCutInARegularHexagon() {
        double tilt = Math.acos(1 / Math.sqrt(3));
        var turn = Meshes.rotation(new Vec3(1, -1, 0), -tilt);
        Mesh cube =
                Meshes.moved(Solid.box(new Vec3(-1, -1, -1), new Vec3(1, 1, 1)).mesh(), turn);
        Cut cut = of(Solid.ofMesh(cube)).below(Plane.ofSlopes(0, 0, 0));
        assertThat(cut.volume()).isCloseTo(4, within(1e-12));
        // Side √2: area 3√3·s²/2, second moments 5√3·s⁴/16 about any axis.
        assertThat(cut.area()).isCloseTo(3 * Math.sqrt(3), within(1e-12));
        assertThat(cut.secondMoments().transverse()).isCloseTo(5 * Math.sqrt(3) / 4, within(1e-12));
        assertThat(cut.secondMoments().longitudinal()).isCloseTo(5 * Math.sqrt(3) / 4, within(1e-12));
        assertThat(cut.secondMoments().product()).isCloseTo(0, within(1e-12));
    }

    /** Half of any centrally symmetric body lies under any plane through its centre, 59° steep as well. */
    @ParameterizedTest
    @CsvSource({"59, 0", "0, 59", "-59, 0", "45, 45"})
    void steepPlanesThroughTheCentreHalveSymmetricBodies(double heel, double trim) {
        double slopeX = Math.tan(Math.toRadians(trim));
        double slopeY = Math.tan(Math.toRadians(heel));
        for (Solid solid : List.of(
                Solid.box(new Vec3(-30, -8, -4), new Vec3(30, 8, 4)),
                Solid.cylinder(new Vec3(0, 0, -20), new Vec3(0, 0, 20), 10, 10),
                Solid.cylinder(new Vec3(-3, 5, -1), new Vec3(3, -5, 1), 2, 2))) {
            Cut cut = of(solid).below(Plane.ofSlopes(0, slopeX, slopeY));
            assertThat(cut.volume()).isCloseTo(solid.volume() / 2, within(1e-11 * solid.volume()));
            SecondMethodTest.sameCuts(of(solid), cut.plane(), 2e-5);
        }
    }

    /** A chest of 10 cm, 120 m from the origin: rounding grows with the cube of 120 m over 10 cm and stays inside the bound of 1e-4. */
    @Test
    void aTinyBodyFarFromTheOriginKeepsItsFigures() {
        Assembly box = of(Solid.box(new Vec3(120, -40, 30), new Vec3(120.1, -39.9, 30.1)));
        Cut cut = box.belowByTriangles(Plane.ofSlopes(30.05, 0, 0));
        assertThat(box.volume()).isCloseTo(1e-3, within(1e-12));
        assertThat(cut.volume()).isCloseTo(5e-4, within(1e-11));
        assertThat(cut.centroid().minus(new Vec3(120.05, -39.95, 30.025)).norm())
                .isLessThan(1e-6);
        double inertia = Math.pow(0.1, 4) / 12;
        assertThat(cut.secondMoments().transverse()).isCloseTo(inertia, within(1e-4 * inertia));
        assertThat(cut.secondMoments().longitudinal()).isCloseTo(inertia, within(1e-4 * inertia));
        Cut held = box.holding(5e-4, 0.1, -0.1, Double.NaN);
        assertThat(held.volume()).isCloseTo(5e-4, within(1e-11));
    }

    /** Two million triangles, cut and searched for a volume; figures of a sphere. */
    @Test
    void aMeshOfMillionsOfTrianglesIsCut() {
        Assembly sphere = of(Solid.ofMesh(Meshes.sphere(10, new Vec3(0, 0, 10), 9)));
        assertThat(sphere.parts().get(0).solid().mesh().triangleCount()).isGreaterThan(2_000_000);
        Cut cut = sphere.holding(904.778684, 0.1, 0.2, Double.NaN);
        double height = cut.plane().height(new Vec3(0, 0, 10));
        assertThat(height).isCloseTo(4, within(1e-4));
        assertThat(cut.area()).isCloseTo(263.893783, within(0.02));
    }
}
