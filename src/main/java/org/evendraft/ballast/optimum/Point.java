package org.evendraft.ballast.optimum;

import java.util.List;

/** A point of a polyline: an amount gained and what it does to each row. Immutable. */
public final class Point {
    private final double amount;
    private final double[] effects;

    /**
     * @param amount what the tank gains, negative for a loss (t)
     * @param effects what that adds to each row, in the row's unit
     */
    public Point(double amount, double[] effects) {
        this.amount = amount;
        this.effects = effects.clone();
    }

    /** What the tank gains (t). */
    public double amount() {
        return amount;
    }

    /** What it adds to a row. */
    public double effect(int row) {
        return effects[row];
    }

    /** The point on the way to another one, 0 for here and 1 for there. */
    Point towards(Point other, double part) {
        double[] mixed = new double[effects.length];
        for (int i = 0; i < mixed.length; i++) {
            mixed[i] = effects[i] + part * (other.effects[i] - effects[i]);
        }
        return new Point(amount + part * (other.amount - amount), mixed);
    }

    /**
     * Adds the effects of a polyline at an amount.
     *
     * @param line its points, amounts rising
     * @param amount an amount, taken at the nearer end when outside (t)
     * @param sum the sum so far, by row
     */
    public static void addEffects(List<Point> line, double amount, double[] sum) {
        int i = 1;
        while (i < line.size() - 1 && line.get(i).amount < amount) {
            i++;
        }
        Point low = line.get(Math.max(0, i - 1));
        Point high = line.get(Math.min(i, line.size() - 1));
        double span = high.amount - low.amount;
        double part = span > 0 ? Math.min(1, Math.max(0, (amount - low.amount) / span)) : 0;
        for (int r = 0; r < sum.length; r++) {
            sum[r] += low.effects[r] + part * (high.effects[r] - low.effects[r]);
        }
    }
}
