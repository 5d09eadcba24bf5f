package org.evendraft.platform;

import org.evendraft.geometry.Vec3;

/**
 * An opening through which water may enter.
 *
 * @param id its name
 * @param position where it is (m)
 * @param closing how it can be closed
 */
public record Opening(String id, Vec3 position, Closing closing) {

    /** How an opening can be closed. */
    public enum Closing {
        /** Not at all. */
        NONE,
        /** No water enters in any sea state. */
        WEATHERTIGHT,
        /** No water passes under its design head. */
        WATERTIGHT
    }
}
