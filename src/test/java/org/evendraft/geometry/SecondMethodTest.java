package org.evendraft.geometry;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Random;
import org.apache.commons.math3.geometry.Point;
import org.apache.commons.math3.geometry.euclidean.threed.Euclidean3D;
import org.apache.commons.math3.geometry.euclidean.threed.PolyhedronsSet;
import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;
import org.apache.commons.math3.geometry.partitioning.BSPTree;
import org.apache.commons.math3.geometry.partitioning.Region;
import org.apache.commons.math3.geometry.partitioning.RegionFactory;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Convex polyhedra under inclined planes, computed a second time: volume and centroid by the binary space partitions of Apache
 * Commons Math 3.6.1, the section as the hull of the points where edges pierce the plane, integrated by the midpoint rule on a fan
 * of triangles (exact for second degree).
 */
class SecondMethodTest {
    private static final double TIE = 1e-10;

    record Case(int seed, Mesh mesh, Plane plane) {
        @Override
        public String toString() {
            return "seed " + seed;
        }
    }

    static List<Case> cases() {
        List<Case> cases = new ArrayList<>();
        for (int seed = 0; seed < 40; seed++) {
            Random random = new Random(seed);
            Vec3 centre = new Vec3(30 * random.nextGaussian(), 30 * random.nextGaussian(), 10 * random.nextGaussian());
            Mesh mesh = seed % 4 == 0
                    ? tiltedBox(random, centre)
                    : Meshes.convex(random, 5 + seed % 9, 3 + 5 * random.nextDouble(), centre);
            double slopeX = 0.8 * random.nextGaussian();
            double slopeY = 0.8 * random.nextGaussian();
            double through = centre.z() - slopeX * centre.x() - slopeY * centre.y() + random.nextGaussian();
            cases.add(new Case(seed, mesh, Plane.ofSlopes(through, slopeX, slopeY)));
        }
        return cases;
    }

    private static Mesh tiltedBox(Random random, Vec3 centre) {
        Vec3 half = new Vec3(1, 1, 1)
                .plus(new Vec3(random.nextDouble(), random.nextDouble(), random.nextDouble()).times(4));
        Vec3 direction = new Vec3(random.nextGaussian(), random.nextGaussian(), random.nextGaussian());
        var turn = Meshes.rotation(direction, 2 * Math.PI * random.nextDouble());
        return Meshes.moved(
                Solid.box(half.times(-1), half).mesh(), v -> turn.apply(v).plus(centre));
    }

    private static Vector3D vector(Vec3 v) {
        return new Vector3D(v.x(), v.y(), v.z());
    }

    /** The mesh's faces cut down one after another from the half-space under the plane. */
    private static Region<Euclidean3D> underPlane(Mesh mesh, Plane plane) {
        RegionFactory<Euclidean3D> factory = new RegionFactory<>();
        Region<Euclidean3D> region = halfSpace(vector(plane.origin()), vector(plane.normal()));
        for (int i = 0; i < mesh.triangleCount(); i++) {
            Vec3 a = mesh.vertex(mesh.corner(i, 0));
            Vec3 normal = mesh.vertex(mesh.corner(i, 1))
                    .minus(a)
                    .cross(mesh.vertex(mesh.corner(i, 2)).minus(a));
            region = factory.intersection(region, halfSpace(vector(a), vector(normal)));
        }
        return region;
    }

    private static Region<Euclidean3D> halfSpace(Vector3D point, Vector3D outward) {
        var face = new org.apache.commons.math3.geometry.euclidean.threed.Plane(point, outward, TIE).wholeHyperplane();
        BSPTree<Euclidean3D> inside = new BSPTree<>(true);
        BSPTree<Euclidean3D> outside = new BSPTree<>(false);
        return new PolyhedronsSet(new BSPTree<>(face, outside, inside, null), TIE);
    }

