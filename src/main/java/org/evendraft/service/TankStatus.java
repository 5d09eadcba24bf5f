package org.evendraft.service;

import com.fasterxml.jackson.annotation.JsonIgnore;
import java.time.Duration;
import java.time.Instant;
import java.util.Optional;
import org.evendraft.platform.Purpose;
import org.evendraft.stability.TankState;

/**
 * A tank as it was read last. Component names are those of the JSON.
 *
 * @param tank the tank's id
 * @param name its name for people
 * @param purpose what it is for
 * @param fullVolume its full volume, permeability counted (m³)
 * @param reading its latest reading, if there is any
 */
public record TankStatus(String tank, String name, Purpose purpose, double fullVolume, Optional<Reading> reading) {

    /** A reading older than this deserves a warning (common practice: tanks are sounded daily; no source). */
    static final Duration OLD = Duration.ofHours(24);

    /**
     * A reading.
     *
     * @param level level (m)
     * @param volume volume (m³)
     * @param mass mass (t)
     * @param fraction part of the full volume
     * @param density density of the liquid (t/m³)
     * @param state empty, slack or pressed up
     * @param at when it was taken
     * @param ageMinutes how long ago that is (minutes)
     * @param source who or what took it
     */
    public record Reading(
            double level,
            double volume,
            double mass,
            double fraction,
            double density,
            TankState state,
            Instant at,
            double ageMinutes,
            String source) {

        @JsonIgnore
        boolean old() {
            return ageMinutes > OLD.toMinutes();
        }
    }
}
