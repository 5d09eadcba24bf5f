package org.evendraft.geometry;

/** A stretch of an outline, which runs anticlockwise. */
sealed interface Stretch {

    /** Adds the part of it that lies inside the half plane or on its line. */
    void addTo(HalfPlane half);

    /** Distance from the line of each place at which the part inside may begin, end or turn back (m). */
    void addCorners(HalfPlane half, SliceEnds ends);

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
        public void addCorners(HalfPlane half, SliceEnds ends) {
            ends.add(half.inside(p0, q0));
        }

        @Override
        public double[] span(double a, double b) {
            double h0 = a * p0 + b * q0;
            double h1 = a * p1 + b * q1;
            return new double[] {Math.min(h0, h1), Math.max(h0, h1)};
        }
    }

    /** An arc, with its ends and what lies between it and its chord. */
    final class Arc implements Stretch {
        private static final double TURN = 2 * Math.PI;

        private final double p;
        private final double q;
        private final double r;
        private final double from;
        private final double to;
        private final double p0;
        private final double q0;
        private final double p1;
        private final double q1;
        private final AreaMoments segment;

        /**
         * @param p centre (m)
         * @param q centre (m)
         * @param r radius (m)
         * @param from angle of its start (rad)
         * @param to angle of its end, less than the start on a hollow corner (rad)
         */
        Arc(double p, double q, double r, double from, double to) {
            this.p = p;
            this.q = q;
            this.r = r;
            this.from = from;
            this.to = to;
            this.p0 = p + r * Math.cos(from);
            this.q0 = q + r * Math.sin(from);
            this.p1 = p + r * Math.cos(to);
            this.q1 = q + r * Math.sin(to);
            // Out along the arc and back along its chord, about the centre of the outline's coordinates.
            HalfPlane round = new HalfPlane(0, 0, 0);
            round.addArc(p, q, r, from, to);
            round.addStraight(p1, q1, p0, q0);
            this.segment = round.moments();
        }

        double p() {
            return p;
        }

        double q() {
            return q;
        }

        double r() {
            return r;
        }

        double from() {
            return from;
        }

        double to() {
            return to;
        }

        /** Whether it goes all the way round. */
        boolean isCircle() {
            return Math.abs(to - from) >= TURN - 1e-9;
        }

        @Override
        public void addTo(HalfPlane half) {
            double least = -half.inside(p, q) / r;
            if (least >= 1) {
                return;
            }
            if (least <= -1) {
                addWhole(half);
            } else {
                addWithin(half, Math.atan2(half.b(), half.a()), Math.acos(least));
            }
        }

        private void addWhole(HalfPlane half) {
            half.addStraight(p0, q0, p1, q1);
            half.addSegment(segment);
        }

        /** Adds the parts of the arc within a reach of an angle, each in the arc's own sense. */
        private void addWithin(HalfPlane half, double middle, double reach) {
            double low = Math.min(from, to);
            double high = Math.max(from, to);
            double start = middle - reach + TURN * Math.floor((low - middle - reach) / TURN);
            for (double a = start; a < high; a += TURN) {
                double first = Math.max(a, low);
                double last = Math.min(a + 2 * reach, high);
                if (first == low && last == high) {
                    addWhole(half);
                } else if (first < last) {
                    half.addArc(p, q, r, to > from ? first : last, to > from ? last : first);
                }
            }
        }

        @Override
        public void addCorners(HalfPlane half, SliceEnds ends) {
            if (!isCircle()) {
                ends.add(half.inside(p0, q0));
            }
            ends.add(half.inside(p, q) + r);
            ends.add(half.inside(p, q) - r);
        }

        @Override
        public double[] span(double a, double b) {
            double atStart = a * p0 + b * q0;
            double atEnd = a * p1 + b * q1;
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
            return angle + TURN * Math.ceil((low - angle) / TURN) <= Math.max(from, to);
        }
    }
}
