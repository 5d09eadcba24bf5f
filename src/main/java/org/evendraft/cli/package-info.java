/** The commands: JSON alone on standard output, problems as JSON on standard error, exit status 2 for bad input and 3 for what cannot be met. */
@NullMarked
package org.evendraft.cli;

import org.jspecify.annotations.NullMarked;
