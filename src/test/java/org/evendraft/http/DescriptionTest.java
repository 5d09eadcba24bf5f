package org.evendraft.http;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.time.Clock;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.stream.Stream;
import org.evendraft.service.ControlRoom;
import org.evendraft.store.Database;
import org.junit.jupiter.api.Test;

class DescriptionTest {
    private static final Description DESCRIPTION = Api.DESCRIPTION;

    @Test
    void everyRouteIsDescribedAndEveryDescriptionHasARoute() {
        try (Database database = Database.open("jdbc:h2:mem:routes", "sa", "")) {
            ControlRoom room = new ControlRoom(database, Clock.systemUTC(), () -> "id", "1");
            List<String> routes = Routes.of(room, Meters.open()).stream()
                    .map(route -> route.method() + " " + route.path())
                    .toList();
            assertThat(DESCRIPTION.operations()).containsExactlyInAnyOrderElementsOf(routes);
        }
    }

    @Test
    void everyRouteReadsAndWritesTheMediaTypesDescribed() {
        try (Database database = Database.open("jdbc:h2:mem:media", "sa", "")) {
            ControlRoom room = new ControlRoom(database, Clock.systemUTC(), () -> "id", "1");
            for (Route route : Routes.of(room, Meters.open())) {
                JsonNode operation = DESCRIPTION
                        .document()
                        .path("paths")
                        .path(route.path())
                        .path(route.method().toLowerCase(Locale.ROOT));
                List<String> reads = names(operation.path("requestBody").path("content"));
                List<String> writes = names(success(operation.path("responses")).path("content"));
                assertThat(reads).as(route.path()).containsExactlyInAnyOrderElementsOf(route.reads());
                assertThat(writes).as(route.path()).containsExactlyInAnyOrderElementsOf(route.writes());
            }
        }
    }

    private static JsonNode success(JsonNode responses) {
        return Stream.of("200", "201", "202")
                .map(responses::path)
                .filter(JsonNode::isObject)
                .findFirst()
                .orElseThrow();
    }

    private static List<String> names(JsonNode object) {
        List<String> names = new ArrayList<>();
        object.fieldNames().forEachRemaining(names::add);
        return names;
    }

    @Test
    void theDemoDocumentsAreAsDescribed() throws IOException {
        assertThat(DESCRIPTION.deviations("Platform", resource("/db/demo/merganser.json")))
                .isEmpty();
        assertThat(DESCRIPTION.deviations("Condition", resource("/db/demo/condition.json")))
                .isEmpty();
        assertThat(DESCRIPTION.deviations("PlanRequest", resource("/db/demo/request.json")))
                .isEmpty();
        assertThat(DESCRIPTION.deviations("LoadPlanRequest", resource("/db/demo/load-plan.json")))
                .isEmpty();
    }

    private static String resource(String name) throws IOException {
        try (var in = DescriptionTest.class.getResourceAsStream(name)) {
            return new String(in.readAllBytes(), StandardCharsets.UTF_8);
        }
    }

    /** The helper that all tests rely on must itself find what is wrong. */
    @Test
    void anAnswerThatIsNotAsDescribedIsFound() {
        assertThat(DESCRIPTION.deviations("GET /health", 200, "application/json", "{\"status\": \"fine\"}"))
                .isNotEmpty();
        assertThat(DESCRIPTION.deviations("GET /health", 204, "application/json", "{}"))
                .isNotEmpty();
        assertThat(DESCRIPTION.deviations("GET /health", 200, "text/html", "<p>"))
                .isNotEmpty();
        assertThat(DESCRIPTION.deviations("EvaluatedCondition", "{}")).isNotEmpty();
    }
}
