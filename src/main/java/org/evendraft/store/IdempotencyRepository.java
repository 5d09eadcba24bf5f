package org.evendraft.store;

import java.sql.ResultSet;
import java.sql.SQLException;
import java.time.Instant;
import java.time.InstantSource;
import java.util.Optional;
import java.util.Set;
import org.jdbi.v3.core.Handle;
import org.jdbi.v3.core.statement.UnableToExecuteStatementException;

/**
 * Keeps the first answer to each request that its sender may repeat. The way of a request: {@link #find}; when it is new, compute
 * with no transaction open; then in one transaction {@link #claim}, and when claimed, write and {@link #answer}. So the answer
 * and what it tells of are stored together or not at all. Safe from many threads.
 */
public final class IdempotencyRepository {
    private static final String SAVEPOINT = "claim";

    /** SQLSTATE of a wait that took too long: H2, PostgreSQL. */
    private static final Set<String> WAITED_TOO_LONG = Set.of("HYT00", "55P03");

    private final InstantSource clock;

    /**
     * @param clock tells when a key is claimed
     */
    public IdempotencyRepository(InstantSource clock) {
        this.clock = clock;
    }

    /** What is known of a request: answered or another; empty when its key is new or not yet answered. */
    public Optional<Claim> find(Handle handle, IdempotentRequest request) {
        return handle.createQuery("""
                        SELECT method, path, body_sha256, status, location, etag, content_type, body
                        FROM idempotent_answer WHERE idempotency_key = :key AND status IS NOT NULL""")
                .bind("key", request.key())
                .map((row, context) -> known(row, request))
                .findOne();
    }

    private static Claim known(ResultSet row, IdempotentRequest request) throws SQLException {
        IdempotentRequest first = new IdempotentRequest(
                request.key(), row.getString("method"), row.getString("path"), row.getString("body_sha256"));
        return first.equals(request) ? new Claim.Answered(answer(row)) : new Claim.OtherRequest();
    }

    private static IdempotentAnswer answer(ResultSet row) throws SQLException {
        return new IdempotentAnswer(
                row.getInt("status"),
                Optional.ofNullable(row.getString("location")),
                Optional.ofNullable(row.getString("etag")),
                Optional.ofNullable(row.getString("content_type")),
                row.getString("body"));
    }

    /**
     * Claims a request's key for the transaction at hand. Waits for the end of another transaction that has claimed it, as long as
     * {@link Database} allows; the key is free again when that one rolls back.
     *
     * @throws IllegalStateException when the key was claimed and the answer never stored
     */
    public Claim claim(Handle handle, IdempotentRequest request) {
        handle.savepoint(SAVEPOINT);
        try {
            boolean claimed = insert(handle, request);
            handle.releaseSavepoint(SAVEPOINT);
            return claimed
                    ? new Claim.Claimed()
                    : find(handle, request)
                            .orElseThrow(() -> new IllegalStateException("no answer to key " + request.key()));
        } catch (UnableToExecuteStatementException failure) {
            if (failure.getCause() instanceof SQLException cause && WAITED_TOO_LONG.contains(cause.getSQLState())) {
                handle.rollbackToSavepoint(SAVEPOINT);
                return new Claim.Busy();
            }
            throw failure;
        }
    }

    private boolean insert(Handle handle, IdempotentRequest request) {
        return handle.createUpdate("""
                                INSERT INTO idempotent_answer (idempotency_key, method, path, body_sha256, created_at)
                                VALUES (:key, :method, :path, :body, :now) ON CONFLICT DO NOTHING""")
                        .bind("key", request.key())
                        .bind("method", request.method())
                        .bind("path", request.path())
                        .bind("body", request.bodySha256())
                        .bind("now", clock.instant())
                        .execute()
                == 1;
    }

    /**
     * Stores the answer to a request that this transaction has claimed.
     *
     * @throws IllegalStateException when it has not
     */
    public void answer(Handle handle, IdempotentRequest request, IdempotentAnswer answer) {
        int rows = handle.createUpdate("""
                        UPDATE idempotent_answer SET status = :status, location = :location, etag = :etag,
                            content_type = :contentType, body = :body
                        WHERE idempotency_key = :key AND status IS NULL""")
                .bind("key", request.key())
                .bind("status", answer.status())
                .bind("location", answer.location().orElse(null))
                .bind("etag", answer.etag().orElse(null))
                .bind("contentType", answer.contentType().orElse(null))
                .bind("body", answer.body())
                .execute();
        if (rows != 1) {
            throw new IllegalStateException("key " + request.key() + " is not claimed");
        }
    }

    /**
     * Forgets the answers to keys claimed before a moment.
     *
     * @return how many
     */
    public int forgetBefore(Handle handle, Instant moment) {
        return handle.createUpdate("DELETE FROM idempotent_answer WHERE created_at < :moment")
                .bind("moment", moment)
                .execute();
    }
}
