package org.evendraft.http;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;

class WindAndCriteriaTest {
    private static final String WIND = Barge.PATH + "/wind";
    private static final String CRITERIA = Barge.PATH + "/criteria";
    private static final String RIGHTING = Barge.PATH + "/righting";
    private static final String LIGHT = ExposedBarge.LIGHT;

    private final TestService service = TestService.start();
    private final Api api = ExposedBarge.stored(service);

    @AfterEach
    void stop() {
        service.close();
    }

    private static JsonNode criterion(JsonNode answer, String name) {
        for (JsonNode criterion : answer.path("criteria")) {
            if (name.equals(criterion.path("criterion").textValue())) {
                return criterion;
            }
        }
        throw new AssertionError("no criterion " + name);
    }

    private static double number(JsonNode node, String name) {
        assertThat(node.path(name).isNumber()).as(name).isTrue();
        return node.path(name).doubleValue();
    }

    @Test
    void theWindOnTheWallIsThatOfTheCodeByHand() {
        JsonNode wind =
                api.post(WIND + "?azimuth=0&to=14&step=7", LIGHT).expect(200).json();
        JsonNode afloat = wind.path("afloat");
        double force = ExposedBarge.force(36);
        assertThat(number(afloat, "force")).isCloseTo(force, within(1e-6));
        assertThat(number(afloat, "resistanceDepth")).isCloseTo(1.5, within(1e-9));
        assertThat(number(afloat, "moment")).isCloseTo(force * 10.5, within(1e-5));
        assertThat(number(afloat, "arm")).isCloseTo(force * 10.5 / ExposedBarge.weight(), within(1e-9));
        JsonNode wall = afloat.path("contributions").path(0);
        assertThat(wall.path("element").textValue()).isEqualTo("wall");
        assertThat(number(wall, "from")).isCloseTo(7, within(1e-9));
        assertThat(number(wall, "to")).isCloseTo(11, within(1e-9));
        assertThat(number(wall, "area")).isCloseTo(ExposedBarge.WALL, within(1e-9));
        assertThat(number(wall, "heightCoefficient")).isEqualTo(1);
        JsonNode inclined = wind.at("/curve/points/2");
        assertThat(number(inclined, "arm")).isCloseTo(ExposedBarge.windArm(36, Math.toRadians(14)), within(1e-7));
        double rest = Math.toRadians(number(wind.path("curve"), "firstIntercept"));
        assertThat(ExposedBarge.gz(rest)).isCloseTo(ExposedBarge.windArm(36, rest), within(1e-7));
        assertThat(wind.path("resistanceCentre").textValue()).contains("centre of buoyancy");
        assertThat(wind.path("platformRevision").intValue()).isEqualTo(1);
    }

    @Test
    void aGivenWindTakesThePlaceOfTheModes() {
        JsonNode wind = api.post(WIND + "?azimuth=60&wind=18&to=10&step=10", "{}")
                .expect(200)
                .json();
        // across this axis the wind sees the half of the wall
        assertThat(number(wind.path("afloat"), "force")).isCloseTo(ExposedBarge.force(18) / 2, within(1e-6));
        assertThat(number(wind.path("curve"), "speed")).isEqualTo(18);
    }

    @Test
    void rightingArmsComeWithWindOpeningsAndCriteriaAboutTheAxis() {
        JsonNode curve = api.post(RIGHTING + "?azimuth=0&to=15&step=5", LIGHT)
                .expect(200)
                .json();
        assertThat(number(curve.path("wind"), "speed")).isEqualTo(36);
        assertThat(number(curve.at("/points/3"), "area"))
                .isCloseTo(ExposedBarge.area(Math.toRadians(15)), within(1e-6));
        JsonNode scuttle = curve.path("openings").path(0);
        assertThat(scuttle.path("opening").textValue()).isEqualTo("scuttle");
        assertThat(number(scuttle, "height")).isCloseTo(2.8, within(1e-7));
        // openings are looked for as far as criteria are judged, beyond the points asked for
        double meets = Math.atan(0.28);
        assertThat(number(scuttle, "angle")).isCloseTo(Math.toDegrees(meets), within(1e-4));
        JsonNode ratio = criterion(curve, "intact.areaRatio");
        assertThat(number(ratio, "value"))
                .isCloseTo(ExposedBarge.area(meets) / ExposedBarge.windArea(36, meets), within(0.01));
        assertThat(number(ratio, "angle")).isCloseTo(Math.toDegrees(meets), within(1e-4));
        assertThat(ratio.path("note").textValue()).contains("scuttle");
        assertThat(curve.path("rules").textValue()).isEqualTo("moduColumnStabilized");
        assertThat(curve.path("rulesAssumed").booleanValue()).isFalse();
    }