    @ParameterizedTest
    @MethodSource("cases")
    void volumeAndCentroidEqualThoseOfSpacePartitioning(Case c) {
        Region<Euclidean3D> region = underPlane(c.mesh, c.plane);
        Cut cut = new Assembly(List.of(new Assembly.Part(Solid.ofMesh(c.mesh), false))).below(c.plane);
        assertThat(cut.volume()).isCloseTo(region.getSize(), within(1e-8 * (1 + region.getSize())));
        if (cut.volume() > 1e-3) {
            Point<Euclidean3D> centroid = region.getBarycenter();
            Vector3D off = vector(cut.centroid()).subtract((Vector3D) centroid);
            assertThat(off.getNorm()).isLessThan(1e-6);
        }
    }

    @ParameterizedTest
    @MethodSource("cases")
    void sectionEqualsThatOfThePiercedEdges(Case c) {
        List<double[]> polygon = piercings(c.mesh, c.plane);
        double[] expected = fan(polygon);
        Cut cut = new Assembly(List.of(new Assembly.Part(Solid.ofMesh(c.mesh), false))).below(c.plane);
        assertThat(cut.area()).isCloseTo(expected[0], within(1e-9 * (1 + expected[0])));
        if (expected[0] > 1e-3) {
            Vec3 centre = cut.sectionCentroid().minus(c.plane.origin());
            assertThat(centre.dot(c.plane.first())).isCloseTo(expected[1], within(1e-8));
            assertThat(centre.dot(c.plane.second())).isCloseTo(expected[2], within(1e-8));
            SecondMoments own = cut.secondMoments();
            double scale = own.transverse() + own.longitudinal();
            assertThat(own.longitudinal()).isCloseTo(expected[3], within(1e-8 * scale));
            assertThat(own.transverse()).isCloseTo(expected[4], within(1e-8 * scale));
            assertThat(own.product()).isCloseTo(expected[5], within(1e-8 * scale));
        }
    }

    /** Points (u, v) of a convex section, ordered around their mean. */
    private static List<double[]> piercings(Mesh mesh, Plane plane) {
        List<double[]> points = new ArrayList<>();
        for (int i = 0; i < 3 * mesh.triangleCount(); i++) {
            Vec3 a = mesh.vertex(mesh.corner(i / 3, i % 3));
            Vec3 b = mesh.vertex(mesh.corner(i / 3, (i + 1) % 3));
            double ha = plane.height(a);
            double hb = plane.height(b);
            if (ha * hb < 0) {
                Vec3 at = a.plus(b.minus(a).times(ha / (ha - hb))).minus(plane.origin());
                points.add(new double[] {at.dot(plane.first()), at.dot(plane.second())});
            }
        }
        double[] mean = mean(points);
        points.sort(Comparator.comparingDouble(p -> Math.atan2(p[1] - mean[1], p[0] - mean[0])));
        return points;
    }

    private static double[] mean(List<double[]> points) {
        return new double[] {
            points.stream().mapToDouble(p -> p[0]).average().orElse(0),
            points.stream().mapToDouble(p -> p[1]).average().orElse(0)
        };
    }

    /** Area, centroid, ∫u², ∫v², ∫uv about it. */
    private static double[] fan(List<double[]> polygon) {
        double[] m = mean(polygon);
        double[] sums = new double[6];
        for (int i = 0; i < polygon.size(); i++) {
            double[] a = {polygon.get(i)[0] - m[0], polygon.get(i)[1] - m[1]};
            double[] b = polygon.get((i + 1) % polygon.size());
            b = new double[] {b[0] - m[0], b[1] - m[1]};
            double third = (a[0] * b[1] - a[1] * b[0]) / 6;
            double[][] middles = {{a[0] / 2, a[1] / 2}, {b[0] / 2, b[1] / 2}, {(a[0] + b[0]) / 2, (a[1] + b[1]) / 2}};
            for (double[] p : middles) {
                double[] f = {1, p[0], p[1], p[0] * p[0], p[1] * p[1], p[0] * p[1]};
                for (int k = 0; k < 6; k++) {
                    sums[k] += third * f[k];
                }
            }
        }
        if (sums[0] == 0) {
            return sums;
        }
        double u = sums[1] / sums[0];
        double v = sums[2] / sums[0];
        return new double[] {
            sums[0], u + m[0], v + m[1], sums[3] - u * u * sums[0], sums[4] - v * v * sums[0], sums[5] - u * v * sums[0]
        };
    }

