package org.evendraft.service;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.List;
import java.util.OptionalInt;
import org.evendraft.platform.Fault;
import org.evendraft.platform.FaultyDocumentException;
import org.evendraft.platform.Platform;
import org.evendraft.platform.PlatformReader;
import org.evendraft.store.PlatformRepository;
import org.evendraft.store.RevisionSaving;

/** Stores a platform as a new revision; each is kept. */
public final class StorePlatform {
    private final PlatformRepository platforms;

    StorePlatform(PlatformRepository platforms) {
        this.platforms = platforms;
    }

    /**
     * What has been stored. Component names are those of the JSON.
     *
     * @param id the platform's id
     * @param revision the revision's number, from 1
     */
    public record StoredRevision(String id, int revision) {}

    /**
     * Checks a platform.
     *
     * @param id the id that it must have
     * @param text the document as it came
     * @param document the same, parsed
     * @param expected the revision that it replaces, 0 when there must be none yet; empty for whichever is there
     * @throws FaultyDocumentException with all faults
     */
    public Pending<StoredRevision> prepare(String id, String text, JsonNode document, OptionalInt expected) {
        Platform platform = PlatformReader.read(document).platform();
        if (!platform.id().equals(id)) {
            String detail = "id is " + platform.id() + ", and the address says " + id;
            throw new FaultyDocumentException(List.of(new Fault("/id", detail, Fault.Kind.MEANING)));
        }
        return new Pending<>(handle -> outcome(id, platforms.save(handle, platform, text, expected)));
    }

    private static StoredRevision outcome(String id, RevisionSaving saving) {
        if (saving instanceof RevisionSaving.Saved saved) {
            return new StoredRevision(id, saved.revision());
        }
        int current = ((RevisionSaving.Stale) saving).current();
        throw new Refusal(
                Reason.STALE,
                current == 0
                        ? "There is no platform " + id + " yet."
                        : "Platform " + id + " is at revision " + current + "; read it and make your change again.");
    }
}
