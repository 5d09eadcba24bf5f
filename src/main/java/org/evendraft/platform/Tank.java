package org.evendraft.platform;

import java.util.List;

/**
 * A tank: a shape, a calibration table, or both.
 *
 * @param id its name in documents
 * @param name its name for people
 * @param purpose what it is for
 * @param density density of its usual liquid (t/m³)
 * @param bodies its shape, empty when it is known by a table only
 * @param table its table, empty when it is known by its shape only
 * @param permeability part of the shape that liquid can fill, over 0 to 1
 * @param pressedUpFraction part of the full volume from which it has no free surface
 * @param leastPumpableFraction part of the full volume that pumps leave behind
 * @param greatestFraction part of the full volume that it is allowed to hold
 * @param locked whether plans must leave it alone
 */
public record Tank(
        String id,
        String name,
        Purpose purpose,
        double density,
        List<Body> bodies,
        List<TableRow> table,
        double permeability,
        double pressedUpFraction,
        double leastPumpableFraction,
        double greatestFraction,
        boolean locked) {

    /** Copies the lists. */
    public Tank {
        bodies = List.copyOf(bodies);
        table = List.copyOf(table);
    }
}
