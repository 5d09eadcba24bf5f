package org.evendraft.ballast.optimum;

import java.util.ArrayList;
import java.util.List;

/** A stretch of one choice's polyline that is still open, with its columns. Immutable. */
final class Span {
    final int choice;
    final List<Point> line;
    /** Columns of each point, one for each pump that can move it there. */
    final List<List<Column>> columns;

    private Span(int choice, List<Point> line, List<List<Column>> columns) {
        this.choice = choice;
        this.line = line;
        this.columns = columns;
    }

    /** The whole of a choice; no points where no pump can move it. */
    static Span whole(Program program, int tank, int choice) {
        TankModel model = program.model().tanks().get(tank);
        List<Point> line = new ArrayList<>();
        List<List<Column>> columns = new ArrayList<>();
        for (Point point : model.choices().get(choice).points()) {
            List<Column> here = columnsAt(program, tank, choice, point);
            if (!here.isEmpty()) {
                line.add(point);
                columns.add(here);
            }
        }
        return new Span(choice, line, columns);
    }

    private static List<Column> columnsAt(Program program, int tank, int choice, Point point) {
        if (point.amount() == 0) {
            return List.of(program.column(tank, choice, point, Flows.NO_PUMP));
        }
        return program.model().tanks().get(tank).pumpsFor(point.amount()).stream()
                .map(pump -> program.column(tank, choice, point, pump))
                .toList();
    }

    boolean empty() {
        return line.isEmpty();
    }

    double least() {
        return line.get(0).amount();
    }

    double greatest() {
        return line.get(line.size() - 1).amount();
    }

    /** The part between two places on the line, each the number of a point and a part of the way to the next. */
    Span between(Program program, int tank, double from, double to) {
        List<Point> newLine = new ArrayList<>();
        List<List<Column>> newColumns = new ArrayList<>();
        int first = (int) Math.ceil(from);
        int last = (int) Math.floor(to);
        if (first > from) {
            addBetween(program, tank, from, newLine, newColumns);
        }
        for (int i = first; i <= last; i++) {
            newLine.add(line.get(i));
            newColumns.add(columns.get(i));
        }
        if (last < to) {
            addBetween(program, tank, to, newLine, newColumns);
        }
        return new Span(choice, newLine, newColumns);
    }

    private void addBetween(
            Program program, int tank, double place, List<Point> newLine, List<List<Column>> newColumns) {
        int i = (int) Math.floor(place);
        Point point = line.get(i).towards(line.get(i + 1), place - i);
        newLine.add(point);
        newColumns.add(columnsAt(program, tank, choice, point));
    }

    /** The place of an amount on the line. */
    double place(double amount) {
        int i = 0;
        while (i < line.size() - 2 && line.get(i + 1).amount() <= amount) {
            i++;
        }
        if (line.size() == 1) {
            return 0;
        }
        double low = line.get(i).amount();
        double part = (amount - low) / (line.get(i + 1).amount() - low);
        return i + Math.min(1, Math.max(0, part));
    }
}
