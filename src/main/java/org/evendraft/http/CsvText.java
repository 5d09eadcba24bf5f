package org.evendraft.http;

import java.util.List;
import org.evendraft.platform.TableRow;
import org.evendraft.platform.TankTables;

/** Answers in CSV (RFC 4180) with a header row. */
final class CsvText {
    static final String MEDIA_TYPE = "text/csv";

    private static final String WITH_CHARSET = MEDIA_TYPE + "; charset=utf-8; header=present";

    private CsvText() {}

    static Answer table(List<TableRow> rows) {
        return answer(TankTables.toCsv(rows));
    }

    /** A text that is CSV already. */
    static Answer answer(String csv) {
        return Answer.text(200, WITH_CHARSET, csv);
    }
}
