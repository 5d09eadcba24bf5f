package org.evendraft.ballast.optimum;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.evendraft.ballast.optimum.Choice.Kind;

/** Random questions of the kind that platforms give: rows of draft, heel and trim bands and of a metacentric height. */
final class Questions {
    static final double PENALTY = 20;
    private static final double AREA = 640;
    private static final double STIFFNESS = 80_000;
    private static final double DRAFT_TOLERANCE = 0.01;
    private static final double ANGLE_TOLERANCE = 3.5e-4;

    private final Random random;
    private final int tanks;
    private final int pumps;
    private final double breadth;

    /** @param breadth how many times the usual tolerance the bands have */
    Questions(long seed, int tanks, int pumps, double breadth) {
        this.random = new Random(seed);
        this.breadth = breadth;
        this.tanks = tanks;
        this.pumps = pumps;
    }

    Model model() {
        List<TankModel> made = new ArrayList<>();
        for (int t = 0; t < tanks; t++) {
            made.add(tank(t));
        }
        List<Model.SeaEnds> ends = new ArrayList<>();
        for (int p = 0; p < pumps; p++) {
            ends.add(new Model.SeaEnds(random.nextInt(8) > 0, random.nextInt(8) > 0));
        }
        return new Model(made, ends, rows());
    }

    private List<Model.Row> rows() {
        double draft = uniform(-0.4, 0.4);
        double heel = uniform(-0.06, 0.06);
        double trim = uniform(-0.06, 0.06);
        List<Model.Row> rows = new ArrayList<>();
        band(rows, draft, DRAFT_TOLERANCE);
        band(rows, heel, ANGLE_TOLERANCE);
        band(rows, trim, ANGLE_TOLERANCE);
        rows.add(new Model.Row(uniform(-0.01, 0.1), 10));
        return rows;
    }

    private void band(List<Model.Row> rows, double middle, double usual) {
        double tolerance = breadth * usual;
        rows.add(new Model.Row(middle + tolerance, 1 / tolerance));
        rows.add(new Model.Row(tolerance - middle, 1 / tolerance));
    }

    private double uniform(double from, double to) {
        return from + (to - from) * random.nextDouble();
    }

    private TankModel tank(int t) {
        int pair = t / 2;
        double x = -45 + 90.0 * pair / Math.max(1, (tanks - 1) / 2);
        double y = t % 2 == 0 ? 29 : -29;
        double full = uniform(500, 1600);
        double start = random.nextInt(4) == 0 ? 0 : random.nextInt(4) == 0 ? full : uniform(0, full);
        Line line = new Line(x, y, full, start, uniform(6, 12), uniform(500, 3000));
        List<Choice> choices = new ArrayList<>();
        boolean slack = start > line.least() && start < line.pressed();
        choices.add(new Choice(Kind.UNTOUCHED, slack ? PENALTY : 0, List.of(new Point(0, new double[7]))));
        line.stretch(choices, Kind.STRIPPED, Math.min(start, line.least()), line.least(), PENALTY);
        line.stretch(choices, Kind.SLACK, line.least(), line.pressed(), 2 * PENALTY);
        line.stretch(choices, Kind.PRESSED_UP, line.pressed(), full, PENALTY);
        List<Integer> through = pumpsOf(t);
        return new TankModel(String.format("T%02d", t), choices, through, through, twin(t));
    }

    private int twin(int t) {
        int other = t ^ 1;
        return other < tanks ? other : t;
    }

    /** Each pump serves a side; a spare pump now and then serves both. */
    private List<Integer> pumpsOf(int t) {
        List<Integer> through = new ArrayList<>();
        for (int p = 0; p < pumps; p++) {
            if (p % 2 == t % 2 || (p >= 2 && random.nextInt(3) == 0)) {
                through.add(p);
            }
        }
        return through;
    }

    /** Effects along a tank: linear but for the metacentric height, where the centroid rises and the surface comes and goes. */
    private record Line(double x, double y, double full, double start, double height, double surface) {
        private static final int SEGMENTS = 3;
        private static final double MASS = 35_000;

        double least() {
            return 0.01 * full;
        }

        double pressed() {
            return 0.98 * full;
        }

        void stretch(List<Choice> choices, Kind kind, double from, double to, double cost) {
            part(choices, kind, from, Math.min(to, start), cost);
            part(choices, kind, Math.max(from, start), to, cost);
        }

        private void part(List<Choice> choices, Kind kind, double from, double to, double cost) {
            if (to < from || (to == from && to == start)) {
                return;
            }
            List<Point> points = new ArrayList<>();
            int segments = to > from ? SEGMENTS : 0;
            for (int i = 0; i <= segments; i++) {
                double mass = i == segments ? to : from + (to - from) * i / segments;
                points.add(new Point(mass - start, effects(mass, kind)));
            }
            choices.add(new Choice(kind, cost, points));
        }

        private double[] effects(double mass, Kind kind) {
            double gain = mass - start;
            double draft = gain / AREA;
            double heel = -gain * y / STIFFNESS;
            double trim = gain * x / STIFFNESS;
            double before = start * height * start / full / 2 + surfaceAt(start, start > 0 && start < pressed());
            double after = mass * height * mass / full / 2 + surfaceAt(mass, kind != Kind.PRESSED_UP);
            return new double[] {draft, -draft, heel, -heel, trim, -trim, (after - before - 9 * gain) / MASS};
        }

        /** A surface that is widest at half height, so that the line is not convex. */
        private double surfaceAt(double mass, boolean free) {
            double part = mass / full;
            return free ? surface * (0.5 + 2 * part * (1 - part)) : 0;
        }
    }
}
