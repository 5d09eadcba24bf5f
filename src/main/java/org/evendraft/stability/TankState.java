package org.evendraft.stability;

/** How a tank's liquid can move. */
public enum TankState {
    /** Under a billionth of full. */
    EMPTY,
    /** Partly filled, with a free surface. */
    SLACK,
    /** At or over its pressed-up fraction, rounding forgiven: no free surface. */
    PRESSED_UP;

    /** A tank under this part of full is empty. */
    private static final double EMPTY_FRACTION = 1e-9;

    /** A fraction so little under the pressed-up one is that one: a volume or mass in decimals seldom hits it exactly. */
    private static final double ROUNDING = 1e-9;

    /**
     * The state of a tank at rest.
     *
     * @param fraction what it holds, as a part of its full volume
     * @param pressedUpFraction the part from which it has no free surface
     */
    public static TankState of(double fraction, double pressedUpFraction) {
        if (fraction < EMPTY_FRACTION) {
            return EMPTY;
        }
        return fraction >= pressedUpFraction - ROUNDING ? PRESSED_UP : SLACK;
    }
}
