package org.evendraft.http;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;

class RightingTest {
    private static final String RIGHTING = Barge.PATH + "/righting";
    private static final String EMPTY = "{ \"name\": \"empty\" }";

    private final TestService service = TestService.start();
    private final Api api = Barge.stored(service);

    @AfterEach
    void stop() {
        service.close();
    }

    /** Wall-sided formula by hand: 100 × 20 m at 3 m of draft, KB 1.5, BM 400/36, KG 5 m. */
    @Test
    void armsAreThoseOfTheWallSidedFormula() {
        JsonNode curve = api.post(RIGHTING + "?azimuth=0&to=15&step=5", EMPTY)
                .expect(200)
                .json();
        double bm = 400 / 36.0;
        double phi = Math.toRadians(15);
        double arm = Math.sin(phi) * (1.5 + bm - 5 + bm / 2 * Math.pow(Math.tan(phi), 2));
        assertThat(curve.path("points")).hasSize(4);
        assertThat(curve.path("points").path(3).path("gz").doubleValue()).isCloseTo(arm, within(1e-7));
        assertThat(curve.path("firstIntercept").doubleValue()).isZero();
        assertThat(curve.path("liquids").textValue()).isEqualTo("free");
        assertThat(curve.path("platformRevision").intValue()).isEqualTo(1);
    }

    @Test
    void aStoredConditionHasCurvesAboutOneAxisAndAllAround() {
        String location = api.post(Barge.PATH + "/conditions", Barge.CONDITION).header("Location");
        JsonNode heel = api.get(location + "/result").json().path("floating").path("heelAngle");
        JsonNode one = api.get(location + "/righting?azimuth=180").expect(200).json();
        assertThat(one.path("firstIntercept").doubleValue()).isCloseTo(-heel.doubleValue(), within(1e-6));
        JsonNode all = api.get(location + "/righting?to=20&step=10").expect(200).json();
        assertThat(all.path("curves")).hasSize(36);
        assertThat(all.path("curves").path(18).path("azimuth").doubleValue()).isEqualTo(180);
    }

    @Test
    void trimAndLiquidsAreCountedAsAsked() {
        String query = "?azimuth=180&to=10&step=10&liquids=";
        double free = armAtTen(query + "free");
        double fixed = armAtTen(query + "free&trim=fixed");
        double moment = armAtTen(query + "actualMoment");
        assertThat(fixed).isCloseTo(free, within(1e-3));
        assertThat(moment).isNotCloseTo(free, within(1e-6));
    }

    private double armAtTen(String query) {
        JsonNode curve = api.post(RIGHTING + query, Barge.CONDITION).expect(200).json();
        return curve.path("points").path(1).path("gz").doubleValue();
    }

    @Test
    void allFaultsOfTheParametersAreTold() {
        assertThat(api.post(RIGHTING + "?to=x&trim=loose", EMPTY).expect(400).details())
                .anyMatch(d -> d.startsWith("parameter azimuth must be given"))
                .anyMatch(d -> d.startsWith("parameter to "))
                .anyMatch(d -> d.startsWith("parameter trim "));
        assertThat(api.post(RIGHTING + "?azimuth=400&to=89&step=0", EMPTY)
                        .expect(422)
                        .details())
                .hasSize(3);
    }

    @Test
    void whatSinksHasNoCurve() {
        String heavy =
                "{ \"loads\": [ { \"name\": \"x\", \"kind\": \"variable\", \"mass\": 50000, \"x\": 0, \"y\": 0, \"z\": 1 } ] }";
        assertThat(api.post(RIGHTING + "?azimuth=0", heavy).expect(422).details())
                .singleElement()
                .asString()
                .contains("sinks");
    }
}
