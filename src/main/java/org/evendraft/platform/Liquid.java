package org.evendraft.platform;

import org.evendraft.geometry.SecondMoments;
import org.evendraft.geometry.Vec3;

/**
 * Liquid in a tank with the platform upright, permeability counted.
 *
 * @param level height of the surface over the tank's lowest point, or the table's own level (m)
 * @param volume volume of the liquid (m³)
 * @param centre its centroid (m)
 * @param surface second moments of its surface about the surface's own centroid (m⁴)
 */
public record Liquid(double level, double volume, Vec3 centre, SecondMoments surface) {}
