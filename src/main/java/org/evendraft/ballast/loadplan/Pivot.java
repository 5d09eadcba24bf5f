package org.evendraft.ballast.loadplan;

import org.evendraft.geometry.Vec3;

/**
 * The upright axis about which a crane slews.
 *
 * @param x forward (m)
 * @param y to port (m)
 */
record Pivot(double x, double y) {

    /** The boom tip on its way between two places, the shorter way round; radius and height change evenly with the angle. */
    Vec3 between(Vec3 from, Vec3 to, double part) {
        if (part == 1) {
            return to;
        }
        double start = Math.atan2(from.y() - y, from.x() - x);
        double turn = Math.IEEEremainder(Math.atan2(to.y() - y, to.x() - x) - start, 2 * Math.PI);
        double radius = (1 - part) * radius(from) + part * radius(to);
        double angle = start + part * turn;
        return new Vec3(
                x + radius * Math.cos(angle), y + radius * Math.sin(angle), (1 - part) * from.z() + part * to.z());
    }

    private double radius(Vec3 at) {
        return Math.hypot(at.x() - x, at.y() - y);
    }
}
