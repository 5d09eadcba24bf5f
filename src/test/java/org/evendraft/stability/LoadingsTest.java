package org.evendraft.stability;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Random;
import net.jqwik.api.Assume;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.ShrinkingMode;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.IntRange;
import org.evendraft.geometry.Assembly;
import org.evendraft.geometry.Cut;
import org.evendraft.geometry.Meshes;
import org.evendraft.geometry.SecondMoments;
import org.evendraft.geometry.Solid;
import org.evendraft.geometry.Vec3;
import org.evendraft.platform.Fill;
import org.evendraft.platform.Load;
import org.evendraft.platform.PreparedPlatform;
import org.evendraft.platform.Purpose;
import org.evendraft.platform.TableRow;
import org.evendraft.platform.Tank;

/**
 * Random loadings of two hulls with slack tanks known by bodies, by tables and by inclined meshes. The condition of rest is checked
 * with the hull and each body tank cut anew, triangle by triangle, under the plane of the answer.
 */
class LoadingsTest {
    private static final double SEA = 1.025;
    private static final double RESIDUAL = 1e-9;

    static Load load(double mass, double x, double y, double z) {
        return new Load("load", Load.Kind.VARIABLE, Optional.empty(), mass, new Vec3(x, y, z), OptionalDouble.empty());
    }

    /** A box of 6 × 4 × 5 m turned about a slanting axis: a tank none of whose walls is upright. */
    static Tank tiltedTank(String id, Vec3 centre) {
        var turn = Meshes.rotation(new Vec3(1, 2, 0.5), 0.6);
        Solid box = Solid.box(new Vec3(-3, -2, -2.5), new Vec3(3, 2, 2.5));
        return Floaters.tank(
                id,
                Floaters.body(
                        id,
                        Solid.ofMesh(Meshes.moved(box.mesh(), v -> turn.apply(v).plus(centre)))));
    }

    /** A tank of vertical walls known by two rows of a table only. */
    static Tank tableTank(String id, double x0, double x1, double y0, double y1, double z0, double z1) {
        List<TableRow> rows = new ArrayList<>();
        double area = (x1 - x0) * (y1 - y0);
        SecondMoments surface =
                new SecondMoments(area * (y1 - y0) * (y1 - y0) / 12, area * (x1 - x0) * (x1 - x0) / 12, 0);
        for (double z : new double[] {z0, z1}) {
            rows.add(new TableRow(
                    z - z0, area * (z - z0), new Vec3((x0 + x1) / 2, (y0 + y1) / 2, (z0 + z) / 2), surface));
        }
        return new Tank(id, id, Purpose.BALLAST, SEA, List.of(), rows, 1, 0.98, 0, 1, false);
    }

    /** Prepared once: the tables of so many curved tanks take longer to make than any position to find. */
    private static final PreparedPlatform TWIN_PONTOON =
            Floaters.platform(Floaters.twinPontoon(), 10_000, new Vec3(0, 0, 14), twinPontoonTanks());

    private static final PreparedPlatform OC4 =
            Floaters.platform(Floaters.oc4(true), 4300, new Vec3(0, 0, 13), oc4Tanks());

    private static List<Tank> twinPontoonTanks() {
        List<Tank> tanks = new ArrayList<>();
        for (int side : new int[] {1, -1}) {
            for (int i = 0; i < 5; i++) {
                double x = -50 + 20 * i;
                String id = (side > 0 ? "P" : "S") + i;
                double y0 = side * 30 - 7.5;
                tanks.add(
                        i == 2
                                ? tableTank(id, x, x + 20, y0, y0 + 15, 0, 8)
                                : Floaters.tank(id, Floaters.box(id, x, x + 20, y0, y0 + 15, 0, 8)));
            }
            tanks.add(tiltedTank("tilted " + side, new Vec3(35, 30 * side, 13)));
            tanks.add(Floaters.tank(
                    "round " + side,
                    Floaters.cylinder("round", new Vec3(-35, 30 * side - 5, 12), new Vec3(-35, 30 * side + 5, 12), 4)));
        }
        return tanks;
    }

    private static List<Tank> oc4Tanks() {
        List<Tank> tanks = new ArrayList<>();
        double[][] axes = {{14.43376, 25.0}, {14.43376, -25.0}, {-28.86751, 0}};
        for (int i = 0; i < 3; i++) {
            double x = axes[i][0];
            double y = axes[i][1];
            tanks.add(
                    Floaters.tank("base " + i, Floaters.cylinder("base", new Vec3(x, y, 0), new Vec3(x, y, 6), 23.88)));
            tanks.add(Floaters.tank(
                    "upper " + i, Floaters.cylinder("upper", new Vec3(x, y, 6), new Vec3(x, y, 20), 11.88)));
        }
        return tanks;
    }

