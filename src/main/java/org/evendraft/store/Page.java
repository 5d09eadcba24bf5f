package org.evendraft.store;

import java.util.List;
import java.util.function.Function;

/**
 * Part of a list.
 *
 * @param items what stands on the page
 * @param total length of the whole list
 * @param <T> what is listed
 */
public record Page<T>(List<T> items, long total) {

    /** Copies the list. */
    public Page {
        items = List.copyOf(items);
    }

    /**
     * The page with every item changed.
     *
     * @param change what becomes of an item
     * @param <R> what it becomes
     */
    public <R> Page<R> map(Function<? super T, ? extends R> change) {
        return new Page<>(items.stream().<R>map(change).toList(), total);
    }
}
