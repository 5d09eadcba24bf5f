package org.evendraft.ballast;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import org.evendraft.platform.Condition;
import org.evendraft.stability.LoadedPlatform;

/**
 * An end state, computed exactly.
 *
 * @param masses masses in the movable tanks, in their order (t)
 * @param condition the condition
 * @param state where it floats
 * @param deviation by what it misses the target
 */
record End(List<Double> masses, Condition condition, ExactState state, Deviation deviation) {

    /** The state with other masses in the movable tanks; empty when the platform would sink or capsize. */
    static Optional<End> of(Plant plant, PlanRequest.Target target, double[] masses) {
        Condition condition = plant.with(masses);
        List<Double> list = Arrays.stream(masses).boxed().toList();
        return ExactState.of(LoadedPlatform.of(plant.prepared(), condition))
                .map(state -> new End(list, condition, state, Deviation.of(target, state)));
    }
}
