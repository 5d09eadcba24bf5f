package org.evendraft.store;

import java.time.Instant;

/**
 * A reading of a tank.
 *
 * @param tank the tank's id
 * @param takenAt when it was read
 * @param source who or what read it
 * @param contents what the tank holds by it
 */
public record Sounding(String tank, Instant takenAt, String source, Contents contents) {

    /** The figure that was read. */
    public enum Given {
        /** Height of the surface. */
        LEVEL,
        /** Volume of the liquid. */
        VOLUME,
        /** Mass of the liquid. */
        MASS,
        /** Part of the full volume. */
        FRACTION
    }

    /**
     * What a tank holds: one figure as it was read, the others by the tank's calibration.
     *
     * @param given which one was read
     * @param level level (m)
     * @param volume volume (m³)
     * @param mass mass (t)
     * @param fraction part of the full volume
     * @param density density of the liquid (t/m³)
     */
    public record Contents(Given given, double level, double volume, double mass, double fraction, double density) {}
}
