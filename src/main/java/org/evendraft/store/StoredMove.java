package org.evendraft.store;

/**
 * A move of a plan.
 *
 * @param step its number, from 1
 * @param from id of the tank it empties, or {@code sea}
 * @param to id of the tank it fills, or {@code sea}
 * @param mass mass moved (t)
 * @param volume volume moved (m³)
 * @param pump id of the pump
 * @param startMinute when it starts, from the plan's start (min)
 * @param endMinute when it ends, from the plan's start (min)
 */
public record StoredMove(
        int step,
        String from,
        String to,
        double mass,
        double volume,
        String pump,
        double startMinute,
        double endMinute) {}
