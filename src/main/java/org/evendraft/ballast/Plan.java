package org.evendraft.ballast;

import java.util.List;
import org.evendraft.stability.ConditionResult;

/**
 * A ballast plan. Component names are those of the JSON answer.
 *
 * @param feasible whether the target is met and every limit kept on the way
 * @param moves the pumping orders by step
 * @param fills contents at the end of every tank touched
 * @param before the condition as it is
 * @param after the condition at the end
 * @param pumpedMass sum of the moves' masses (t)
 * @param tanksTouched number of tanks whose contents change
 * @param slackTanks number of ballast tanks that end slack, moved or not
 * @param cost what was least (t)
 * @param durationMinutes from the first start to the last end (min)
 * @param worst the worst on the way
 * @param optimality how good the plan is known to be
 * @param binding what keeps the target from being met, and limits passed on the way; empty when feasible
 * @param warnings sentences on what deserves attention
 * @param caution what the plan must not be taken for
 */
public record Plan(
        boolean feasible,
        List<Move> moves,
        List<EndFill> fills,
        ConditionResult before,
        ConditionResult after,
        double pumpedMass,
        int tanksTouched,
        int slackTanks,
        double cost,
        double durationMinutes,
        Worst worst,
        Optimality optimality,
        List<Binding> binding,
        List<String> warnings,
        String caution) {
    /** Copies the lists. */
    public Plan {
        moves = List.copyOf(moves);
        fills = List.copyOf(fills);
        binding = List.copyOf(binding);
        warnings = List.copyOf(warnings);
    }

    /**
     * Contents of a tank at the end, in the form of a condition's fill.
     *
     * @param tank the tank's id
     * @param mass mass (t)
     * @param density density (t/m³)
     */
    public record EndFill(String tank, double mass, double density) {}

    /**
     * The worst on the way, from the start to the end.
     *
     * @param gmTransverse least corrected transverse metacentric height on even keel (m)
     * @param gmLongitudinal least longitudinal one (m)
     * @param heelAngle greatest heel to either side (degrees)
     * @param trimAngle greatest trim to either end (degrees)
     */
    public record Worst(Extreme gmTransverse, Extreme gmLongitudinal, Extreme heelAngle, Extreme trimAngle) {}

    /**
     * An extreme value.
     *
     * @param value the value
     * @param minute when (min)
     */
    public record Extreme(double value, double minute) {}

    /**
     * How good the plan is known to be.
     *
     * @param bound no plan of the model costs less (t)
     * @param gap (cost − bound)/cost
     * @param proven whether the gap is at most 0.1 %
     */
    public record Optimality(double bound, double gap, boolean proven) {}

    /**
     * A limit that keeps the target from being met.
     *
     * @param limit its name
     * @param value what the nearest plan reaches
     * @param bound what was asked for, the tolerance counted
     * @param lack by how much the value misses the bound, positive
     */
    public record Binding(String limit, double value, double bound, double lack) {}
}
