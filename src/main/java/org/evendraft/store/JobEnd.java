package org.evendraft.store;

/** What the work on a job came to. */
public sealed interface JobEnd {
    /**
     * It has a result.
     *
     * @param resultJson JSON text of the result
     */
    record Done(String resultJson) implements JobEnd {}

    /**
     * It has none.
     *
     * @param reason why, in words
     */
    record Failed(String reason) implements JobEnd {}
}
