package org.evendraft.platform;

import java.util.OptionalDouble;

/**
 * Least corrected metacentric heights; one that is absent is not judged.
 *
 * @param transverse about the longitudinal axis (m)
 * @param longitudinal about the transverse axis (m)
 */
public record GmBound(OptionalDouble transverse, OptionalDouble longitudinal) {}
