package org.evendraft.stability;

import java.util.List;
import java.util.concurrent.TimeUnit;
import java.util.stream.IntStream;
import org.evendraft.platform.BenchPlatforms;
import org.evendraft.platform.PreparedPlatform;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;

/** Righting arms of the demo's condition about 36 axes from upright to 60° by 1°, trim and liquids free, on all cores. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.SampleTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Fork(1)
@Warmup(iterations = 3, time = 2)
@Measurement(iterations = 5, time = 2)
public class RightingArmsBench {
    private static final int AXES = 36;
    private static final double AZIMUTH_STEP = 10;

    private final LoadedPlatform loaded = demo();

    private static LoadedPlatform demo() {
        PreparedPlatform demo = BenchPlatforms.demo();
        return LoadedPlatform.of(demo, BenchPlatforms.demoCondition(demo));
    }

    /** The arms alone, each curve as far as it goes. */
    @Benchmark
    public List<double[]> arms() {
        return IntStream.range(0, AXES)
                .parallel()
                .mapToObj(i -> arms(i * AZIMUTH_STEP))
                .toList();
    }

    private double[] arms(double azimuth) {
        RightingArms arms = RightingArms.fromUpright(loaded, RightingCurve.Request.usual(azimuth));
        int last = (int) Math.round(arms.endRad() / arms.stepRad());
        return IntStream.rangeClosed(1, last)
                .mapToDouble(degrees -> arms.arm(arms.at(degrees * arms.stepRad())))
                .toArray();
    }

    /** The curves with their figures: intercepts, greatest arm, area. */
    @Benchmark
    public List<RightingCurve> curves() {
        return IntStream.range(0, AXES)
                .parallel()
                .mapToObj(i -> RightingArms.curve(loaded, RightingCurve.Request.usual(i * AZIMUTH_STEP)))
                .toList();
    }
}
