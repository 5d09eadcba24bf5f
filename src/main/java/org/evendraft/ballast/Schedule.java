package org.evendraft.ballast;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.evendraft.platform.Pump;

/** Transfers on pumps in time: one at a time on each pump and on each tank. Immutable. */
record Schedule(List<Run> runs) {
    private static final double MINUTES_IN_HOUR = 60;
    /** Times closer than this are the same (min). */
    static final double INSTANT = 1e-9;

    /**
     * A transfer on its pump.
     *
     * @param transfer the transfer
     * @param pump the pump's id
     * @param start when it starts (min)
     * @param end when it ends (min)
     */
    record Run(Transfer transfer, String pump, double start, double end) {
        /** The part done at an instant. */
        double done(double minute) {
            return Math.min(1, Math.max(0, (minute - start) / (end - start)));
        }

        private boolean continuesAs(Run next) {
            return pump.equals(next.pump)
                    && transfer.from().equals(next.transfer.from())
                    && transfer.to().equals(next.transfer.to())
                    && Math.abs(end - next.start) <= INSTANT;
        }

        private Run with(Run next) {
            double mass = transfer.mass() + next.transfer.mass();
            return new Run(new Transfer(transfer.from(), transfer.to(), mass), pump, start, next.end);
        }

        /** Whether it is at work inside a span of time. */
        boolean works(double from, double to) {
            return start < to - INSTANT && end > from + INSTANT;
        }
    }

    /**
     * Starts each transfer as early as its pump and tanks allow, earlier ones of the list first.
     *
     * @param order the transfers
     * @param pumps the pumps
     * @param density density of the sea (t/m³)
     * @param rule how many may run at once, and whether one may start before those that come before it in the list
     */
    static Schedule of(List<Transfer> order, List<Pump> pumps, double density, Rule rule) {
        List<Transfer> waiting = new ArrayList<>(order);
        List<Run> runs = new ArrayList<>();
        double now = 0;
        while (!waiting.isEmpty()) {
            startAll(waiting, runs, pumps, density, now, rule);
            double moment = now;
            now = runs.stream()
                    .mapToDouble(Run::end)
                    .filter(end -> end > moment + INSTANT)
                    .min()
                    .orElseThrow(() -> new IllegalStateException("no pump for " + waiting));
        }
        runs.sort(Comparator.comparingDouble(Run::start));
        return new Schedule(joined(runs));
    }

    /** Parts of a transfer that follow each other on one pump are one run. */
    private static List<Run> joined(List<Run> runs) {
        List<Run> joined = new ArrayList<>();
        for (Run run : runs) {
            Optional<Run> before =
                    joined.stream().filter(earlier -> earlier.continuesAs(run)).findFirst();
            if (before.isPresent()) {
                joined.set(joined.indexOf(before.get()), before.get().with(run));
            } else {
                joined.add(run);
            }
        }
        return List.copyOf(joined);
    }

    private static void startAll(
            List<Transfer> waiting, List<Run> runs, List<Pump> pumps, double density, double now, Rule rule) {
        for (Transfer transfer : List.copyOf(waiting)) {
            List<Run> working =
                    runs.stream().filter(run -> run.end() > now + INSTANT).toList();
            boolean busy = working.size() >= rule.atOnce()
                    || working.stream().anyMatch(run -> run.transfer().sharesTank(transfer));
            Optional<Pump> pump = busy ? Optional.empty() : fastest(transfer, working, pumps);
            if (pump.isPresent()) {
                runs.add(run(transfer, pump.get(), density, now));
                waiting.remove(transfer);
            } else if (!rule.overtaking()) {
                return;
            }
        }
    }

    /** The fastest idle pump that can do it, the first by name among equals. */
    private static Optional<Pump> fastest(Transfer transfer, List<Run> working, List<Pump> pumps) {
        return pumps.stream()
                .filter(pump -> transfer.possibleOn(pump)
                        && working.stream().noneMatch(run -> run.pump().equals(pump.id())))
                .max(Comparator.comparingDouble(Pump::rate)
                        .thenComparing(Comparator.comparing(Pump::id).reversed()));
    }

    /**
     * What a schedule may do.
     *
     * @param atOnce how many transfers may run at once
     * @param overtaking whether a transfer may start before one that comes before it in the list
     */
    record Rule(int atOnce, boolean overtaking) {}

    private static Run run(Transfer transfer, Pump pump, double density, double now) {
        double minutes = transfer.mass() / density / pump.rate() * MINUTES_IN_HOUR;
        return new Run(transfer, pump.id(), now, now + minutes);
    }

    double duration() {
        return runs.stream().mapToDouble(Run::end).max().orElse(0);
    }

    /** The instants at which something starts or ends, 0 included. */
    List<Double> instants() {
        List<Double> times = new ArrayList<>(List.of(0.0));
        runs.forEach(run -> {
            times.add(run.start());
            times.add(run.end());
        });
        times.sort(Comparator.naturalOrder());
        List<Double> distinct = new ArrayList<>();
        for (double time : times) {
            if (distinct.isEmpty() || time > distinct.get(distinct.size() - 1) + INSTANT) {
                distinct.add(time);
            }
        }
        return distinct;
    }

    /** What each tank has gained by an instant (t). */
    Map<String, Double> gained(double minute) {
        Map<String, Double> gained = new HashMap<>();
        for (Run run : runs) {
            double mass = run.transfer().mass() * run.done(minute);
            gained.merge(run.transfer().to(), mass, Double::sum);
            gained.merge(run.transfer().from(), -mass, Double::sum);
        }
        gained.remove(Pump.SEA);
        return gained;
    }

    /** Tanks worked on inside a span of time. */
    Set<String> moving(double from, double to) {
        Set<String> moving = new HashSet<>();
        for (Run run : runs) {
            if (run.works(from, to)) {
                moving.add(run.transfer().from());
                moving.add(run.transfer().to());
            }
        }
        moving.remove(Pump.SEA);
        return moving;
    }
}
