package org.evendraft.platform;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

/** Reads criteria of stability: those that standards publish, and what a platform makes of them. */
final class RulesReader {
    private static final String RULES = "rules";
    private static final String OWN = "own";
    private static final String WITHOUT = "without";

    private RulesReader() {}

    /**
     * Reads the criteria of a platform.
     *
     * @param criteria the object with the name of the published rules, the platform's own criteria and the names of those that do not
     *     hold for it; when it is absent, or names no rules, {@link PublishedRules#ASSUMED} are assumed
     */
    static StabilityRules read(Optional<Fields> criteria) {
        return criteria.map(RulesReader::rules)
                .orElseGet(() ->
                        new StabilityRules(PublishedRules.ASSUMED, true, PublishedRules.of(PublishedRules.ASSUMED)));
    }

    /** Reads all criteria of a list, whose names must differ. */
    static List<Criterion> criteria(List<Fields> list) {
        Set<String> names = new HashSet<>();
        List<Criterion> criteria = new ArrayList<>();
        for (Fields fields : list) {
            Criterion criterion = criterion(fields);
            if (!criterion.name().isBlank() && !names.add(criterion.name())) {
                fields.meaning("name", "there are two criteria " + Words.quote(criterion.name()) + " in one list");
            }
            criteria.add(criterion);
        }
        return criteria;
    }

    private static StabilityRules rules(Fields fields) {
        boolean assumed = !fields.has(RULES);
        String name = fields.text(RULES, PublishedRules.ASSUMED);
        boolean published = PublishedRules.names().contains(name);
        if (!published && !name.isBlank()) {
            fields.meaning(
                    RULES,
                    "there are no published rules " + Words.quote(name) + "; known: "
                            + Words.few(PublishedRules.names()));
        }
        Map<String, Criterion> byName = new LinkedHashMap<>();
        PublishedRules.of(name).forEach(criterion -> byName.put(criterion.name(), criterion));
        Set<String> own = new HashSet<>();
        Set<String> droppable = new LinkedHashSet<>(byName.keySet());
        for (Criterion criterion : criteria(fields.objects(OWN))) {
            own.add(criterion.name());
            byName.put(criterion.name(), criterion);
        }
        List<String> without = fields.texts(WITHOUT);
        if (published) {
            checkWithout(fields, without, droppable, own);
        }
        without.forEach(byName::remove);
        fields.noOthers();
        return new StabilityRules(name, assumed, List.copyOf(byName.values()));
    }

    private static void checkWithout(Fields fields, List<String> without, Set<String> rules, Set<String> own) {
        Set<String> seen = new HashSet<>();
        for (int i = 0; i < without.size(); i++) {
            String name = without.get(i);
            String at = fields.pointer(WITHOUT) + "/" + i;
            if (own.contains(name) && !name.isBlank()) {
                fields.faults().meaning(at, Words.quote(name) + " is one of the platform's own criteria as well");
            } else if (!rules.contains(name) && !name.isBlank()) {
                fields.faults()
                        .meaning(
                                at,
                                "the rules have no criterion " + Words.quote(name) + "; known: "
                                        + String.join(", ", rules));
            }
            if (!seen.add(name) && !name.isBlank()) {
                fields.faults().meaning(at, Words.quote(name) + " is named twice");
            }
        }
    }

    private static Criterion criterion(Fields fields) {
        String name = fields.text("name");
        String clause = fields.text("clause");
        Situation situation = fields.choice("situation", Situation.class).orElse(Situation.INTACT);
        Optional<Criterion.Measure> measure = fields.choice("measure", Criterion.Measure.class);
        Criterion criterion = new Criterion(
                name,
                clause,
                situation,
                measure.orElse(Criterion.Measure.LEAST_GM),
                fields.number("bound", measure.map(RulesReader::bounds).orElse(Range.ANY)),
                fields.optionalNumber("windSpeed", Range.NOT_NEGATIVE),
                fields.choice("limitAngle", Criterion.LimitAngle.class, Criterion.LimitAngle.LESSER),
                fields.choice("openings", Criterion.Openings.class, Criterion.Openings.NOT_WEATHERTIGHT));
        if (measure.filter(Criterion.Measure.LEAST_GM::equals).isPresent() && situation != Situation.INTACT) {
            fields.meaning("measure", "leastGm is a measure of the intact platform alone");
        }
        fields.noOthers();
        return criterion;
    }

    /** The bounds that a measure can have. */
    private static Range bounds(Criterion.Measure measure) {
        return switch (measure) {
            case AREA_RATIO, ARM_RATIO -> Range.POSITIVE;
            case INCLINATION, RANGE -> Range.ANGLE_OR_NONE;
            case LEAST_ARM, LEAST_GM, OPENING_HEIGHT -> Range.COORDINATE;
        };
    }
}
