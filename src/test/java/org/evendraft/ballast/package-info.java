/** Tests of ballast plans. */
@NullMarked
package org.evendraft.ballast;

import org.jspecify.annotations.NullMarked;
