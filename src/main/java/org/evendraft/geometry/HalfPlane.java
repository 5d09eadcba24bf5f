package org.evendraft.geometry;

/**
 * Gathers what of an outline lies on one side of a line, {@code c + a·p + b·q > 0} with (a, b) a unit vector: the area's moments,
 * by Green's theorem along the outline about the line's point nearest to the centre, where the line itself contributes nothing;
 * and the chord that the line makes, by its ends.
 */
final class HalfPlane {
    private double a;
    private double b;
    private double c;
    /** The point of the line nearest to the centre. */
    private double op;

    private double oq;
    /** Whether the chord is asked for. */
    private boolean withChord;
    /** Twice the area, six times the first moments, 12 and (pq) 24 times the second, about that point. */
    private double twice;

    private double sixP;
    private double sixQ;
    private double twelvePp;
    private double twentyfourPq;
    private double twelveQq;
    private double chord;
    private double chordFirst;
    private double chordSecond;
    /** What round corners add to the straight stretches between their ends, about the centre. */
    private double roundArea;

    private double roundP;
    private double roundQ;
    private double roundPp;
    private double roundPq;
    private double roundQq;

    HalfPlane(double c, double a, double b) {
        restart(c, a, b, false);
    }

    /** Lets everything go that was gathered, and begins again on one side of another line, with its chord or without. */
    void restart(double newC, double newA, double newB, boolean chordToo) {
        c = newC;
        a = newA;
        b = newB;
        op = -c * a;
        oq = -c * b;
        withChord = chordToo;
        twice = 0;
        sixP = 0;
        sixQ = 0;
        twelvePp = 0;
        twentyfourPq = 0;
        twelveQq = 0;
        chord = 0;
        chordFirst = 0;
        chordSecond = 0;
        roundArea = 0;
        roundP = 0;
        roundQ = 0;
        roundPp = 0;
        roundPq = 0;
        roundQq = 0;
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
        return new AreaMoments(twice / 2, sixP / 6, sixQ / 6, twelvePp / 12, twentyfourPq / 24, twelveQq / 12)
                .about(op, oq)
                .plus(new AreaMoments(roundArea, roundP, roundQ, roundPp, roundPq, roundQq));
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
    private void addEnds(double p0, double q0, double p1, double q1) {
        if (withChord) {
            addEnd(-1, a * (q0 - oq) - b * (p0 - op));
            addEnd(1, a * (q1 - oq) - b * (p1 - op));
        }
    }

    private void addEnd(double sign, double w) {
        chord += sign * w;
        chordFirst += sign * w * w / 2;
        chordSecond += sign * w * w * w / 3;
    }

    /** Adds a straight stretch of outline that lies inside. */
    void addStraight(double p0, double q0, double p1, double q1) {
        addEnds(p0, q0, p1, q1);
        double u0 = p0 - op;
        double v0 = q0 - oq;
        double u1 = p1 - op;
        double v1 = q1 - oq;
        double k = u0 * v1 - u1 * v0;
        twice += k;
        sixP += k * (u0 + u1);
        sixQ += k * (v0 + v1);
        twelvePp += k * (u0 * u0 + u0 * u1 + u1 * u1);
        twelveQq += k * (v0 * v0 + v0 * v1 + v1 * v1);
        twentyfourPq += k * (u0 * v1 + 2 * u0 * v0 + 2 * u1 * v1 + u1 * v0);
    }

    /** Adds what lies between a straight stretch that was added and an arc with the same ends, known about the centre. */
    void addSegment(AreaMoments segment) {
        roundArea += segment.area();
        roundP += segment.p();
        roundQ += segment.q();
        roundPp += segment.pp();
        roundPq += segment.pq();
        roundQq += segment.qq();
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
        addEnds(centreP + r * c0, centreQ + r * s0, centreP + r * c1, centreQ + r * s1);
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
        twice += f1;
        sixP += 2 * (cp * f1 + r * fc);
        sixQ += 2 * (cq * f1 + r * fs);
        twelvePp += 3 * (cp * cp * f1 + 2 * cp * r * fc + r * r * fcc);
        twelveQq += 3 * (cq * cq * f1 + 2 * cq * r * fs + r * r * fss);
        twentyfourPq += 6 * (cp * cq * f1 + r * (cp * fs + cq * fc) + r * r * fcs);
    }
}
