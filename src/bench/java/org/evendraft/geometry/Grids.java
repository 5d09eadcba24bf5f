package org.evendraft.geometry;

import java.util.ArrayList;
import java.util.List;

/** Boxes of many triangles for benchmarks. */
public final class Grids {
    private Grids() {}

    /**
     * The surface of a box's bounds, each face divided into a grid of cells of two triangles.
     *
     * @param cells along each edge
     */
    public static Mesh box(Solid box, int cells) {
        Vec3 a = box.least();
        Vec3 d = box.greatest().minus(a);
        Vec3 x = new Vec3(d.x(), 0, 0);
        Vec3 y = new Vec3(0, d.y(), 0);
        Vec3 z = new Vec3(0, 0, d.z());
        List<Vec3> corners = new ArrayList<>();
        addFace(corners, a, y, x, cells);
        addFace(corners, a, x, z, cells);
        addFace(corners, a, z, y, cells);
        addFace(corners, a.plus(z), x, y, cells);
        addFace(corners, a.plus(y), z, x, cells);
        addFace(corners, a.plus(x), y, z, cells);
        double[] coordinates = corners.stream()
                .flatMap(v -> List.of(v.x(), v.y(), v.z()).stream())
                .mapToDouble(Double::doubleValue)
                .toArray();
        int[] numbers = new int[corners.size()];
        for (int i = 0; i < numbers.length; i++) {
            numbers[i] = i;
        }
        return new Mesh(coordinates, numbers).tidied();
    }

    /** Adds the triangles of a face spanned by two edges, seen anticlockwise from where their vector product points. */
    private static void addFace(List<Vec3> corners, Vec3 at, Vec3 u, Vec3 v, int cells) {
        for (int i = 0; i < cells; i++) {
            for (int k = 0; k < cells; k++) {
                Vec3 a = node(at, u, v, i, k, cells);
                Vec3 c = node(at, u, v, i + 1, k + 1, cells);
                corners.addAll(List.of(a, node(at, u, v, i + 1, k, cells), c));
                corners.addAll(List.of(a, c, node(at, u, v, i, k + 1, cells)));
            }
        }
    }

    private static Vec3 node(Vec3 at, Vec3 u, Vec3 v, int i, int k, int cells) {
        return at.plus(u.times((double) i / cells)).plus(v.times((double) k / cells));
    }
}
