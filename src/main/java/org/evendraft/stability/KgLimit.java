package org.evendraft.stability;

import java.util.List;
import org.jspecify.annotations.Nullable;

/**
 * The greatest KG at a draft. Component names are those of the JSON answer.
 *
 * @param draft even-keel draft (m)
 * @param displacement mass afloat at that draft (t)
 * @param kmTransverse height of the transverse metacentre (m)
 * @param kmLongitudinal height of the longitudinal metacentre (m)
 * @param allowableKg the greatest KG, free-surface correction counted, for which every criterion holds (m); null when none was found
 * @param breaksAt a KG a millimetre higher or less, for which the governing criterion does not hold (m)
 * @param criterion the governing criterion
 * @param clause where it stands
 * @param damageCase the governing damage case; null for the intact platform
 * @param azimuth direction of the governing axis (degrees)
 * @param notJudged names of criteria that could not be judged, with the reason
 */
public record KgLimit(
        double draft,
        double displacement,
        double kmTransverse,
        double kmLongitudinal,
        @Nullable Double allowableKg,
        @Nullable Double breaksAt,
        String criterion,
        String clause,
        @Nullable String damageCase,
        @Nullable Double azimuth,
        List<String> notJudged) {

    /** Copies the list. */
    public KgLimit {
        notJudged = List.copyOf(notJudged);
    }
}
