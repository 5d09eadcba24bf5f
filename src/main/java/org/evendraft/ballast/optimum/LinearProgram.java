package org.evendraft.ballast.optimum;

import java.util.Arrays;
import java.util.List;

/**
 * The rows of a linear program {@code min c·x, A x ≤ b or = b, x ≥ 0}, whose columns are given anew for every solution: branching
 * only takes columns away or puts points between others, so the program itself stays. Immutable.
 */
final class LinearProgram {
    final double[] rhs;
    final boolean[] equality;
    /** One logical column a row: the slack of an inequality, nothing at all in an equation. */
    final Column[] logicals;

    LinearProgram(double[] rhs, boolean[] equality) {
        this.rhs = rhs.clone();
        this.equality = equality.clone();
        this.logicals = new Column[rhs.length];
        for (int i = 0; i < rhs.length; i++) {
            logicals[i] = Column.free(new int[] {i}, new double[] {1}, 0, Double.POSITIVE_INFINITY);
        }
    }

    int size() {
        return rhs.length;
    }

    /**
     * Solves for the columns given.
     *
     * @param columns what may be used; every cost at least 0, or dual feasible at the basis
     * @param start a dual feasible basis; columns in it that are not given are driven to zero
     * @param cutoff a bound above which the answer no longer matters
     */
    LpSolution solve(List<Column> columns, List<Column> start, double cutoff) {
        return new DualSimplex(this, columns, start, cutoff).solve();
    }

    /**
     * A lower bound on the cost from any row prices (weak duality): prices of the wrong sign are set to nil, each tank takes its
     * cheapest column, and a free column that prices out below nil is charged at its greatest value. Holds whatever rounding was done.
     */
    double bound(double[] prices, List<Column> columns, int tanks) {
        double[] y = prices.clone();
        double total = 0;
        for (int i = tanks; i < y.length; i++) {
            if (!equality[i] && y[i] > 0) {
                y[i] = 0;
            }
            total += y[i] * rhs[i];
        }
        for (int i = 0; i < tanks; i++) {
            y[i] = 0;
        }
        double[] cheapest = new double[tanks];
        Arrays.fill(cheapest, Double.POSITIVE_INFINITY);
        for (Column column : columns) {
            double reduced = column.cost - column.times(y);
            if (column.tank != Column.NO_TANK) {
                cheapest[column.tank] = Math.min(cheapest[column.tank], reduced);
            } else if (reduced < 0) {
                total += reduced * column.upper;
            }
        }
        for (double least : cheapest) {
            total += least;
        }
        return total;
    }
}
