package org.evendraft.stability.damage;

import java.util.BitSet;

/**
 * Damage by a collision.
 *
 * @param target what is struck
 * @param window between which heights
 * @param place where along the contour (m)
 * @param opened numbers of the spaces opened to the sea; never changed
 * @param throughBulkheads whether vertical bulkheads are disregarded
 */
record Blow(Target target, Window window, double place, BitSet opened, boolean throughBulkheads) {}
