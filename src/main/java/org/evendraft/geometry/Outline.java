package org.evendraft.geometry;

import java.util.ArrayList;
import java.util.List;

/**
 * A closed plane polygon, anticlockwise, with the integrals of the area that it bounds. Curves are polygons whose area is that of
 * the curve and whose edges span at most {@link #STEP}.
 */
final class Outline {
    /**
     * Greatest angle that one edge of a tessellated curve spans (rad). The edges of an area-true polygon lie within ±r·STEP²/12 of
     * the circle, so a cut along the axis of a lying cylinder has its breadth b within r²·STEP²/(3b) and its second moment (∝ b³)
     * within r²·STEP²/b² of the true one: under 1e-4 for every cut broader than a fifth of the diameter, that is deeper than one
     * hundredth of it.
     */
    static final double STEP = 2 * Math.PI / 1440;

    private static final double SAME_POINT = 1e-9;

    private final double[] p;
    private final double[] q;
    private final double area;
    private final double centroidP;
    private final double centroidQ;
    private final double spp;
    private final double sqq;
    private final double spq;
    private final double radius;

    private Outline(List<double[]> points) {
        int n = points.size();
        double twice = 0;
        double mp = 0;
        double mq = 0;
        double p0 = points.get(0)[0];
        double q0 = points.get(0)[1];
        for (int i = 0; i < n; i++) {
            double[] a = points.get(i);
            double[] b = points.get((i + 1) % n);
            double c = (a[0] - p0) * (b[1] - q0) - (b[0] - p0) * (a[1] - q0);
            twice += c;
            mp += c * (a[0] + b[0] - 2 * p0);
            mq += c * (a[1] + b[1] - 2 * q0);
        }
        area = Math.abs(twice / 2);
        centroidP = p0 + mp / (3 * twice);
        centroidQ = q0 + mq / (3 * twice);
        p = new double[n];
        q = new double[n];
        for (int i = 0; i < n; i++) {
            double[] a = points.get(twice > 0 ? i : n - 1 - i);
            p[i] = a[0] - centroidP;
            q[i] = a[1] - centroidQ;
        }
        double pp = 0;
        double qq = 0;
        double pq = 0;
        double far = 0;
        for (int i = 0; i < n; i++) {
            int j = (i + 1) % n;
            double c = p[i] * q[j] - p[j] * q[i];
            pp += c * (p[i] * p[i] + p[i] * p[j] + p[j] * p[j]) / 12;
            qq += c * (q[i] * q[i] + q[i] * q[j] + q[j] * q[j]) / 12;
            pq += c * (p[i] * q[j] + 2 * p[i] * q[i] + 2 * p[j] * q[j] + p[j] * q[i]) / 24;
            far = Math.max(far, Math.hypot(p[i], q[i]));
        }
        spp = pp;
        sqq = qq;
        spq = pq;
        radius = far;
    }

    /** A polygon with sharp corners, in either sense. */
    static Outline polygon(List<double[]> points) {
        return new Outline(points);
    }

    /** A circle about (0, 0). */
    static Outline circle(double radius) {
        int n = (int) Math.round(2 * Math.PI / STEP);
        double r = radius * Math.sqrt(STEP / Math.sin(STEP));
        List<double[]> points = new ArrayList<>(n);
        for (int i = 0; i < n; i++) {
            points.add(new double[] {r * Math.cos(i * STEP), r * Math.sin(i * STEP)});
        }
        return new Outline(points);
    }

