/**
 * Ballast plans: what to pump where, at the least cost, and in which order.
 *
 * <p>{@link org.evendraft.ballast.BallastPlanner} works in four steps.
 *
 * <ol>
 *   <li>{@code TargetModel} makes the optimiser's model. Its rows ({@code Coupling}) are: draft, trim and heel each at most at the upper and at least
 *       at the lower face of its band ({@code PositionRow}; {@code Response} says why a row taken at the face is exact there), and the two metacentric
 *       heights on even keel ({@code MetacentricRow}) by every tank's true vertical moment and free surface. {@code TankLine} turns each tank's
 *       contents into polylines, one for each way in which it may end.
 *   <li>{@link org.evendraft.ballast.optimum.Optimiser} finds the cheapest end state and a bound that proves it.
 *   <li>{@code TargetSearch} computes where the platform then floats exactly and corrects the rows until that is inside the tolerance.
 *       A target that cannot be met is approached: the rows are taken at the position reached, the weighted sum of the excesses is made
 *       least, and so on until nothing is gained; then the cheapest plan with that excess is taken.
 *   <li>{@code Transfer} pairs what pumps draw and deliver, {@code Ordering} tries orders and, where a limit is passed, parts of
 *       moves, and {@code Path} follows the exact state through the schedule.
 * </ol>
 */
@NullMarked
package org.evendraft.ballast;

import org.jspecify.annotations.NullMarked;
