package org.evendraft.ballast.loadplan;

import java.util.OptionalDouble;
import org.evendraft.ballast.PlanRequest;
import org.evendraft.ballast.PlanRequest.Target;
import org.evendraft.stability.ConditionResult;
import org.evendraft.stability.ConditionResult.Floating;
import org.evendraft.stability.ConditionResult.LimitResult;

/**
 * Whether ballast is needed to restore a target. The platform without wind is judged: ballast against a wind is wrong when the wind veers.
 *
 * @param request what is to be restored
 */
record Restoring(PlanRequest request) {
    /** So small a part of a tolerance is rounding. */
    private static final double ROUNDING = 1e-6;

    boolean needed(ConditionResult calm) {
        return leavesTarget(calm) || calm.limits().stream().anyMatch(limit -> !limit.met() && mendable(limit));
    }

    private boolean leavesTarget(ConditionResult calm) {
        Target target = request.target();
        Floating at = calm.floating();
        return misses(at.draft() - target.draft(), target.tolerance().draft())
                || misses(
                        at.heelAngle() - target.heelAngle(), target.tolerance().angle())
                || misses(
                        at.trimAngle() - target.trimAngle(), target.tolerance().angle())
                || under(calm.gm().transverse().corrected(), target.minGm().transverse())
                || under(calm.gm().longitudinal().corrected(), target.minGm().longitudinal());
    }

    private static boolean misses(double deviation, double tolerance) {
        return Math.abs(deviation) > tolerance * (1 + ROUNDING);
    }

    private static boolean under(double gm, OptionalDouble least) {
        return least.isPresent() && gm < least.getAsDouble();
    }

    /** By how much a limit that ballast can mend is missed; 0 when it is met. */
    static double lack(LimitResult limit) {
        Double margin = limit.margin();
        return limit.met() || !mendable(limit) || margin == null ? 0 : -margin;
    }

    /** What stands on the decks is no matter of ballast. */
    private static boolean mendable(LimitResult limit) {
        return !limit.limit().equals("maxDeckLoad") && !limit.limit().startsWith("deckArea.");
    }
}
