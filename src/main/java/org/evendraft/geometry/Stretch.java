package org.evendraft.geometry;

import java.util.ArrayList;
import java.util.List;

/** A stretch of an outline, which runs anticlockwise. */
sealed interface Stretch {

    /** Adds the part of it that lies inside the half plane or on its line. */
    void addTo(HalfPlane half);

    /** Distance from the line of each place at which the part inside may begin, end or turn back (m). */
    void addCorners(HalfPlane half, List<Double> distances);

    /** Its least and greatest reach along a direction (a, b) from the centre, (least, greatest) (m). */
    double[] span(double a, double b);

    /** A straight edge between two points. */
    record Edge(double p0, double q0, double p1, double q1) implements Stretch {

        @Override
        public void addTo(HalfPlane half) {
            double h0 = half.inside(p0, q0);
            double h1 = half.inside(p1, q1);
            if (h0 >= 0 && h1 >= 0) {
                half.addStraight(p0, q0, p1, q1);
            } else if (h0 >= 0 || h1 >= 0) {
                double part = h0 / (h0 - h1);
                double p = p0 + part * (p1 - p0);
                double q = q0 + part * (q1 - q0);
                if (h0 >= 0) {
                    half.addStraight(p0, q0, p, q);
                } else {
                    half.addStraight(p, q, p1, q1);
                }
            }
        }

        @Override
        public void addCorners(HalfPlane half, List<Double> distances) {
            distances.add(half.inside(p0, q0));
        }

        @Override
        public double[] span(double a, double b) {
            double h0 = a * p0 + b * q0;
            double h1 = a * p1 + b * q1;
            return new double[] {Math.min(h0, h1), Math.max(h0, h1)};
        }
    }

    /**
     * An arc.
     *
     * @param p centre (m)
     * @param q centre (m)
     * @param r radius (m)
     * @param from angle of its start (rad)
     * @param to angle of its end, less than the start on a hollow corner (rad)
     */
    record Arc(double p, double q, double r, double from, double to) implements Stretch {

        @Override
        public void addTo(HalfPlane half) {
            double least = -half.inside(p, q) / r;
            if (least >= 1) {
                return;
            }
            if (least <= -1) {
                half.addArc(p, q, r, from, to);
                return;
            }
            double middle = Math.atan2(half.b(), half.a());
            double reach = Math.acos(least);
            for (double[] part : partsInside(middle, reach)) {
                half.addArc(p, q, r, part[0], part[1]);
            }
        }

        /** The parts of the arc within a reach of an angle, each in the arc's own sense. */
        private List<double[]> partsInside(double middle, double reach) {
            double low = Math.min(from, to);
            double high = Math.max(from, to);
            double turn = 2 * Math.PI;
            List<double[]> parts = new ArrayList<>(2);
            double start = middle - reach + turn * Math.floor((low - middle - reach) / turn);
            for (double a = start; a < high; a += turn) {
                double first = Math.max(a, low);
                double last = Math.min(a + 2 * reach, high);
                if (first < last) {
                    parts.add(to > from ? new double[] {first, last} : new double[] {last, first});
                }
            }
            return parts;
        }

        @Override
        public void addCorners(HalfPlane half, List<Double> distances) {
            distances.add(half.inside(p + r * Math.cos(from), q + r * Math.sin(from)));
            distances.add(half.inside(p, q) + r);
            distances.add(half.inside(p, q) - r);
        }

        @Override
        public double[] span(double a, double b) {
            double atStart = a * (p + r * Math.cos(from)) + b * (q + r * Math.sin(from));
            double atEnd = a * (p + r * Math.cos(to)) + b * (q + r * Math.sin(to));
            double middle = a * p + b * q;
            double reach = r * Math.hypot(a, b);
            double towards = Math.atan2(b, a);
            return new double[] {
                passes(towards + Math.PI) ? middle - reach : Math.min(atStart, atEnd),
                passes(towards) ? middle + reach : Math.max(atStart, atEnd)
            };
        }

        private boolean passes(double angle) {
            double low = Math.min(from, to);
            double turn = 2 * Math.PI;
            return angle + turn * Math.ceil((low - angle) / turn) <= Math.max(from, to);
        }
    }
}
