package org.evendraft.stability;

import java.util.Optional;
import java.util.OptionalDouble;
import org.evendraft.stability.Equilibrium.Afloat;

/** Where a steady wind lays a floating platform. */
public final class WindHeel {
    private WindHeel() {}

    /**
     * The rest under a steady wind: the first intercept of the platform's righting arms with the wind's heeling arms about an axis, the
     * trim about the perpendicular axis at rest, liquids free.
     *
     * @param loaded the platform
     * @param calm where it floats without wind
     * @param azimuth direction of the axis about which the wind heels it, from x towards y: 0 turns starboard down (degrees)
     * @param speed wind speed, over 0 (m/s)
     * @return empty when the arms meet nowhere on the curve: the wind lays the platform over
     */
    public static Optional<Waterplane> rest(LoadedPlatform loaded, Afloat calm, double azimuth, double speed) {
        RightingArms arms =
                RightingArms.fromRest(loaded, RightingCurve.Request.usual(azimuth), Slopes.of(calm.waterplane()));
        return HeelStates.settled(
                () -> rest(new AxisStability(arms, loaded.prepared().platform()), speed));
    }

    private static Optional<Waterplane> rest(AxisStability axis, double speed) {
        OptionalDouble rest = axis.arms().exists() ? axis.rest(speed) : OptionalDouble.empty();
        return rest.stream()
                .mapToObj(angle -> axis.arms().at(angle).waterplane())
                .findFirst();
    }
}
