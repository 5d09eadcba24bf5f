package org.evendraft.ballast;

import java.util.List;
import java.util.OptionalDouble;
import org.evendraft.platform.GmBound;

/**
 * What a plan shall reach. Component names are those of the JSON request.
 *
 * @param target where the platform shall float
 * @param objective what pumping and tanks cost
 * @param operationLimits what must hold at every instant on the way
 * @param lockedTanks ids of tanks whose contents may not change, besides those that the platform locks
 * @param pumpsOutOfService ids of pumps that may not be used
 */
public record PlanRequest(
        Target target,
        Objective objective,
        OperationLimits operationLimits,
        List<String> lockedTanks,
        List<String> pumpsOutOfService) {

    /** Copies the lists. */
    public PlanRequest {
        lockedTanks = List.copyOf(lockedTanks);
        pumpsOutOfService = List.copyOf(pumpsOutOfService);
    }

    /** The same with another target. */
    public PlanRequest withTarget(Target other) {
        return new PlanRequest(other, objective, operationLimits, lockedTanks, pumpsOutOfService);
    }

    /** The same with other limits on the way. */
    public PlanRequest withOperationLimits(OperationLimits other) {
        return new PlanRequest(target, objective, other, lockedTanks, pumpsOutOfService);
    }

    /**
     * Where the platform shall float.
     *
     * @param draft draft at the origin (m)
     * @param heelAngle starboard down positive (degrees)
     * @param trimAngle bow down positive (degrees)
     * @param minGm least corrected metacentric heights on even keel
     * @param tolerance the band round draft and angles that the plan may use
     */
    public record Target(double draft, double heelAngle, double trimAngle, GmBound minGm, Tolerance tolerance) {}

    /**
     * A band to both sides.
     *
     * @param draft of the draft, positive (m)
     * @param angle of heel and trim, positive (degrees)
     */
    public record Tolerance(double draft, double angle) {}

    /**
     * What is added to the mass pumped.
     *
     * @param touchPenalty for each tank whose contents change, 0 or more (t)
     * @param slackPenalty for each ballast tank that ends slack, 0 or more (t)
     */
    public record Objective(double touchPenalty, double slackPenalty) {}

    /**
     * Limits on the way; one that is absent is not judged.
     *
     * @param maxHeel greatest heel to either side (degrees)
     * @param maxTrim greatest trim to either end (degrees)
     * @param minGm least corrected metacentric heights on even keel, tanks in motion slack
     */
    public record OperationLimits(OptionalDouble maxHeel, OptionalDouble maxTrim, GmBound minGm) {}
}
