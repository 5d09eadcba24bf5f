package org.evendraft.service;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import ch.qos.logback.classic.Level;
import ch.qos.logback.classic.Logger;
import ch.qos.logback.classic.spi.ILoggingEvent;
import ch.qos.logback.core.read.ListAppender;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.time.Clock;
import java.time.Duration;
import java.time.Instant;
import java.time.ZoneId;
import java.time.ZoneOffset;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.UUID;
import java.util.concurrent.CancellationException;
import org.evendraft.platform.Json;
import org.evendraft.store.Database;
import org.evendraft.store.JobState;
import org.evendraft.store.NewJob;
import org.evendraft.store.PageRequest;
import org.evendraft.store.StoredJob;
import org.jdbi.v3.core.JdbiException;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.slf4j.LoggerFactory;

/** What becomes of jobs when their service stops, is killed, is not alone, or cannot reach its database. */
class JobsTest {
    private static final Instant START = Instant.parse("2026-06-12T06:00:00Z");
    private static final String STOPPED = "the service stopped while it ran; ask again";
    private static final String PLATFORM = """
            { "id": "box", "waterDensity": 1.0,
              "hull": { "bodies": [ { "name": "hull", "shape": "box", "min": [-50, -10, 0], "max": [50, 10, 10] } ] },
              "lightship": { "mass": 6000, "x": 0, "y": 0, "z": 5 } }
            """;

    private final Database database = Database.open("jdbc:h2:mem:" + UUID.randomUUID(), "sa", "");
    private final ControlRoom first = room(database, START);
    private final SteppedWork work = new SteppedWork();

    @AfterEach
    void stop() {
        first.jobs().close();
        database.close();
    }

    private static ControlRoom room(Database database, Instant now) {
        return new ControlRoom(
                database,
                Clock.fixed(now, ZoneOffset.UTC),
                () -> UUID.randomUUID().toString(),
                "1");
    }

    private static StoredJob ask(ControlRoom room, Database database, SteppedWork work) {
        return database.inTransaction(room.jobs().prepare(new NewJob("allowableKg", "box", 1, "{}"), work)::store);
    }

    private static void storePlatform(ControlRoom room, Database database) {
        var document = Json.parse(PLATFORM.getBytes(StandardCharsets.UTF_8));
        database.inTransaction(room.storePlatform().prepare("box", PLATFORM, document, OptionalInt.empty())::store);
    }

    /** A job that the first instance works on. */
    private StoredJob running() {
        storePlatform(first, database);
        first.jobs().begin();
        StoredJob job = ask(first, database, work);
        work.awaitBegun();
        return job;
    }

    private static void assertFailedBecauseStopped(StoredJob job) {
        assertThat(job.state()).isEqualTo(JobState.FAILED);
        assertThat(job.reason()).contains(STOPPED);
        assertThat(job.finishedAt()).isPresent();
    }

    @Test
    void jobsOfAKilledServiceHaveFailedWhenItIsStartedAgainOnItsFile(@TempDir Path folder) {
        String url = "jdbc:h2:file:" + folder.resolve("store");
        Database lost = Database.open(url, "sa", "");
        ControlRoom killed = room(lost, START);
        storePlatform(killed, lost);
        killed.jobs().begin();
        String running = ask(killed, lost, work).id();
        work.awaitBegun();
        SteppedWork second = new SteppedWork();
        ask(killed, lost, second);
        second.awaitBegun();
        String queued = ask(killed, lost, new SteppedWork()).id();
        lost.close(); // nothing more reaches the file, as after a kill
        try (Database found = Database.open(url, "sa", "")) {
            // at the same moment: a file that one process can have open needs no waiting for signs of life
            Jobs again = room(found, START).jobs();
            again.begin();
            assertFailedBecauseStopped(again.read(running));
            assertFailedBecauseStopped(again.read(queued));
            again.close();
        }
        killed.jobs().close();
    }

    @Test
    void anotherInstanceLeavesTheJobsOfALivingOneAlone() {
        StoredJob job = running();
        Jobs second = room(database, START.plus(JobLedger.SILENCE)).jobs();
        second.begin();
        assertThat(second.read(job.id()).state()).isEqualTo(JobState.RUNNING);
        work.finish(21.5);
        StoredJob done = SteppedWork.await(() -> second.read(job.id()), j -> j.state() == JobState.DONE);
        assertThat(done.fraction()).isEqualTo(1);
        assertThat(second.result(job.id())).isEqualTo("{\"kg\":21.5}");
        second.close();
    }

    @Test
    void anotherInstanceLetsTheJobsOfASilentOneFailAndTheirWorkStops() {
        StoredJob job = running();
        Jobs second =
                room(database, START.plus(JobLedger.SILENCE).plusMillis(1)).jobs();
        second.begin();
        assertFailedBecauseStopped(second.read(job.id()));
        // the silent one comes back to life and finds that its job has been given up
        work.awaitStopped();
        first.jobs().close();
        assertFailedBecauseStopped(second.read(job.id()));
        second.close();
    }

