package org.evendraft.stability.damage;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;

/**
 * Vertical bulkheads that stand too close to count, so that damage goes through them.
 *
 * @param from where the first of them stands along the periphery (m)
 * @param length from there to the last of them (m)
 */
record Disregarded(double from, double length) {

    /**
     * The rule by which bulkheads are disregarded.
     *
     * @param spacing distance from which on they count (m)
     * @param text under {@link Extents.Text#IMO} all that are closer to the first than that go together, under the other one at a time
     */
    record Rule(double spacing, Extents.Text text) {

        /** The bulkheads to disregard on a round, by the first of them. */
        List<Disregarded> on(Round round) {
            return round.bulkheads().stream()
                    .flatMap(bulkhead -> from(bulkhead, round).stream())
                    .toList();
        }

        /** The bulkheads to disregard from a place on the periphery on (m). */
        Optional<Disregarded> from(double place, Round round) {
            double start = place - Round.ASIDE;
            boolean together = text == Extents.Text.IMO;
            double end = Round.ASIDE + (together ? spacing - Round.ASIDE : Round.ASIDE);
            List<Double> met = round.bulkheads().stream()
                    .filter(bulkhead -> round.ahead(start, bulkhead) < end)
                    .sorted(Comparator.comparingDouble(bulkhead -> round.ahead(start, bulkhead)))
                    .toList();
            boolean close = together ? met.size() > 1 : !met.isEmpty() && hasNeighbour(round, met.get(0));
            return close
                    ? Optional.of(new Disregarded(met.get(0), round.ahead(met.get(0), met.get(met.size() - 1))))
                    : Optional.empty();
        }

        private boolean hasNeighbour(Round round, double bulkhead) {
            double limit = spacing + Round.ASIDE;
            return round.bulkheads().stream()
                    .filter(other -> other != bulkhead)
                    .anyMatch(other -> round.ahead(bulkhead, other) <= limit || round.ahead(other, bulkhead) <= limit);
        }

        /** How far along the damage lies at other levels too (m). */
        double reach(Disregarded damage) {
            return text == Extents.Text.IMO ? Math.max(spacing, damage.length) : damage.length;
        }
    }
}
