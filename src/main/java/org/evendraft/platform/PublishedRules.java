package org.evendraft.platform;

import com.fasterxml.jackson.databind.JsonNode;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;

/** The sets of criteria that standards publish, each under its name; they stand as data in {@code rules.json}. */
final class PublishedRules {
    /** The set that is taken where a platform's document names none. */
    static final String ASSUMED = "moduColumnStabilized";

    private static final String RESOURCE = "rules.json";
    private static final Map<String, List<Criterion>> SETS = read(resource());

    private PublishedRules() {}

    /** The names of all sets. */
    static Set<String> names() {
        return SETS.keySet();
    }

    /**
     * The criteria of a set.
     *
     * @param name its name
     * @return its criteria, empty when there is no such set
     */
    static List<Criterion> of(String name) {
        return SETS.getOrDefault(name, List.of());
    }

    /**
     * Reads sets of criteria.
     *
     * @param utf8 an object that has a list of criteria under each set's name
     * @throws IllegalStateException when anything in it is wrong: the program is built wrongly
     */
    static Map<String, List<Criterion>> read(byte[] utf8) {
        try {
            JsonNode document = Json.parse(utf8);
            Faults faults = new Faults();
            Fields fields = Fields.of(document, "", faults);
            Map<String, List<Criterion>> sets = new LinkedHashMap<>();
            document.fieldNames()
                    .forEachRemaining(name -> sets.put(name, RulesReader.criteria(fields.someObjects(name))));
            if (!sets.containsKey(ASSUMED)) {
                fields.form(ASSUMED, "the set " + ASSUMED + " is missing");
            }
            faults.throwIfAny();
            sets.replaceAll((name, criteria) -> List.copyOf(criteria));
            return Collections.unmodifiableMap(sets);
        } catch (FaultyDocumentException e) {
            List<String> places = new ArrayList<>();
            e.faults().forEach(fault -> places.add(fault.pointer() + ": " + fault.detail()));
            throw new IllegalStateException("broken " + RESOURCE + ": " + String.join("; ", places), e);
        }
    }

    private static byte[] resource() {
        try (InputStream in = PublishedRules.class.getResourceAsStream(RESOURCE)) {
            if (in == null) {
                throw new IllegalStateException("there is no " + RESOURCE);
            }
            return in.readAllBytes();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
