package org.evendraft.store;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.time.Instant;
import java.time.InstantSource;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.concurrent.ExecutionException;
import java.util.function.BiFunction;
import org.jdbi.v3.core.Handle;
import org.jdbi.v3.core.JdbiException;
import org.junit.jupiter.api.Test;

/** What holds of jobs on every engine. */
interface JobContract extends StoreContract {
    JobProgress HALF_WAY = new JobProgress(0.5, Optional.of("draft 3 of 6"));
    Instant LATER = Samples.NOON.plusSeconds(60);

    private <T> T at(Instant now, BiFunction<JobRepository, Handle, T> work) {
        JobRepository jobs = new JobRepository(InstantSource.fixed(now), Samples::newId);
        return database().inTransaction(handle -> work.apply(jobs, handle));
    }

    /** Registers a run of the service, alive at a moment. */
    private String runAt(Instant now) {
        String run = Samples.newId();
        at(now, (jobs, handle) -> {
            jobs.register(handle, run);
            return run;
        });
        return run;
    }

    private StoredJob save(Instant now, String platform, String run) {
        NewJob job = new NewJob("allowableKg", platform, 1, "{\"drafts\":[18]}");
        return at(now, (jobs, handle) -> jobs.save(handle, job, run));
    }

    private StoredJob running(String run) {
        StoredJob job = save(Samples.NOON, Samples.storedPlatform(database()), run);
        assertThat(begin(job.id(), run)).isTrue();
        return job;
    }

    private boolean begin(String id, String run) {
        return at(LATER, (jobs, handle) -> jobs.begin(handle, id, run));
    }

    private boolean finish(String id, String run, JobEnd end) {
        return at(LATER, (jobs, handle) -> jobs.finish(handle, id, run, HALF_WAY, end));
    }

    private boolean cancel(String id) {
        return at(LATER, (jobs, handle) -> jobs.cancel(handle, id));
    }

    private void advance(String id, String run) {
        at(LATER, (jobs, handle) -> {
            jobs.advance(handle, id, run, HALF_WAY);
            return true;
        });
    }

    private Optional<StoredJob> lookUp(String id) {
        return at(LATER, (jobs, handle) -> jobs.find(handle, id));
    }

    private StoredJob find(String id) {
        return lookUp(id).orElseThrow();
    }

    private Set<String> unfinished(String run) {
        return at(LATER, (jobs, handle) -> jobs.unfinished(handle, run));
    }

    private int failAbandoned(Instant since) {
        return at(LATER, (jobs, handle) -> jobs.failAbandoned(handle, since, "gone"));
    }

    private int failAllOfOthers(String run) {
        return at(LATER, (jobs, handle) -> jobs.failAllOfOthers(handle, run, "gone"));
    }

    private Optional<String> result(String id) {
        return at(LATER, (jobs, handle) -> jobs.result(handle, id));
    }

    @Test
    default void aJobIsQueuedAsItWasAskedFor() {
        String run = runAt(Samples.NOON);
        String platform = Samples.storedPlatform(database());
        StoredJob job = save(LATER, platform, run);
        assertThat(job)
                .isEqualTo(new StoredJob(
                        job.id(),
                        "allowableKg",
                        platform,
                        1,
                        JobState.QUEUED,
                        0,
                        Optional.empty(),
                        Optional.empty(),
                        LATER,
                        Optional.empty(),
                        Optional.empty()));
        assertThat(find(job.id())).isEqualTo(job);
        assertThat(Samples.rows(database(), "SELECT request, owner FROM job WHERE id = :id", job.id()))
                .containsExactly("{\"drafts\":[18]} " + run);
        assertThat(lookUp("none")).isEmpty();
    }

    @Test
    default void aJobRunsAdvancesAndIsDone() {
        String run = runAt(Samples.NOON);
        StoredJob job = running(run);
        assertThat(begin(job.id(), run)).as("begun twice").isFalse();
        advance(job.id(), run);
        StoredJob advanced = find(job.id());
        assertThat(advanced.state()).isEqualTo(JobState.RUNNING);
        assertThat(advanced.startedAt()).contains(LATER);
        assertThat(advanced.fraction()).isEqualTo(0.5);
        assertThat(advanced.doing()).contains("draft 3 of 6");
        assertThat(result(job.id())).isEmpty();
        assertThat(finish(job.id(), run, new JobEnd.Done("{\"kg\":21.5}"))).isTrue();
        StoredJob done = find(job.id());
        assertThat(done.state()).isEqualTo(JobState.DONE);
        assertThat(done.finishedAt()).contains(LATER);
        assertThat(done.reason()).isEmpty();
        assertThat(result(job.id())).contains("{\"kg\":21.5}");
    }

