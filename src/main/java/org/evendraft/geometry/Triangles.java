package org.evendraft.geometry;

import java.util.Arrays;

/** Gathers triangles by vertex numbers; those that use a vertex twice, once vertices are made one, bound nothing and are left out. */
final class Triangles {
    private static final int FIRST_LENGTH = 3 * 1024;

    private int[] corners = new int[FIRST_LENGTH];
    private int size;

    void add(int a, int b, int c) {
        if (a == b || b == c || c == a) {
            return;
        }
        if (size == corners.length) {
            corners = Arrays.copyOf(corners, 2 * size);
        }
        corners[size++] = a;
        corners[size++] = b;
        corners[size++] = c;
    }

    boolean isEmpty() {
        return size == 0;
    }

    int[] corners() {
        return Arrays.copyOf(corners, size);
    }
}
