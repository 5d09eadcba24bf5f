package org.evendraft.geometry;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;

/**
 * A closed plane outline of straight edges and arcs, anticlockwise about its centroid, which is the centre of its coordinates.
 * Immutable.
 */
final class Outline {
    /**
     * Greatest angle that one edge of a tessellated curve spans (rad). Only cones are integrated by their tessellation: its edges lie
     * within ±r·STEP²/12 of the circle, so the breadth b of a section along the axis is within r²·STEP²/(3b) and its second moment
     * (∝ b³) within r²·STEP²/b² of the true one: under 1e-4 where b is more than a fifth of the diameter.
     */
    static final double STEP = 2 * Math.PI / 1440;

    private static final double SAME_POINT = 1e-9;

    private final Stretch[] stretches;
    private final double centroidP;
    private final double centroidQ;
    private final AreaMoments whole;
    private final double middleP;
    private final double middleQ;
    private final double halfP;
    private final double halfQ;

    private Outline(List<Stretch> placed) {
        AreaMoments about = momentsOf(placed);
        this.centroidP = about.p() / about.area();
        this.centroidQ = about.q() / about.area();
        this.stretches =
                placed.stream().map(s -> moved(s, -centroidP, -centroidQ)).toArray(Stretch[]::new);
        AreaMoments central = momentsOf(List.of(stretches));
        this.whole = new AreaMoments(central.area(), 0, 0, central.pp(), central.pq(), central.qq());
        double[] p = span(1, 0);
        double[] q = span(0, 1);
        this.middleP = (p[0] + p[1]) / 2;
        this.middleQ = (q[0] + q[1]) / 2;
        this.halfP = (p[1] - p[0]) / 2;
        this.halfQ = (q[1] - q[0]) / 2;
    }

    private static AreaMoments momentsOf(Iterable<Stretch> stretches) {
        // A line so that everything lies inside: the half plane's own point is then the origin.
        HalfPlane all = new HalfPlane(0, 0, 0);
        for (Stretch stretch : stretches) {
            if (stretch instanceof Stretch.Edge e) {
                all.addStraight(e.p0(), e.q0(), e.p1(), e.q1());
            } else if (stretch instanceof Stretch.Arc arc) {
                all.addArc(arc.p(), arc.q(), arc.r(), arc.from(), arc.to());
            }
        }
        return all.moments();
    }

    private static Stretch moved(Stretch stretch, double dp, double dq) {
        if (stretch instanceof Stretch.Edge e) {
            return new Stretch.Edge(e.p0() + dp, e.q0() + dq, e.p1() + dp, e.q1() + dq);
        }
        Stretch.Arc arc = (Stretch.Arc) stretch;
        return new Stretch.Arc(arc.p() + dp, arc.q() + dq, arc.r(), arc.from(), arc.to());
    }

    /** A circle about (0, 0). */
    static Outline circle(double radius) {
        return new Outline(List.of(new Stretch.Arc(0, 0, radius, 0, 2 * Math.PI)));
    }

    /**
     * A polygon, in either sense, with every corner rounded to an arc that touches both its edges.
     *
     * @param corners the corners (m)
     * @param radius of the arcs, 0 for sharp corners (m)
     * @throws IllegalArgumentException when two arcs need more than the edge between them
     */
    static Outline polygon(List<double[]> corners, double radius) {
        List<double[]> run = withoutRepeats(corners);
        if (twiceArea(corners) < 0) {
            Collections.reverse(run);
        }
        int n = run.size();
        List<double[]> ends = new ArrayList<>();
        List<Stretch> stretches = new ArrayList<>();
        for (int i = 0; i < n; i++) {
            ends.add(arcEnds(run, i, radius));
        }
        for (int i = 0; i < n; i++) {
            double[] here = ends.get(i);
            double[] next = ends.get((i + 1) % n);
            checkFits(run, i, here, next, radius);
            if (radius > 0 && here[5] != 0) {
                stretches.add(arc(here, radius));
            }
            if (Math.hypot(next[0] - here[2], next[1] - here[3]) > SAME_POINT) {
                stretches.add(new Stretch.Edge(here[2], here[3], next[0], next[1]));
            }
        }
        return new Outline(stretches);
    }

    private static List<double[]> withoutRepeats(List<double[]> corners) {
        List<double[]> run = new ArrayList<>();
        for (int i = 0; i < corners.size(); i++) {
            double[] here = corners.get(i);
            double[] next = corners.get((i + 1) % corners.size());
            if (Math.hypot(next[0] - here[0], next[1] - here[1]) > SAME_POINT) {
                run.add(here);
            }
        }
        return run;
    }

    private static double twiceArea(List<double[]> corners) {
        double twice = 0;
        for (int i = 0; i < corners.size(); i++) {
            double[] a = corners.get(i);
            double[] b = corners.get((i + 1) % corners.size());
            twice += a[0] * b[1] - b[0] * a[1];
        }
        return twice;
    }