    @Test
    default void aFailedJobTellsWhyAndHasNoResult() {
        String run = runAt(Samples.NOON);
        StoredJob job = running(run);
        assertThat(finish(job.id(), run, new JobEnd.Failed("it floats nowhere")))
                .isTrue();
        StoredJob failed = find(job.id());
        assertThat(failed.state()).isEqualTo(JobState.FAILED);
        assertThat(failed.reason()).contains("it floats nowhere");
        assertThat(failed.finishedAt()).contains(LATER);
        assertThat(result(job.id())).isEmpty();
    }

    @Test
    default void aFinishedJobIsNeverChanged() {
        String run = runAt(Samples.NOON);
        JobEnd done = new JobEnd.Done("{}");
        StoredJob cancelled = running(run);
        assertThat(cancel(cancelled.id())).isTrue();
        StoredJob before = find(cancelled.id());
        assertThat(before.state()).isEqualTo(JobState.CANCELLED);
        assertThat(before.finishedAt()).contains(LATER);
        assertThat(cancel(cancelled.id())).isFalse();
        assertThat(begin(cancelled.id(), run)).isFalse();
        assertThat(finish(cancelled.id(), run, done)).isFalse();
        advance(cancelled.id(), run);
        assertThat(find(cancelled.id())).isEqualTo(before);
        StoredJob finished = running(run);
        assertThat(finish(finished.id(), run, done)).isTrue();
        assertThat(cancel(finished.id())).isFalse();
        assertThat(finish(finished.id(), run, new JobEnd.Failed("late"))).isFalse();
        assertThat(find(finished.id()).state()).isEqualTo(JobState.DONE);
        assertThat(cancel("none")).isFalse();
    }

    @Test
    default void onlyItsOwnerWorksOnAJobAndAnyoneMayCancelIt() {
        String run = runAt(Samples.NOON);
        String other = runAt(Samples.NOON);
        StoredJob job = save(Samples.NOON, Samples.storedPlatform(database()), run);
        assertThat(begin(job.id(), other)).isFalse();
        assertThat(begin(job.id(), run)).isTrue();
        advance(job.id(), other);
        assertThat(find(job.id()).fraction()).isZero();
        assertThat(finish(job.id(), other, new JobEnd.Done("{}"))).isFalse();
        assertThat(unfinished(run)).containsExactly(job.id());
        assertThat(unfinished(other)).isEmpty();
        assertThat(cancel(job.id())).isTrue();
        assertThat(unfinished(run)).isEmpty();
    }

    @Test
    default void unfinishedJobsOfASilentRunFailAndNoOthers() {
        String silent = runAt(Samples.NOON.minusSeconds(100));
        String alive = runAt(Samples.NOON.minusSeconds(100));
        String platform = Samples.storedPlatform(database());
        StoredJob queued = save(Samples.NOON.minusSeconds(40), platform, silent);
        StoredJob running = save(Samples.NOON.minusSeconds(40), platform, silent);
        begin(running.id(), silent);
        StoredJob done = save(Samples.NOON.minusSeconds(40), platform, silent);
        finish(done.id(), silent, new JobEnd.Done("{}"));
        StoredJob ofAlive = save(Samples.NOON.minusSeconds(40), platform, alive);
        at(Samples.NOON.minusSeconds(30), (jobs, handle) -> {
            jobs.markAlive(handle, alive);
            return true;
        });
        Instant since = Samples.NOON.minusSeconds(30);
        assertThat(failAbandoned(since)).isEqualTo(2);
        for (StoredJob abandoned : List.of(queued, running)) {
            StoredJob failed = find(abandoned.id());
            assertThat(failed.state()).isEqualTo(JobState.FAILED);
            assertThat(failed.reason()).contains("gone");
            assertThat(failed.finishedAt()).contains(LATER);
        }
        assertThat(find(done.id()).state()).isEqualTo(JobState.DONE);
        assertThat(find(ofAlive.id()).state()).isEqualTo(JobState.QUEUED);
    }

