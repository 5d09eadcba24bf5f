package org.evendraft.stability;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.DoubleUnaryOperator;
import java.util.function.Supplier;
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

/**
 * The righting arms of one platform about one axis, at nodes a step apart, each found from the one before when it is first asked for,
 * and exactly in between from the nearest node. Remembers what it has found; one thread at a time.
 */
public final class RightingArms {
    /** Error of the area under one degree of the curve (m·rad). */
    private static final double AREA_TOLERANCE = 1e-6;
    /** Crossings are found to this angle (rad). */
    private static final double ANGLE_TOLERANCE = 1e-9;

    /** So small a part of a step beside an angle, the sign of the arm tells on which side of a crossing the angle lies. */
    private static final double BESIDE = 1e-3;

    /** Further than any curve goes (rad). */
    static final double FAR = Double.POSITIVE_INFINITY;

    private static final int MOST_EVALUATIONS = 200;
    private static final int GREATEST_DEPTH = 10;

    private final HeelPath path;
    private final double stepRad;
    /** Places of the first and the last node, in steps from upright. */
    private final int first;

    private final int last;
    private final List<Inclination> nodes = new ArrayList<>();
    private final Map<Double, Inclination> between = new HashMap<>();
    private boolean ended;

    RightingArms(LoadedPlatform loaded, RightingCurve.Request request) {
        this(loaded, request, Slopes.LEVEL);
    }

    /** @param near slopes at which the platform floats: when it leans away from the axis's lower side, the curve begins before upright */
    RightingArms(LoadedPlatform loaded, RightingCurve.Request request, Slopes near) {
        double azimuthRad = Math.toRadians(request.azimuth());
        this.path = new HeelPath(azimuthRad, request.freeTrim());
        this.last = (int) Math.ceil(request.to() / request.step() - 1e-9);
        this.stepRad = Math.toRadians(request.to() / last);
        double lean = path.lean(near);
        this.first = lean < 0 ? (int) Math.floor(lean / stepRad) - 1 : 0;
        LoadedPlatform counted = counted(loaded, request.liquids(), azimuthRad);
        add(path.at(Inclination.upright(counted).at(near), first * stepRad));
    }

    private void add(Optional<Inclination> node) {
        node.ifPresentOrElse(nodes::add, () -> ended = true);
        ended |= nodes.size() > last - first;
    }

    /** Follows the curve as far as an angle, if it goes so far. */
    private boolean reaches(double angleRad) {
        while (!ended && (first + nodes.size() - 1) * stepRad < angleRad) {
            int count = nodes.size();
            Inclination before = nodes.get(Math.max(0, count - 2));
            add(path.follow(nodes.get(count - 1), before, (first + count) * stepRad));
        }
        return angleRad <= (first + nodes.size() - 1) * stepRad;
    }

    /** The platform with its liquids as the treatment has them: free, or at rest with G raised by the correction about the axis. */
    private static LoadedPlatform counted(LoadedPlatform loaded, LiquidTreatment liquids, double azimuthRad) {
        return switch (liquids) {
            case FREE -> loaded;
            case ACTUAL_MOMENT -> loaded.atRest(azimuthRad, FreeSurface.ACTUAL);
            case MAXIMUM_MOMENT -> loaded.atRest(azimuthRad, FreeSurface.MAXIMUM);
        };
    }

    /** Whether the curve exists at all: it has an upright. */
    boolean exists() {
        return !nodes.isEmpty() && reaches(0);
    }

    /** Whether it reaches the angle asked for. */
    boolean complete() {
        return reaches(last * stepRad);
    }

    /** Its first angle (rad): 0, or less where the platform leans the other way. */
    double startRad() {
        return first * stepRad;
    }

    /** The last angle of the curve (rad). */
    double endRad() {
        reaches(last * stepRad);
        return (first + nodes.size() - 1) * stepRad;
    }

    /** The angle between nodes (rad). */
    double stepRad() {
        return stepRad;
    }

