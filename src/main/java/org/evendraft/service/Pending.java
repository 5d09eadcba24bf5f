package org.evendraft.service;

import java.util.function.Function;
import org.jdbi.v3.core.Handle;

/**
 * A write that has been checked and computed and is yet to be stored, so that no transaction is open while anything is computed.
 *
 * @param <T> what tells that it is stored
 */
public final class Pending<T> {
    private final Function<Handle, T> write;

    Pending(Function<Handle, T> write) {
        this.write = write;
    }

    /** Something to tell that needs no writing. */
    public static <T> Pending<T> of(T told) {
        return new Pending<>(handle -> told);
    }

    /** The same write, telling something else. */
    public <R> Pending<R> then(Function<? super T, ? extends R> next) {
        return new Pending<>(handle -> next.apply(write.apply(handle)));
    }

    T store(Handle handle) {
        return write.apply(handle);
    }
}
