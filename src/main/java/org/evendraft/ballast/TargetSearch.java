package org.evendraft.ballast;

import java.util.List;
import java.util.Optional;
import org.evendraft.ballast.optimum.Answer;
import org.evendraft.ballast.optimum.Goal;
import org.evendraft.ballast.optimum.Optimiser;
import org.evendraft.ballast.optimum.Optimum;
import org.evendraft.stability.Waterplane;

/**
 * Finds the end state of a plan. The optimiser's rows are exact at the faces of the target's bands but for what draft, heel and trim do
 * to each other there; what the exact floating position is seen to differ is taken off the bounds and the amounts are found
 * again, until the exact position is inside.
 */
final class TargetSearch {
    private static final int MOST_NODES = 8000;
    private static final int MOST_NODES_FOR_EXCESS = 500;
    private static final int MOST_NODES_WITHIN_EXCESS = 2000;
    private static final int MOST_CORRECTIONS = 8;
    private static final int MOST_APPROACHES = 12;
    /** When corrections change the cost by more than this part, the choices are searched anew. */
    private static final double COST_MOVED = 2e-4;
    /** An approach that gains less than this in weighted excess is the last. */
    private static final double LEAST_GAIN = 1e-6;
    /** How much more weighted excess than the least one the cheapest nearest plan may have: rounding. */
    private static final double EXCESS_SPARE = 1e-3;

    private final Plant plant;
    private final PlanRequest request;

    TargetSearch(Plant plant, PlanRequest request) {
        this.plant = plant;
        this.request = request;
    }

    /** The best end state: on target when that can be, else the nearest. */
    Optional<Found> run() {
        Optional<Found> met = meet();
        return met.isPresent() ? met : nearest();
    }

    private Optional<Found> meet() {
        TargetModel target =
                new TargetModel(plant, Bands.atFaces(plant, request.target(), plant.stowage()), request.objective());
        return corrected(target, new Goal.Cost(), Double.POSITIVE_INFINITY, Optional.empty());
    }

    /**
     * Solves, and corrects until the exact state is as good as the goal asks.
     *
     * @param mostExcess weighted excess that is good enough; infinite when there must be none
     * @param known a plan to correct by and to better
     */
    private Optional<Found> corrected(TargetModel target, Goal goal, double mostExcess, Optional<Found> known) {
        boolean onTarget = Double.isInfinite(mostExcess);
        double[] corrections = known.map(
                        found -> target.errors(found.plan(), found.end().state()))
                .orElseGet(() -> new double[target.size()]);
        List<List<Integer>> seeds =
                known.map(found -> List.of(found.plan().choices())).orElse(List.of());
        int nodes = onTarget ? MOST_NODES : MOST_NODES_WITHIN_EXCESS;
        Answer answer = Optimiser.solve(target.model(corrections), goal, nodes, seeds);
        Optional<Optimum> plan = answer.best();
        double searchedCost = plan.map(Optimum::cost).orElse(0.0);
        for (int round = 0; round < MOST_CORRECTIONS && plan.isPresent(); round++) {
            Optional<End> end = End.of(plant, request.target(), target.masses(plan.get()));
            if (end.isEmpty()) {
                return Optional.empty();
            }
            Deviation deviation = end.get().deviation();
            if (onTarget ? deviation.none() : deviation.sum() <= mostExcess) {
                return Optional.of(new Found(plan.get(), end.get(), answer.bound()));
            }
            corrections = target.errors(plan.get(), end.get().state());
            List<Integer> choices = plan.get().choices();
            plan = Optimiser.complete(target.model(corrections), goal, choices);
            if (plan.isEmpty() || plan.get().cost() > searchedCost * (1 + COST_MOVED)) {
                answer = Optimiser.solve(target.model(corrections), goal, nodes, List.of(choices));
                plan = answer.best();
                searchedCost = plan.map(Optimum::cost).orElse(0.0);
            }
        }
        return Optional.empty();
    }

    /** Approaches the target position by position, then takes the cheapest plan that comes as near. */
    private Optional<Found> nearest() {
        Waterplane position = Waterplane.ofDegrees(
                request.target().draft(),
                request.target().heelAngle(),
                request.target().trimAngle());
        Stowage reference = plant.stowage();
        Optional<Found> best = Optional.empty();
        Waterplane bestPosition = position;
        for (int i = 0; i < MOST_APPROACHES; i++) {
            TargetModel model = modelNear(reference, position);
            Optional<Found> found = leastExcess(model);
            if (found.isEmpty() || !better(found.get(), best)) {
                break;
            }
            best = found;
            bestPosition = found.get().end().state().waterplane();
            position = bestPosition;
            reference = Stowage.of(plant.prepared(), found.get().end().condition());
        }
        if (best.isEmpty()) {
            return asItIs();
        }
        double most = best.get().end().deviation().sum() + EXCESS_SPARE;
        Optional<Found> cheapest = corrected(
                modelNear(reference, bestPosition), new Goal.CostWithinExcess(most), most + EXCESS_SPARE, best);
        return cheapest.isPresent() ? cheapest : best;
    }

    private static boolean better(Found found, Optional<Found> best) {
        return best.isEmpty()
                || found.end().deviation().sum() < best.get().end().deviation().sum() - LEAST_GAIN;
    }

    private TargetModel modelNear(Stowage reference, Waterplane position) {
        List<Coupling> rows = Bands.near(plant, request.target(), reference, position);
        return new TargetModel(plant, rows, request.objective());
    }

    private Optional<Found> leastExcess(TargetModel model) {
        Answer answer = Optimiser.solve(
                model.model(new double[model.size()]), new Goal.Excess(), MOST_NODES_FOR_EXCESS, List.of());
        return answer.best()
                .flatMap(plan ->
                        End.of(plant, request.target(), model.masses(plan)).map(end -> new Found(plan, end, 0)));
    }

    /** Nothing moved: the last resort, when every approach would sink or capsize the platform. */
    private Optional<Found> asItIs() {
        TargetModel model =
                modelNear(plant.stowage(), Waterplane.ofDegrees(request.target().draft(), 0, 0));
        List<Integer> untouched = plant.tanks().stream().map(tank -> 0).toList();
        return Optimiser.complete(model.model(new double[model.size()]), new Goal.Excess(), untouched)
                .flatMap(plan ->
                        End.of(plant, request.target(), model.masses(plan)).map(end -> new Found(plan, end, 0)));
    }
}
