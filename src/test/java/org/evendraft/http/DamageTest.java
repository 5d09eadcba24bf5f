package org.evendraft.http;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.net.http.HttpRequest.BodyPublishers;
import org.evendraft.service.SteppedWork;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;

class DamageTest {
    private static final String DAMAGE = Barge.PATH + "/damage";
    private static final String LIGHT = ExposedBarge.LIGHT;
    private static final String KEY = "Idempotency-Key";

    private final TestService service = TestService.start();
    private final Api api = ExposedBarge.stored(service);

    @AfterEach
    void stop() {
        service.close();
    }

    private JsonNode ask(String query) {
        return api.post(DAMAGE + query, LIGHT).expect(200).json();
    }

    private String stored(String condition) {
        return api.post(Barge.PATH + "/conditions", condition).expect(201).header("Location");
    }

    /** 20 m of a box of 100 m, as much on either side of the middle, no longer carry it: 6000 m³ on 80 × 20 m is 3.75 m. */
    @Test
    void listedCasesFloatByLostBuoyancy() {
        JsonNode survey = ask("");
        JsonNode damaged = survey.at("/cases/0");
        assertThat(survey.path("cases")).hasSize(1);
        assertThat(damaged.path("damageCase").textValue()).isEqualTo("both-ends");
        assertThat(damaged.path("situation").textValue()).isEqualTo("flooding");
        assertThat(damaged.path("why").textValue()).contains("listed");
        assertThat(damaged.path("outcome").textValue()).isEqualTo("afloat");
        assertThat(damaged.at("/floating/draft").doubleValue()).isCloseTo(3.75, within(1e-7));
        assertThat(damaged.at("/floating/inclination").doubleValue()).isCloseTo(0, within(1e-7));
        assertThat(damaged.at("/floating/mass").doubleValue()).isCloseTo(6000, within(1e-7));
        assertThat(damaged.at("/floating/marks/F").doubleValue()).isCloseTo(3.75, within(1e-7));
        assertThat(damaged.at("/openings/0/height").doubleValue()).isCloseTo(2.05, within(1e-7));
        assertThat(damaged.path("criteria").findValuesAsText("criterion"))
                .containsExactly("flooding.inclination", "flooding.openingsUnderWater");
        assertThat(survey.path("survived").booleanValue()).isTrue();
        assertThat(survey.path("worstCase").textValue()).isEqualTo("both-ends");
        assertThat(survey.path("why").textValue()).isNotBlank();
    }

    /** The tank is half full: 40 × 5 × 2.5 m³ of water are lost, and then 200 m² of waterplane on one side. */
    @Test
    void whatAFloodedTankHeldIsLost() {
        String stored = stored(Barge.CONDITION);
        JsonNode damaged = api.get(stored + "/damage?flooded=PORT&wind=10")
                .expect(200)
                .json()
                .at("/cases/0");
        assertThat(damaged.path("lostContent").doubleValue()).isCloseTo(500, within(1e-6));
        assertThat(damaged.at("/floating/mass").doubleValue()).isCloseTo(6100, within(1e-6));
        assertThat(damaged.path("situation").textValue()).isEqualTo("collision");
        assertThat(damaged.path("flooded").path(0).textValue()).isEqualTo("PORT");
        assertThat(damaged.path("why").textValue()).isEqualTo("asked for");
        assertThat(damaged.at("/criteria/0/windSpeed").doubleValue()).isEqualTo(25.8);
    }

    /** 2.5 m of the barge hold 5000 t, and it weighs 6000 t. Between the wings 7 m of breadth are left: BM 0.5 m under a KG of 5 m. */
    @Test
    void aPlatformThatSinksOrCapsizesIsAnAnswer() {
        JsonNode sunk = ask("?flooded=TOP");
        assertThat(sunk.at("/cases/0/outcome").textValue()).isEqualTo("sinks");
        assertThat(sunk.at("/cases/0/reason").textValue()).contains("6000.0 t").contains("5000.0 t");
        assertThat(sunk.at("/cases/0/floating").isNull()).isTrue();
        assertThat(sunk.at("/cases/0/criteria")).isEmpty();
        assertThat(sunk.path("survived").booleanValue()).isFalse();
        assertThat(sunk.path("worstCase").textValue()).isEqualTo("asked");
        JsonNode over = ask("?flooded=PWING,SWING&situation=flooding");
        assertThat(over.at("/cases/0/outcome").textValue()).isEqualTo("capsizes");
        assertThat(over.path("survived").booleanValue()).isFalse();
        assertThat(over.path("why").textValue()).contains("capsizes");
    }

