package org.evendraft.geometry;

import java.util.List;
import java.util.concurrent.TimeUnit;
import org.evendraft.platform.BenchPlatforms;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Level;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;

/** One space cut by one plane: what all else is made of. With short cuts, and by clipping every triangle. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.NANOSECONDS)
@Fork(1)
@Warmup(iterations = 3, time = 1)
@Measurement(iterations = 5, time = 1)
public class CutBench {
    /** The demo's hull upright on its columns and at 20°; a tank with its surface clear of bottom and top, and with a bare bottom. */
    public enum Place {
        HULL_ON_COLUMNS,
        HULL_AT_20_DEGREES,
        TANK_WALL_SIDED,
        TANK_BARE_BOTTOM
    }

    /** What is cut. */
    @Param
    public Place place = Place.TANK_WALL_SIDED;

    /** Whether short cuts are taken. */
    @Param({"true", "false"})
    public boolean shortCuts = true;

    private Assembly space = tank();
    private Plane plane = Plane.ofSlopes(0, 0, 0);

    /** Chooses space and plane. */
    @Setup(Level.Trial)
    public void choose() {
        Assembly hull = BenchPlatforms.demo().hull();
        Assembly chosen =
                switch (place) {
                    case HULL_ON_COLUMNS, HULL_AT_20_DEGREES -> hull;
                    case TANK_WALL_SIDED, TANK_BARE_BOTTOM -> tank();
                };
        plane = switch (place) {
            case HULL_ON_COLUMNS -> Plane.ofSlopes(18.5, 0.01, 0.02);
            case HULL_AT_20_DEGREES -> Plane.ofSlopes(18.5, 0.02, Math.tan(Math.toRadians(20)));
            case TANK_WALL_SIDED -> Plane.ofSlopes(4, 0.01, 0.02);
            case TANK_BARE_BOTTOM -> Plane.ofSlopes(0, 0.1, 0.2);
        };
        space = shortCuts ? chosen : chosen.byTriangles();
    }

    private static Assembly tank() {
        return new Assembly(List.of(new Assembly.Part(Solid.box(new Vec3(-6, -7, 0), new Vec3(6, 7, 8.5)), false)));
    }

    /** The integrals under the plane. */
    @Benchmark
    public Cut cut() {
        return space.below(plane);
    }
}
