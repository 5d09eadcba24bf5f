package org.evendraft;

import java.time.Clock;
import java.util.UUID;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.atomic.AtomicBoolean;
import org.evendraft.cli.Station;
import org.evendraft.http.HttpServer;
import org.evendraft.http.Options;
import org.evendraft.service.ControlRoom;
import org.evendraft.service.Reason;
import org.evendraft.service.Refusal;
import org.evendraft.store.Database;
import org.jspecify.annotations.Nullable;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;

/** The service with its database, put together by hand. */
final class RunningStation implements Station {
    private static final Logger LOG = LoggerFactory.getLogger(RunningStation.class);

    private final Settings settings;
    private final Database database;
    private final ControlRoom controlRoom;
    private final CountDownLatch stopped = new CountDownLatch(1);
    private final AtomicBoolean closing = new AtomicBoolean();
    private volatile @Nullable HttpServer server;

    private RunningStation(Settings settings, Database database, String version) {
        this.settings = settings;
        this.database = database;
        this.controlRoom = new ControlRoom(
                database, Clock.systemUTC(), () -> UUID.randomUUID().toString(), version);
    }

    /**
     * Opens the database and puts the service together; it is stopped with the program at the latest.
     *
     * @throws Refusal when the database cannot be opened
     */
    static RunningStation open(Settings settings, String version) {
        Database database = open(settings.database());
        RunningStation station = new RunningStation(settings, database, version);
        Runtime.getRuntime().addShutdownHook(new Thread(station::close, "stop"));
        return station;
    }

    // The pool, the migrations and the drivers throw what they like; whoever starts the program needs one sentence.
    private static Database open(Settings.DatabaseSettings at) {
        try {
            return Database.open(at.url(), at.user(), at.password());
        } catch (RuntimeException e) {
            LOG.debug("the database cannot be opened", e);
            Throwable cause = e;
            while (cause.getCause() != null) {
                cause = cause.getCause();
            }
            throw new Refusal(
                    Reason.UNAVAILABLE, "The database at " + at.url() + " cannot be opened: " + cause.getMessage());
        }
    }

    @Override
    public ControlRoom controlRoom() {
        return controlRoom;
    }

    @Override
    public String listen() {
        Options options = new Options(
                settings.host(), settings.port(), settings.maxBodyBytes(), settings.requestTime(), settings.token());
        controlRoom.jobs().begin();
        HttpServer started = HttpServer.start(options, controlRoom);
        server = started;
        LOG.atInfo().addKeyValue("address", started.address()).log("listening");
        return started.address();
    }

    @Override
    public void awaitStop() {
        try {
            stopped.await();
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
        }
    }

    @Override
    public void close() {
        if (!closing.compareAndSet(false, true)) {
            return;
        }
        HttpServer running = server;
        if (running != null) {
            running.close();
            LOG.info("stopped");
        }
        controlRoom.jobs().close();
        database.close();
        stopped.countDown();
    }
}
