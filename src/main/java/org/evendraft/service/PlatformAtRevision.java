package org.evendraft.service;

import org.evendraft.platform.PreparedPlatform;

/**
 * A stored platform, prepared for computing.
 *
 * @param revision number of its revision, from 1; 0 for one that is not stored
 * @param prepared the platform
 */
public record PlatformAtRevision(int revision, PreparedPlatform prepared) {

    /** The platform's id. */
    public String id() {
        return prepared.platform().id();
    }
}
