package org.evendraft.service;

import java.util.List;
import java.util.OptionalInt;
import org.evendraft.store.Database;
import org.evendraft.store.PlatformRepository;
import org.evendraft.store.PlatformSummary;
import org.evendraft.store.StoredPlatform;

/** Reads and lists stored platforms. */
public final class ReadPlatforms {
    private final Database database;
    private final PlatformRepository platforms;
    private final PlatformShelf shelf;

    ReadPlatforms(Database database, PlatformRepository platforms, PlatformShelf shelf) {
        this.database = database;
        this.platforms = platforms;
        this.shelf = shelf;
    }

    /**
     * All platforms. The component's name is that of the JSON.
     *
     * @param platforms each by its current revision
     */
    public record PlatformList(List<PlatformSummary> platforms) {

        /** Copies the list. */
        public PlatformList {
            platforms = List.copyOf(platforms);
        }
    }

    /** All platforms. */
    public PlatformList list() {
        return new PlatformList(database.read(platforms::list));
    }

    /**
     * A platform as it was stored.
     *
     * @param revision its revision; empty for the current one
     * @throws Refusal when there is none
     */
    public StoredPlatform read(String id, OptionalInt revision) {
        return shelf.stored(id, revision);
    }
}
