package org.evendraft.ballast.optimum;

import java.util.List;

/** What the dual simplex method came to. */
final class LpSolution {
    /** How it ended. */
    enum Status {
        /** The least cost was found. */
        OPTIMAL,
        /** Nothing meets all rows. */
        INFEASIBLE,
        /** The bound passed the cutoff. */
        CUT_OFF,
        /** It was given up; the prices still give a bound. */
        UNFINISHED
    }

    final Status status;
    final List<Column> basis;
    /** Value of each basic column. */
    final double[] values;
    /** Price of each row. */
    final double[] prices;

    final double objective;
    final int pivots;

    LpSolution(Status status, DualSimplex solver) {
        this.status = status;
        this.basis = List.of(solver.basisColumns());
        this.values = solver.values();
        this.prices = solver.prices();
        this.objective = solver.objective();
        this.pivots = solver.pivots();
    }

    boolean optimal() {
        return status == Status.OPTIMAL;
    }

    boolean dropped() {
        return status == Status.INFEASIBLE || status == Status.CUT_OFF;
    }
}
