package org.evendraft.http;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

/** What the parts of the service say about the demo platform agrees. */
class DemoJudgedTest {
    private static final String DEMO = "/api/v1/platforms/merganser";

    private final TestService service = TestService.start();
    private final Api api = service.api();
    private String condition = "";
    private JsonNode result = ExposedBarge.parse("{}");

    @BeforeEach
    void store() throws IOException {
        api.put(DEMO, resource("merganser.json")).expect(201);
        Api.Reply stored = api.post(DEMO + "/conditions", resource("condition.json"));
        condition = stored.expect(201).header("Location");
        result = stored.json();
    }

    @AfterEach
    void stop() {
        service.close();
    }

    private static String resource(String name) throws IOException {
        try (var in = DemoJudgedTest.class.getResourceAsStream("/db/demo/" + name)) {
            return new String(in.readAllBytes(), StandardCharsets.UTF_8);
        }
    }

    @Test
    void theCriteriaAreMetAndTheLeastGmIsThatOfTheCondition() {
        JsonNode judged = api.get(condition + "/criteria").expect(200).json();
        assertThat(judged.path("met").booleanValue()).isTrue();
        assertThat(judged.path("windSpeed").doubleValue()).isEqualTo(36);
        JsonNode least = judged.at("/criteria/0");
        assertThat(least.path("criterion").textValue()).isEqualTo("intact.leastGm");
        assertThat(least.path("value").doubleValue())
                .isCloseTo(result.at("/gm/least/corrected").doubleValue(), within(1e-9));
        assertThat(judged.path("criteria").findValuesAsText("met")).doesNotContain("null", "false");
    }

    /** The contributions of the elements add up, and the arm is their moment over the weight. */
    @Test
    void theContributionsToTheWindAddUp() {
        JsonNode wind = api.get(condition + "/wind?azimuth=30&to=10&step=10")
                .expect(200)
                .json()
                .path("afloat");
        double force = 0;
        double moment = 0;
        for (JsonNode part : wind.path("contributions")) {
            force += part.path("force").doubleValue();
            moment += part.path("moment").doubleValue();
            assertThat(part.path("moment").doubleValue())
                    .isCloseTo(
                            part.path("force").doubleValue()
                                    * part.path("lever").doubleValue(),
                            within(1e-6));
        }
        assertThat(wind.path("contributions").size()).isGreaterThan(9); // nine elements, some in two height bands
        assertThat(wind.path("force").doubleValue()).isPositive().isCloseTo(force, within(1e-6));
        assertThat(wind.path("moment").doubleValue()).isCloseTo(moment, within(1e-5));
        double weight = result.path("mass").doubleValue() * 9.80665;
        assertThat(wind.path("arm").doubleValue()).isCloseTo(moment / weight, within(1e-9));
    }

    @Test
    void everyListedCaseIsSurvivedAndWhatIsLostIsWhatTheTanksHeld() {
        JsonNode survey = api.get(condition + "/damage").expect(200).json();
        assertThat(survey.path("cases")).hasSize(8);
        assertThat(survey.path("survived").booleanValue()).isTrue();
        double mass = result.path("mass").doubleValue();
        for (JsonNode damaged : survey.path("cases")) {
            double lost = 0;
            for (JsonNode space : damaged.path("flooded")) {
                lost += held(space.textValue());
            }
            assertThat(damaged.path("lostContent").doubleValue()).isCloseTo(lost, within(1e-6));
            assertThat(damaged.at("/floating/mass").doubleValue()).isCloseTo(mass - lost, within(1e-6));
            assertThat(damaged.path("outcome").textValue()).isEqualTo("afloat");
        }
        JsonNode worst = survey.at("/worst/0");
        assertThat(survey.path("why").textValue()).contains(worst.path("clause").textValue());
        assertThat(survey.path("worstCase").textValue())
                .isEqualTo(worst.path("damageCase").textValue());
    }

    /** What a tank held in the condition, 0 for a compartment (t). */
    private double held(String space) {
        for (JsonNode tank : result.path("tanks")) {
            if (space.equals(tank.path("tank").textValue())) {
                return tank.path("mass").doubleValue();
            }
        }
        return 0;
    }
}
