package org.evendraft.stability;

import org.evendraft.geometry.Vec3;

/**
 * Hydrostatics at one draft, heel and trim. Areas and second moments are those of the true section in its own plane, first axis
 * forward, second to port; heights of metacentres are measured from the keel origin along the normal of the waterplane.
 *
 * @param draft at the origin (m)
 * @param heelAngle starboard down positive (degrees)
 * @param trimAngle bow down positive (degrees)
 * @param displacedVolume V (m³)
 * @param displacement V times the density of the water (t)
 * @param centreOfBuoyancy centroid of V (m)
 * @param waterplaneArea area of the section (m²)
 * @param centreOfFlotation its centroid (m)
 * @param inertiaT second moment about the longitudinal axis through it (m⁴)
 * @param inertiaL second moment about the transverse axis through it (m⁴)
 * @param inertiaTL product of inertia (m⁴)
 * @param bmT transverse metacentric radius {@code inertiaT / V} (m)
 * @param bmL longitudinal metacentric radius {@code inertiaL / V} (m)
 * @param kmT height of the transverse metacentre (m)
 * @param kmL height of the longitudinal metacentre (m)
 * @param tonnesPerCentimetre mass that changes the draft by a centimetre (t/cm)
 * @param momentToHeelOneDegree {@code displacement·bmT·tan 1°}: BM stands for GM, which needs a loading (t·m/degree)
 * @param momentToTrimOneDegree {@code displacement·bmL·tan 1°}, likewise (t·m/degree)
 */
public record HydrostaticRow(
        double draft,
        double heelAngle,
        double trimAngle,
        double displacedVolume,
        double displacement,
        Vec3 centreOfBuoyancy,
        double waterplaneArea,
        Vec3 centreOfFlotation,
        double inertiaT,
        double inertiaL,
        double inertiaTL,
        double bmT,
        double bmL,
        double kmT,
        double kmL,
        double tonnesPerCentimetre,
        double momentToHeelOneDegree,
        double momentToTrimOneDegree) {}
