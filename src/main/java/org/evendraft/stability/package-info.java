/** How a loaded platform floats, with what reserve: hydrostatics, free surface, floating position, limits. Angles in radians inside, degrees in results. */
@NullMarked
package org.evendraft.stability;

import org.jspecify.annotations.NullMarked;
