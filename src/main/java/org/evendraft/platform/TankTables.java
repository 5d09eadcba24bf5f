package org.evendraft.platform;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.List;

/** Calibration tables as JSON and as CSV, and a platform document with one of its tables replaced. */
public final class TankTables {
    private TankTables() {}

    /**
     * Reads a table from a JSON list of rows, or from an object whose property {@code table} is one.
     *
     * @throws FaultyDocumentException with all faults; pointers start at the document given
     */
    public static List<TableRow> fromJson(JsonNode document) {
        ObjectNode wrapped = Json.mapper().createObjectNode();
        if (document.isArray()) {
            wrapped.set("table", document);
        }
        Faults faults = new Faults();
        Fields fields = Fields.of(document.isArray() ? wrapped : document, "", faults);
        if (!fields.has("table") && document.isObject()) {
            fields.form("table", "table must be given");
        }
        List<TableRow> rows = TableReader.read(fields);
        fields.noOthers();
        throwAsGiven(faults, document.isArray() ? "/table" : "");
        return rows;
    }

    private static void throwAsGiven(Faults faults, String wrapping) {
        if (faults.count() > 0) {
            throw new FaultyDocumentException(faults.list().stream()
                    .map(f -> new Fault(f.pointer().substring(wrapping.length()), f.detail(), f.kind()))
                    .toList());
        }
    }

    /**
     * Reads a table from CSV (RFC 4180): a header row with {@code level, volume, x, y, z, inertiaT, inertiaL} and, if it is known,
     * {@code inertiaTL}, in any order.
     *
     * @param utf8 the bytes as they came; a byte order mark is let pass
     * @throws FaultyDocumentException with all faults, each with its line
     */
    public static List<TableRow> fromCsv(byte[] utf8) {
        return TableCsv.read(utf8);
    }

    /** Writes a table as CSV, which {@link #fromCsv} reads back to the same values. */
    public static String toCsv(List<TableRow> rows) {
        return TableCsv.write(rows);
    }

    /** Writes a table as a JSON list of rows. */
    public static ArrayNode toJson(List<TableRow> rows) {
        ArrayNode list = Json.mapper().createArrayNode();
        for (TableRow row : rows) {
            list.addObject()
                    .put("level", row.level())
                    .put("volume", row.volume())
                    .put("x", row.centre().x())
                    .put("y", row.centre().y())
                    .put("z", row.centre().z())
                    .put("inertiaT", row.surface().transverse())
                    .put("inertiaL", row.surface().longitudinal())
                    .put("inertiaTL", row.surface().product());
        }
        return list;
    }

    /**
     * The platform document with one tank's table replaced; the rest as it was. It is for {@link PlatformReader} to check.
     *
     * @param document a platform document that has been read without fault; it is not changed
     * @param tank the tank's id
     * @param rows the new table
     * @throws IllegalArgumentException when there is no such tank
     */
    public static ObjectNode replaced(JsonNode document, String tank, List<TableRow> rows) {
        ObjectNode copy = document.deepCopy();
        for (JsonNode candidate : copy.path("tanks")) {
            if (candidate instanceof ObjectNode node
                    && tank.equals(node.path("id").textValue())) {
                node.set("table", toJson(rows));
                return copy;
            }
        }
        throw new IllegalArgumentException("no tank " + tank);
    }
}