    /** Every shape the documents know, one of each, and a cut-out. */
    static Assembly everyShape() {
        List<double[]> hexagon = List.of(
                new double[] {20, -6},
                new double[] {30, -8},
                new double[] {36, 0},
                new double[] {30, 4},
                new double[] {26, 1},
                new double[] {22, 4});
        return new Assembly(List.of(
                new Assembly.Part(Solid.box(new Vec3(-40, 10, 0), new Vec3(40, 22, 8)), false),
                new Assembly.Part(Solid.box(new Vec3(-5, 14, 0), new Vec3(5, 18, 8)), true),
                new Assembly.Part(Solid.cylinder(new Vec3(-20, -20, 0), new Vec3(-20, -20, 30), 12, 12), false),
                new Assembly.Part(Solid.cylinder(new Vec3(10, -20, 0), new Vec3(12, -22, 25), 14, 6), false),
                new Assembly.Part(Solid.cylinder(new Vec3(-18, 0, 2), new Vec3(15, 5, 25), 3, 3), false),
                new Assembly.Part(Solid.prism(Axis.Z, 8, 30, hexagon, 0.8), false),
                new Assembly.Part(
                        Solid.prism(
                                Axis.Y,
                                -9,
                                9,
                                List.of(
                                        new double[] {-40, 0},
                                        new double[] {-25, 0},
                                        new double[] {-25, 9},
                                        new double[] {-40, 9}),
                                2),
                        false),
                new Assembly.Part(Solid.prism(Axis.X, 40, 55, hexagon, 0), false)));
    }

    static List<Plane> planes() {
        List<Plane> planes = new ArrayList<>();
        Random random = new Random(7);
        for (int i = 0; i < 60; i++) {
            double steep = i % 3 == 0 ? 0.01 : i % 3 == 1 ? 0.2 : 1.5;
            planes.add(Plane.ofSlopes(
                    30 * random.nextDouble(),
                    steep * (2 * random.nextDouble() - 1),
                    steep * (2 * random.nextDouble() - 1)));
        }
        return planes;
    }

    /** Numbers in {@link #everyShape()} of the bodies with curves, which the fast way integrates as such and the triangles only nearly. */
    private static final List<Integer> CURVED = List.of(2, 4, 5, 6);

    private static final double TESSELLATED = 2e-5;
    private static final double FLAT = 1e-10;

    @ParameterizedTest
    @MethodSource("planes")
    void theFastWayEqualsClippingEveryTriangle(Plane plane) {
        Assembly all = everyShape();
        for (int i = 0; i < all.parts().size(); i++) {
            double part = CURVED.contains(i) ? TESSELLATED : FLAT;
            sameCuts(new Assembly(List.of(all.parts().get(i))), plane, part);
        }
        sameCuts(all, plane, TESSELLATED);
    }

    /** Fast way and triangles agree to a part of the whole volume and of the section's area at a body's length. */
    static void sameCuts(Assembly assembly, Plane plane, double part) {
        Cut fast = assembly.below(plane);
        Cut slow = assembly.belowByTriangles(plane);
        double whole = Math.abs(assembly.volume());
        double length = 100;
        double area = Math.abs(slow.area()) + 1;
        assertThat(fast.volume()).isCloseTo(slow.volume(), within(part * whole));
        assertThat(fast.moment().minus(slow.moment()).norm()).isLessThan(part * whole * length);
        assertThat(fast.area()).isCloseTo(slow.area(), within(part * area));
        assertThat(fast.sectionCentroid().minus(slow.sectionCentroid()).norm() * Math.abs(slow.area()))
                .isLessThan(part * length * area);
        double scale = part * length * length * area;
        SecondMoments a = fast.secondMoments();
        SecondMoments b = slow.secondMoments();
        assertThat(a.transverse()).isCloseTo(b.transverse(), within(scale));
        assertThat(a.longitudinal()).isCloseTo(b.longitudinal(), within(scale));
        assertThat(a.product()).isCloseTo(b.product(), within(scale));
    }
}