    @Test
    void anyOneSpaceIsFlooded() {
        ObjectNode shallow = ExposedBarge.document();
        shallow.remove("damageCases");
        api.put(Barge.PATH, shallow.toString()).expect(200);
        JsonNode none = ask("");
        assertThat(none.path("cases")).isEmpty();
        assertThat(none.path("worstCase").isNull()).isTrue();
        assertThat(none.path("notes").path(0).textValue()).contains("lists no damage cases");
        JsonNode any = ask("?cases=flooding");
        assertThat(any.path("cases").findValuesAsText("situation")).isNotEmpty().containsOnly("flooding");
        assertThat(any.path("survived").booleanValue()).isFalse();
        assertThat(any.path("why").textValue()).contains("sinks");
    }

    @Test
    void allFaultsOfAQuestionAreToldTogether() {
        Api.Reply unknown =
                api.post(DAMAGE + "?flooded=GHOST,MID,FUEL,MID,", LIGHT).expect(400);
        assertThat(unknown.pointers())
                .containsExactlyInAnyOrder("/flooded/0", "/flooded/2", "/flooded/3", "/flooded/4");
        assertThat(unknown.details())
                .anyMatch(d -> d.contains("no tank or compartment 'GHOST'"))
                .anyMatch(d -> d.contains("FUEL is known only by a table"))
                .anyMatch(d -> d.contains("named twice"));
        api.post(DAMAGE + "?flooded=GHOST,FUEL", LIGHT).expect(422);
        assertThat(api.post(DAMAGE + "?flooded=MID&cases=flooding&situation=war&wind=999&x=1", LIGHT)
                        .expect(400)
                        .details())
                .hasSize(4)
                .anyMatch(d -> d.contains("cases cannot be given together with flooded"))
                .anyMatch(d -> d.contains("situation must be one of collision, flooding, not 'war'"))
                .anyMatch(d -> d.contains("wind must be from 0 to 150 m/s"));
        assertThat(api.post(DAMAGE + "?cases=all&situation=flooding", LIGHT)
                        .expect(400)
                        .details())
                .hasSize(2)
                .anyMatch(d -> d.contains("cases must be one of listed, collision, flooding"));
        assertThat(api.post(DAMAGE + "?cases=collision", "{}").expect(422).pointers())
                .containsExactly("/mode");
        api.get(Barge.PATH + "/conditions/none/damage").expect(404);
        send(Barge.PATH + "/conditions/none/damage").expect(404);
    }

    /** A POST without a body, and with no word on its kind. */
    private Api.Reply send(String path, String... headers) {
        return api.send("POST", path, BodyPublishers.noBody(), headers);
    }

    @Test
    void theSameQuestionAsAJobHasTheSameAnswer() {
        String stored = stored(LIGHT);
        Api.Reply accepted = send(stored + "/damage", KEY, "tablet-1").expect(202);
        JsonNode job = accepted.json();
        assertThat(job.path("kind").textValue()).isEqualTo("damage");
        assertThat(accepted.header("Location")).isEqualTo(job.at("/links/self").textValue());
        Api.Reply retry = send(stored + "/damage", KEY, "tablet-1").expect(202);
        assertThat(retry.text()).isEqualTo(accepted.text());
        send(stored + "/damage?flooded=TOP", KEY, "tablet-1").expect(422);
        JsonNode done = SteppedWork.await(
                () -> api.get(accepted.header("Location")).json(),
                j -> j.path("state").textValue().equals("done"));
        String result =
                api.get(done.at("/links/result").textValue()).expect(200).text();
        assertThat(Api.DESCRIPTION.deviations("TracedDamageSurvey", result)).isEmpty();
        JsonNode atOnce = api.get(stored + "/damage").expect(200).json();
        assertThat(ExposedBarge.parse(result).path("cases")).isEqualTo(atOnce.path("cases"));
        assertThat(api.get("/api/v1/jobs").json().path("total").intValue()).isEqualTo(1);
    }

    @Test
    void whatIsWrongWithAJobIsToldBeforeItIsOne() {
        String stored = stored("{}");
        assertThat(send(stored + "/damage?flooded=GHOST").expect(422).pointers())
                .containsExactly("/flooded/0");
        assertThat(send(stored + "/damage?cases=collision").expect(422).pointers())
                .containsExactly("/mode");
        send(stored + "/damage?cases=all").expect(400);
        assertThat(api.get("/api/v1/jobs").json().path("total").intValue()).isZero();
    }
}
