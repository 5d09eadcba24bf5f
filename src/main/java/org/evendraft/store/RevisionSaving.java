package org.evendraft.store;

/** What became of a new revision of a platform. */
public sealed interface RevisionSaving {
    /**
     * It is stored.
     *
     * @param revision its number
     */
    record Saved(int revision) implements RevisionSaving {}

    /**
     * It was made from a revision that is not the current one; nothing is stored.
     *
     * @param current the current revision, 0 when there is no such platform
     */
    record Stale(int current) implements RevisionSaving {}
}
