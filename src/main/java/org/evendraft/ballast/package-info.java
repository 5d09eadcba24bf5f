/** Ballast plans: what to pump where, at the least cost, and in which order. */
@NullMarked
package org.evendraft.ballast;

import org.jspecify.annotations.NullMarked;
