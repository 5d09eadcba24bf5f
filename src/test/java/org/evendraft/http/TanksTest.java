package org.evendraft.http;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import java.net.http.HttpRequest.BodyPublishers;
import java.time.Duration;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;

class TanksTest {
    private static final String TANKS = Barge.PATH + "/tanks";
    private static final String SOUNDINGS = Barge.PATH + "/soundings";
    private static final String TABLE = TANKS + "/FUEL/table";

    private final TestService service = TestService.start();
    private final Api api = Barge.stored(service);

    @AfterEach
    void stop() {
        service.close();
    }

    @Test
    void aTankWithoutReadingSaysSo() {
        JsonNode tanks = api.get(TANKS).expect(200).json().path("tanks");
        assertThat(tanks).hasSize(3);
        assertThat(tanks.path(0).path("reading").isNull()).isTrue();
        assertThat(tanks.path(0).path("fullVolume").doubleValue()).isCloseTo(1000, within(1e-9));
    }

    @Test
    void aReadingGivesAllFiguresAndItsAge() {
        JsonNode batch = api.post(SOUNDINGS, """
                        { "source": "morning round", "readings": [
                          { "tank": "PORT", "at": "2026-06-12T05:30:00Z", "level": 2.5, "density": 1.02 },
                          { "tank": "FUEL", "mass": 85, "source": "gauge" } ] }""").expect(201).json();
        assertThat(batch.path("readings").path(0).path("given").textValue()).isEqualTo("level");
        service.pass(Duration.ofMinutes(12));
        JsonNode port = api.get(TANKS + "/PORT").expect(200).json().path("reading");
        assertThat(port.path("volume").doubleValue()).isCloseTo(500, within(1e-9));
        assertThat(port.path("mass").doubleValue()).isCloseTo(510, within(1e-9));
        assertThat(port.path("fraction").doubleValue()).isCloseTo(0.5, within(1e-12));
        assertThat(port.path("state").textValue()).isEqualTo("slack");
        assertThat(port.path("ageMinutes").doubleValue()).isCloseTo(42, within(1e-9));
        assertThat(port.path("source").textValue()).isEqualTo("morning round");
        JsonNode fuel = api.get(TANKS + "/FUEL").json().path("reading");
        assertThat(fuel.path("fraction").doubleValue()).isCloseTo(1, within(1e-12));
        assertThat(fuel.path("state").textValue()).isEqualTo("pressedUp");
        assertThat(fuel.path("source").textValue()).isEqualTo("gauge");
    }

    @Test
    void theLatestReadingCountsWhateverTheOrderOfArrival() {
        api.post(
                        SOUNDINGS,
                        "{ \"readings\": [ { \"tank\": \"PORT\", \"at\": \"2026-06-12T05:00:00Z\", \"fraction\": 0.2 } ] }")
                .expect(201);
        api.post(
                        SOUNDINGS,
                        "{ \"readings\": [ { \"tank\": \"PORT\", \"at\": \"2026-06-12T04:00:00Z\", \"fraction\": 0.9 } ] }")
                .expect(201);
        assertThat(api.get(TANKS + "/PORT")
                        .json()
                        .path("reading")
                        .path("fraction")
                        .doubleValue())
                .isCloseTo(0.2, within(1e-12));
    }

    @Test
    void theHistoryIsReadByTankAndInterval() {
        for (int hour = 1; hour <= 5; hour++) {
            String reading = "{ \"tank\": \"%s\", \"at\": \"2026-06-12T0%d:00:00Z\", \"fraction\": 0.%d }";
            api.post(
                            SOUNDINGS,
                            "{ \"readings\": [ " + reading.formatted(hour % 2 == 0 ? "PORT" : "STBD", hour, hour)
                                    + " ] }")
                    .expect(201);
        }
        JsonNode all = api.get(SOUNDINGS + "?limit=2&offset=1").expect(200).json();
        assertThat(all.path("total").intValue()).isEqualTo(5);
        assertThat(all.path("readings").findValuesAsText("at"))
                .containsExactly("2026-06-12T04:00:00Z", "2026-06-12T03:00:00Z");
        JsonNode some = api.get(SOUNDINGS + "?tank=STBD&from=2026-06-12T03:00:00Z&to=2026-06-12T05:00:00Z")
                .json();
        assertThat(some.path("readings").findValuesAsText("at")).containsExactly("2026-06-12T03:00:00Z");
        Api.Reply refused = api.get(SOUNDINGS + "?from=yesterday&limit=0").expect(400);
        assertThat(refused.details()).hasSize(2);
    }

