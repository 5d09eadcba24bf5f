package org.evendraft.http;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.nio.charset.StandardCharsets;
import java.time.Duration;
import java.util.List;
import org.evendraft.platform.Json;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;

class LoadPlansTest {
    private static final String PATH = Barge.PATH + "/load-plans";
    private static final String EVENTS = """
            "events": [
              { "event": "aboard", "name": "pump", "minute": 0, "load": { "kind": "deck", "area": "deck", "mass": 80, "x": 0, "y": 6, "z": 11 } },
              { "event": "lift", "load": "pump", "minute": 240, "boomTip": [0, 8, 30] },
              { "event": "setDown", "load": "pump", "area": "deck", "x": 10, "y": -4, "z": 11 },
              { "event": "bunker", "tank": "FUEL", "volume": 40 } ]
            """;
    private static final String START = "\"start\": " + Barge.CONDITION;
    private static final String REQUEST = "{ \"name\": \"new pump\", " + START + ", " + EVENTS + " }";

    private final TestService service = TestService.start();
    private final Api api = Barge.stored(service);

    @AfterEach
    void stop() {
        service.close();
    }

    private static double mass(JsonNode plan, int event) {
        return plan.path("events").path(event - 1).path("position").path("mass").doubleValue();
    }

    @Test
    void aLoadPlanIsMadeStoredListedAndRead() {
        Api.Reply made = api.post(PATH, REQUEST).expect(201);
        JsonNode plan = made.json();
        assertThat(plan.path("name").textValue()).isEqualTo("new pump");
        assertThat(plan.path("caution").textValue()).contains("Planning aid only");
        assertThat(plan.path("events")).hasSize(4);
        assertThat(plan.path("events").path(0).path("planAfter").path("moves")).isNotEmpty();
        String id = plan.path("id").textValue();
        assertThat(made.header("Location")).isEqualTo(PATH + "/" + id);
        assertThat(api.get(made.header("Location")).expect(200).json()).isEqualTo(plan);
        JsonNode page = api.get(PATH + "?limit=1").expect(200).json();
        assertThat(page.path("total").intValue()).isEqualTo(1);
        assertThat(page.path("loadPlans").path(0).path("id").textValue()).isEqualTo(id);
    }

    @Test
    void aStoredConditionIsStartedFrom() {
        String location = api.post(Barge.PATH + "/conditions", Barge.CONDITION).header("Location");
        String id = location.substring(location.lastIndexOf('/') + 1);
        JsonNode plan = api.post(PATH, "{ \"condition\": \"" + id + "\", " + EVENTS + " }")
                .expect(201)
                .json();
        assertThat(plan.path("condition").textValue()).isEqualTo(id);
        assertThat(plan.path("name").textValue()).isEqualTo("Half port");
    }

    @Test
    void aRepeatedPostHasTheFirstAnswer() {
        Api.Reply first = api.post(PATH, REQUEST, "Idempotency-Key", "lift-1").expect(201);
        Api.Reply again = api.post(PATH, REQUEST, "Idempotency-Key", "lift-1").expect(201);
        assertThat(again.text()).isEqualTo(first.text());
        assertThat(again.header("Idempotency-Replayed")).isEqualTo("true");
        assertThat(api.get(PATH).json().path("total").intValue()).isEqualTo(1);
        api.post(PATH, REQUEST.replace("new pump", "old pump"), "Idempotency-Key", "lift-1")
                .expect(422);
    }

    @Test
    void whatIsReachedCanBePostedAsACondition() {
        JsonNode plan = api.post(PATH, REQUEST).expect(201).json();
        JsonNode last = plan.path("events").path(3);
        JsonNode result = api.post(
                        Barge.PATH + "/evaluate", last.path("loading").toString())
                .expect(200)
                .json();
        JsonNode after = last.path("planAfter").isNull()
                ? last.path("position")
                : last.path("planAfter").path("after");
        assertThat(result.path("mass").doubleValue())
                .isCloseTo(after.path("mass").doubleValue(), within(1e-6));
    }

    @Test
    void theRestIsPlannedAnewFromWhatTheTanksHold() {
        JsonNode first = api.post(PATH, REQUEST).expect(201).json();
        String address = PATH + "/" + first.path("id").textValue();
        service.pass(Duration.ofMinutes(1));
        Api.Reply resumed = api.post(
                        address + "/resume",
                        "{ \"afterEvent\": 2, \"fills\": [ { \"tank\": \"FUEL\", \"volume\": 10 } ] }",
                        "Idempotency-Key",
                        "resume-1")
                .expect(201);
        JsonNode rest = resumed.json();
        assertThat(rest.path("resumption").path("loadPlan").textValue())
                .isEqualTo(first.path("id").textValue());
        assertThat(rest.path("resumption").path("afterEvent").intValue()).isEqualTo(2);
        assertThat(rest.path("events").toString()).contains("setDown", "bunker");
        assertThat(rest.path("events")).hasSize(2);
        assertThat(rest.path("target")).isEqualTo(first.path("target"));
        JsonNode reached = first.path("events").path(1).path("loading");
        assertThat(rest.path("start").path("loading").path("loads")).isEqualTo(reached.path("loads"));
        assertThat(rest.path("start").path("loading").path("fills").toString()).contains("\"FUEL\",\"volume\":10.0");
        assertThat(api.get(resumed.header("Location")).expect(200).json()).isEqualTo(rest);
        assertThat(api.get(PATH)
                        .json()
                        .path("loadPlans")
                        .path(0)
                        .path("resumedFrom")
                        .textValue())
                .isEqualTo(first.path("id").textValue());
    }

