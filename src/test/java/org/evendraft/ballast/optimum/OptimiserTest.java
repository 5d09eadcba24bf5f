package org.evendraft.ballast.optimum;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.OptionalDouble;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

final class OptimiserTest {
    private static final int MANY_NODES = 100_000;
    /** The general solver works to a relative gap of 1e-7 and to tolerances of 1e-6 in its rows. */
    private static final double SAME_COST = 2e-5;

    @ParameterizedTest
    @CsvSource({"3,1,1,10", "6,2,100,20", "10,2,200,7"})
    void costsWhatTheGeneralSolverFinds(int tanks, int pumps, long firstSeed, int cases) {
        int met = 0;
        for (long seed = firstSeed; seed < firstSeed + cases; seed++) {
            Model model = new Questions(seed, tanks, pumps).model();
            OptionalDouble reference = IndependentSolver.leastCost(model);
            long t0 = System.nanoTime();
            Answer answer = Optimiser.solve(model, new Goal.Cost(), MANY_NODES, List.of());
            System.out.printf(
                    "%d tanks seed %d: ref %.4f ours %.4f bound %.4f nodes %d %.1f ms%n",
                    tanks,
                    seed,
                    reference.orElse(Double.NaN),
                    answer.best().map(Optimum::cost).orElse(Double.NaN),
                    answer.bound(),
                    answer.nodes(),
                    (System.nanoTime() - t0) / 1e6);
            assertThat(answer.best().isPresent()).as("seed %d", seed).isEqualTo(reference.isPresent());
            if (reference.isPresent()) {
                met++;
                double cost = answer.best().orElseThrow().cost();
                double tolerance = SAME_COST * Math.max(1, cost);
                assertThat(cost)
                        .as("seed %d", seed)
                        .isBetween(reference.getAsDouble() - tolerance, reference.getAsDouble() * 1.001);
                assertThat(answer.bound())
                        .as("bound of seed %d", seed)
                        .isLessThanOrEqualTo(reference.getAsDouble() + tolerance);
            }
        }
        assertThat(met).isPositive();
    }
}
