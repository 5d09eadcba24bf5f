package org.evendraft.store;

import java.sql.ResultSet;
import java.sql.SQLException;
import java.time.Instant;
import java.time.InstantSource;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.function.Supplier;
import java.util.stream.Collectors;
import org.jdbi.v3.core.Handle;
import org.jdbi.v3.core.statement.Query;

/**
 * Keeps jobs, and the runs of the service that work on them. A job that is finished is never changed: each change asks in the same
 * statement that the job is not, so of two that race one wins and the other is told so. Safe from many threads.
 */
public final class JobRepository {
    private static final String SELECT = """
            SELECT id, kind, platform_id, platform_revision, state, fraction, doing, reason, created_at, started_at, finished_at
            FROM job
            """;

    private static final String UNFINISHED = " state IN ('QUEUED', 'RUNNING') ";

    private final InstantSource clock;
    private final Supplier<String> ids;

    /**
     * @param clock tells when something happens to a job
     * @param ids makes the id of a job, a UUID
     */
    public JobRepository(InstantSource clock, Supplier<String> ids) {
        this.clock = clock;
        this.ids = ids;
    }

    /** Keeps a run of the service, which may then own jobs. */
    public void register(Handle handle, String run) {
        handle.createUpdate("INSERT INTO service_run (id, started_at, alive_at) VALUES (:run, :now, :now)")
                .bind("run", run)
                .bind("now", clock.instant())
                .execute();
    }

    /** Notes that a run is alive. */
    public void markAlive(Handle handle, String run) {
        handle.createUpdate("UPDATE service_run SET alive_at = :now WHERE id = :run")
                .bind("run", run)
                .bind("now", clock.instant())
                .execute();
    }

    /**
     * Stores a job, queued, and notes that its owner is alive.
     *
     * @param job the job
     * @param owner the run of the service that works on it, registered
     */
    public StoredJob save(Handle handle, NewJob job, String owner) {
        markAlive(handle, owner);
        StoredJob stored = new StoredJob(
                ids.get(),
                job.kind(),
                job.platformId(),
                job.platformRevision(),
                JobState.QUEUED,
                JobProgress.NONE.fraction(),
                JobProgress.NONE.doing(),
                Optional.empty(),
                InstantBinding.toMicros(clock.instant()),
                Optional.empty(),
                Optional.empty());
        handle.createUpdate("""
                        INSERT INTO job (id, kind, platform_id, platform_revision, request, owner, state, fraction, created_at)
                        VALUES (:id, :kind, :platform, :revision, :request, :owner, :state, :fraction, :now)""")
                .bind("id", stored.id())
                .bind("kind", stored.kind())
                .bind("platform", stored.platform())
                .bind("revision", stored.platformRevision())
                .bind("request", job.requestJson())
                .bind("owner", owner)
                .bind("state", stored.state().name())
                .bind("fraction", stored.fraction())
                .bind("now", stored.createdAt())
                .execute();
        return stored;
    }

    /**
     * Notes that the work on a queued job begins.
     *
     * @return whether the job was still queued and is this run's
     */
    public boolean begin(Handle handle, String id, String owner) {
        return handle.createUpdate("""
                                UPDATE job SET state = 'RUNNING', started_at = :now
                                WHERE id = :id AND owner = :owner AND state = 'QUEUED'""")
                        .bind("id", id)
                        .bind("owner", owner)
                        .bind("now", clock.instant())
                        .execute()
                == 1;
    }

    /** Notes how far the work on a job has come, if it is running. */
    public void advance(Handle handle, String id, String owner, JobProgress progress) {
        handle.createUpdate("""
                        UPDATE job SET fraction = :fraction, doing = :doing
                        WHERE id = :id AND owner = :owner AND state = 'RUNNING'""")
                .bind("id", id)
                .bind("owner", owner)
                .bind("fraction", progress.fraction())
                .bind("doing", progress.doing().orElse(null))
                .execute();
    }

    /**
     * Stores what the work on a job came to.
     *
     * @param progress how far it came
     * @return whether the job was not finished before and is this run's
     */
    public boolean finish(Handle handle, String id, String owner, JobProgress progress, JobEnd end) {
        Optional<String> result = end instanceof JobEnd.Done done ? Optional.of(done.resultJson()) : Optional.empty();
        Optional<String> reason = end instanceof JobEnd.Failed failed ? Optional.of(failed.reason()) : Optional.empty();
        return handle.createUpdate("""
                                UPDATE job SET state = :state, fraction = :fraction, doing = :doing, reason = :reason,
                                    result = :result, finished_at = :now
                                WHERE id = :id AND owner = :owner AND""" + UNFINISHED)
                        .bind("id", id)
                        .bind("owner", owner)
                        .bind("state", (result.isPresent() ? JobState.DONE : JobState.FAILED).name())
                        .bind("fraction", progress.fraction())
                        .bind("doing", progress.doing().orElse(null))
                        .bind("reason", reason.orElse(null))
                        .bind("result", result.orElse(null))
                        .bind("now", clock.instant())
                        .execute()
                == 1;
    }

