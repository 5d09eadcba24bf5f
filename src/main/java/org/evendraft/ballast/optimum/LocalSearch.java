package org.evendraft.ballast.optimum;

import java.util.ArrayList;
import java.util.List;

/** Betters a plan by leaving a tank out, giving a tank another choice, or letting one tank take the place of another. */
final class LocalSearch {
    private static final int UNTOUCHED = 0;
    /** How many neighbours are tried in one search, all starts together. */
    private static final int MOST_TRIED = 2000;

    private final Program program;
    private final Completion completion;
    private final Incumbent incumbent;
    private int tried;

    LocalSearch(Program program, Completion completion, Incumbent incumbent) {
        this.program = program;
        this.completion = completion;
        this.incumbent = incumbent;
    }

    /** Goes on from the best plan until no neighbour is better. */
    void run() {
        boolean better = incumbent.best().isPresent();
        while (better && tried < MOST_TRIED) {
            better = pass(incumbent.best().orElseThrow().choices());
        }
    }

    private boolean pass(List<Integer> choices) {
        boolean better = false;
        for (int t = 0; t < choices.size(); t++) {
            if (choices.get(t) != UNTOUCHED) {
                better |= attempt(choices, t, UNTOUCHED);
                better |= others(choices, t, t);
            }
        }
        for (int t = 0; t < choices.size() && !better; t++) {
            if (choices.get(t) != UNTOUCHED) {
                for (int other = 0; other < choices.size(); other++) {
                    better |= choices.get(other) == UNTOUCHED && others(choices, t, other);
                }
            }
        }
        return better;
    }

    /** Tries every touched choice of a tank, another one left out if it is not the same. */
    private boolean others(List<Integer> choices, int out, int tank) {
        boolean better = false;
        for (int c = 1; c < program.model().tanks().get(tank).choices().size(); c++) {
            List<Integer> changed = new ArrayList<>(choices);
            changed.set(out, UNTOUCHED);
            better |= attempt(changed, tank, c);
        }
        return better;
    }

    private boolean attempt(List<Integer> choices, int tank, int choice) {
        if (tried >= MOST_TRIED) {
            return false;
        }
        tried++;
        List<Integer> changed = new ArrayList<>(choices);
        changed.set(tank, choice);
        return incumbent.offer(completion.of(changed));
    }
}
