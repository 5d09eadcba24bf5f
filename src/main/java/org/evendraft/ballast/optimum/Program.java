package org.evendraft.ballast.optimum;

import java.util.ArrayList;
import java.util.List;

/** The linear program of a model for a goal: rows and their scales, and columns made on demand. Immutable. */
final class Program {
    /** Pump rows and sea columns count in thousands of tonnes, to have entries near 1. */
    private static final double PUMP_UNIT = 1000;
    /** When the excess is what counts, one unit of it weighs as much as this (t). */
    private static final double EXCESS_PRICE = 1e6;
    /** When the excess is what counts, the cost only tells equal ones apart. */
    private static final double COST_BESIDE_EXCESS = 1e-2;
    /** No excess is greater, in the row's unit times its weight. */
    private static final double GREATEST_EXCESS = 1e5;

    /** A scaled row may be this far over its bound for rounding. */
    private static final double SLIP = 1e-7;

    private final Model model;
    private final double costFactor;
    private final int tanks;
    private final int effects;
    private final double[] scale;
    private final LinearProgram linear;
    private final List<Column> free = new ArrayList<>();

    Program(Model model, Goal goal) {
        this.model = model;
        this.tanks = model.tanks().size();
        this.effects = model.rows().size();
        this.costFactor = goal instanceof Goal.Excess ? COST_BESIDE_EXCESS : 1;
        this.scale = scales();
        this.linear = rows(goal);
        addSea();
        if (!(goal instanceof Goal.Cost)) {
            addExcess(goal);
        }
    }

    private double[] scales() {
        double[] greatest = new double[effects];
        for (TankModel tank : model.tanks()) {
            for (Choice choice : tank.choices()) {
                for (Point point : choice.points()) {
                    for (int r = 0; r < effects; r++) {
                        greatest[r] = Math.max(greatest[r], Math.abs(point.effect(r)));
                    }
                }
            }
        }
        double[] scales = new double[effects];
        for (int r = 0; r < effects; r++) {
            scales[r] = greatest[r] > 0 ? 1 / greatest[r] : 1;
        }
        return scales;
    }

    private LinearProgram rows(Goal goal) {
        boolean within = goal instanceof Goal.CostWithinExcess;
        int pumps = model.pumps().size();
        double[] rhs = new double[tanks + effects + pumps + (within ? 1 : 0)];
        boolean[] equality = new boolean[rhs.length];
        for (int i = 0; i < tanks; i++) {
            rhs[i] = 1;
            equality[i] = true;
        }
        for (int r = 0; r < effects; r++) {
            rhs[tanks + r] = scale[r] * model.rows().get(r).bound();
        }
        for (int p = 0; p < pumps; p++) {
            equality[tanks + effects + p] = true;
        }
        if (goal instanceof Goal.CostWithinExcess limit) {
            rhs[rhs.length - 1] = limit.most();
        }
        return new LinearProgram(rhs, equality);
    }

    private void addSea() {
        double most = 0;
        for (TankModel tank : model.tanks()) {
            most += tank.choices().stream()
                    .mapToDouble(choice -> Math.max(Math.abs(choice.least()), Math.abs(choice.greatest())))
                    .max()
                    .orElse(0);
        }
        for (int p = 0; p < model.pumps().size(); p++) {
            int[] row = {pumpRow(p)};
            double upper = most / PUMP_UNIT;
            if (model.pumps().get(p).draws()) {
                free.add(Column.free(row, new double[] {-1}, costFactor * PUMP_UNIT, upper));
            }
            if (model.pumps().get(p).discharges()) {
                free.add(Column.free(row, new double[] {1}, 0, upper));
            }
        }
    }

    private void addExcess(Goal goal) {
        boolean least = goal instanceof Goal.Excess;
        for (int r = 0; r < effects; r++) {
            double weight = model.rows().get(r).weight();
            int[] rows = least ? new int[] {tanks + r} : new int[] {tanks + r, linear.size() - 1};
            double[] entries = least ? new double[] {-scale[r] / weight} : new double[] {-scale[r] / weight, 1};
            free.add(Column.free(rows, entries, least ? EXCESS_PRICE : 0, GREATEST_EXCESS));
        }
    }

    LinearProgram linear() {
        return linear;
    }

    Model model() {
        return model;
    }

    List<Column> free() {
        return free;
    }

    int pumpRow(int pump) {
        return tanks + effects + pump;
    }

    int effectRow(int row) {
        return tanks + row;
    }

    /** What a cost in tonnes counts under the goal. */
    double priced(double cost, double excess) {
        return costFactor * cost + (costFactor == 1 ? 0 : EXCESS_PRICE * excess);
    }

    /** An effect in the scale of its row. */
    double scaled(int row, double effect) {
        return scale[row] * effect;
    }

    /** How far a row of effects may be over its bound for rounding, in the row's unit. */
    double slip(int row) {
        return SLIP / scale[row];
    }

    /** The column of a tank at a point of a choice, moved by a pump. */
    Column column(int tank, int choice, Point point, int pump) {
        Choice way = model.tanks().get(tank).choices().get(choice);
        double cost = costFactor * (way.fixedCost() + Math.max(0, -point.amount()));
        int[] rows = new int[1 + effects + (pump == Flows.NO_PUMP ? 0 : 1)];
        double[] entries = new double[rows.length];
        rows[0] = tank;
        entries[0] = 1;
        for (int r = 0; r < effects; r++) {
            rows[1 + r] = tanks + r;
            entries[1 + r] = scale[r] * point.effect(r);
        }
        if (pump != Flows.NO_PUMP) {
            rows[1 + effects] = pumpRow(pump);
            entries[1 + effects] = point.amount() / PUMP_UNIT;
        }
        return Column.of(new Column.TankPoint(tank, choice, pump, point.amount()), rows, entries, cost);
    }

    /** What a pump exchanges with the sea in a solution: the amount of a free column of a pump row (t). */
    static double seaAmount(double value) {
        return value * PUMP_UNIT;
    }
}
