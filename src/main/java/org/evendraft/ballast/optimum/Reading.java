package org.evendraft.ballast.optimum;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/** A solution of the linear program read back: shares of choices, amounts, flows. */
final class Reading {
    /** A share this close to nil or one counts as that. */
    private static final double WHOLE = 1e-7;

    private final Program program;
    private final double[][] share;
    private final double[] amount;
    private final double[][] gained;
    private final double[] fromSea;
    private final double[] toSea;
    private final double[] excess;
    /** What the mixture of points does to each row, scaled: tank by row. */
    private final double[][] mixed;

    Reading(Program program, LpSolution solution) {
        this.program = program;
        Model model = program.model();
        int tanks = model.tanks().size();
        this.share = new double[tanks][];
        for (int t = 0; t < tanks; t++) {
            share[t] = new double[model.tanks().get(t).choices().size()];
        }
        this.amount = new double[tanks];
        this.gained = new double[tanks][model.pumps().size()];
        this.fromSea = new double[model.pumps().size()];
        this.toSea = new double[model.pumps().size()];
        this.mixed = new double[tanks][model.rows().size()];
        this.excess = new double[model.rows().size()];
        for (int i = 0; i < solution.basis.size(); i++) {
            add(solution.basis.get(i), Math.max(0, solution.values[i]));
        }
    }

    private void add(Column column, double value) {
        if (column.tank != Column.NO_TANK) {
            share[column.tank][column.choice] += value;
            amount[column.tank] += value * column.amount;
            for (int r = 0; r < excess.length; r++) {
                mixed[column.tank][r] += value * column.entries[1 + r];
            }
            if (column.pump != Flows.NO_PUMP) {
                gained[column.tank][column.pump] += value * column.amount;
            }
        } else if (program.free().contains(column)) {
            int pump = column.rows[0] - program.pumpRow(0);
            if (pump < 0) {
                excess[column.rows[0] - program.effectRow(0)] += value;
            } else if (column.entries[0] < 0) {
                fromSea[pump] += Program.seaAmount(value);
            } else {
                toSea[pump] += Program.seaAmount(value);
            }
        }
    }

    double share(int tank, int choice) {
        return share[tank][choice];
    }

    double amount(int tank) {
        return amount[tank];
    }

    /** The only choice of a tank, −1 when several are mixed. */
    int single(int tank) {
        for (int c = 0; c < share[tank].length; c++) {
            if (share[tank][c] >= 1 - WHOLE) {
                return c;
            }
        }
        return -1;
    }

    boolean whole() {
        for (int t = 0; t < share.length; t++) {
            if (single(t) < 0) {
                return false;
            }
        }
        return true;
    }

    /** What the shares alone make the fixed costs (t). */
    double sharedFixedCost(int tank) {
        double sum = 0;
        for (int c = 0; c < share[tank].length; c++) {
            sum += share[tank][c] * choice(tank, c).fixedCost();
        }
        return sum;
    }

    private Choice choice(int tank, int c) {
        return program.model().tanks().get(tank).choices().get(c);
    }

    /** Whether the polylines themselves, rather than mixtures of their points, keep every row as the solution says. */
    boolean trueToLines() {
        double[] sum = trueOver();
        for (int r = 0; r < sum.length; r++) {
            if (sum[r] > program.slip(r)) {
                return false;
            }
        }
        return true;
    }

    /** How far a tank's own line is over what the mixture of its points makes it, in scaled rows added up. */
    double offLine(int tank) {
        double[] own = new double[excess.length];
        Point.addEffects(choice(tank, single(tank)).points(), amount[tank], own);
        double sum = 0;
        for (int r = 0; r < own.length; r++) {
            sum += Math.max(0, program.scaled(r, own[r]) - mixed[tank][r]);
        }
        return sum;
    }

    private double[] trueOver() {
        Model model = program.model();
        double[] sum = new double[model.rows().size()];
        for (int t = 0; t < share.length; t++) {
            Point.addEffects(choice(t, single(t)).points(), amount[t], sum);
        }
        for (int r = 0; r < sum.length; r++) {
            sum[r] -= model.rows().get(r).bound()
                    + excess[r] / model.rows().get(r).weight();
        }
        return sum;
    }

    /** The plan, when every tank has a single choice. */
    Optimum optimum() {
        List<Integer> choices = new ArrayList<>();
        List<Double> amounts = new ArrayList<>();
        double fixed = 0;
        for (int t = 0; t < share.length; t++) {
            choices.add(single(t));
            amounts.add(amount[t]);
            fixed += choice(t, single(t)).fixedCost();
        }
        Flows flows = new Flows(gained, fromSea, toSea);
        return new Optimum(
                choices,
                amounts,
                flows,
                fixed + flows.pumped(),
                Arrays.stream(excess).sum());
    }
}
