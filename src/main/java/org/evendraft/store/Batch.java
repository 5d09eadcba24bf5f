package org.evendraft.store;

import java.util.List;
import org.jdbi.v3.core.Handle;
import org.jdbi.v3.core.statement.PreparedBatch;

/** Inserts many rows with one prepared statement. */
final class Batch {
    /** Rows sent at once: enough to make the round trips few, few enough to bound the memory of a condition of 100 000 loads. */
    private static final int ROWS_AT_ONCE = 1000;

    private Batch() {}

    /**
     * Binds one row.
     *
     * @param <T> what becomes a row
     */
    interface RowBinder<T> {
        void bind(PreparedBatch row, T item);
    }

    /**
     * Inserts a row for each item; binds {@code ordinal}, the item's place in the list from 0, by itself.
     *
     * @param sql the statement with named parameters
     */
    static <T> void insert(Handle handle, String sql, List<T> items, RowBinder<? super T> binder) {
        if (items.isEmpty()) {
            return;
        }
        try (PreparedBatch batch = handle.prepareBatch(sql)) {
            int ordinal = 0;
            for (T item : items) {
                binder.bind(batch.bind("ordinal", ordinal), item);
                batch.add();
                ordinal++;
                if (ordinal % ROWS_AT_ONCE == 0) {
                    batch.execute();
                }
            }
            if (batch.size() > 0) {
                batch.execute();
            }
        }
    }
}
