package org.evendraft.ballast.loadplan;

import java.util.Optional;
import java.util.function.Function;
import org.evendraft.ballast.BallastPlanner;
import org.evendraft.ballast.Plan;
import org.evendraft.ballast.PlanRequest;
import org.evendraft.ballast.PlanRequest.Target;
import org.evendraft.platform.Condition;
import org.evendraft.platform.PreparedPlatform;
import org.evendraft.stability.ConditionResult.Floating;

/**
 * Ballast moved beforehand. The platform is laid over by half of what is to come, the other way, so that it passes through even keel and leans
 * to both sides alike; since heel is not quite in proportion to moment, what then comes is looked at and the lean corrected.
 *
 * @param prepared the platform
 * @param request draft, least metacentric heights and tolerance to keep to, and limits on the way; its angles are replaced
 * @param follow what is to come from a loading
 */
record PreBallast(PreparedPlatform prepared, PlanRequest request, Function<Condition, Trial> follow) {
    /** Plans made at most: the first lean misses by the curvature of the righting arms, the second by its square. */
    private static final int ROUNDS = 3;

    /**
     * A plan that helps.
     *
     * @param plan the plan
     * @param trial what then comes
     */
    record Found(Plan plan, Trial trial) {}

    /**
     * The best plan found.
     *
     * @param start the loading that it starts from
     * @param without what comes without it
     * @return empty when none is better than that
     */
    Optional<Found> best(Condition start, Trial without) {
        Floating at = Position.calm(prepared, start).floating();
        double heel = at.heelAngle();
        double trim = at.trimAngle();
        Optional<Found> best = Optional.empty();
        Trial last = without;
        for (int round = 0; round < ROUNDS && !balanced(last.swing()); round++) {
            Plan plan = BallastPlanner.plan(
                    prepared,
                    start,
                    leaning(
                            heel - last.swing().middleHeel(),
                            trim - last.swing().middleTrim()));
            Optional<Trial> then = trial(Changes.pumped(prepared, start, plan));
            if (then.isEmpty()) {
                return best;
            }
            last = then.get();
            heel = plan.after().floating().heelAngle();
            trim = plan.after().floating().trimAngle();
            if (better(plan, last, best.map(Found::trial).orElse(without))) {
                best = Optional.of(new Found(plan, last));
            }
        }
        return best;
    }

    private Optional<Trial> trial(Condition from) {
        try {
            return Optional.of(follow.apply(from));
        } catch (LostException e) {
            return Optional.empty();
        }
    }

    private boolean balanced(Swing swing) {
        double enough = request.target().tolerance().angle();
        return Math.abs(swing.middleHeel()) <= enough && Math.abs(swing.middleTrim()) <= enough;
    }

    private PlanRequest leaning(double heelAngle, double trimAngle) {
        Target target = request.target();
        return request.withTarget(new Target(target.draft(), heelAngle, trimAngle, target.minGm(), target.tolerance()));
    }

    /** A plan that misses its own target is taken only for the sake of the limits. */
    private static boolean better(Plan plan, Trial trial, Trial other) {
        return trial.saferThan(other) || (plan.feasible() && trial.gentlerThan(other));
    }
}
