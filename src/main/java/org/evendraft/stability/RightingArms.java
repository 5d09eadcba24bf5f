package org.evendraft.stability;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.DoubleUnaryOperator;
import org.apache.commons.math3.analysis.solvers.BrentSolver;
import org.apache.commons.math3.optim.MaxEval;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;
import org.apache.commons.math3.optim.univariate.BrentOptimizer;
import org.apache.commons.math3.optim.univariate.SearchInterval;
import org.apache.commons.math3.optim.univariate.UnivariateObjectiveFunction;
import org.evendraft.platform.Condition.FreeSurface;

/**
 * The righting arms of one platform about one axis, known at nodes a step apart and computed exactly in between from the nearest
 * node. Immutable after construction.
 */
public final class RightingArms {
    /** Error of the area under one degree of the curve (m·rad). */
    private static final double AREA_TOLERANCE = 1e-6;
    /** Crossings are found to this angle (rad). */
    private static final double ANGLE_TOLERANCE = 1e-9;

    /** So small a part of a step beside an angle, the sign of the arm tells on which side of a crossing the angle lies. */
    private static final double BESIDE = 1e-3;

    private static final int MOST_EVALUATIONS = 200;
    private static final int GREATEST_DEPTH = 10;

    private final HeelPath path;
    private final double stepRad;
    private final List<Inclination> nodes = new ArrayList<>();
    private final boolean complete;

    RightingArms(LoadedPlatform loaded, RightingCurve.Request request) {
        double azimuthRad = Math.toRadians(request.azimuth());
        this.path = new HeelPath(azimuthRad, request.freeTrim());
        int steps = (int) Math.ceil(request.to() / request.step() - 1e-9);
        this.stepRad = Math.toRadians(request.to() / steps);
        LoadedPlatform counted = counted(loaded, request.liquids(), azimuthRad);
        Optional<Inclination> here = path.at(Inclination.upright(counted), 0);
        while (here.isPresent() && nodes.size() <= steps) {
            nodes.add(here.get());
            here = nodes.size() <= steps ? path.at(here.get(), nodes.size() * stepRad) : here;
        }
        this.complete = nodes.size() > steps;
    }

    /** The platform with its liquids as the treatment has them: free, or at rest with G raised by the correction about the axis. */
    private static LoadedPlatform counted(LoadedPlatform loaded, LiquidTreatment liquids, double azimuthRad) {
        return switch (liquids) {
            case FREE -> loaded;
            case ACTUAL_MOMENT -> loaded.atRest(azimuthRad, FreeSurface.ACTUAL);
            case MAXIMUM_MOMENT -> loaded.atRest(azimuthRad, FreeSurface.MAXIMUM);
        };
    }

    /** Whether the curve exists at all. */
    boolean exists() {
        return !nodes.isEmpty();
    }

    /** Whether it reaches the angle asked for. */
    boolean complete() {
        return complete;
    }

    /** The last angle of the curve (rad). */
    double endRad() {
        return (nodes.size() - 1) * stepRad;
    }

    /** The angle between nodes (rad). */
    double stepRad() {
        return stepRad;
    }

    /** The points at the nodes. */
    List<RightingPoint> points() {
        List<RightingPoint> points = new ArrayList<>();
        for (int i = 0; i < nodes.size(); i++) {
            points.add(path.point(nodes.get(i), i * stepRad));
        }
        return points;
    }

    /**
     * The platform at an angle on the curve (rad), found from the nearest node, or else from the one on the angle's other side.
     *
     * @throws IllegalStateException when the trim finds no rest from either: no other angle's state stands in
     */
    Inclination at(double angleRad) {
        int i = node(Math.round(angleRad / stepRad));
        if (i * stepRad == angleRad) {
            return nodes.get(i);
        }
        int other = node(i * stepRad < angleRad ? i + 1L : i - 1L);
        return path.at(nodes.get(i), angleRad)
                .or(() -> path.at(nodes.get(other), angleRad))
                .orElseThrow(() -> new IllegalStateException("no rest at " + Math.toDegrees(angleRad) + "°"));
    }

    private int node(long wanted) {
        return (int) Math.min(nodes.size() - 1L, Math.max(0, wanted));
    }

    /** The point at an angle on the curve (rad). */
    RightingPoint point(double angleRad) {
        return path.point(at(angleRad), angleRad);
    }

    /** The righting arm at an angle on the curve (m). */
    double arm(double angleRad) {
        return path.arm(at(angleRad));
    }

    /**
     * The first angle from a start on at which the arm less another passes 0.
     *
     * @param other what is taken off, by angle (m)
     * @param fromRad where to start (rad)
     * @param upwards whether from negative to positive
     */
    OptionalDouble crossing(DoubleUnaryOperator other, double fromRad, boolean upwards) {
        double sign = upwards ? 1 : -1;
        DoubleUnaryOperator excess = angle -> sign * (arm(angle) - other.applyAsDouble(angle));
        double low = fromRad;
        double atLow = excess.applyAsDouble(low);
        while (low < endRad()) {
            double high = Math.min(endRad(), (Math.floor(low / stepRad + 1e-9) + 1) * stepRad);
            double atHigh = excess.applyAsDouble(high);
            if (atLow < 0 && atHigh >= 0) {
                return OptionalDouble.of(
                        new BrentSolver(ANGLE_TOLERANCE).solve(MOST_EVALUATIONS, excess::applyAsDouble, low, high));
            }
            low = high;
            atLow = atHigh;
        }
        return OptionalDouble.empty();
    }

