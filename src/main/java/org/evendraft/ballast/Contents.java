package org.evendraft.ballast;

import org.evendraft.geometry.SecondMoments;
import org.evendraft.geometry.Vec3;
import org.evendraft.platform.Calibration;
import org.evendraft.platform.Condition.FreeSurface;

/**
 * Liquid in a tank.
 *
 * @param calibration the tank's calibration
 * @param density density of the liquid (t/m³)
 * @param volume its volume (m³)
 * @param free whether it has a free surface
 */
record Contents(Calibration calibration, double density, double volume, boolean free) {

    double mass() {
        return density * volume;
    }

    /** First moments of mass under a surface of given slopes; of a liquid without free surface always the same (t·m). */
    Vec3 moment(double slopeX, double slopeY) {
        if (volume == 0) {
            return Vec3.ZERO;
        }
        if (!free || (slopeX == 0 && slopeY == 0)) {
            return calibration.holding(volume).centre().times(mass());
        }
        return calibration.inclined(volume, slopeX, slopeY, Double.NaN).moment().times(density);
    }

    /** Free-surface moments, upright, at the actual level (t·m). */
    SecondMoments surface() {
        return free && volume > 0 ? calibration.holding(volume).surface().times(density) : SecondMoments.NONE;
    }

    /** Free-surface moments, upright, as a condition counts them (t·m). */
    SecondMoments surface(FreeSurface which) {
        if (which == FreeSurface.ACTUAL || !free || volume == 0) {
            return surface();
        }
        SecondMoments actual = surface();
        SecondMoments greatest = calibration.greatestSurface().times(density);
        return new SecondMoments(
                Math.max(actual.transverse(), greatest.transverse()),
                Math.max(actual.longitudinal(), greatest.longitudinal()),
                actual.product());
    }
}
