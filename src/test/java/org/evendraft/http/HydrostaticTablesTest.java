package org.evendraft.http;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Tables over drafts, heels and trims, of a box whose figures are closed forms. */
class HydrostaticTablesTest {
    private static final String PATH = Barge.PATH + "/hydrostatics";
    private static final double LENGTH = 100;
    private static final double BREADTH = 20;

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

    private static List<List<Double>> places(JsonNode table) {
        List<List<Double>> places = new ArrayList<>();
        table.path("rows")
                .forEach(row -> places.add(List.of(
                        row.path("trimAngle").doubleValue(),
                        row.path("heelAngle").doubleValue(),
                        row.path("draft").doubleValue())));
        return places;
    }

    @Test
    void rowsAreOrderedByTrimThenHeelThenDraft() {
        JsonNode table = api.get(PATH + "?from=3&to=4&step=1&heel=5,0&trim=1,-1:0:1")
                .expect(200)
                .json();
        assertThat(places(table))
                .containsExactly(
                        List.of(-1.0, 0.0, 3.0),
                        List.of(-1.0, 0.0, 4.0),
                        List.of(-1.0, 5.0, 3.0),
                        List.of(-1.0, 5.0, 4.0),
                        List.of(0.0, 0.0, 3.0),
                        List.of(0.0, 0.0, 4.0),
                        List.of(0.0, 5.0, 3.0),
                        List.of(0.0, 5.0, 4.0),
                        List.of(1.0, 0.0, 3.0),
                        List.of(1.0, 0.0, 4.0),
                        List.of(1.0, 5.0, 3.0),
                        List.of(1.0, 5.0, 4.0));
    }

    /**
     * Closed forms of a wall-sided box, V = L·B·T at any heel and trim within its sides: the section is broader by 1/cos, the buoyancy
     * moves by I·tan/V and rises by I·tan²/(2V) (wall-sided formula; any textbook), M is I/V over B along the waterplane's normal.
     */
    @ParameterizedTest
    @CsvSource({"3, 0", "4, 5", "5, -5", "4.5, 10"})
    void figuresOfAHeeledBoxAreItsClosedForms(double draft, double heel) {
        String query = "?from=" + draft + "&to=" + draft + "&step=1&heel=0," + heel;
        JsonNode rows = api.get(PATH + query).expect(200).json().path("rows");
        JsonNode row = rows.path(heel < 0 ? 0 : rows.size() - 1);
        double volume = LENGTH * BREADTH * draft;
        double tan = Math.tan(Math.toRadians(heel));
        double cos = Math.cos(Math.toRadians(heel));
        double upright = LENGTH * Math.pow(BREADTH, 3) / 12;
        double across = -upright * tan / volume;
        double up = draft / 2 + upright * tan * tan / (2 * volume);
        double bm = upright / Math.pow(cos, 3) / volume;
        assertThat(row.path("heelAngle").doubleValue()).isEqualTo(heel);
        assertThat(row.path("displacedVolume").doubleValue()).isCloseTo(volume, within(1e-8));
        assertThat(row.path("waterplaneArea").doubleValue()).isCloseTo(LENGTH * BREADTH / cos, within(1e-8));
        assertThat(row.path("centreOfBuoyancy").path(1).doubleValue()).isCloseTo(across, within(1e-9));
        assertThat(row.path("centreOfBuoyancy").path(2).doubleValue()).isCloseTo(up, within(1e-9));
        assertThat(row.path("bmT").doubleValue()).isCloseTo(bm, within(1e-9));
        assertThat(row.path("kmT").doubleValue())
                .isCloseTo(across * Math.sin(Math.toRadians(heel)) + up * cos + bm, within(1e-9));
        assertThat(row.path("tonnesPerCentimetre").doubleValue()).isCloseTo(20, within(1e-9));
    }

    @Test
    void aDraftWithSeveralHeelsIsATableToo() {
        JsonNode table = api.get(PATH + "?draft=4&heel=0:2:1").expect(200).json();
        assertThat(places(table))
                .containsExactly(List.of(0.0, 0.0, 4.0), List.of(0.0, 1.0, 4.0), List.of(0.0, 2.0, 4.0));
    }

    @Test
    void valuesGivenTwiceMakeOneRow() {
        JsonNode table =
                api.get(PATH + "?draft=4&heel=1,-1:1:1,-0.0,%200").expect(200).json();
        assertThat(places(table)).extracting(p -> p.get(1)).containsExactly(-1.0, 0.0, 1.0);
    }

