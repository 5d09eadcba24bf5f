package org.evendraft.geometry;

/**
 * A directed line seen from above; places on it are told by their distance from its point, positive along its direction (m).
 *
 * @param x the point, forward (m)
 * @param y the point, to port (m)
 * @param dx unit direction, forward
 * @param dy unit direction, to port
 */
public record PlanLine(double x, double y, double dx, double dy) {

    /** Distance of a point to the left of the line (m). */
    double left(double px, double py) {
        return dx * (py - y) - dy * (px - x);
    }

    /** Distance of a point along the line (m). */
    double along(double px, double py) {
        return dx * (px - x) + dy * (py - y);
    }
}
