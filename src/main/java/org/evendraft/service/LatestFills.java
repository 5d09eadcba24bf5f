package org.evendraft.service;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** Puts the tanks' latest readings in the place of {@code "fills": "latest"}. */
final class LatestFills {
    private static final String FILLS = "fills";
    private static final String LATEST = "latest";

    private final ReadTankStates tankStates;

    LatestFills(ReadTankStates tankStates) {
        this.tankStates = tankStates;
    }

    /**
     * A condition's document with its fills.
     *
     * @param document the document
     * @param warnings sentences on readings that are old or missing
     */
    record Filled(JsonNode document, List<String> warnings) {}

    /** The document with the readings, or as it is when it does not ask for them. */
    Filled fill(PlatformAtRevision platform, JsonNode document) {
        return fill(platform, document, "taken as empty");
    }

    /**
     * The document with the readings, or as it is when it does not ask for them.
     *
     * @param otherwise what becomes of tanks without a reading, in words
     */
    Filled fill(PlatformAtRevision platform, JsonNode document, String otherwise) {
        if (!LATEST.equals(document.path(FILLS).textValue())) {
            return new Filled(document, List.of());
        }
        ObjectNode filled = ((ObjectNode) document).deepCopy();
        ArrayNode fills = filled.putArray(FILLS);
        List<String> missing = new ArrayList<>();
        List<String> old = new ArrayList<>();
        for (TankStatus status : tankStates.of(platform)) {
            Optional<TankStatus.Reading> reading = status.reading();
            reading.ifPresent(r -> fills.addObject()
                    .put("tank", status.tank())
                    .put("volume", Math.min(r.volume(), status.fullVolume()))
                    .put("density", r.density()));
            if (reading.isEmpty()) {
                missing.add(status.tank());
            } else if (reading.get().old()) {
                old.add(status.tank());
            }
        }
        return new Filled(filled, warnings(missing, old, otherwise));
    }

    private static List<String> warnings(List<String> missing, List<String> old, String otherwise) {
        List<String> warnings = new ArrayList<>();
        if (!missing.isEmpty()) {
            warnings.add("No reading of " + tanks(missing) + ": " + otherwise + ".");
        }
        if (!old.isEmpty()) {
            warnings.add("The latest reading of " + tanks(old) + " is more than " + TankStatus.OLD.toHours()
                    + " hours old.");
        }
        return warnings;
    }

    private static String tanks(List<String> ids) {
        return (ids.size() == 1 ? "tank " : "tanks ") + String.join(", ", ids);
    }
}
