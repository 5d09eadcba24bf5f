package org.evendraft.geometry;

import java.util.List;

/** Bodies for tests. */
final class Shapes {
    private Shapes() {}

    static Solid box(double x0, double x1, double y0, double y1, double z0, double z1) {
        return Solid.box(new Vec3(x0, y0, z0), new Vec3(x1, y1, z1));
    }

    static Assembly space(Solid... solids) {
        return new Assembly(
                List.of(solids).stream().map(s -> new Assembly.Part(s, false)).toList());
    }

    /** The cube from 0 to 1 by eight vertices and twelve triangles. */
    static Mesh cube() {
        double[] xyz = {0, 0, 0, 1, 0, 0, 1, 1, 0, 0, 1, 0, 0, 0, 1, 1, 0, 1, 1, 1, 1, 0, 1, 1};
        int[] corners = {
            0, 2, 1, 0, 3, 2, 4, 5, 6, 4, 6, 7, 0, 1, 5, 0, 5, 4, 1, 2, 6, 1, 6, 5, 2, 3, 7, 2, 7, 6, 3, 0, 4, 3, 4, 7
        };
        return new Mesh(xyz, corners);
    }

    /** A sphere about the origin by squares over latitude and longitude. */
    static Mesh sphere(double radius, int parts) {
        int around = 2 * parts;
        double[] xyz = new double[3 * ((parts - 1) * around + 2)];
        for (int i = 1; i < parts; i++) {
            double latitude = Math.PI * i / parts;
            for (int j = 0; j < around; j++) {
                int k = 3 * ((i - 1) * around + j);
                xyz[k] = radius * Math.sin(latitude) * Math.cos(Math.PI * j / parts);
                xyz[k + 1] = radius * Math.sin(latitude) * Math.sin(Math.PI * j / parts);
                xyz[k + 2] = -radius * Math.cos(latitude);
            }
        }
        int south = (parts - 1) * around;
        xyz[3 * south + 2] = -radius;
        xyz[3 * south + 5] = radius;
        int[] corners = new int[3 * 2 * around * (parts - 1)];
        int n = 0;
        for (int j = 0; j < around; j++) {
            int next = (j + 1) % around;
            n = put(corners, n, south, next, j);
            for (int i = 0; i < parts - 2; i++) {
                int low = i * around;
                int high = low + around;
                n = put(corners, n, low + j, low + next, high + next);
                n = put(corners, n, low + j, high + next, high + j);
            }
            int last = (parts - 2) * around;
            n = put(corners, n, south + 1, last + j, last + next);
        }
        return new Mesh(xyz, corners);
    }

    private static int put(int[] corners, int n, int a, int b, int c) {
        corners[n] = a;
        corners[n + 1] = b;
        corners[n + 2] = c;
        return n + 3;
    }
}