    /** The points at the nodes from upright on. */
    List<RightingPoint> points() {
        int count = (int) Math.round(endRad() / stepRad) + 1;
        List<RightingPoint> points = new ArrayList<>(count);
        double area = 0;
        for (int i = 0; i < count; i++) {
            double angle = i * stepRad;
            area += i == 0 ? 0 : area(this::arm, (i - 1) * stepRad, angle, AREA_TOLERANCE);
            points.add(path.point(at(angle), angle, area));
        }
        return points;
    }

    /**
     * The platform at an angle on the curve (rad), found from the nearest node, or else from the one on the angle's other side.
     *
     * @throws LostRestException when the trim finds no rest from either: no other angle's state stands in, and from then on the curve
     *     ends at the node before
     */
    Inclination at(double angleRad) {
        if (!reaches(angleRad)) {
            throw new IllegalArgumentException(Math.toDegrees(angleRad) + "° is beyond the curve");
        }
        long nearest = Math.round(angleRad / stepRad);
        if (nearest * stepRad == angleRad) {
            return node(nearest);
        }
        Inclination known = between.get(angleRad);
        if (known != null) {
            return known;
        }
        Inclination near = node(nearest);
        Inclination other = node(nearest * stepRad < angleRad ? nearest + 1 : nearest - 1);
        Optional<Inclination> found = path.follow(near, other, angleRad).or(() -> path.follow(other, near, angleRad));
        if (found.isEmpty()) {
            endBefore(angleRad);
            throw new LostRestException(angleRad);
        }
        between.put(angleRad, found.get());
        return found.get();
    }

    private void endBefore(double angleRad) {
        int kept = Math.max(0, (int) Math.floor(angleRad / stepRad) - first + 1);
        nodes.subList(Math.min(kept, nodes.size()), nodes.size()).clear();
        ended = true;
    }

    /** Something found on the curve; when the curve turns out to end earlier than its nodes told, found again on what is left of it. */
    static <T> T settled(Supplier<T> search) {
        while (true) {
            try {
                return search.get();
            } catch (LostRestException e) {
                // The curve is shorter now by a node at least, so this comes to an end.
            }
        }
    }

    private Inclination node(long place) {
        return nodes.get((int) Math.min(nodes.size() - 1L, Math.max(0, place - first)));
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
        double low = fromRad;
        double atLow = signed.applyAsDouble(low);
        while (low < toRad && reaches(nextNode(low))) {
            double high = nextNode(low);
            double atHigh = signed.applyAsDouble(high);
            if (atLow < 0 && atHigh >= 0) {
                double found =
                        new BrentSolver(ANGLE_TOLERANCE).solve(MOST_EVALUATIONS, signed::applyAsDouble, low, high);
                return found <= toRad ? OptionalDouble.of(found) : OptionalDouble.empty();
            }
            low = high;
            atLow = atHigh;
        }
        return OptionalDouble.empty();
    }

    private double nextNode(double angleRad) {
        return (Math.floor(angleRad / stepRad + 1e-9) + 1) * stepRad;
    }

    /** The angle at which something is greatest between two angles (rad), to be found near a node where it is. */
    double greatest(ToDoubleFunction<Inclination> what, double fromRad, double toRad) {
        DoubleUnaryOperator byAngle = angle -> what.applyAsDouble(at(angle));
        double best = fromRad;
        double most = byAngle.applyAsDouble(fromRad);
        for (double angle = fromRad; angle < toRad; ) {
            angle = Math.min(toRad, nextNode(angle));
            double here = byAngle.applyAsDouble(angle);
            best = here > most ? angle : best;
            most = Math.max(most, here);
        }
        double low = Math.max(fromRad, best - stepRad);
        double high = Math.min(toRad, best + stepRad);
        if (!(high > low)) {
            return best;
        }
        UnivariatePointValuePair found = new BrentOptimizer(1e-8, ANGLE_TOLERANCE)
                .optimize(
                        new MaxEval(MOST_EVALUATIONS),
                        new UnivariateObjectiveFunction(byAngle::applyAsDouble),
                        GoalType.MAXIMIZE,
                        new SearchInterval(low, high));
        return found.getValue() > most ? found.getPoint() : best;
    }

