package org.evendraft.geometry;

/**
 * Moments of a plane area about a point, by its coordinates p and q.
 *
 * @param area ∫dA (m²)
 * @param p ∫p dA (m³)
 * @param q ∫q dA (m³)
 * @param pp ∫p² dA (m⁴)
 * @param pq ∫pq dA (m⁴)
 * @param qq ∫q² dA (m⁴)
 */
record AreaMoments(double area, double p, double q, double pp, double pq, double qq) {
    static final AreaMoments NONE = new AreaMoments(0, 0, 0, 0, 0, 0);

    AreaMoments plus(AreaMoments o) {
        return new AreaMoments(area + o.area, p + o.p, q + o.q, pp + o.pp, pq + o.pq, qq + o.qq);
    }

    /** The same area, about a point that lies at (−dp, −dq) of the present one. */
    AreaMoments about(double dp, double dq) {
        return new AreaMoments(
                area,
                p + area * dp,
                q + area * dq,
                pp + 2 * dp * p + dp * dp * area,
                pq + dp * q + dq * p + dp * dq * area,
                qq + 2 * dq * q + dq * dq * area);
    }
}
