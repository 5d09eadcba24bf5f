package org.evendraft.stability.damage;

/**
 * How far damage by collision reaches on a column-stabilized unit.
 *
 * @param verticalExtent height of the damage (m)
 * @param above how far over the greatest draft its upper end may lie (m)
 * @param below how far under the least draft its lower end may lie (m)
 * @param penetration how deep it goes, square to the shell (m)
 * @param perimeterPart vertical bulkheads of a column that are closer than this part of its perimeter are disregarded
 * @param hullBulkheads the same distance for an underwater hull (m), 0 to take every bulkhead as intact
 * @param text whose wording applies where the texts differ otherwise than by a number
 */
public record Extents(
        double verticalExtent,
        double above,
        double below,
        double penetration,
        double perimeterPart,
        double hullBulkheads,
        Text text) {

    /** 5 feet (m). */
    private static final double FIVE_FEET = 1.524;

    /**
     * IMO MODU Code 2009 (res. A.1023(26)), 3.5.10.1 to .5. Underwater hulls are damaged like columns, with regard to their shape
     * either by the spacing of bulkheads in 3.5.10.3 or by that in 3.5.6; here by the latter, 3.0 m between effective bulkheads.
     */
    public static final Extents MODU = new Extents(3.0, 5.0, 3.0, 1.5, 1.0 / 8, 3.0, Text.IMO);

    /**
     * 46 CFR 174.085: all compartments of a column within 5 feet of the waterline and of an outer surface outboard of the planes that
     * join the centrelines of the outermost columns; two neighbours where bulkheads stand an eighth of the perimeter apart or less;
     * each compartment of a footing by itself.
     */
    public static final Extents CFR = new Extents(2 * FIVE_FEET, FIVE_FEET, FIVE_FEET, FIVE_FEET, 1.0 / 8, 0, Text.CFR);

    /** Checks the numbers. */
    public Extents {
        if (!(verticalExtent > 0) || !(penetration > 0) || !(above + below >= verticalExtent)) {
            throw new IllegalArgumentException(
                    "no room for damage of " + verticalExtent + " m by " + penetration + " m");
        }
        if (!(perimeterPart >= 0 && perimeterPart < 1) || !(hullBulkheads >= 0)) {
            throw new IllegalArgumentException("bulkheads closer than " + perimeterPart + ", " + hullBulkheads + " m");
        }
    }

    /** Whose wording applies. */
    public enum Text {
        /**
         * Shell from which nothing of the unit is seen is exposed. Bulkheads are disregarded when closer than the distance, all that
         * stand within it together ("one or more", 3.5.10.3).
         */
        IMO,
        /**
         * Shell outboard of the lines that join the centres of the outermost columns is exposed. Of bulkheads at the distance or
         * closer one at a time is disregarded ("each two adjacent compartments").
         */
        CFR
    }
}
