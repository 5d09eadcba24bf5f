package org.evendraft.stability;

import org.evendraft.geometry.SecondMoments;
import org.evendraft.geometry.Vec3;
import org.evendraft.platform.Calibration;
import org.evendraft.platform.Condition.FreeSurface;
import org.evendraft.platform.Liquid;
import org.evendraft.platform.Tank;

/**
 * A tank and what it holds, the platform upright. Immutable.
 *
 * @param tank the tank
 * @param calibration its calibration
 * @param density density of the liquid (t/m³)
 * @param liquid the liquid
 * @param moving whether a pump works on it: then it counts as slack whatever its level
 */
record TankContents(Tank tank, Calibration calibration, double density, Liquid liquid, boolean moving) {
    double mass() {
        return density * liquid.volume();
    }

    double fraction() {
        return liquid.volume() / calibration.fullVolume();
    }

    TankState state() {
        return TankState.of(fraction(), tank.pressedUpFraction());
    }

    boolean hasFreeSurface() {
        return state() == TankState.SLACK || (moving && state() != TankState.EMPTY);
    }

    /** First moments of mass, upright (t·m). */
    Vec3 moment() {
        return liquid.centre().times(mass());
    }

    /**
     * Free-surface moments (t·m), none unless there is a free surface. The greatest transverse and longitudinal moments come with
     * the product at the actual level, with which the matrix stays positive.
     */
    SecondMoments freeSurfaceMoments(FreeSurface which) {
        if (!hasFreeSurface()) {
            return SecondMoments.NONE;
        }
        SecondMoments actual = liquid.surface();
        SecondMoments greatest = calibration.greatestSurface();
        SecondMoments taken = which == FreeSurface.ACTUAL
                ? actual
                : new SecondMoments(
                        Math.max(actual.transverse(), greatest.transverse()),
                        Math.max(actual.longitudinal(), greatest.longitudinal()),
                        actual.product());
        return taken.times(density);
    }

    TankContents with(double newDensity, double volume) {
        return new TankContents(tank, calibration, newDensity, calibration.holding(volume), moving);
    }

    TankContents withMoving(boolean now) {
        return now == moving ? this : new TankContents(tank, calibration, density, liquid, now);
    }
}
