package org.evendraft.http;

import com.fasterxml.jackson.databind.JsonNode;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import org.evendraft.platform.Json;
import org.evendraft.service.AnswerJson;
import org.evendraft.service.ControlRoom;
import org.evendraft.service.Pending;
import org.evendraft.service.ReadPlatforms;
import org.evendraft.service.Reply;
import org.evendraft.service.StorePlatform;
import org.evendraft.store.StoredPlatform;

/** Platforms and their revisions. */
final class PlatformRoutes {
    static final String PLATFORMS = "/api/v1/platforms";
    static final String PLATFORM = PLATFORMS + "/{platform}";

    private static final int CREATED = 201;
    private static final int OK = 200;
    private static final int NOT_MODIFIED = 304;

    private final StorePlatform store;
    private final ReadPlatforms read;
    private final Writes writes;

    PlatformRoutes(ControlRoom room, Writes writes) {
        this.store = room.storePlatform();
        this.read = room.readPlatforms();
        this.writes = writes;
    }

    List<Route> routes() {
        return List.of(
                Route.get(PLATFORMS, this::list), Route.get(PLATFORM, this::one), Route.put(PLATFORM, this::replace));
    }

    private Answer list(Request request) {
        new Query(request.query()).done();
        return Answer.ok(read.list());
    }

    private Answer one(Request request) {
        Query query = new Query(request.query());
        OptionalInt revision = query.whole("revision", 1, Integer.MAX_VALUE);
        query.done();
        StoredPlatform platform = read.read(request.variable("platform"), revision);
        boolean known = Tags.known(request.header("if-none-match"), platform.revision());
        return Answer.text(known ? NOT_MODIFIED : OK, Answer.JSON, known ? "" : platform.document())
                .with("ETag", Tags.of(platform.revision()))
                .with("Platform-Revision", Integer.toString(platform.revision()));
    }

    private Answer replace(Request request) {
        new Query(request.query()).done();
        String id = request.variable("platform");
        JsonNode document = Json.parse(request.body());
        String text = new String(request.body(), StandardCharsets.UTF_8);
        return writes.put(() -> {
            OptionalInt expected = Tags.expected(request, read, id);
            Pending<StorePlatform.StoredRevision> pending = store.prepare(id, text, document, expected);
            return pending.then(PlatformRoutes::reply);
        });
    }

    static Reply reply(StorePlatform.StoredRevision stored) {
        boolean first = stored.revision() == 1;
        return new Reply(
                first ? CREATED : OK,
                first ? Optional.of(PLATFORMS + "/" + stored.id()) : Optional.empty(),
                Optional.of(Tags.of(stored.revision())),
                AnswerJson.text(stored),
                false);
    }
}
