package org.evendraft.ballast;

import org.evendraft.platform.Condition.FreeSurface;

/**
 * The sea and how free surfaces count.
 *
 * @param density density of the sea (t/m³)
 * @param freeSurface which free-surface moments the correction takes
 */
record Water(double density, FreeSurface freeSurface) {}
