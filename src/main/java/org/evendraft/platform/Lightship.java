package org.evendraft.platform;

import org.evendraft.geometry.Vec3;

/**
 * The empty platform.
 *
 * @param mass mass (t)
 * @param centre centre of gravity (m)
 */
public record Lightship(double mass, Vec3 centre) {}