    @Test
    void anInstanceThatFallsSilentLaterIsNoticedToo() {
        StoredJob job = running();
        MovableClock clock = new MovableClock();
        Jobs second = new ControlRoom(database, clock, () -> UUID.randomUUID().toString(), "1").jobs();
        second.begin();
        assertThat(second.read(job.id()).state()).isEqualTo(JobState.RUNNING);
        clock.now = START.plus(Duration.ofHours(1));
        assertFailedBecauseStopped(SteppedWork.await(() -> second.read(job.id()), j -> j.state() != JobState.RUNNING));
        second.close();
    }

    @Test
    void aJobCancelledThroughAnotherInstanceStops() {
        StoredJob job = running();
        Jobs second = room(database, START).jobs();
        second.begin();
        assertThat(second.cancel(job.id()).job().state()).isEqualTo(JobState.CANCELLED);
        work.awaitStopped();
        assertThat(first.jobs().read(job.id()).state()).isEqualTo(JobState.CANCELLED);
        second.close();
    }

    @Test
    void whenTheServiceStopsItsJobsStopAndHaveFailed() {
        StoredJob job = running();
        SteppedWork other = new SteppedWork();
        ask(first, database, other);
        other.awaitBegun();
        SteppedWork waiting = new SteppedWork();
        StoredJob queued = ask(first, database, waiting);
        work.put(0.25, "last words");
        SteppedWork.await(() -> first.jobs().read(job.id()), j -> j.fraction() == 0.25);
        first.jobs().close();
        work.awaitStopped();
        StoredJob failed = first.jobs().read(job.id());
        assertFailedBecauseStopped(failed);
        assertThat(failed.fraction()).isEqualTo(0.25);
        assertThat(failed.doing()).contains("last words");
        assertFailedBecauseStopped(first.jobs().read(queued.id()));
        assertThat(waiting.runs()).isZero();
        assertThatThrownBy(() -> ask(first, database, new SteppedWork()))
                .isInstanceOfSatisfying(
                        Refusal.class, e -> assertThat(e.reason()).isEqualTo(Reason.UNAVAILABLE));
    }

    @Test
    void aServiceThatHasNotBegunTakesNoJobs() {
        storePlatform(first, database);
        assertThatThrownBy(() -> ask(first, database, work))
                .isInstanceOfSatisfying(
                        Refusal.class, e -> assertThat(e.reason()).isEqualTo(Reason.UNAVAILABLE));
        assertThat(first.jobs().page(Optional.empty(), new PageRequest(1, 0)).total())
                .isZero();
    }

    @Test
    void aResultThatCannotBeStoredAtOnceIsStoredLater() {
        StoredJob job = running();
        ListAppender<ILoggingEvent> log = new ListAppender<>();
        log.start();
        Logger logger = (Logger) LoggerFactory.getLogger(JobRunner.class);
        logger.setLevel(Level.WARN);
        logger.setAdditive(false);
        logger.addAppender(log);
        database.jdbi().useHandle(handle -> handle.execute("ALTER TABLE job RENAME TO job_out_of_reach"));
        work.finish(21.5);
        SteppedWork.await(
                () -> List.copyOf(log.list), // told once the first attempt has failed
                told -> told.stream().anyMatch(e -> e.getMessage().contains("not stored yet")));
        logger.detachAppender(log);
        logger.setAdditive(true);
        logger.setLevel(null);
        database.jdbi().useHandle(handle -> handle.execute("ALTER TABLE job_out_of_reach RENAME TO job"));
        SteppedWork.await(() -> first.jobs().read(job.id()), j -> j.state() == JobState.DONE);
        assertThat(first.jobs().result(job.id())).isEqualTo("{\"kg\":21.5}");
    }

    @Test
    void aJobThatIsNotStoredTakesNoPlace() {
        storePlatform(first, database);
        first.jobs().begin();
        for (int i = 0; i <= JobRunner.AT_ONCE + JobRunner.MOST_WAITING; i++) {
            assertThatThrownBy(() -> store(new NewJob("allowableKg", "nobody", 1, "{}"), false))
                    .isInstanceOf(JdbiException.class);
            assertThatThrownBy(() -> store(new NewJob("allowableKg", "box", 1, "{}"), true))
                    .isInstanceOf(CancellationException.class);
        }
        ask(first, database, work);
        work.awaitBegun();
        assertThat(work.runs()).isEqualTo(1);
    }

    private void store(NewJob job, boolean breakOff) {
        Pending<StoredJob> pending = first.jobs().prepare(job, work);
        database.inTransaction(handle -> {
            StoredJob stored = pending.store(handle);
            if (breakOff) {
                throw new CancellationException("undone");
            }
            return stored;
        });
    }

    private static final class MovableClock extends Clock {
        private volatile Instant now = START;

        @Override
        public ZoneId getZone() {
            return ZoneOffset.UTC;
        }

        @Override
        public Clock withZone(ZoneId zone) {
            throw new IllegalStateException("the service keeps UTC");
        }

        @Override
        public Instant instant() {
            return now;
        }
    }
}
