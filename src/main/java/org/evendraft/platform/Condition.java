package org.evendraft.platform;

import java.util.List;
import java.util.Optional;

/**
 * How a platform is loaded, checked against it.
 *
 * @param name its name for people
 * @param mode the mode whose limits are in force, if any
 * @param waterDensity density of the sea (t/m³)
 * @param freeSurface which free-surface moments the correction takes
 * @param fills contents of tanks; a tank not named is empty
 * @param loads what else is on board
 */
public record Condition(
        String name,
        Optional<Mode> mode,
        double waterDensity,
        FreeSurface freeSurface,
        List<Fill> fills,
        List<Load> loads) {

    /** Copies the lists. */
    public Condition {
        fills = List.copyOf(fills);
        loads = List.copyOf(loads);
    }

    /** Which free-surface moments the correction takes. */
    public enum FreeSurface {
        /** Those at the actual levels. */
        ACTUAL,
        /** The greatest of each slack tank over all levels. */
        MAXIMUM
    }
}
