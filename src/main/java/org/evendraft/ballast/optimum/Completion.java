package org.evendraft.ballast.optimum;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** Finds the best amounts once every tank's choice is made: a linear program without any choice left. For one search. */
final class Completion {
    /** How often a line that is not convex is cut back to the neighbourhood of the amount found. */
    private static final int MOST_CUTS = 3;
    /** Amounts closer than this are the same (t). */
    private static final double SAME_AMOUNT = 1e-6;

    private final Program program;
    private final List<List<Span>> whole;
    private final Map<List<Integer>, Optional<Optimum>> known = new HashMap<>();

    Completion(Program program) {
        this.program = program;
        this.whole = Node.root(program).open();
    }

    /** The best plan with these choices, or with cheaper ones that allow the same amounts. */
    Optional<Optimum> of(List<Integer> choices) {
        Optional<Optimum> found = known.get(choices);
        if (found == null) {
            found = attempt(choices);
            known.put(List.copyOf(choices), found);
            if (found.isPresent()) {
                List<Integer> cheaper = relabelled(found.get());
                found = cheaper.equals(choices) ? found : better(found, of(cheaper));
                known.put(List.copyOf(choices), found);
            }
        }
        return found;
    }

    private Optional<Optimum> better(Optional<Optimum> a, Optional<Optimum> b) {
        return b.isEmpty() || (a.isPresent() && !better(b.get(), a.get())) ? a : b;
    }

    private boolean better(Optimum a, Optimum b) {
        return program.priced(a.cost(), a.excess()) < program.priced(b.cost(), b.excess());
    }

    private Optional<Optimum> attempt(List<Integer> choices) {
        List<Span> spans = new ArrayList<>();
        for (int t = 0; t < choices.size(); t++) {
            Optional<Span> span = span(t, choices.get(t));
            if (span.isEmpty()) {
                return Optional.empty();
            }
            spans.add(span.get());
        }
        for (int cuts = 0; cuts <= MOST_CUTS; cuts++) {
            Optional<Reading> reading = solve(spans);
            if (reading.isEmpty() || !reading.get().whole()) {
                return Optional.empty();
            }
            if (reading.get().trueToLines()) {
                return reading.map(Reading::optimum);
            }
            spans = cutBack(spans, reading.get());
        }
        return Optional.empty();
    }

    private Optional<Span> span(int tank, int choice) {
        return whole.get(tank).stream().filter(span -> span.choice == choice).findFirst();
    }

    private Optional<Reading> solve(List<Span> spans) {
        List<Column> columns = new ArrayList<>(program.free());
        Column[] start = program.linear().logicals.clone();
        for (int t = 0; t < spans.size(); t++) {
            Span span = spans.get(t);
            span.columns.forEach(columns::addAll);
            if (span.line.size() == 1 && span.columns.get(0).size() == 1) {
                start[t] = span.columns.get(0).get(0);
            }
        }
        LpSolution solution = program.linear().solve(columns, List.of(start), Double.POSITIVE_INFINITY);
        return solution.optimal() ? Optional.of(new Reading(program, solution)) : Optional.empty();
    }

    private List<Span> cutBack(List<Span> spans, Reading reading) {
        List<Span> cut = new ArrayList<>();
        for (int t = 0; t < spans.size(); t++) {
            Span span = spans.get(t);
            int last = span.line.size() - 1;
            if (last > 1) {
                double place = span.place(reading.amount(t));
                double from = Math.max(0, Math.ceil(place) - 1);
                span = span.between(program, t, from, Math.min(last, from + 1));
            }
            cut.add(span);
        }
        return cut;
    }

    /** Choices of least fixed cost that allow the plan's amounts. */
    private List<Integer> relabelled(Optimum plan) {
        List<Integer> choices = new ArrayList<>();
        for (int t = 0; t < plan.choices().size(); t++) {
            int best = plan.choices().get(t);
            List<Choice> ways = program.model().tanks().get(t).choices();
            for (int c = 0; c < ways.size(); c++) {
                if (allows(ways.get(c), plan.amounts().get(t))
                        && ways.get(c).fixedCost() < ways.get(best).fixedCost()) {
                    best = c;
                }
            }
            choices.add(best);
        }
        return choices;
    }

    private static boolean allows(Choice choice, double amount) {
        return amount >= choice.least() - SAME_AMOUNT && amount <= choice.greatest() + SAME_AMOUNT;
    }
}
