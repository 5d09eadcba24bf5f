package org.evendraft.stability;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.evendraft.platform.Mode;
import org.evendraft.platform.StabilityRules;
import org.evendraft.stability.Equilibrium.Afloat;
import org.jspecify.annotations.Nullable;

/**
 * The intact platform judged about every axis. Component names are those of the JSON answer.
 *
 * @param rules name of the rules that the criteria start from
 * @param rulesAssumed whether the platform names none and these were taken for want of better
 * @param windSpeed wind of the mode, or the one asked for (m/s)
 * @param azimuthStep between the axes looked at, before the worst is looked at more closely (degrees)
 * @param met whether every criterion that could be judged is met; null when none could
 * @param notJudged names of the criteria that could not be judged
 * @param criteria the criteria, each about its worst axis
 */
public record CriteriaAnswer(
        String rules,
        boolean rulesAssumed,
        @Nullable Double windSpeed,
        double azimuthStep,
        @Nullable Boolean met,
        List<String> notJudged,
        List<CriterionResult> criteria) {

    /** Copies the lists. */
    public CriteriaAnswer {
        notJudged = List.copyOf(notJudged);
        criteria = List.copyOf(criteria);
    }

    /** The answer for a loaded platform; parameters as those of {@link IntactStability#judge}. */
    public static CriteriaAnswer of(
            LoadedPlatform loaded, Afloat afloat, Optional<Mode> mode, OptionalDouble windSpeed) {
        StabilityRules rules = loaded.prepared().platform().stabilityRules();
        OptionalDouble wind = WindSpeed.counted(windSpeed, mode);
        List<CriterionResult> results = IntactStability.judge(loaded, afloat, mode, windSpeed);
        return new CriteriaAnswer(
                rules.rules(),
                rules.assumed(),
                wind.isPresent() ? Double.valueOf(wind.getAsDouble()) : null,
                AllAround.AZIMUTH_STEP,
                CriterionResult.allMet(results),
                results.stream()
                        .filter(r -> r.met() == null)
                        .map(CriterionResult::criterion)
                        .toList(),
                results);
    }
}
