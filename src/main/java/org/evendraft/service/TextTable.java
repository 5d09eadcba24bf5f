package org.evendraft.service;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import java.util.stream.Stream;

/** A table in plain text: columns as wide as their widest cell, numbers to the right. */
public final class TextTable {
    private static final String INDENT = "  ";
    private static final String GAP = "  ";

    private final List<List<String>> heads = new ArrayList<>();
    private final List<List<String>> rows = new ArrayList<>();

    /** A table without rows so far. */
    public TextTable(String... header) {
        heads.add(List.of(header));
    }

    /** Adds a line under the header, with as many cells. */
    public void subheader(String... cells) {
        heads.add(List.of(cells));
    }

    /** Adds a row with as many cells as the header. */
    public void row(String... cells) {
        rows.add(List.of(cells));
    }

    @Override
    public String toString() {
        List<Column> columns = IntStream.range(0, heads.get(0).size())
                .mapToObj(i -> new Column(width(i), isNumeric(i)))
                .toList();
        return lines().map(row -> line(row, columns)).collect(Collectors.joining("\n"));
    }

    private Stream<List<String>> lines() {
        return Stream.concat(heads.stream(), rows.stream());
    }

    private int width(int column) {
        return lines().mapToInt(row -> length(row.get(column))).max().orElse(0);
    }

    /** A column is one of numbers when each of its cells under the header starts as a number or is a dash. */
    private boolean isNumeric(int column) {
        return rows.stream().allMatch(r -> r.get(column).matches("[+−-]?\\d.*|[-–]"));
    }

    private static String line(List<String> row, List<Column> columns) {
        return IntStream.range(0, row.size())
                .mapToObj(i -> columns.get(i).padded(row.get(i)))
                .collect(Collectors.joining(GAP, INDENT, ""))
                .stripTrailing();
    }

    /**
     * How a column is set.
     *
     * @param width in characters
     * @param numeric whether its cells stand to the right
     */
    private record Column(int width, boolean numeric) {

        String padded(String cell) {
            String fill = " ".repeat(width - length(cell));
            return numeric ? fill + cell : cell + fill;
        }
    }

    private static int length(String cell) {
        return cell.codePointCount(0, cell.length());
    }
}
