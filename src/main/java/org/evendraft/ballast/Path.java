package org.evendraft.ballast;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import org.evendraft.ballast.PlanRequest.OperationLimits;
import org.evendraft.stability.LoadedPlatform;

/**
 * The state followed through a schedule: at each instant at which a pump starts or stops, just before and just after, and at samples
 * between, the exact floating position with liquids free and the metacentric heights with the tanks in motion slack. Where the
 * start is outside a limit, the figure may not get worse until it is inside. Immutable.
 */
final class Path {
    /** Samples between two instants. */
    static final int CLOSE = 20;

    /** Just after and just before an instant: so small a part of the time between two that a tank has just begun to fill or to run dry. */
    private static final double BESIDE = 1e-6;

    /** An excess of less than this, in degrees or metres, is rounding. */
    private static final double ROUNDING = 1e-9;

    private final Plant plant;
    private final Schedule schedule;
    private final Map<Quantity, Peak> peaks = new EnumMap<>(Quantity.class);
    private final Map<Quantity, Peak> excesses = new EnumMap<>(Quantity.class);
    private final Map<Quantity, Double> allowed = new EnumMap<>(Quantity.class);
    private double lostAt = Double.NaN;

    /**
     * A figure at its worst.
     *
     * @param figure the figure, or its excess
     * @param minute when
     */
    record Peak(double figure, double minute) {}

    private Path(Plant plant, Schedule schedule) {
        this.plant = plant;
        this.schedule = schedule;
    }

    /** Follows a schedule, with a number of samples between two instants. */
    static Path follow(Plant plant, Schedule schedule, OperationLimits limits, int samples) {
        Path path = new Path(plant, schedule);
        path.look(0, Set.of(), limits);
        List<Double> instants = schedule.instants();
        for (int i = 0; i + 1 < instants.size(); i++) {
            double from = instants.get(i);
            double to = instants.get(i + 1);
            Set<String> moving = schedule.moving(from, to);
            for (int s = 0; s <= samples + 1; s++) {
                double part = Math.min(1 - BESIDE, Math.max(BESIDE, s / (samples + 1.0)));
                path.look(from + (to - from) * part, moving, limits);
            }
        }
        path.look(schedule.duration(), Set.of(), limits);
        return path;
    }

    private void look(double minute, Set<String> moving, OperationLimits limits) {
        Optional<ExactState> state = ExactState.of(at(minute, moving));
        if (state.isEmpty()) {
            lostAt = Double.isNaN(lostAt) ? minute : lostAt;
            return;
        }
        for (Quantity quantity : Quantity.values()) {
            double figure = quantity.of(state.get());
            raise(peaks, quantity, new Peak(figure, minute));
            OptionalDouble limit = quantity.limit(limits);
            if (limit.isPresent()) {
                double before = allowed.getOrDefault(quantity, Math.max(figure, limit.getAsDouble()));
                raise(excesses, quantity, new Peak(figure - before, minute));
                allowed.put(quantity, Math.max(limit.getAsDouble(), Math.min(before, figure)));
            }
        }
    }

    private static void raise(Map<Quantity, Peak> greatest, Quantity quantity, Peak peak) {
        greatest.merge(quantity, peak, (old, now) -> now.figure() > old.figure() ? now : old);
    }

    /** The platform at an instant. */
    private LoadedPlatform at(double minute, Set<String> moving) {
        Map<String, Double> gained = schedule.gained(minute);
        Map<String, Double> volumes = new HashMap<>();
        for (BallastTank tank : plant.tanks()) {
            Double gain = gained.get(tank.id());
            if (gain != null) {
                volumes.put(tank.id(), tank.volume(tank.start() + gain));
            }
        }
        return plant.loaded().withVolumes(volumes).withMoving(moving);
    }

    /** The state at the end of a run, its own tanks at rest unless another one works on them. */
    ExactState after(Schedule.Run run) {
        double end = run.end();
        Set<String> moving = schedule.moving(end - Schedule.INSTANT, end + Schedule.INSTANT);
        return ExactState.of(at(end, moving)).orElseThrow(() -> new IllegalStateException("lost at minute " + end));
    }

    /** Whether the platform floats at every instant looked at. */
    boolean afloat() {
        return Double.isNaN(lostAt);
    }

    Plan.Extreme worst(Quantity quantity) {
        Peak peak = peaks.getOrDefault(quantity, new Peak(Double.NaN, 0));
        return new Plan.Extreme(quantity.plain(peak.figure()), peak.minute());
    }

    /** All excesses over the limits added up (degrees, metres); infinite when the platform is lost. */
    double excess() {
        return afloat()
                ? excesses.values().stream()
                        .mapToDouble(Peak::figure)
                        .filter(figure -> figure > ROUNDING)
                        .sum()
                : Double.POSITIVE_INFINITY;
    }

    /** Whether the platform floats and every limit is kept at every instant looked at. */
    boolean kept() {
        return afloat() && limitsPassed().isEmpty();
    }

    /** The limits that are not kept. */
    List<Plan.Binding> limitsPassed() {
        List<Plan.Binding> passed = new ArrayList<>();
        excesses.forEach((quantity, peak) -> {
            if (peak.figure() > ROUNDING) {
                double worst = peaks.getOrDefault(quantity, peak).figure();
                passed.add(new Plan.Binding(
                        "operationLimits." + quantity.limitName(),
                        quantity.plain(worst),
                        quantity.plain(worst - peak.figure()),
                        peak.figure()));
            }
        });
        return passed;
    }

    /** A sentence on each limit that is not kept. */
    List<String> violations() {
        List<String> sentences = new ArrayList<>();
        excesses.forEach((quantity, peak) -> {
            if (peak.figure() > ROUNDING) {
                sentences.add(String.format(
                        Locale.ROOT,
                        "On the way a limit is passed: at minute %.1f the %s is %s beyond what is allowed there; the worst is %s at minute %.1f.",
                        peak.minute(),
                        quantity.words(),
                        quantity.amount(peak.figure()),
                        quantity.told(peaks.getOrDefault(quantity, peak).figure()),
                        peaks.getOrDefault(quantity, peak).minute()));
            }
        });
        if (!afloat()) {
            sentences.add(String.format(
                    Locale.ROOT,
                    "On the way the platform would sink or capsize: the computation finds no floating position at minute %.1f.",
                    lostAt));
        }
        return sentences;
    }
}
