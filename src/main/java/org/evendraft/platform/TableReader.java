package org.evendraft.platform;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.List;
import org.evendraft.geometry.SecondMoments;

/** Reads a calibration table from JSON. */
final class TableReader {
    private TableReader() {}

    /** Reads the property {@code table}; empty when it is absent, or has faults. */
    static List<TableRow> read(Fields fields) {
        if (!fields.has("table")) {
            return List.of();
        }
        Faults faults = fields.faults();
        int before = faults.count();
        List<TableRow> rows = new ArrayList<>();
        for (Fields row : fields.objects("table")) {
            rows.add(row(row));
        }
        if (fields.value("table").filter(JsonNode::isArray).isPresent()) {
            TableCheck.faults(rows).forEach(fault -> faults.meaning(place(fields, fault), fault.detail()));
        }
        return faults.count() == before ? rows : List.of();
    }

    private static String place(Fields fields, TableCheck.RowFault fault) {
        return fault.row() < 0
                ? fields.pointer("table")
                : fields.pointer("table") + "/" + fault.row() + "/" + fault.column();
    }

    private static TableRow row(Fields row) {
        TableRow read = new TableRow(
                row.number("level", Range.COORDINATE),
                row.number("volume", Range.NOT_NEGATIVE),
                row.position(),
                new SecondMoments(
                        row.number("inertiaT", Range.INERTIA),
                        row.number("inertiaL", Range.INERTIA),
                        row.number("inertiaTL", Range.ANY_INERTIA, 0)));
        row.noOthers();
        return read;
    }
}
