package org.evendraft.stability;

/** How a tank's liquid can move. */
public enum TankState {
    /** Under a billionth of full. */
    EMPTY,
    /** Partly filled, with a free surface. */
    SLACK,
    /** At or over its pressed-up fraction: no free surface. */
    PRESSED_UP
}
