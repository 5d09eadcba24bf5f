package org.evendraft.service;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.OptionalInt;
import java.util.function.ToDoubleFunction;
import java.util.regex.Pattern;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVPrinter;
import org.evendraft.stability.HydrostaticRow;

/** Tables of hydrostatics as CSV and as plain text that is ready to print. */
public final class HydrostaticPrint {
    private static final String KEY = """
            Drafts are read at the origin: amidships, on the centreline, at the keel. Heel is positive starboard down, trim bow down.
            LCB, TCB, VCB: centre of buoyancy forward, to port and up from the origin. Area: of the waterplane. LCF, TCF: its centre.
            IT, IL, ITL: its second moments about the longitudinal and the transverse axis through its centre, and their product.
            BM: radius of the metacentre, T transverse, L longitudinal. KM: its height over the keel, square to the waterplane.
            TPC: mass that changes the draft by 1 cm. MH1, MT1: moment that heels or trims by 1 degree, with BM in the place of GM.
            """;

    /** What the title has on a line, up to a space. */
    private static final Pattern LINE_END = Pattern.compile("(.{1,120})(?:\\s|$)");

    private HydrostaticPrint() {}

    /**
     * CSV (RFC 4180) with a header row; columns are named as the JSON's properties, points as {@code nameX, nameY, nameZ}.
     *
     * @param rows the rows
     * @param digits decimals of lengths; unrounded when empty
     */
    public static String csv(List<HydrostaticRow> rows, OptionalInt digits) {
        List<HydrostaticColumn> columns = HydrostaticColumn.all();
        StringBuilder text = new StringBuilder();
        try (CSVPrinter printer = new CSVPrinter(text, CSVFormat.RFC4180)) {
            printer.printRecord(columns.stream().map(HydrostaticColumn::name));
            for (HydrostaticRow row : rows) {
                printer.printRecord(columns.stream()
                        .map(column ->
                                digits.isPresent() ? column.rounded(row, digits.getAsInt()) : column.exact(row)));
            }
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        return text.toString();
    }

    /**
     * Plain text: a title, then a block for each trim and heel.
     *
     * @param table the table
     * @param digits decimals of lengths; {@value Decimals#USUAL} when empty
     */
    public static String text(HydrostaticTable table, OptionalInt digits) {
        int decimals = digits.orElse(Decimals.USUAL);
        StringBuilder text = new StringBuilder(title(table));
        blocks(table.rows()).forEach((heading, rows) -> {
            text.append('\n').append(heading).append('\n');
            text.append(block(rows, decimals)).append('\n');
        });
        return text.append('\n').append(KEY).toString();
    }

    private static String title(HydrostaticTable table) {
        Provenance from = table.provenance();
        String revision = from.platformRevision() == 0 ? "not stored" : "revision " + from.platformRevision();
        return String.format(
                Locale.ROOT,
                """
                HYDROSTATICS
                Platform:      %s (%s), %s
                Water density: %s t/m³
                Computed:      %s by Evendraft %s
                %s
                """,
                table.name(),
                table.platform(),
                revision,
                table.waterDensity(),
                from.computedAt(),
                from.engineVersion(),
                LINE_END.matcher(from.caution()).replaceAll("$1\n").strip());
    }

    /** The rows of each trim and heel under their heading, in their order. */
    private static Map<String, List<HydrostaticRow>> blocks(List<HydrostaticRow> rows) {
        Map<String, List<HydrostaticRow>> blocks = new LinkedHashMap<>();
        for (HydrostaticRow row : rows) {
            String heading = "Trim " + angle(row, HydrostaticRow::trimAngle) + "°, heel "
                    + angle(row, HydrostaticRow::heelAngle) + "°";
            blocks.computeIfAbsent(heading, none -> new ArrayList<>()).add(row);
        }
        return blocks;
    }

    /** An angle as it was asked for, whatever the digits: blocks must not look alike. */
    private static String angle(HydrostaticRow row, ToDoubleFunction<HydrostaticRow> of) {
        return BigDecimal.valueOf(of.applyAsDouble(row)).stripTrailingZeros().toPlainString();
    }

    private static TextTable block(List<HydrostaticRow> rows, int digits) {
        List<HydrostaticColumn> columns = HydrostaticColumn.printed();
        TextTable block =
                new TextTable(columns.stream().map(HydrostaticColumn::head).toArray(String[]::new));
        block.subheader(columns.stream().map(HydrostaticColumn::unit).toArray(String[]::new));
        rows.forEach(row -> block.row(
                columns.stream().map(column -> column.rounded(row, digits)).toArray(String[]::new)));
        return block;
    }
}
