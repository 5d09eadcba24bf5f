package org.evendraft.stability;

import java.util.Collection;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.function.Function;
import java.util.function.UnaryOperator;
import java.util.stream.Collectors;
import org.evendraft.geometry.Assembly;
import org.evendraft.geometry.Cut;
import org.evendraft.geometry.Plane;
import org.evendraft.geometry.SecondMoments;
import org.evendraft.geometry.Vec3;
import org.evendraft.platform.Calibration;
import org.evendraft.platform.Condition;
import org.evendraft.platform.Condition.FreeSurface;
import org.evendraft.platform.Fill;
import org.evendraft.platform.Load;
import org.evendraft.platform.PreparedPlatform;
import org.evendraft.platform.Tank;

/** A platform with all that it carries, in water of one density. Immutable; {@code with…} methods return another. */
public final class LoadedPlatform {
    /** A mass within this part of the whole buoyancy has no freeboard left to float by. */
    private static final double LEAST_RESERVE = 1e-9;

    private final PreparedPlatform prepared;
    private final Assembly hull;
    private final double waterDensity;
    private final FreeSurface freeSurface;
    private final double fixedMass;
    private final Vec3 fixedMoment;
    private final List<TankContents> tanks;

    private LoadedPlatform(
            PreparedPlatform prepared,
            Assembly hull,
            double waterDensity,
            FreeSurface freeSurface,
            double fixedMass,
            Vec3 fixedMoment,
            List<TankContents> tanks) {
        this.prepared = prepared;
        this.hull = hull;
        this.waterDensity = waterDensity;
        this.freeSurface = freeSurface;
        this.fixedMass = fixedMass;
        this.fixedMoment = fixedMoment;
        this.tanks = tanks;
    }

    /** The platform in a condition. */
    public static LoadedPlatform of(PreparedPlatform prepared, Condition condition) {
        double mass = prepared.platform().lightship().mass();
        Vec3 moment = prepared.platform().lightship().centre().times(mass);
        for (Load load : condition.loads()) {
            mass += load.mass();
            moment = moment.plus(load.position().times(load.mass()));
        }
        Map<String, Fill> fills = condition.fills().stream().collect(Collectors.toMap(Fill::tank, Function.identity()));
        List<TankContents> tanks = prepared.platform().tanks().stream()
                .map(tank -> contents(tank, prepared.calibration(tank.id()), fills))
                .toList();
        return new LoadedPlatform(
                prepared, prepared.hull(), condition.waterDensity(), condition.freeSurface(), mass, moment, tanks);
    }

    private static TankContents contents(Tank tank, Calibration calibration, Map<String, Fill> fills) {
        Fill fill = fills.getOrDefault(tank.id(), new Fill(tank.id(), 0, tank.density()));
        return new TankContents(tank, calibration, fill.density(), calibration.holding(fill.volume()), false);
    }

    /**
     * A platform that floats upright at a draft, G on the vertical through B, as limits of KG are found for: no liquid is free, for KG stands
     * there for KG with the free-surface correction.
     *
     * @param draft even-keel draft (m), at which a part of the hull is in the water and a part over it
     * @param kg height of G over the keel (m)
     */
    static LoadedPlatform upright(PreparedPlatform prepared, double waterDensity, double draft, double kg) {
        Cut cut = prepared.hull().below(Plane.ofSlopes(draft, 0, 0));
        double mass = waterDensity * cut.volume();
        Vec3 centre = new Vec3(cut.centroid().x(), cut.centroid().y(), kg);
        return new LoadedPlatform(
                prepared, prepared.hull(), waterDensity, FreeSurface.ACTUAL, mass, centre.times(mass), List.of());
    }

    /** The same with G at another height, of a platform without tanks (m). */
    LoadedPlatform withKg(double kg) {
        Vec3 moment = new Vec3(fixedMoment.x(), fixedMoment.y(), kg * fixedMass);
        return new LoadedPlatform(prepared, hull, waterDensity, freeSurface, fixedMass, moment, tanks);
    }

    /** The same with other contents in the tanks named. */
    public LoadedPlatform withFills(Collection<Fill> fills) {
        Map<String, Fill> byTank = fills.stream().collect(Collectors.toMap(Fill::tank, Function.identity()));
        return withTanks(t -> {
            Fill fill = byTank.get(t.tank().id());
            return fill == null ? t : t.with(fill.density(), fill.volume());
        });
    }

    /** The same with other volumes of the liquids that the tanks named hold, of sea water where they are empty (m³). */
    public LoadedPlatform withVolumes(Map<String, Double> volumes) {
        return withTanks(t -> {
            Double volume = volumes.get(t.tank().id());
            double density = t.state() == TankState.EMPTY ? waterDensity : t.density();
            return volume == null ? t : t.with(density, volume);
        });
    }

    /** The same with pumps at work on just the tanks named: they have a free surface even when all but full. */
    public LoadedPlatform withMoving(Set<String> ids) {
        return withTanks(t -> t.withMoving(ids.contains(t.tank().id())));
    }

