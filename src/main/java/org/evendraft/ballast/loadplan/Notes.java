package org.evendraft.ballast.loadplan;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import org.evendraft.ballast.Plan;
import org.evendraft.ballast.loadplan.LoadPlan.Ended;

/** What deserves attention in a load plan, each in a sentence. */
final class Notes {
    private final List<String> sentences = new ArrayList<>();

    private Notes() {}

    private void add(String sentence, Object... values) {
        sentences.add(String.format(Locale.ROOT, sentence, values));
    }

    /** Ballast plans that do not meet their targets, and one that was asked for and is not there. */
    static List<String> onBallast(LoadPlanRequest request, Optional<Plan> preBallast, List<EventOutcome> outcomes) {
        Notes notes = new Notes();
        if (request.ballasting() == Ballasting.ONCE && preBallast.isEmpty()) {
            notes.add("No ballast moved before the first event makes the sequence safer or gentler.");
        }
        preBallast.ifPresent(plan -> notes.feasible(plan, "before the first event"));
        for (EventOutcome outcome : outcomes) {
            outcome.planBefore().ifPresent(plan -> notes.feasible(plan, "before event " + outcome.number()));
            outcome.planAfter().ifPresent(plan -> notes.feasible(plan, "after event " + outcome.number()));
        }
        return notes.sentences;
    }

    private void feasible(Plan plan, String when) {
        if (!plan.feasible()) {
            add("The ballast plan %s does not meet its target or its limits: its own warnings tell what lacks.", when);
        }
    }

    /** Ballast that cannot be moved in the time between two events. */
    static List<String> onTime(LoadPlanRequest request, Optional<Plan> preBallast, List<EventOutcome> outcomes) {
        Notes notes = new Notes();
        double since = 0;
        double pumping = preBallast.map(Plan::durationMinutes).orElse(0.0);
        for (EventOutcome outcome : outcomes) {
            pumping += outcome.planBefore().map(Plan::durationMinutes).orElse(0.0);
            OptionalDouble minute = request.events().get(outcome.number() - 1).minute();
            if (minute.isPresent()) {
                notes.late(outcome.number(), pumping, minute.getAsDouble() - since);
                since = minute.getAsDouble();
                pumping = 0;
            }
            pumping += outcome.planAfter().map(Plan::durationMinutes).orElse(0.0);
        }
        return notes.sentences;
    }

    private void late(int number, double pumping, double available) {
        if (pumping > available) {
            add(
                    "Ballast to be moved before event %d takes %.0f minutes, and there are %.0f: the event must wait.",
                    number, pumping, available);
        }
    }

    /** Limits that are not kept, and the end of a sequence that cannot go on. */
    static List<String> onLimits(List<EventOutcome> outcomes, Optional<Ended> ended) {
        Notes notes = new Notes();
        for (EventOutcome outcome : outcomes) {
            outcome.broken()
                    .forEach(breach -> notes.add(
                            "Event %d: %s is %.3f where the bound is %.3f (%s).",
                            outcome.number(), breach.limit(), breach.value(), breach.bound(), breach.what()));
            outcome.position().limits().stream()
                    .filter(limit -> !limit.met())
                    .forEach(
                            limit -> notes.add("After event %d limit %s is not met.", outcome.number(), limit.limit()));
        }
        ended.ifPresent(end -> notes.add("The sequence ends at event %d. %s", end.event(), end.reason()));
        return notes.sentences;
    }
}
