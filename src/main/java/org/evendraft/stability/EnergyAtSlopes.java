package org.evendraft.stability;

import java.util.Optional;
import org.evendraft.geometry.SecondMoments;
import org.evendraft.geometry.Vec3;

/**
 * The potential energy per unit of weight, G's height over B along the vertical, at given slopes at the displacement with liquids
 * level, with its gradient and Hessian over the slopes h = tan(heel), t = tan(trim).
 *
 * <p>With d = G − B, s² = 1 + t² + h² and n = (−t, h, 1)/s the energy is e = n·d. Since the sea and each liquid lie at rest, e
 * changes only by the turn of n (envelope theorem): ∂e/∂h = d_y/s − h·e/s², ∂e/∂t = −d_x/s − t·e/s². d itself changes by the second
 * moments of the surfaces seen from above, those of the liquids less that of the sea, over the mass. On even keel the Hessian is
 * the matrix of corrected metacentric heights.
 *
 * @param value the energy (m)
 * @param gradient its derivatives by the slopes (m)
 * @param byHeelTwice second derivative by heel (m)
 * @param byHeelAndTrim mixed second derivative (m)
 * @param byTrimTwice second derivative by trim (m)
 */
record EnergyAtSlopes(double value, Slopes gradient, double byHeelTwice, double byHeelAndTrim, double byTrimTwice) {
    /** A curvature flatter than this part of the steeper one is taken as this part, to bound the step. */
    private static final double FLATTEST = 1e-6;

    private static final double SAME_DIRECTION = 1e-9;

    /**
     * @param at the slopes
     * @param d from B to G (m)
     * @param c second moments of liquids less that of the sea, seen from above, times density over mass (m)
     */
    static EnergyAtSlopes of(Slopes at, Vec3 d, SecondMoments c) {
        double h = at.heel();
        double t = at.trim();
        double s2 = 1 + t * t + h * h;
        double s = Math.sqrt(s2);
        double s3 = s2 * s;
        double s4 = s2 * s2;
        double e = (-t * d.x() + h * d.y() + d.z()) / s;
        double byHeel = d.y() / s - h * e / s2;
        double byTrim = -d.x() / s - t * e / s2;
        return new EnergyAtSlopes(
                e,
                new Slopes(byHeel, byTrim),
                -c.transverse() / s - d.y() * h / s3 - e / s2 - h * byHeel / s2 + 2 * h * h * e / s4,
                c.product() / s + d.x() * h / s3 - t * byHeel / s2 + 2 * t * h * e / s4,
                -c.longitudinal() / s + d.x() * t / s3 - e / s2 - t * byTrim / s2 + 2 * t * t * e / s4);
    }

    /** A step downhill, no longer than the reach: Newton's where the energy is convex, its mirror image along directions where it is not. */
    Slopes newtonStep(double reach) {
        Slopes first = steepest();
        Slopes second = first.quarterTurn();
        double floor =
                FLATTEST * Math.max(Math.abs(greatestCurvature()), Math.abs(leastCurvature())) + Double.MIN_NORMAL;
        double a = -gradient.dot(first) / Math.max(Math.abs(greatestCurvature()), floor);
        double b = -gradient.dot(second) / Math.max(Math.abs(leastCurvature()), floor);
        Slopes step = first.times(a).plus(second.times(b));
        return step.times(Math.min(1, reach / step.norm()));
    }

    /** Where the energy has no minimum, the unit direction in which it falls: of both ways the one with starboard, then bow, down. */
    Optional<Slopes> wayOffSaddle() {
        if (leastCurvature() > 0) {
            return Optional.empty();
        }
        Slopes way = steepest().quarterTurn();
        boolean alongTrim = Math.abs(way.heel()) <= SAME_DIRECTION;
        boolean turn = alongTrim ? way.trim() < 0 : way.heel() < 0;
        return Optional.of(turn ? way.times(-1) : way);
    }

    /** Unit eigenvector of the Hessian's greater eigenvalue. */
    private Slopes steepest() {
        double angle = Math.atan2(2 * byHeelAndTrim, byHeelTwice - byTrimTwice) / 2;
        return new Slopes(Math.cos(angle), Math.sin(angle));
    }

    /** Second derivative along a unit direction of the slopes (m). */
    double curvatureAlong(Slopes u) {
        return curvatureAlong(u, u);
    }

    /** Mixed second derivative along two unit directions of the slopes (m). */
    double curvatureAlong(Slopes u, Slopes v) {
        return u.heel() * v.heel() * byHeelTwice
                + (u.heel() * v.trim() + u.trim() * v.heel()) * byHeelAndTrim
                + u.trim() * v.trim() * byTrimTwice;
    }

    /** The Hessian's greater eigenvalue (m). */
    double greatestCurvature() {
        return (byHeelTwice + byTrimTwice) / 2 + Math.hypot((byHeelTwice - byTrimTwice) / 2, byHeelAndTrim);
    }

    /** The Hessian's smaller eigenvalue (m). */
    double leastCurvature() {
        return (byHeelTwice + byTrimTwice) / 2 - Math.hypot((byHeelTwice - byTrimTwice) / 2, byHeelAndTrim);
    }
}
