package org.evendraft.platform;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVParser;
import org.apache.commons.csv.CSVRecord;
import org.evendraft.geometry.SecondMoments;
import org.evendraft.geometry.Vec3;

/** Reads and writes calibration tables as CSV. Faults of a value point at {@code /row/column}, rows from 0 as in JSON. */
final class TableCsv {
    private static final String LEVEL = "level";
    private static final String VOLUME = "volume";
    private static final String PRODUCT = "inertiaTL";
    private static final List<String> REQUIRED = List.of(LEVEL, VOLUME, "x", "y", "z", "inertiaT", "inertiaL");

    private static final Map<String, Range> RANGES = Map.of(
            LEVEL,
            Range.COORDINATE,
            VOLUME,
            Range.NOT_NEGATIVE,
            "x",
            Range.COORDINATE,
            "y",
            Range.COORDINATE,
            "z",
            Range.COORDINATE,
            "inertiaT",
            Range.INERTIA,
            "inertiaL",
            Range.INERTIA,
            PRODUCT,
            Range.ANY_INERTIA);

    private final Faults faults = new Faults();
    private final Map<String, Integer> columns = new HashMap<>();
    private final List<TableRow> rows = new ArrayList<>();
    private final List<Long> lines = new ArrayList<>();

    private TableCsv() {}

    static List<TableRow> read(byte[] utf8) {
        TableCsv csv = new TableCsv();
        boolean whole = csv.readRecords(Json.text(utf8));
        if (whole && csv.columns.keySet().containsAll(REQUIRED)) {
            TableCheck.faults(csv.rows).forEach(csv::place);
        }
        csv.faults.throwIfAny();
        return csv.rows;
    }

    static String write(List<TableRow> rows) {
        List<String> header = new ArrayList<>(REQUIRED);
        header.add(PRODUCT);
        StringBuilder out = new StringBuilder(record(header.toArray()));
        for (TableRow row : rows) {
            Vec3 centre = row.centre();
            SecondMoments s = row.surface();
            out.append(record(
                    row.level(),
                    row.volume(),
                    centre.x(),
                    centre.y(),
                    centre.z(),
                    s.transverse(),
                    s.longitudinal(),
                    s.product()));
        }
        return out.toString();
    }

    private static String record(Object... values) {
        return CSVFormat.RFC4180.format(values) + CSVFormat.RFC4180.getRecordSeparator();
    }

    /** Reads all lines; false when they do not end as CSV must, so that rows may be missing. */
    private boolean readRecords(String text) {
        long line = 1;
        try (CSVParser parser = CSVParser.parse(text, CSVFormat.RFC4180)) {
            for (CSVRecord next : parser) {
                if (line == 1) {
                    readHeader(next);
                } else if (columns.keySet().containsAll(REQUIRED)) {
                    readRow(next, line);
                }
                line = parser.getCurrentLineNumber() + 1;
            }
        } catch (IOException | UncheckedIOException e) {
            faults.form("", "line " + line + ": not CSV by RFC 4180; is a quotation mark missing?");
            return false;
        }
        if (line == 1 && faults.count() == 0) {
            faults.form("", "the table is empty; the first line must name the columns " + String.join(", ", REQUIRED));
        }
        return true;
    }

    private void readHeader(CSVRecord header) {
        for (int i = 0; i < header.size(); i++) {
            String name = header.get(i).strip();
            if (!RANGES.containsKey(name)) {
                faults.form(
                        "",
                        "line 1: unknown column " + Words.quote(name) + "; known: " + String.join(", ", REQUIRED) + ", "
                                + PRODUCT);
            } else if (columns.put(name, i) != null) {
                faults.form("", "line 1: column " + name + " is given twice");
            }
        }
        for (String name : REQUIRED) {
            if (!columns.containsKey(name)) {
                faults.form("", "line 1: column " + name + " is missing");
            }
        }
    }

    private void readRow(CSVRecord next, long line) {
        if (next.size() == 1 && next.get(0).isBlank()) {
            return;
        }
        lines.add(line);
        if (next.size() != columns.size()) {
            faults.form(
                    "/" + rows.size(),
                    "line " + line + ": " + next.size() + " values for " + columns.size() + " columns");
        }
        double product = columns.containsKey(PRODUCT) ? value(next, PRODUCT) : 0;
        rows.add(new TableRow(
                value(next, LEVEL),
                value(next, VOLUME),
                new Vec3(value(next, "x"), value(next, "y"), value(next, "z")),
                new SecondMoments(value(next, "inertiaT"), value(next, "inertiaL"), product)));
    }

    private double value(CSVRecord next, String column) {
        int i = columns.getOrDefault(column, -1);
        if (i < 0 || i >= next.size()) {
            return Double.NaN;
        }
        String pointer = "/" + rows.size() + "/" + column;
        String start = "line " + lines.get(rows.size()) + ": " + column;
        Range range = RANGES.getOrDefault(column, Range.ANY);
        OptionalDouble value = Words.number(next.get(i).strip());
        if (value.isEmpty()) {
            faults.form(pointer, start + " must be a finite number, not " + Words.quote(next.get(i)));
            return Double.NaN;
        }
        double number = value.getAsDouble();
        if (!range.allows(number)) {
            faults.meaning(pointer, start + " must be " + range.words() + ", not " + Words.given(number));
            return Double.NaN;
        }
        return number;
    }

    private void place(TableCheck.RowFault fault) {
        if (fault.row() < 0) {
            faults.meaning("", fault.detail());
        } else {
            faults.meaning(
                    "/" + fault.row() + "/" + fault.column(), "line " + lines.get(fault.row()) + ": " + fault.detail());
        }
    }
}
