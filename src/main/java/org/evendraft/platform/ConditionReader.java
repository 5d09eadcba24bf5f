package org.evendraft.platform;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.List;
import java.util.Optional;

/** Reads a condition document and checks it against its platform. */
public final class ConditionReader {
    private ConditionReader() {}

    /**
     * Reads a condition.
     *
     * @param document the document, as {@link Json#parse} gives it
     * @param platform the platform that it is of
     * @throws FaultyDocumentException with all faults
     */
    public static Condition read(JsonNode document, PreparedPlatform platform) {
        Faults faults = new Faults();
        Fields fields = Fields.of(document, "", faults);
        Condition condition = new Condition(
                fields.text("name", "unnamed"),
                mode(fields, platform.platform().modes()),
                fields.number("waterDensity", Range.DENSITY, platform.platform().waterDensity()),
                fields.choice("freeSurface", Condition.FreeSurface.class, Condition.FreeSurface.ACTUAL),
                FillReader.read(fields.objects("fills"), platform),
                LoadReader.read(fields.objects("loads"), platform.platform().deckAreas()));
        fields.noOthers();
        faults.throwIfAny();
        return condition;
    }

    /**
     * Reads the id of a mode, where one is given.
     *
     * @param fields what may give it, under its usual name
     * @param modes the platform's modes
     */
    public static Optional<Mode> mode(Fields fields, List<Mode> modes) {
        Optional<String> id = fields.optionalText("mode");
        Optional<Mode> mode = id.flatMap(
                wanted -> modes.stream().filter(m -> m.id().equals(wanted)).findFirst());
        if (id.isPresent() && !id.get().isBlank() && mode.isEmpty()) {
            fields.meaning(
                    "mode",
                    "there is no mode " + Words.quote(id.get()) + "; known: "
                            + Words.few(modes.stream().map(Mode::id).toList()));
        }
        return mode;
    }
}
