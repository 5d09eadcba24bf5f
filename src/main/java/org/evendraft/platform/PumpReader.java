package org.evendraft.platform;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;

/** Reads the pumps of a platform. */
final class PumpReader {
    /** The sea, then the tanks; one wrongly called the sea as well is not told twice. */
    private final Set<String> known = new LinkedHashSet<>();

    private final Ids ids = new Ids("pump");

    private PumpReader(Set<String> tanks) {
        known.add(Pump.SEA);
        known.addAll(tanks);
        known.remove(""); // a tank whose id has a fault
    }

    /**
     * Reads all pumps of a list.
     *
     * @param tanks ids of the tanks that they may stand on
     */
    static List<Pump> read(List<Fields> list, Set<String> tanks) {
        PumpReader reader = new PumpReader(tanks);
        List<Pump> pumps = new ArrayList<>();
        for (Fields fields : list) {
            pumps.add(reader.pump(fields));
        }
        return pumps;
    }

    private Pump pump(Fields fields) {
        String id = ids.read(fields);
        double rate = fields.number("rate", Range.POSITIVE);
        List<String> from = ends(fields, "from");
        List<String> to = ends(fields, "to");
        fields.noOthers();
        boolean moves = from.stream().anyMatch(a -> to.stream().anyMatch(b -> !a.equals(b)));
        if (!from.isEmpty() && !to.isEmpty() && !moves) {
            fields.faults()
                    .meaning(
                            fields.pointer(),
                            "pump " + id + " can move nothing: it has one and the same end on both sides");
        }
        return new Pump(id, rate, from, to);
    }

    private List<String> ends(Fields fields, String name) {
        int before = fields.faults().count();
        List<String> ends = fields.texts(name);
        if (ends.isEmpty() && fields.faults().count() == before) {
            fields.form(name, name + " must name at least one tank, or " + Pump.SEA);
        }
        Set<String> seen = new HashSet<>();
        for (int i = 0; i < ends.size(); i++) {
            String end = ends.get(i);
            if (!end.isBlank() && !known.contains(end)) {
                at(fields, name, i, "there is no tank " + Words.quote(end) + "; known: " + Words.few(known));
            }
            if (!seen.add(end)) {
                at(fields, name, i, Words.quote(end) + " is named twice");
            }
        }
        return ends;
    }

    private static void at(Fields fields, String name, int i, String detail) {
        fields.faults().meaning(fields.pointer(name) + "/" + i, detail);
    }
}
