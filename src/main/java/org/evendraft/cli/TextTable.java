package org.evendraft.cli;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.IntStream;

/** A table in plain text: columns as wide as their widest cell, numbers to the right. */
final class TextTable {
    private static final String INDENT = "  ";
    private static final String GAP = "  ";

    private final List<List<String>> rows = new ArrayList<>();

    TextTable(String... header) {
        rows.add(List.of(header));
    }

    /** Adds a row with as many cells as the header. */
    void row(String... cells) {
        rows.add(List.of(cells));
    }

    @Override
    public String toString() {
        return rows.stream().map(this::line).collect(Collectors.joining("\n"));
    }

    private String line(List<String> row) {
        String line = IntStream.range(0, row.size())
                .mapToObj(i -> padded(row.get(i), i))
                .collect(Collectors.joining(GAP, INDENT, ""));
        return line.stripTrailing();
    }

    private String padded(String cell, int column) {
        int width = rows.stream().mapToInt(r -> length(r.get(column))).max().orElse(0);
        String fill = " ".repeat(width - length(cell));
        return numeric(column) ? fill + cell : cell + fill;
    }

    /** A column is one of numbers when each of its cells under the header starts as a number or is a dash. */
    private boolean numeric(int column) {
        return rows.stream().skip(1).allMatch(r -> r.get(column).matches("[+−-]?\\d.*|[-–]"));
    }

    private static int length(String cell) {
        return cell.codePointCount(0, cell.length());
    }
}