    @Test
    void everyAnswerTellsItsWaterAndWhereItComesFrom() {
        for (String query : List.of("?draft=4", "?draft=4&heel=0,1")) {
            JsonNode own = api.get(PATH + query).expect(200).json();
            assertThat(own.path("waterDensity").doubleValue()).isEqualTo(1.0);
            assertThat(own.path("platformRevision").intValue()).isEqualTo(1);
            assertThat(own.path("engineVersion").textValue()).isEqualTo(TestService.VERSION);
            assertThat(own.path("computedAt").textValue()).isNotBlank();
            assertThat(own.path("caution").textValue()).contains("Planning aid only");
        }
        JsonNode table = api.get(PATH + "?draft=4&heel=0,1").json();
        assertThat(table.path("platform").textValue()).isEqualTo("barge");
        assertThat(table.path("name").textValue()).isEqualTo("Barge");
    }

    @Test
    void anotherWaterChangesMassesAndNothingElse() {
        JsonNode sea = api.get(PATH + "?draft=4&waterDensity=1.025").expect(200).json();
        assertThat(sea.path("waterDensity").doubleValue()).isEqualTo(1.025);
        assertThat(sea.path("displacement").doubleValue()).isCloseTo(8200, within(1e-8));
        assertThat(sea.path("displacedVolume").doubleValue()).isCloseTo(8000, within(1e-8));
        assertThat(sea.path("tonnesPerCentimetre").doubleValue()).isCloseTo(20.5, within(1e-10));
        JsonNode table = api.get(PATH + "?from=4&to=4&step=1&waterDensity=1.025")
                .expect(200)
                .json();
        assertThat(table.path("waterDensity").doubleValue()).isEqualTo(1.025);
        assertThat(table.path("rows").path(0).path("displacement").doubleValue())
                .isCloseTo(8200, within(1e-8));
    }

    /** KM = T/2 + B²/(12 T) = 1.5 + 11.111… m, I = L·B³/12 = 66 666.67 m⁴, displacement·BM·tan 1° = 1163.67 t·m. */
    @Test
    void digitsRoundEveryQuantityByItsUnit() {
        JsonNode row = api.get(PATH + "?draft=3&digits=2").expect(200).json();
        assertThat(row.path("kmT").doubleValue()).isEqualTo(12.61);
        assertThat(row.path("displacement").doubleValue()).isEqualTo(6000);
        assertThat(row.path("inertiaT").doubleValue()).isEqualTo(66_667);
        assertThat(row.path("momentToHeelOneDegree").doubleValue()).isEqualTo(1164);
        List<String> csv = api.get(PATH + "?draft=3&digits=4", "Accept", "text/csv")
                .expect(200)
                .text()
                .lines()
                .toList();
        assertThat(csv.get(0)).startsWith("draft,heelAngle,trimAngle,displacedVolume,displacement,centreOfBuoyancyX");
        assertThat(csv.get(1))
                .isEqualTo("3.0000,0.0000,0.0000,6000.00,6000.00,0.0000,0.0000,1.5000,2000.00,0.0000,0.0000,3.0000,"
                        + "66666.7,1666666.7,0.0,11.1111,277.7778,12.6111,279.2778,20.000,1163.67,29091.77");
    }

    @Test
    void textIsReadyToPrint() {
        Api.Reply reply = api.get(
                        PATH + "?from=3&to=5&step=1&heel=0,2.5&trim=-1&waterDensity=1.025", "Accept", "text/plain")
                .expect(200);
        assertThat(reply.header("Content-Type")).isEqualTo("text/plain;charset=utf-8");
        List<String> lines = reply.text().lines().toList();
        assertThat(lines).allSatisfy(line -> assertThat(line.length()).isLessThanOrEqualTo(180));
        assertThat(String.join(" ", lines.subList(0, 7)))
                .contains(
                        "Barge (barge), revision 1",
                        "1.025 t/m³",
                        TestService.VERSION,
                        "Planning aid only",
                        "draft marks");
        assertThat(lines).containsOnlyOnce("Trim -1°, heel 0°").containsOnlyOnce("Trim -1°, heel 2.5°");
        int block = lines.indexOf("Trim -1°, heel 0°");
        assertThat(lines.get(block + 1)).matches(" +Draft +Volume +Displ\\. +LCB .* KMT +KML +TPC +MH1 +MT1");
        assertThat(lines.get(block + 2)).matches(" +m +m³ +t +m .* t/cm +t·m/° +t·m/°");
        assertThat(lines.get(block + 3)).startsWith("  3.000   6000.0   6150.0  ");
        assertThat(lines.subList(block + 1, block + 6))
                .extracting(String::length)
                .containsOnly(lines.get(block + 1).length());
        assertThat(lines.get(block + 6)).isEmpty();
    }

