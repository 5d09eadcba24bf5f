package org.evendraft.geometry;

import java.util.TreeSet;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegrator;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegratorFactory;

/**
 * A right prism or cylinder: an outline moved along its own normal, integrated exactly with its curves, not by triangles.
 *
 * <p>Over a point (p, q) of the outline the plane stands at the height t(p, q), linear, along the axis, and what lies under it is
 * min(max(t, 0), length) long. So each integral is one of a polynomial over the part of the outline where t &gt; 0, less one over
 * the part where t &gt; length, and the section is the difference of the two parts, projected. Where the plane runs almost along
 * the axis, slices across it are summed by Gauss's rule between the places where their form changes.
 */
final class Extrusion {
    /** Under this cosine between the plane's normal and the axis, t is too steep and slices are summed. */
    private static final double STEEP = 1e-3;
    /** Under this sine between them the plane is square to the axis. */
    private static final double SQUARE = 1e-12;
    /** Exact to degree 23, in a variable that flattens the square roots at grazing arcs. */
    private static final GaussIntegrator GAUSS = new GaussIntegratorFactory().legendre(12, -1, 1);

    private final Outline outline;
    private final Vec3 start;
    private final Vec3 p;
    private final Vec3 q;
    private final Vec3 axis;
    private final double length;

    /**
     * @param start the outline's centroid at the first end (m)
     * @param p unit vector of the outline's first coordinate
     * @param q unit vector of the second
     * @param axis unit vector {@code p × q}, towards the other end
     * @param length along the axis (m)
     */
    Extrusion(Outline outline, Vec3 start, Vec3 p, Vec3 q, Vec3 axis, double length) {
        this.outline = outline;
        this.start = start;
        this.p = p;
        this.q = q;
        this.axis = axis;
        this.length = length;
    }

    double volume() {
        return outline.whole().area() * length;
    }

    /** First moments of the whole about the platform's origin (m⁴). */
    Vec3 moment() {
        return start.plus(axis.times(length / 2)).times(volume());
    }

    /** Least and greatest reach along a direction from the platform's origin (m). */
    double[] span(Vec3 direction) {
        double[] across = outline.span(direction.dot(p), direction.dot(q));
        double base = direction.dot(start);
        double along = direction.dot(axis) * length;
        return new double[] {base + Math.min(0, along) + across[0], base + Math.max(0, along) + across[1]};
    }

    /** Adds what lies under the cut's plane. */
    void addBelow(Cut cut, double sign) {
        Passage passage = new Passage(cut, sign);
        if (passage.along < STEEP) {
            passage.addSlices();
        } else {
            passage.addColumns();
        }
    }

    /**
     * A plane on its way through the prism, seen from the end under it: a point (p, q) at s along the axis stands
     * {@code height + np·p + nq·q + along·s} over the plane.
     */
    private final class Passage {
        private final Cut cut;
        private final double sign;
        private final Vec3 up;
        private final Vec3 base;
        private final double np;
        private final double nq;
        private final double along;
        private final double height;
        private final double steepness;

        Passage(Cut cut, double sign) {
            this.cut = cut;
            this.sign = sign;
            Vec3 n = cut.plane().normal();
            boolean down = n.dot(axis) < 0;
            this.up = down ? axis.times(-1) : axis;
            this.base = down ? start.plus(axis.times(length)) : start;
            this.along = n.dot(up);
            this.np = n.dot(p);
            this.nq = n.dot(q);
            this.height = cut.plane().height(base);
            this.steepness = Math.hypot(np, nq);
        }

        void addColumns() {
            double t0 = -height / along;
            Columns under = new Columns(where(t0), t0, 0);
            Columns beyond = new Columns(where(t0 - length), t0 - length, length);
            double volume = under.volume() - beyond.volume();
            Vec3 moment = under.moment().minus(beyond.moment());
            cut.addWhole(sign, volume, base.times(volume).plus(moment));
            addSection(under.foot.minus(beyond.foot), t0);
        }

        /** Moments, about the outline's centroid, of its part over which the plane stands at least as high as where t is 0. */
        private AreaMoments where(double t0) {
            if (steepness < SQUARE) {
                return t0 >= 0 ? outline.whole() : AreaMoments.NONE;
            }
            double c = t0 * along / steepness;
            double a = -np / steepness;
            double b = -nq / steepness;
            double[] span = outline.span(a, b);
            if (c + span[0] >= 0) {
                return outline.whole();
            }
            return c + span[1] < 0 ? AreaMoments.NONE : outline.inside(c, a, b).moments();
        }

        /** Columns of the height t = t0 − (np·p + nq·q)/along over a part of the outline, standing at a distance from the base. */
        private final class Columns {
            private final AreaMoments foot;
            private final double distance;
            private final double t;
            private final double tp;
            private final double tq;
            private final double tt;

