package org.evendraft.ballast.loadplan;

import java.util.OptionalDouble;

/**
 * The platform at one instant of a sequence. Component names are those of the JSON answer.
 *
 * @param event number of the event, from 1; 0 for the start
 * @param minute minute of that event, where it has one (min)
 * @param what what is going on, in words
 * @param draft draft at the origin (m)
 * @param heelAngle starboard down positive (degrees)
 * @param trimAngle bow down positive (degrees)
 * @param gmTransverse corrected, on even keel (m)
 * @param gmLongitudinal corrected, on even keel (m)
 * @param gmLeast the least corrected over all horizontal axes (m)
 */
public record Instant(
        int event,
        OptionalDouble minute,
        String what,
        double draft,
        double heelAngle,
        double trimAngle,
        double gmTransverse,
        double gmLongitudinal,
        double gmLeast) {

    static Instant of(int event, OptionalDouble minute, String what, Stance stance) {
        return new Instant(
                event,
                minute,
                what,
                stance.waterplane().draft(),
                stance.waterplane().heelAngle(),
                stance.waterplane().trimAngle(),
                stance.gm().transverse().corrected(),
                stance.gm().longitudinal().corrected(),
                stance.gm().least().corrected());
    }
}
