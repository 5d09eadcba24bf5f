package org.evendraft.service;

import java.time.Instant;
import org.evendraft.store.Sounding;

/**
 * A recorded reading. Component names are those of the JSON.
 *
 * @param tank the tank's id
 * @param at when it was taken
 * @param given which figure was read; the others follow from the tank's calibration
 * @param level level (m)
 * @param volume volume (m³)
 * @param mass mass (t)
 * @param fraction part of the full volume
 * @param density density of the liquid (t/m³)
 * @param source who or what took it
 */
public record SoundingRecord(
        String tank,
        Instant at,
        Sounding.Given given,
        double level,
        double volume,
        double mass,
        double fraction,
        double density,
        String source) {

    static SoundingRecord of(Sounding sounding) {
        Sounding.Contents held = sounding.contents();
        return new SoundingRecord(
                sounding.tank(),
                sounding.takenAt(),
                held.given(),
                held.level(),
                held.volume(),
                held.mass(),
                held.fraction(),
                held.density(),
                sounding.source());
    }
}
