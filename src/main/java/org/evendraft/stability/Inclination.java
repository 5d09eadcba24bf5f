package org.evendraft.stability;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import org.evendraft.geometry.Cut;
import org.evendraft.geometry.SecondMoments;
import org.evendraft.geometry.Vec3;
import org.evendraft.platform.Calibration.Inclined;
import org.evendraft.stability.Equilibrium.Afloat;

/**
 * A platform held at given slopes at its displacement, liquids level with the sea: the potential energy per unit of weight, its
 * gradient and its Hessian over the slopes tan(heel), tan(trim).
 *
 * <p>With d = G − B, the slopes h and t, s² = 1 + t² + h² and n = (−t, h, 1)/s the energy is e = n·d. Since the sea and each liquid
 * lie at rest at given slopes, e changes only by the turn of n (envelope theorem): ∂e/∂h = d_y/s − h·e/s², ∂e/∂t = −d_x/s − t·e/s².
 * d itself changes by the second moments seen from above, those of the liquids less that of the sea. On even keel the Hessian is
 * the matrix of corrected metacentric heights.
 */
final class Inclination {
    private static final double SAME_DIRECTION = 1e-9;
    /** A curvature flatter than this part of the steeper one is taken as this part, to bound the step. */
    private static final double FLATTEST = 1e-6;

    private final LoadedPlatform platform;
    private final double h;
    private final double t;
    private final Cut hull;
    private final double[] surfaces;
    private final Vec3 gravity;
    private final Vec3 d;
    private final double s;
    private final double energy;
    private final double byHeel;
    private final double byTrim;
    private final double heelHeel;
    private final double heelTrim;
    private final double trimTrim;

    private Inclination(LoadedPlatform platform, double h, double t, double guess, double[] surfaceGuesses) {
        this.platform = platform;
        this.h = h;
        this.t = t;
        double mass = platform.mass();
        double density = platform.waterDensity();
        this.hull = platform.prepared().hull().holding(mass / density, t, -h, guess);
        this.surfaces = surfaceGuesses.clone();
        Vec3 moment = platform.fixedMoment();
        SecondMoments stiffness = hull.projectedSecondMoments().times(-density);
        List<TankContents> tanks = platform.tanks();
        for (int i = 0; i < surfaces.length; i++) {
            TankContents tank = tanks.get(i);
            if (tank.hasFreeSurface()) {
                Inclined liquid = tank.calibration().inclined(tank.liquid().volume(), t, -h, surfaces[i]);
                surfaces[i] = liquid.height();
                moment = moment.plus(liquid.moment().times(tank.density()));
                stiffness = stiffness.plus(liquid.projected().times(tank.density()));
            } else {
                moment = moment.plus(tank.moment());
            }
        }
        this.gravity = moment.times(1 / mass);
        this.d = gravity.minus(hull.centroid());
        SecondMoments c = stiffness.times(1 / mass);
        this.s = Math.sqrt(1 + t * t + h * h);
        this.energy = (-t * d.x() + h * d.y() + d.z()) / s;
        double s2 = s * s;
        double s3 = s2 * s;
        double e = energy;
        this.byHeel = d.y() / s - h * e / s2;
        this.byTrim = -d.x() / s - t * e / s2;
        this.heelHeel = -c.transverse() / s - d.y() * h / s3 - e / s2 - h * byHeel / s2 + 2 * h * h * e / (s2 * s2);
        this.trimTrim = -c.longitudinal() / s + d.x() * t / s3 - e / s2 - t * byTrim / s2 + 2 * t * t * e / (s2 * s2);
        this.heelTrim = c.product() / s + d.x() * h / s3 - t * byHeel / s2 + 2 * t * h * e / (s2 * s2);
    }

    static Inclination upright(LoadedPlatform platform) {
        double[] guesses = new double[platform.tanks().size()];
        Arrays.fill(guesses, Double.NaN);
        return new Inclination(platform, 0, 0, Double.NaN, guesses);
    }

    /** The same platform at other slopes. */
    Inclination at(double heelSlope, double trimSlope) {
        Vec3 pivot = hull.sectionCentroid();
        double guess = hull.plane().origin().z() - pivot.x() * (trimSlope - t) + pivot.y() * (heelSlope - h);
        return new Inclination(platform, heelSlope, trimSlope, guess, surfaces);
    }

    Inclination moved(double heelStep, double trimStep) {
        return at(h + heelStep, t + trimStep);
    }

    double energy() {
        return energy;
    }

    /** Distance of G from the vertical through B (m). */
    double arm() {
        Vec3 n = hull.plane().normal();
        return d.minus(n.times(d.dot(n))).norm();
    }

    /** Angle between the platform's and the true vertical (rad). */
    double inclination() {
        return Math.acos(1 / s);
    }

    /** A step downhill, no longer than the reach: Newton's where the energy is convex, its mirror image along directions where it is not. */
    double[] newtonStep(double reach) {
        double[] v = firstDirection();
        double[] curvatures = curvatures();
        double along = byHeel * v[0] + byTrim * v[1];
        double across = -byHeel * v[1] + byTrim * v[0];
        double floor = FLATTEST * Math.max(Math.abs(curvatures[0]), Math.abs(curvatures[1])) + Double.MIN_NORMAL;
        double a = -along / Math.max(Math.abs(curvatures[0]), floor);
        double b = -across / Math.max(Math.abs(curvatures[1]), floor);
        double scale = Math.min(1, reach / Math.hypot(a, b));
        return new double[] {scale * (a * v[0] - b * v[1]), scale * (a * v[1] + b * v[0])};
    }

    /** Where the energy has no minimum, the direction in which it falls; of both the one towards starboard, then bow, down. */
    Optional<double[]> wayOffSaddle() {
        double[] curvatures = curvatures();
        if (curvatures[0] > 0 && curvatures[1] > 0) {
            return Optional.empty();
        }
        double[] v = firstDirection();
        double[] way = {-v[1], v[0]};
        boolean alongTrim = Math.abs(way[0]) <= SAME_DIRECTION;
        boolean turn = alongTrim ? way[1] < 0 : way[0] < 0;
        return Optional.of(turn ? new double[] {-way[0], -way[1]} : way);
    }

    /** Unit eigenvector (heel, trim) of the Hessian's greater eigenvalue. */
    private double[] firstDirection() {
        double angle = Math.atan2(2 * heelTrim, heelHeel - trimTrim) / 2;
        return new double[] {Math.cos(angle), Math.sin(angle)};
    }

    /** The Hessian's eigenvalues, the greater first (m). */
    private double[] curvatures() {
        double mean = (heelHeel + trimTrim) / 2;
        double spread = Math.hypot((heelHeel - trimTrim) / 2, heelTrim);
        return new double[] {mean + spread, mean - spread};
    }

    Afloat afloat(boolean stable) {
        Waterplane waterplane = new Waterplane(hull.plane().origin().z(), Math.atan(h), Math.atan(t));
        return new Afloat(waterplane, hull.volume(), hull.centroid(), gravity, stable, arm());
    }
}
