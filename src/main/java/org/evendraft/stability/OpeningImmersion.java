package org.evendraft.stability;

import org.evendraft.platform.Opening;
import org.jspecify.annotations.Nullable;

/**
 * An opening on the way of a heeling platform. Component names are those of the JSON answer.
 *
 * @param opening its id
 * @param closing how it can be closed
 * @param height height over the water where the platform floats, negative under it (m)
 * @param angle inclination about the axis at which it meets the water (degrees); null if not on the curve
 */
public record OpeningImmersion(
        String opening,
        Opening.Closing closing,
        double height,
        @Nullable Double angle) {}
