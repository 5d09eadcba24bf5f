/**
 * Vectors, closed solids and their integrals under a plane. Lengths in metres; knows nothing of tonnes, tanks or documents.
 */
@NullMarked
package org.evendraft.geometry;

import org.jspecify.annotations.NullMarked;
