package org.evendraft.stability;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.IntStream;
import org.evendraft.platform.Faults;
import org.evendraft.platform.FaultyDocumentException;
import org.evendraft.platform.Fields;
import org.evendraft.platform.Mode;
import org.evendraft.platform.PreparedPlatform;
import org.evendraft.platform.Range;

/** Reads what limits of KG are wanted. */
public final class KgRequestReader {
    /** Winds beyond this are none that blow (m/s). */
    private static final Range WIND = new Range(0, false, 150);

    /** How far, without drafts given, the line between two drafts may allow too much (m). */
    private static final double USUAL_REFINEMENT = 0.01;

    private static final int MOST_DRAFTS = 200;
    /** Drafts over a mode's range when none are given. */
    private static final int USUAL_DRAFTS = 5;

    private KgRequestReader() {}

    /** Which damage is to be survived. */
    public enum Damage {
        /** None. */
        NONE,
        /** The cases that the platform's document lists. */
        LISTED,
        /** Those of the Code's extents of damage at the drafts of the mode, and flooding of any one space. */
        GENERATED
    }

    /**
     * What was read.
     *
     * @param request the request, as yet without damage cases
     * @param damage which cases belong to it
     */
    public record Wanted(KgRequest request, Damage damage) {}

    /**
     * Reads {@code {"mode", "drafts": [d, …] or {"from", "to", "step"}, "refine", "damage", "windSpeed", "waterDensity"}}. Without drafts
     * five are taken over the mode's range and refined.
     *
     * @throws FaultyDocumentException with all faults
     */
    public static Wanted read(JsonNode document, PreparedPlatform prepared) {
        Faults faults = new Faults();
        Fields fields = Fields.of(document, "", faults);
        Optional<Mode> mode = mode(fields, prepared);
        Range depth = new Range(prepared.hull().lowest(), true, prepared.hull().highest());
        List<Double> drafts = drafts(fields, depth, mode);
        drafts.forEach(draft -> checkAfloat(fields, prepared, draft));
        OptionalDouble wind = fields.optionalNumber("windSpeed", WIND);
        double water =
                fields.number("waterDensity", Range.DENSITY, prepared.platform().waterDensity());
        OptionalDouble refine = fields.optionalNumber("refine", Range.POSITIVE);
        OptionalDouble refineTo =
                refine.isPresent() || fields.has("drafts") ? refine : OptionalDouble.of(USUAL_REFINEMENT);
        Damage damage = fields.choice("damage", Damage.class, Damage.LISTED);
        fields.noOthers();
        if (mode.isPresent() && mode.get().windSpeed().isEmpty() && wind.isEmpty()) {
            fields.meaning(
                    "windSpeed", "windSpeed must be given: mode " + mode.get().id() + " has none");
        }
        faults.throwIfAny();
        return new Wanted(new KgRequest(mode.orElseThrow(), drafts, wind, water, refineTo, List.of()), damage);
    }

    /** Checks a wind speed that was not given in a document (m/s). */
    public static void checkWind(OptionalDouble wind, Faults faults) {
        if (wind.isPresent() && !WIND.allows(wind.getAsDouble())) {
            faults.meaning("", "wind must be " + WIND.words() + " m/s, not " + wind.getAsDouble());
        }
    }

    private static Optional<Mode> mode(Fields fields, PreparedPlatform prepared) {
        String id = fields.text("mode");
        Optional<Mode> mode = prepared.platform().modes().stream()
                .filter(m -> m.id().equals(id))
                .findFirst();
        if (mode.isEmpty() && !id.isBlank()) {
            List<String> known =
                    prepared.platform().modes().stream().map(Mode::id).toList();
            fields.meaning("mode", "the platform has no mode " + id + "; it has " + String.join(", ", known));
        }
        return mode;
    }

    private static List<Double> drafts(Fields fields, Range depth, Optional<Mode> mode) {
        Optional<JsonNode> given = fields.value("drafts");
        if (given.isEmpty()) {
            return usualDrafts(fields, depth, mode);
        }
        List<Double> drafts =
                given.get().isObject() ? steps(fields.object("drafts"), depth) : fields.numberList("drafts", depth);
        if (drafts.size() > MOST_DRAFTS) {
            fields.meaning("drafts", "at most " + MOST_DRAFTS + " drafts can be asked for, not " + drafts.size());
        }
        for (int i = 1; i < drafts.size(); i++) {
            if (drafts.get(i) <= drafts.get(i - 1)) {
                fields.meaning("drafts", "drafts must rise");
                break;
            }
        }
        return drafts;
    }

    /** A draft at which the hull lies in the water, and not all of it: the top of the hull itself is none. */
    private static void checkAfloat(Fields fields, PreparedPlatform prepared, double draft) {
        if (!LoadedPlatform.upright(prepared, 1, draft, 0).canFloat()) {
            fields.meaning("drafts", "at a draft of " + draft + " m the hull has no reserve of buoyancy left");
        }
    }

    private static List<Double> usualDrafts(Fields fields, Range depth, Optional<Mode> mode) {
        Optional<Mode.DraftRange> range = mode.flatMap(Mode::draftRange);
        if (range.isEmpty()) {
            if (mode.isPresent()) {
                fields.meaning(
                        "drafts", "drafts must be given: mode " + mode.get().id() + " has no draftRange");
            }
            return List.of();
        }
        double least = range.get().least();
        double step = (range.get().greatest() - least) / (USUAL_DRAFTS - 1);
        List<Double> drafts =
                IntStream.range(0, USUAL_DRAFTS).mapToObj(i -> least + i * step).toList();
        if (!drafts.stream().allMatch(depth::allows)) {
            fields.meaning("drafts", "drafts must be given: the mode's draftRange reaches beyond the hull");
        }
        return drafts;
    }

    private static List<Double> steps(Fields fields, Range depth) {
        int before = fields.faults().count();
        double from = fields.number("from", depth);
        double to = fields.number("to", depth);
        double step = fields.number("step", Range.POSITIVE);
        fields.noOthers();
        if (fields.faults().count() > before) {
            return List.of();
        }
        if (to < from) {
            fields.meaning("to", "to must not be less than from");
        }
        double count = Math.ceil((to - from) / step - 1e-9);
        if (count >= MOST_DRAFTS) {
            fields.meaning("step", "step makes more than " + MOST_DRAFTS + " drafts");
            return List.of();
        }
        List<Double> drafts = new ArrayList<>();
        for (int i = 0; i <= count; i++) {
            drafts.add(Math.min(to, from + i * step));
        }
        return drafts;
    }
}
