package org.evendraft.stability;

import org.evendraft.geometry.Vec3;

/** Where a loaded platform comes to rest, if it does. */
public sealed interface Equilibrium {

    /**
     * It floats.
     *
     * @param waterplane draft, heel and trim
     * @param displacedVolume displaced volume (m³)
     * @param centreOfBuoyancy centre of buoyancy (m)
     * @param centreOfGravity centre of gravity with the liquids as they lie there (m)
     * @param stable whether the potential energy has a minimum there
     * @param residualArm distance of G from the vertical through B (m)
     */
    record Afloat(
            Waterplane waterplane,
            double displacedVolume,
            Vec3 centreOfBuoyancy,
            Vec3 centreOfGravity,
            boolean stable,
            double residualArm)
            implements Equilibrium {}

    /**
     * Its mass is more than the whole hull can carry.
     *
     * @param mass mass (t)
     * @param buoyancy what the whole hull displaces (t)
     */
    record Sinks(double mass, double buoyancy) implements Equilibrium {}

    /** No stable position within {@link FloatingPosition#GREATEST_INCLINATION}. */
    record Capsizes() implements Equilibrium {}

    /**
     * The computation did not reach its accuracy; no number is given.
     *
     * @param residualArm what was reached (m)
     */
    record Unresolved(double residualArm) implements Equilibrium {}
}
