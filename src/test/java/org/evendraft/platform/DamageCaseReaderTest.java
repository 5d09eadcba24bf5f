package org.evendraft.platform;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.tuple;
import static org.evendraft.platform.PlatformReaderTest.faults;
import static org.evendraft.platform.PlatformReaderTest.with;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Damage cases in a platform's document, and the places of the spaces that they flood. */
class DamageCaseReaderTest {
    private static final String C2 = """
            { "id": "C2", "bodies": [ { "shape": "box", "min": [%s], "max": [%s] } ] }
            """;

    private static ObjectNode withCompartment(String min, String max) {
        ObjectNode document = Examples.platform();
        document.withArray("compartments").add(Examples.parse(C2.formatted(min, max)));
        return document;
    }

    @Test
    void readsCasesWithTheirSituationsACollisionUnlessToldOtherwise() {
        assertThat(Examples.prepared().platform().damageCases())
                .containsExactly(
                        new DamageCase("bow", Situation.FLOODING, List.of("B1", "C1")),
                        new DamageCase("side", Situation.COLLISION, List.of("B2")));
    }

    @Test
    void aDocumentWithoutCasesHasNone() {
        ObjectNode document = Examples.platform();
        document.remove("damageCases");
        assertThat(PlatformReader.read(document).platform().damageCases()).isEmpty();
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "0/id | \"a b\" | FORM | letters, digits",
                "0/id | null | FORM | must be given",
                "1/id | \"bow\" | MEANING | two of damage case bow",
                "0/situation | \"intact\" | FORM | one of collision, flooding, not the text 'intact'",
                "0/situation | \"fire\" | FORM | one of collision, flooding",
                "0/flooded | [] | FORM | at least one entry",
                "0/flooded | null | FORM | at least one entry",
                "0/flooded | \"B1\" | FORM | list",
                "0/flooded/1 | 7 | FORM | text",
                "0/flooded/1 | \" \" | FORM | empty",
                "0/flooded/1 | \"B9\" | MEANING | no tank or compartment 'B9'; known: B1, B2, F1, C1",
                "0/flooded/1 | \"F1\" | MEANING | tank F1 is known only by a table",
                "0/flooded/1 | \"B1\" | MEANING | 'B1' is named twice",
                "0/tanks | [] | FORM | unknown property"
            })
    void pointsAtWhatIsWrongWithACase(String place, String value, Fault.Kind kind, String told) {
        ObjectNode document = with(Examples.platform(), "/damageCases/" + place, Examples.parse(value));
        assertThat(faults(document)).singleElement().satisfies(fault -> {
            assertThat(fault.pointer()).isEqualTo("/damageCases/" + place);
            assertThat(fault.kind()).isEqualTo(kind);
            assertThat(fault.detail()).contains(told);
        });
    }

    @Test
    void refusesAnIdThatNamesBothATankAndACompartment() {
        ObjectNode document = with(Examples.platform(), "/compartments/0/id", Examples.parse("\"B2\""));
        with(document, "/damageCases/0/flooded", Examples.parse("[\"B1\"]"));
        assertThat(faults(document)).singleElement().satisfies(fault -> {
            assertThat(fault.pointer()).isEqualTo("/damageCases/1/flooded/0");
            assertThat(fault.detail())
                    .isEqualTo("'B2' names both a tank and a compartment; give one of them another id");
        });
    }

    @Test
    void warnsOfATankAndACompartmentOfOneIdThatNoCaseNames() {
        ObjectNode document = with(Examples.platform(), "/compartments/0/id", Examples.parse("\"B2\""));
        document.remove("damageCases");
        assertThat(PlatformReader.read(document).warnings())
                .containsExactly("tank and compartment B2 have one id: no damage case can name either of them");
    }

    @Test
    void aTankWithAFaultyShapeIsNotTakenForOneWithoutShape() {
        ObjectNode document = with(Examples.platform(), "/tanks/1/bodies/0/max", Examples.parse("[1]"));
        assertThat(faults(document)).extracting(Fault::pointer).containsExactly("/tanks/1/bodies/0/max");
    }

    @Test
    void listsAllFaultsOfCasesAtOnce() {
        ObjectNode document = with(Examples.platform(), "/damageCases", Examples.parse("""
                [ { "id": "a", "flooded": ["B7", "F1", "B1", "B1"] },
                  { "id": "a", "situation": "intact", "flooded": [] }, 5 ]
                """));
        assertThat(faults(document))
                .extracting(Fault::pointer, Fault::kind)
                .containsExactlyInAnyOrder(
                        tuple("/damageCases/0/flooded/0", Fault.Kind.MEANING),
                        tuple("/damageCases/0/flooded/1", Fault.Kind.MEANING),
                        tuple("/damageCases/0/flooded/3", Fault.Kind.MEANING),
                        tuple("/damageCases/1/id", Fault.Kind.MEANING),
                        tuple("/damageCases/1/situation", Fault.Kind.FORM),
                        tuple("/damageCases/1/flooded", Fault.Kind.FORM),
                        tuple("/damageCases/2", Fault.Kind.FORM));
    }

    @Test
    void warnsOfACompartmentThatReachesOutsideTheHull() {
        // a fifth of 10 m sticks out ahead of the hull's end at x = 30
        assertThat(PlatformReader.read(withCompartment("22, 0, 0", "32, 10, 4")).warnings())
                .singleElement()
                .asString()
                .startsWith("compartment C2 reaches outside the hull with about 20 % of its shape");
    }

    @Test
    void warnsOfCompartmentsThatOverlapTanksOrEachOther() {
        // 2 m of B2's 10 m, 10 m wide and 4 m high; then 1 m of C1's 10 m, 10 m wide and 4 m high
        assertThat(PlatformReader.read(withCompartment("-22, 0, 0", "-12, 10, 4"))
                        .warnings())
                .containsExactly("tank B2 and compartment C2 overlap: about 80 m³ in common");
        assertThat(PlatformReader.read(withCompartment("-9, -10, 0", "1, 0, 4")).warnings())
                .containsExactly("compartments C1 and C2 overlap: about 40 m³ in common");
    }

    @Test
    void acceptsCompartmentsThatTouch() {
        assertThat(PlatformReader.read(withCompartment("-20, 0, 0", "-10, 10, 4"))
                        .warnings())
                .isEmpty();
    }

    @Test
    void theDemoPlatformNamesItsRulesAndHasCasesOfBothSituations() throws IOException {
        Platform demo = PlatformReader.read(Json.parse(Files.readAllBytes(Path.of("db/demo/merganser.json"))))
                .platform();
        assertThat(demo.stabilityRules().assumed()).isFalse();
        assertThat(demo.stabilityRules().rules()).isEqualTo("moduColumnStabilized");
        assertThat(demo.damageCases())
                .extracting(DamageCase::situation)
                .contains(Situation.COLLISION, Situation.FLOODING);
        assertThat(demo.windage())
                .anySatisfy(element -> assertThat(element.areaZ()).isPositive());
    }
}
