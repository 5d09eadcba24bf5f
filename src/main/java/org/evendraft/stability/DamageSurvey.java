package org.evendraft.stability;

import java.util.ArrayList;
import java.util.Collection;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Stream;
import org.evendraft.platform.DamageCase;
import org.evendraft.platform.StabilityRules;
import org.jspecify.annotations.Nullable;

/**
 * A platform judged in several damage cases. Component names are those of the JSON answer.
 *
 * @param rules name of the rules that the criteria start from
 * @param rulesAssumed whether the platform names none and these were taken for want of better
 * @param survived whether it floats in every case and breaks no criterion in any; null when no criterion was judged
 * @param worstCase id of the case that comes nearest to the end, or goes beyond it; null without cases
 * @param why what makes it the worst, in a sentence
 * @param worst each criterion in the case and about the axis where it is nearest to its bound
 * @param cases every case
 * @param notes what was left out, and why
 */
public record DamageSurvey(
        String rules,
        boolean rulesAssumed,
        @Nullable Boolean survived,
        @Nullable String worstCase,
        String why,
        List<CriterionResult> worst,
        List<DamageResult> cases,
        List<String> notes) {

    /** Copies the lists. */
    public DamageSurvey {
        worst = List.copyOf(worst);
        cases = List.copyOf(cases);
        notes = List.copyOf(notes);
    }

    /**
     * What is to be judged.
     *
     * @param cases the cases
     * @param reasons where each of them comes from, in a sentence
     * @param notes what they leave out, and why
     */
    public record Question(List<DamageCase> cases, List<String> reasons, List<String> notes) {

        /** Copies the lists. */
        public Question {
            cases = List.copyOf(cases);
            reasons = List.copyOf(reasons);
            notes = List.copyOf(notes);
        }

        /** This and another. */
        public Question and(Question other) {
            return new Question(joined(cases, other.cases), joined(reasons, other.reasons), joined(notes, other.notes));
        }

        private static <T> List<T> joined(List<T> a, List<T> b) {
            return Stream.concat(a.stream(), b.stream()).toList();
        }
    }

    /**
     * Judges a platform case by case.
     *
     * @param intact the platform before
     * @param modeWind wind speed for criteria that give none of their own (m/s)
     * @param progress is told of the work, may stop it
     */
    public static DamageSurvey of(
            LoadedPlatform intact, Question question, OptionalDouble modeWind, Progress progress) {
        List<DamageResult> results = new ArrayList<>();
        int count = question.cases().size();
        for (int i = 0; i < count; i++) {
            DamageCase damage = question.cases().get(i);
            progress.reached(i / (double) count, "damage case " + damage.id());
            results.add(DamageStability.judge(intact, damage, question.reasons().get(i), modeWind));
        }
        StabilityRules rules = intact.prepared().platform().stabilityRules();
        List<CriterionResult> worst = worstOfEach(results);
        Optional<DamageResult> lost = results.stream()
                .filter(r -> r.outcome() != DamageResult.Outcome.AFLOAT)
                .min(Comparator.comparing(r -> r.outcome() != DamageResult.Outcome.SINKS));
        Optional<CriterionResult> nearest = worst.stream()
                .filter(c -> c.met() != null)
                .min(Comparator.comparingDouble(DamageSurvey::relativeUrgency));
        return new DamageSurvey(
                rules.rules(),
                rules.assumed(),
                lost.isPresent() ? Boolean.FALSE : CriterionResult.allMet(worst),
                lost.map(DamageResult::damageCase)
                        .or(() -> nearest.map(CriterionResult::damageCase))
                        .orElse(null),
                lost.map(DamageResult::reason)
                        .or(() -> nearest.map(DamageSurvey::sentence))
                        .orElse("No criterion was judged."),
                worst,
                results,
                question.notes());
    }

    private static List<CriterionResult> worstOfEach(Collection<DamageResult> results) {
        Map<String, CriterionResult> worst = new LinkedHashMap<>();
        for (DamageResult result : results) {
            for (CriterionResult criterion : result.criteria()) {
                worst.merge(criterion.criterion(), criterion, (a, b) -> b.urgency() < a.urgency() ? b : a);
            }
        }
        return List.copyOf(worst.values());
    }

    /** Margins of different criteria are compared as parts of their bounds; heights, whose bound may be 0, as they are in metres. */
    private static double relativeUrgency(CriterionResult result) {
        return result.urgency() / Math.max(1, Math.abs(result.bound()));
    }

    private static String sentence(CriterionResult result) {
        Double value = result.value();
        Double azimuth = result.azimuth();
        return String.format(
                Locale.ROOT,
                "%s (%s) %s: %s where the bound is %.2f%s, %s.",
                result.criterion(),
                result.clause(),
                result.isBroken() ? "is not met" : "has the least margin",
                value == null ? "no value" : String.format(Locale.ROOT, "%.2f", value),
                result.bound(),
                azimuth == null ? "" : String.format(Locale.ROOT, ", about the axis %.0f°", azimuth),
                result.note());
    }
}
