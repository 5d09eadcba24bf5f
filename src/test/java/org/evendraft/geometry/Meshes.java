package org.evendraft.geometry;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.function.UnaryOperator;

/** Closed meshes for tests, made without the shapes of the engine. */
public final class Meshes {
    private Meshes() {}

    /** The mesh of points and triangles. */
    public static Mesh of(List<Vec3> points, List<int[]> triangles) {
        double[] xyz = points.stream()
                .flatMap(p -> List.of(p.x(), p.y(), p.z()).stream())
                .mapToDouble(Double::doubleValue)
                .toArray();
        int[] corners = triangles.stream().flatMapToInt(Arrays::stream).toArray();
        return new Mesh(xyz, corners);
    }

    /** The same triangles with every vertex moved. */
    public static Mesh moved(Mesh mesh, UnaryOperator<Vec3> move) {
        List<Vec3> points = new ArrayList<>();
        for (int i = 0; i < mesh.vertexCount(); i++) {
            points.add(move.apply(mesh.vertex(i)));
        }
        List<int[]> triangles = new ArrayList<>();
        for (int i = 0; i < mesh.triangleCount(); i++) {
            triangles.add(new int[] {mesh.corner(i, 0), mesh.corner(i, 1), mesh.corner(i, 2)});
        }
        return of(points, triangles);
    }

    /** A rotation by an angle about a direction through the origin (Rodrigues' formula). */
    public static UnaryOperator<Vec3> rotation(Vec3 direction, double angle) {
        Vec3 k = direction.unit();
        double c = Math.cos(angle);
        double s = Math.sin(angle);
        return v -> v.times(c).plus(k.cross(v).times(s)).plus(k.times(k.dot(v) * (1 - c)));
    }

    /** An octahedron whose faces are divided in four again and again, its vertices on a sphere. */
    public static Mesh sphere(double radius, Vec3 centre, int divisions) {
        List<Vec3> points = new ArrayList<>(List.of(
                new Vec3(1, 0, 0),
                new Vec3(0, 1, 0),
                new Vec3(-1, 0, 0),
                new Vec3(0, -1, 0),
                new Vec3(0, 0, 1),
                new Vec3(0, 0, -1)));
        List<int[]> faces = new ArrayList<>();
        for (int i = 0; i < 4; i++) {
            int j = (i + 1) % 4;
            faces.add(new int[] {i, j, 4});
            faces.add(new int[] {j, i, 5});
        }
        for (int k = 0; k < divisions; k++) {
            faces = divided(points, faces);
        }
        return of(points.stream().map(p -> p.times(radius).plus(centre)).toList(), faces);
    }

    private static List<int[]> divided(List<Vec3> points, List<int[]> faces) {
        Map<Long, Integer> middles = new HashMap<>();
        List<int[]> finer = new ArrayList<>();
        for (int[] f : faces) {
            int ab = middle(points, middles, f[0], f[1]);
            int bc = middle(points, middles, f[1], f[2]);
            int ca = middle(points, middles, f[2], f[0]);
            finer.add(new int[] {f[0], ab, ca});
            finer.add(new int[] {ab, f[1], bc});
            finer.add(new int[] {ca, bc, f[2]});
            finer.add(new int[] {ab, bc, ca});
        }
        return finer;
    }

    private static int middle(List<Vec3> points, Map<Long, Integer> middles, int a, int b) {
        long edge = (long) Math.min(a, b) << 32 | Math.max(a, b);
        return middles.computeIfAbsent(edge, e -> {
            points.add(points.get(a).plus(points.get(b)).unit());
            return points.size() - 1;
        });
    }

    /** The convex hull of random points near a sphere: every triple of points with all others on one side is a face. */
    public static Mesh convex(Random random, int count, double size, Vec3 centre) {
        List<Vec3> points = new ArrayList<>();
        for (int i = 0; i < count; i++) {
            Vec3 direction = new Vec3(random.nextGaussian(), random.nextGaussian(), random.nextGaussian()).unit();
            points.add(direction.times(size * (0.9 + 0.2 * random.nextDouble())).plus(centre));
        }
        List<int[]> faces = new ArrayList<>();
        for (int a = 0; a < count; a++) {
            for (int b = 0; b < count; b++) {
                for (int c = 0; c < count; c++) {
                    if (a < b && a < c && b != c && isFace(points, a, b, c)) {
                        faces.add(new int[] {a, b, c});
                    }
                }
            }
        }
        return of(points, faces);
    }

    private static boolean isFace(List<Vec3> points, int a, int b, int c) {
        Vec3 at = points.get(a);
        Vec3 normal = points.get(b).minus(at).cross(points.get(c).minus(at));
        return points.stream().allMatch(p -> normal.dot(p.minus(at)) <= 1e-12 * normal.norm());
    }

    /**
     * The Wigley hull {@code y = ±B/2·(1 − (2x/L)²)(1 − ((T − z)/T)²)} from the keel to the draft T, with vertical sides over it.
     *
     * @param along number of panels along the length
     * @param up number of panels from keel to waterline
     */
    public static Mesh wigley(double length, double breadth, double draft, double freeboard, int along, int up) {
        List<Vec3> points = new ArrayList<>();
        for (int side : new int[] {1, -1}) {
            for (int i = 0; i <= along; i++) {
                double x = length * ((double) i / along - 0.5);
                for (int j = 0; j <= up + 1; j++) {
                    double z = j <= up ? draft * j / up : draft + freeboard;
                    double under = Math.max(0, draft - z) / draft;
                    double y = breadth / 2 * (1 - 4 * x * x / (length * length)) * (1 - under * under);
                    points.add(new Vec3(x, side * y, z));
                }
            }
        }
        List<int[]> faces = new ArrayList<>();
        int rows = up + 2;
        int starboard = (along + 1) * rows;
        for (int i = 0; i < along; i++) {
            for (int j = 0; j < rows - 1; j++) {
                int p = i * rows + j;
                quad(faces, p + rows, p, p + 1, p + rows + 1);
                quad(faces, starboard + p, starboard + p + rows, starboard + p + rows + 1, starboard + p + 1);
            }
            int top = i * rows + rows - 1;
            quad(faces, top + rows, top, starboard + top, starboard + top + rows);
        }
        return of(points, faces);
    }

    private static void quad(List<int[]> faces, int a, int b, int c, int d) {
        faces.add(new int[] {a, b, c});
        faces.add(new int[] {a, c, d});
    }
}
