package org.evendraft.ballast.optimum;

import java.util.List;

/**
 * A tank that can be moved.
 *
 * @param id its name; ties between plans are broken by it
 * @param choices the ways in which it may end, the first one untouched with nil amount and effects
 * @param filledBy numbers of the pumps that can deliver to it
 * @param drawnBy numbers of the pumps that can draw from it
 * @param twin index of its mirror image on the other side, its own where there is none
 */
public record TankModel(String id, List<Choice> choices, List<Integer> filledBy, List<Integer> drawnBy, int twin) {

    /** Copies the lists. */
    public TankModel {
        choices = List.copyOf(choices);
        filledBy = List.copyOf(filledBy);
        drawnBy = List.copyOf(drawnBy);
        if (!choices.get(0).untouched()) {
            throw new IllegalArgumentException("the first choice of " + id + " is not untouched");
        }
    }

    List<Integer> pumpsFor(double amount) {
        return amount > 0 ? filledBy : drawnBy;
    }
}
