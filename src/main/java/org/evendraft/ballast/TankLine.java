package org.evendraft.ballast;

import java.util.ArrayList;
import java.util.List;
import java.util.NavigableSet;
import java.util.TreeSet;
import org.evendraft.ballast.optimum.Choice;
import org.evendraft.ballast.optimum.Choice.Kind;
import org.evendraft.ballast.optimum.Point;
import org.evendraft.platform.TableRow;

/**
 * Makes the choices of a tank: stretches of its contents, each a polyline through the exact effects at points chosen so that straight
 * lines between them miss no row by more than is negligible (after Ramer 1972, Douglas and Peucker 1973).
 */
final class TankLine {
    /** Points are chosen among the rows of the tank's table and this many equal steps of the full tank. */
    private static final int STEPS = 16;
    /** Amounts closer than this are the same (t). */
    private static final double SAME = 1e-9;

    private final BallastTank tank;
    private final List<Coupling> rows;
    private final PlanRequest.Objective objective;
    private final double[] atStart;

    TankLine(BallastTank tank, List<Coupling> rows, PlanRequest.Objective objective) {
        this.tank = tank;
        this.rows = rows;
        this.objective = objective;
        this.atStart = effects(tank.atStart());
    }

    List<Choice> choices() {
        List<Choice> choices = new ArrayList<>();
        double resting = tank.slack(tank.start()) ? objective.slackPenalty() : 0;
        choices.add(new Choice(Kind.UNTOUCHED, resting, List.of(new Point(0, new double[rows.size()]))));
        double touch = objective.touchPenalty();
        add(choices, Kind.STRIPPED, tank.least(), Math.min(tank.leastPumpable(), tank.greatest()), touch);
        double top = Math.min(tank.pressedUp(), tank.greatest());
        add(choices, Kind.SLACK, tank.leastPumpable(), top, touch + objective.slackPenalty());
        add(choices, Kind.PRESSED_UP, tank.pressedUp(), tank.greatest(), touch);
        return choices;
    }

    private void add(List<Choice> choices, Kind kind, double from, double to, double cost) {
        addPart(choices, kind, from, Math.min(to, tank.start()), cost);
        addPart(choices, kind, Math.max(from, tank.start()), to, cost);
    }

    private void addPart(List<Choice> choices, Kind kind, double from, double to, double cost) {
        boolean onlyStart = to - from <= SAME && Math.abs(from - tank.start()) <= SAME;
        if (to >= from && !onlyStart) {
            choices.add(new Choice(kind, cost, line(from, to, kind == Kind.PRESSED_UP)));
        }
    }

    private List<Point> line(double from, double to, boolean pressedUp) {
        NavigableSet<Double> masses = new TreeSet<>(List.of(from, to));
        if (to - from > SAME) {
            for (TableRow row : tank.calibration().table()) {
                masses.add(row.volume() * tank.density());
            }
            for (int i = 1; i < STEPS; i++) {
                masses.add(i * tank.full() / STEPS);
            }
        }
        List<Point> all = new ArrayList<>();
        double before = Double.NEGATIVE_INFINITY;
        for (double mass : masses.subSet(from, true, to, true)) {
            if (mass - before > SAME || mass == to) {
                all.add(new Point(mass - tank.start(), gained(tank.at(mass, pressedUp))));
                before = mass;
            }
        }
        List<Point> kept = new ArrayList<>(List.of(all.get(0)));
        thin(all, 0, all.size() - 1, kept);
        return kept;
    }

    /** Adds the points needed after the first up to the last. */
    private void thin(List<Point> all, int first, int last, List<Point> kept) {
        int worst = -1;
        double most = 1;
        for (int i = first + 1; i < last; i++) {
            double miss = miss(all.get(first), all.get(last), all.get(i));
            if (miss > most) {
                most = miss;
                worst = i;
            }
        }
        if (worst > 0) {
            thin(all, first, worst, kept);
            thin(all, worst, last, kept);
        } else if (last > first) {
            kept.add(all.get(last));
        }
    }

    /** How far the straight line misses a point, in the row where it is worst, in parts of what is negligible. */
    private double miss(Point low, Point high, Point point) {
        double part = (point.amount() - low.amount()) / (high.amount() - low.amount());
        double worst = 0;
        for (int r = 0; r < rows.size(); r++) {
            double straight = low.effect(r) + part * (high.effect(r) - low.effect(r));
            worst = Math.max(
                    worst, Math.abs(straight - point.effect(r)) / rows.get(r).negligible());
        }
        return worst;
    }

    private double[] gained(Contents contents) {
        double[] effects = effects(contents);
        for (int r = 0; r < effects.length; r++) {
            effects[r] -= atStart[r];
        }
        return effects;
    }

    private double[] effects(Contents contents) {
        return rows.stream().mapToDouble(row -> row.effect(contents)).toArray();
    }
}
