package org.evendraft.platform;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.EnumSet;
import java.util.HashSet;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;

/** Reads the damage cases of a platform. */
public final class DamageCaseReader {
    private static final String FLOODED = "flooded";

    private final Set<String> known = new LinkedHashSet<>();
    private final Set<String> shapeless = new HashSet<>();
    private final Set<String> ambiguous = new HashSet<>();
    private final Ids ids = new Ids("damage case");

    private DamageCaseReader(List<Tank> tanks, List<Compartment> compartments) {
        for (Tank tank : tanks) {
            known.add(tank.id());
            if (tank.bodies().isEmpty() && !tank.table().isEmpty()) {
                shapeless.add(tank.id());
            }
        }
        for (Compartment compartment : compartments) {
            if (!known.add(compartment.id()) && tanks.stream().anyMatch(t -> t.id().equals(compartment.id()))) {
                ambiguous.add(compartment.id());
            }
        }
        known.remove(""); // a space whose id has a fault
    }

    /**
     * Reads all damage cases of a list.
     *
     * @param tanks the platform's tanks
     * @param compartments its compartments
     */
    static List<DamageCase> read(List<Fields> list, List<Tank> tanks, List<Compartment> compartments) {
        DamageCaseReader reader = new DamageCaseReader(tanks, compartments);
        List<DamageCase> cases = new ArrayList<>();
        for (Fields fields : list) {
            cases.add(reader.damageCase(fields));
        }
        return cases;
    }

    /**
     * Reads one damage case that is not among those of the platform's document.
     *
     * @param document an object as the document lists them
     * @throws FaultyDocumentException with all faults
     */
    public static DamageCase read(JsonNode document, Platform platform) {
        Faults faults = new Faults();
        DamageCase read = new DamageCaseReader(platform.tanks(), platform.compartments())
                .damageCase(Fields.of(document, "", faults));
        faults.throwIfAny();
        return read;
    }

    private DamageCase damageCase(Fields fields) {
        DamageCase damageCase = new DamageCase(
                ids.read(fields),
                fields.choice("situation", EnumSet.complementOf(EnumSet.of(Situation.INTACT)), Situation.COLLISION),
                flooded(fields));
        fields.noOthers();
        return damageCase;
    }

    private List<String> flooded(Fields fields) {
        List<String> flooded = fields.someTexts(FLOODED);
        Set<String> seen = new HashSet<>();
        for (int i = 0; i < flooded.size(); i++) {
            String space = flooded.get(i);
            String at = fields.pointer(FLOODED) + "/" + i;
            if (space.isBlank()) {
                continue; // its fault is told already
            }
            check(fields.faults(), at, space);
            if (!seen.add(space)) {
                fields.faults().meaning(at, Words.quote(space) + " is named twice");
            }
        }
        return flooded;
    }

    private void check(Faults faults, String at, String space) {
        if (!known.contains(space)) {
            faults.meaning(
                    at, "there is no tank or compartment " + Words.quote(space) + "; known: " + Words.few(known));
        } else if (ambiguous.contains(space)) {
            faults.meaning(
                    at, Words.quote(space) + " names both a tank and a compartment; give one of them another id");
        } else if (shapeless.contains(space)) {
            faults.meaning(
                    at,
                    "tank " + space + " is known only by a table; the buoyancy lost with it cannot be computed"
                            + " without its shape: give it bodies");
        }
    }
}
