package org.evendraft.http;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.net.http.HttpRequest.BodyPublishers;
import org.evendraft.service.SteppedWork;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;

class AllowableKgTest {
    private static final String COMPUTE = Barge.PATH + "/allowable-kg";
    private static final String OF_MODE = Barge.PATH + "/modes/afloat/allowable-kg";
    private static final String REQUEST = "{ \"mode\": \"afloat\", \"drafts\": [2, 3, 4], \"damage\": \"none\" }";
    private static final String KEY = "Idempotency-Key";

    private final TestService service = TestService.start();
    private final Api api = stored(service);

    @AfterEach
    void stop() {
        service.close();
    }

    /** Only the least GM, 1 m, is a criterion: the greatest KG is KM less that. */
    private static Api stored(TestService service) {
        ObjectNode document = ExposedBarge.document();
        document.set("criteria", ExposedBarge.parse("""
                { "rules": "moduColumnStabilized", "without": [ "intact.areaRatio", "intact.positiveArms" ], "own": [
                  { "name": "intact.leastGm", "clause": "standing orders", "situation": "intact", "measure": "leastGm", "bound": 2 } ] }
                """));
        Api api = service.api();
        api.put(Barge.PATH, document.toString()).expect(201);
        return api;
    }

    private static double km(double draft) {
        return draft / 2 + 400 / (12 * draft);
    }

    /** A job's id, once it is done. */
    private String done(String request) {
        String address = api.post(COMPUTE, request).expect(202).header("Location");
        SteppedWork.await(
                () -> api.get(address).json(), j -> j.path("state").textValue().equals("done"));
        return address.substring(address.lastIndexOf('/') + 1);
    }

    private JsonNode result(String job) {
        Api.Reply result = api.get("/api/v1/jobs/" + job + "/result").expect(200);
        assertThat(Api.DESCRIPTION.deviations("AllowableKgCurve", result.text()))
                .isEmpty();
        return result.json();
    }

    private static String byJob(String job) {
        return "{ \"job\": \"" + job + "\" }";
    }

    /** The draft range of the mode is 2 to 8 m; the metacentre over a box stands at T/2 + B²/12T. */
    @Test
    void theGreatestKgIsFoundAsAJobByHand() {
        JsonNode curve = result(done(REQUEST));
        assertThat(curve.path("mode").textValue()).isEqualTo("afloat");
        assertThat(curve.path("rules").textValue()).isEqualTo("moduColumnStabilized");
        assertThat(curve.path("windSpeed").doubleValue()).isEqualTo(36);
        assertThat(curve.path("limits")).hasSize(3);
        for (JsonNode limit : curve.path("limits")) {
            double draft = limit.path("draft").doubleValue();
            double kg = limit.path("allowableKg").doubleValue();
            assertThat(limit.path("displacement").doubleValue()).isCloseTo(2000 * draft, within(1e-6));
            assertThat(limit.path("kmTransverse").doubleValue()).isCloseTo(km(draft), within(1e-9));
            assertThat(kg).isCloseTo(km(draft) - 2, within(1e-3));
            assertThat(limit.path("breaksAt").doubleValue()).isGreaterThan(kg).isCloseTo(kg, within(1.001e-3));
            assertThat(limit.path("criterion").textValue()).isEqualTo("intact.leastGm");
            assertThat(limit.path("clause").textValue()).isEqualTo("standing orders");
        }
        assertThat(curve.path("notes").path(0).textValue()).contains("No damage");
        assertThat(curve.path("caution").textValue()).isNotBlank();
    }

