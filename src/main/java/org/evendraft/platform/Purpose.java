package org.evendraft.platform;

/** What a tank is for. */
public enum Purpose {
    /** Sea water that a plan may move. */
    BALLAST,
    /** Fuel. */
    FUEL,
    /** Drill water. */
    DRILL_WATER,
    /** Fresh water. */
    FRESH_WATER,
    /** Mud. */
    MUD,
    /** Brine. */
    BRINE,
    /** Any other liquid. */
    OTHER,
    /** A space kept dry. */
    VOID
}
