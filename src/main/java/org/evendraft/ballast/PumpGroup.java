package org.evendraft.ballast;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import org.evendraft.platform.Pump;

/**
 * Pumps that count as one when masses are planned: a pump whose ends another one has too can do nothing that the other cannot.
 *
 * @param from ends that it draws from
 * @param to ends that it delivers to
 */
record PumpGroup(Set<String> from, Set<String> to) {

    PumpGroup {
        from = Set.copyOf(from);
        to = Set.copyOf(to);
    }

    /** The groups of a platform's pumps, ends that no plan may use left out. */
    static List<PumpGroup> of(List<Pump> pumps, Set<String> ends) {
        List<PumpGroup> groups = new ArrayList<>();
        List<Pump> byName =
                pumps.stream().sorted(Comparator.comparing(Pump::id)).toList();
        for (Pump pump : byName) {
            PumpGroup group = new PumpGroup(kept(pump.from(), ends), kept(pump.to(), ends));
            if (groups.stream().noneMatch(group::within)) {
                groups.removeIf(other -> other.within(group));
                groups.add(group);
            }
        }
        return groups;
    }

    private static Set<String> kept(List<String> names, Set<String> ends) {
        Set<String> kept = new HashSet<>(names);
        kept.retainAll(ends);
        return kept;
    }

    private boolean within(PumpGroup other) {
        return other.from.containsAll(from) && other.to.containsAll(to);
    }
}
