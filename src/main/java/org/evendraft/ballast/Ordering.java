package org.evendraft.ballast;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import org.evendraft.ballast.PlanRequest.OperationLimits;
import org.evendraft.geometry.Plane;
import org.evendraft.platform.Pump;

/**
 * Puts transfers in order. Orders are tried by a quick estimate, heel and trim linear in what has been moved, and the most
 * promising ones are followed exactly; where a limit is passed, the transfers are also tried in parts. Least excess over the limits comes
 * first, then the shortest time, then the least heel and trim on the way.
 */
final class Ordering {
    /** Up to this many transfers all orders are tried, of more only neighbours of the best one known. */
    private static final int ALL_ORDERS_OF = 5;

    private static final int MOST_TRIED = 400;
    private static final int FOLLOWED = 4;
    private static final int[] PARTS = {2, 4, 8};
    /** Parts are not tried when they would be more than this many orders to carry out. */
    private static final int MOST_PIECES = 24;
    /** Transfers are parted only when that takes off this part of the excess. */
    private static final double WORTH = 0.5;

    private static final double SAME = 1e-9;
    /** All pumps at once, the same without overtaking, two at once without overtaking, one after another. */
    private static final List<Schedule.Rule> RULES = List.of(
            new Schedule.Rule(Integer.MAX_VALUE, true),
            new Schedule.Rule(Integer.MAX_VALUE, false),
            new Schedule.Rule(2, false),
            new Schedule.Rule(1, false));
    /** Samples between two instants while orders are compared. */
    private static final int COARSE = 1;

    private final Plant plant;
    private final OperationLimits limits;
    /** The answer of draft and slopes to a tonne in each tank. */
    private final Map<String, double[]> perTonne = new HashMap<>();

    private final double startHeel;
    private final double startTrim;

    Ordering(Plant plant, OperationLimits limits, ExactState start) {
        this.plant = plant;
        this.limits = limits;
        Plane plane = start.waterplane().plane();
        Response response = new Response(
                plant.prepared(),
                plant.water().density(),
                plane,
                plant.stowage(),
                plant.stowage(),
                plant.ballastHeight());
        plant.tanks().forEach(tank -> perTonne.put(tank.id(), perTonne(tank, response)));
        this.startHeel = -start.component(Response.SLOPE_Y);
        this.startTrim = start.component(Response.SLOPE_X);
    }

    /** The best schedule found. */
    Schedule best(List<Transfer> transfers) {
        if (transfers.isEmpty()) {
            return new Schedule(List.of());
        }
        Followed best = bestOf(transfers);
        for (int parts : PARTS) {
            if (best.excess() > SAME && parts * transfers.size() <= MOST_PIECES) {
                Followed parted = bestOf(inParts(transfers, parts));
                best = parted.excess() < WORTH * best.excess() ? parted : best;
            }
        }
        return best.schedule();
    }

    private static List<Transfer> inParts(List<Transfer> transfers, int parts) {
        List<Transfer> pieces = new ArrayList<>();
        for (int i = 0; i < parts; i++) {
            transfers.forEach(transfer -> pieces.add(transfer.part(parts)));
        }
        return pieces;
    }

    private Followed bestOf(List<Transfer> transfers) {
        return promising(transfers).stream()
                .map(this::follow)
                .min(Followed.BEST_FIRST)
                .orElseThrow();
    }

    private record Followed(Schedule schedule, double excess, double duration, double swing) {
        static final Comparator<Followed> BEST_FIRST = Comparator.comparingDouble(Followed::excess)
                .thenComparingDouble(Followed::duration)
                .thenComparingDouble(Followed::swing);
    }

    private Followed follow(Estimate estimate) {
        Path path = Path.follow(plant, estimate.schedule(), limits, COARSE);
        double swing =
                path.worst(Quantity.HEEL).value() + path.worst(Quantity.TRIM).value();
        return new Followed(estimate.schedule(), path.excess(), estimate.duration(), swing);
    }

    private record Estimate(Schedule schedule, List<Transfer> order, double excess, double duration, double swing) {
        static final Comparator<Estimate> BEST_FIRST = Comparator.comparingDouble(Estimate::excess)
                .thenComparingDouble(Estimate::duration)
                .thenComparingDouble(Estimate::swing);
        static final Comparator<Estimate> STEADIEST_FIRST =
                Comparator.comparingDouble(Estimate::excess).thenComparingDouble(Estimate::swing);
    }

    /** The best estimates, some by time and some by how little the platform moves. */
    private List<Estimate> promising(List<Transfer> pieces) {
        List<Estimate> estimates = pieces.size() <= ALL_ORDERS_OF ? allOrders(pieces) : neighbours(pieces);
        List<Estimate> chosen = new ArrayList<>();
        chosen.addAll(estimates.stream()
                .sorted(Estimate.BEST_FIRST)
                .limit(FOLLOWED / 2)
                .toList());
        chosen.addAll(estimates.stream()
                .sorted(Estimate.STEADIEST_FIRST)
                .limit(FOLLOWED / 2)
                .toList());
        return chosen;
    }

