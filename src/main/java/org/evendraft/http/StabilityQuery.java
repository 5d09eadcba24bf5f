package org.evendraft.http;

import java.util.EnumSet;
import java.util.OptionalDouble;
import org.evendraft.stability.KgRequestReader;
import org.evendraft.stability.LiquidTreatment;
import org.evendraft.stability.RightingCurve;

/**
 * What a question about stability asks by its parameters.
 *
 * @param wind wind speed in place of the mode's (m/s)
 * @param curve the curve about an axis
 */
record StabilityQuery(OptionalDouble wind, RightingCurve.Request curve) {

    /** What becomes of the trim about the axis perpendicular to that of a curve. */
    private enum Trim {
        /** At rest at each angle. */
        FREE,
        /** Held at 0. */
        FIXED
    }

    /** A question about the axis that must be given. */
    static StabilityQuery aboutOneAxis(Query query) {
        return read(query, query.required("azimuth"));
    }

    /** A question about the axis that is given; about the first of those all around when none is. */
    static StabilityQuery aboutAnyAxis(Query query) {
        return read(query, query.number("azimuth").orElse(0));
    }

    private static StabilityQuery read(Query query, double azimuth) {
        double to = query.number("to").orElse(RightingCurve.Request.USUAL_ANGLE);
        double step = query.number("step").orElse(1);
        Trim trim = query.choice("trim", EnumSet.allOf(Trim.class), Trim.FREE);
        LiquidTreatment liquids = query.choice("liquids", EnumSet.allOf(LiquidTreatment.class), LiquidTreatment.FREE);
        OptionalDouble wind = wind(query);
        RightingCurve.Request curve =
                RightingCurve.Request.checked(azimuth, to, step, trim == Trim.FREE, liquids, query.faults());
        query.done();
        return new StabilityQuery(wind, curve);
    }

    /** A wind speed in place of the mode's (m/s); others may follow. */
    static OptionalDouble wind(Query query) {
        OptionalDouble wind = query.number("wind");
        KgRequestReader.checkWind(wind, query.faults());
        return wind;
    }
}
