package org.evendraft.ballast;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.evendraft.ballast.Plan.Binding;
import org.evendraft.ballast.PlanRequest.Target;

/**
 * By what a state misses a target.
 *
 * @param binding each limit that is missed
 * @param sum the excesses, each divided by its tolerance or by 0.1 m of metacentric height
 */
record Deviation(List<Binding> binding, double sum) {
    private static final double GM_UNIT = 0.1;
    /** An excess of less than this part of its unit is rounding. */
    private static final double ROUNDING = 1e-5;

    static Deviation of(Target target, ExactState state) {
        Collector collector = new Collector();
        double angle = target.tolerance().angle();
        collector.band(
                "target.draft",
                state.waterplane().draft(),
                target.draft(),
                target.tolerance().draft());
        collector.band("target.heelAngle", state.waterplane().heelAngle(), target.heelAngle(), angle);
        collector.band("target.trimAngle", state.waterplane().trimAngle(), target.trimAngle(), angle);
        collector.least("minGm.transverse", state.gmTransverse(), target.minGm().transverse());
        collector.least(
                "minGm.longitudinal", state.gmLongitudinal(), target.minGm().longitudinal());
        return new Deviation(List.copyOf(collector.binding), collector.sum);
    }

    boolean none() {
        return binding.isEmpty();
    }

    private static final class Collector {
        private final List<Binding> binding = new ArrayList<>();
        private double sum;

        private void band(String limit, double value, double target, double tolerance) {
            double bound = value > target ? target + tolerance : target - tolerance;
            add(limit, value, bound, Math.abs(value - target) - tolerance, tolerance);
        }

        private void least(String limit, double value, OptionalDouble least) {
            double bound = least.orElse(0);
            add(limit, value, bound, bound - value, GM_UNIT);
        }

        private void add(String limit, double value, double bound, double lack, double unit) {
            if (lack > ROUNDING * unit) {
                binding.add(new Binding(limit, value, bound, lack));
                sum += lack / unit;
            }
        }
    }
}
