package org.evendraft.ballast.loadplan;

/**
 * Between which angles a platform swings in a sequence (degrees).
 *
 * @param leastHeel least heel, starboard down positive
 * @param greatestHeel greatest heel
 * @param leastTrim least trim, bow down positive
 * @param greatestTrim greatest trim
 */
record Swing(double leastHeel, double greatestHeel, double leastTrim, double greatestTrim) {

    static Swing of(Instant only) {
        return new Swing(only.heelAngle(), only.heelAngle(), only.trimAngle(), only.trimAngle());
    }

    Swing and(Swing other) {
        return new Swing(
                Math.min(leastHeel, other.leastHeel),
                Math.max(greatestHeel, other.greatestHeel),
                Math.min(leastTrim, other.leastTrim),
                Math.max(greatestTrim, other.greatestTrim));
    }

    double middleHeel() {
        return (leastHeel + greatestHeel) / 2;
    }

    double middleTrim() {
        return (leastTrim + greatestTrim) / 2;
    }

    /** The greatest angle to any side or end. */
    double greatest() {
        return Math.max(
                Math.max(Math.abs(leastHeel), Math.abs(greatestHeel)),
                Math.max(Math.abs(leastTrim), Math.abs(greatestTrim)));
    }
}
