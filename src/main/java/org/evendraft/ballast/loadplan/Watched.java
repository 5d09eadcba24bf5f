package org.evendraft.ballast.loadplan;

import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Function;
import java.util.function.ToDoubleFunction;
import org.evendraft.ballast.PlanRequest.OperationLimits;

/** What must keep inside the operation limits at every instant of an event. */
enum Watched {
    /** Heel to either side. */
    HEEL("operationLimits.maxHeel", OperationLimits::maxHeel, at -> Math.abs(at.heelAngle()), false),
    /** Trim to either end. */
    TRIM("operationLimits.maxTrim", OperationLimits::maxTrim, at -> Math.abs(at.trimAngle()), false),
    /** Transverse metacentric height. */
    GM_TRANSVERSE("operationLimits.minGm.transverse", l -> l.minGm().transverse(), Instant::gmTransverse, true),
    /** Longitudinal metacentric height. */
    GM_LONGITUDINAL("operationLimits.minGm.longitudinal", l -> l.minGm().longitudinal(), Instant::gmLongitudinal, true);

    /** An excess of less than this is rounding (degrees, m). */
    private static final double ROUNDING = 1e-6;

    private final String limit;
    private final Function<OperationLimits, OptionalDouble> bound;
    private final ToDoubleFunction<Instant> value;
    private final boolean atLeast;

    Watched(
            String limit,
            Function<OperationLimits, OptionalDouble> bound,
            ToDoubleFunction<Instant> value,
            boolean atLeast) {
        this.limit = limit;
        this.bound = bound;
        this.value = value;
        this.atLeast = atLeast;
    }

    /** The breach at an instant, if there is one. */
    Optional<Breach> breach(Instant at, OperationLimits limits) {
        double allowed = bound.apply(limits).orElse(atLeast ? Double.NEGATIVE_INFINITY : Double.POSITIVE_INFINITY);
        double found = value.applyAsDouble(at);
        double lack = atLeast ? allowed - found : found - allowed;
        return lack > ROUNDING ? Optional.of(new Breach(limit, found, allowed, lack, at.what())) : Optional.empty();
    }
}
