package org.evendraft.ballast.loadplan;

import java.util.OptionalDouble;
import org.evendraft.platform.Condition;
import org.evendraft.platform.PreparedPlatform;
import org.evendraft.stability.LoadedPlatform;

/**
 * What a sequence, or a part of it, comes to from one loading.
 *
 * @param followed how many events the platform floats through
 * @param misses by how much limits that ballast can mend are missed, all added up (degrees, m)
 * @param swing between which angles the platform swings, the start counted
 * @param worst its worst instants, the start counted
 */
record Trial(int followed, double misses, Swing swing, Worst worst) {
    /** Differences of less than this are rounding (degrees, m). */
    private static final double ROUNDING = 1e-6;

    /**
     * Before any event.
     *
     * @throws LostException when the platform finds no rest so
     */
    static Trial at(PreparedPlatform prepared, Condition start, SteadyWind wind) {
        Instant at =
                Instant.of(0, OptionalDouble.empty(), "start", Stance.of(LoadedPlatform.of(prepared, start), wind));
        return new Trial(0, 0, Swing.of(at), Worst.of(at));
    }

    Trial and(Passage passage) {
        double more = passage.broken().stream().mapToDouble(Breach::lack).sum();
        return new Trial(followed + 1, misses + more, swing.and(passage.swing()), worst.and(passage.worst()));
    }

    Trial and(Passage passage, Position position) {
        Trial through = and(passage);
        double more = position.limits().stream().mapToDouble(Restoring::lack).sum();
        return new Trial(through.followed, through.misses + more, through.swing, through.worst);
    }

    /** Whether it goes further, or as far with limits missed by less. */
    boolean saferThan(Trial other) {
        return followed > other.followed || (followed == other.followed && misses < other.misses - ROUNDING);
    }

    /** Whether it is as safe and swings the platform less. */
    boolean gentlerThan(Trial other) {
        return !other.saferThan(this) && swing.greatest() < other.swing.greatest() - ROUNDING;
    }
}
