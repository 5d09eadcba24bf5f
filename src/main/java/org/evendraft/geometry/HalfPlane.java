package org.evendraft.geometry;

/**
 * Gathers what of an outline lies on one side of a line, {@code c + a·p + b·q > 0} with (a, b) a unit vector: the area's moments,
 * by Green's theorem along the outline about the line's point nearest to the centre, where the line itself contributes nothing;
 * and the chord that the line makes, by its ends.
 */
final class HalfPlane {
    private final double a;
    private final double b;
    private final double c;
    /** The point of the line nearest to the centre. */
    private final double op;

    private final double oq;
    private double area;
    private double mp;
    private double mq;
    private double mpp;
    private double mpq;
    private double mqq;
    private double chord;
    private double chordFirst;
    private double chordSecond;

    HalfPlane(double c, double a, double b) {
        this.c = c;
        this.a = a;
        this.b = b;
        this.op = -c * a;
        this.oq = -c * b;
    }

    /** Signed distance of a point from the line, positive inside (m). */
    double inside(double p, double q) {
        return c + a * p + b * q;
    }

    double a() {
        return a;
    }

    double b() {
        return b;
    }

    /** Moments of what was gathered, about the centre. */
    AreaMoments moments() {
        return new AreaMoments(area, mp, mq, mpp, mpq, mqq).about(op, oq);
    }

    /** Length of the chord (m). */
    double chord() {
        return chord;
    }

    /** ∫w over the chord, w along (−b, a) from the line's point nearest to the centre (m²). */
    double chordFirst() {
        return chordFirst;
    }

    /** ∫w² over the chord (m³). */
    double chordSecond() {
        return chordSecond;
    }

    double nearestP() {
        return op;
    }

    double nearestQ() {
        return oq;
    }

    /**
     * Each stretch inside adds its end and takes off its beginning, seen along the line: where stretches follow each other that
     * cancels, and what remains are the ends of the chord, which runs from where the outline enters to where it leaves.
     */
    private void addEnd(double sign, double p, double q) {
        double w = a * (q - oq) - b * (p - op);
        chord += sign * w;
        chordFirst += sign * w * w / 2;
        chordSecond += sign * w * w * w / 3;
    }

    /** Adds a straight stretch of outline that lies inside. */
    void addStraight(double p0, double q0, double p1, double q1) {
        addEnd(-1, p0, q0);
        addEnd(1, p1, q1);
        double u0 = p0 - op;
        double v0 = q0 - oq;
        double u1 = p1 - op;
        double v1 = q1 - oq;
        double twice = u0 * v1 - u1 * v0;
        area += twice / 2;
        mp += twice * (u0 + u1) / 6;
        mq += twice * (v0 + v1) / 6;
        mpp += twice * (u0 * u0 + u0 * u1 + u1 * u1) / 12;
        mqq += twice * (v0 * v0 + v0 * v1 + v1 * v1) / 12;
        mpq += twice * (u0 * v1 + 2 * u0 * v0 + 2 * u1 * v1 + u1 * v0) / 24;
    }

    /**
     * Adds a stretch of arc that lies inside: with x = C + r·u the integrals are of 1, p, q, p², pq, q² times
     * {@code x × dx = (r² + r·(C_p cos + C_q sin)) dθ}, in closed form.
     */
    void addArc(double centreP, double centreQ, double r, double from, double to) {
        double cp = centreP - op;
        double cq = centreQ - oq;
        double s0 = Math.sin(from);
        double c0 = Math.cos(from);
        double s1 = Math.sin(to);
        double c1 = Math.cos(to);
        addEnd(-1, centreP + r * c0, centreQ + r * s0);
        addEnd(1, centreP + r * c1, centreQ + r * s1);
        double i1 = to - from;
        double ic = s1 - s0;
        double is = c0 - c1;
        double icc = (i1 + s1 * c1 - s0 * c0) / 2;
        double iss = i1 - icc;
        double ics = (s1 * s1 - s0 * s0) / 2;
        double iccc = ic - (s1 * s1 * s1 - s0 * s0 * s0) / 3;
        double icss = ic - iccc;
        double iccs = (c0 * c0 * c0 - c1 * c1 * c1) / 3;
        double isss = is - iccs;
        double k = r * r;
        double kc = r * cp;
        double ks = r * cq;
        double f1 = k * i1 + kc * ic + ks * is;
        double fc = k * ic + kc * icc + ks * ics;
        double fs = k * is + kc * ics + ks * iss;
        double fcc = k * icc + kc * iccc + ks * iccs;
        double fcs = k * ics + kc * iccs + ks * icss;
        double fss = k * iss + kc * icss + ks * isss;
        area += f1 / 2;
        mp += (cp * f1 + r * fc) / 3;
        mq += (cq * f1 + r * fs) / 3;
        mpp += (cp * cp * f1 + 2 * cp * r * fc + r * r * fcc) / 4;
        mqq += (cq * cq * f1 + 2 * cq * r * fs + r * r * fss) / 4;
        mpq += (cp * cq * f1 + r * (cp * fs + cq * fc) + r * r * fcs) / 4;
    }
}
