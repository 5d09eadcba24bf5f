package org.evendraft.http;

import java.time.Clock;
import java.time.Duration;
import java.time.Instant;
import java.time.ZoneId;
import java.time.ZoneOffset;
import java.util.Optional;
import java.util.UUID;
import java.util.function.Supplier;
import org.evendraft.service.ControlRoom;
import org.evendraft.store.Database;

/** The whole service on a free port, with a database in memory and a clock that stands still until it is put on. */
final class TestService implements AutoCloseable {
    static final Instant START = Instant.parse("2026-06-12T06:00:00Z");
    static final String VERSION = "9.9.9";

    private final Database database;
    private final ControlRoom room;
    private final HttpServer server;
    private volatile Instant now = START;

    private TestService(Options options) {
        this.database = Database.open("jdbc:h2:mem:" + UUID.randomUUID(), "sa", "");
        Supplier<String> ids = () -> UUID.randomUUID().toString();
        this.room = new ControlRoom(database, new TestClock(), ids, VERSION);
        room.jobs().begin();
        this.server = HttpServer.start(options, room);
    }

    static TestService start() {
        return new TestService(options(Optional.empty()));
    }

    static TestService startWithToken(String token) {
        return new TestService(options(Optional.of(token)));
    }

    static TestService startWith(int maxBodyBytes, Duration requestTime) {
        return new TestService(new Options("127.0.0.1", 0, maxBodyBytes, requestTime, Optional.empty()));
    }

    private static Options options(Optional<String> token) {
        return new Options("127.0.0.1", 0, 20_000_000, Duration.ofSeconds(60), token);
    }

    Api api() {
        return new Api(server.address());
    }

    int port() {
        return server.port();
    }

    ControlRoom room() {
        return room;
    }

    Database database() {
        return database;
    }

    /** Puts the clock on. */
    void pass(Duration time) {
        now = now.plus(time);
    }

    @Override
    public void close() {
        server.close();
        room.jobs().close();
        database.close();
    }

    private final class TestClock extends Clock {
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
