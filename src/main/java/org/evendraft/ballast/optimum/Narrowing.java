package org.evendraft.ballast.optimum;

import java.util.ArrayList;
import java.util.List;

/**
 * Cuts off what cannot be part of a plan better than the best one known: with row prices y, any plan in which a tank ends at a point
 * costs at least the bound plus that point's reduced cost over the tank's least (weak duality, tank by tank).
 */
final class Narrowing {
    /** A stretch is shortened only when that takes off this part of it. */
    private static final double WORTH = 0.05;
    /** Costs are compared with this to spare (t). */
    private static final double SPARE = 1e-7;

    private final Program program;
    private final double[] prices;
    private final double allowance;
    private boolean changed;

    /**
     * @param prices row prices
     * @param allowance cost of the best plan less the bound at these prices
     */
    Narrowing(Program program, double[] prices, double allowance) {
        this.program = program;
        this.prices = prices;
        this.allowance = allowance + SPARE;
    }

    boolean changed() {
        return changed;
    }

    List<List<Span>> of(List<List<Span>> open) {
        List<List<Span>> result = new ArrayList<>();
        for (int t = 0; t < open.size(); t++) {
            result.add(narrowed(t, open.get(t)));
        }
        return result;
    }

    private List<Span> narrowed(int tank, List<Span> spans) {
        double least = Double.POSITIVE_INFINITY;
        for (Span span : spans) {
            for (int i = 0; i < span.line.size(); i++) {
                least = Math.min(least, reduced(span, i));
            }
        }
        List<Span> left = new ArrayList<>();
        for (Span span : spans) {
            shortened(tank, span, least, left);
        }
        return left;
    }

    private double reduced(Span span, int point) {
        double least = Double.POSITIVE_INFINITY;
        for (Column column : span.columns.get(point)) {
            least = Math.min(least, column.cost - column.times(prices));
        }
        return least;
    }

    private void shortened(int tank, Span span, double least, List<Span> left) {
        int n = span.line.size();
        double[] over = new double[n];
        int first = -1;
        int last = -1;
        for (int i = 0; i < n; i++) {
            over[i] = reduced(span, i) - least - allowance;
            if (over[i] <= 0) {
                first = first < 0 ? i : first;
                last = i;
            }
        }
        if (first < 0) {
            changed = true;
            return;
        }
        double from = first == 0 ? 0 : first - crossing(over[first], over[first - 1]);
        double to = last == n - 1 ? last : last + crossing(over[last], over[last + 1]);
        double kept = amountAt(span, to) - amountAt(span, from);
        if (kept < (1 - WORTH) * (span.greatest() - span.least())) {
            changed = true;
            left.add(span.between(program, tank, from, to));
        } else {
            left.add(span);
        }
    }

    /**
     * How far from an allowed point towards one that is not it may still go. With several pumps the least reduced cost is concave
     * between points, so that the straight line is never too high: nothing allowed is cut off.
     */
    private static double crossing(double inside, double outside) {
        return outside - inside > 0 ? -inside / (outside - inside) : 1;
    }

    private static double amountAt(Span span, double place) {
        int i = (int) Math.floor(place);
        double low = span.line.get(i).amount();
        return place > i ? low + (place - i) * (span.line.get(i + 1).amount() - low) : low;
    }
}
