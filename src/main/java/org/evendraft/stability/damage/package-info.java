/** Damage cases that follow from the extents of damage in the published rules: which tanks and compartments a collision opens to the sea. */
@NullMarked
package org.evendraft.stability.damage;

import org.jspecify.annotations.NullMarked;
