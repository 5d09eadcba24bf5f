package org.evendraft.stability;

import java.util.Optional;
import org.evendraft.geometry.Vec3;

/**
 * The way of a platform that is turned about the horizontal axis a = (cos A, sin A, 0) with displacement kept and, unless fixed, the
 * trim about the perpendicular b = (−sin A, cos A, 0) at rest. With φ = tan(angle) and τ = tan(trim) the waterplane's normal is
 * ∝ −τ·a + φ·b + z. The trim rests where the energy is least over τ: there (G − B) has no part along a seen in the waterplane.
 */
final class HeelPath {
    /** Inclinations beyond this are not followed (rad). */
    private static final double GREATEST = Math.toRadians(85);

    private static final int MOST_STEPS = 60;
    private static final double LONGEST_STEP = 0.1;
    /** Arm about the perpendicular axis under which the trim is at rest (m). */
    private static final double TRIM_TOLERANCE = 1e-10;

    /** Two states lie on a smooth path when the tangent at one misses tan(trim) at the other by less than this. */
    private static final double SMOOTH = 0.01;

    /** No further than so many times their distance do two states foretell a third. */
    private static final double FURTHEST = 4;

    /** Between two states of one path tan(trim) changes as its slopes at both tell, within this; across a fold it leaps. */
    private static final double LEAP = 3e-3;

    /** The end of a path is found to this (rad). */
    static final double SHORTEST_STEP = Math.toRadians(0.0005);

    private final Slopes alongHeel;
    private final Slopes alongTrim;
    private final Vec3 axis;
    private final boolean freeTrim;

    HeelPath(double azimuthRad, boolean freeTrim) {
        double cos = Math.cos(azimuthRad);
        double sin = Math.sin(azimuthRad);
        this.alongHeel = new Slopes(cos, sin);
        this.alongTrim = new Slopes(-sin, cos);
        this.axis = new Vec3(cos, sin, 0);
        this.freeTrim = freeTrim;
    }

    /**
     * How far a path was followed.
     *
     * @param angleRad the angle reached (rad)
     * @param state the platform there
     */
    record Reached(double angleRad, Inclination state) {}

    /**
     * Follows the path from a state towards an angle without a leap of the trim, in shorter steps where the trim turns fast, until it
     * arrives or the path ends: beyond a fold the trim rests elsewhere or nowhere.
     *
     * @param from where the path is followed from
     * @param before a state on the path further off, with which the trim is foreseen
     * @param angleRad inclination about the axis to be reached (rad)
     * @return the angle itself, or the last one within {@link #SHORTEST_STEP} of the path's end
     */
    Reached follow(Reached from, Reached before, double angleRad) {
        Reached here = from;
        Reached last = before;
        double step = angleRad - from.angleRad();
        double shortest = Math.min(SHORTEST_STEP, Math.abs(step));
        while (here.angleRad() != angleRad && Math.abs(step) >= shortest) {
            boolean whole = Math.abs(angleRad - here.angleRad()) <= Math.abs(step);
            double next = whole ? angleRad : here.angleRad() + step;
            Optional<Inclination> found = at(here.state(), last.state(), next);
            if (found.isPresent() && isSmooth(here.state(), found.get())) {
                last = here;
                here = new Reached(next, found.get());
                step *= 2;
            } else {
                step = (next - here.angleRad()) / 2;
            }
        }
        return here;
    }

    /**
     * The platform at an angle, from a neighbouring state.
     *
     * @param near where the search for the trim starts
     * @param angleRad inclination about the axis (rad)
     * @return empty where the trim has no stable rest within reach
     */
    Optional<Inclination> at(Inclination near, double angleRad) {
        return at(near, near, angleRad);
    }

    /**
     * The platform at an angle, from two states on the path.
     *
     * @param near where the search for the trim starts
     * @param other a state further off, with which the trim is foreseen
     * @param angleRad inclination about the axis (rad)
     * @return empty where the trim has no stable rest within reach
     */
    Optional<Inclination> at(Inclination near, Inclination other, double angleRad) {
        double phi = Math.tan(angleRad);
        double tau = freeTrim ? foreseen(near, other, phi) : 0;
        Inclination here = near.at(slopes(phi, tau));
        for (int i = 0; freeTrim && i < MOST_STEPS; i++) {
            if (here.slopes().inclination() > GREATEST) {
                return Optional.empty();
            }
            double slope = here.energy().gradient().dot(alongTrim);
            double curvature = here.energy().curvatureAlong(alongTrim);
            if (Math.abs(slope) <= TRIM_TOLERANCE) {
                return curvature > 0 ? Optional.of(here) : Optional.empty();
            }
            double step = curvature > 0 ? -slope / curvature : -Math.signum(slope) * LONGEST_STEP;
            tau += Math.max(-LONGEST_STEP, Math.min(LONGEST_STEP, step));
            here = here.at(slopes(phi, tau));
        }
        return freeTrim ? Optional.empty() : Optional.of(here);
    }

    /** tan(trim) by the cubic through two states with their slopes; by one of them alone where the two lie on no smooth path. */
    private double foreseen(Inclination near, Inclination other, double phi) {
        double from = phi(near);
        double step = phi(other) - from;
        double tangent = tau(near) + slope(near) * (phi - from);
        double miss = tau(other) - tau(near) - slope(near) * step;
        if (FURTHEST * Math.abs(step) <= Math.abs(phi - from) || !(Math.abs(miss) < SMOOTH)) {
            return Math.abs(tangent - tau(near)) < LONGEST_STEP ? tangent : tau(near);
        }
        double part = (phi - from) / step;
        double turn = (slope(other) - slope(near)) * step;
        return tangent + part * part * (3 * miss - turn + part * (turn - 2 * miss));
    }

    /** Whether the trim has gone from one state to the other without a leap: by the trapezium of its slopes. */
    private boolean isSmooth(Inclination from, Inclination to) {
        double told = (slope(from) + slope(to)) / 2 * (phi(to) - phi(from));
        return !freeTrim || Math.abs(tau(to) - tau(from) - told) <= LEAP;
    }

    private double phi(Inclination at) {
        return at.slopes().dot(alongHeel);
    }

    private double tau(Inclination at) {
        return at.slopes().dot(alongTrim);
    }

    /** Change of tan(trim) with tan(angle) for the trim to stay at rest: along it the energy's slope by the trim stays 0. */
    private double slope(Inclination at) {
        double curvature = at.energy().curvatureAlong(alongTrim);
        return curvature > 0 ? -at.energy().curvatureAlong(alongHeel, alongTrim) / curvature : 0;
    }

    private Slopes slopes(double phi, double tau) {
        return alongHeel.times(phi).plus(alongTrim.times(tau));
    }

    /** How far slopes lean about the axis (rad). */
    double lean(Slopes slopes) {
        return Math.atan(slopes.dot(alongHeel));
    }

    /** The righting arm (G − B)·(n × e), e the axis seen in the waterplane (m). */
    double arm(Inclination at) {
        return -at.gravityOverBuoyancy().dot(leeward(at));
    }

    /** The horizontal direction e × n towards which the platform leans, square to the axis: the lower side's. */
    Vec3 leeward(Inclination at) {
        Vec3 n = at.normal();
        Vec3 e = axis.minus(n.times(axis.dot(n))).unit();
        return e.cross(n);
    }

    RightingPoint point(Inclination at, double angleRad, double area) {
        return new RightingPoint(
                Math.toDegrees(angleRad), arm(at), at.waterplane().draft(), Math.toDegrees(Math.atan(tau(at))), area);
    }
}