    /** The same with spaces open to the sea: their buoyancy lost, and the tanks' contents with it. */
    LoadedPlatform withFlooded(Collection<String> spaces) {
        LoadedPlatform emptied = withTanks(t -> spaces.contains(t.tank().id()) ? t.with(t.density(), 0) : t);
        return new LoadedPlatform(
                prepared,
                prepared.hullWithout(spaces),
                waterDensity,
                freeSurface,
                fixedMass,
                fixedMoment,
                emptied.tanks);
    }

    private LoadedPlatform withTanks(UnaryOperator<TankContents> change) {
        List<TankContents> changed = tanks.stream().map(change).toList();
        return new LoadedPlatform(prepared, hull, waterDensity, freeSurface, fixedMass, fixedMoment, changed);
    }

    /** The same with every liquid held as on even keel and G raised by the free-surface correction about a horizontal axis. */
    LoadedPlatform atRest(double azimuthRad, FreeSurface which) {
        SecondMoments moments = tanks.stream()
                .map(tank -> tank.freeSurfaceMoments(which))
                .reduce(SecondMoments.NONE, SecondMoments::plus);
        double cos = Math.cos(azimuthRad);
        double sin = Math.sin(azimuthRad);
        double aboutAxis = cos * cos * moments.transverse()
                - 2 * sin * cos * moments.product()
                + sin * sin * moments.longitudinal();
        double mass = mass();
        Vec3 moment = centreOfGravity().times(mass).plus(new Vec3(0, 0, aboutAxis));
        return new LoadedPlatform(prepared, hull, waterDensity, freeSurface, mass, moment, List.of());
    }

    /** The platform. */
    public PreparedPlatform prepared() {
        return prepared;
    }

    /** What keeps it afloat: the platform's hull, less what the sea has flooded. */
    Assembly hull() {
        return hull;
    }

    /** Density of the sea (t/m³). */
    public double waterDensity() {
        return waterDensity;
    }

    List<TankContents> tanks() {
        return tanks;
    }

    double fixedMass() {
        return fixedMass;
    }

    Vec3 fixedMoment() {
        return fixedMoment;
    }

    /** Mass afloat (t). */
    public double mass() {
        return fixedMass + tanks.stream().mapToDouble(TankContents::mass).sum();
    }

    /** Centre of gravity, liquids as they lie on even keel (m). */
    public Vec3 centreOfGravity() {
        Vec3 moment = fixedMoment;
        for (TankContents tank : tanks) {
            moment = moment.plus(tank.moment());
        }
        return moment.times(1 / mass());
    }

    /** What the whole hull displaces (t). */
    public double buoyancy() {
        return waterDensity * hull.volume();
    }

    /** Whether the hull can carry the mass, and there is one. */
    public boolean canFloat() {
        double mass = mass();
        return mass > 0 && mass < buoyancy() * (1 - LEAST_RESERVE);
    }

    /**
     * The platform on even keel.
     *
     * @throws IllegalStateException when it cannot float
     */
    public EvenKeel evenKeel() {
        if (!canFloat()) {
            throw new IllegalStateException("mass " + mass() + " t of " + buoyancy() + " t");
        }
        double mass = mass();
        Cut cut = hull.holding(mass / waterDensity, 0, 0, Double.NaN);
        double kb = cut.centroid().z();
        SecondMoments inertia = cut.secondMoments();
        MetacentricMatrix solid = MetacentricMatrix.of(
                inertia, cut.volume(), kb - centreOfGravity().z());
        MetacentricMatrix correction = MetacentricMatrix.of(freeSurfaceMoments(), mass, 0);
        MetacentricMatrix corrected = solid.minus(correction);
        ConditionResult.Gm gm = new ConditionResult.Gm(
                new ConditionResult.GmFigures(solid.transverse(), correction.transverse(), corrected.transverse()),
                new ConditionResult.GmFigures(
                        solid.longitudinal(), correction.longitudinal(), corrected.longitudinal()),
                new ConditionResult.LeastGm(corrected.least(), corrected.leastAzimuth()));
        ConditionResult.Directions km = new ConditionResult.Directions(
                kb + inertia.transverse() / cut.volume(), kb + inertia.longitudinal() / cut.volume());
        return new EvenKeel(cut.plane().origin().z(), cut.volume(), cut.centroid(), km, gm);
    }

    private SecondMoments freeSurfaceMoments() {
        return tanks.stream()
                .map(tank -> tank.freeSurfaceMoments(freeSurface))
                .reduce(SecondMoments.NONE, SecondMoments::plus);
    }

    /** Free-surface moments of a tank, as the condition asks for them (t·m). */
    SecondMoments freeSurfaceMoments(TankContents tank) {
        return tank.freeSurfaceMoments(freeSurface);
    }

    /** The exact floating position, liquids free. */
    public Equilibrium floatingPosition() {
        double mass = mass();
        return canFloat() ? new FloatingPosition(this).find() : new Equilibrium.Sinks(mass, buoyancy());
    }
}
