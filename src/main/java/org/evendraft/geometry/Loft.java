package org.evendraft.geometry;

import java.util.List;

/** The surface between two parallel outlines of one form, each cap a fan about its middle. */
final class Loft {
    private Loft() {}

    /**
     * The closed mesh from the outline at the start, scaled, to the outline at the end, scaled.
     *
     * @param p unit vector of the outline's first coordinate
     * @param q unit vector of its second; {@code p × q} points from start to end
     */
    static Mesh between(Outline outline, Vec3 start, double startScale, Vec3 end, double endScale, Vec3 p, Vec3 q) {
        List<double[]> points = outline.tessellated();
        int n = points.size();
        double[] xyz = new double[3 * (2 * n + 2)];
        for (int i = 0; i < n; i++) {
            Vec3 spoke = p.times(points.get(i)[0]).plus(q.times(points.get(i)[1]));
            put(xyz, i, start.plus(spoke.times(startScale)));
            put(xyz, n + i, end.plus(spoke.times(endScale)));
        }
        put(xyz, 2 * n, start);
        put(xyz, 2 * n + 1, end);
        int[] corners = new int[12 * n];
        for (int i = 0, k = 0; i < n; i++) {
            int j = (i + 1) % n;
            k = put(corners, k, i, j, n + j);
            k = put(corners, k, i, n + j, n + i);
            k = put(corners, k, 2 * n, j, i);
            k = put(corners, k, 2 * n + 1, n + i, n + j);
        }
        return new Mesh(xyz, corners);
    }

    private static void put(double[] xyz, int i, Vec3 v) {
        xyz[3 * i] = v.x();
        xyz[3 * i + 1] = v.y();
        xyz[3 * i + 2] = v.z();
    }

    private static int put(int[] corners, int k, int a, int b, int c) {
        corners[k] = a;
        corners[k + 1] = b;
        corners[k + 2] = c;
        return k + 3;
    }
}