    @Test
    void theCurveOfAJobBecomesThatOfTheModeAndThenLimitsConditions() {
        String condition = "{ \"mode\": \"afloat\" }";
        assertThat(limit(condition).isMissingNode()).isTrue();
        String job = done(REQUEST);
        double kgAtThree = result(job).at("/limits/1/allowableKg").doubleValue();
        Api.Reply put = api.put(OF_MODE, byJob(job), "If-Match", "\"rev-1\"").expect(200);
        assertThat(put.json().path("revision").intValue()).isEqualTo(2);
        assertThat(put.header("ETag")).isEqualTo("\"rev-2\"");
        assertThat(api.get(Barge.PATH).json().at("/modes/0/allowableKg")).hasSize(3);
        JsonNode limit = limit(condition);
        assertThat(limit.path("value").doubleValue()).isCloseTo(5, within(1e-9));
        assertThat(limit.path("bound").doubleValue()).isCloseTo(kgAtThree, within(1e-9));
        assertThat(limit.path("margin").doubleValue()).isCloseTo(kgAtThree - 5, within(1e-9));
        assertThat(limit.path("met").booleanValue()).isTrue();
        String high = condition.replace(
                "}", ", \"loads\": [ { \"kind\": \"variable\", \"mass\": 1000, \"x\": 0, \"y\": 0, \"z\": 40 } ] }");
        assertThat(limit(high).path("met").booleanValue()).isFalse();
        // its job was for revision 1, and there is a later one
        assertThat(api.put(OF_MODE, byJob(job)).expect(422).details())
                .singleElement()
                .asString()
                .contains("revision 1");
    }

    private JsonNode limit(String condition) {
        JsonNode limits =
                api.post(Barge.PATH + "/evaluate", condition).expect(200).json().path("limits");
        for (JsonNode limit : limits) {
            if ("allowableKg".equals(limit.path("limit").textValue())) {
                return limit;
            }
        }
        return limits.path("none");
    }

    @Test
    void theSameKeyTwiceMakesOneJob() {
        Api.Reply first = api.post(COMPUTE, REQUEST, KEY, "tablet-1").expect(202);
        Api.Reply retry = api.post(COMPUTE, REQUEST, KEY, "tablet-1").expect(202);
        assertThat(retry.text()).isEqualTo(first.text());
        assertThat(retry.header("Location")).isEqualTo(first.header("Location"));
        assertThat(retry.header("Idempotency-Replayed")).isEqualTo("true");
        assertThat(api.get("/api/v1/jobs").json().path("total").intValue()).isEqualTo(1);
    }

    @Test
    void allFaultsOfARequestAreToldTogether() {
        Api.Reply faulty = api.post(COMPUTE, """
                { "mode": "ghost", "drafts": [3, 12, 2, -1, "deep"], "windSpeed": -1, "waterDensity": 0, "damage": "total", "speed": 1 }
                """).expect(400);
        assertThat(faulty.pointers())
                .containsExactlyInAnyOrder(
                        "/mode",
                        "/drafts",
                        "/drafts/1",
                        "/drafts/3",
                        "/drafts/4",
                        "/windSpeed",
                        "/waterDensity",
                        "/damage",
                        "/speed");
        assertThat(api.post(COMPUTE, "{ \"mode\": \"calm\" }").expect(422).pointers())
                .containsExactlyInAnyOrder("/drafts", "/windSpeed");
        assertThat(api.post(COMPUTE, many("{ \"from\": 2, \"to\": 8, \"step\": 0.001 }"))
                        .expect(422)
                        .pointers())
                .containsExactly("/drafts/step");
        assertThat(api.post(COMPUTE, many("{ \"from\": 8, \"to\": 2, \"step\": 1, \"by\": 2 }"))
                        .expect(400)
                        .pointers())
                .containsExactly("/drafts/by");
        // 10 m is the deck of the barge: no hull is left over the water
        assertThat(api.post(COMPUTE, many("[9.99, 10]")).expect(422).details())
                .singleElement()
                .asString()
                .contains("no reserve");
        assertThat(api.post(COMPUTE, many("[]")).expect(400).pointers()).containsExactly("/drafts");
        assertThat(api.post(COMPUTE, "{}").expect(400).pointers()).contains("/mode");
        api.post("/api/v1/platforms/nobody/allowable-kg", REQUEST).expect(404);
        api.post(COMPUTE + "?mode=afloat", REQUEST).expect(400);
        assertThat(api.get("/api/v1/jobs").json().path("total").intValue()).isZero();
    }

    private static String many(String drafts) {
        return "{ \"mode\": \"afloat\", \"drafts\": " + drafts + " }";
    }

