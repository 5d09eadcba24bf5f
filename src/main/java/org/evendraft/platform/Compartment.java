package org.evendraft.platform;

import java.util.List;

/**
 * A space that damage may flood.
 *
 * @param id its name
 * @param bodies its shape
 * @param permeability part of it that water can fill
 */
public record Compartment(String id, List<Body> bodies, double permeability) {

    /** Copies the list. */
    public Compartment {
        bodies = List.copyOf(bodies);
    }
}
