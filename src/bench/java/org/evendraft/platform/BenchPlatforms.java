package org.evendraft.platform;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.List;
import java.util.SplittableRandom;
import java.util.function.UnaryOperator;
import java.util.stream.IntStream;
import org.evendraft.geometry.Assembly;
import org.evendraft.geometry.Grids;
import org.evendraft.geometry.Solid;
import org.evendraft.geometry.Vec3;

/** The demo platform and its condition for benchmarks, as they are and in variations. The same at every run. */
public final class BenchPlatforms {
    private static final long SEED = 20261201;
    /** Every tank is filled to between these parts: all are slack and the platform floats on its columns. */
    private static final double LEAST_FILL = 0.4;

    private static final double GREATEST_FILL = 0.55;

    private BenchPlatforms() {}

    /** The demo platform. */
    public static PreparedPlatform demo() {
        return PlatformReader.read(Json.parse(resource("merganser.json")));
    }

    /** The condition of the demo. */
    public static Condition demoCondition(PreparedPlatform demo) {
        return ConditionReader.read(Json.parse(resource("condition.json")), demo);
    }

    private static byte[] resource(String name) {
        try (InputStream in = BenchPlatforms.class.getResourceAsStream("/db/demo/" + name)) {
            if (in == null) {
                throw new IllegalStateException("no " + name);
            }
            return in.readAllBytes();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** The same platform without short cuts: hull and tanks by clipping every triangle. */
    public static PreparedPlatform byTriangles(PreparedPlatform prepared) {
        return new PreparedPlatform(prepared.platform(), List.of(), Assembly::byTriangles);
    }

    /** The demo's loads with every tank slack, filled at random. */
    public static Condition allSlack(PreparedPlatform prepared, Condition like) {
        SplittableRandom random = new SplittableRandom(SEED);
        List<Fill> fills = new ArrayList<>();
        for (Tank tank : prepared.platform().tanks()) {
            double fraction = random.nextDouble(LEAST_FILL, GREATEST_FILL);
            double volume = fraction * prepared.calibration(tank.id()).fullVolume();
            fills.add(new Fill(tank.id(), volume, tank.density()));
        }
        return with(like, fills);
    }

    private static Condition with(Condition like, List<Fill> fills) {
        return new Condition(like.name(), like.mode(), like.waterDensity(), like.freeSurface(), fills, like.loads());
    }

    /** The platform with each tank divided into four: a box lengthwise and crosswise, a tank known by its table into equal parts. */
    public static PreparedPlatform withQuarteredTanks(PreparedPlatform prepared) {
        List<Tank> quarters = prepared.platform().tanks().stream()
                .flatMap(tank -> IntStream.range(0, 4).mapToObj(k -> quarter(tank, k)))
                .toList();
        return new PreparedPlatform(with(prepared.platform(), prepared.platform().hull(), quarters));
    }

    /** The condition of the platform with quartered tanks, each quarter filled to the same part as the whole tank. */
    public static Condition quartered(Condition like) {
        return with(
                like,
                like.fills().stream()
                        .flatMap(fill -> IntStream.range(0, 4)
                                .mapToObj(k -> new Fill(fill.tank() + "." + k, fill.volume() / 4, fill.density())))
                        .toList());
    }

    private static Tank quarter(Tank whole, int k) {
        UnaryOperator<Body> part = body -> new Body(body.name(), body.cutOut(), quarter(body.solid(), k));
        List<TableRow> rows = whole.table().stream()
                .map(r -> new TableRow(r.level(), r.volume() / 4, r.centre(), r.surface().times(1 / 4.0)))
                .toList();
        return new Tank(
                whole.id() + "." + k,
                whole.name(),
                whole.purpose(),
                whole.density(),
                whole.bodies().stream().map(part).toList(),
                rows,
                whole.permeability(),
                whole.pressedUpFraction(),
                whole.leastPumpableFraction(),
                whole.greatestFraction(),
                whole.locked());
    }

    private static Solid quarter(Solid box, int k) {
        Vec3 half = box.greatest().minus(box.least()).times(0.5);
        Vec3 from = box.least().plus(new Vec3((k & 1) * half.x(), (k >> 1) * half.y(), 0));
        return Solid.box(from, from.plus(new Vec3(half.x(), half.y(), 2 * half.z())));
    }

    /**
     * The platform with its pontoons as meshes, whose faces are divided into a grid.
     *
     * @param cells of the grid along each edge
     */
    public static PreparedPlatform withPontoonsOfTriangles(PreparedPlatform prepared, int cells) {
        List<Body> hull = prepared.platform().hull().stream()
                .map(body -> body.name().contains("pontoon")
                        ? new Body(body.name(), false, Solid.ofMesh(Grids.box(body.solid(), cells)))
                        : body)
                .toList();
        return new PreparedPlatform(
                with(prepared.platform(), hull, prepared.platform().tanks()));
    }

    private static Platform with(Platform p, List<Body> hull, List<Tank> tanks) {
        return new Platform(
                p.id(),
                p.name(),
                p.waterDensity(),
                hull,
                p.draftMarks(),
                p.lightship(),
                tanks,
                List.of(),
                p.deckAreas(),
                p.windage(),
                p.openings(),
                p.modes(),
                p.compartments(),
                p.stabilityRules(),
                p.damageCases());
    }
}
