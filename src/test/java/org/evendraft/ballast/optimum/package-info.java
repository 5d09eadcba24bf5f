/** Tests of the optimiser on plain arrays. */
@NullMarked
package org.evendraft.ballast.optimum;

import org.jspecify.annotations.NullMarked;