    /**
     * A polygon with every corner rounded to an arc that touches both its edges.
     *
     * @throws IllegalArgumentException when two arcs need more than the edge between them
     */
    static Outline rounded(List<double[]> corners, double radius) {
        int n = corners.size();
        double[] tangents = new double[n];
        for (int i = 0; i < n; i++) {
            tangents[i] = radius * Math.tan(Math.abs(turn(corners, i)) / 2);
        }
        for (int i = 0; i < n; i++) {
            double[] a = corners.get(i);
            double[] b = corners.get((i + 1) % n);
            double length = Math.hypot(b[0] - a[0], b[1] - a[1]);
            if (tangents[i] + tangents[(i + 1) % n] > length * (1 + SAME_POINT)) {
                throw new IllegalArgumentException(
                        "corner radius " + radius + " m does not fit an edge of " + length + " m");
            }
        }
        List<double[]> points = new ArrayList<>();
        for (int i = 0; i < n; i++) {
            addArc(points, corners, i, radius, tangents[i]);
        }
        double[] first = points.get(0);
        double[] last = points.get(points.size() - 1);
        if (Math.hypot(first[0] - last[0], first[1] - last[1]) < SAME_POINT) {
            points.remove(points.size() - 1);
        }
        return new Outline(points);
    }

    /** The change of direction at a corner (rad), positive to the left. */
    private static double turn(List<double[]> corners, int i) {
        int n = corners.size();
        double[] before = corners.get((i + n - 1) % n);
        double[] at = corners.get(i);
        double[] after = corners.get((i + 1) % n);
        double ap = at[0] - before[0];
        double aq = at[1] - before[1];
        double bp = after[0] - at[0];
        double bq = after[1] - at[1];
        return Math.atan2(ap * bq - aq * bp, ap * bp + aq * bq);
    }

    private static void addArc(List<double[]> points, List<double[]> corners, int i, double radius, double tangent) {
        int n = corners.size();
        double turn = turn(corners, i);
        double[] before = corners.get((i + n - 1) % n);
        double[] at = corners.get(i);
        double length = Math.hypot(at[0] - before[0], at[1] - before[1]);
        double dp = (at[0] - before[0]) / length;
        double dq = (at[1] - before[1]) / length;
        double side = Math.signum(turn);
        double startP = at[0] - tangent * dp;
        double startQ = at[1] - tangent * dq;
        double centreP = startP - side * radius * dq;
        double centreQ = startQ + side * radius * dp;
        int edges = Math.max(2, (int) Math.ceil(Math.abs(turn) / STEP - 1e-9));
        double step = turn / edges;
        double inner = innerRadius(radius, Math.abs(turn), edges);
        double angle = Math.atan2(startQ - centreQ, startP - centreP);
        for (int k = 0; k <= edges; k++) {
            double r = k == 0 || k == edges ? radius : inner;
            double[] point = {centreP + r * Math.cos(angle + k * step), centreQ + r * Math.sin(angle + k * step)};
            double[] last = points.isEmpty() ? null : points.get(points.size() - 1);
            if (last == null || Math.hypot(point[0] - last[0], point[1] - last[1]) >= SAME_POINT) {
                points.add(point);
            }
        }
    }

    /**
     * The radius of an arc's inner vertices for which the fan of triangles under it, its two ends on the true radius r, has the
     * sector's area: {@code sin(step)·(r·x + (edges − 2)·x²/2) = r²·turn/2}, solved for x.
     */
    private static double innerRadius(double r, double turn, int edges) {
        double target = r * r * turn / (2 * Math.sin(turn / edges));
        double m = edges - 2;
        return m == 0 ? target / r : (Math.sqrt(r * r + 2 * m * target) - r) / m;
    }

    int size() {
        return p.length;
    }

    /** First coordinate of a point from the centroid (m). */
    double p(int i) {
        return p[i];
    }

    /** Second coordinate of a point from the centroid (m). */
    double q(int i) {
        return q[i];
    }

    double area() {
        return area;
    }

    double centroidP() {
        return centroidP;
    }

    double centroidQ() {
        return centroidQ;
    }

    /** ∫p² dA about the centroid (m⁴). */
    double spp() {
        return spp;
    }

    /** ∫q² dA about the centroid (m⁴). */
    double sqq() {
        return sqq;
    }

    /** ∫pq dA about the centroid (m⁴). */
    double spq() {
        return spq;
    }

    /** Greatest distance of a point from the centroid (m). */
    double radius() {
        return radius;
    }
}
