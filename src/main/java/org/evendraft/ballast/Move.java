package org.evendraft.ballast;

import java.util.Map;

/**
 * A pumping order.
 *
 * @param step its number, from 1, in the order of starting
 * @param from id of the tank it empties, or {@code sea}
 * @param to id of the tank it fills, or {@code sea}
 * @param mass mass moved (t)
 * @param volume volume moved (m³)
 * @param pump id of the pump
 * @param startMinute when it starts, from the plan's start (min)
 * @param endMinute when it ends (min)
 * @param after the state at its end
 * @param explanation a sentence for people: the mass, from where to where, and what the move does by itself, that is how far the exact floating
 *     position of the plan's start with this move alone differs from the one without: heel (degrees, to port or to starboard), trim (degrees, by
 *     the bow or by the stern) and draft at the origin (m). With the figures of the plan's {@code before} a pencil finds nearly the same: heel
 *     m·y/(Δ·GM), trim m·x/(Δ·GM), sinkage m/(ρ·A)
 */
public record Move(
        int step,
        String from,
        String to,
        double mass,
        double volume,
        String pump,
        double startMinute,
        double endMinute,
        After after,
        String explanation) {

    /**
     * The state at the end of a move, its own tanks at rest unless another move works on them.
     *
     * @param draft at the origin (m)
     * @param heelAngle starboard down positive (degrees)
     * @param trimAngle bow down positive (degrees)
     * @param gmTransverse corrected, on even keel (m)
     * @param gmLongitudinal corrected, on even keel (m)
     * @param marks reading of each draft mark (m)
     */
    public record After(
            double draft,
            double heelAngle,
            double trimAngle,
            double gmTransverse,
            double gmLongitudinal,
            Map<String, Double> marks) {}
}
