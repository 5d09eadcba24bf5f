package org.evendraft.stability;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.OptionalDouble;
import java.util.function.DoubleUnaryOperator;
import java.util.function.ToDoubleFunction;
import org.apache.commons.math3.analysis.solvers.BrentSolver;
import org.apache.commons.math3.optim.MaxEval;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;
import org.apache.commons.math3.optim.univariate.BrentOptimizer;
import org.apache.commons.math3.optim.univariate.SearchInterval;
import org.apache.commons.math3.optim.univariate.UnivariateObjectiveFunction;
import org.apache.commons.math3.optim.univariate.UnivariatePointValuePair;
import org.evendraft.geometry.Vec3;
import org.evendraft.platform.Condition.FreeSurface;

/** The righting arms of one platform about one axis, and what is read off them. Remembers what it has found; one thread at a time. */
public final class RightingArms {
    /** Error of the area under one degree of the curve (m·rad). */
    private static final double AREA_TOLERANCE = 1e-6;
    /** Crossings are found to this angle (rad). */
    private static final double ANGLE_TOLERANCE = 1e-9;
    /** The greatest of something is found to this part of its angle. */
    private static final double GREATEST_TOLERANCE = 1e-8;
    /** So small a part of a step does not make another. */
    private static final double WHOLE_STEPS = 1e-9;
    /** An arm under this is none (m). */
    private static final double NO_ARM = 1e-9;

    /** So small a part of a step beside an angle, the sign of the arm tells on which side of a crossing the angle lies. */
    private static final double BESIDE = 1e-3;

    /** Further than any curve goes (rad). */
    static final double FAR = Double.POSITIVE_INFINITY;

    private static final int MOST_EVALUATIONS = 200;

    private final HeelPath path;
    private final HeelStates states;
    private final boolean fromRest;
    private OptionalDouble startRad = OptionalDouble.empty();

    private RightingArms(LoadedPlatform loaded, RightingCurve.Request request, Slopes near, boolean fromRest) {
        double azimuthRad = Math.toRadians(request.azimuth());
        this.path = new HeelPath(azimuthRad, request.freeTrim());
        this.fromRest = fromRest;
        int steps = (int) Math.ceil(request.to() / request.step() - WHOLE_STEPS);
        double stepRad = Math.toRadians(request.to()) / steps;
        LoadedPlatform counted = counted(loaded, request.liquids(), azimuthRad);
        double lean = path.lean(near);
        Inclination held = Inclination.upright(counted).at(near);
        this.states = new HeelStates(path, lean, path.at(held, lean), stepRad, steps * stepRad);
    }

    /** The arms from upright on. */
    static RightingArms fromUpright(LoadedPlatform loaded, RightingCurve.Request request) {
        return new RightingArms(loaded, request, Slopes.LEVEL, false);
    }

    /**
     * The arms from before the platform's rest on, wherever that is: before upright when it leans away from the axis's lower side.
     *
     * @param near slopes at which the platform floats, or nearly
     */
    static RightingArms fromRest(LoadedPlatform loaded, RightingCurve.Request request, Slopes near) {
        return new RightingArms(loaded, request, near, true);
    }

    /** Back from where the platform floats to the first node at which its arm drives it forward again (rad). */
    private double beforeRest() {
        double angle = states.seedRad();
        while (states.reach(states.lowerNode(angle))) {
            angle = states.lowerNode(angle);
            if (arm(at(angle)) < -NO_ARM) {
                return angle;
            }
        }
        return states.startRad();
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
        return states.areThere();
    }

    /** Whether it reaches the angle asked for. */
    boolean complete() {
        return states.areComplete();
    }

    /** Whether it can be followed back to upright. */
    boolean reachesUpright() {
        return states.reach(0);
    }

    /** Where what happens on it begins (rad): upright, or a node before the platform's rest. */
    double startRad() {
        // The path may have turned out shorter since.
        if (startRad.isEmpty() || startRad.getAsDouble() < states.startRad()) {
            startRad = OptionalDouble.of(fromRest ? beforeRest() : 0);
        }
        return startRad.getAsDouble();
    }