            Columns(AreaMoments foot, double t0, double distance) {
                double a = -np / along;
                double b = -nq / along;
                this.foot = foot;
                this.distance = distance;
                this.t = t0 * foot.area() + a * foot.p() + b * foot.q();
                this.tp = t0 * foot.p() + a * foot.pp() + b * foot.pq();
                this.tq = t0 * foot.q() + a * foot.pq() + b * foot.qq();
                this.tt = t0 * t + a * tp + b * tq;
            }

            double volume() {
                return t;
            }

            /** First moments about the base's centre (m⁴). */
            Vec3 moment() {
                return p.times(tp).plus(q.times(tq)).plus(up.times(tt / 2 + distance * t));
            }
        }

        /** The section is a part of the outline seen along the axis: (p, q) lies at {@code centre + p·alongP + q·alongQ}. */
        private void addSection(AreaMoments m, double t0) {
            Vec3 centre = base.plus(up.times(t0)).minus(cut.plane().origin());
            Vec3 alongP = p.minus(up.times(np / along));
            Vec3 alongQ = q.minus(up.times(nq / along));
            Vec3 first = cut.plane().first();
            Vec3 second = cut.plane().second();
            double cu = centre.dot(first);
            double cv = centre.dot(second);
            double pu = alongP.dot(first);
            double pv = alongP.dot(second);
            double qu = alongQ.dot(first);
            double qv = alongQ.dot(second);
            double u = pu * m.p() + qu * m.q();
            double v = pv * m.p() + qv * m.q();
            double uu = pu * pu * m.pp() + 2 * pu * qu * m.pq() + qu * qu * m.qq();
            double uv = pu * pv * m.pp() + (pu * qv + pv * qu) * m.pq() + qu * qv * m.qq();
            double vv = pv * pv * m.pp() + 2 * pv * qv * m.pq() + qv * qv * m.qq();
            double area = m.area();
            cut.addSection(
                    sign / along,
                    area,
                    area * cu + u,
                    area * cv + v,
                    area * cu * cu + 2 * cu * u + uu,
                    area * cu * cv + cu * v + cv * u + uv,
                    area * cv * cv + 2 * cv * v + vv);
        }

        void addSlices() {
            double from = 0;
            for (double to : sliceEnds()) {
                for (int i = 0; i < GAUSS.getNumberOfPoints(); i++) {
                    double x = GAUSS.getPoint(i);
                    double s = (from + to) / 2 + (to - from) / 4 * x * (3 - x * x);
                    addSlice(s, GAUSS.getWeight(i) * (to - from) * 3 / 4 * (1 - x * x));
                }
                from = to;
            }
        }

        /** Where along the axis the form of the slices changes, and the far end. */
        private Iterable<Double> sliceEnds() {
            TreeSet<Double> ends = new TreeSet<>();
            ends.add(length);
            if (along > 0) {
                outline.corners(halfPlaneAt(0)).stream()
                        .map(distance -> distance * steepness / along)
                        .filter(s -> s > 0 && s < length)
                        .forEach(ends::add);
            }
            return ends;
        }

        private HalfPlane halfPlaneAt(double s) {
            return new HalfPlane(-(height + along * s) / steepness, -np / steepness, -nq / steepness);
        }

        private void addSlice(double s, double weight) {
            HalfPlane half = halfPlaneAt(s);
            outline.addTo(half);
            AreaMoments m = half.moments();
            Vec3 centre = base.plus(up.times(s));
            Vec3 moment = centre.times(m.area()).plus(p.times(m.p())).plus(q.times(m.q()));
            cut.addWhole(sign, weight * m.area(), moment.times(weight));
            Vec3 foot = centre.plus(p.times(half.nearestP())).plus(q.times(half.nearestQ()));
            addChord(half, foot.minus(cut.plane().origin()), weight / steepness);
        }

        private void addChord(HalfPlane half, Vec3 foot, double breadth) {
            Vec3 w = p.times(-half.b()).plus(q.times(half.a()));
            double fu = foot.dot(cut.plane().first());
            double fv = foot.dot(cut.plane().second());
            double wu = w.dot(cut.plane().first());
            double wv = w.dot(cut.plane().second());
            double c = half.chord();
            double c1 = half.chordFirst();
            double c2 = half.chordSecond();
            cut.addSection(
                    sign * breadth,
                    c,
                    c * fu + wu * c1,
                    c * fv + wv * c1,
                    c * fu * fu + 2 * fu * wu * c1 + wu * wu * c2,
                    c * fu * fv + (fu * wv + fv * wu) * c1 + wu * wv * c2,
                    c * fv * fv + 2 * fv * wv * c1 + wv * wv * c2);
        }
    }
}