    @Test
    void allFaultsOfABatchAreToldAndNothingIsStored() {
        Api.Reply refused = api.post(SOUNDINGS, """
                { "source": "x", "readings": [
                  { "tank": "GHOST", "level": 1 },
                  { "tank": "PORT", "fraction": 1.2 },
                  { "tank": "PORT", "level": 1, "volume": 3 },
                  { "tank": "PORT", "at": "soon", "level": 1 },
                  { "tank": "PORT", "at": "2026-06-12T07:00:00Z", "level": 1 },
                  { "tank": "PORT", "mass": -1, "colour": "blue" },
                  { "tank": "PORT", "level": 1 } ] }""");
        refused.expect(400);
        assertThat(refused.pointers())
                .containsExactlyInAnyOrder(
                        "/readings/0/tank",
                        "/readings/1/fraction",
                        "/readings/2",
                        "/readings/3/at",
                        "/readings/4/at",
                        "/readings/5/mass",
                        "/readings/5/colour");
        assertThat(api.get(SOUNDINGS).json().path("total").intValue()).isZero();
        assertThat(api.post(SOUNDINGS, "{ \"readings\": [] }").expect(400).pointers())
                .containsExactly("/readings");
        assertThat(api.post(SOUNDINGS, "{ \"readings\": [ 7 ] }").expect(400).pointers())
                .contains("/readings/0");
    }

    @Test
    void aConditionMayTakeTheLatestReadingsAndKeepsThem() {
        api.post(SOUNDINGS, """
                        { "readings": [
                          { "tank": "PORT", "at": "2026-06-10T06:00:00Z", "fraction": 0.25 },
                          { "tank": "STBD", "at": "2026-06-12T05:00:00Z", "volume": 400, "density": 1.02 } ] }""").expect(201);
        JsonNode result = api.post(Barge.PATH + "/conditions", "{ \"name\": \"now\", \"fills\": \"latest\" }")
                .expect(201)
                .json();
        assertThat(result.path("mass").doubleValue()).isCloseTo(6000 + 250 + 408, within(1e-6));
        assertThat(result.path("warnings").toString())
                .contains("No reading of tank FUEL")
                .contains("tank PORT is more than 24 hours old");
        api.post(SOUNDINGS, "{ \"readings\": [ { \"tank\": \"PORT\", \"fraction\": 0.75 } ] }")
                .expect(201);
        JsonNode kept = api.get(Barge.PATH + "/conditions/" + result.path("id").textValue())
                .expect(200)
                .json();
        assertThat(kept.path("condition").path("fills").path(0).path("volume").doubleValue())
                .isCloseTo(250, within(1e-9));
    }

    @Test
    void aTableComesAsJsonAndCsvAndGoesBackUnchanged() {
        Api.Reply json = api.get(TABLE).expect(200);
        assertThat(json.json().path("table")).hasSize(2);
        assertThat(json.header("ETag")).isEqualTo("\"rev-1\"");
        Api.Reply csv = api.get(TABLE, "Accept", "text/csv").expect(200);
        assertThat(csv.text()).startsWith("level,volume,x,y,z,inertiaT,inertiaL,inertiaTL\r\n");
        api.put(TABLE, json.text()).expect(200);
        api.send("PUT", TABLE, BodyPublishers.ofString(csv.text()), "Content-Type", "text/csv")
                .expect(200);
        assertThat(api.get(TABLE).json()).isEqualTo(json.json());
        assertThat(api.get(TABLE).header("Platform-Revision")).isEqualTo("3");
    }

    @Test
    void aNewTableMakesANewRevisionOfThePlatform() {
        String taller = "level,volume,x,y,z,inertiaT,inertiaL\n0,0,0,0,5,100,200\n4,200,0,0,7,100,200\n";
        Api.Reply stored = api.send(
                        "PUT",
                        TABLE,
                        BodyPublishers.ofString(taller),
                        "Content-Type",
                        "text/csv",
                        "If-Match",
                        "\"rev-1\"")
                .expect(200);
        assertThat(stored.header("ETag")).isEqualTo("\"rev-2\"");
        assertThat(api.get(TANKS + "/FUEL").json().path("fullVolume").doubleValue())
                .isCloseTo(200, within(1e-9));
        assertThat(api.get(Barge.PATH + "?revision=1")
                        .json()
                        .path("tanks")
                        .path(2)
                        .path("table")
                        .path(1)
                        .path("volume")
                        .intValue())
                .isEqualTo(100);
        api.send("PUT", TABLE, BodyPublishers.ofString(taller), "Content-Type", "text/csv", "If-Match", "\"rev-1\"")
                .expect(412);
    }

    @Test
    void aTableThatGoesBackwardsIsRefusedWithItsLine() {
        String backwards =
                "level,volume,x,y,z,inertiaT,inertiaL\n0,0,0,0,5,100,200\n4,200,0,0,7,100,200\n3,250,0,0,7,100,200\n";
        Api.Reply refused = api.send("PUT", TABLE, BodyPublishers.ofString(backwards), "Content-Type", "text/csv")
                .expect(422);
        assertThat(refused.pointers()).containsExactly("/2/level");
        assertThat(refused.details()).singleElement().asString().contains("line 4");
        api.put(TABLE, "{ \"table\": [ { \"level\": 0 } ] }").expect(400);
        assertThat(api.get(Barge.PATH).header("ETag")).isEqualTo("\"rev-1\"");
    }

    @Test
    void anUnknownTankIsNotFound() {
        api.get(TANKS + "/GHOST").expect(404);
        api.get(TANKS + "/GHOST/table").expect(404);
        api.put(TANKS + "/GHOST/table", api.get(TABLE).text()).expect(404);
        api.post("/api/v1/platforms/ghost/soundings", "{ \"readings\": [ { \"tank\": \"A\", \"level\": 1 } ] }")
                .expect(404);
    }
}
