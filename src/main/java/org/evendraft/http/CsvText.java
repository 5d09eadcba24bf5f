package org.evendraft.http;

import com.fasterxml.jackson.databind.JsonNode;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVPrinter;
import org.evendraft.platform.Json;
import org.evendraft.platform.TableRow;
import org.evendraft.platform.TankTables;
import org.evendraft.stability.HydrostaticRow;

/** Tables as CSV (RFC 4180) with a header row; columns are named as the JSON's properties, points as {@code nameX, nameY, nameZ}. */
final class CsvText {
    static final String MEDIA_TYPE = "text/csv";

    private static final String WITH_CHARSET = MEDIA_TYPE + "; charset=utf-8; header=present";
    private static final List<String> AXES = List.of("X", "Y", "Z");

    private CsvText() {}

    static Answer hydrostatics(List<HydrostaticRow> rows) {
        return answer(rows.stream().map(CsvText::flat).toList());
    }

    static Answer table(List<TableRow> rows) {
        return Answer.text(200, WITH_CHARSET, TankTables.toCsv(rows));
    }

    private static Answer answer(List<Map<String, String>> rows) {
        StringBuilder text = new StringBuilder();
        try (CSVPrinter printer = new CSVPrinter(text, CSVFormat.RFC4180)) {
            printer.printRecord(rows.get(0).keySet());
            for (Map<String, String> row : rows) {
                printer.printRecord(row.values());
            }
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        return Answer.text(200, WITH_CHARSET, text.toString());
    }

    private static Map<String, String> flat(Object row) {
        Map<String, String> flat = new LinkedHashMap<>();
        for (Map.Entry<String, JsonNode> property :
                Json.mapper().valueToTree(row).properties()) {
            JsonNode value = property.getValue();
            List<String> names = new ArrayList<>();
            if (value.isArray()) {
                AXES.forEach(axis -> names.add(property.getKey() + axis));
            }
            for (int i = 0; i < names.size(); i++) {
                flat.put(names.get(i), value.get(i).asText());
            }
            if (names.isEmpty()) {
                flat.put(property.getKey(), value.asText());
            }
        }
        return flat;
    }
}
