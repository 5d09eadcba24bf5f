package org.evendraft.stability;

import java.util.List;
import org.jspecify.annotations.Nullable;

/**
 * A criterion of stability judged. Component names are those of the JSON answer.
 *
 * @param criterion its name
 * @param clause where it stands
 * @param damageCase the damage case judged; null for the intact platform
 * @param value what the platform has, about the worst axis; null where it has none
 * @param bound what is asked for
 * @param margin what is left, positive inside; null with the value
 * @param met whether it is met; null where it cannot be judged
 * @param azimuth direction of the worst axis (degrees)
 * @param angle inclination about it at which the value was found or ends (degrees)
 * @param windSpeed speed of the wind counted (m/s)
 * @param note what the value refers to, or why there is none
 */
public record CriterionResult(
        String criterion,
        String clause,
        @Nullable String damageCase,
        @Nullable Double value,
        double bound,
        @Nullable Double margin,
        @Nullable Boolean met,
        @Nullable Double azimuth,
        @Nullable Double angle,
        @Nullable Double windSpeed,
        String note) {

    /** Whether all criteria that were judged are met; null when none was. */
    static @Nullable Boolean allMet(List<CriterionResult> results) {
        if (results.stream().anyMatch(CriterionResult::isBroken)) {
            return false;
        }
        return results.stream().allMatch(r -> r.met() == null) ? null : Boolean.TRUE;
    }

    /** Whether it is judged and not met. */
    boolean isBroken() {
        return Boolean.FALSE.equals(met);
    }

    /** How near it is to its bound: the margin, less than any for one not met without a value, more than any for one not judged. */
    double urgency() {
        if (margin != null) {
            return margin;
        }
        return isBroken() ? Double.NEGATIVE_INFINITY : Double.POSITIVE_INFINITY;
    }
}