    /** The last angle of the curve (rad). */
    double endRad() {
        return states.endRad();
    }

    /** The angle between nodes (rad). */
    double stepRad() {
        return states.stepRad();
    }

    /** The points at the nodes from upright on. */
    List<RightingPoint> points() {
        List<RightingPoint> points = new ArrayList<>();
        double area = 0;
        for (int i = 0; states.reach(i * stepRad()); i++) {
            double angle = i * stepRad();
            area += i == 0 ? 0 : area(this::arm, (i - 1) * stepRad(), angle, AREA_TOLERANCE);
            points.add(path.point(at(angle), angle, area));
        }
        return points;
    }

    /** The platform at an angle on the curve (rad). Exceptions are those of {@link HeelStates#at}. */
    Inclination at(double angleRad) {
        return states.at(angleRad);
    }

    /** The point at an angle on the curve (rad). */
    RightingPoint point(double angleRad) {
        return path.point(at(angleRad), angleRad, area(this::arm, 0, angleRad, AREA_TOLERANCE));
    }

    /** The righting arm of the platform held at an inclination of the curve (m). */
    double arm(Inclination at) {
        return path.arm(at);
    }

    /** The horizontal direction towards which the platform leans there, a unit vector in its axes: with the wind that heels it. */
    Vec3 leeward(Inclination at) {
        return path.leeward(at);
    }

    /** The next node, or the end of the curve where that comes first; the angle itself at the end (rad). */
    private double next(double angleRad) {
        double node = states.nextNode(angleRad);
        return states.reach(node) ? node : Math.max(angleRad, endRad());
    }

    /**
     * The first angle between two others at which something passes 0.
     *
     * @param what what is looked at
     * @param fromRad where to start (rad)
     * @param toRad where to stop (rad), or further than the curve goes
     * @param upwards whether from negative to positive
     */
    OptionalDouble crossing(ToDoubleFunction<Inclination> what, double fromRad, double toRad, boolean upwards) {
        double sign = upwards ? 1 : -1;
        DoubleUnaryOperator signed = angle -> sign * what.applyAsDouble(at(angle));
        double before = fromRad;
        double low = fromRad;
        double high = fromRad;
        while (low < toRad && (high = Math.min(toRad, next(low))) > low) {
            OptionalDouble hump = hump(signed, before, low, high);
            double to = hump.orElse(high);
            double from = hump.isPresent() ? before : low;
            if (signed.applyAsDouble(from) < 0 && signed.applyAsDouble(to) >= 0) {
                return OptionalDouble.of(
                        new BrentSolver(ANGLE_TOLERANCE).solve(MOST_EVALUATIONS, signed::applyAsDouble, from, to));
            }
            before = low;
            low = high;
        }
        return OptionalDouble.empty();
    }

    /** Where something under 0 at three angles, greatest at the middle one, comes over 0 between them; empty when it does not. */
    private static OptionalDouble hump(DoubleUnaryOperator what, double before, double low, double high) {
        double middle = what.applyAsDouble(low);
        boolean turns = before < low
                && middle < 0
                && what.applyAsDouble(before) <= middle
                && what.applyAsDouble(high) < Math.min(0, middle);
        if (!turns) {
            return OptionalDouble.empty();
        }
        UnivariatePointValuePair top = top(what, before, high);
        return top.getValue() >= 0 ? OptionalDouble.of(top.getPoint()) : OptionalDouble.empty();
    }

    private static UnivariatePointValuePair top(DoubleUnaryOperator what, double low, double high) {
        return new BrentOptimizer(GREATEST_TOLERANCE, ANGLE_TOLERANCE)
                .optimize(
                        new MaxEval(MOST_EVALUATIONS),
                        new UnivariateObjectiveFunction(what::applyAsDouble),
                        GoalType.MAXIMIZE,
                        new SearchInterval(low, high));
    }

