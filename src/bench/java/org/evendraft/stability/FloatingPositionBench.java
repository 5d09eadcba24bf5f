package org.evendraft.stability;

import java.util.concurrent.TimeUnit;
import org.evendraft.platform.BenchPlatforms;
import org.evendraft.platform.Condition;
import org.evendraft.platform.PreparedPlatform;
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

/** The exact floating position from even keel, every tank slack, liquids free: fast and plain, and its cost against size. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.SampleTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@Fork(1)
@Warmup(iterations = 4, time = 1)
@Measurement(iterations = 5, time = 1)
public class FloatingPositionBench {
    private static final int CELLS = 8;

    /** The platform: as it is, by clipping every triangle, with four times the tanks, with its pontoons as coarse or fine meshes. */
    public enum Variant {
        DEMO,
        DEMO_BY_TRIANGLES,
        FOUR_TIMES_THE_TANKS,
        PONTOONS_OF_TRIANGLES,
        PONTOONS_OF_16_TIMES_THE_TRIANGLES
    }

    /** Which platform. */
    @Param
    public Variant platform = Variant.DEMO;

    private LoadedPlatform loaded = load(Variant.DEMO);

    /** Loads the platform. */
    @Setup(Level.Trial)
    public void load() {
        loaded = load(platform);
        Equilibrium found = loaded.floatingPosition();
        if (!(found instanceof Equilibrium.Afloat afloat && afloat.stable())) {
            throw new IllegalStateException(found.toString());
        }
    }

    private static LoadedPlatform load(Variant variant) {
        PreparedPlatform demo = BenchPlatforms.demo();
        Condition slack = BenchPlatforms.allSlack(demo, BenchPlatforms.demoCondition(demo));
        return switch (variant) {
            case DEMO -> LoadedPlatform.of(demo, slack);
            case DEMO_BY_TRIANGLES -> LoadedPlatform.of(BenchPlatforms.byTriangles(demo), slack);
            case FOUR_TIMES_THE_TANKS -> LoadedPlatform.of(
                    BenchPlatforms.withQuarteredTanks(demo), BenchPlatforms.quartered(slack));
            case PONTOONS_OF_TRIANGLES -> LoadedPlatform.of(
                    BenchPlatforms.withPontoonsOfTriangles(demo, CELLS), slack);
            case PONTOONS_OF_16_TIMES_THE_TRIANGLES -> LoadedPlatform.of(
                    BenchPlatforms.withPontoonsOfTriangles(demo, 4 * CELLS), slack);
        };
    }

    /** The search for the position. */
    @Benchmark
    public Equilibrium position() {
        return loaded.floatingPosition();
    }
}
