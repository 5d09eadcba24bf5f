package org.evendraft.platform;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;

/** Reads loads. */
public final class LoadReader {
    private final Set<String> areas = new LinkedHashSet<>();

    private LoadReader(List<DeckArea> areas) {
        areas.forEach(area -> this.areas.add(area.id()));
    }

    /** Reads all loads of a list. */
    static List<Load> read(List<Fields> list, List<DeckArea> areas) {
        LoadReader reader = new LoadReader(areas);
        List<Load> loads = new ArrayList<>(list.size());
        for (Fields fields : list) {
            loads.add(reader.load(fields, loads.size() + 1));
        }
        return loads;
    }

    /**
     * Reads one load, with the same faults as in a condition.
     *
     * @param fields the load
     * @param areas the platform's deck areas
     */
    public static Load one(Fields fields, List<DeckArea> areas) {
        return new LoadReader(areas).load(fields, 1);
    }

    /**
     * Reads the id of a deck area, where one is given.
     *
     * @param fields what may give it, under its usual name
     * @param areas the platform's deck areas
     */
    public static Optional<String> area(Fields fields, List<DeckArea> areas) {
        return new LoadReader(areas).area(fields);
    }

    private Load load(Fields fields, int number) {
        Optional<Load.Kind> kind = fields.choice("kind", Load.Kind.class);
        Load load = new Load(
                fields.text("name", "load " + number),
                kind.orElse(Load.Kind.VARIABLE),
                area(fields),
                mass(fields, kind),
                fields.position(),
                fields.optionalNumber("footprint", Range.POSITIVE));
        fields.noOthers();
        return load;
    }

    private Optional<String> area(Fields fields) {
        Optional<String> area = fields.optionalText("area");
        if (area.isPresent() && !area.get().isBlank() && !areas.contains(area.get())) {
            fields.meaning("area", "there is no deck area " + Words.quote(area.get()) + "; known: " + Words.few(areas));
        }
        return area;
    }

    private static double mass(Fields fields, Optional<Load.Kind> kind) {
        double mass = fields.number("mass", Range.ANY);
        boolean mayBeNegative = kind.isEmpty() || kind.get() == Load.Kind.CORRECTION;
        if (mass <= 0 && !mayBeNegative) {
            fields.meaning(
                    "mass", "mass must be over 0, not " + Words.given(mass) + "; only a correction may be negative");
        }
        return mass;
    }
}
