package org.evendraft.stability;

import org.evendraft.geometry.Plane;
import org.evendraft.geometry.Vec3;

/**
 * The plane of the sea seen from the platform, {@code z = draft + x·tan(trim) − y·tan(heel)}.
 *
 * @param draft height over the origin (m)
 * @param heelRad starboard down positive (rad)
 * @param trimRad bow down positive (rad)
 */
public record Waterplane(double draft, double heelRad, double trimRad) {

    /** From angles in degrees. */
    public static Waterplane ofDegrees(double draft, double heelAngle, double trimAngle) {
        return new Waterplane(draft, Math.toRadians(heelAngle), Math.toRadians(trimAngle));
    }

    /** The plane for the geometry. */
    public Plane plane() {
        return Plane.ofSlopes(draft, Math.tan(trimRad), -Math.tan(heelRad));
    }

    /** Starboard down positive (degrees). */
    public double heelAngle() {
        return Math.toDegrees(heelRad);
    }

    /** Bow down positive (degrees). */
    public double trimAngle() {
        return Math.toDegrees(trimRad);
    }

    /** Height of the water over the keel plane at a place (m). */
    public double heightAt(double x, double y) {
        return draft + x * Math.tan(trimRad) - y * Math.tan(heelRad);
    }

    /** How high a point of the platform stands over the water, square to it; negative under water (m). */
    public double freeboard(Vec3 point) {
        return plane().height(point);
    }
}
