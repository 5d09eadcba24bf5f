package org.evendraft.store;

/** What is known of a request's key. */
public sealed interface Claim {
    /** The key is new and now this transaction's, which must store an answer before it commits. */
    record Claimed() implements Claim {}

    /**
     * The same request has been answered.
     *
     * @param answer the first answer
     */
    record Answered(IdempotentAnswer answer) implements Claim {}

    /** The key has been used for another request: another body, method or path. */
    record OtherRequest() implements Claim {}

    /** Another transaction holds the key and does not end; try again later. */
    record Busy() implements Claim {}
}
