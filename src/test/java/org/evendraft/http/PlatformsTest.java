package org.evendraft.http;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import org.evendraft.platform.Json;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;

class PlatformsTest {
    private final TestService service = TestService.start();
    private final Api api = service.api();

    @AfterEach
    void stop() {
        service.close();
    }

    @Test
    void theFirstRevisionIsCreatedAndTheNextReplacesIt() {
        Api.Reply first = api.put(Barge.PATH, Barge.PLATFORM).expect(201);
        assertThat(first.header("ETag")).isEqualTo("\"rev-1\"");
        assertThat(first.header("Location")).isEqualTo(Barge.PATH);
        Api.Reply second = api.put(Barge.PATH, Barge.PLATFORM).expect(200);
        assertThat(second.header("ETag")).isEqualTo("\"rev-2\"");
        assertThat(second.json().path("revision").intValue()).isEqualTo(2);
    }

    @Test
    void aPlatformIsReadAsItWasStoredAndEveryRevisionIsKept() throws Exception {
        api.put(Barge.PATH, Barge.PLATFORM).expect(201);
        api.put(Barge.PATH, Barge.PLATFORM.replace("\"name\": \"Barge\"", "\"name\": \"Longboat\""))
                .expect(200);
        Api.Reply current = api.get(Barge.PATH).expect(200);
        assertThat(current.json().path("name").textValue()).isEqualTo("Longboat");
        assertThat(current.header("Platform-Revision")).isEqualTo("2");
        Api.Reply first = api.get(Barge.PATH + "?revision=1").expect(200);
        assertThat(first.json()).isEqualTo(Json.mapper().readTree(Barge.PLATFORM));
        assertThat(first.header("ETag")).isEqualTo("\"rev-1\"");
        api.get(Barge.PATH + "?revision=3").expect(404);
    }

    @Test
    void aStaleIfMatchIsRefusedAndNothingIsStored() {
        api.put(Barge.PATH, Barge.PLATFORM).expect(201);
        api.put(Barge.PATH, Barge.PLATFORM, "If-Match", "\"rev-1\"").expect(200);
        Api.Reply stale =
                api.put(Barge.PATH, Barge.PLATFORM, "If-Match", "\"rev-1\"").expect(412);
        assertThat(stale.json().path("detail").textValue()).contains("revision 2");
        assertThat(api.get(Barge.PATH).header("ETag")).isEqualTo("\"rev-2\"");
        api.put(Barge.PATH, Barge.PLATFORM, "If-Match", "\"rev-7\", \"rev-2\"").expect(200);
        api.put(Barge.PATH, Barge.PLATFORM, "If-Match", "*").expect(200);
    }

    @Test
    void ifNoneMatchGuardsAPlatformThatExists() {
        api.put(Barge.PATH, Barge.PLATFORM, "If-None-Match", "*").expect(201);
        api.put(Barge.PATH, Barge.PLATFORM, "If-None-Match", "*").expect(412);
        api.put("/api/v1/platforms/other", Barge.PLATFORM, "If-Match", "*").expect(412);
    }

    @Test
    void aClientThatHasTheRevisionIsToldSo() {
        api.put(Barge.PATH, Barge.PLATFORM).expect(201);
        Api.Reply known = api.get(Barge.PATH, "If-None-Match", "\"rev-1\"").expect(304);
        assertThat(known.text()).isEmpty();
        api.get(Barge.PATH, "If-None-Match", "\"rev-2\"").expect(200);
    }

    @Test
    void theIdMustBeThatOfTheAddress() {
        Api.Reply other = api.put("/api/v1/platforms/other", Barge.PLATFORM).expect(422);
        assertThat(other.pointers()).containsExactly("/id");
        api.get("/api/v1/platforms/other").expect(404);
    }

    @Test
    void allPlatformsAreListed() {
        assertThat(api.get("/api/v1/platforms").expect(200).json().path("platforms"))
                .isEmpty();
        api.put(Barge.PATH, Barge.PLATFORM).expect(201);
        api.put("/api/v1/platforms/ark", Barge.PLATFORM.replace("\"barge\"", "\"ark\""))
                .expect(201);
        JsonNode platforms = api.get("/api/v1/platforms").json().path("platforms");
        assertThat(platforms.findValuesAsText("id")).containsExactly("ark", "barge");
        assertThat(platforms.path(0).path("tanks").intValue()).isEqualTo(3);
    }

    @Test
    void aPlatformWithFaultsIsRefusedWithAllOfThemAndNotStored() {
        String faulty =
                Barge.PLATFORM.replace("\"mass\": 6000", "\"mass\": -1").replace("\"rate\": 500", "\"rate\": \"fast\"");
        Api.Reply refused = api.put(Barge.PATH, faulty).expect(400);
        assertThat(refused.pointers()).containsExactlyInAnyOrder("/lightship/mass", "/pumps/0/rate");
        api.get(Barge.PATH).expect(404);
    }
}
