package org.evendraft.stability;

import java.util.List;

/**
 * A band of heights over the water with its height coefficient: IMO MODU Code 2009 (res. A.1023(26)), table 3-2; the same values
 * stand in 46 CFR table 174.055(a). Steps, with no interpolation; the bounds of the last two rows (259 m) from memory of the Code,
 * the CFR text prints 256 m.
 *
 * @param from lower bound (m)
 * @param to upper bound, included (m)
 * @param coefficient height coefficient C_H
 */
record HeightBand(double from, double to, double coefficient) {
    /** All bands from the water up. */
    static final List<HeightBand> ALL = List.of(
            new HeightBand(0, 15.3, 1.00),
            new HeightBand(15.3, 30.5, 1.10),
            new HeightBand(30.5, 46.0, 1.20),
            new HeightBand(46.0, 61.0, 1.30),
            new HeightBand(61.0, 76.0, 1.37),
            new HeightBand(76.0, 91.5, 1.43),
            new HeightBand(91.5, 106.5, 1.48),
            new HeightBand(106.5, 122.0, 1.52),
            new HeightBand(122.0, 137.0, 1.56),
            new HeightBand(137.0, 152.5, 1.60),
            new HeightBand(152.5, 167.5, 1.63),
            new HeightBand(167.5, 183.0, 1.67),
            new HeightBand(183.0, 198.0, 1.70),
            new HeightBand(198.0, 213.5, 1.72),
            new HeightBand(213.5, 228.5, 1.75),
            new HeightBand(228.5, 244.0, 1.77),
            new HeightBand(244.0, 259.0, 1.79),
            new HeightBand(259.0, Double.POSITIVE_INFINITY, 1.80));
}
