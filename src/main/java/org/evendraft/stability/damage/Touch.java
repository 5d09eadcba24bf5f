package org.evendraft.stability.damage;

import java.util.BitSet;

/**
 * What damage at one place and height of the shell touches.
 *
 * @param shell whether there is shell at all
 * @param exposed whether a collision can reach it
 * @param first number of the space next to the shell; {@link #NO_SPACE} for none within reach
 * @param reached numbers of all spaces within reach; never changed
 */
record Touch(boolean shell, boolean exposed, int first, BitSet reached) {
    /** No space. */
    static final int NO_SPACE = -1;

    /** No shell here. */
    static final Touch NO_SHELL = new Touch(false, false, NO_SPACE, new BitSet());

    /** No space near; whether a collision can reach the shell does not matter then. */
    static final Touch NO_SPACES = new Touch(true, false, NO_SPACE, new BitSet());

    /** Adds what a collision opens here. */
    void addTo(BitSet opened) {
        if (exposed) {
            opened.or(reached);
        }
    }

    /** Whether a vertical bulkhead at the shell parts this place from the next. */
    boolean isPartedFrom(Touch next) {
        return shell && next.shell && first != next.first;
    }
}
