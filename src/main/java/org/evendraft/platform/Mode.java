package org.evendraft.platform;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * A mode of operation with its limits; a limit that is absent is not judged.
 *
 * @param id its name in documents
 * @param name its name for people
 * @param draftRange least and greatest draft
 * @param minGm least corrected metacentric heights
 * @param allowableKg points of the curve of greatest KG against draft, drafts rising; empty for none
 * @param maxHeel greatest heel to either side (degrees)
 * @param maxTrim greatest trim to either end (degrees)
 * @param maxDeckLoad greatest sum of loads of kind deck (t)
 * @param windSpeed wind speed of the mode (m/s)
 */
public record Mode(
        String id,
        String name,
        Optional<DraftRange> draftRange,
        Optional<GmBound> minGm,
        List<KgPoint> allowableKg,
        OptionalDouble maxHeel,
        OptionalDouble maxTrim,
        OptionalDouble maxDeckLoad,
        OptionalDouble windSpeed) {

    /** Copies the list. */
    public Mode {
        allowableKg = List.copyOf(allowableKg);
    }

    /**
     * Limits of the draft.
     *
     * @param least least draft (m)
     * @param greatest greatest draft (m)
     */
    public record DraftRange(double least, double greatest) {}

    /**
     * A point of the allowable KG curve.
     *
     * @param draft draft (m)
     * @param kg greatest KG, free surface counted (m)
     */
    public record KgPoint(double draft, double kg) {}
}
