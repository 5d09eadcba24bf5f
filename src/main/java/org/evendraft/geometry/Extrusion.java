package org.evendraft.geometry;

/**
 * A right prism: an outline moved along its own normal. While a plane passes only through its sides its integrals are closed
 * forms of the outline's moments, whatever the number of edges.
 */
final class Extrusion {
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

    /**
     * Adds what lies under the plane when the plane passes through the sides only.
     *
     * @return false, with nothing added, when the plane may meet an end
     */
    boolean addBelow(Cut cut, double sign) {
        Plane plane = cut.plane();
        double along = plane.normal().dot(axis);
        if (Math.abs(along) < 1e-3) {
            return false;
        }
        boolean upward = along > 0;
        Vec3 base = upward ? start : start.plus(axis.times(length));
        Vec3 up = upward ? axis : axis.times(-1);
        double rise = Math.abs(along);
        double t0 = -plane.height(base) / rise;
        double a = -plane.normal().dot(p) / rise;
        double b = -plane.normal().dot(q) / rise;
        double reach = Math.hypot(a, b) * outline.radius();
        if (t0 - reach <= 0 || t0 + reach >= length) {
            return false;
        }
        addVolume(cut, sign, base, up, t0, a, b);
        addSection(cut, sign, base.plus(up.times(t0)), p.plus(up.times(a)), q.plus(up.times(b)), 1 / rise);
        return true;
    }

    /** Under the plane the prism is {@code t0 + a·p + b·q} high over its base. */
    private void addVolume(Cut cut, double sign, Vec3 base, Vec3 up, double t0, double a, double b) {
        double volume = t0 * outline.area();
        double mp = a * outline.spp() + b * outline.spq();
        double mq = a * outline.spq() + b * outline.sqq();
        double mt = (t0 * volume + a * mp + b * mq) / 2;
        Vec3 moment = base.times(volume).plus(p.times(mp)).plus(q.times(mq)).plus(up.times(mt));
        cut.addWhole(sign, volume, moment);
    }

    /** The section is the outline seen along the axis: a point (p, q) of it lies at {@code centre + p·alongP + q·alongQ}. */
    private void addSection(Cut cut, double sign, Vec3 centre, Vec3 alongP, Vec3 alongQ, double stretch) {
        Plane plane = cut.plane();
        Vec3 offset = centre.minus(plane.origin());
        double cu = offset.dot(plane.first());
        double cv = offset.dot(plane.second());
        double pu = alongP.dot(plane.first());
        double pv = alongP.dot(plane.second());
        double qu = alongQ.dot(plane.first());
        double qv = alongQ.dot(plane.second());
        double area = outline.area() * stretch;
        double pp = outline.spp() * stretch;
        double pq = outline.spq() * stretch;
        double qq = outline.sqq() * stretch;
        cut.addSection(
                sign,
                area,
                area * cu,
                area * cv,
                area * cu * cu + pu * pu * pp + 2 * pu * qu * pq + qu * qu * qq,
                area * cu * cv + pu * pv * pp + (pu * qv + pv * qu) * pq + qu * qv * qq,
                area * cv * cv + pv * pv * pp + 2 * pv * qv * pq + qv * qv * qq);
    }
}
