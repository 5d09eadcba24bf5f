package org.evendraft.http;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.List;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;

class HydrostaticsTest {
    private static final String PATH = Barge.PATH + "/hydrostatics";

    private final TestService service = TestService.start();
    private final Api api = Barge.stored(service);

    @AfterEach
    void stop() {
        service.close();
    }

    /** Closed forms of a box: V = L·B·T, KM = T/2 + B²/(12 T). */
    @Test
    void aRowIsThatOfABox() {
        JsonNode row = api.get(PATH + "?draft=4").expect(200).json();
        assertThat(row.path("displacedVolume").doubleValue()).isCloseTo(8000, within(1e-6));
        assertThat(row.path("kmT").doubleValue()).isCloseTo(2 + 400 / 48.0, within(1e-9));
    }

    @Test
    void aTableHasBothEndsAndTellsWhereItComesFrom() {
        JsonNode table = api.get(PATH + "?from=2&to=3&step=0.4").expect(200).json();
        List<String> drafts = table.path("rows").findValuesAsText("draft");
        assertThat(drafts).containsExactly("2.0", "2.4", "2.8", "3.0");
        assertThat(table.path("platformRevision").intValue()).isEqualTo(1);
        assertThat(table.path("engineVersion").textValue()).isEqualTo(TestService.VERSION);
        assertThat(table.path("caution").textValue()).contains("Planning aid only");
    }

    @Test
    void csvHasAHeaderAndOneLineForEachDraft() {
        Api.Reply csv =
                api.get(PATH + "?from=2&to=4&step=1", "Accept", "text/csv").expect(200);
        assertThat(csv.header("Content-Type")).startsWith("text/csv");
        List<String> lines = csv.text().lines().toList();
        assertThat(lines).hasSize(4);
        assertThat(lines.get(0)).startsWith("draft,heelAngle,trimAngle,displacedVolume,displacement,centreOfBuoyancyX");
        assertThat(lines.get(1)).startsWith("2.0,0.0,0.0,4000.0,");
        assertThat(lines.get(3).split(",")).hasSameSizeAs(lines.get(0).split(","));
    }

    @Test
    void heelAndTrimInclineTheWaterplane() {
        JsonNode row = api.get(PATH + "?draft=4&heel=2&trim=-1").expect(200).json();
        assertThat(row.path("heelAngle").doubleValue()).isCloseTo(2, within(1e-12));
        assertThat(row.path("centreOfBuoyancy").path(1).doubleValue()).isNegative();
        assertThat(row.path("centreOfBuoyancy").path(0).doubleValue()).isNegative();
    }

    @Test
    void allFaultsOfTheParametersAreTold() {
        Api.Reply refused = api.get(PATH + "?from=x&to=1e400&heel=89&depth=3").expect(400);
        assertThat(refused.details())
                .anyMatch(d -> d.startsWith("parameter from "))
                .anyMatch(d -> d.startsWith("parameter to "))
                .anyMatch(d -> d.startsWith("parameter heel "))
                .anyMatch(d -> d.startsWith("parameter step must be given"))
                .anyMatch(d -> d.startsWith("parameter depth is unknown"));
    }

    @Test
    void aTableThatWouldHaveTooManyRowsIsRefused() {
        Api.Reply refused = api.get(PATH + "?from=0.1&to=10&step=0.0001").expect(400);
        assertThat(refused.details()).singleElement().asString().contains("10000 rows");
        api.get(PATH + "?from=3&to=2&step=1").expect(400);
        api.get(PATH + "?from=2&to=3&step=0").expect(400);
    }

    @Test
    void aDraftAtWhichNothingIsUnderWaterIsImpossible() {
        api.get(PATH + "?draft=-1").expect(422);
    }

    @Test
    void anUnknownPlatformIsNotFound() {
        api.get("/api/v1/platforms/ghost/hydrostatics?draft=4").expect(404);
    }

    @Test
    void aMediaTypeThatIsNotWrittenIsNotAcceptable() {
        api.get(PATH + "?draft=4", "Accept", "image/png").expect(406);
        api.get(PATH + "?draft=4", "Accept", "text/html, */*;q=0.1").expect(200);
    }
}
