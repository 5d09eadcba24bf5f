package org.evendraft.stability;

import java.util.List;
import java.util.OptionalDouble;
import org.evendraft.platform.DamageCase;
import org.evendraft.platform.Mode;

/**
 * What limits of KG are wanted.
 *
 * @param mode the mode whose wind and least GM count
 * @param drafts even-keel drafts (m)
 * @param windSpeed wind in place of the mode's (m/s)
 * @param waterDensity density of the sea (t/m³)
 * @param refineTo where a straight line between two drafts would allow more than this too much, a draft between them is added (m); empty to
 *     keep to the drafts given
 * @param damageCases damage to be survived; none for the intact platform alone
 */
public record KgRequest(
        Mode mode,
        List<Double> drafts,
        OptionalDouble windSpeed,
        double waterDensity,
        OptionalDouble refineTo,
        List<DamageCase> damageCases) {

    /** Copies the lists. */
    public KgRequest {
        drafts = List.copyOf(drafts);
        damageCases = List.copyOf(damageCases);
    }

    /** The same with other damage to be survived. */
    public KgRequest surviving(List<DamageCase> cases) {
        return new KgRequest(mode, drafts, windSpeed, waterDensity, refineTo, cases);
    }
}
