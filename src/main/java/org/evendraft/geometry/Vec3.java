package org.evendraft.geometry;

/**
 * A point or a direction in space.
 *
 * @param x forward (m)
 * @param y to port (m)
 * @param z up (m)
 */
public record Vec3(double x, double y, double z) {

    /** The origin. */
    public static final Vec3 ZERO = new Vec3(0, 0, 0);

    /** The sum. */
    public Vec3 plus(Vec3 o) {
        return new Vec3(x + o.x, y + o.y, z + o.z);
    }

    /** The difference {@code this − o}. */
    public Vec3 minus(Vec3 o) {
        return new Vec3(x - o.x, y - o.y, z - o.z);
    }

    /** The multiple by a number. */
    public Vec3 times(double k) {
        return new Vec3(k * x, k * y, k * z);
    }

    /** The scalar product. */
    public double dot(Vec3 o) {
        return x * o.x + y * o.y + z * o.z;
    }

    /** The vector product {@code this × o}. */
    public Vec3 cross(Vec3 o) {
        return new Vec3(y * o.z - z * o.y, z * o.x - x * o.z, x * o.y - y * o.x);
    }

    /** The Euclidean length. */
    public double norm() {
        return Math.sqrt(dot(this));
    }

    /** The vector of length 1 in this direction; not a number for the zero vector. */
    public Vec3 unit() {
        return times(1 / norm());
    }
}
