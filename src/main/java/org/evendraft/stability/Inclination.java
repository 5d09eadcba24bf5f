package org.evendraft.stability;

import java.util.Arrays;
import java.util.List;
import org.evendraft.geometry.Cut;
import org.evendraft.geometry.SecondMoments;
import org.evendraft.geometry.Vec3;
import org.evendraft.platform.Calibration.Inclined;
import org.evendraft.stability.Equilibrium.Afloat;

/** A platform held at given slopes at its displacement, its liquids level with the sea. Immutable. */
final class Inclination {
    private final LoadedPlatform platform;
    private final Slopes slopes;
    private final Cut hull;
    /** Heights of the tanks' surfaces over the origin, to start from at neighbouring slopes (m). */
    private final double[] surfaces;

    private final Vec3 gravity;
    private final EnergyAtSlopes energy;

    private Inclination(LoadedPlatform platform, Slopes slopes, double guess, double[] surfaceGuesses) {
        this.platform = platform;
        this.slopes = slopes;
        double mass = platform.mass();
        double density = platform.waterDensity();
        this.hull = platform.hull().holding(mass / density, slopes.trim(), -slopes.heel(), guess);
        this.surfaces = surfaceGuesses.clone();
        Vec3 moment = platform.fixedMoment();
        SecondMoments stiffness = hull.projectedSecondMoments().times(-density);
        List<TankContents> tanks = platform.tanks();
        for (int i = 0; i < surfaces.length; i++) {
            TankContents tank = tanks.get(i);
            if (tank.hasFreeSurface()) {
                Inclined liquid =
                        tank.calibration().inclined(tank.liquid().volume(), slopes.trim(), -slopes.heel(), surfaces[i]);
                surfaces[i] = liquid.height();
                moment = moment.plus(liquid.moment().times(tank.density()));
                stiffness = stiffness.plus(liquid.projected().times(tank.density()));
            } else {
                moment = moment.plus(tank.moment());
            }
        }
        this.gravity = moment.times(1 / mass);
        this.energy = EnergyAtSlopes.of(slopes, gravity.minus(hull.centroid()), stiffness.times(1 / mass));
    }

    static Inclination upright(LoadedPlatform platform) {
        double[] guesses = new double[platform.tanks().size()];
        Arrays.fill(guesses, Double.NaN);
        return new Inclination(platform, Slopes.LEVEL, Double.NaN, guesses);
    }

    /** The same platform at other slopes. */
    Inclination at(Slopes other) {
        Vec3 pivot = hull.sectionCentroid();
        double guess = hull.plane().origin().z()
                - pivot.x() * (other.trim() - slopes.trim())
                + pivot.y() * (other.heel() - slopes.heel());
        return new Inclination(platform, other, guess, surfaces);
    }

    Inclination moved(Slopes step) {
        return at(slopes.plus(step));
    }

    Slopes slopes() {
        return slopes;
    }

    EnergyAtSlopes energy() {
        return energy;
    }

    Waterplane waterplane() {
        return new Waterplane(hull.plane().origin().z(), Math.atan(slopes.heel()), Math.atan(slopes.trim()));
    }

    /** Centre of buoyancy (m). */
    Vec3 centreOfBuoyancy() {
        return hull.centroid();
    }

    /** Mass afloat (t). */
    double mass() {
        return platform.mass();
    }

    /** From B to G (m). */
    Vec3 gravityOverBuoyancy() {
        return gravity.minus(hull.centroid());
    }

    /** Distance of G from the vertical through B (m). */
    double arm() {
        Vec3 d = gravityOverBuoyancy();
        Vec3 n = hull.plane().normal();
        return d.minus(n.times(d.dot(n))).norm();
    }

    Afloat afloat() {
        boolean stable = energy.leastCurvature() > 0;
        return new Afloat(waterplane(), hull.volume(), hull.centroid(), gravity, stable, arm());
    }
}
