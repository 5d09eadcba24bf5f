package org.evendraft.geometry;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/** A closed polygon seen from above with what it bounds on its left: anticlockwise round a body, clockwise round a hole. Immutable. */
public final class Contour {
    /** Edges in a row that share a box, so that a line passes most of a curve by. */
    private static final int RUN = 24;

    /** A line that passes a box by less is looked at closer (m). */
    private static final double ROUNDING = 1e-9;

    private final double[] x;
    private final double[] y;
    /** Length of the contour up to each corner; at the end that of the whole. */
    private final double[] lengths;

    private final Box whole;
    private final List<Run> runs;

    /**
     * A contour through corners.
     *
     * @param corners x and y of each corner in turn (m)
     * @throws IllegalArgumentException when there are none
     */
    public Contour(List<double[]> corners) {
        if (corners.isEmpty()) {
            throw new IllegalArgumentException("a contour has corners");
        }
        int n = corners.size();
        this.x = corners.stream().mapToDouble(c -> c[0]).toArray();
        this.y = corners.stream().mapToDouble(c -> c[1]).toArray();
        this.lengths = new double[n + 1];
        for (int i = 0; i < n; i++) {
            lengths[i + 1] = lengths[i] + Math.hypot(x[next(i)] - x[i], y[next(i)] - y[i]);
        }
        this.whole = box(0, n);
        this.runs = new ArrayList<>();
        for (int first = 0; first < n; first += RUN) {
            int end = Math.min(n, first + RUN);
            runs.add(new Run(first, end, box(first, end)));
        }
    }

    private int next(int i) {
        return i + 1 < x.length ? i + 1 : 0;
    }

    /** Length once round (m). */
    public double perimeter() {
        return lengths[x.length];
    }

    /** Area bounded (m²), negative for a hole. */
    public double area() {
        double twice = 0;
        for (int i = 0; i < x.length; i++) {
            twice += twiceArea(i);
        }
        return twice / 2;
    }

    /** Twice the area of the triangle that an edge makes with the first corner. */
    private double twiceArea(int i) {
        return (x[i] - x[0]) * (y[next(i)] - y[0]) - (x[next(i)] - x[0]) * (y[i] - y[0]);
    }

    /** Centroid of the area, as x and y (m); not a number when the area is 0. */
    public double[] centroid() {
        double sumX = 0;
        double sumY = 0;
        double twice = 0;
        for (int i = 0; i < x.length; i++) {
            double part = twiceArea(i);
            twice += part;
            sumX += part * (x[0] + x[i] + x[next(i)]) / 3;
            sumY += part * (y[0] + y[i] + y[next(i)]) / 3;
        }
        return new double[] {sumX / twice, sumY / twice};
    }

    /** The lesser of its extents along x and y (m). */
    public double lesserWidth() {
        return Math.min(whole.maxX - whole.minX, whole.maxY - whole.minY);
    }

    /** The greater of its extents along x and y (m). */
    public double greaterWidth() {
        return Math.max(whole.maxX - whole.minX, whole.maxY - whole.minY);
    }

    /**
     * The line square to the contour at a place on it, from there outward.
     *
     * @param length distance of the place along the contour from its first corner (m); whole turns are taken off
     */
    public PlanLine outward(double length) {
        double turned = length - perimeter() * Math.floor(length / perimeter());
        int found = Arrays.binarySearch(lengths, turned);
        int edge = Math.min(found >= 0 ? found : -found - 2, x.length - 1);
        double size = lengths[edge + 1] - lengths[edge];
        double ex = (x[next(edge)] - x[edge]) / size;
        double ey = (y[next(edge)] - y[edge]) / size;
        double part = turned - lengths[edge];
        return new PlanLine(x[edge] + part * ex, y[edge] + part * ey, ey, -ex);
    }

    /** Whether another contour is the same to within a tolerance (m): as long, as wide and at the same place. */
    public boolean isSame(Contour other, double tolerance) {
        return Math.abs(perimeter() - other.perimeter()) <= tolerance && whole.isSame(other.whole, tolerance);
    }

    /** Whether a line meets the box round the contour. */
    boolean isNear(PlanLine line) {
        return whole.isNear(line);
    }

    /** Adds where a line enters the contour (the weight) and leaves it (its negative). */
    void addCrossings(PlanLine line, double weight, Chords chords) {
        for (Run run : runs) {
            if (run.box.isNear(line)) {
                addCrossings(run, line, weight, chords);
            }
        }
    }

    private void addCrossings(Run run, PlanLine line, double weight, Chords chords) {
        double here = line.left(x[run.first], y[run.first]);
        for (int i = run.first; i < run.end; i++) {
            int j = next(i);
            double there = line.left(x[j], y[j]);
            // A corner on the line belongs to its left, so that each crossing counts once.
            if (here < 0 != there < 0) {
                double part = here / (here - there);
                double at = line.along(x[i] + part * (x[j] - x[i]), y[i] + part * (y[j] - y[i]));
                chords.add(at, here < 0 ? -weight : weight);
            }
            here = there;
        }
    }

    /** Edges in a row, told by the numbers of the first and of the one after the last, in their box. */
    private record Run(int first, int end, Box box) {}

    /** A box in plan. */
    private record Box(double minX, double maxX, double minY, double maxY) {

        boolean isNear(PlanLine line) {
            double middle = line.left((minX + maxX) / 2, (minY + maxY) / 2);
            double reach = (Math.abs(line.dy()) * (maxX - minX) + Math.abs(line.dx()) * (maxY - minY)) / 2;
            return Math.abs(middle) <= reach + ROUNDING;
        }

        boolean isSame(Box other, double tolerance) {
            return Math.abs(minX - other.minX) <= tolerance
                    && Math.abs(maxX - other.maxX) <= tolerance
                    && Math.abs(minY - other.minY) <= tolerance
                    && Math.abs(maxY - other.maxY) <= tolerance;
        }
    }

    /** The box round edges in a row. */
    private Box box(int first, int end) {
        double minX = x[first];
        double maxX = minX;
        double minY = y[first];
        double maxY = minY;
        for (int i = first; i < end; i++) {
            minX = Math.min(minX, x[next(i)]);
            maxX = Math.max(maxX, x[next(i)]);
            minY = Math.min(minY, y[next(i)]);
            maxY = Math.max(maxY, y[next(i)]);
        }
        return new Box(minX, maxX, minY, maxY);
    }
}
