package org.evendraft.geometry;

import java.util.Arrays;

/** Where upright lines cross the surface of a space, in rising order on each line. */
final class Crossings {
    private final int[] starts;
    private final long[] keys;

    private Crossings(int[] starts, long[] keys) {
        this.starts = starts;
        this.keys = keys;
    }

    /** The number of the first crossing of a line; that of the next line ends its crossings. */
    int start(int ray) {
        return starts[ray];
    }

    /** Height of a crossing (m). */
    double height(int i) {
        return Double.longBitsToDouble(ordered(keys[i] & ~1L));
    }

    /** 1 where the line enters the space going up, −1 where it leaves. */
    int step(int i) {
        return (keys[i] & 1) == 1 ? 1 : -1;
    }

    /** Bits of a double in the order of their values as whole numbers, and back. */
    private static long ordered(long bits) {
        return bits ^ ((bits >> 63) & Long.MAX_VALUE);
    }

    /** Takes crossings in any order. */
    static final class Gatherer {
        private static final int FIRST_LENGTH = 1024;

        private final int[] starts;
        private int[] rays = new int[FIRST_LENGTH];
        private long[] keys = new long[FIRST_LENGTH];
        private int size;

        Gatherer(int rayCount) {
            this.starts = new int[rayCount + 1];
        }

        /** Adds a crossing; the last bit of the height gives way to the direction. */
        void add(int ray, double height, boolean enters) {
            if (size == rays.length) {
                rays = Arrays.copyOf(rays, 2 * size);
                keys = Arrays.copyOf(keys, 2 * size);
            }
            rays[size] = ray;
            keys[size++] = (ordered(Double.doubleToLongBits(height)) & ~1L) | (enters ? 1 : 0);
            starts[ray + 1]++;
        }

        Crossings sorted() {
            for (int i = 1; i < starts.length; i++) {
                starts[i] += starts[i - 1];
            }
            int[] free = starts.clone();
            long[] sorted = new long[size];
            for (int i = 0; i < size; i++) {
                sorted[free[rays[i]]++] = keys[i];
            }
            for (int ray = 0; ray + 1 < starts.length; ray++) {
                Arrays.sort(sorted, starts[ray], starts[ray + 1]);
            }
            return new Crossings(starts, sorted);
        }
    }
}
