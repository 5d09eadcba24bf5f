package org.evendraft.geometry;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

/**
 * What keeps a mesh from bounding a body: numbers that are not finite, triangles without area, holes, neighbours that face opposite
 * ways, normals that point inward. Each in a sentence that tells where.
 */
public final class MeshDefects {
    /** A triangle whose height is under this part of its longest edge has no area. */
    private static final double FLAT = 1e-12;

    /** A mesh that winds twice, or the wrong way, round this part of its volume is no surface of a body. */
    private static final double FOLDED = 1e-4;

    private static final int MOST_NAMED = 3;

    private MeshDefects() {}

    /**
     * All defects of a mesh, none for a sound one.
     *
     * @param mesh vertices at one place must be one vertex, see {@link Mesh#tidied}
     */
    public static List<String> of(Mesh mesh) {
        if (!isFinite(mesh)) {
            return List.of("a vertex of the mesh has a coordinate that is not a finite number");
        }
        List<String> defects = new ArrayList<>();
        flatTriangles(mesh).ifPresent(defects::add);
        edges(mesh).ifPresent(defects::add);
        if (defects.isEmpty()) {
            orientation(Solid.ofMesh(mesh)).ifPresent(defects::add);
        }
        return defects;
    }

    private static Optional<String> orientation(Solid solid) {
        double volume = solid.volume();
        if (volume < 0) {
            return Optional.of("the mesh is inside out: its normals point inward");
        }
        if (!(volume > 0)) {
            return Optional.of("the mesh bounds no volume");
        }
        double folded = Overlap.folded(solid);
        return folded <= FOLDED * volume
                ? Optional.empty()
                : Optional.of(String.format(
                        Locale.ROOT, "the mesh crosses itself or is partly inside out: about %.3g m³ of it", folded));
    }

    private static boolean isFinite(Mesh mesh) {
        return Arrays.stream(mesh.rawCoordinates()).allMatch(Double::isFinite);
    }

    private static Optional<String> flatTriangles(Mesh mesh) {
        int count = 0;
        StringBuilder first = new StringBuilder();
        for (int i = 0; i < mesh.triangleCount(); i++) {
            if (isFlat(mesh, i)) {
                count++;
                if (count <= MOST_NAMED) {
                    first.append(count == 1 ? "" : ", ").append(i);
                }
            }
        }
        return switch (count) {
            case 0 -> Optional.empty();
            case 1 -> Optional.of("triangle " + first + " has no area");
            default ->
                Optional.of(count + " triangles have no area: " + first + (count > MOST_NAMED ? " and others" : ""));
        };
    }

    private static boolean isFlat(Mesh mesh, int i) {
        return isFlat(mesh.vertex(mesh.corner(i, 0)), mesh.vertex(mesh.corner(i, 1)), mesh.vertex(mesh.corner(i, 2)));
    }

    /** Whether three points bound no area. */
    static boolean isFlat(Vec3 a, Vec3 b, Vec3 c) {
        Vec3 ab = b.minus(a);
        Vec3 ac = c.minus(a);
        double longest = Math.max(ab.norm(), Math.max(ac.norm(), ac.minus(ab).norm()));
        return ab.cross(ac).norm() <= FLAT * longest * longest;
    }

    /** Each edge must be passed as often in one direction as in the other. */
    private static Optional<String> edges(Mesh mesh) {
        long[] keys = sortedEdges(mesh);
        int single = 0;
        int unequal = 0;
        long where = 0;
        for (int i = 0; i < keys.length; ) {
            long edge = keys[i] >>> 1;
            int count = 0;
            int balance = 0;
            for (; i < keys.length && keys[i] >>> 1 == edge; i++) {
                count++;
                balance += (keys[i] & 1) == 0 ? 1 : -1;
            }
            if (balance != 0) {
                where = single + unequal == 0 ? edge : where;
                single += count % 2;
                unequal += 1 - count % 2;
            }
        }
        return single + unequal == 0 ? Optional.empty() : Optional.of(sentence(mesh, single, unequal, where));
    }

    private static String sentence(Mesh mesh, int single, int unequal, long edge) {
        Vec3 middle = mesh.vertex((int) (edge >>> 31))
                .plus(mesh.vertex((int) (edge & Integer.MAX_VALUE)))
                .times(0.5);
        String near = String.format(Locale.ROOT, " near (%.3f, %.3f, %.3f)", middle.x(), middle.y(), middle.z());
        if (single > 0) {
            String edges = single == 1 ? "1 edge lacks" : single + " edges lack";
            return edges + " a triangle on one side: the mesh has a hole" + near;
        }
        return unequal + (unequal == 1 ? " edge lies" : " edges lie")
                + " between triangles that face opposite ways: the mesh is partly inside out" + near;
    }

    /** An edge as lesser vertex, greater vertex (31 bits each) and direction (1 bit), sorted. */
    private static long[] sortedEdges(Mesh mesh) {
        int[] corners = mesh.rawCorners();
        long[] keys = new long[corners.length];
        for (int i = 0; i < corners.length; i++) {
            int from = corners[i];
            int to = corners[i % 3 == 2 ? i - 2 : i + 1];
            long pair = (long) Math.min(from, to) << 31 | Math.max(from, to);
            keys[i] = pair << 1 | (from < to ? 0 : 1);
        }
        Arrays.parallelSort(keys);
        return keys;
    }
}
