package org.evendraft.ballast;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import org.evendraft.ballast.optimum.Flows;
import org.evendraft.platform.Pump;

/**
 * Water to be moved from one end to another, no pump and no time chosen yet.
 *
 * @param from id of the tank, or sea
 * @param to id of the tank, or sea
 * @param mass what is moved (t)
 */
record Transfer(String from, String to, double mass) {
    /** Smaller amounts are rounding (t). */
    private static final double NOTHING = 1e-6;

    /** The transfers that make up the flows of all pumps. */
    static List<Transfer> of(Plant plant, Flows flows) {
        List<Transfer> transfers = new ArrayList<>();
        for (int p = 0; p < plant.groups().size(); p++) {
            List<Share> sources = new ArrayList<>(List.of(new Share(Pump.SEA, flows.fromSea(p))));
            List<Share> sinks = new ArrayList<>(List.of(new Share(Pump.SEA, flows.toSea(p))));
            for (int t = 0; t < plant.tanks().size(); t++) {
                double gained = flows.gained(t, p);
                (gained < 0 ? sources : sinks)
                        .add(new Share(plant.tanks().get(t).id(), Math.abs(gained)));
            }
            pair(sources, sinks, transfers);
        }
        return transfers;
    }

    private record Share(String id, double mass) {
        static final Comparator<Share> LARGEST_FIRST =
                Comparator.comparingDouble(Share::mass).reversed().thenComparing(Share::id);

        boolean same(Share other) {
            return Math.abs(mass - other.mass) < NOTHING;
        }
    }

    /** Pairs equal amounts first, then always the largest with the largest: at most one transfer fewer than there are ends. */
    private static void pair(List<Share> sources, List<Share> sinks, List<Transfer> transfers) {
        sources.removeIf(end -> end.mass() < NOTHING);
        sinks.removeIf(end -> end.mass() < NOTHING);
        sources.sort(Share.LARGEST_FIRST);
        sinks.sort(Share.LARGEST_FIRST);
        for (Share source : List.copyOf(sources)) {
            sinks.stream().filter(source::same).findFirst().ifPresent(sink -> {
                transfers.add(new Transfer(source.id(), sink.id(), source.mass()));
                sources.remove(source);
                sinks.remove(sink);
            });
        }
        while (!sources.isEmpty() && !sinks.isEmpty()) {
            Share source = sources.remove(0);
            Share sink = sinks.remove(0);
            double mass = Math.min(source.mass(), sink.mass());
            transfers.add(new Transfer(source.id(), sink.id(), mass));
            putBack(sources, source, mass);
            putBack(sinks, sink, mass);
        }
    }

    private static void putBack(List<Share> ends, Share end, double used) {
        if (end.mass() - used >= NOTHING) {
            ends.add(new Share(end.id(), end.mass() - used));
            ends.sort(Share.LARGEST_FIRST);
        }
    }

    /** Whether a pump can do it. */
    boolean possibleOn(Pump pump) {
        return pump.from().contains(from) && pump.to().contains(to);
    }

    /** One of a number of equal parts of it. */
    Transfer part(int parts) {
        return new Transfer(from, to, mass / parts);
    }

    /** Whether it works on a tank that another one works on. */
    boolean sharesTank(Transfer other) {
        return uses(other.from) || uses(other.to);
    }

    private boolean uses(String end) {
        return !end.equals(Pump.SEA) && (end.equals(from) || end.equals(to));
    }
}
