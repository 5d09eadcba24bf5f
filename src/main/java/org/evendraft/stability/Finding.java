package org.evendraft.stability;

import java.util.OptionalDouble;
import org.evendraft.platform.Criterion;
import org.jspecify.annotations.Nullable;

/**
 * What a criterion's measure comes to about one axis.
 *
 * @param value the measure; empty where it has none
 * @param broken whether that in itself breaks the criterion
 * @param angle angle at which it was found or ends (degrees)
 * @param note what it refers to, or why there is no value
 */
record Finding(OptionalDouble value, boolean broken, OptionalDouble angle, String note) {
    static Finding of(double value, double angleRad, String note) {
        return new Finding(OptionalDouble.of(value), false, OptionalDouble.of(Math.toDegrees(angleRad)), note);
    }

    static Finding broken(String note) {
        return new Finding(OptionalDouble.empty(), true, OptionalDouble.empty(), note);
    }

    static Finding notJudged(String note) {
        return new Finding(OptionalDouble.empty(), false, OptionalDouble.empty(), note);
    }

    /** What is left to the bound, positive inside; −∞ when broken, +∞ when not judged. */
    double margin(Criterion criterion) {
        if (value.isEmpty()) {
            return broken ? Double.NEGATIVE_INFINITY : Double.POSITIVE_INFINITY;
        }
        return criterion.measure().isAtMost()
                ? criterion.bound() - value.getAsDouble()
                : value.getAsDouble() - criterion.bound();
    }

    /** Whether the criterion is kept, or cannot be judged. */
    boolean isKept(Criterion criterion) {
        double margin = margin(criterion);
        return criterion.measure().isStrict() ? margin > 0 : margin >= 0;
    }

    /** The result, for an axis (degrees) where there is one. */
    CriterionResult result(
            Criterion criterion, @Nullable String damageCase, @Nullable Double azimuth, OptionalDouble windSpeed) {
        boolean judged = value.isPresent() || broken;
        return new CriterionResult(
                criterion.name(),
                criterion.clause(),
                damageCase,
                boxed(value),
                criterion.bound(),
                value.isPresent() ? Double.valueOf(margin(criterion)) : null,
                judged ? Boolean.valueOf(isKept(criterion)) : null,
                judged ? azimuth : null,
                boxed(angle),
                boxed(windSpeed),
                note);
    }

    private static @Nullable Double boxed(OptionalDouble number) {
        return number.isPresent() ? Double.valueOf(number.getAsDouble()) : null;
    }
}
