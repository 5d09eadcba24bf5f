/**
 * What a floating platform is made of and carries: records of the documents, reading them with every fault listed, and the
 * tables of its tanks. Units and axes as in README: metres, tonnes, t/m³, degrees; x forward, y to port, z up from the keel.
 */
@NullMarked
package org.evendraft.platform;

import org.jspecify.annotations.NullMarked;