    @Test
    void aCurveThatIsNoneIsRefused() {
        Api.Reply falling =
                api.put(OF_MODE, "{ \"points\": [[4, 9], [3, 10]] }").expect(422);
        assertThat(falling.details()).singleElement().asString().contains("rise");
        assertThat(falling.pointers()).singleElement().asString().startsWith("/points");
        assertThat(api.put(OF_MODE, "{ \"points\": [] }").expect(400).pointers())
                .containsExactly("/points");
        api.put(OF_MODE, "{}").expect(400);
        api.put(OF_MODE, "{ \"job\": \"x\", \"points\": [[3, 10]] }").expect(400);
        api.put(OF_MODE, "{ \"points\": [[3]], \"mode\": \"afloat\" }").expect(400);
        api.put(Barge.PATH + "/modes/ghost/allowable-kg", "{ \"points\": [[3, 10]] }")
                .expect(404);
        api.put("/api/v1/platforms/nobody/modes/afloat/allowable-kg", "{ \"points\": [[3, 10]] }")
                .expect(404);
        api.put(OF_MODE, "{ \"points\": [[3, 10]] }", "If-Match", "\"rev-7\"").expect(412);
        assertThat(api.get(Barge.PATH).expect(200).header("ETag")).isEqualTo("\"rev-1\"");
        api.put(OF_MODE, "{ \"points\": [[2, 12], [4, 9]] }").expect(200);
        api.put(OF_MODE, "{ \"points\": [[2, 12]] }", "If-Match", "\"rev-1\"").expect(412);
    }

    @Test
    void aJobOfAnotherKindModePlatformOrWithoutResultGivesNoCurve() {
        assertThat(refused(done(many("[3]").replace("afloat", "calm").replace("] }", "], \"windSpeed\": 20 }"))))
                .contains("computed for mode calm");
        String unknown = api.put(OF_MODE, byJob("ghost")).text();
        assertThat(unknown).contains("ghost");
        String stored = api.post(Barge.PATH + "/conditions", "{}").header("Location");
        String damage = api.send("POST", stored + "/damage?wind=10", BodyPublishers.noBody())
                .expect(202)
                .json()
                .path("id")
                .textValue();
        assertThat(refused(damage)).contains("did not compute a greatest KG");
        ObjectNode other = ExposedBarge.document().put("id", "other");
        api.put("/api/v1/platforms/other", other.toString()).expect(201);
        String elsewhere = done(REQUEST);
        assertThat(api.put("/api/v1/platforms/other/modes/afloat/allowable-kg", byJob(elsewhere))
                        .expect(422)
                        .details()
                        .get(0))
                .contains("of platform other");
        String cancelled = api.post(COMPUTE, many("{ \"from\": 2, \"to\": 8, \"step\": 0.05 }"))
                .expect(202)
                .header("Location");
        Api.Reply first = api.delete(cancelled).expect(200);
        assertThat(first.json().path("state").textValue()).isEqualTo("cancelled");
        assertThat(api.delete(cancelled).expect(200).text()).isEqualTo(first.text());
        assertThat(refused(first.json().path("id").textValue())).contains("no result");
        assertThat(api.get(Barge.PATH).header("ETag")).isEqualTo("\"rev-1\"");
    }

    private String refused(String job) {
        Api.Reply refused = api.put(OF_MODE, byJob(job)).expect(422);
        assertThat(refused.pointers()).containsExactly("/job");
        return refused.details().get(0);
    }

    /** A KG that the barge cannot have at any draft: its metacentre is never 300 m up. */
    @Test
    void aDraftWithoutAnyKgIsToldAndGivesNoCurve() {
        ObjectNode strict = ExposedBarge.document();
        ((ObjectNode) strict.at("/criteria/own/0")).put("measure", "leastGm").put("bound", 300);
        api.put(Barge.PATH, strict.toString()).expect(200);
        String job = done(REQUEST);
        JsonNode limit = result(job).at("/limits/0");
        assertThat(limit.path("allowableKg").isNull()).isTrue();
        assertThat(limit.path("breaksAt").isNull()).isTrue();
        assertThat(limit.path("criterion").textValue()).isEqualTo("heel");
        assertThat(refused(job)).contains("no KG was found at the draft of 2");
    }
}
