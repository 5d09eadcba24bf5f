package org.evendraft.ballast;

import org.evendraft.ballast.optimum.Optimum;

/**
 * An end state that the search came to.
 *
 * @param plan the optimiser's plan
 * @param end where that leaves the platform
 * @param bound no plan of the model costs less (t), tanks that cannot be moved not counted
 */
record Found(Optimum plan, End end, double bound) {}
