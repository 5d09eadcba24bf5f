/** Tests of load plans. */
@NullMarked
package org.evendraft.ballast.loadplan;

import org.jspecify.annotations.NullMarked;
