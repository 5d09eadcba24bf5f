/** Checks of generated damage cases. */
@NullMarked
package org.evendraft.stability.damage;

import org.jspecify.annotations.NullMarked;