    @Test
    void aPumpOutOfServiceStaysOutWhenTheRestIsPlannedAnew() {
        String without = REQUEST.replaceFirst("\\{", "{ \"pumpsOutOfService\": [\"P1\"],");
        for (String request : List.of(REQUEST, without)) {
            String id = api.post(PATH, request).expect(201).json().path("id").textValue();
            JsonNode rest = api.post(PATH + "/" + id + "/resume", "{ \"afterEvent\": 0 }")
                    .expect(201)
                    .json();
            boolean pumped = rest.path("events").findValues("moves").stream().anyMatch(moves -> !moves.isEmpty());
            assertThat(pumped).isEqualTo(request.equals(REQUEST));
        }
    }

    @Test
    void resumedWithoutSoundingsTheRestComesOutAsItWasPlanned() {
        JsonNode first = api.post(PATH, REQUEST).expect(201).json();
        String address = PATH + "/" + first.path("id").textValue();
        JsonNode rest = api.post(address + "/resume", "{ \"afterEvent\": 2 }")
                .expect(201)
                .json();
        assertThat(mass(rest, 1)).isCloseTo(mass(first, 3), within(1e-6));
        assertThat(mass(rest, 2)).isCloseTo(mass(first, 4), within(1e-6));
    }

    @Test
    void latestSoundingsTakeTheirTanksAndLeaveTheOthersAsPlanned() {
        JsonNode first = api.post(PATH, REQUEST).expect(201).json();
        api.post(
                        Barge.PATH + "/soundings",
                        "{ \"readings\": [ { \"tank\": \"FUEL\", \"volume\": 20, \"at\": \"2026-06-12T05:50:00Z\" } ] }")
                .expect(201);
        JsonNode rest = api.post(
                        PATH + "/" + first.path("id").textValue() + "/resume",
                        "{ \"afterEvent\": 3, \"fills\": \"latest\" }")
                .expect(201)
                .json();
        assertThat(rest.path("start").path("loading").path("fills").toString()).contains("\"FUEL\",\"volume\":20.0");
        assertThat(rest.path("warnings").toString()).contains("taken as planned");
        assertThat(mass(rest, 1))
                .isCloseTo(rest.path("start").path("position").path("mass").doubleValue() + 0.85 * 40, within(1e-6));
    }

    @Test
    void aResumptionWithFaultsListsThemAll() {
        JsonNode first = api.post(PATH, REQUEST).expect(201).json();
        String address = PATH + "/" + first.path("id").textValue() + "/resume";
        assertThat(api.post(
                                address,
                                "{ \"afterEvent\": 9, \"fills\": [ { \"tank\": \"NONE\", \"volume\": 1 } ], \"x\": 1 }")
                        .expect(400)
                        .pointers())
                .containsExactlyInAnyOrder("/afterEvent", "/fills/0/tank", "/x");
        assertThat(api.post(address, "{ \"afterEvent\": 4 }").expect(422).pointers())
                .containsExactly("/afterEvent");
        assertThat(api.post(address, "{ \"afterEvent\": 3, \"fills\": [ { \"tank\": \"FUEL\", \"volume\": 90 } ] }")
                        .expect(422)
                        .pointers())
                .containsExactly("/fills");
        api.post(PATH + "/none/resume", "{ \"afterEvent\": 1 }").expect(404);
    }

    @Test
    void aPlatformThatWouldBeLostIsAnAnswerAndNoError() {
        ObjectNode request = (ObjectNode) Json.parse(REQUEST.getBytes(StandardCharsets.UTF_8));
        ((ObjectNode) request.path("events").path(0).path("load")).put("mass", 50_000);
        JsonNode plan = api.post(PATH, request.toString()).expect(201).json();
        assertThat(plan.path("feasible").booleanValue()).isFalse();
        assertThat(plan.path("ended").path("event").intValue()).isEqualTo(1);
        assertThat(plan.path("ended").path("reason").textValue()).contains("capsizes");
        assertThat(plan.path("events")).isEmpty();
    }

    @Test
    void faultsAreListedAndNothingIsStored() {
        ObjectNode request = (ObjectNode) Json.parse(REQUEST.getBytes(StandardCharsets.UTF_8));
        ((ArrayNode) request.path("events")).addObject().put("event", "lift").put("load", "anvil");
        ((ObjectNode) request.path("events").path(3)).put("volume", 4000);
        List<String> pointers = api.post(PATH, request.toString()).expect(400).pointers();
        assertThat(pointers).containsExactlyInAnyOrder("/events/3/volume", "/events/4/load", "/events/4/boomTip");
        assertThat(api.get(PATH).json().path("total").intValue()).isZero();
    }

    @Test
    void unknownPlatformsConditionsAndLoadPlansAreToldApart() {
        api.post("/api/v1/platforms/none/load-plans", REQUEST).expect(404);
        api.get("/api/v1/platforms/none/load-plans").expect(404);
        api.get(PATH + "/none").expect(404);
        assertThat(api.post(PATH, "{ \"condition\": \"none\", " + EVENTS + " }")
                        .expect(422)
                        .pointers())
                .containsExactly("/condition");
    }
}
