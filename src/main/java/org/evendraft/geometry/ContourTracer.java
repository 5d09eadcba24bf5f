package org.evendraft.geometry;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/** Follows the contours that a horizontal plane cuts from a closed mesh, triangle by triangle across their edges. */
final class ContourTracer {
    /** A corner that turns by less than this is none (rad). */
    private static final double STRAIGHT = 1e-7;

    /** Contours of less area are rounding (m²). */
    private static final double LEAST_AREA = 1e-9;

    private final double[] xyz;
    private final double z;
    private final Map<Long, Deque<Step>> steps = new HashMap<>();
    private final List<Step> inOrder = new ArrayList<>();

    /** The way through one triangle: the mesh edges where the plane comes in and goes out. */
    private static final class Step {
        private final long from;
        private final long to;
        private boolean taken;

        Step(long from, long to) {
            this.from = from;
            this.to = to;
        }
    }

    private ContourTracer(double[] xyz, double z) {
        this.xyz = xyz;
        this.z = z;
    }

    /** The contours of a mesh at a height; what lies in the plane counts as under it. */
    static List<Contour> trace(Mesh mesh, double z) {
        ContourTracer tracer = new ContourTracer(mesh.rawCoordinates(), z);
        int[] corners = mesh.rawCorners();
        for (int i = 0; i < corners.length; i += 3) {
            tracer.addTriangle(corners[i], corners[i + 1], corners[i + 2]);
        }
        return tracer.contours();
    }

    private boolean isOver(int vertex) {
        return xyz[3 * vertex + 2] > z;
    }

    private void addTriangle(int a, int b, int c) {
        if (isOver(a) != isOver(b) && isOver(a) != isOver(c)) {
            addStep(a, b, c);
        } else if (isOver(b) != isOver(a) && isOver(b) != isOver(c)) {
            addStep(b, c, a);
        } else if (isOver(c) != isOver(a) && isOver(c) != isOver(b)) {
            addStep(c, a, b);
        }
    }

    /** Adds the way through a triangle whose first vertex lies alone on its side: with the body to the left, seen from above. */
    private void addStep(int alone, int second, int third) {
        long first = edge(alone, second);
        long last = edge(third, alone);
        Step step = isOver(alone) ? new Step(first, last) : new Step(last, first);
        steps.computeIfAbsent(step.from, key -> new ArrayDeque<>()).add(step);
        inOrder.add(step);
    }

    /** A number for the edge between two vertices, the same from both sides. */
    private long edge(int a, int b) {
        return Math.min(a, b) * (xyz.length / 3L) + Math.max(a, b);
    }

    private List<Contour> contours() {
        List<Contour> contours = new ArrayList<>();
        for (Step step : inOrder) {
            if (!step.taken) {
                List<double[]> corners = withoutStraight(follow(step));
                if (corners.size() > 2) {
                    contours.add(new Contour(corners));
                }
            }
        }
        contours.removeIf(c -> Math.abs(c.area()) < LEAST_AREA);
        return contours;
    }

    private List<double[]> follow(Step start) {
        List<double[]> corners = new ArrayList<>();
        Step step = start;
        while (step != null && !step.taken) {
            step.taken = true;
            corners.add(point(step.from));
            Deque<Step> onward = steps.get(step.to);
            step = onward == null ? null : onward.poll();
        }
        return corners;
    }

    /** Where a mesh edge meets the plane. */
    private double[] point(long edge) {
        int a = 3 * (int) (edge / (xyz.length / 3));
        int b = 3 * (int) (edge % (xyz.length / 3));
        double part = (z - xyz[a + 2]) / (xyz[b + 2] - xyz[a + 2]);
        return new double[] {xyz[a] + part * (xyz[b] - xyz[a]), xyz[a + 1] + part * (xyz[b + 1] - xyz[a + 1])};
    }

    /** Takes out corners on a straight line, also where the contour runs back on itself as across the fan of a cap. */
    private static List<double[]> withoutStraight(List<double[]> corners) {
        List<double[]> kept = new ArrayList<>();
        for (double[] corner : corners) {
            while (kept.size() > 1 && isStraight(kept.get(kept.size() - 2), kept.get(kept.size() - 1), corner)) {
                kept.remove(kept.size() - 1);
            }
            kept.add(corner);
        }
        while (kept.size() > 2 && isStraight(kept.get(kept.size() - 2), kept.get(kept.size() - 1), kept.get(0))) {
            kept.remove(kept.size() - 1);
        }
        while (kept.size() > 2 && isStraight(kept.get(kept.size() - 1), kept.get(0), kept.get(1))) {
            kept.remove(0);
        }
        return kept;
    }

    private static boolean isStraight(double[] a, double[] b, double[] c) {
        double inX = b[0] - a[0];
        double inY = b[1] - a[1];
        double outX = c[0] - b[0];
        double outY = c[1] - b[1];
        double lengths = Math.hypot(inX, inY) * Math.hypot(outX, outY);
        return Math.abs(inX * outY - inY * outX) <= STRAIGHT * lengths;
    }
}
