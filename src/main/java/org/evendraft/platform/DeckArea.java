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

    private static final double NEAR = 1e-3;

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

    /** Whether a place lies inside the outline or within a millimetre of it (m). */
    public boolean contains(double x, double y) {
        boolean inside = false;
        for (int i = 0; i < outline.size(); i++) {
            Corner a = outline.get(i);
            Corner b = outline.get((i + 1) % outline.size());
            if (distance(a, b, x, y) <= NEAR) {
                return true;
            }
            if ((a.y() > y) != (b.y() > y) && x < a.x() + (y - a.y()) / (b.y() - a.y()) * (b.x() - a.x())) {
                inside = !inside;
            }
        }
        return inside;
    }

    private static double distance(Corner a, Corner b, double x, double y) {
        double ex = b.x() - a.x();
        double ey = b.y() - a.y();
        double length = ex * ex + ey * ey;
        double part = length == 0 ? 0 : Math.min(1, Math.max(0, ((x - a.x()) * ex + (y - a.y()) * ey) / length));
        return Math.hypot(x - a.x() - part * ex, y - a.y() - part * ey);
    }
}
