/**
 * The optimiser of ballast plans, on plain arrays: which tanks to touch, how far, through which pumps, at the least cost.
 *
 * <h2>The model</h2>
 *
 * <p>Each tank that can be moved ends in exactly one of a few {@linkplain org.evendraft.ballast.optimum.Choice choices}: untouched,
 * stripped, slack, pressed up; the last three once for losing and once for gaining water. A choice has a fixed cost (touch and slack
 * penalty) and a polyline of points: the amount gained and the effects on the coupling rows, linear between points. Variables are
 * the shares {@code λ} of the points, one set of them for each pump that can move that amount, so that
 *
 * <ul>
 *   <li>one row a tank says that its shares add up to 1 (the convex hull of its choices: far tighter than a switch with a big
 *       constant for each tank);
 *   <li>one row for each effect says that all effects together stay under its bound (draft, heel and trim under and over their
 *       bands, metacentric heights over their bounds);
 *   <li>one row for each pump says that what it draws equals what it delivers, the sea being a free end where it has one.
 * </ul>
 *
 * The cost is the fixed cost of the choices plus the mass that the pumps draw, so that a transfer from tank to tank counts once. A tank
 * is either filled or drawn from, never both.
 *
 * <h2>The method</h2>
 *
 * <p>{@link org.evendraft.ballast.optimum.Optimiser} is a branch and bound over the choices, best bound first. Bounds come from the linear
 * program, solved by a dual simplex method that starts from the parent's basis, and are computed from its row prices by weak duality,
 * so that rounding cannot spoil them. The same prices give each point of each tank a cost of using it: points that cost more than the
 * best plan known are cut off, which shortens the polylines and lifts the bound. Where a polyline is not convex and
 * the program mixes points that are not neighbours, the polyline itself is split. Limits are numbers of nodes, never time: the same
 * question has the same answer.
 */
@NullMarked
package org.evendraft.ballast.optimum;

import org.jspecify.annotations.NullMarked;
