package org.evendraft.ballast;

/** A row of the optimiser's model: a function, linear in the tanks, that must stay at or under a bound. */
sealed interface Coupling permits PositionRow, MetacentricRow {

    /** The name of the limit. */
    String limit();

    /** What a liquid alone adds. */
    double effect(Contents liquid);

    /** What is left under the bound with everything as at the start; negative when it is over. */
    double room();

    /** What an excess of one unit counts when the target cannot be met. */
    double weight();

    /** An error of this size from straight lines between points does not matter. */
    double negligible();

    /** How far the exact state is over the bound, in the row's unit. */
    double over(ExactState state);
}
