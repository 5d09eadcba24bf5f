package org.evendraft.platform;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowableOfType;

import com.fasterxml.jackson.core.JsonProcessingException;
import java.nio.charset.StandardCharsets;
import java.time.Instant;
import java.util.Optional;
import java.util.OptionalDouble;
import org.evendraft.geometry.Vec3;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class JsonTest {
    record Everything(
            Vec3 place, Purpose purpose, Instant at, Optional<String> note, OptionalDouble bound, double value) {}

    private static Fault faultOf(byte[] bytes) {
        FaultyDocumentException e = catchThrowableOfType(FaultyDocumentException.class, () -> Json.parse(bytes));
        assertThat(e.faults()).hasSize(1);
        assertThat(e.malformed()).isTrue();
        return e.faults().get(0);
    }

    private static Fault faultOf(String json) {
        return faultOf(json.getBytes(StandardCharsets.UTF_8));
    }

    @Test
    void writesPointsEnumsInstantsAndWhatIsAbsent() throws JsonProcessingException {
        Everything all = new Everything(
                new Vec3(1, 2.5, -3),
                Purpose.DRILL_WATER,
                Instant.parse("2026-06-12T08:00:00Z"),
                Optional.empty(),
                OptionalDouble.of(1.5),
                Double.NaN);
        assertThat(Json.mapper().writeValueAsString(all))
                .isEqualTo("{\"place\":[1.0,2.5,-3.0],\"purpose\":\"drillWater\",\"at\":\"2026-06-12T08:00:00Z\","
                        + "\"note\":null,\"bound\":1.5,\"value\":null}");
    }

    @Test
    void readsBackWhatItWrites() throws JsonProcessingException {
        Everything all = new Everything(
                new Vec3(1, 2, 3), Purpose.FRESH_WATER, Instant.EPOCH, Optional.of("n"), OptionalDouble.empty(), 4);
        String json = Json.mapper().writeValueAsString(all);
        assertThat(Json.mapper().readValue(json, Everything.class)).isEqualTo(all);
    }

    @Test
    void tellsWhereATruncatedDocumentEnds() {
        Fault fault = faultOf("{ \"id\": \"a\",\n  \"tanks\": [ { ");
        assertThat(fault.pointer()).isEmpty();
        assertThat(fault.detail()).contains("ends before", "line 2");
    }

    @Test
    void refusesBytesThatAreNotUtf8() {
        byte[] latin1 = "{ \"name\": \"Frøya\" }".getBytes(StandardCharsets.ISO_8859_1);
        assertThat(faultOf(latin1).detail()).contains("not UTF-8", "byte 13");
        byte[] cut = {'"', (byte) 0xC3};
        assertThat(faultOf(cut).detail()).contains("not UTF-8");
        assertThat(faultOf("{}".getBytes(StandardCharsets.UTF_16LE)).pointer()).isEmpty();
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "NaN",
                "{\"a\": Infinity}",
                "{\"a\": -Infinity}",
                "{a: 1}",
                "{'a': 1}",
                "[1,]",
                "01",
                "hello",
                "{\"a\" 1}"
            })
    void refusesWhatIsNotJson(String text) {
        Fault fault = faultOf(text);
        assertThat(fault.pointer()).isEmpty();
        assertThat(fault.detail()).contains("not JSON", "line 1");
    }

    @Test
    void tellsNearWhichPropertyTheJsonBreaks() {
        assertThat(faultOf("{ \"tanks\": [ { \"density\": NaN } ] }").detail()).contains("near /tanks/0/density");
    }

    @Test
    void neverQuotesTheDocumentItself() {
        assertThat(faultOf("{ \"password\": hunter2 }").detail()).doesNotContain("hunter2");
    }

    @Test
    void refusesAPropertyGivenTwice() {
        Fault fault = faultOf("{ \"hull\": { \"a\": 1, \"a\": 2 } }");
        assertThat(fault.pointer()).isEqualTo("/hull/a");
        assertThat(fault.detail()).contains("twice");
    }

    @ParameterizedTest
    @CsvSource({"'', empty", "'  ', empty", "'{} {}', follows", "'1 2', follows"})
    void refusesNothingAndMoreThanOneDocument(String text, String word) {
        assertThat(faultOf(text).detail()).contains(word);
    }

    @Test
    void refusesDeepNestingAndEndlessNumbers() {
        assertThat(faultOf("[".repeat(100_000)).detail()).contains("limit");
        assertThat(faultOf("1".repeat(5000)).detail()).contains("limit");
    }

    @Test
    void letsAByteOrderMarkPass() {
        assertThat(Json.parse("\uFEFF{\"a\": 1}".getBytes(StandardCharsets.UTF_8))
                        .get("a")
                        .intValue())
                .isEqualTo(1);
    }
}
