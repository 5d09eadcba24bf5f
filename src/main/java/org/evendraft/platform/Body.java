package org.evendraft.platform;

import org.evendraft.geometry.Solid;

/**
 * A closed body of a hull, a tank or a compartment.
 *
 * @param name its name in messages
 * @param cutOut whether it is taken off (moonpool, sea chest)
 * @param solid its shape
 */
public record Body(String name, boolean cutOut, Solid solid) {}
