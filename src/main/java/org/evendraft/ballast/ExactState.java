package org.evendraft.ballast;

import java.util.Optional;
import org.evendraft.stability.Equilibrium;
import org.evendraft.stability.EvenKeel;
import org.evendraft.stability.LoadedPlatform;
import org.evendraft.stability.Waterplane;

/**
 * Where a platform floats exactly, liquids free, and its corrected metacentric heights on even keel.
 *
 * @param waterplane the position
 * @param gmTransverse corrected (m)
 * @param gmLongitudinal corrected (m)
 */
record ExactState(Waterplane waterplane, double gmTransverse, double gmLongitudinal) {

    /** The state, empty when the platform sinks or capsizes. */
    static Optional<ExactState> of(LoadedPlatform loaded) {
        if (loaded.floatingPosition() instanceof Equilibrium.Afloat afloat) {
            EvenKeel evenKeel = loaded.evenKeel();
            return Optional.of(new ExactState(
                    afloat.waterplane(),
                    evenKeel.gm().transverse().corrected(),
                    evenKeel.gm().longitudinal().corrected()));
        }
        return Optional.empty();
    }

    double component(int component) {
        return switch (component) {
            case Response.DRAFT -> waterplane.draft();
            case Response.SLOPE_X -> Math.tan(waterplane.trimRad());
            default -> -Math.tan(waterplane.heelRad());
        };
    }

    double gm(boolean transverse) {
        return transverse ? gmTransverse : gmLongitudinal;
    }
}