    /**
     * Area under something between two angles (its unit·rad), by Simpson's rule halved until it settles.
     *
     * @param tolerance error allowed under one degree of the curve
     */
    double area(ToDoubleFunction<Inclination> what, double fromRad, double toRad, double tolerance) {
        Simpson simpson = new Simpson(angle -> what.applyAsDouble(at(angle)), tolerance / Math.toRadians(1));
        double sum = 0;
        double low = fromRad;
        while (low < toRad) {
            double high = Math.min(toRad, nextNode(low));
            sum += simpson.area(low, high);
            low = high;
        }
        return sum;
    }

    /**
     * Simpson's rule with halved steps.
     *
     * @param what the integrand by angle (rad)
     * @param tolerance error allowed for each radian
     */
    private record Simpson(DoubleUnaryOperator what, double tolerance) {
        double area(double from, double to) {
            double middle = (from + to) / 2;
            return area(from, at(from), to, at(to), at(middle), GREATEST_DEPTH);
        }

        private double at(double angleRad) {
            return what.applyAsDouble(angleRad);
        }

        private double area(double a, double atA, double b, double atB, double atMiddle, int depth) {
            double m = (a + b) / 2;
            double atLeft = at((a + m) / 2);
            double atRight = at((m + b) / 2);
            double whole = (b - a) / 6 * (atA + 4 * atMiddle + atB);
            double halves = (b - a) / 12 * (atA + 4 * atLeft + 2 * atMiddle + 4 * atRight + atB);
            if (depth == 0 || Math.abs(halves - whole) <= 15 * tolerance * (b - a)) {
                return halves + (halves - whole) / 15;
            }
            return area(a, atA, m, atMiddle, atLeft, depth - 1) + area(m, atMiddle, b, atB, atRight, depth - 1);
        }
    }

    /** Where the platform first rests under a heeling arm (m): there the righting arm less it passes 0 upwards. */
    OptionalDouble rest(ToDoubleFunction<Inclination> heeling) {
        ToDoubleFunction<Inclination> excess = at -> arm(at) - heeling.applyAsDouble(at);
        double near = startRad() + stepRad * BESIDE;
        if (!reaches(startRad() + stepRad)) {
            return OptionalDouble.empty();
        }
        boolean rises = excess.applyAsDouble(at(near)) >= 0;
        if (rises && excess.applyAsDouble(at(startRad())) >= 0) {
            return OptionalDouble.of(startRad());
        }
        return crossing(excess, rises ? startRad() : near, FAR, true);
    }

    /**
     * Where, beyond its rest, the platform no longer withstands a heeling arm (m): there the righting arm less it passes 0 downwards.
     *
     * @param toRad how far to look (rad)
     */
    OptionalDouble secondIntercept(double restRad, double toRad, ToDoubleFunction<Inclination> heeling) {
        // From just beyond the first intercept: at it the difference is zero within rounding.
        double beyond = restRad + stepRad * BESIDE;
        return beyond < toRad && reaches(beyond)
                ? crossing(at -> arm(at) - heeling.applyAsDouble(at), beyond, toRad, false)
                : OptionalDouble.empty();
    }

    /**
     * The curve with its figures.
     *
     * @throws IllegalStateException when the platform cannot float
     */
    public static RightingCurve curve(LoadedPlatform loaded, RightingCurve.Request request) {
        return new RightingArms(loaded, request).curve(request);
    }

    /** The curve with its figures. */
    RightingCurve curve(RightingCurve.Request request) {
        return settled(() -> figures(request));
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
                                Locale.ROOT, "Beyond %.2f° the trim finds no stable rest.", Math.toDegrees(endRad())),
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
