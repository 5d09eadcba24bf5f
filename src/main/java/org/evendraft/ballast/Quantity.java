package org.evendraft.ballast;

import java.util.Locale;
import java.util.OptionalDouble;
import org.evendraft.ballast.PlanRequest.OperationLimits;

/** What is watched on the way: each as a figure that must stay at or under its limit. */
enum Quantity {
    /** Greatest heel to either side (degrees). */
    HEEL("heel", "maxHeel", "°", 1),
    /** Greatest trim to either end (degrees). */
    TRIM("trim", "maxTrim", "°", 1),
    /** Least transverse metacentric height, counted negative (m). */
    GM_TRANSVERSE("transverse GM", "minGm.transverse", " m", -1),
    /** Least longitudinal metacentric height, counted negative (m). */
    GM_LONGITUDINAL("longitudinal GM", "minGm.longitudinal", " m", -1);

    private final String words;
    private final String limitName;
    private final String unit;
    private final int sign;

    Quantity(String words, String limitName, String unit, int sign) {
        this.words = words;
        this.limitName = limitName;
        this.unit = unit;
        this.sign = sign;
    }

    /** The figure of a state. */
    double of(ExactState state) {
        return switch (this) {
            case HEEL -> Math.abs(state.waterplane().heelAngle());
            case TRIM -> Math.abs(state.waterplane().trimAngle());
            case GM_TRANSVERSE -> -state.gmTransverse();
            case GM_LONGITUDINAL -> -state.gmLongitudinal();
        };
    }

    /** The limit of the figure. */
    OptionalDouble limit(OperationLimits limits) {
        OptionalDouble limit = switch (this) {
            case HEEL -> limits.maxHeel();
            case TRIM -> limits.maxTrim();
            case GM_TRANSVERSE -> limits.minGm().transverse();
            case GM_LONGITUDINAL -> limits.minGm().longitudinal();
        };
        return limit.isPresent() ? OptionalDouble.of(sign * limit.getAsDouble()) : limit;
    }

    /** Its name for people. */
    String words() {
        return words;
    }

    /** Name of its limit in a request. */
    String limitName() {
        return limitName;
    }

    /** The figure as people read it. */
    double plain(double figure) {
        return sign * figure;
    }

    /** The figure in words. */
    String told(double figure) {
        return String.format(Locale.ROOT, "%s %.3f%s", words, plain(figure), unit);
    }

    /** An amount of it in words. */
    String amount(double excess) {
        return String.format(Locale.ROOT, "%.3f%s", excess, unit);
    }
}
