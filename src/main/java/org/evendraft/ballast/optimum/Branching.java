package org.evendraft.ballast.optimum;

import java.util.ArrayList;
import java.util.List;

/** Decides which tank to decide next, and how its open stretches are shared among the children. */
final class Branching {
    private static final int UNTOUCHED = 0;
    /** A share of less than this is rounding. */
    private static final double SHARE = 1e-7;

    private final Program program;
    private final Node node;
    private final Reading reading;

    Branching(Program program, Node node, Reading reading) {
        this.program = program;
        this.node = node;
        this.reading = reading;
    }

    /** A tank and the stretches that each child keeps; no children when nothing is left to decide. */
    record Decision(int tank, List<List<Span>> children) {}

    Decision decide() {
        int tank = mostUnderpaid();
        if (tank >= 0) {
            return new Decision(tank, byChoice(tank));
        }
        return byLine();
    }

    /** The tank with several choices whose shares pay least of the fixed cost that they will come to; −1 for none. */
    private int mostUnderpaid() {
        int best = -1;
        double most = -1;
        for (int t = 0; t < node.open().size(); t++) {
            if (reading.single(t) < 0) {
                double underpaid = dearest(t) - reading.sharedFixedCost(t);
                if (underpaid > most) {
                    most = underpaid;
                    best = t;
                }
            }
        }
        return best;
    }

    private double dearest(int tank) {
        double dearest = 0;
        for (Span span : node.open().get(tank)) {
            if (reading.share(tank, span.choice) > SHARE) {
                dearest = Math.max(
                        dearest,
                        program.model()
                                .tanks()
                                .get(tank)
                                .choices()
                                .get(span.choice)
                                .fixedCost());
            }
        }
        return dearest;
    }

    private List<List<Span>> byChoice(int tank) {
        int alone = UNTOUCHED;
        if (reading.share(tank, UNTOUCHED) <= SHARE) {
            for (Span span : node.open().get(tank)) {
                if (reading.share(tank, span.choice) > reading.share(tank, alone)) {
                    alone = span.choice;
                }
            }
        }
        List<Span> first = new ArrayList<>();
        List<Span> rest = new ArrayList<>();
        for (Span span : node.open().get(tank)) {
            (span.choice == alone ? first : rest).add(span);
        }
        return List.of(first, rest);
    }

    /** Splits the line that the solution leaves farthest, at the inner point nearest to the amount. */
    private Decision byLine() {
        int best = -1;
        double farthest = 0;
        for (int t = 0; t < node.open().size(); t++) {
            if (spanInUse(t).line.size() > 2 && reading.offLine(t) > farthest) {
                farthest = reading.offLine(t);
                best = t;
            }
        }
        return best < 0 ? new Decision(0, List.of()) : new Decision(best, halves(best));
    }

    private List<List<Span>> halves(int tank) {
        Span span = spanInUse(tank);
        int last = span.line.size() - 1;
        double at = Math.min(last - 1, Math.max(1, Math.rint(span.place(reading.amount(tank)))));
        return List.of(List.of(span.between(program, tank, 0, at)), List.of(span.between(program, tank, at, last)));
    }

    private Span spanInUse(int tank) {
        int choice = reading.single(tank);
        return node.open().get(tank).stream()
                .filter(span -> span.choice == choice)
                .findFirst()
                .orElseThrow();
    }
}
