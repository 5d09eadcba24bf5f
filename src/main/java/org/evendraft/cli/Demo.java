package org.evendraft.cli;

import com.fasterxml.jackson.databind.JsonNode;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.function.Supplier;
import org.evendraft.platform.Json;
import org.evendraft.service.ControlRoom;
import org.evendraft.service.Pending;
import org.evendraft.service.Reply;
import org.evendraft.store.IdempotentRequest;
import org.evendraft.store.StoredPlatform;

/** The demo platform in the store: put there once, and found there when the demo runs again. */
final class Demo {
    private static final String ID = "merganser";
    private static final String PLATFORM = text("merganser.json");
    private static final String CONDITION = text("condition.json");
    private static final String REQUEST = text("request.json");

    private final ControlRoom room;
    private final String version;
    private final int revision;

    /** Stores the platform unless its current revision is the same. */
    Demo(ControlRoom room, String version) {
        this.room = room;
        this.version = version;
        this.revision = current().orElseGet(this::store);
    }

    private Optional<Integer> current() {
        boolean there = room.readPlatforms().list().platforms().stream().anyMatch(p -> p.id().equals(ID));
        return Optional.of(ID)
                .filter(id -> there)
                .map(id -> room.readPlatforms().read(id, OptionalInt.empty()))
                .filter(stored -> stored.document().equals(PLATFORM))
                .map(StoredPlatform::revision);
    }

    private int store() {
        JsonNode document = tree(PLATFORM);
        String stored = room.once()
                .carryOut(
                        Optional.empty(),
                        () -> room.storePlatform()
                                .prepare(ID, PLATFORM, document, OptionalInt.empty())
                                .then(r -> Reply.created("", r)))
                .body();
        return tree(stored).path("revision").intValue();
    }

    JsonNode platform() {
        return tree(PLATFORM);
    }

    JsonNode document() {
        return tree(CONDITION);
    }

    JsonNode request() {
        return tree(REQUEST);
    }

    /** The stored condition's result. */
    JsonNode condition() {
        return carryOut(
                "condition",
                CONDITION,
                () -> room.storeCondition().prepare(ID, tree(CONDITION)).then(kept -> Reply.created("", kept)));
    }

    /** The stored plan from a stored condition. */
    JsonNode plan(String condition) {
        return carryOut(
                "plan of " + condition,
                REQUEST,
                () -> room.makePlan().prepare(ID, condition, tree(REQUEST)).then(kept -> Reply.created("", kept)));
    }

    private JsonNode carryOut(String what, String body, Supplier<Pending<Reply>> work) {
        String key = "demo " + version + ", revision " + revision + ", " + what;
        byte[] bytes = body.getBytes(StandardCharsets.UTF_8);
        IdempotentRequest request = IdempotentRequest.of(key, "DEMO", what, bytes);
        return tree(room.once().carryOut(Optional.of(request), work).body());
    }

    private static JsonNode tree(String text) {
        return Json.parse(text.getBytes(StandardCharsets.UTF_8));
    }

    private static String text(String name) {
        try (InputStream in = Demo.class.getResourceAsStream("/db/demo/" + name)) {
            if (in == null) {
                throw new IllegalStateException("the program lacks db/demo/" + name);
            }
            return new String(in.readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
