package org.evendraft.platform;

import java.util.List;
import java.util.OptionalDouble;

/**
 * An area of a deck.
 *
 * @param id its name
 * @param outline its corners
 * @param z height of the deck (m)
 * @param maxLoad greatest mass on it (t)
 * @param maxPressure greatest mass on a square metre (t/m²)
 */
public record DeckArea(String id, List<Corner> outline, double z, OptionalDouble maxLoad, OptionalDouble maxPressure) {

    /**
     * A corner of an area.
     *
     * @param x forward (m)
     * @param y to port (m)
     */
    public record Corner(double x, double y) {}

    /** Copies the list. */
    public DeckArea {
        outline = List.copyOf(outline);
    }

    /** Size of the area (m²). */
    public double size() {
        double twice = 0;
        for (int i = 0; i < outline.size(); i++) {
            Corner a = outline.get(i);
            Corner b = outline.get((i + 1) % outline.size());
            twice += a.x() * b.y() - b.x() * a.y();
        }
        return Math.abs(twice / 2);
    }
}
