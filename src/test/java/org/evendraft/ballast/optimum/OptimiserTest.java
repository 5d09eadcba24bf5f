package org.evendraft.ballast.optimum;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

final class OptimiserTest {
    private static final int MANY_NODES = 100_000;
    /** Six times what these cases take. */
    private static final int FEW_NODES = 10_000;

    private static final double PROVEN = 1e-3;
    /** The general solver works to a relative gap of 1e-7 and to tolerances of 1e-6 in its rows. */
    private static final double SAME_COST = 2e-5;

    /** Tanks, pumps, first seed, number of cases, breadth of the bands. */
    @ParameterizedTest
    @CsvSource({"3,1,1,15,40", "4,2,50,15,20", "6,2,100,20,1", "8,2,200,5,1"})
    void costsWhatTheGeneralSolverFinds(int tanks, int pumps, long firstSeed, int cases, double breadth) {
        int met = 0;
        for (long seed = firstSeed; seed < firstSeed + cases; seed++) {
            Model model = new Questions(seed, tanks, pumps, breadth).model();
            OptionalDouble reference = IndependentSolver.leastCost(model);
            Answer answer = Optimiser.solve(model, new Goal.Cost(), MANY_NODES, List.of());
            assertThat(answer.best().isPresent()).as("seed %d", seed).isEqualTo(reference.isPresent());
            if (reference.isPresent()) {
                met++;
                double least = reference.getAsDouble();
                double tolerance = SAME_COST * Math.max(1, least);
                double cost = answer.best().orElseThrow().cost();
                assertThat(cost).as("seed %d", seed).isCloseTo(least, within(tolerance));
                assertThat(answer.bound()).as("bound of seed %d", seed).isLessThanOrEqualTo(least + tolerance);
                assertThat(answer.bound()).as("gap of seed %d", seed).isGreaterThanOrEqualTo(least - tolerance);
            }
        }
        assertThat(met).isPositive();
    }

    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4, 5, 6, 7, 8, 9, 10})
    void findsTheBestOfAllCombinationsOfChoices(long seed) {
        Model model = new Questions(seed, 4, 2, 20).model();
        double best = bestOfAll(model, new ArrayList<>());
        Answer answer = Optimiser.solve(model, new Goal.Cost(), MANY_NODES, List.of());
        double cost = answer.best().map(Optimum::cost).orElse(Double.POSITIVE_INFINITY);
        if (Double.isInfinite(best)) {
            assertThat(cost).isInfinite();
        } else {
            assertThat(cost).isCloseTo(best, within(SAME_COST * Math.max(1, best)));
        }
    }

    private static double bestOfAll(Model model, List<Integer> choices) {
        if (choices.size() == model.tanks().size()) {
            return Optimiser.complete(model, new Goal.Cost(), choices)
                    .map(Optimum::cost)
                    .orElse(Double.POSITIVE_INFINITY);
        }
        double best = Double.POSITIVE_INFINITY;
        for (int c = 0; c < model.tanks().get(choices.size()).choices().size(); c++) {
            List<Integer> more = new ArrayList<>(choices);
            more.add(c);
            best = Math.min(best, bestOfAll(model, more));
        }
        return best;
    }

    @ParameterizedTest
    @ValueSource(longs = {500, 501, 502})
    void aNodeLimitLeavesAnHonestBound(long seed) {
        Model model = new Questions(seed, 12, 2, 1).model();
        Answer whole = Optimiser.solve(model, new Goal.Cost(), MANY_NODES, List.of());
        Answer cut = Optimiser.solve(model, new Goal.Cost(), 3, List.of());
        double least = whole.best().map(Optimum::cost).orElse(Double.POSITIVE_INFINITY);
        assertThat(cut.nodes()).isLessThanOrEqualTo(3);
        assertThat(cut.bound()).isLessThanOrEqualTo(least * (1 + SAME_COST));
        assertThat(cut.best().map(Optimum::cost).orElse(Double.POSITIVE_INFINITY))
                .isGreaterThanOrEqualTo(least * (1 - SAME_COST));
    }

    @ParameterizedTest
    @ValueSource(longs = {600, 601, 602, 603, 604, 605})
    void platformsOfTwentyEightTanksAreProvenInFewNodes(long seed) {
        Answer answer = Optimiser.solve(new Questions(seed, 28, 4, 1).model(), new Goal.Cost(), MANY_NODES, List.of());
        double cost = answer.best().orElseThrow().cost();
        assertThat(answer.bound()).isGreaterThanOrEqualTo(cost * (1 - PROVEN));
        assertThat(answer.nodes()).isLessThan(FEW_NODES);
    }

    @ParameterizedTest
    @ValueSource(longs = {700, 701, 702, 703})
    void theLeastExcessIsNilJustWhereTheRowsCanBeMet(long seed) {
        Model model = new Questions(seed, 5, 2, 10).model();
        boolean met = Optimiser.solve(model, new Goal.Cost(), MANY_NODES, List.of())
                .best()
                .isPresent();
        double excess = Optimiser.solve(model, new Goal.Excess(), MANY_NODES, List.of())
                .best()
                .orElseThrow()
                .excess();
        assertThat(excess < 1e-6).isEqualTo(met);
        Answer within = Optimiser.solve(model, new Goal.CostWithinExcess(excess + 1e-3), MANY_NODES, List.of());
        assertThat(within.best().orElseThrow().excess()).isLessThanOrEqualTo(excess + 1.1e-3);
    }
}
