package org.evendraft.platform;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowableOfType;
import static org.assertj.core.api.Assertions.tuple;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.core.JsonPointer;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.List;
import org.evendraft.geometry.Vec3;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class PlatformReaderTest {

    static List<Fault> faults(JsonNode document) {
        FaultyDocumentException e =
                catchThrowableOfType(FaultyDocumentException.class, () -> PlatformReader.read(document));
        assertThat(e).as("faults").isNotNull();
        return e.faults();
    }

    /** The document with the value put at the pointer. */
    static ObjectNode with(ObjectNode document, String pointer, JsonNode value) {
        JsonPointer at = JsonPointer.compile(pointer);
        JsonNode parent = document.at(at.head());
        if (parent instanceof ArrayNode array) {
            array.set(at.last().getMatchingIndex(), value);
        } else {
            ((ObjectNode) parent).set(at.last().getMatchingProperty(), value);
        }
        return document;
    }

    @Test
    void readsOneOfEverything() {
        Platform p = Examples.prepared().platform();
        assertThat(p.id()).isEqualTo("skua");
        assertThat(p.hull()).extracting(Body::name).containsExactly("hull", "column", "brace", "moonpool");
        assertThat(p.hull()).extracting(Body::cutOut).containsExactly(false, false, false, true);
        assertThat(p.lightship()).isEqualTo(new Lightship(2500, new Vec3(0.5, 0, 7)));
        assertThat(p.draftMarks()).containsExactly(new DraftMark("AFT", -30, 0, 0));
        assertThat(p.pumps())
                .containsExactly(new Pump("P1", 300, List.of("B1", "B2", "sea"), List.of("B1", "B2", "sea")));
        assertThat(p.deckAreas().get(0).size()).isEqualTo(360);
        assertThat(p.windage()).containsExactly(new WindageElement("house", 0, 0, 20, 26, 60, 90, 0, 1));
        assertThat(p.openings()).containsExactly(new Opening("V1", new Vec3(4, 4, 20), Opening.Closing.WEATHERTIGHT));
        assertThat(p.compartments().get(0).permeability()).isEqualTo(0.95);
        Mode mode = p.modes().get(0);
        assertThat(mode.draftRange()).contains(new Mode.DraftRange(3, 6));
        assertThat(mode.minGm().orElseThrow().transverse()).hasValue(0.5);
        assertThat(mode.minGm().orElseThrow().longitudinal()).isEmpty();
        assertThat(mode.allowableKg()).containsExactly(new Mode.KgPoint(3, 9), new Mode.KgPoint(6, 8));
    }

    @Test
    void takesThePublishedDefaults() {
        Tank tank = Examples.prepared().platform().tanks().get(1);
        assertThat(tank.name()).isEqualTo("B2");
        assertThat(tank.density()).isEqualTo(1.025);
        assertThat(tank.permeability()).isEqualTo(1);
        assertThat(tank.pressedUpFraction()).isEqualTo(0.98);
        assertThat(tank.leastPumpableFraction()).isZero();
        assertThat(tank.greatestFraction()).isEqualTo(1);
        assertThat(tank.locked()).isFalse();
        assertThat(tank.bodies().get(0).name()).isEqualTo("body 1");
    }

    @Test
    void readsTheLeastDocument() {
        PreparedPlatform least = PlatformReader.read(Examples.parse("""
                { "id": "raft", "hull": { "bodies": [ { "shape": "box", "min": [0, 0, 0], "max": [4, 2, 1] } ] },
                  "lightship": { "mass": 3, "x": 2, "y": 1, "z": 0.5 } }
                """));
        assertThat(least.platform().name()).isEqualTo("raft");
        assertThat(least.platform().waterDensity()).isEqualTo(1.025);
        assertThat(least.platform().tanks()).isEmpty();
        assertThat(least.hull().volume()).isCloseTo(8, within(1e-12));
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "/id | 'a b' | FORM",
                "/id | '' | FORM",
                "/id | \".\" | FORM",
                "/id | \"..\" | FORM",
                "/tanks/0/id | \"..\" | FORM",
                "/tanks/0/id | \"-B1\" | FORM",
                "/pumps/0/id | \"_P\" | FORM",
                "/modes/0/id | \".work\" | FORM",
                "/id | 7 | FORM",
                "/waterDensity | 0 | MEANING",
                "/waterDensity | -1.025 | MEANING",
                "/waterDensity | \"1.025\" | FORM",
                "/waterDensity | 1e400 | FORM",
                "/waterDensity | [1] | FORM",
                "/hull/bodies | [] | FORM",
                "/hull/bodies | {} | FORM",
                "/hull | 3 | FORM",
                "/hull/bodies/0/shape | \"sphere\" | FORM",
                "/hull/bodies/0/min | [0, 0] | FORM",
                "/hull/bodies/0/max | [-31, 10, 8] | MEANING",
                "/hull/bodies/2/diameter | -1 | MEANING",
                "/hull/bodies/2/end | [5, 0, 14] | MEANING",
                "/hull/bodies/1/outline | [[0, 0], [1, 1]] | MEANING",
                "/hull/bodies/1/outline | [[0, 0], [4, 4], [4, 0], [0, 4]] | MEANING",
                "/hull/bodies/1/cornerRadius | 7 | MEANING",
                "/hull/bodies/1/to | 8 | MEANING",
                "/hull/bodies/1/axis | \"w\" | FORM",
                "/hull/bodies/0/cutOut | \"no\" | FORM",
                "/lightship/mass | 0 | MEANING",
                "/lightship/x | 1e5 | MEANING",
                "/lightship | null | FORM",
                "/tanks/0/id | \"sea\" | MEANING",
                "/tanks/1/id | \"B1\" | MEANING",
                "/tanks/0/purpose | \"gas\" | FORM",
                "/tanks/0/density | 0 | MEANING",
                "/tanks/0/permeability | 1.2 | MEANING",
                "/tanks/0/permeability | 0 | MEANING",
                "/tanks/0/leastPumpableFraction | 0.96 | MEANING",
                "/tanks/0/greatestFraction | -0.1 | MEANING",
                "/tanks/0/locked | 1 | FORM",
                "/tanks/2/table | [] | MEANING",
                "/tanks/2/table | {} | FORM",
                "/tanks/2/table/1/level | 0 | MEANING",
                "/tanks/2/table/2/volume | 100 | MEANING",
                "/tanks/2/table/1/volume | -1 | MEANING",
                "/tanks/2/table/1/inertiaT | -1 | MEANING",
                "/tanks/2/table/1/inertiaTL | 900 | MEANING",
                "/pumps/0/rate | 0 | MEANING",
                "/pumps/0/from/1 | \"B9\" | MEANING",
                "/pumps/0/from | [] | FORM",
                "/pumps/0/to/0 | 3 | FORM",
                "/deckAreas/0/outline | [[0, 0], [1, 0]] | MEANING",
                "/deckAreas/0/maxLoad | -1 | MEANING",
                "/windage/0/zTo | 20 | MEANING",
                "/windage/0/areaX | -5 | MEANING",
                "/openings/0/closing | \"shut\" | FORM",
                "/modes/0/draftRange | [6, 3] | MEANING",
                "/modes/0/draftRange | [6] | FORM",
                "/modes/0/allowableKg/1/0 | 3 | MEANING",
                "/modes/0/minGm/transverse | \"x\" | FORM",
                "/compartments/0/permeability | 2 | MEANING",
                "/compartments/0/bodies | [] | FORM"
            })
    void pointsAtWhatIsWrong(String pointer, String value, Fault.Kind kind) {
        List<Fault> faults = faults(with(
                Examples.platform(),
                pointer,
                Examples.parse(value.isEmpty() ? "\"\"" : value.startsWith("a") ? "\"" + value + "\"" : value)));
        assertThat(faults).anySatisfy(fault -> {
            assertThat(fault.pointer()).startsWith(pointer);
            assertThat(fault.kind()).isEqualTo(kind);
        });
    }

    @Test
    void listsAllFaultsAtOnce() {
        ObjectNode document = Examples.platform();
        with(document, "/waterDensity", Examples.parse("\"salt\""));
        with(document, "/tanks/2/density", Examples.parse("-1"));
        with(document, "/hull/bodies/0/max", Examples.parse("[1, 2]"));
        with(document, "/pumps/0/from/0", Examples.parse("\"B7\""));
        document.put("colour", "red");
        ((ObjectNode) document.at("/tanks/0")).put("a/b", 1);
        assertThat(faults(document))
                .extracting(Fault::pointer)
                .containsExactlyInAnyOrder(
                        "/waterDensity",
                        "/tanks/2/density",
                        "/hull/bodies/0/max",
                        "/pumps/0/from/0",
                        "/colour",
                        "/tanks/0/a~1b");
    }

    @Test
    void namesTheKnownPropertiesBesideAnUnknownOne() {
        ObjectNode document = Examples.platform();
        ((ObjectNode) document.get("lightship")).put("weight", 5);
        assertThat(faults(document)).singleElement().satisfies(fault -> {
            assertThat(fault.pointer()).isEqualTo("/lightship/weight");
            assertThat(fault.detail()).isEqualTo("unknown property 'weight'; known here: mass, x, y, z");
        });
    }

    @Test
    void needsATankToHaveAShapeOrATable() {
        ObjectNode document = Examples.platform();
        ((ObjectNode) document.at("/tanks/2")).remove("table");
        assertThat(faults(document)).singleElement().satisfies(fault -> {
            assertThat(fault.pointer()).isEqualTo("/tanks/2");
            assertThat(fault.detail()).contains("F1", "neither");
        });
    }

    @Test
    void refusesATableThatHoldsMoreThanTheShape() {
        ObjectNode document = Examples.platform();
        JsonNode bodies = Examples.parse("[{ \"shape\": \"box\", \"min\": [0, 0, 0], \"max\": [10, 10, 3.9] }]");
        with(document, "/tanks/2/bodies", bodies);
        assertThat(faults(document)).singleElement().satisfies(fault -> {
            assertThat(fault.pointer()).isEqualTo("/tanks/2/table/2/volume");
            assertThat(fault.detail()).contains("400 m³", "390 m³");
        });
    }

    @Test
    void tellsThatAnIdStartsWithALetterOrADigit() {
        ObjectNode document = with(Examples.platform(), "/id", Examples.parse("\"..\""));
        assertThat(faults(document))
                .singleElement()
                .satisfies(fault -> assertThat(fault.detail())
                        .isEqualTo("id must be 1 to 64 letters, digits, dots, hyphens or underscores, "
                                + "the first of them a letter or a digit, not '..'"));
        assertThat(PlatformReader.read(with(Examples.platform(), "/id", Examples.parse("\"7_a.-\"")))
                        .platform()
                        .id())
                .isEqualTo("7_a.-");
    }

    @Test
    void listsATableThatGoesBackwardsTogetherWithItsNegativeValues() {
        ObjectNode document = Examples.platform();
        with(document, "/tanks/2/table/0/inertiaT", Examples.parse("-1"));
        with(document, "/tanks/2/table/1/volume", Examples.parse("-200"));
        with(document, "/tanks/2/table/2/level", Examples.parse("1"));
        with(document, "/tanks/2/table/0/volume", Examples.parse("500"));
        assertThat(faults(document))
                .extracting(Fault::pointer, Fault::detail)
                .containsExactlyInAnyOrder(
                        tuple("/tanks/2/table/0/inertiaT", "inertiaT must be 0 or more, not -1"),
                        tuple("/tanks/2/table/1/volume", "volume must be 0 or more, not -200"),
                        tuple("/tanks/2/table/2/level", "level must rise from row to row: 1 follows 2"),
                        tuple("/tanks/2/table/2/volume", "volume must rise from row to row: 400 follows 500"));
    }

    @Test
    void tellsTheKnownEndsOfAPumpOnceEach() {
        ObjectNode document = Examples.platform();
        with(document, "/tanks/0/id", Examples.parse("\"sea\""));
        with(document, "/tanks/2/id", Examples.parse("\"F 1\""));
        assertThat(faults(document))
                .filteredOn(fault -> fault.pointer().equals("/pumps/0/from/0"))
                .extracting(Fault::detail)
                .containsExactly("there is no tank 'B1'; known: sea, B2");
    }

    @Test
    void refusesAPumpThatCanMoveNothing() {
        ObjectNode document = Examples.platform();
        with(document, "/pumps/0/from", Examples.parse("[\"B1\"]"));
        with(document, "/pumps/0/to", Examples.parse("[\"B1\"]"));
        assertThat(faults(document)).singleElement().extracting(Fault::pointer).isEqualTo("/pumps/0");
    }

    @Test
    void refusesWhatIsNoObject() {
        assertThat(faults(Examples.parse("[]"))).singleElement().satisfies(fault -> {
            assertThat(fault.pointer()).isEmpty();
            assertThat(fault.kind()).isEqualTo(Fault.Kind.FORM);
        });
    }

    @Test
    void refusesAPlatformThatItsLightshipAloneSinks() {
        ObjectNode platform = Examples.platform();
        ((ObjectNode) platform.path("lightship")).put("mass", 9e6);
        FaultyDocumentException e =
                catchThrowableOfType(FaultyDocumentException.class, () -> PlatformReader.read(platform));
        assertThat(e.faults()).singleElement().satisfies(fault -> {
            assertThat(fault.pointer()).isEmpty();
            assertThat(fault.detail()).contains("sinks").contains("9000000.0 t");
        });
    }
}
