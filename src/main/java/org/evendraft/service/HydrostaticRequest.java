package org.evendraft.service;

import java.util.OptionalDouble;
import java.util.OptionalInt;
import org.evendraft.stability.HydrostaticGrid;

/**
 * Which hydrostatics are wanted.
 *
 * @param grid the drafts, heels and trims
 * @param single whether one row alone is wanted, not a table
 * @param waterDensity density of the water where it is not the platform's own (t/m³)
 * @param digits decimals of lengths and angles where values are to be rounded; other quantities as {@link Decimals} tells
 */
public record HydrostaticRequest(
        HydrostaticGrid grid, boolean single, OptionalDouble waterDensity, OptionalInt digits) {
    /** The most rows of a table. */
    public static final int MOST_ROWS = 10_000;

    /**
     * Reads a request: {@code draft}, or {@code from}, {@code to} and {@code step} of drafts; {@code heel} and {@code trim}, each a
     * number, a range {@code from:to:step}, or several of these with commas; {@code waterDensity}; {@code digits}.
     *
     * @param given the parameters, whose faults must be looked at before the request is used
     */
    public static HydrostaticRequest read(Parameters given) {
        return new HydrostaticRequestReader(given).read();
    }
}