    /** The angle at which something is greatest between two angles of the curve (rad), to be found near a node where it is. */
    double greatest(ToDoubleFunction<Inclination> what, double fromRad, double toRad) {
        DoubleUnaryOperator byAngle = angle -> what.applyAsDouble(at(angle));
        double best = fromRad;
        double most = byAngle.applyAsDouble(fromRad);
        for (double angle = fromRad; angle < toRad; ) {
            angle = Math.min(toRad, next(angle));
            double here = byAngle.applyAsDouble(angle);
            best = here > most ? angle : best;
            most = Math.max(most, here);
        }
        double low = Math.max(fromRad, best - stepRad());
        double high = Math.min(toRad, best + stepRad());
        if (!(high > low)) {
            return best;
        }
        UnivariatePointValuePair found = top(byAngle, low, high);
        return found.getValue() > most ? found.getPoint() : best;
    }

    /**
     * Area under something between two angles of the curve (its unit·rad), step by step by {@link Simpson}'s rule.
     *
     * @param tolerance error allowed under one degree of the curve
     */
    double area(ToDoubleFunction<Inclination> what, double fromRad, double toRad, double tolerance) {
        Simpson simpson = new Simpson(angle -> what.applyAsDouble(at(angle)), tolerance / Math.toRadians(1));
        double sum = 0;
        double low = fromRad;
        while (low < toRad) {
            double high = Math.min(toRad, next(low));
            sum += simpson.area(low, high);
            low = high;
        }
        return sum;
    }

    /**
     * Where the platform first rests under a heeling arm (m): there the righting arm less it passes 0 upwards. On a curve from upright, 0
     * when it rests at or before upright.
     */
    OptionalDouble rest(ToDoubleFunction<Inclination> heeling) {
        ToDoubleFunction<Inclination> excess = at -> arm(at) - heeling.applyAsDouble(at);
        double start = startRad();
        double near = start + (next(start) - start) * BESIDE;
        boolean rises = near > start && excess.applyAsDouble(at(near)) >= 0;
        if (rises && excess.applyAsDouble(at(start)) >= 0) {
            return fromRest ? OptionalDouble.empty() : OptionalDouble.of(start);
        }
        return crossing(excess, rises ? start : near, FAR, true);
    }

    /**
     * Where, beyond its rest, the platform no longer withstands a heeling arm (m): there the righting arm less it passes 0 downwards.
     *
     * @param toRad how far to look (rad)
     */
    OptionalDouble secondIntercept(double restRad, double toRad, ToDoubleFunction<Inclination> heeling) {
        // From just beyond the first intercept: at it the difference is zero within rounding.
        double beyond = restRad + (next(restRad) - restRad) * BESIDE;
        return beyond > restRad && beyond < toRad
                ? crossing(at -> arm(at) - heeling.applyAsDouble(at), beyond, toRad, false)
                : OptionalDouble.empty();
    }

    /**
     * The curve with its figures.
     *
     * @throws IllegalStateException when the platform cannot float
     */
    public static RightingCurve curve(LoadedPlatform loaded, RightingCurve.Request request) {
        return fromUpright(loaded, request).curve(request);
    }

    /** The curve with its figures. */
    RightingCurve curve(RightingCurve.Request request) {
        return HeelStates.settled(() -> figures(request));
    }

    private RightingCurve figures(RightingCurve.Request request) {
        if (!exists()) {
            return empty(request);
        }
        OptionalDouble rest = rest(at -> 0);
        OptionalDouble second =
                rest.isPresent() ? secondIntercept(rest.getAsDouble(), FAR, at -> 0) : OptionalDouble.empty();
        return figures(request, rest, second);
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
                complete() ? null : Double.valueOf(Math.toDegrees(endRad())),
                complete()
                        ? null
                        : String.format(
                                Locale.ROOT,
                                "Beyond %.2f° the trim finds no stable rest within 85° of upright.",
                                Math.toDegrees(endRad())),
                rights ? Double.valueOf(Math.toDegrees(from)) : null,
                second.isPresent() ? Double.valueOf(Math.toDegrees(to)) : null,
                rights ? Double.valueOf(Math.toDegrees(to - from)) : null,
                point(greatest(this::arm, 0, endRad())),
                rights ? Double.valueOf(area(this::arm, from, to, AREA_TOLERANCE)) : null,
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
