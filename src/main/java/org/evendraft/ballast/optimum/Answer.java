package org.evendraft.ballast.optimum;

import java.util.Optional;

/**
 * What the optimiser came to.
 *
 * @param best the best plan found, if any
 * @param bound no plan of the model is better than this, in the unit of the goal; infinite when there is none at all
 * @param nodes how many nodes were looked at
 */
public record Answer(Optional<Optimum> best, double bound, int nodes) {}