    private List<Estimate> allOrders(List<Transfer> pieces) {
        List<Estimate> estimates = new ArrayList<>();
        permute(new ArrayList<>(pieces), 0, estimates);
        return estimates;
    }

    private void permute(List<Transfer> order, int fixed, List<Estimate> estimates) {
        if (fixed == order.size()) {
            estimates.addAll(estimates(order));
            return;
        }
        for (int i = fixed; i < order.size(); i++) {
            List<Transfer> next = new ArrayList<>(order);
            next.add(fixed, next.remove(i));
            permute(next, fixed + 1, estimates);
        }
    }

    /** Moves one transfer at a time to another place as long as that betters the estimate. */
    private List<Estimate> neighbours(List<Transfer> pieces) {
        List<Estimate> all = new ArrayList<>(estimates(pieces));
        all.addAll(estimates(steadiest(pieces)));
        Estimate best = all.stream().min(Estimate.BEST_FIRST).orElseThrow();
        boolean better = true;
        while (better && all.size() < MOST_TRIED) {
            better = false;
            for (int i = 0; i < pieces.size() && all.size() < MOST_TRIED; i++) {
                for (int j = 0; j < pieces.size(); j++) {
                    List<Transfer> order = new ArrayList<>(best.order());
                    order.add(j, order.remove(i));
                    List<Estimate> now = estimates(order);
                    all.addAll(now);
                    Estimate first = now.stream().min(Estimate.BEST_FIRST).orElseThrow();
                    if (Estimate.BEST_FIRST.compare(first, best) < 0) {
                        best = first;
                        better = true;
                    }
                }
            }
        }
        return all;
    }

    /** At each turn the transfer after which the platform lies most nearly upright. */
    private List<Transfer> steadiest(List<Transfer> pieces) {
        List<Transfer> waiting = new ArrayList<>(pieces);
        List<Transfer> order = new ArrayList<>();
        Map<String, Double> gained = new HashMap<>();
        while (!waiting.isEmpty()) {
            Transfer next = waiting.stream()
                    .min(Comparator.comparingDouble(transfer -> slopeAfter(gained, transfer)))
                    .orElseThrow();
            waiting.remove(next);
            order.add(next);
            gained.merge(next.from(), -next.mass(), Double::sum);
            gained.merge(next.to(), next.mass(), Double::sum);
        }
        return order;
    }

    private double slopeAfter(Map<String, Double> gained, Transfer transfer) {
        Map<String, Double> then = new HashMap<>(gained);
        then.merge(transfer.from(), -transfer.mass(), Double::sum);
        then.merge(transfer.to(), transfer.mass(), Double::sum);
        then.remove(Pump.SEA);
        double[] moved = moved(then);
        return Math.hypot(startHeel - moved[Response.SLOPE_Y], startTrim + moved[Response.SLOPE_X]);
    }

    /** An order by each rule. */
    private List<Estimate> estimates(List<Transfer> order) {
        List<Estimate> estimates = new ArrayList<>();
        for (Schedule.Rule rule : RULES) {
            estimates.add(estimate(
                    order, Schedule.of(order, plant.pumps(), plant.water().density(), rule)));
        }
        return estimates;
    }

    private Estimate estimate(List<Transfer> order, Schedule schedule) {
        Watch heelWatch = new Watch(limits.maxHeel());
        Watch trimWatch = new Watch(limits.maxTrim());
        for (double minute : schedule.instants()) {
            double[] moved = moved(schedule.gained(minute));
            heelWatch.see(startHeel - moved[Response.SLOPE_Y]);
            trimWatch.see(startTrim + moved[Response.SLOPE_X]);
        }
        return new Estimate(
                schedule,
                order,
                heelWatch.excess + trimWatch.excess,
                schedule.duration(),
                heelWatch.swing + trimWatch.swing);
    }

    /** Keeps the excess of an angle over its limit, which is never under what the angle has come down to. */
    private static final class Watch {
        private final double limit;
        private double allowed = Double.POSITIVE_INFINITY;
        private double excess;
        private double swing;

        Watch(OptionalDouble limit) {
            this.limit = limit.orElse(Double.POSITIVE_INFINITY);
        }

        void see(double slope) {
            double angle = Math.toDegrees(Math.atan(Math.abs(slope)));
            excess = Math.max(excess, allowed == Double.POSITIVE_INFINITY ? 0 : angle - allowed);
            allowed = Math.max(limit, Math.min(allowed, angle));
            swing = Math.max(swing, angle);
        }
    }

    private double[] moved(Map<String, Double> gained) {
        double[] sum = new double[3];
        gained.forEach((tank, gain) -> {
            double[] one = perTonne.getOrDefault(tank, sum);
            for (int i = 0; i < sum.length; i++) {
                sum[i] += gain * one[i];
            }
        });
        return sum;
    }

    /** The answer to a tonne in a tank, where the tank's middle is. */
    private static double[] perTonne(BallastTank tank, Response response) {
        Contents full = new Contents(
                tank.calibration(), tank.density(), tank.calibration().fullVolume(), false);
        double[] answer = response.to(full);
        for (int i = 0; i < answer.length; i++) {
            answer[i] /= full.mass();
        }
        return answer;
    }
}
