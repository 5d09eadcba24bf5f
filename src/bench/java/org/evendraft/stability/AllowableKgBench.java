package org.evendraft.stability;

import java.util.List;
import java.util.OptionalDouble;
import java.util.concurrent.TimeUnit;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.evendraft.platform.BenchPlatforms;
import org.evendraft.platform.DamageCase;
import org.evendraft.platform.Mode.DraftRange;
import org.evendraft.platform.PreparedPlatform;
import org.evendraft.stability.damage.DamageExtents;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;

/** The greatest KG of the demo in its operating mode at ten drafts, and the criteria of its condition, on all cores. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.SingleShotTime)
@OutputTimeUnit(TimeUnit.SECONDS)
@Fork(1)
@Warmup(iterations = 1)
@Measurement(iterations = 5)
public class AllowableKgBench {
    private static final int DRAFTS = 10;
    /** The cases of the extents of damage and those listed by hand, as many as the aim speaks of. */
    private static final int CASES = 20;

    private final PreparedPlatform demo = BenchPlatforms.demo();
    private final org.evendraft.platform.Mode operating = demo.platform().modes().stream()
            .filter(mode -> mode.id().equals("operating"))
            .findFirst()
            .orElseThrow();
    private final List<DamageCase> cases = Stream.concat(
                    DamageExtents.collisionCases(demo, operating).cases().stream(),
                    demo.platform().damageCases().stream())
            .limit(CASES)
            .toList();

    private List<KgLimit> find(List<DamageCase> damage) {
        DraftRange range = operating.draftRange().orElseThrow();
        double step = (range.greatest() - range.least()) / (DRAFTS - 1);
        List<Double> drafts = IntStream.range(0, DRAFTS)
                .mapToObj(i -> range.least() + i * step)
                .toList();
        KgRequest request = new KgRequest(
                operating, drafts, OptionalDouble.empty(), demo.platform().waterDensity(), OptionalDouble.empty(), damage);
        return AllowableKgCurve.find(demo, request, Progress.UNWATCHED);
    }

    /** Intact only. */
    @Benchmark
    public List<KgLimit> intact() {
        return find(List.of());
    }

    /** With twenty damage cases. */
    @Benchmark
    public List<KgLimit> damaged() {
        if (cases.size() != CASES) {
            throw new IllegalStateException(cases.size() + " cases");
        }
        return find(cases);
    }
}
