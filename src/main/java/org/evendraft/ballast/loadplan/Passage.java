package org.evendraft.ballast.loadplan;

import java.util.EnumMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.evendraft.platform.Condition;
import org.evendraft.platform.PreparedPlatform;
import org.evendraft.stability.LoadedPlatform;

/**
 * What an event does while it lasts.
 *
 * @param worst its worst instants
 * @param swing between which angles it swings the platform
 * @param broken the operation limits that it breaks
 */
record Passage(Worst worst, Swing swing, List<Breach> broken) {
    /** Parts in which an event is followed: 5° each when a crane slews through half a turn, the most that the shorter way takes. */
    static final int PARTS = 36;

    private static final double PERCENT = 100;

    /**
     * Follows an event from the loading before it to its end.
     *
     * @param number the event's number, from 1
     * @throws LostException when the platform finds no rest
     */
    static Passage follow(
            PreparedPlatform prepared, Condition before, SteadyWind wind, int number, PlannedEvent planned) {
        Gathering gathering = new Gathering(planned);
        for (int k = 1; k <= PARTS; k++) {
            double part = (double) k / PARTS;
            LoadedPlatform loaded = LoadedPlatform.of(prepared, planned.event().at(before, part))
                    .withMoving(moving(planned, part));
            gathering.add(Instant.of(number, planned.minute(), what(planned.event(), part), Stance.of(loaded, wind)));
        }
        return gathering.passage();
    }

    /** While a pump works on a tank its surface is free, however full it is. */
    private static Set<String> moving(PlannedEvent planned, double part) {
        return planned.event() instanceof TankChange change && part < 1
                ? Set.of(change.end().tank())
                : Set.of();
    }

    private static String what(LoadEvent event, double part) {
        return part == 1 ? event.done() : String.format(Locale.ROOT, "%s, %.0f %% done", event.doing(), PERCENT * part);
    }

    private static final class Gathering {
        private final PlannedEvent planned;
        private final Map<Watched, Breach> broken = new EnumMap<>(Watched.class);
        private Optional<Worst> worst = Optional.empty();
        private Optional<Swing> swing = Optional.empty();

        Gathering(PlannedEvent planned) {
            this.planned = planned;
        }

        void add(Instant at) {
            Worst here = Worst.of(at);
            worst = Optional.of(worst.map(w -> w.and(here)).orElse(here));
            Swing now = Swing.of(at);
            swing = Optional.of(swing.map(s -> s.and(now)).orElse(now));
            for (Watched watched : Watched.values()) {
                watched.breach(at, planned.limits())
                        .ifPresent(breach -> broken.merge(watched, breach, (a, b) -> b.lack() > a.lack() ? b : a));
            }
        }

        Passage passage() {
            return new Passage(worst.orElseThrow(), swing.orElseThrow(), List.copyOf(broken.values()));
        }
    }
}