    @Test
    void withoutAWindSpeedTheCurveSaysThatItsCriteriaAreNotJudged() {
        JsonNode curve = api.post(RIGHTING + "?azimuth=0&to=10&step=10", "{}")
                .expect(200)
                .json();
        assertThat(curve.path("wind").isNull()).isTrue();
        assertThat(criterion(curve, "intact.areaRatio").path("met").isNull()).isTrue();
        assertThat(criterion(curve, "intact.areaRatio").path("note").textValue())
                .contains("no wind speed");
        assertThat(number(criterion(curve, "intact.leastGm"), "value")).isCloseTo(ExposedBarge.gm(), within(1e-7));
    }

    @Test
    void criteriaAreJudgedAboutTheirWorstAxes() {
        JsonNode judged = api.post(CRITERIA, LIGHT).expect(200).json();
        assertThat(judged.path("met").booleanValue()).isTrue();
        assertThat(number(judged, "windSpeed")).isEqualTo(36);
        JsonNode gm = criterion(judged, "intact.leastGm");
        assertThat(number(gm, "value")).isCloseTo(ExposedBarge.gm(), within(1e-7));
        assertThat(number(gm, "margin")).isCloseTo(ExposedBarge.gm() - 0.05, within(1e-7));
        assertThat(gm.path("clause").textValue()).contains("46 CFR 174.040");
        assertThat(number(criterion(judged, "minGm.transverse"), "bound")).isEqualTo(1);
        JsonNode heel = criterion(judged, "heel");
        double rest = Math.toRadians(number(heel, "value"));
        assertThat(ExposedBarge.gz(rest)).isCloseTo(ExposedBarge.windArm(36, rest), within(1e-6));
        assertThat(number(heel, "azimuth") % 180)
                .satisfiesAnyOf(
                        a -> assertThat(a).isLessThan(5), a -> assertThat(a).isGreaterThan(175));
        assertThat(number(heel, "margin")).isCloseTo(1 - number(heel, "value"), within(1e-12));
    }

    @Test
    void aStrongerWindBreaksACriterionAndTheAnswerSaysWhich() {
        String stored = api.post(Barge.PATH + "/conditions", LIGHT).header("Location");
        assertThat(api.get(stored + "/criteria").expect(200).json().path("met").booleanValue())
                .isTrue();
        JsonNode judged = api.get(stored + "/criteria?wind=100").expect(200).json();
        assertThat(judged.path("met").booleanValue()).isFalse();
        JsonNode heel = criterion(judged, "heel");
        assertThat(heel.path("met").booleanValue()).isFalse();
        double rest = Math.toRadians(number(heel, "value"));
        assertThat(ExposedBarge.gz(rest)).isCloseTo(ExposedBarge.windArm(100, rest), within(1e-5));
        assertThat(number(heel, "margin")).isNegative();
        assertThat(criterion(judged, "intact.areaRatio").path("met").booleanValue())
                .isTrue();
        JsonNode wind = api.get(stored + "/wind?azimuth=0&wind=100&to=5&step=5")
                .expect(200)
                .json();
        assertThat(number(wind.path("afloat"), "force")).isCloseTo(ExposedBarge.force(100), within(1e-6));
    }

    @Test
    void withoutAKnownWindNothingIsJudgedByIt() {
        for (String condition : new String[] {"{}", "{ \"mode\": \"calm\" }"}) {
            for (String path : new String[] {CRITERIA, WIND + "?azimuth=0"}) {
                assertThat(api.post(path, condition).expect(422).pointers()).containsExactly("/mode");
            }
            String stored = api.post(Barge.PATH + "/conditions", condition).header("Location");
            assertThat(api.get(stored + "/criteria").expect(422).details())
                    .singleElement()
                    .asString()
                    .contains("wind");
        }
        api.post(CRITERIA + "?wind=20", "{}").expect(200);
    }

