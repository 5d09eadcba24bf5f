package org.evendraft.ballast.optimum;

import java.util.List;

/**
 * One way in which a tank may end.
 *
 * @param kind what it is
 * @param fixedCost what it costs before anything is pumped (t)
 * @param points the ends it allows, amounts rising; all amounts of one sign, nil included
 */
public record Choice(Kind kind, double fixedCost, List<Point> points) {

    /** What a choice is. */
    public enum Kind {
        /** Left alone. */
        UNTOUCHED,
        /** Down to what pumps leave behind. */
        STRIPPED,
        /** Between. */
        SLACK,
        /** From the pressed-up fraction upwards. */
        PRESSED_UP
    }

    /** Copies the list. */
    public Choice {
        points = List.copyOf(points);
    }

    /** Whether the tank is left alone. */
    public boolean untouched() {
        return kind == Kind.UNTOUCHED;
    }

    double least() {
        return points.get(0).amount();
    }

    double greatest() {
        return points.get(points.size() - 1).amount();
    }
}
