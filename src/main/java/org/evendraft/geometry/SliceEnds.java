package org.evendraft.geometry;

import java.util.Arrays;

/** Gathers where, along the axis of a prism that a plane runs almost along, the form of the slices across it changes. */
final class SliceEnds {
    private static final int FIRST_LENGTH = 32;

    private final double perDistance;
    private final double length;
    private double[] places = new double[FIRST_LENGTH];
    private int size;

    /**
     * @param perDistance way along the axis on which the plane moves one metre aside
     * @param length of the prism (m)
     */
    SliceEnds(double perDistance, double length) {
        this.perDistance = perDistance;
        this.length = length;
        put(length);
    }

    /** Adds the place where the plane has moved aside by a distance (m), if it lies within the prism. */
    void add(double distance) {
        double place = distance * perDistance;
        if (place > 0 && place < length) {
            put(place);
        }
    }

    private void put(double place) {
        if (size == places.length) {
            places = Arrays.copyOf(places, 2 * size);
        }
        places[size++] = place;
    }

    /** The places in order, the far end last (m). */
    double[] inOrder() {
        return Arrays.stream(places, 0, size).sorted().distinct().toArray();
    }
}
