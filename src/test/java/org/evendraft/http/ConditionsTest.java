package org.evendraft.http;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import java.time.Duration;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;

class ConditionsTest {
    private static final String CONDITIONS = Barge.PATH + "/conditions";

    private final TestService service = TestService.start();
    private final Api api = Barge.stored(service);

    @AfterEach
    void stop() {
        service.close();
    }

    /** By hand: 6000 + 500 + 100 t on 2000 m² of fresh water float at 3.3 m. */
    @Test
    void aConditionIsEvaluatedAndNothingIsStored() {
        JsonNode result =
                api.post(Barge.PATH + "/evaluate", Barge.CONDITION).expect(200).json();
        assertThat(result.path("evenKeelDraft").doubleValue()).isCloseTo(3.3, within(1e-9));
        assertThat(result.path("platformRevision").intValue()).isEqualTo(1);
        assertThat(result.path("engineVersion").textValue()).isEqualTo(TestService.VERSION);
        assertThat(result.path("computedAt").textValue()).isEqualTo("2026-06-12T06:00:00Z");
        assertThat(result.path("caution").textValue()).contains("Planning aid only");
        assertThat(api.get(CONDITIONS).json().path("total").intValue()).isZero();
    }

    @Test
    void aPostedConditionIsStoredWithItsResult() {
        Api.Reply posted = api.post(CONDITIONS, Barge.CONDITION).expect(201);
        String id = posted.json().path("id").textValue();
        assertThat(posted.header("Location")).isEqualTo(CONDITIONS + "/" + id);
        JsonNode file = api.get(posted.header("Location")).expect(200).json();
        assertThat(file.path("platform").textValue()).isEqualTo("barge");
        assertThat(file.path("condition").path("name").textValue()).isEqualTo("Half port");
        assertThat(api.get(posted.header("Location") + "/result").expect(200).json())
                .isEqualTo(posted.json());
    }

    @Test
    void conditionsAreListedNewestFirstPageByPage() {
        for (int i = 1; i <= 5; i++) {
            service.pass(Duration.ofMinutes(1));
            api.post(CONDITIONS, "{ \"name\": \"No. " + i + "\" }").expect(201);
        }
        JsonNode page = api.get(CONDITIONS + "?limit=2&offset=1").expect(200).json();
        assertThat(page.path("total").intValue()).isEqualTo(5);
        assertThat(page.path("conditions").findValuesAsText("name")).containsExactly("No. 4", "No. 3");
    }

    @Test
    void aConditionKeepsToTheRevisionItWasCheckedAgainst() {
        String first = api.post(CONDITIONS, Barge.CONDITION).header("Location");
        api.put(Barge.PATH, Barge.PLATFORM.replace("\"mass\": 6000", "\"mass\": 7000"))
                .expect(200);
        assertThat(api.get(first + "/result").json().path("platformRevision").intValue())
                .isEqualTo(1);
        JsonNode second = api.post(CONDITIONS, Barge.CONDITION).expect(201).json();
        assertThat(second.path("platformRevision").intValue()).isEqualTo(2);
        assertThat(second.path("mass").doubleValue()).isCloseTo(7600, within(1e-6));
    }

    @Test
    void whatIsNotThereIsNotFound() {
        api.get("/api/v1/platforms/ghost/conditions").expect(404);
        api.post("/api/v1/platforms/ghost/conditions", Barge.CONDITION).expect(404);
        api.post("/api/v1/platforms/ghost/evaluate", Barge.CONDITION).expect(404);
        api.get(CONDITIONS + "/nobody").expect(404);
        api.get(CONDITIONS + "/nobody/result").expect(404);
        String condition =
                api.post(CONDITIONS, Barge.CONDITION).json().path("id").textValue();
        api.get("/api/v1/platforms/ghost/conditions/" + condition).expect(404);
    }

    @Test
    void aConditionThatSinksOrCapsizesIsImpossibleAndNotStored() {
        Api.Reply sinks = api.post(CONDITIONS, load(20_000, 0)).expect(422);
        assertThat(sinks.pointers()).containsExactly("");
        assertThat(sinks.details()).singleElement().asString().contains("sinks");
        Api.Reply capsizes = api.post(CONDITIONS, load(5000, 60)).expect(422);
        assertThat(capsizes.details()).singleElement().asString().contains("capsizes");
        assertThat(api.get(CONDITIONS).json().path("total").intValue()).isZero();
    }

    private static String load(double mass, double height) {
        return "{ \"loads\": [ { \"name\": \"x\", \"kind\": \"variable\", \"mass\": %s, \"x\": 0, \"y\": 0, \"z\": %s } ] }"
                .formatted(mass, height);
    }

    @Test
    void aConditionOfManyLoadsIsTaken() {
        StringBuilder loads = new StringBuilder();
        for (int i = 0; i < 100_000; i++) {
            loads.append(i == 0 ? "" : ",")
                    .append("{\"name\":\"L\",\"kind\":\"variable\",\"mass\":0.001,\"x\":0,\"y\":0,\"z\":5}");
        }
        JsonNode result = api.post(CONDITIONS, "{ \"loads\": [" + loads + "] }")
                .expect(201)
                .json();
        assertThat(result.path("mass").doubleValue()).isCloseTo(6100, within(1e-6));
    }
}