    @Test
    void withoutWindageOrOpeningsCriteriaSayThatTheyAreNotJudged() {
        ObjectNode bare = ExposedBarge.document();
        bare.remove("windage");
        bare.remove("openings");
        api.put(Barge.PATH, bare.toString()).expect(200);
        assertThat(api.post(WIND + "?azimuth=0", LIGHT).expect(422).details())
                .singleElement()
                .asString()
                .contains("no windage");
        JsonNode judged = api.post(CRITERIA, LIGHT).expect(200).json();
        JsonNode ratio = criterion(judged, "intact.areaRatio");
        assertThat(ratio.path("met").isNull()).isTrue();
        assertThat(ratio.path("value").isNull()).isTrue();
        assertThat(ratio.path("azimuth").isNull()).isTrue();
        assertThat(ratio.path("note").textValue()).contains("no windage");
        assertThat(judged.path("met").booleanValue()).isTrue();
        JsonNode damaged = api.post(Barge.PATH + "/damage?flooded=MID&situation=flooding", LIGHT)
                .expect(200)
                .json();
        JsonNode opening = criterion(damaged.at("/cases/0"), "flooding.openingsUnderWater");
        assertThat(opening.path("met").isNull()).isTrue();
        assertThat(opening.path("note").textValue()).contains("no opening");
        assertThat(damaged.at("/cases/0/openings")).isEmpty();
    }

    @Test
    void allFaultsOfTheParametersAreToldTogether() {
        assertThat(api.post(WIND + "?azimuth=361&to=81&wind=-1", LIGHT)
                        .expect(422)
                        .details())
                .hasSize(3)
                .anyMatch(d -> d.startsWith("azimuth"))
                .anyMatch(d -> d.startsWith("to "))
                .anyMatch(d -> d.startsWith("wind must be from 0 to 150 m/s"));
        assertThat(api.post(RIGHTING + "?azimuth=-400&liquids=frozen&wind=151", LIGHT)
                        .expect(400)
                        .details())
                .hasSize(3)
                .anyMatch(d -> d.contains("liquids must be one of free, actualMoment, maximumMoment, not 'frozen'"));
        assertThat(api.post(WIND, LIGHT).expect(400).details())
                .singleElement()
                .asString()
                .contains("azimuth must be given");
        assertThat(api.post(CRITERIA + "?azimuth=0&wind=strong", LIGHT)
                        .expect(400)
                        .details())
                .hasSize(2);
        api.post(CRITERIA + "?wind=150", LIGHT).expect(200);
    }

    @Test
    void aConditionThatFloatsNowhereOrIsNotThereHasNoCriteria() {
        String heavy =
                "{ \"mode\": \"afloat\", \"loads\": [ { \"kind\": \"variable\", \"mass\": 50000, \"x\": 0, \"y\": 0, \"z\": 1 } ] }";
        String high =
                "{ \"mode\": \"afloat\", \"loads\": [ { \"kind\": \"variable\", \"mass\": 6000, \"x\": 0, \"y\": 0, \"z\": 60 } ] }";
        for (String path : new String[] {CRITERIA, WIND + "?azimuth=0", Barge.PATH + "/damage"}) {
            assertThat(api.post(path, heavy).expect(422).details())
                    .singleElement()
                    .asString()
                    .contains("sinks");
            assertThat(api.post(path, high).expect(422).details())
                    .singleElement()
                    .asString()
                    .contains("capsizes");
        }
        api.get(Barge.PATH + "/conditions/none/criteria").expect(404);
        api.get(Barge.PATH + "/conditions/none/wind?azimuth=0").expect(404);
        api.post("/api/v1/platforms/nobody/criteria", LIGHT).expect(404);
        assertThat(api.post(CRITERIA, "{ \"mode\": \"ghost\" }").expect(422).pointers())
                .containsExactly("/mode");
    }
}
