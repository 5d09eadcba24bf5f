package org.evendraft.platform;

import java.util.OptionalDouble;

/**
 * Least corrected metacentric heights; one that is absent is not judged.
 *
 * @param transverse about the longitudinal axis (m)
 * @param longitudinal about the transverse axis (m)
 */
public record GmBound(OptionalDouble transverse, OptionalDouble longitudinal) {

    /** Reads an object {@code {"transverse", "longitudinal"}}, each of which may be absent. */
    public static GmBound read(Fields fields) {
        GmBound bound = new GmBound(
                fields.optionalNumber("transverse", Range.COORDINATE),
                fields.optionalNumber("longitudinal", Range.COORDINATE));
        fields.noOthers();
        return bound;
    }
}
