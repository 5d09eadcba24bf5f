package org.evendraft.ballast.optimum;

/** A variable of the linear program, never negative, with its entries in the rows. Immutable. */
final class Column {
    /** Tank index of a column that belongs to no tank. */
    static final int NO_TANK = -1;

    final int[] rows;
    final double[] entries;
    final double cost;
    /** A value it never exceeds, by which rounding in a bound is made good. */
    final double upper;

    final int tank;
    final int choice;
    /** The pump that moves the amount, or {@link Flows#NO_PUMP}. */
    final int pump;
    /** What the tank gains at this column (t). */
    final double amount;

    private Column(int[] rows, double[] entries, double cost, double upper, TankPoint point) {
        this.rows = rows;
        this.entries = entries;
        this.cost = cost;
        this.upper = upper;
        this.tank = point.tank;
        this.choice = point.choice;
        this.pump = point.pump;
        this.amount = point.amount;
    }

    /** A column of no tank. */
    static Column free(int[] rows, double[] entries, double cost, double upper) {
        return new Column(rows, entries, cost, upper, TankPoint.NONE);
    }

    /** A point at which a tank may end; its share of the tank is at most 1. */
    static Column of(TankPoint point, int[] rows, double[] entries, double cost) {
        return new Column(rows, entries, cost, 1, point);
    }

    /** The scalar product with a dense vector. */
    double times(double[] vector) {
        double sum = 0;
        for (int i = 0; i < rows.length; i++) {
            sum += entries[i] * vector[rows[i]];
        }
        return sum;
    }

    /**
     * Where on a tank's choices a column stands.
     *
     * @param tank index of the tank
     * @param choice index of the choice
     * @param pump pump that serves it
     * @param amount what the tank gains (t)
     */
    record TankPoint(int tank, int choice, int pump, double amount) {
        static final TankPoint NONE = new TankPoint(NO_TANK, 0, Flows.NO_PUMP, 0);
    }
}
