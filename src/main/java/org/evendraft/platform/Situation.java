package org.evendraft.platform;

/** What a platform must withstand when its stability is judged. */
public enum Situation {
    /** Nothing flooded. */
    INTACT,
    /** Spaces flooded by a blow from outside: the Code's extent of damage, IMO MODU Code 2009, 3.5. */
    COLLISION,
    /** Any one compartment flooded: IMO MODU Code 2009, 3.4.4. */
    FLOODING
}
