package org.evendraft.stability;

import java.util.EnumMap;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.ToDoubleFunction;
import org.evendraft.platform.Criterion;
import org.evendraft.platform.Criterion.LimitAngle;
import org.evendraft.platform.Criterion.Openings;
import org.evendraft.platform.Opening;
import org.evendraft.platform.Platform;

/**
 * A platform's righting arms about one axis against the wind that heels it about that axis, and its openings on the way. Remembers what
 * it has found; one thread at a time.
 */
final class AxisStability {
    /** A heeling arm under this is none (m). */
    private static final double LEAST_HEELING = 1e-6;

    /** Error allowed in areas under one degree of a curve, where criteria compare them (m·rad): ratios of usual areas, some 0.1 m·rad, are then good to three digits. */
    private static final double AREA_TOLERANCE = 1e-5;

    private final RightingArms arms;
    private final Wind wind;
    private final List<Opening> openings;
    private final Map<Double, OptionalDouble> rests = new HashMap<>();
    private final Map<Double, OptionalDouble> seconds = new HashMap<>();
    private final Map<Openings, Optional<Place>> floodings = new EnumMap<>(Openings.class);

    /** @param arms the righting arms, which exist */
    AxisStability(RightingArms arms, Platform platform) {
        this.arms = arms;
        this.wind = new Wind(platform.windage());
        this.openings = platform.openings();
    }

    /**
     * A place on the curve where areas or ranges end.
     *
     * @param angleRad the angle (rad)
     * @param what what it is, in words
     */
    record Place(double angleRad, String what) {}

    RightingArms arms() {
        return arms;
    }

    /** Whether a wind of a speed (m/s) heels the platform about this axis, where it rests without. */
    boolean isHeeledBy(double speed) {
        return speed > 0
                && wind.meetsSomething()
                && force(arms.at(ownRest()), speed).arm() > LEAST_HEELING;
    }

    /** Where the platform rests without wind, or the curve begins where there is no such place (rad). */
    private double ownRest() {
        return rest(0).orElse(arms.startRad());
    }

    /** The wind's heeling arm by the platform's state (m). */
    ToDoubleFunction<Inclination> heeling(double speed) {
        return speed > 0 && wind.meetsSomething() ? at -> force(at, speed).arm() : at -> 0;
    }

    /** The wind's force on the platform at a state, at a speed (m/s). */
    WindForce force(Inclination at, double speed) {
        return wind.on(at, arms.leeward(at), speed);
    }

    /** Where the platform rests under a wind: the first intercept (rad). */
    OptionalDouble rest(double speed) {
        return rests.computeIfAbsent(speed, s -> arms.rest(heeling(s)));
    }

    /** The second intercept (rad). */
    OptionalDouble secondIntercept(double speed) {
        return seconds.computeIfAbsent(speed, s -> secondIntercept(s, RightingArms.FAR));
    }

    private OptionalDouble secondIntercept(double speed, double toRad) {
        OptionalDouble rest = rest(speed);
        return rest.isPresent() ? arms.secondIntercept(rest.getAsDouble(), toRad, heeling(speed)) : rest;
    }

    /** Area under the righting arms over that under the wind's heeling arms, from upright to an angle. */
    double areaRatio(double speed, double toRad) {
        return arms.area(arms::arm, 0, toRad, AREA_TOLERANCE) / arms.area(heeling(speed), 0, toRad, AREA_TOLERANCE);
    }

    /** The angle between two others at which the righting arm is most against the heeling arm (rad). */
    double bestRatio(double speed, double fromRad, double toRad) {
        return arms.greatest(at -> ratio(at, speed), fromRad, toRad);
    }

    /** Righting over heeling arm at a state; a heeling arm under the least that counts is taken as that. */
    double ratio(Inclination at, double speed) {
        return arms.arm(at) / Math.max(LEAST_HEELING, heeling(speed).applyAsDouble(at));
    }

    /** Where an opening first meets the water from the platform's own rest on (rad); empty when that is not on the curve. */
    OptionalDouble immersion(Opening opening) {
        return immersion(at -> at.waterplane().freeboard(opening.position()));
    }

    private OptionalDouble immersion(ToDoubleFunction<Inclination> height) {
        double start = ownRest();
        return height.applyAsDouble(arms.at(start)) <= 0
                ? OptionalDouble.of(start)
                : arms.crossing(height, start, RightingArms.FAR, false);
    }

    /** Where the first of the openings that count meets the water. */
    Optional<Place> downflooding(Openings counted) {
        return floodings.computeIfAbsent(counted, this::firstImmersion);
    }

    private Optional<Place> firstImmersion(Openings counted) {
        OptionalDouble angle =
                immersion(at -> lowest(counted, at).map(Lowest::height).orElse(Double.POSITIVE_INFINITY));
        return angle.stream()
                .boxed()
                .flatMap(a -> lowest(counted, arms.at(a)).stream()
                        .map(low -> new Place(a, "opening " + low.opening() + " meets the water")))
                .findFirst();
    }

    /** The lowest opening that counts over the water at a state: its height (m), and which it is. */
    Optional<Lowest> lowest(Openings counted, Inclination at) {
        return openings.stream()
                .filter(counted::count)
                .map(opening -> new Lowest(at.waterplane().freeboard(opening.position()), opening.id()))
                .reduce((a, b) -> b.height() < a.height() ? b : a);
    }

    /**
     * An opening over the water.
     *
     * @param height its height (m)
     * @param opening its id
     */
    record Lowest(double height, String opening) {}

    /**
     * Where a criterion's areas and ranges end; at the end of the curve when what ends them is not on it. By {@link LimitAngle#DOWNFLOODING}
     * that lies beyond the second intercept, so that the arms lost after it count as far as they are known.
     */
    Place limit(Criterion criterion, double speed) {
        LimitAngle wanted = criterion.limitAngle();
        Optional<Place> flooding =
                wanted == LimitAngle.SECOND_INTERCEPT ? Optional.empty() : downflooding(criterion.openings());
        boolean toOpening =
                wanted == LimitAngle.DOWNFLOODING && openings.stream().anyMatch(criterion.openings()::count);
        if (flooding.isPresent() && toOpening) {
            return flooding.get();
        }
        OptionalDouble second =
                flooding.isPresent() ? secondIntercept(speed, flooding.get().angleRad()) : secondIntercept(speed);
        if (toOpening) {
            return second.isPresent() && !arms.complete()
                    ? new Place(arms.endRad(), end().what() + ", beyond the second intercept and before any opening")
                    : end();
        }
        if (second.isPresent()) {
            return new Place(second.getAsDouble(), "the second intercept");
        }
        return flooding.orElseGet(this::end);
    }

    /** The end of the curve. */
    Place end() {
        String what =
                arms.complete() ? "the curve's last angle" : "the end of the curve, where the trim loses its rest";
        return new Place(arms.endRad(), what);
    }
}
