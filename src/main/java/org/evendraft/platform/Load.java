package org.evendraft.platform;

import java.util.Optional;
import java.util.OptionalDouble;
import org.evendraft.geometry.Vec3;

/**
 * A mass on board that is neither lightship nor liquid in a tank.
 *
 * @param name its name
 * @param kind what it is
 * @param area the deck area it stands on, if any
 * @param mass its mass, negative only for a correction (t)
 * @param position its centre of gravity; of a suspended load the point of suspension, of a line the fairlead or tensioner (m)
 * @param footprint the area that carries it, where its own pressure on the deck is to be judged (m²)
 */
public record Load(
        String name, Kind kind, Optional<String> area, double mass, Vec3 position, OptionalDouble footprint) {

    /** What a load is. */
    public enum Kind {
        /** Stands on a deck. */
        DECK,
        /** Hangs from a crane or derrick. */
        SUSPENDED,
        /** Vertical pull of a mooring line or riser. */
        LINE,
        /** Anything else that comes and goes. */
        VARIABLE,
        /** A correction of the lightship, of either sign. */
        CORRECTION
    }
}