    private static LoadedPlatform loaded(PreparedPlatform platform, Random random, List<Load> loads) {
        List<Fill> fills = platform.platform().tanks().stream()
                .map(t -> new Fill(
                        t.id(),
                        platform.calibration(t.id()).fullVolume() * random.nextDouble(),
                        0.8 + 0.4 * random.nextDouble()))
                .toList();
        return LoadedPlatform.of(platform, Floaters.condition(fills, loads));
    }

    /** The synthetic twin-pontoon hull with fourteen tanks at random; about a third of the loadings rest near its pontoon deck. */
    static LoadedPlatform twinPontoon(int seed) {
        Random random = new Random(seed);
        Load more = load(6000 * random.nextDouble(), random.nextGaussian(), random.nextGaussian(), 14);
        Load aside = load(200 * random.nextDouble(), 30 * random.nextGaussian(), 20 * random.nextGaussian(), 30);
        return loaded(TWIN_PONTOON, random, List.of(more, aside));
    }

    /** OC4 with its braces, a ballast tank in each base and upper column, filled at random. */
    static LoadedPlatform oc4(int seed) {
        Random random = new Random(seed);
        return loaded(OC4, random, List.of(load(200, 5 * random.nextGaussian(), 5 * random.nextGaussian(), 30)));
    }

    private static boolean nearlyUpright(LoadedPlatform loaded) {
        return loaded.canFloat() && loaded.evenKeel().gm().least().corrected() > 0;
    }

    @Property(tries = 40, seed = "51", shrinking = ShrinkingMode.OFF)
    void theTwinPontoonHullRestsWhereWeightEqualsBuoyancy(@ForAll @IntRange(max = 1_000_000) int seed) {
        assertAtRest(twinPontoon(seed));
    }

    @Property(tries = 12, seed = "52", shrinking = ShrinkingMode.OFF)
    void oc4RestsWhereWeightEqualsBuoyancy(@ForAll @IntRange(max = 1_000_000) int seed) {
        assertAtRest(oc4(seed));
    }

    private static void assertAtRest(LoadedPlatform loaded) {
        Equilibrium found = loaded.floatingPosition();
        assertThat(found).isNotInstanceOf(Equilibrium.Unresolved.class);
        Assume.that(nearlyUpright(loaded) && found instanceof Equilibrium.Afloat);
        Equilibrium.Afloat afloat = (Equilibrium.Afloat) found;
        Cut hull = loaded.prepared().hull().belowByTriangles(afloat.waterplane().plane());
        double mass = loaded.mass();
        assertThat(SEA * hull.volume()).isCloseTo(mass, within(RESIDUAL * mass));
        Vec3 g = gravity(loaded, afloat.waterplane());
        assertThat(g.minus(afloat.centreOfGravity()).norm()).isLessThan(1e-8);
        Vec3 d = g.minus(hull.centroid());
        assertThat(d.cross(hull.plane().normal()).norm()).isLessThan(2 * RESIDUAL);
        assertThat(afloat.residualArm()).isLessThanOrEqualTo(RESIDUAL);
        assertThat(afloat.stable()).isTrue();
    }

    /** G with each slack body tank cut anew under its own plane, and each table tank moved as a wall-sided one. */
    private static Vec3 gravity(LoadedPlatform loaded, Waterplane at) {
        Vec3 moment = loaded.fixedMoment();
        for (TankContents t : loaded.tanks()) {
            moment = moment.plus(t.state() == TankState.SLACK ? moved(t, at) : t.moment());
        }
        return moment.times(1 / loaded.mass());
    }

    private static Vec3 moved(TankContents t, Waterplane at) {
        double slopeX = Math.tan(at.trimRad());
        double slopeY = -Math.tan(at.heelRad());
        if (t.tank().bodies().isEmpty()) {
            double byX = t.liquid().surface().longitudinal() * slopeX;
            double byY = t.liquid().surface().transverse() * slopeY;
            Vec3 shift = new Vec3(byX, byY, (byX * slopeX + byY * slopeY) / 2);
            return t.moment().plus(shift.times(t.density()));
        }
        Assembly shape = new Assembly(t.tank().bodies().stream()
                .map(b -> new Assembly.Part(b.solid(), b.cutOut()))
                .toList());
        Cut held = shape.holding(t.liquid().volume(), slopeX, slopeY, Double.NaN);
        return shape.belowByTriangles(held.plane()).moment().times(t.density());
    }

