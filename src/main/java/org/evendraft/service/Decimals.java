package org.evendraft.service;

import java.math.BigDecimal;
import java.math.RoundingMode;

/** How many decimals a quantity is printed with, told by those of lengths: common practice of printed tables, no source. */
enum Decimals {
    /** Lengths (m) and angles (degrees): as many as asked for. */
    LENGTH(0),
    /** Mass for a centimetre of draft (t/cm). */
    IMMERSION(1),
    /** Areas (m²), volumes (m³), masses (t) and moments of mass (t·m). */
    AMOUNT(2),
    /** Second moments of area (m⁴). */
    INERTIA(3);

    /** Decimals of lengths in a table that is printed. */
    static final int USUAL = 3;

    private final int fewer;

    Decimals(int fewer) {
        this.fewer = fewer;
    }

    /**
     * A finite value rounded.
     *
     * @param digits decimals of lengths
     */
    BigDecimal rounded(double value, int digits) {
        return BigDecimal.valueOf(value).setScale(Math.max(0, digits - fewer), RoundingMode.HALF_UP);
    }

    /** The same as {@link #rounded(double, int)}, as a number. */
    double number(double value, int digits) {
        return rounded(value, digits).doubleValue();
    }
}
