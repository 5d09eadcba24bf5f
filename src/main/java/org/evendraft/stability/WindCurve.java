package org.evendraft.stability;

import java.util.List;
import org.jspecify.annotations.Nullable;

/**
 * A wind that heels a platform about one axis, over the inclination. Component names are those of the JSON answer.
 *
 * @param speed wind speed (m/s)
 * @param points force and moment at each angle of the curve of righting arms
 * @param firstIntercept where the platform lies under the wind: righting and heeling arms cross upwards (degrees); null if nowhere on the curve
 * @param secondIntercept where they cross again, null if not on the curve (degrees)
 */
public record WindCurve(
        double speed,
        List<WindPoint> points,
        @Nullable Double firstIntercept,
        @Nullable Double secondIntercept) {

    /** Copies the list. */
    public WindCurve {
        points = List.copyOf(points);
    }

    /**
     * The wind at one inclination.
     *
     * @param angle inclination about the axis (degrees)
     * @param force horizontal force (kN)
     * @param moment moment about the lateral resistance centre (kN·m)
     * @param arm the moment over the platform's weight (m)
     */
    public record WindPoint(double angle, double force, double moment, double arm) {}
}
