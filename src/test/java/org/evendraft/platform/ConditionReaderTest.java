package org.evendraft.platform;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowableOfType;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.List;
import java.util.stream.IntStream;
import org.evendraft.geometry.Vec3;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class ConditionReaderTest {
    private static final PreparedPlatform SKUA = Examples.prepared();

    private static Condition read(String json) {
        return ConditionReader.read(Examples.parse(json), SKUA);
    }

    private static List<Fault> faults(JsonNode document) {
        FaultyDocumentException e =
                catchThrowableOfType(FaultyDocumentException.class, () -> ConditionReader.read(document, SKUA));
        assertThat(e).as("faults").isNotNull();
        return e.faults();
    }

    private static Fault faultOfFill(String fill) {
        List<Fault> faults = faults(Examples.parse("{ \"fills\": [ " + fill + " ] }"));
        assertThat(faults).hasSize(1);
        return faults.get(0);
    }

    @Test
    void readsEverySpellingOfAFillAndEveryKindOfLoad() {
        Condition condition = ConditionReader.read(Examples.condition(), SKUA);
        assertThat(condition.mode()).map(Mode::id).contains("work");
        assertThat(condition.waterDensity()).isEqualTo(1.02);
        assertThat(condition.freeSurface()).isEqualTo(Condition.FreeSurface.MAXIMUM);
        assertThat(condition.fills()).hasSize(3);
        assertThat(condition.fills().get(0).volume()).isCloseTo(196, within(1e-9));
        assertThat(condition.fills().get(0).density()).isEqualTo(1.025);
        assertThat(condition.fills().get(1).volume()).isCloseTo(200, within(1e-9));
        assertThat(condition.fills().get(1).density()).isEqualTo(1.01);
        assertThat(condition.fills().get(2).volume()).isCloseTo(100, within(1e-9));
        assertThat(condition.loads())
                .extracting(Load::kind)
                .containsExactly(
                        Load.Kind.DECK, Load.Kind.SUSPENDED, Load.Kind.LINE, Load.Kind.VARIABLE, Load.Kind.CORRECTION);
        assertThat(condition.loads().get(0).footprint()).hasValue(30);
        assertThat(condition.loads().get(4).mass()).isEqualTo(-12);
        assertThat(condition.loads().get(1).position()).isEqualTo(new Vec3(10, 12, 30));
    }

    @Test
    void takesThePublishedDefaults() {
        Condition condition = read("{}");
        assertThat(condition.name()).isEqualTo("unnamed");
        assertThat(condition.mode()).isEmpty();
        assertThat(condition.waterDensity()).isEqualTo(1.025);
        assertThat(condition.freeSurface()).isEqualTo(Condition.FreeSurface.ACTUAL);
        assertThat(condition.fills()).isEmpty();
        assertThat(condition.loads()).isEmpty();
    }

    @ParameterizedTest
    @CsvSource({"level, 4.000003", "volume, 392.0003", "mass, 401.8003", "fraction, 1.0000009"})
    void forgivesAMillionthOverTheFullTank(String spelling, double value) {
        Condition condition = read("{ \"fills\": [ { \"tank\": \"B1\", \"" + spelling + "\": " + value + " } ] }");
        assertThat(condition.fills().get(0).volume())
                .isCloseTo(392, within(1e-9))
                .isLessThanOrEqualTo(SKUA.calibration("B1").fullVolume());
    }

    @ParameterizedTest
    @CsvSource({"level, 4.01, 4 m", "volume, 392.01, 392 m³", "mass, 402, 401.8 t", "fraction, 1.00001, 1"})
    void refusesMoreAndTellsWhatTheFullTankHolds(String spelling, String value, String full) {
        Fault fault = faultOfFill("{ \"tank\": \"B1\", \"" + spelling + "\": " + value + " }");
        assertThat(fault.pointer()).isEqualTo("/fills/0/" + spelling);
        assertThat(fault.kind()).isEqualTo(Fault.Kind.MEANING);
        assertThat(fault.detail())
                .contains("B1", "overfilled", String.valueOf(value))
                .endsWith(full);
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "{ \"tank\": \"B1\" } | /fills/0 | FORM | none",
                "{ \"tank\": \"B1\", \"level\": 1, \"mass\": 2 } | /fills/0 | FORM | level and mass",
                "{ \"tank\": \"B9\", \"level\": 1 } | /fills/0/tank | MEANING | known: B1, B2, F1",
                "{ \"level\": 1 } | /fills/0/tank | FORM | must be given",
                "{ \"tank\": \"B1\", \"level\": -1 } | /fills/0/level | MEANING | -1",
                "{ \"tank\": \"B1\", \"volume\": -1 } | /fills/0/volume | MEANING | -1",
                "{ \"tank\": \"B1\", \"mass\": -1 } | /fills/0/mass | MEANING | -1",
                "{ \"tank\": \"B1\", \"fraction\": -0.1 } | /fills/0/fraction | MEANING | -0.1",
                "{ \"tank\": \"B1\", \"fraction\": \"half\" } | /fills/0/fraction | FORM | half",
                "{ \"tank\": \"B1\", \"fraction\": 1e400 } | /fills/0/fraction | FORM | finite",
                "{ \"tank\": \"B1\", \"mass\": 5, \"density\": 0 } | /fills/0/density | MEANING | over 0",
                "{ \"tank\": \"B1\", \"mass\": 5, \"sg\": 1 } | /fills/0/sg | FORM | known here"
            })
    void tellsWhatIsWrongWithAFill(String fill, String pointer, Fault.Kind kind, String words) {
        Fault fault = faultOfFill(fill);
        assertThat(fault.pointer()).isEqualTo(pointer);
        assertThat(fault.kind()).isEqualTo(kind);
        assertThat(fault.detail()).contains(words);
    }

    @Test
    void refusesATankFilledTwice() {
        List<Fault> faults = faults(Examples.parse(
                "{ \"fills\": [ { \"tank\": \"B1\", \"level\": 1 }, { \"tank\": \"B1\", \"level\": 2 } ] }"));
        assertThat(faults).singleElement().extracting(Fault::pointer).isEqualTo("/fills/1/tank");
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "/mode | \"storm\" | MEANING",
                "/waterDensity | -1 | MEANING",
                "/freeSurface | \"some\" | FORM",
                "/loads/0/mass | 0 | MEANING",
                "/loads/1/mass | -3 | MEANING",
                "/loads/1/mass | \"3\" | FORM",
                "/loads/2/kind | \"cargo\" | FORM",
                "/loads/0/area | \"bow\" | MEANING",
                "/loads/0/x | null | FORM",
                "/loads/0/footprint | 0 | MEANING",
                "/loads/3 | 7 | FORM",
                "/fills | \"oldest\" | FORM",
                "/name | 5 | FORM"
            })
    void pointsAtWhatIsWrong(String pointer, String value, Fault.Kind kind) {
        ObjectNode document = PlatformReaderTest.with(Examples.condition(), pointer, Examples.parse(value));
        assertThat(faults(document)).singleElement().satisfies(fault -> {
            assertThat(fault.pointer()).isEqualTo(pointer);
            assertThat(fault.kind()).isEqualTo(kind);
        });
    }

    @Test
    void readsAHundredThousandLoads() {
        ObjectNode document = Examples.object("{}");
        ArrayNode loads = document.putArray("loads");
        IntStream.range(0, 100_000)
                .forEach(i -> loads.addObject()
                        .put("kind", "variable")
                        .put("mass", 0.01)
                        .put("x", i % 50)
                        .put("y", 0)
                        .put("z", 9));
        assertThat(ConditionReader.read(document, SKUA).loads()).hasSize(100_000);
        ((ObjectNode) loads.get(99_999)).put("mass", 0);
        assertThat(faults(document)).singleElement().extracting(Fault::pointer).isEqualTo("/loads/99999/mass");
    }

    @ParameterizedTest
    @ValueSource(strings = {"\\u0000", "a\\u0007b", "half \\ud800", "two\\nlines"})
    void refusesTextThatNoDatabaseOrLineCanKeep(String name) {
        List<Fault> faults = faults(Examples.parse("{ \"name\": \"" + name + "\" }"));
        assertThat(faults).extracting(Fault::pointer).containsExactly("/name");
        assertThat(faults.get(0).kind()).isEqualTo(Fault.Kind.FORM);
    }
}
