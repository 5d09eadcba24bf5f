/**
 * Load plans: a sequence of events (loads that come aboard, leave, move, hang on the crane's hook; liquids consumed or bunkered; wind), followed
 * from a loading with the exact floating position after each event and at its worst instant, and with ballast plans where they are asked for.
 *
 * <p>An event is done in equal parts. What a part does to the loading is the same whatever the time that it takes: a crane that takes a load
 * off the deck moves its weight from where it stands to the boom tip little by little, and a load half taken is one half way between the
 * two, for the first moments of mass are the same. Every part is looked at with its own floating position, liquids free, in the wind of that
 * moment.
 */
@NullMarked
package org.evendraft.ballast.loadplan;

import org.jspecify.annotations.NullMarked;
