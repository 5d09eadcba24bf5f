package org.evendraft.ballast.optimum;

import java.util.Optional;

/** The best plan so far: least in the goal, then fewest tanks, then most alike on both sides, then first by name. Mutable, for one search. */
final class Incumbent {
    /** Costs closer than this are equal (t). */
    private static final double EQUAL = 1e-6;
    /** A bound this part under the best plan's goal, or this many tonnes, proves it. */
    private static final double CLOSE = 1e-6;

    private final Program program;
    private Optional<Optimum> best = Optional.empty();

    Incumbent(Program program) {
        this.program = program;
    }

    Optional<Optimum> best() {
        return best;
    }

    double value() {
        return best.map(this::value).orElse(Double.POSITIVE_INFINITY);
    }

    private double value(Optimum plan) {
        return program.priced(plan.cost(), plan.excess());
    }

    /** A bound at or above this needs no further search. */
    double cutoff() {
        return best.isEmpty() ? Double.POSITIVE_INFINITY : value() - CLOSE * Math.max(1, value());
    }

    /** Takes a plan when it is better; tells whether it was. */
    boolean offer(Optional<Optimum> plan) {
        if (plan.isEmpty() || (best.isPresent() && !better(plan.get(), best.get()))) {
            return false;
        }
        best = plan;
        return true;
    }

    private boolean better(Optimum a, Optimum b) {
        double difference = value(a) - value(b);
        if (Math.abs(difference) > EQUAL * Math.max(1, Math.abs(value(b)) * CLOSE)) {
            return difference < 0;
        }
        if (a.touched() != b.touched()) {
            return a.touched() < b.touched();
        }
        double lopsided = lopsidedness(a) - lopsidedness(b);
        if (Math.abs(lopsided) > EQUAL) {
            return lopsided < 0;
        }
        return earlier(a, b);
    }

    /** How much the amounts of mirror twins differ, all together (t). */
    private double lopsidedness(Optimum plan) {
        double sum = 0;
        for (int t = 0; t < plan.amounts().size(); t++) {
            int twin = program.model().tanks().get(t).twin();
            sum += Math.abs(plan.amounts().get(t) - plan.amounts().get(twin));
        }
        return sum;
    }

    /** Tanks are in the order of their names: the plan that touches the earlier ones. */
    private static boolean earlier(Optimum a, Optimum b) {
        for (int t = 0; t < a.choices().size(); t++) {
            boolean inA = a.choices().get(t) > 0;
            boolean inB = b.choices().get(t) > 0;
            if (inA != inB) {
                return inA;
            }
        }
        return false;
    }
}
