package org.evendraft.platform;

import java.util.List;

/**
 * Spaces that the sea has flooded together.
 *
 * @param id its name
 * @param situation by which criteria it is judged: collision, or flooding of any one compartment
 * @param flooded ids of the tanks and compartments open to the sea
 */
public record DamageCase(String id, Situation situation, List<String> flooded) {

    /** Copies the list. */
    public DamageCase {
        flooded = List.copyOf(flooded);
    }
}
