package org.evendraft.geometry;

/** An axis of the platform. */
public enum Axis {
    /** Forward; the other two coordinates are (y, z). */
    X(new Vec3(1, 0, 0), new Vec3(0, 1, 0), new Vec3(0, 0, 1)),
    /** To port; the other two coordinates are (x, z). */
    Y(new Vec3(0, 1, 0), new Vec3(1, 0, 0), new Vec3(0, 0, 1)),
    /** Up; the other two coordinates are (x, y). */
    Z(new Vec3(0, 0, 1), new Vec3(1, 0, 0), new Vec3(0, 1, 0));

    private final Vec3 direction;
    private final Vec3 first;
    private final Vec3 second;

    Axis(Vec3 direction, Vec3 first, Vec3 second) {
        this.direction = direction;
        this.first = first;
        this.second = second;
    }

    /** The unit vector along this axis. */
    public Vec3 direction() {
        return direction;
    }

    /** The unit vector of the first of the other two coordinates. */
    public Vec3 first() {
        return first;
    }

    /** The unit vector of the second of the other two coordinates. */
    public Vec3 second() {
        return second;
    }
}
