package org.evendraft.geometry;

import org.apache.commons.math3.analysis.integration.gauss.GaussIntegrator;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegratorFactory;

/**
 * A cut's plane on its way through prisms, one after the other: each is integrated exactly with its curves, not by triangles.
 *
 * <p>Seen from the end of the prism that lies under the plane, a point (p, q) of the outline at s along the axis stands
 * {@code height + np·p + nq·q + along·s} over the plane. So over (p, q) the plane stands at the height t(p, q), linear, along the
 * axis, and what lies under it is min(max(t, 0), length) long: each integral is one of a polynomial over the part of the outline
 * where t &gt; 0, less one over the part where t &gt; length, and the section is the difference of the two parts, projected. Where
 * the plane runs almost along the axis, slices across it are summed by Gauss's rule between the places where their form changes.
 */
final class Passage {
    /** Under this cosine between the plane's normal and the axis, t is too steep and slices are summed. */
    private static final double STEEP = 1e-3;
    /** Under this sine between them the plane is square to the axis. */
    private static final double SQUARE = 1e-12;
    /** Exact to degree 23, in a variable that flattens the square roots at grazing arcs. */
    private static final GaussIntegrator GAUSS = new GaussIntegratorFactory().legendre(12, -1, 1);

    private final Cut cut;
    private final HalfPlane half = new HalfPlane(0, 0, 0);
    private double sign;
    private Vec3 up = Vec3.ZERO;
    private Vec3 base = Vec3.ZERO;
    private double np;
    private double nq;
    private double along;
    private double height;

    Passage(Cut cut) {
        this.cut = cut;
    }

    /** Adds what of a prism lies under the plane. */
    void through(Extrusion prism, double weight) {
        Vec3 n = cut.normal();
        double forth = n.dot(prism.axis());
        sign = weight;
        up = forth < 0 ? prism.back() : prism.axis();
        base = forth < 0 ? prism.end() : prism.start();
        along = Math.abs(forth);
        np = n.dot(prism.p());
        nq = n.dot(prism.q());
        height = cut.height(base);
        if (along < STEEP) {
            addSlices(prism);
        } else {
            addColumns(prism, sign, 0);
            addColumns(prism, -sign, prism.length());
        }
    }

    /** Adds the columns, as high as the plane stands over a distance from the base, with the part of the section over them. */
    private void addColumns(Extrusion prism, double weight, double distance) {
        double depth = -height - along * distance;
        AreaMoments foot = where(prism.outline(), depth);
        if (foot.area() != 0) {
            addColumns(prism, weight, foot, depth / along, distance);
            addSection(prism, weight / along, foot);
        }
    }

    /** Moments, about the outline's centroid, of its part that lies under the plane where the centroid lies at a depth (m). */
    private AreaMoments where(Outline outline, double depth) {
        double middle = depth - outline.middleReach(np, nq);
        double reach = outline.halfReach(np, nq);
        if (middle - reach >= 0) {
            return outline.whole();
        }
        if (middle + reach < 0) {
            return AreaMoments.NONE;
        }
        double steepness = steepness();
        if (steepness < SQUARE) {
            return depth >= 0 ? outline.whole() : AreaMoments.NONE;
        }
        half.restart(depth / steepness, -np / steepness, -nq / steepness, false);
        outline.addTo(half);
        return half.moments();
    }

    /** Sine between the plane's normal and the axis. */
    private double steepness() {
        return Math.sqrt(np * np + nq * nq);
    }

    /** Columns of the height t = t0 − (np·p + nq·q)/along over a part of the outline, standing at a distance from the base. */
    private void addColumns(Extrusion prism, double weight, AreaMoments foot, double t0, double distance) {
        double a = -np / along;
        double b = -nq / along;
        double t = t0 * foot.area() + a * foot.p() + b * foot.q();
        double tp = t0 * foot.p() + a * foot.pp() + b * foot.pq();
        double tq = t0 * foot.q() + a * foot.pq() + b * foot.qq();
        double tt = t0 * t + a * tp + b * tq;
        Vec3 moment = base.times(t)
                .plus(prism.p().times(tp))
                .plus(prism.q().times(tq))
                .plus(up.times(tt / 2 + distance * t));
        cut.addWhole(weight, t, moment);
    }

    /** The section is a part of the outline seen along the axis: (p, q) lies at {@code centre + p·alongP + q·alongQ}. */
    private void addSection(Extrusion prism, double weight, AreaMoments m) {
        Vec3 centre = base.minus(up.times(height / along)).minus(cut.origin());
        Vec3 alongP = prism.p().minus(up.times(np / along));
        Vec3 alongQ = prism.q().minus(up.times(nq / along));
        Vec3 first = cut.first();
        Vec3 second = cut.second();
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
                weight,
                area,
                area * cu + u,
                area * cv + v,
                area * cu * cu + 2 * cu * u + uu,
                area * cu * cv + cu * v + cv * u + uv,
                area * cv * cv + 2 * cv * v + vv);
    }

    private void addSlices(Extrusion prism) {
        double from = 0;
        for (double to : sliceEnds(prism)) {
            for (int i = 0; i < GAUSS.getNumberOfPoints(); i++) {
                double x = GAUSS.getPoint(i);
                double s = (from + to) / 2 + (to - from) / 4 * x * (3 - x * x);
                addSlice(prism, s, GAUSS.getWeight(i) * (to - from) * 3 / 4 * (1 - x * x));
            }
            from = to;
        }
    }

    /** Where along the axis the form of the slices changes, and the far end. */
    private double[] sliceEnds(Extrusion prism) {
        SliceEnds ends = new SliceEnds(along > 0 ? steepness() / along : 0, prism.length());
        restartAt(0);
        prism.outline().addCorners(half, ends);
        return ends.inOrder();
    }

    private void restartAt(double s) {
        double steepness = steepness();
        half.restart(-(height + along * s) / steepness, -np / steepness, -nq / steepness, true);
    }

    private void addSlice(Extrusion prism, double s, double weight) {
        restartAt(s);
        prism.outline().addTo(half);
        AreaMoments m = half.moments();
        Vec3 centre = base.plus(up.times(s));
        Vec3 moment = centre.times(m.area())
                .plus(prism.p().times(m.p()))
                .plus(prism.q().times(m.q()));
        cut.addWhole(sign, weight * m.area(), moment.times(weight));
        Vec3 foot = centre.plus(prism.p().times(half.nearestP())).plus(prism.q().times(half.nearestQ()));
        Vec3 w = prism.p().times(-half.b()).plus(prism.q().times(half.a()));
        addChord(foot.minus(cut.origin()), w, sign * weight / steepness());
    }

    /** A strip of the section along a chord, whose points are foot + w times their distance from the foot. */
    private void addChord(Vec3 foot, Vec3 w, double breadth) {
        double fu = foot.dot(cut.first());
        double fv = foot.dot(cut.second());
        double wu = w.dot(cut.first());
        double wv = w.dot(cut.second());
        double c = half.chord();
        double c1 = half.chordFirst();
        double c2 = half.chordSecond();
        cut.addSection(
                breadth,
                c,
                c * fu + wu * c1,
                c * fv + wv * c1,
                c * fu * fu + 2 * fu * wu * c1 + wu * wu * c2,
                c * fu * fv + (fu * wv + fv * wu) * c1 + wu * wv * c2,
                c * fv * fv + 2 * fv * wv * c1 + wv * wv * c2);
    }
}
