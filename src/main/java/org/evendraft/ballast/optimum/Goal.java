package org.evendraft.ballast.optimum;

/** What is to be least. */
public sealed interface Goal {
    /** The cost, all rows met. */
    record Cost() implements Goal {}

    /** The weighted excess over the rows. */
    record Excess() implements Goal {}

    /**
     * The cost, the weighted excess kept under a bound.
     *
     * @param most the greatest excess
     */
    record CostWithinExcess(double most) implements Goal {}
}
