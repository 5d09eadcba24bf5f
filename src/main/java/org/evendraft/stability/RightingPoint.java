package org.evendraft.stability;

/**
 * A point of a curve of righting arms.
 *
 * @param angle inclination about the axis (degrees)
 * @param gz righting arm, positive when it rights (m)
 * @param draft draft at the origin (m)
 * @param trim slope angle about the perpendicular axis (degrees)
 * @param area under the arms from upright to the angle (m·rad): that between two angles is the difference
 */
public record RightingPoint(double angle, double gz, double draft, double trim, double area) {}
