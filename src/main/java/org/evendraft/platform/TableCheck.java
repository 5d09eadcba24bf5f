package org.evendraft.platform;

import java.util.ArrayList;
import java.util.List;
import java.util.function.ToDoubleFunction;
import org.evendraft.geometry.SecondMoments;

/** Whether rows make a calibration table. */
final class TableCheck {
    /** The product may exceed the root of the other two by this part: tables are printed with few digits. */
    private static final double PRINTED = 1e-3;

    private TableCheck() {}

    /**
     * What is wrong with a row.
     *
     * @param row number of the row from 0, −1 for the table as a whole
     * @param column name of its column
     * @param detail a sentence
     */
    record RowFault(int row, String column, String detail) {}

    /**
     * All that is wrong with the order and the sizes in a table.
     *
     * @param rows its rows; what could not be read, or is out of its range, is not a number and has no further fault
     */
    static List<RowFault> faults(List<TableRow> rows) {
        List<RowFault> faults = new ArrayList<>();
        if (rows.size() < 2) {
            faults.add(new RowFault(-1, "", "a table must have at least 2 rows, not " + rows.size()));
        }
        rising(faults, "level", rows, TableRow::level);
        rising(faults, "volume", rows, TableRow::volume);
        for (int i = 0; i < rows.size(); i++) {
            SecondMoments s = rows.get(i).surface();
            double most = Math.sqrt(s.transverse() * s.longitudinal());
            if (Math.abs(s.product()) > most * (1 + PRINTED)) {
                faults.add(new RowFault(
                        i,
                        "inertiaTL",
                        "inertiaTL cannot be over the root of inertiaT times inertiaL: " + Words.given(s.product())
                                + " is over " + Words.rounded(most)));
            }
        }
        if (!rows.isEmpty() && rows.get(rows.size() - 1).volume() < BodyCheck.LEAST_VOLUME) {
            faults.add(new RowFault(rows.size() - 1, "volume", "the full tank has no volume"));
        }
        return faults;
    }

    /** A value is compared with the last one that is a number: whatever belongs between them, the two must rise. */
    private static void rising(
            List<RowFault> faults, String column, List<TableRow> rows, ToDoubleFunction<TableRow> read) {
        double before = Double.NaN;
        for (int i = 0; i < rows.size(); i++) {
            double value = read.applyAsDouble(rows.get(i));
            if (value <= before) {
                faults.add(new RowFault(
                        i,
                        column,
                        column + " must rise from row to row: " + Words.given(value) + " follows "
                                + Words.given(before)));
            }
            before = Double.isNaN(value) ? before : value;
        }
    }
}