    /** About the pontoon deck, where the waterplane and with it GM jump, a position is found or none exists, but none is missed. */
    @Property(tries = 150, seed = "55", shrinking = ShrinkingMode.OFF)
    void positionsAwashAtThePontoonDeckAreFound(@ForAll @IntRange(max = 1_000_000) int seed) {
        Random random = new Random(seed);
        double volume = 24_000 + (seed % 3 == 0 ? 0 : 300 * random.nextGaussian());
        Vec3 g = new Vec3(2 * random.nextGaussian(), 2 * random.nextGaussian(), 10 + 20 * random.nextDouble());
        PreparedPlatform platform = Floaters.platform(Floaters.twinPontoon(), SEA * volume, g, List.of());
        Equilibrium found = LoadedPlatform.of(platform, Floaters.condition(List.of(), List.of()))
                .floatingPosition();
        assertThat(found).isNotInstanceOf(Equilibrium.Unresolved.class);
        if (found instanceof Equilibrium.Afloat afloat) {
            Cut hull = platform.hull().belowByTriangles(afloat.waterplane().plane());
            assertThat(hull.volume()).isCloseTo(volume, within(RESIDUAL * volume));
            assertThat(g.minus(hull.centroid()).cross(hull.plane().normal()).norm())
                    .isLessThan(2 * RESIDUAL);
            assertThat(afloat.stable()).isTrue();
        }
    }

    /** As the moment goes to nothing the exact heel and trim become the estimates, liquids free in both. */
    @Property(tries = 30, seed = "53", shrinking = ShrinkingMode.OFF)
    void atSmallAnglesTheExactPositionIsTheEstimate(
            @ForAll @DoubleRange(min = 0.15, max = 0.85) double fraction,
            @ForAll @DoubleRange(min = -20, max = 20) double x,
            @ForAll @DoubleRange(min = -20, max = 20) double y) {
        List<Tank> tanks = List.of(
                Floaters.tank("P", Floaters.box("P", -20, 20, 22.5, 37.5, 0, 8)),
                Floaters.tank("S", Floaters.box("S", -20, 20, -37.5, -22.5, 0, 8)),
                tableTank("C", -6, 6, -6, 6, 20, 28));
        PreparedPlatform platform = Floaters.platform(Floaters.twinPontoon(), 22_000, new Vec3(0, 0, 12), tanks);
        List<Fill> fills = List.of(
                new Fill("P", 4800 * fraction, SEA),
                new Fill("S", 4800 * fraction, SEA),
                new Fill("C", 1152 * fraction, SEA));
        double previous = Double.POSITIVE_INFINITY;
        for (double mass : new double[] {100, 1, 0.01}) {
            ConditionResult result =
                    Evaluation.evaluate(platform, Floaters.condition(fills, List.of(load(mass, x, y, 30))));
            double heel = Math.toDegrees(Math.atan(
                    -result.centreOfGravity().y() / result.gm().transverse().corrected()));
            double trim = Math.toDegrees(Math.atan(
                    result.centreOfGravity().x() / result.gm().longitudinal().corrected()));
            assertThat(result.estimate().heelAngle()).isCloseTo(heel, within(1e-9));
            assertThat(result.estimate().trimAngle()).isCloseTo(trim, within(1e-9));
            double off = Math.hypot(
                    result.floating().heelAngle() - heel, result.floating().trimAngle() - trim);
            double size = Math.hypot(heel, trim);
            // The first difference is of the third order: the angle's square times the angle; under it, 1e-9 m of arm.
            assertThat(off).isLessThan(1e-3 * size * size * size + 1e-2 * size * size / 100 + 1e-7);
            assertThat(off).isLessThanOrEqualTo(previous + 1e-7);
            previous = off;
        }
    }

    /** What is loaded mirrored to the other side heels as much to the other side. */
    @Property(tries = 15, seed = "54", shrinking = ShrinkingMode.OFF)
    void aMirroredLoadingHeelsAsMuchToTheOtherSide(
            @ForAll @DoubleRange(min = 0.05, max = 0.95) double one,
            @ForAll @DoubleRange(min = 0.05, max = 0.95) double other,
            @ForAll @DoubleRange(min = -25, max = 25) double y) {
        ConditionResult a = mirrored(one, other, y);
        ConditionResult b = mirrored(other, one, -y);
        assertThat(a.floating().heelAngle()).isCloseTo(-b.floating().heelAngle(), within(1e-7));
        assertThat(a.floating().trimAngle()).isCloseTo(b.floating().trimAngle(), within(1e-7));
        assertThat(a.floating().draft()).isCloseTo(b.floating().draft(), within(1e-7));
    }

    private static ConditionResult mirrored(double port, double starboard, double y) {
        List<Tank> tanks = List.of(
                Floaters.tank("P", Floaters.box("P", 0, 20, 22.5, 37.5, 0, 8)),
                Floaters.tank("S", Floaters.box("S", 0, 20, -37.5, -22.5, 0, 8)));
        PreparedPlatform platform = Floaters.platform(Floaters.twinPontoon(), 25_000, new Vec3(-2, 0, 12), tanks);
        List<Fill> fills = List.of(new Fill("P", 2400 * port, SEA), new Fill("S", 2400 * starboard, SEA));
        return Evaluation.evaluate(platform, Floaters.condition(fills, List.of(load(100, 5, y, 30))));
    }
}
