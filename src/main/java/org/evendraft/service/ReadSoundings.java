package org.evendraft.service;

import java.util.List;
import java.util.OptionalInt;
import org.evendraft.store.Database;
import org.evendraft.store.Page;
import org.evendraft.store.PageRequest;
import org.evendraft.store.SoundingQuery;
import org.evendraft.store.SoundingRepository;
import org.evendraft.store.StoredSounding;

/** The history of tank readings. */
public final class ReadSoundings {
    private final Database database;
    private final PlatformShelf shelf;
    private final SoundingRepository soundings;

    ReadSoundings(Database database, PlatformShelf shelf, SoundingRepository soundings) {
        this.database = database;
        this.shelf = shelf;
        this.soundings = soundings;
    }

    /**
     * Part of the history. Component names are those of the JSON.
     *
     * @param readings the readings, latest first
     * @param total how many there are in all
     * @param limit the most that were asked for
     * @param offset how many were passed over
     */
    public record History(List<SoundingRecord> readings, long total, int limit, long offset) {

        /** Copies the list. */
        public History {
            readings = List.copyOf(readings);
        }
    }

    /**
     * The readings that a query asks for.
     *
     * @throws Refusal when there is no such platform
     */
    public History history(SoundingQuery query, PageRequest request) {
        shelf.stored(query.platformId(), OptionalInt.empty());
        Page<SoundingRecord> page = database.read(handle -> soundings.history(handle, query, request))
                .map(StoredSounding::sounding)
                .map(SoundingRecord::of);
        return new History(page.items(), page.total(), request.limit(), request.offset());
    }
}
