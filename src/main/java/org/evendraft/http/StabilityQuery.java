package org.evendraft.http;

import java.util.List;
import java.util.OptionalDouble;
import java.util.stream.Stream;
import org.evendraft.platform.Json;
import org.evendraft.stability.KgRequestReader;
import org.evendraft.stability.LiquidTreatment;
import org.evendraft.stability.RightingCurve;

/** Reads the parameters that questions about stability have in common. */
final class StabilityQuery {
    private StabilityQuery() {}

    /** A wind speed in place of the mode's (m/s). */
    static OptionalDouble wind(Query query) {
        OptionalDouble wind = query.number("wind");
        if (wind.isPresent() && !KgRequestReader.WIND.allows(wind.getAsDouble())) {
            query.fault("wind", "must be " + KgRequestReader.WIND.words() + " m/s, not " + wind.getAsDouble());
        }
        return wind;
    }

    /**
     * The curve wanted. Ends the reading of the query.
     *
     * @param azimuth direction of the axis (degrees)
     */
    static RightingCurve.Request curve(Query query, double azimuth) {
        double to = query.number("to").orElse(RightingCurve.Request.USUAL_ANGLE);
        double step = query.number("step").orElse(1);
        boolean freeTrim = oneOf(query, "trim", "free", "free", "fixed").equals("free");
        String treatment = oneOf(query, "liquids", "free", codes());
        LiquidTreatment liquids = Stream.of(LiquidTreatment.values())
                .filter(way -> Json.code(way).equals(treatment))
                .findFirst()
                .orElse(LiquidTreatment.FREE);
        query.done();
        return RightingCurve.Request.checked(azimuth, to, step, freeTrim, liquids);
    }

    private static String[] codes() {
        return Stream.of(LiquidTreatment.values()).map(Json::code).toArray(String[]::new);
    }

    /** One of some words. */
    static String oneOf(Query query, String name, String otherwise, String... words) {
        String given = query.text(name).orElse(otherwise);
        if (!List.of(words).contains(given)) {
            query.fault(name, "must be one of " + String.join(", ", words));
        }
        return given;
    }
}
