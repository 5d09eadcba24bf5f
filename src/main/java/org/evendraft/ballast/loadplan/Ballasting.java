package org.evendraft.ballast.loadplan;

/** When ballast is moved. */
public enum Ballasting {
    /** Never: the sequence is only followed. */
    NONE,
    /** After each event that leaves a limit or the target's tolerance, and before one that would break a limit while it lasts. */
    EACH_EVENT,
    /** Once, before the first event, so that the sequence swings to both sides alike. */
    ONCE
}
