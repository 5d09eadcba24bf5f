package org.evendraft.service;

import java.nio.charset.StandardCharsets;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.OptionalInt;
import org.evendraft.platform.Json;
import org.evendraft.platform.PlatformReader;
import org.evendraft.platform.PreparedPlatform;
import org.evendraft.store.Database;
import org.evendraft.store.PlatformRepository;
import org.evendraft.store.StoredPlatform;
import org.jspecify.annotations.Nullable;

/** Takes platforms out of the store and keeps the few used last prepared, for preparing takes longer than computing. */
final class PlatformShelf {
    /** A platform of a million triangles takes some hundred megabytes; those of one fleet that are worked on at once are few. */
    private static final int ROOM = 8;

    private final Database database;
    private final PlatformRepository platforms;
    private final Map<Place, PreparedPlatform> shelf = new LinkedHashMap<>(ROOM, 1, true) {
        private static final long serialVersionUID = 1L;

        @Override
        protected boolean removeEldestEntry(Map.Entry<Place, PreparedPlatform> eldest) {
            return size() > ROOM;
        }
    };

    private record Place(String id, int revision) {}

    PlatformShelf(Database database, PlatformRepository platforms) {
        this.database = database;
        this.platforms = platforms;
    }

    /**
     * A stored document.
     *
     * @param revision its revision; empty for the current one
     * @throws Refusal when there is none
     */
    StoredPlatform stored(String id, OptionalInt revision) {
        return database.read(handle -> revision.isPresent()
                        ? platforms.find(handle, id, revision.getAsInt())
                        : platforms.findLatest(handle, id))
                .orElseThrow(() -> missing(id, revision));
    }

    private static Refusal missing(String id, OptionalInt revision) {
        return Refusal.notFound(
                revision.isPresent()
                        ? "There is no revision " + revision.getAsInt() + " of a platform " + id + "."
                        : "There is no platform " + id + ".");
    }

    /**
     * The current revision of a platform, prepared.
     *
     * @throws Refusal when there is no such platform
     */
    PlatformAtRevision current(String id) {
        return prepared(stored(id, OptionalInt.empty()));
    }

    /**
     * A revision of a platform, prepared.
     *
     * @throws Refusal when there is none
     */
    PlatformAtRevision at(String id, int revision) {
        PreparedPlatform ready = onShelf(new Place(id, revision));
        return ready != null ? new PlatformAtRevision(revision, ready) : prepared(stored(id, OptionalInt.of(revision)));
    }

    private PlatformAtRevision prepared(StoredPlatform stored) {
        Place place = new Place(stored.id(), stored.revision());
        PreparedPlatform ready = onShelf(place);
        if (ready == null) {
            byte[] document = stored.document().getBytes(StandardCharsets.UTF_8);
            ready = PlatformReader.read(Json.parse(document));
            synchronized (shelf) {
                shelf.put(place, ready);
            }
        }
        return new PlatformAtRevision(stored.revision(), ready);
    }

    private @Nullable PreparedPlatform onShelf(Place place) {
        synchronized (shelf) {
            return shelf.get(place);
        }
    }
}
