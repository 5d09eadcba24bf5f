/** The program: reads its configuration, puts the rooms together by hand and starts a command. */
@NullMarked
package org.evendraft;

import org.jspecify.annotations.NullMarked;
