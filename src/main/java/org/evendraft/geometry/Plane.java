package org.evendraft.geometry;

/**
 * A plane that is not vertical, with a frame of its own: the surface of the sea, or of the liquid in a tank, seen from the platform.
 *
 * @param origin the point of the plane over the platform's origin, (0, 0, c) (m)
 * @param normal the upward unit normal
 * @param first the unit vector in the plane along x: (1, 0, slopeX) normalised
 * @param second the unit vector {@code normal × first}, to port
 */
public record Plane(Vec3 origin, Vec3 normal, Vec3 first, Vec3 second) {

    /**
     * The plane {@code z = c + slopeX·x + slopeY·y}.
     *
     * @param c height over the origin (m)
     * @param slopeX rise per metre forward
     * @param slopeY rise per metre to port
     */
    public static Plane ofSlopes(double c, double slopeX, double slopeY) {
        Vec3 normal = new Vec3(-slopeX, -slopeY, 1).unit();
        Vec3 first = new Vec3(1, 0, slopeX).unit();
        return new Plane(new Vec3(0, 0, c), normal, first, normal.cross(first));
    }

    /** The signed distance of a point over the plane (m). */
    public double height(Vec3 p) {
        return p.minus(origin).dot(normal);
    }
}
