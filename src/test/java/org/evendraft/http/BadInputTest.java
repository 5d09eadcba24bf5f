package org.evendraft.http;

import static org.assertj.core.api.Assertions.assertThat;

import java.net.http.HttpRequest.BodyPublishers;
import java.nio.charset.StandardCharsets;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** What must be told apart clearly, and leave nothing stored. */
class BadInputTest {
    private static TestService service;
    private static Api api;

    @BeforeAll
    static void start() {
        service = TestService.start();
        api = Barge.stored(service);
    }

    @AfterAll
    static void stop() {
        service.close();
    }

    @AfterEach
    void nothingIsStored() {
        assertThat(api.get(Barge.PATH).header("ETag")).isEqualTo("\"rev-1\"");
        assertThat(api.get(Barge.PATH + "/conditions").json().path("total").intValue())
                .isZero();
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "422 | /fills/0/tank | { \"fills\": [ { \"tank\": \"GHOST\", \"fraction\": 0.5 } ] }",
                "422 | /mode | { \"mode\": \"submerged\" }",
                "422 | /loads/0/area | { \"loads\": [ { \"name\": \"x\", \"kind\": \"deck\", \"area\": \"roof\", \"mass\": 1, \"x\": 0, \"y\": 0, \"z\": 10 } ] }",
                "400 | /fills/0 | { \"fills\": [ { \"tank\": \"PORT\", \"fraction\": 0.5, \"level\": 1 } ] }",
                "422 | /fills/0/fraction | { \"fills\": [ { \"tank\": \"PORT\", \"fraction\": 1.5 } ] }",
                "400 | '' | { \"fills\": [ { \"tank\": \"PORT\", \"fraction\": NaN } ] }",
                "400 | '' | { \"waterDensity\": Infinity }",
                "400 | /waterDensity | { \"waterDensity\": 1e400 }",
                "400 | /waterDensity | { \"waterDensity\": \"1.025\" }",
                "422 | /waterDensity | { \"waterDensity\": 0 }",
                "422 | /fills/0/density | { \"fills\": [ { \"tank\": \"PORT\", \"fraction\": 0.5, \"density\": -1 } ] }",
                "400 | /colour | { \"colour\": \"blue\" }",
                "400 | '' | { \"fills\": [ { \"tank\": \"PO",
                "400 | '' | []",
                "400 | '' | { \"a\": 1 } x",
                "400 | /fills | { \"fills\": \"newest\" }",
            })
    void aConditionWithAFaultIsRefusedWithItsPlace(int status, String pointer, String document) {
        Api.Reply refused = api.post(Barge.PATH + "/conditions", document).expect(status);
        assertThat(refused.pointers()).contains(pointer);
        assertThat(refused.json().path("detail").textValue()).isNotBlank();
        api.post(Barge.PATH + "/evaluate", document).expect(status);
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "400 | /hull/bodies | \"bodies\": [ { \"name\": \"hull\", \"shape\": \"box\", \"min\": [-50, -10, 0], \"max\": [50, 10, 10] } ] | \"bodies\": []",
                "422 | /lightship/mass | \"mass\": 6000 | \"mass\": 0",
                "422 | /tanks/0/density | \"density\": 1.0 | \"density\": 0",
                "422 | /pumps/0/from/0 | \"from\": [\"PORT\" | \"from\": [\"GHOST\"",
                "422 | /tanks/2/table/1/level | \"level\": 2 | \"level\": -2",
                "400 | /name | \"name\": \"Barge\" | \"name\": 7",
            })
    void aPlatformWithAFaultIsRefusedWithItsPlace(int status, String pointer, String text, String wrong) {
        assertThat(Barge.PLATFORM).contains(text);
        Api.Reply refused =
                api.put(Barge.PATH, Barge.PLATFORM.replace(text, wrong)).expect(status);
        assertThat(refused.pointers()).contains(pointer);
    }

    @Test
    void overlappingBodiesAreToldWithTheirNames() {
        String two = Barge.PLATFORM.replace(
                "\"max\": [50, 10, 10] }",
                "\"max\": [50, 10, 10] }, { \"name\": \"sponson\", \"shape\": \"box\", \"min\": [0, 5, 0], \"max\": [10, 15, 5] }");
        Api.Reply refused = api.put(Barge.PATH, two).expect(422);
        assertThat(refused.details()).anyMatch(d -> d.contains("hull") && d.contains("sponson"));
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "hole | [[0,2,1],[0,1,3],[1,2,3]]",
                "inside out | [[0,1,2],[0,3,1],[1,3,2],[2,3,0]]",
                "no area | [[0,2,1],[0,1,3],[1,2,3],[2,0,3],[0,0,1]]",
            })
    void aMeshThatIsNoBodyIsRefused(String what, String triangles) {
        String mesh = "{ \"name\": \"" + what
                + "\", \"shape\": \"mesh\", \"vertices\": [[0,20,0],[5,20,0],[0,25,0],[0,20,5]], \"triangles\": "
                + triangles + " }";
        String platform = Barge.PLATFORM.replace("\"max\": [50, 10, 10] }", "\"max\": [50, 10, 10] }, " + mesh);
        Api.Reply refused = api.put(Barge.PATH, platform);
        assertThat(refused.status()).as(refused.text()).isIn(400, 422);
        assertThat(refused.details()).anyMatch(d -> d.contains(what));
    }

    @Test
    void allFaultsAreListedAndFormComesBeforeMeaning() {
        Api.Reply refused = api.post(Barge.PATH + "/conditions", """
                        { "mode": "submerged", "waterDensity": "wet",
                          "fills": [ { "tank": "GHOST", "level": 1 }, { "tank": "PORT" } ], "extra": 1 }""").expect(400);
        assertThat(refused.pointers())
                .containsExactlyInAnyOrder("/mode", "/waterDensity", "/fills/0/tank", "/fills/1", "/extra");
        assertThat(refused.json().path("type").textValue()).isEqualTo("urn:evendraft:problem:malformed");
    }

    @Test
    void anotherMediaTypeIsNotRead() {
        var body = BodyPublishers.ofString(Barge.CONDITION);
        String path = Barge.PATH + "/conditions";
        api.send("POST", path, body, "Content-Type", "text/plain").expect(415);
        api.send("POST", path, body, "Content-Type", "application/json; charset=iso-8859-1")
                .expect(415);
        api.send("POST", path, body).expect(415);
        api.send("POST", path, body, "Content-Type", "text/csv").expect(415);
    }

    @Test
    void whatIsNotUtf8IsRefused() {
        byte[] latin = "{ \"name\": \"Köln\" }".getBytes(StandardCharsets.ISO_8859_1);
        Api.Reply refused = api.send(
                "POST",
                Barge.PATH + "/conditions",
                BodyPublishers.ofByteArray(latin),
                "Content-Type",
                "application/json; charset=utf-8");
        assertThat(refused.expect(400).details()).singleElement().asString().contains("UTF-8");
        byte[] wide = "{ }".getBytes(StandardCharsets.UTF_16);
        api.send(
                        "POST",
                        Barge.PATH + "/conditions",
                        BodyPublishers.ofByteArray(wide),
                        "Content-Type",
                        "application/json")
                .expect(400);
    }

    @Test
    void tooDeepNestingIsRefused() {
        String deep = "[".repeat(100_000);
        api.post(Barge.PATH + "/conditions", deep).expect(400);
        api.put(Barge.PATH, "{\"hull\":".repeat(10_000)).expect(400);
    }

    @Test
    void anEmptyBodyIsRefused() {
        api.post(Barge.PATH + "/conditions", "").expect(400);
    }

    @Test
    void aBodyOfAMillionTrianglesIsTooLarge() {
        String triangles = "[1,2,3],".repeat(3_000_000);
        api.put(Barge.PATH, "{ \"hull\": { \"bodies\": [ { \"triangles\": [" + triangles)
                .expect(413);
    }
}
