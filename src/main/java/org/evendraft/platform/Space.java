package org.evendraft.platform;

import java.util.List;

/**
 * A tank or compartment by its shape, as damage floods it.
 *
 * @param id its id
 * @param bodies its shape
 * @param permeability part of it that water can fill
 */
public record Space(String id, List<Body> bodies, double permeability) {

    /** Copies the list. */
    public Space {
        bodies = List.copyOf(bodies);
    }
}
