package org.evendraft.service;

import java.util.Optional;
import java.util.function.Supplier;
import org.evendraft.store.Claim;
import org.evendraft.store.Database;
import org.evendraft.store.IdempotencyRepository;
import org.evendraft.store.IdempotentRequest;
import org.jdbi.v3.core.Handle;

/**
 * Carries out a write once, however often it is asked for under one idempotency key. The answer is stored in the transaction of
 * the write, so that there is never one without the other.
 */
public final class Once {
    /** The longest key that is taken. */
    public static final int LONGEST_KEY = 255;

    private final Database database;
    private final IdempotencyRepository answers;

    Once(Database database, IdempotencyRepository answers) {
        this.database = database;
        this.answers = answers;
    }

    /**
     * Carries it out, or gives the first answer again.
     *
     * @param request the request with its key; none when it carries no key and is carried out each time
     * @param work checks and computes the write
     * @return the answer; what it tells of is on disk
     * @throws Refusal when the key has been used for another request, or the same request is being carried out
     */
    public Reply carryOut(Optional<IdempotentRequest> request, Supplier<Pending<Reply>> work) {
        if (request.isEmpty()) {
            Pending<Reply> pending = work.get();
            return database.inTransaction(pending::store);
        }
        IdempotentRequest known = request.get();
        Optional<Claim> earlier = database.read(handle -> answers.find(handle, known));
        if (earlier.isPresent()) {
            // Another thread may have committed that answer and not yet flushed it: this returns when it is on disk.
            return database.inTransaction(handle -> replay(earlier.get()));
        }
        Pending<Reply> pending = work.get();
        return database.inTransaction(handle -> store(handle, known, pending));
    }

    private Reply store(Handle handle, IdempotentRequest request, Pending<Reply> pending) {
        Claim claim = answers.claim(handle, request);
        if (!(claim instanceof Claim.Claimed)) {
            return replay(claim);
        }
        Reply reply = pending.store(handle);
        answers.answer(handle, request, reply.toStore());
        return reply;
    }

    private static Reply replay(Claim claim) {
        if (claim instanceof Claim.Answered answered) {
            return Reply.stored(answered.answer());
        }
        if (claim instanceof Claim.OtherRequest) {
            throw new Refusal(
                    Reason.KEY_REUSED, "This Idempotency-Key has been used for another request; take a new one.");
        }
        throw new Refusal(
                Reason.CONFLICT, "A request with this Idempotency-Key is being carried out; repeat it in a moment.");
    }
}
