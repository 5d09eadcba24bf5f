package org.evendraft.stability;

/** How righting arms count the liquid in slack tanks. */
public enum LiquidTreatment {
    /** Every surface stays level with the sea and the liquid's centroid moves: exact. */
    FREE,
    /** Liquids stay as on even keel and G is raised by the free-surface correction about the axis, at the actual levels. */
    ACTUAL_MOMENT,
    /** The same with each tank's greatest moment. */
    MAXIMUM_MOMENT
}
