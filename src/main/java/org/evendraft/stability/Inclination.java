package org.evendraft.stability;

import java.util.ArrayList;
import java.util.List;
import org.evendraft.geometry.Assembly;
import org.evendraft.geometry.Cut;
import org.evendraft.geometry.SecondMoments;
import org.evendraft.geometry.Vec3;
import org.evendraft.platform.InclinedLiquids;
import org.evendraft.stability.Equilibrium.Afloat;

/** A platform held at given slopes at its displacement, its liquids level with the sea. Immutable. */
final class Inclination {
    private final Weights weights;
    private final Slopes slopes;
    private final Cut hull;
    private final InclinedLiquids liquids;
    private final Vec3 gravity;
    private final EnergyAtSlopes energy;

    /**
     * What is the same at all slopes.
     *
     * @param hull what keeps the platform afloat
     * @param waterDensity density of the sea (t/m³)
     * @param mass mass afloat (t)
     * @param fixedMoment first moments of what does not move (t·m)
     * @param free tanks whose liquid moves
     */
    private record Weights(Assembly hull, double waterDensity, double mass, Vec3 fixedMoment, List<TankContents> free) {
        static Weights of(LoadedPlatform platform) {
            Vec3 moment = platform.fixedMoment();
            List<TankContents> free = new ArrayList<>();
            for (TankContents tank : platform.tanks()) {
                if (tank.hasFreeSurface()) {
                    free.add(tank);
                } else {
                    moment = moment.plus(tank.moment());
                }
            }
            return new Weights(platform.hull(), platform.waterDensity(), platform.mass(), moment, free);
        }
    }

    /**
     * @param guess height of the waterplane over the origin to start from (m)
     * @param liquids not gathered yet
     */
    private Inclination(Weights weights, Slopes slopes, double guess, InclinedLiquids liquids) {
        this.weights = weights;
        this.slopes = slopes;
        this.liquids = liquids;
        double mass = weights.mass();
        double density = weights.waterDensity();
        this.hull = weights.hull().holding(mass / density, slopes.trim(), -slopes.heel(), guess);
        for (int i = 0; i < weights.free().size(); i++) {
            TankContents tank = weights.free().get(i);
            tank.calibration().addInclined(liquids, i, tank.liquid(), tank.density());
        }
        this.gravity = weights.fixedMoment().plus(liquids.moment()).times(1 / mass);
        SecondMoments stiffness =
                liquids.projected().plus(hull.projectedSecondMoments().times(-density));
        this.energy = EnergyAtSlopes.of(slopes, gravity.minus(hull.centroid()), stiffness.times(1 / mass));
    }

    static Inclination upright(LoadedPlatform platform) {
        Weights weights = Weights.of(platform);
        InclinedLiquids liquids = InclinedLiquids.upright(weights.free().size());
        return new Inclination(weights, Slopes.LEVEL, Double.NaN, liquids);
    }

    /** The same platform at other slopes. */
    Inclination at(Slopes other) {
        Vec3 pivot = hull.sectionCentroid();
        double guess = hull.heightOverOrigin()
                - pivot.x() * (other.trim() - slopes.trim())
                + pivot.y() * (other.heel() - slopes.heel());
        return new Inclination(weights, other, guess, liquids.at(other.trim(), -other.heel()));
    }

    Inclination moved(Slopes step) {
        return at(slopes.plus(step));
    }

    Slopes slopes() {
        return slopes;
    }

    /** Upward unit normal of the waterplane. */
    Vec3 normal() {
        return hull.normal();
    }

    EnergyAtSlopes energy() {
        return energy;
    }

    Waterplane waterplane() {
        return new Waterplane(hull.heightOverOrigin(), Math.atan(slopes.heel()), Math.atan(slopes.trim()));
    }

    /** Centre of buoyancy (m). */
    Vec3 centreOfBuoyancy() {
        return hull.centroid();
    }

    /** Mass afloat (t). */
    double mass() {
        return weights.mass();
    }

    /** From B to G (m). */
    Vec3 gravityOverBuoyancy() {
        return gravity.minus(hull.centroid());
    }

    /** Distance of G from the vertical through B (m). */
    double arm() {
        Vec3 d = gravityOverBuoyancy();
        Vec3 n = hull.normal();
        return d.minus(n.times(d.dot(n))).norm();
    }

    Afloat afloat() {
        boolean stable = energy.leastCurvature() > 0;
        return new Afloat(waterplane(), hull.volume(), hull.centroid(), gravity, stable, arm());
    }
}
