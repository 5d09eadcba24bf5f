package org.evendraft.ballast.optimum;

import java.util.HashMap;
import java.util.List;
import java.util.Map;

/**
 * The dual simplex method (Lemke 1954) with a dense inverse, steepest-edge choice of the row that leaves and Harris' two-pass
 * ratio test (Harris 1973). All columns are nil outside the basis; a column that was taken away but is still basic must fall to nil,
 * from either side. Every basis on the way is dual feasible, so that its prices give a bound whenever it stops. For one solution.
 */
final class DualSimplex {
    /** Rows are scaled to entries of at most 1: a value may be this far under nil. */
    private static final double FEASIBLE = 1e-9;
    /** A value less than this under nil, with nothing to mend it, may be rounding. */
    private static final double SURELY_INFEASIBLE = 1e-7;
    /** Reduced costs (t) may be this far under nil. */
    private static final double DUAL_FEASIBLE = 1e-9;
    /** Smaller pivots are not trusted. */
    private static final double LEAST_PIVOT = 1e-8;

    private static final int REFACTOR_AFTER = 40;
    private static final int MOST_PIVOTS = 2000;

    private final LinearProgram program;
    private final int size;
    private final Column[] all;
    private final boolean[] usable;
    private final boolean[] basic;
    private final int[] basis;
    private final double[] reduced;
    private final double[] alpha;
    private final double[] x;
    private final Inverse inverse;
    private final double cutoff;
    private int pivots;

    DualSimplex(LinearProgram program, List<Column> columns, List<Column> start, double cutoff) {
        this.program = program;
        this.size = program.size();
        this.cutoff = cutoff;
        Map<Column, Integer> index = new HashMap<>();
        columns.forEach(column -> index.put(column, index.size()));
        int given = index.size();
        for (Column column : program.logicals) {
            index.put(column, index.size());
        }
        start.forEach(column -> index.putIfAbsent(column, index.size()));
        this.all = new Column[index.size()];
        index.forEach((column, j) -> all[j] = column);
        this.usable = new boolean[all.length];
        for (int j = 0; j < given + size; j++) {
            usable[j] = j < given || !program.equality[j - given];
        }
        this.basic = new boolean[all.length];
        this.basis = new int[size];
        for (int i = 0; i < size; i++) {
            basis[i] = index.getOrDefault(start.get(i), 0);
            basic[basis[i]] = true;
        }
        this.reduced = new double[all.length];
        this.alpha = new double[all.length];
        this.x = new double[size];
        this.inverse = new Inverse(size);
    }

    LpSolution solve() {
        if (!refactor()) {
            return new LpSolution(LpSolution.Status.UNFINISHED, this);
        }
        while (pivots < MOST_PIVOTS) {
            int row = leaving();
            if (row < 0) {
                return new LpSolution(LpSolution.Status.OPTIMAL, this);
            }
            if (objective() > cutoff) {
                return new LpSolution(LpSolution.Status.CUT_OFF, this);
            }
            int entering = entering(row);
            if (entering < 0) {
                boolean surely = Math.abs(x[row]) > SURELY_INFEASIBLE;
                return new LpSolution(surely ? LpSolution.Status.INFEASIBLE : LpSolution.Status.UNFINISHED, this);
            }
            if (!pivot(row, entering)) {
                return new LpSolution(LpSolution.Status.UNFINISHED, this);
            }
        }
        return new LpSolution(LpSolution.Status.UNFINISHED, this);
    }

    /** The row whose value is most out of bounds for the length of its edge, −1 for none. */
    private int leaving() {
        int best = -1;
        double most = 0;
        for (int i = 0; i < size; i++) {
            double out = usable[basis[i]] ? Math.max(0, -x[i]) : Math.abs(x[i]);
            if (out > FEASIBLE) {
                double merit = out * out / inverse.squaredNorm(i);
                if (merit > most) {
                    most = merit;
                    best = i;
                }
            }
        }
        return best;
    }

    /** The column that keeps all reduced costs at least nil, by the largest pivot among near ties; −1 for none. */
    private int entering(int row) {
        double sign = x[row] < 0 ? -1 : 1;
        double[] rho = inverse.row(row);
        double reach = Double.POSITIVE_INFINITY;
        for (int j = 0; j < all.length; j++) {
            if (basic[j] || !usable[j]) {
                continue;
            }
            alpha[j] = sign * all[j].times(rho);
            if (alpha[j] > LEAST_PIVOT) {
                reach = Math.min(reach, (Math.max(0, reduced[j]) + DUAL_FEASIBLE) / alpha[j]);
            }
        }
        int best = -1;
        double largest = 0;
        for (int j = 0; j < all.length; j++) {
            if (!basic[j]
                    && usable[j]
                    && alpha[j] > LEAST_PIVOT
                    && alpha[j] > largest
                    && Math.max(0, reduced[j]) <= reach * alpha[j]) {
                best = j;
                largest = alpha[j];
            }
        }
        return best;
    }

    private boolean pivot(int row, int entering) {
        double sign = x[row] < 0 ? -1 : 1;
        double step = Math.max(0, reduced[entering]) / alpha[entering];
        for (int j = 0; j < all.length; j++) {
            if (!basic[j] && usable[j]) {
                reduced[j] -= step * alpha[j];
            }
        }
        double[] change = inverse.times(all[entering]);
        double length = x[row] / change[row];
        for (int i = 0; i < size; i++) {
            x[i] -= length * change[i];
        }
        x[row] = length;
        basic[basis[row]] = false;
        reduced[basis[row]] = sign < 0 ? step : -step;
        basis[row] = entering;
        basic[entering] = true;
        reduced[entering] = 0;
        inverse.replace(row, change);
        pivots++;
        return pivots % REFACTOR_AFTER != 0 || refactor();
    }

    private boolean refactor() {
        if (!inverse.of(basisColumns())) {
            return false;
        }
        for (int i = 0; i < size; i++) {
            x[i] = inverse.rowTimes(i, program.rhs);
        }
        double[] y = prices();
        for (int j = 0; j < all.length; j++) {
            reduced[j] = basic[j] ? 0 : all[j].cost - all[j].times(y);
        }
        return true;
    }

    Column[] basisColumns() {
        Column[] columns = new Column[size];
        for (int i = 0; i < size; i++) {
            columns[i] = all[basis[i]];
        }
        return columns;
    }

    double[] values() {
        return x.clone();
    }

    double[] prices() {
        double[] y = new double[size];
        for (int i = 0; i < size; i++) {
            double cost = all[basis[i]].cost;
            if (cost != 0) {
                double[] row = inverse.row(i);
                for (int k = 0; k < size; k++) {
                    y[k] += cost * row[k];
                }
            }
        }
        return y;
    }

    double objective() {
        double sum = 0;
        for (int i = 0; i < size; i++) {
            sum += all[basis[i]].cost * x[i];
        }
        return sum;
    }

    int pivots() {
        return pivots;
    }
}
