package org.evendraft.service;

import com.fasterxml.jackson.databind.JsonNode;
import java.time.Clock;
import java.time.Instant;
import java.time.temporal.ChronoUnit;
import java.util.ArrayList;
import java.util.List;
import org.evendraft.platform.Faults;
import org.evendraft.platform.FaultyDocumentException;
import org.evendraft.platform.Fields;
import org.evendraft.platform.PreparedPlatform;
import org.evendraft.store.Sounding;
import org.evendraft.store.SoundingBatch;
import org.evendraft.store.SoundingRepository;

/** Records a batch of tank readings; the figures that were not read follow from the tank's calibration. */
public final class RecordSoundings {
    private static final String READINGS = "readings";
    private static final String SOURCE = "source";

    private final PlatformShelf shelf;
    private final SoundingRepository soundings;
    private final Clock clock;

    RecordSoundings(PlatformShelf shelf, SoundingRepository soundings, Clock clock) {
        this.shelf = shelf;
        this.soundings = soundings;
        this.clock = clock;
    }

    /**
     * A batch that is stored. Component names are those of the JSON.
     *
     * @param id the batch's id
     * @param recordedAt when it was stored
     * @param platformRevision the revision whose calibration was used
     * @param readings the readings, with all figures
     */
    public record RecordedBatch(String id, Instant recordedAt, int platformRevision, List<SoundingRecord> readings) {

        /** Copies the list. */
        public RecordedBatch {
            readings = List.copyOf(readings);
        }
    }

    /**
     * Checks a batch.
     *
     * @throws Refusal when there is no such platform
     * @throws FaultyDocumentException with all that is wrong with the batch
     */
    public Pending<RecordedBatch> prepare(String platform, JsonNode document) {
        PlatformAtRevision current = shelf.current(platform);
        List<Sounding> read = read(document, current.prepared());
        return new Pending<>(handle -> {
            SoundingBatch batch = soundings.save(handle, platform, current.revision(), read);
            List<SoundingRecord> records = read.stream().map(SoundingRecord::of).toList();
            return new RecordedBatch(batch.id(), batch.recordedAt(), current.revision(), records);
        });
    }

    private List<Sounding> read(JsonNode document, PreparedPlatform platform) {
        Faults faults = new Faults();
        Fields fields = Fields.of(document, "", faults);
        String source = fields.text(SOURCE, "unknown");
        List<Sounding> read = new ArrayList<>();
        Instant now = clock.instant().truncatedTo(ChronoUnit.MILLIS);
        int i = 0;
        for (Fields reading : fields.someObjects(READINGS)) {
            SoundingReader reader = new SoundingReader(
                    platform, reading, document.path(READINGS).path(i++));
            reader.read(source, now).ifPresent(read::add);
        }
        fields.noOthers();
        faults.throwIfAny();
        return read;
    }
}
