package org.evendraft.geometry;

/** A right prism or cylinder: an outline moved along its own normal, its curves kept as curves. Immutable. */
final class Extrusion {
    private final Outline outline;
    private final Vec3 start;
    private final Vec3 end;
    private final Vec3 p;
    private final Vec3 q;
    private final Vec3 axis;
    private final Vec3 back;
    private final double length;

    /**
     * @param start the outline's centroid at the first end (m)
     * @param p unit vector of the outline's first coordinate
     * @param q unit vector of the second
     * @param axis unit vector {@code p × q}, towards the other end
     * @param length along the axis (m)
     */
    Extrusion(Outline outline, Vec3 start, Vec3 p, Vec3 q, Vec3 axis, double length) {
        this.outline = outline;
        this.start = start;
        this.end = start.plus(axis.times(length));
        this.p = p;
        this.q = q;
        this.axis = axis;
        this.back = axis.times(-1);
        this.length = length;
    }

    double volume() {
        return outline.whole().area() * length;
    }

    /** First moments of the whole about the platform's origin (m⁴). */
    Vec3 moment() {
        return start.plus(axis.times(length / 2)).times(volume());
    }

    /** Least and greatest reach along a direction from the platform's origin (m). */
    double[] span(Vec3 direction) {
        double[] across = outline.span(direction.dot(p), direction.dot(q));
        double base = direction.dot(start);
        double along = direction.dot(axis) * length;
        return new double[] {base + Math.min(0, along) + across[0], base + Math.max(0, along) + across[1]};
    }

    Outline outline() {
        return outline;
    }

    /** The outline's centroid at the first end (m). */
    Vec3 start() {
        return start;
    }

    /** The outline's centroid at the other end (m). */
    Vec3 end() {
        return end;
    }

    /** Unit vector of the outline's first coordinate. */
    Vec3 p() {
        return p;
    }

    /** Unit vector of the outline's second coordinate. */
    Vec3 q() {
        return q;
    }

    /** Unit vector from the first end to the other. */
    Vec3 axis() {
        return axis;
    }

    /** Unit vector from the other end to the first. */
    Vec3 back() {
        return back;
    }

    double length() {
        return length;
    }
}
