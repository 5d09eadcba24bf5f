package org.evendraft.geometry;

import java.util.Arrays;

/** Numbers points so that points at one place get one number. Not thread-safe. */
final class Welder {
    /** Cells this many tolerances wide: a point near no border looks into one cell only. */
    private static final int CELL = 8;

    private static final int SMALLEST = 64;

    private final double tolerance;
    private double[] xyz = new double[3 * SMALLEST];
    private int[] next = new int[SMALLEST];
    private int[] heads = emptyHeads(2 * SMALLEST);
    private int size;

    /**
     * @param tolerance points no farther apart than this are one (m); 0 for the same coordinates only
     */
    Welder(double tolerance) {
        this.tolerance = tolerance;
    }

    /** The number of the point: that of an earlier one at the same place, else the next free. */
    int number(double x, double y, double z) {
        long x0 = cell(x - tolerance);
        long x1 = cell(x + tolerance);
        long y0 = cell(y - tolerance);
        long y1 = cell(y + tolerance);
        long z0 = cell(z - tolerance);
        long z1 = cell(z + tolerance);
        for (long i = x0; i <= x1; i++) {
            for (long j = y0; j <= y1; j++) {
                for (long k = z0; k <= z1; k++) {
                    int found = find(hash(i, j, k), x, y, z);
                    if (found >= 0) {
                        return found;
                    }
                }
            }
        }
        return add(x, y, z);
    }

    /** The point of a number. */
    Vec3 point(int number) {
        return new Vec3(xyz[3 * number], xyz[3 * number + 1], xyz[3 * number + 2]);
    }

    /** Coordinates of the points in the order of their numbers. */
    double[] coordinates() {
        return Arrays.copyOf(xyz, 3 * size);
    }

    private long cell(double coordinate) {
        return tolerance > 0
                ? (long) Math.floor(coordinate / (CELL * tolerance))
                : Double.doubleToLongBits(coordinate + 0.0);
    }

    private int find(int hash, double x, double y, double z) {
        for (int i = heads[hash & (heads.length - 1)]; i >= 0; i = next[i]) {
            if (Math.abs(xyz[3 * i] - x) <= tolerance
                    && Math.abs(xyz[3 * i + 1] - y) <= tolerance
                    && Math.abs(xyz[3 * i + 2] - z) <= tolerance) {
                return i;
            }
        }
        return -1;
    }

    private int add(double x, double y, double z) {
        if (size == next.length) {
            grow();
        }
        xyz[3 * size] = x;
        xyz[3 * size + 1] = y;
        xyz[3 * size + 2] = z;
        link(size);
        return size++;
    }

    private void link(int i) {
        int slot = hash(cell(xyz[3 * i]), cell(xyz[3 * i + 1]), cell(xyz[3 * i + 2])) & (heads.length - 1);
        next[i] = heads[slot];
        heads[slot] = i;
    }

    private void grow() {
        xyz = Arrays.copyOf(xyz, 2 * xyz.length);
        next = Arrays.copyOf(next, 2 * next.length);
        heads = emptyHeads(2 * heads.length);
        for (int i = 0; i < size; i++) {
            link(i);
        }
    }

    private static int[] emptyHeads(int length) {
        int[] heads = new int[length];
        Arrays.fill(heads, -1);
        return heads;
    }

    private static int hash(long i, long j, long k) {
        long h = (i * 0x9E3779B97F4A7C15L + j) * 0xC2B2AE3D27D4EB4FL + k;
        h = (h ^ (h >>> 29)) * 0x9E3779B97F4A7C15L;
        return (int) (h >>> 32);
    }
}