    /** The angle of the greatest arm between two angles (rad). */
    double greatest(double fromRad, double toRad) {
        double best = fromRad;
        for (int i = (int) Math.ceil(fromRad / stepRad); i * stepRad <= toRad; i++) {
            best = arm(i * stepRad) > arm(best) ? i * stepRad : best;
        }
        double low = Math.max(fromRad, best - stepRad);
        double high = Math.min(toRad, best + stepRad);
        if (!(high > low)) {
            return best;
        }
        double found = new BrentOptimizer(1e-8, ANGLE_TOLERANCE)
                .optimize(
                        new MaxEval(MOST_EVALUATIONS),
                        new UnivariateObjectiveFunction(this::arm),
                        GoalType.MAXIMIZE,
                        new SearchInterval(low, high))
                .getPoint();
        return arm(found) > arm(best) ? found : best;
    }

    /** Area under the arms between two angles (m·rad), by Simpson's rule halved until it settles. */
    double area(double fromRad, double toRad) {
        double sum = 0;
        double low = fromRad;
        while (low < toRad) {
            double high = Math.min(toRad, (Math.floor(low / stepRad + 1e-9) + 1) * stepRad);
            sum += simpson(low, arm(low), high, arm(high), arm((low + high) / 2), GREATEST_DEPTH);
            low = high;
        }
        return sum;
    }

    private double simpson(double a, double atA, double b, double atB, double atMiddle, int depth) {
        double m = (a + b) / 2;
        double atLeft = arm((a + m) / 2);
        double atRight = arm((m + b) / 2);
        double whole = (b - a) / 6 * (atA + 4 * atMiddle + atB);
        double halves = (b - a) / 12 * (atA + 4 * atLeft + 2 * atMiddle + 4 * atRight + atB);
        double tolerance = AREA_TOLERANCE * (b - a) / Math.toRadians(1);
        if (depth == 0 || Math.abs(halves - whole) <= 15 * tolerance) {
            return halves + (halves - whole) / 15;
        }
        return simpson(a, atA, m, atMiddle, atLeft, depth - 1) + simpson(m, atMiddle, b, atB, atRight, depth - 1);
    }

    /**
     * The curve with its figures.
     *
     * @throws IllegalStateException when the platform cannot float
     */
    public static RightingCurve curve(LoadedPlatform loaded, RightingCurve.Request request) {
        RightingArms arms = new RightingArms(loaded, request);
        if (!arms.exists()) {
            return empty(request);
        }
        DoubleUnaryOperator none = angle -> 0;
        OptionalDouble first = arms.rest(none);
        if (first.isEmpty()) {
            return arms.figures(request, OptionalDouble.empty(), OptionalDouble.empty());
        }
        // From just beyond the first intercept: at it the arm is zero within rounding.
        double beyond = Math.min(arms.endRad(), first.getAsDouble() + arms.stepRad() * BESIDE);
        return arms.figures(request, first, arms.crossing(none, beyond, false));
    }

    /** Where, from upright on, the platform rests under a heeling arm: there the arm less it passes 0 upwards. */
    OptionalDouble rest(DoubleUnaryOperator heeling) {
        double near = stepRad * BESIDE;
        boolean rises = arm(near) >= heeling.applyAsDouble(near);
        if (rises && arm(0) >= heeling.applyAsDouble(0)) {
            return OptionalDouble.of(0);
        }
        return crossing(heeling, rises ? 0 : near, true);
    }

    private RightingCurve figures(RightingCurve.Request request, OptionalDouble first, OptionalDouble second) {
        double from = first.orElse(0);
        double to = second.orElse(endRad());
        boolean rights = first.isPresent();
        return new RightingCurve(
                request.azimuth(),
                request.freeTrim(),
                request.liquids(),
                points(),
                complete ? null : Double.valueOf(Math.toDegrees(endRad())),
                complete
                        ? null
                        : String.format(
                                Locale.ROOT, "Beyond %.2f° the trim finds no stable rest.", Math.toDegrees(endRad())),
                rights ? Double.valueOf(Math.toDegrees(from)) : null,
                second.isPresent() ? Double.valueOf(Math.toDegrees(to)) : null,
                rights ? Double.valueOf(Math.toDegrees(to - from)) : null,
                point(greatest(0, endRad())),
                rights ? Double.valueOf(area(from, to)) : null,
                AREA_TOLERANCE * Math.max(1, Math.toDegrees(to - from)));
    }

    private static RightingCurve empty(RightingCurve.Request request) {
        return new RightingCurve(
                request.azimuth(),
                request.freeTrim(),
                request.liquids(),
                List.of(),
                0.0,
                "Upright the trim finds no stable rest.",
                null,
                null,
                null,
                null,
                null,
                0);
    }
}
