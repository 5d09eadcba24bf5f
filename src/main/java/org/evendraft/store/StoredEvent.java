package org.evendraft.store;

import java.util.Optional;
import java.util.OptionalDouble;

/**
 * An event of a load plan with where it leaves the platform.
 *
 * @param number its number, from 1
 * @param kind the word for it
 * @param subject the load's name or the tank's id, if it has one
 * @param minute when, from the sequence's start, if that is said (min)
 * @param after the platform after it, before the ballast plan after it
 * @param worst the worst while it lasts
 * @param limitsKept whether every limit is kept
 * @param pumpedMass what the ballast plans before and after it pump (t)
 */
public record StoredEvent(
        int number,
        String kind,
        Optional<String> subject,
        OptionalDouble minute,
        After after,
        WorstFigures worst,
        boolean limitsKept,
        double pumpedMass) {

    /**
     * The platform after an event.
     *
     * @param mass mass afloat (t)
     * @param draft draft at the origin (m)
     * @param heelAngle starboard down positive (degrees)
     * @param trimAngle bow down positive (degrees)
     * @param gmTransverse corrected (m)
     * @param gmLongitudinal corrected (m)
     */
    public record After(
            double mass,
            double draft,
            double heelAngle,
            double trimAngle,
            double gmTransverse,
            double gmLongitudinal) {}

    /**
     * The worst while an event lasts.
     *
     * @param heelAngle the heel that is greatest to either side (degrees)
     * @param trimAngle the trim that is greatest to either end (degrees)
     * @param gmLeast the least metacentric height over all axes (m)
     */
    public record WorstFigures(double heelAngle, double trimAngle, double gmLeast) {}
}
