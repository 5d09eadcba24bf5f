package org.evendraft.ballast.optimum;

import java.util.List;

/**
 * The best plan found.
 *
 * @param choices the number of each tank's choice
 * @param amounts what each tank gains (t)
 * @param flows through which pumps
 * @param cost its cost (t)
 * @param excess its weighted excess over the rows
 */
public record Optimum(List<Integer> choices, List<Double> amounts, Flows flows, double cost, double excess) {

    /** Copies the lists. */
    public Optimum {
        choices = List.copyOf(choices);
        amounts = List.copyOf(amounts);
    }

    long touched() {
        return choices.stream().filter(choice -> choice > 0).count();
    }
}