    @Test
    default void allUnfinishedJobsOfOtherRunsCanBeGivenUp() {
        String run = runAt(LATER);
        String other = runAt(LATER);
        StoredJob mine = running(run);
        StoredJob running = running(other);
        StoredJob done = running(other);
        finish(done.id(), other, new JobEnd.Done("{}"));
        assertThat(failAllOfOthers(run)).isPositive();
        assertThat(find(mine.id()).state()).isEqualTo(JobState.RUNNING);
        assertThat(find(running.id()).reason()).contains("gone");
        assertThat(find(done.id()).state()).isEqualTo(JobState.DONE);
    }

    @Test
    default void savingAJobIsASignOfLife() {
        String run = runAt(Samples.NOON.minusSeconds(1000));
        StoredJob job = save(Samples.NOON, Samples.storedPlatform(database()), run);
        failAbandoned(Samples.NOON);
        assertThat(find(job.id()).state()).isEqualTo(JobState.QUEUED);
    }

    @Test
    default void jobsArePagedNewestFirstOfOnePlatformOrAll() {
        String run = runAt(Samples.NOON);
        String platform = Samples.storedPlatform(database());
        String first = save(LATER.plusSeconds(1), platform, run).id();
        String second = save(LATER.plusSeconds(2), platform, run).id();
        String third = save(LATER.plusSeconds(3), platform, run).id();
        String other = save(LATER.plusSeconds(4), Samples.storedPlatform(database()), run)
                .id();
        assertThat(page(Optional.of(platform), new PageRequest(2, 0))).isEqualTo(new Page<>(List.of(third, second), 3));
        assertThat(page(Optional.of(platform), new PageRequest(2, 2))).isEqualTo(new Page<>(List.of(first), 3));
        assertThat(page(Optional.empty(), new PageRequest(3, 0)).items()).containsExactly(other, third, second);
        assertThat(page(Optional.of("none"), new PageRequest(3, 0)).total()).isZero();
    }

    private Page<String> page(Optional<String> platform, PageRequest page) {
        return at(LATER, (jobs, handle) -> jobs.page(handle, platform, page)).map(StoredJob::id);
    }

    @Test
    default void ofTwoWhoFinishAJobAtOnceOneSucceeds() throws InterruptedException, ExecutionException {
        String run = runAt(Samples.NOON);
        for (int round = 0; round < 5; round++) {
            StoredJob job = running(run);
            List<Boolean> succeeded = Simultaneously.run(
                    2, number -> number == 0 ? cancel(job.id()) : finish(job.id(), run, new JobEnd.Done("{\"kg\":1}")));
            assertThat(succeeded).containsOnlyOnce(true);
            assertThat(find(job.id()).state()).isEqualTo(succeeded.get(0) ? JobState.CANCELLED : JobState.DONE);
        }
    }

    @Test
    default void aJobOfAnUnknownPlatformOrRunIsRefused() {
        String run = runAt(Samples.NOON);
        assertThatThrownBy(() -> save(Samples.NOON, "none", run)).isInstanceOf(JdbiException.class);
        String platform = Samples.storedPlatform(database());
        assertThatThrownBy(() -> save(Samples.NOON, platform, "none")).isInstanceOf(JdbiException.class);
    }

    @Test
    default void theEndOfATransactionIsTold() {
        StringBuilder told = new StringBuilder();
        database().inTransaction(handle -> {
            Database.whenEnded(handle, () -> told.append("committed "), () -> told.append("undone "));
            return told.append("open ");
        });
        assertThatThrownBy(() -> database().inTransaction(handle -> {
                    Database.whenEnded(handle, () -> told.append("committed "), () -> told.append("undone "));
                    throw new IllegalStateException("no");
                }))
                .isInstanceOf(IllegalStateException.class);
        assertThat(told).hasToString("open committed undone ");
    }

    @Test
    default void workInPassingIsCommitted() {
        String run = Samples.newId();
        database().inPassing(handle -> {
            new JobRepository(Samples.AT_NOON, Samples::newId).register(handle, run);
            return run;
        });
        assertThat(Samples.rows(database(), "SELECT id FROM service_run WHERE id = :id", run))
                .containsExactly(run);
    }
}
