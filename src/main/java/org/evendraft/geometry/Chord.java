package org.evendraft.geometry;

/**
 * A part of a line that lies inside.
 *
 * @param from distance along the line where it begins (m)
 * @param to distance where it ends (m)
 */
public record Chord(double from, double to) {

    /** How much of it lies between two distances along the line (m); 0 for none. */
    public double within(double least, double greatest) {
        return Math.max(0, Math.min(to, greatest) - Math.max(from, least));
    }
}
