package org.evendraft.stability;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;

/**
 * The waterplanes of a table: every draft at every heel and trim.
 *
 * @param drafts at the origin (m)
 * @param heelAngles starboard down positive (degrees)
 * @param trimAngles bow down positive (degrees)
 */
public record HydrostaticGrid(List<Double> drafts, List<Double> heelAngles, List<Double> trimAngles) {
    /** A last step shorter than this part of a step is none: the ends were given in rounded decimals. */
    private static final double NO_STEP = 1e-9;

    /** Copies the lists. */
    public HydrostaticGrid {
        drafts = List.copyOf(drafts);
        heelAngles = List.copyOf(heelAngles);
        trimAngles = List.copyOf(trimAngles);
    }

    /**
     * Values from one to another, both included, the last step perhaps shorter; decimals stay as they are, {@code 0.1 + 2·0.1 = 0.3}.
     *
     * @param from first value
     * @param to last value, at least the first
     * @param step between values, over 0
     */
    public static List<Double> steps(double from, double to, double step) {
        int count = (int) Math.ceil((to - from) / step - NO_STEP);
        BigDecimal first = BigDecimal.valueOf(from);
        BigDecimal between = BigDecimal.valueOf(step);
        List<Double> values = new ArrayList<>();
        for (int i = 0; i < count; i++) {
            values.add(first.add(between.multiply(BigDecimal.valueOf(i))).doubleValue());
        }
        values.add(to);
        return values;
    }

    /** How many waterplanes there are. */
    public long count() {
        return (long) drafts.size() * heelAngles.size() * trimAngles.size();
    }

    /** The waterplanes, by trim, then heel, then draft. */
    public List<Waterplane> waterplanes() {
        List<Waterplane> planes = new ArrayList<>();
        for (double trim : trimAngles) {
            for (double heel : heelAngles) {
                for (double draft : drafts) {
                    planes.add(Waterplane.ofDegrees(draft, heel, trim));
                }
            }
        }
        return planes;
    }
}
