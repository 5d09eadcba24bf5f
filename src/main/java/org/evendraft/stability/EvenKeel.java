package org.evendraft.stability;

import org.evendraft.geometry.Vec3;

/**
 * The platform at its displacement without heel or trim.
 *
 * @param draft draft (m)
 * @param displacedVolume displaced volume (m³)
 * @param centreOfBuoyancy centre of buoyancy (m)
 * @param km heights of the metacentres over the keel (m)
 * @param gm metacentric heights: solid, correction, corrected (m), and the least
 */
public record EvenKeel(
        double draft,
        double displacedVolume,
        Vec3 centreOfBuoyancy,
        ConditionResult.Directions km,
        ConditionResult.Gm gm) {}
