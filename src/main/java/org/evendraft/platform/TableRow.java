package org.evendraft.platform;

import org.evendraft.geometry.SecondMoments;
import org.evendraft.geometry.Vec3;

/**
 * A row of a calibration table, the platform upright.
 *
 * @param level height of the surface over the tank's lowest point, or the table's own level (m)
 * @param volume volume of the liquid (m³)
 * @param centre centroid of the liquid in platform axes (m)
 * @param surface second moments of the free surface about its own centroid (m⁴)
 */
public record TableRow(double level, double volume, Vec3 centre, SecondMoments surface) {}