    /** At a corner: start (p, q) and end (p, q) of its arc, the length of its tangents, its turn to the left (rad). */
    private static double[] arcEnds(List<double[]> corners, int i, double radius) {
        int n = corners.size();
        double[] before = corners.get((i + n - 1) % n);
        double[] at = corners.get(i);
        double[] after = corners.get((i + 1) % n);
        double inP = at[0] - before[0];
        double inQ = at[1] - before[1];
        double outP = after[0] - at[0];
        double outQ = after[1] - at[1];
        double turn = Math.atan2(inP * outQ - inQ * outP, inP * outP + inQ * outQ);
        double tangent = radius * Math.tan(Math.abs(turn) / 2);
        double toIn = tangent / Math.hypot(inP, inQ);
        double toOut = tangent / Math.hypot(outP, outQ);
        return new double[] {
            at[0] - toIn * inP, at[1] - toIn * inQ, at[0] + toOut * outP, at[1] + toOut * outQ, tangent, turn
        };
    }

    private static void checkFits(List<double[]> corners, int i, double[] here, double[] next, double radius) {
        double[] a = corners.get(i);
        double[] b = corners.get((i + 1) % corners.size());
        double length = Math.hypot(b[0] - a[0], b[1] - a[1]);
        if (here[4] + next[4] > length + SAME_POINT) {
            throw new IllegalArgumentException(
                    "corner radius " + radius + " m does not fit an edge of " + length + " m");
        }
    }

    private static Stretch arc(double[] ends, double radius) {
        double turn = ends[5];
        double side = Math.signum(turn);
        // The centre lies square to the way in; the way in is the tangent at the arc's start.
        double chordP = ends[2] - ends[0];
        double chordQ = ends[3] - ends[1];
        double towards = Math.atan2(chordQ, chordP) - turn / 2;
        double centreP = ends[0] - side * radius * Math.sin(towards);
        double centreQ = ends[1] + side * radius * Math.cos(towards);
        double from = Math.atan2(ends[1] - centreQ, ends[0] - centreP);
        return new Stretch.Arc(centreP, centreQ, radius, from, from + turn);
    }

    /** Moments of the whole, about the centroid. */
    AreaMoments whole() {
        return whole;
    }

    double centroidP() {
        return centroidP;
    }

    double centroidQ() {
        return centroidQ;
    }

    /** Adds what lies inside a half plane to it. */
    void addTo(HalfPlane half) {
        for (Stretch stretch : stretches) {
            stretch.addTo(half);
        }
    }

    /** Adds the distances from a half plane's line of the places where the part inside changes its form. */
    void addCorners(HalfPlane half, SliceEnds ends) {
        for (Stretch stretch : stretches) {
            stretch.addCorners(half, ends);
        }
    }

    /** How far the middle of the outline's bounding rectangle lies along a direction from the centroid (m). */
    double middleReach(double a, double b) {
        return a * middleP + b * middleQ;
    }

    /** No point lies further along a direction, or against it, from there (m). */
    double halfReach(double a, double b) {
        return Math.abs(a) * halfP + Math.abs(b) * halfQ;
    }

    /** Least and greatest reach along a direction from the centroid (m). */
    double[] span(double a, double b) {
        double[] span = {Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY};
        for (Stretch stretch : stretches) {
            double[] own = stretch.span(a, b);
            span[0] = Math.min(span[0], own[0]);
            span[1] = Math.max(span[1], own[1]);
        }
        return span;
    }

    /** Points of a polygon of the same area, arcs in steps of at most {@link #STEP}, as p, q about the centroid. */
    List<double[]> tessellated() {
        List<double[]> points = new ArrayList<>();
        for (Stretch stretch : stretches) {
            if (stretch instanceof Stretch.Edge e) {
                points.add(new double[] {e.p0(), e.q0()});
            } else if (stretch instanceof Stretch.Arc arc) {
                addPoints(points, arc);
            }
        }
        return points;
    }

    /** Points on an arc from its start until before its end, pushed out so far that the polygon has the arc's area. */
    private static void addPoints(List<double[]> points, Stretch.Arc arc) {
        double turn = arc.to() - arc.from();
        boolean circle = arc.isCircle();
        int edges = Math.max(2, (int) Math.ceil(Math.abs(turn) / STEP - SAME_POINT));
        double step = turn / edges;
        double pushed =
                circle ? arc.r() * Math.sqrt(step / Math.sin(step)) : innerRadius(arc.r(), Math.abs(turn), edges);
        for (int k = 0; k < edges; k++) {
            double r = k == 0 && !circle ? arc.r() : pushed;
            double angle = arc.from() + k * step;
            points.add(new double[] {arc.p() + r * Math.cos(angle), arc.q() + r * Math.sin(angle)});
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
}