    @Test
    void textOfARowIsATableOfOneRow() {
        String text = api.get(PATH + "?draft=4&digits=1", "Accept", "text/plain")
                .expect(200)
                .text();
        assertThat(text).contains("Trim 0°, heel 0°").containsPattern("\n +4\\.0 +8000 +8000 ");
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "draft=4&heel=0,,5 | heel has an empty entry",
                "draft=4&heel= | heel has an empty entry",
                "draft=4&trim=0, | trim has an empty entry",
                "draft=4&heel=NaN | heel must be a finite number",
                "draft=4&heel=1,Infinity | heel must be a finite number",
                "draft=4&heel=0:1e999:1 | heel must be a finite number",
                "draft=4&heel=0:5 | heel must be a finite number, a range from:to:step",
                "draft=4&heel=0:5:1:2 | heel must be a finite number, a range from:to:step",
                "draft=4&heel=0:5: | heel must be a finite number, a range from:to:step",
                "draft=4&heel=5:0:1 | heel has a range whose end is less than its start",
                "draft=4&heel=0:5:0 | heel has a range whose step is not over 0",
                "draft=4&heel=0:5:-1 | heel has a range whose step is not over 0",
                "draft=4&heel=0:80:1e-300 | heel makes more than 10000 rows",
                "draft=4&trim=0,81 | trim must lie within 80 degrees",
                "draft=4&trim=-81:0:1 | trim must lie within 80 degrees",
                "draft=4&heel=1&heel=2 | heel is given 2 times",
                "draft=20000 | draft must lie within 10000 m",
                "heel=1 | draft must be given, or from, to and step",
                "draft=4&from=3&to=5&step=1 | draft cannot be given together",
                "from=3&to=5&step=-1 | step must be over 0",
                "from=3&to=5&step=0 | step must be over 0",
                "from=3&to=5 | step must be given",
                "from=1&to=9&step=0.01&heel=-10:10:1 | step makes a table of 16821 rows",
                "draft=4&heel=0:80:0.5&trim=0:40:0.5 | heel makes a table of 13041 rows",
                "draft=4&waterDensity=0 | waterDensity must be over 0 and at most 20",
                "draft=4&waterDensity=NaN | waterDensity must be a finite number",
                "draft=4&digits=10 | digits must be a whole number from 0 to 9",
                "draft=4&digits=-1 | digits must be a whole number from 0 to 9",
                "draft=4&list=1 | list is unknown",
            })
    void whatIsWrongIsTold(String query, String told) {
        Api.Reply refused = api.get(PATH + "?" + query.strip()).expect(400);
        assertThat(refused.details()).singleElement().asString().startsWith("parameter " + told);
    }

    @Test
    void allThatIsWrongIsToldAtOnce() {
        Api.Reply refused = api.get(
                        PATH + "?draft=x&from=3&to=2&step=-1&heel=,99&trim=2:1:0&waterDensity=-1&digits=a&a=1")
                .expect(400);
        assertThat(refused.details())
                .extracting(detail -> detail.split(" ", 3)[1])
                .containsExactly(
                        "draft", "draft", "to", "step", "heel", "heel", "trim", "trim", "waterDensity", "digits", "a");
    }

    @Test
    void aWaterplaneUnderTheWholeHullIsToldWithItsAngles() {
        Api.Reply refused = api.get(PATH + "?draft=-9&heel=0,2").expect(422);
        assertThat(refused.details()).singleElement().asString().contains("draft of -9.000 m no part of the hull");
    }

    @Test
    void tenThousandRowsAreGiven() {
        Api.Reply csv = api.get(PATH + "?from=1&to=5.99&step=0.01&heel=-5:4.5:0.5", "Accept", "text/csv")
                .expect(200);
        List<String> lines = csv.text().lines().toList();
        assertThat(lines).hasSize(10_001);
        assertThat(lines.get(1)).startsWith("1.0,-5.0,0.0,");
        assertThat(lines.get(10_000)).startsWith("5.99,4.5,0.0,");
    }
}
