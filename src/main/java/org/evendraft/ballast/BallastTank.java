package org.evendraft.ballast;

import org.evendraft.platform.Calibration;
import org.evendraft.platform.Tank;
import org.evendraft.stability.TankState;

/**
 * A ballast tank that a plan may move, with sea water in it.
 *
 * @param tank the tank
 * @param calibration its calibration
 * @param density density of the sea (t/m³)
 * @param start mass in it at the start (t)
 */
record BallastTank(Tank tank, Calibration calibration, double density, double start) {
    /** A pressed-up tank is filled this part over its bound, so that no rounding makes it slack. */
    private static final double OVER = 1e-9;

    String id() {
        return tank.id();
    }

    double full() {
        return density * calibration.fullVolume();
    }

    /** What pumps leave behind (t). */
    double leastPumpable() {
        return tank.leastPumpableFraction() * full();
    }

    /** The least mass from which it has no free surface (t). */
    double pressedUp() {
        return Math.min(full(), tank.pressedUpFraction() * full() * (1 + OVER));
    }

    /** The least mass allowed (t). */
    double least() {
        return Math.min(start, leastPumpable());
    }

    /** The greatest mass allowed (t). */
    double greatest() {
        return Math.max(start, tank.greatestFraction() * full());
    }

    /** Whether a mass counts as slack in the cost. */
    boolean slack(double mass) {
        return countsAsSlack(tank, mass / full());
    }

    static boolean countsAsSlack(Tank tank, double fraction) {
        return fraction > tank.leastPumpableFraction() * (1 + OVER)
                && TankState.of(fraction, tank.pressedUpFraction()) != TankState.PRESSED_UP;
    }

    /** The volume of a mass (m³). */
    double volume(double mass) {
        return Math.min(calibration.fullVolume(), Math.max(0, mass / density));
    }

    /** What a mass is as contents at rest, its surface free unless the tank is pressed up or empty. */
    Contents at(double mass, boolean pressedUp) {
        return new Contents(calibration, density, volume(mass), !pressedUp);
    }

    Contents atStart() {
        return at(start, TankState.of(start / full(), tank.pressedUpFraction()) == TankState.PRESSED_UP);
    }
}
