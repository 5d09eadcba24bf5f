package org.evendraft.platform;

/**
 * The values that a number of a document may take.
 *
 * @param least least value
 * @param open whether the least value itself is excluded
 * @param greatest greatest value, itself included
 */
public record Range(double least, boolean open, double greatest) {
    /** Beyond this no quantity of a platform is meant (t, m³, m²): far over any that floats, far under what overflows. */
    private static final double VAST = 1e9;

    /** No part of a platform is farther from its origin (m): a slip of units shows up here. */
    private static final double FARTHEST = 1e4;

    /** No liquid aboard is denser (t/m³): mercury has 13.6. */
    private static final double DENSEST = 20;

    /** Any value of a mass or the like, of either sign. */
    public static final Range ANY = new Range(-VAST, false, VAST);

    /** Over 0. */
    public static final Range POSITIVE = new Range(0, true, VAST);

    /** 0 or more. */
    public static final Range NOT_NEGATIVE = new Range(0, false, VAST);

    /** A coordinate (m). */
    public static final Range COORDINATE = new Range(-FARTHEST, false, FARTHEST);

    /** Greatest second moment of a surface (m⁴): that of a square of a kilometre. */
    private static final double VAST_INERTIA = 1e12;

    /** A second moment of area (m⁴), 0 or more. */
    public static final Range INERTIA = new Range(0, false, VAST_INERTIA);

    /** A product of area (m⁴), of either sign. */
    public static final Range ANY_INERTIA = new Range(-VAST_INERTIA, false, VAST_INERTIA);

    /** A density (t/m³). */
    public static final Range DENSITY = new Range(0, true, DENSEST);

    /** A part of a whole, 0 and 1 included. */
    public static final Range FRACTION = new Range(0, false, 1);

    /** A part of a whole over 0, 1 included. */
    public static final Range POSITIVE_FRACTION = new Range(0, true, 1);

    /** An angle from the upright, over 0 (degrees). */
    public static final Range ANGLE = new Range(0, true, 90);

    /** An angle from the upright, or between two such, 0 included (degrees). */
    public static final Range ANGLE_OR_NONE = new Range(0, false, 90);

    /** Whether the value is allowed; one that is not a number is not. */
    public boolean allows(double value) {
        return value <= greatest && (open ? value > least : value >= least);
    }

    /** The rule in words, to follow "must be". */
    public String words() {
        boolean bounded = greatest < VAST;
        if (bounded) {
            return (open ? "over " : "from ")
                    + Words.given(least)
                    + (open ? " and at most " : " to ")
                    + Words.given(greatest);
        }
        if (least == -VAST) {
            return "from " + Words.given(least) + " to " + Words.given(greatest);
        }
        return open ? "over " + Words.given(least) : Words.given(least) + " or more";
    }
}
