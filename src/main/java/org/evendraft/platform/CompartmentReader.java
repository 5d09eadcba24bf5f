package org.evendraft.platform;

import java.util.ArrayList;
import java.util.List;

/** Reads the spaces that damage may flood. */
final class CompartmentReader {
    private CompartmentReader() {}

    static List<Compartment> read(List<Fields> list) {
        Ids ids = new Ids("compartment");
        List<Compartment> compartments = new ArrayList<>();
        for (Fields fields : list) {
            compartments.add(new Compartment(
                    ids.read(fields),
                    BodyCheck.read(fields.someObjects("bodies"), fields, "bodies"),
                    fields.number("permeability", Range.POSITIVE_FRACTION, 1)));
            fields.noOthers();
        }
        return compartments;
    }
}