    /**
     * Cancels a job, whoever works on it.
     *
     * @return whether there is one that was not finished before
     */
    public boolean cancel(Handle handle, String id) {
        return handle.createUpdate("UPDATE job SET state = 'CANCELLED', finished_at = :now WHERE id = :id AND"
                                + UNFINISHED)
                        .bind("id", id)
                        .bind("now", clock.instant())
                        .execute()
                == 1;
    }

    /**
     * Lets every unfinished job fail whose owner has shown no sign of life for a while.
     *
     * @param silentSince owners that were alive at this moment or later are left alone
     * @param reason why, in words
     * @return how many jobs failed
     */
    public int failAbandoned(Handle handle, Instant silentSince, String reason) {
        return handle.createUpdate("UPDATE job SET state = 'FAILED', reason = :reason, finished_at = :now WHERE"
                        + UNFINISHED + "AND owner IN (SELECT id FROM service_run WHERE alive_at < :since)")
                .bind("reason", reason)
                .bind("now", clock.instant())
                .bind("since", silentSince)
                .execute();
    }

    /**
     * Lets every unfinished job of any other run fail: for a database that no other process can have open.
     *
     * @param run the run whose jobs are left alone
     * @param reason why, in words
     * @return how many jobs failed
     */
    public int failAllOfOthers(Handle handle, String run, String reason) {
        return handle.createUpdate("UPDATE job SET state = 'FAILED', reason = :reason, finished_at = :now WHERE"
                        + UNFINISHED + "AND owner <> :run")
                .bind("reason", reason)
                .bind("now", clock.instant())
                .bind("run", run)
                .execute();
    }

    /** Ids of the unfinished jobs of a run. */
    public Set<String> unfinished(Handle handle, String owner) {
        return handle
                .createQuery("SELECT id FROM job WHERE owner = :owner AND" + UNFINISHED)
                .bind("owner", owner)
                .mapTo(String.class)
                .stream()
                .collect(Collectors.toUnmodifiableSet());
    }

    /** A job. */
    public Optional<StoredJob> find(Handle handle, String id) {
        return handle.createQuery(SELECT + "WHERE id = :id")
                .bind("id", id)
                .map((row, context) -> job(row))
                .findOne();
    }

    /** The result of a job that is done, as JSON text. */
    public Optional<String> result(Handle handle, String id) {
        return handle.createQuery("SELECT result FROM job WHERE id = :id AND state = 'DONE'")
                .bind("id", id)
                .mapTo(String.class)
                .findOne();
    }

    /**
     * Jobs, newest first.
     *
     * @param platform the platform whose jobs are wanted; empty for all
     */
    public Page<StoredJob> page(Handle handle, Optional<String> platform, PageRequest page) {
        String where = platform.isPresent() ? "WHERE platform_id = :platform " : "";
        long total = bind(handle.createQuery("SELECT COUNT(*) FROM job " + where), platform)
                .mapTo(Long.class)
                .one();
        List<StoredJob> items = bind(
                        handle.createQuery(
                                SELECT + where + "ORDER BY created_at DESC, id DESC LIMIT :limit OFFSET :offset"),
                        platform)
                .bind("limit", page.limit())
                .bind("offset", page.offset())
                .map((row, context) -> job(row))
                .list();
        return new Page<>(items, total);
    }

    private static Query bind(Query statement, Optional<String> platform) {
        platform.ifPresent(id -> statement.bind("platform", id));
        return statement;
    }

    private static StoredJob job(ResultSet row) throws SQLException {
        return new StoredJob(
                row.getString("id"),
                row.getString("kind"),
                row.getString("platform_id"),
                row.getInt("platform_revision"),
                JobState.valueOf(row.getString("state")),
                row.getDouble("fraction"),
                Optional.ofNullable(row.getString("doing")),
                Optional.ofNullable(row.getString("reason")),
                InstantBinding.read(row, "created_at"),
                InstantBinding.readOptional(row, "started_at"),
                InstantBinding.readOptional(row, "finished_at"));
    }
}
