package org.evendraft.platform;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.tuple;
import static org.evendraft.platform.PlatformReaderTest.faults;
import static org.evendraft.platform.PlatformReaderTest.with;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.OptionalDouble;
import org.evendraft.platform.Criterion.LimitAngle;
import org.evendraft.platform.Criterion.Measure;
import org.evendraft.platform.Criterion.Openings;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** The published criteria against the texts that publish them, and what a platform's document makes of them. */
class RulesReaderTest {

    private static Criterion published(String rules, String name) {
        return PublishedRules.of(rules).stream()
                .filter(c -> c.name().equals(name))
                .findFirst()
                .orElseThrow();
    }

    private static ObjectNode withCriteria(String json) {
        return with(Examples.platform(), "/criteria", Examples.parse(json));
    }

    private static StabilityRules rules(ObjectNode document) {
        return PlatformReader.read(document).platform().stabilityRules();
    }

    @Test
    void knowsFourSetsInWhichEachNameStandsOnce() {
        assertThat(PublishedRules.names())
                .containsExactly("moduColumnStabilized", "moduSurface", "cfrColumnStabilized", "cfrSurface");
        for (String set : PublishedRules.names()) {
            List<Criterion> criteria = PublishedRules.of(set);
            assertThat(criteria).as(set).isNotEmpty();
            assertThat(criteria).as(set).extracting(Criterion::name).doesNotHaveDuplicates();
            assertThat(criteria)
                    .as(set)
                    .allSatisfy(c -> assertThat(c.name()).startsWith(Json.code(c.situation()) + "."));
        }
    }

    /** IMO MODU Code 2009 (res. A.1023(26)), 3.3.1 and 3.4.3 and 3.4.4; the floor of GM is that of 46 CFR 174.040 (50 mm). */
    @ParameterizedTest
    @CsvSource(
            nullValues = "-",
            value = {
                // 3.3.1.2: the area to the downflooding angle at least 30 % over that of the wind; the mode's wind
                "intact.areaRatio, AREA_RATIO, 1.30, -, 3.3.1.2",
                // 3.3.1.3: positive from upright to the second intercept
                "intact.positiveArms, LEAST_ARM, 0, -, 3.3.1.3",
                "intact.leastGm, LEAST_GM, 0.05, 0, 174.040",
                // 3.4.3.1 to 3.4.3.3, in a wind of 25.8 m/s
                "collision.inclination, INCLINATION, 17, 25.8, 3.4.3.1",
                "collision.openingsUnderWater, OPENING_HEIGHT, 0, 25.8, 3.4.3.2",
                "collision.openingsNearWater, OPENING_HEIGHT, 4, 25.8, 3.4.3.2",
                "collision.range, RANGE, 7, 25.8, 3.4.3.3",
                "collision.armRatio, ARM_RATIO, 2, 25.8, 3.4.3.3",
                // 3.4.4.1 to 3.4.4.3; the clause names no wind
                "flooding.inclination, INCLINATION, 25, 0, 3.4.4.1",
                "flooding.openingsUnderWater, OPENING_HEIGHT, 0, 0, 3.4.4.2",
                "flooding.range, RANGE, 7, 0, 3.4.4.3"
            })
    void columnStabilizedUnitsHaveTheNumbersOfTheCode(
            String name, Measure measure, double bound, Double windSpeed, String clause) {
        Criterion criterion = published("moduColumnStabilized", name);
        assertThat(criterion.measure()).isEqualTo(measure);
        assertThat(criterion.bound()).isEqualTo(bound);
        assertThat(criterion.windSpeed())
                .isEqualTo(windSpeed == null ? OptionalDouble.empty() : OptionalDouble.of(windSpeed));
        assertThat(criterion.clause()).contains(clause);
    }

    @Test
    void columnStabilizedUnitsHaveNoCriterionThatIsNotCheckedHere() {
        assertThat(PublishedRules.of("moduColumnStabilized")).hasSize(11);
    }

    /**
     * IMO MODU Code 2009, 3.3.1.2 ends the areas at the downflooding angle, 3.3.1.1 (surface units) and 46 CFR 174.045(a) at the lesser
     * of it and the second intercept; factors 1.3 for column-stabilized and 1.4 for surface units in both.
     */
    @Test
    void eachTextHasItsOwnFactorAndLimitAngleForTheAreas() {
        assertThat(PublishedRules.names())
                .extracting(set -> published(set, "intact.areaRatio"))
                .extracting(Criterion::bound, Criterion::limitAngle, Criterion::openings)
                .containsExactly(
                        tuple(1.3, LimitAngle.DOWNFLOODING, Openings.NOT_WEATHERTIGHT),
                        tuple(1.4, LimitAngle.LESSER, Openings.NOT_WEATHERTIGHT),
                        tuple(1.3, LimitAngle.LESSER, Openings.NOT_WEATHERTIGHT),
                        tuple(1.4, LimitAngle.LESSER, Openings.NOT_WEATHERTIGHT));
    }

    /**
     * IMO MODU Code 2009, 3.4.3.2 and 3.4.4.2: openings below the final waterline watertight, those within 4 m over it weathertight;
     * 3.4.3.3: the range ends where that weathertight integrity ends, or at the second intercept.
     */
    @Test
    void afterDamageOpeningsCountByWhatTheCodeAsksOfThem() {
        String set = "moduColumnStabilized";
        assertThat(published(set, "collision.openingsUnderWater").openings()).isEqualTo(Openings.NOT_WATERTIGHT);
        assertThat(published(set, "flooding.openingsUnderWater").openings()).isEqualTo(Openings.NOT_WATERTIGHT);
        assertThat(published(set, "collision.openingsNearWater").openings()).isEqualTo(Openings.NOT_WEATHERTIGHT);
        for (String name : List.of("collision.range", "collision.armRatio", "flooding.range")) {
            assertThat(published(set, name).limitAngle()).as(name).isEqualTo(LimitAngle.LESSER);
            assertThat(published(set, name).openings()).as(name).isEqualTo(Openings.NOT_WEATHERTIGHT);
        }
    }

    /** 46 CFR 174.040 (upright GM of 50 mm), 174.045(b), (c), and 174.100(d) with the wind of 25.8 m/s (50 knots). */
    @ParameterizedTest
    @ValueSource(strings = {"cfrColumnStabilized", "cfrSurface"})
    void theAmericanRulesHaveTheirNumbers(String set) {
        assertThat(PublishedRules.of(set))
                .extracting(Criterion::name, Criterion::bound, Criterion::windSpeed, Criterion::clause)
                .contains(
                        tuple("intact.leastGm", 0.05, OptionalDouble.of(0), "46 CFR 174.040"),
                        tuple("intact.positiveArms", 0.0, OptionalDouble.empty(), "46 CFR 174.045(b)"),
                        tuple("intact.openingsUnderWater", 0.0, OptionalDouble.empty(), "46 CFR 174.045(c)"),
                        tuple("collision.openingsUnderWater", 0.0, OptionalDouble.of(25.8), "46 CFR 174.100(d)"));
    }

    /** IMO MODU Code 2009, 3.3.1.3 and 3.4.3: wind of 25.8 m/s after damage; the rest of chapter 3.4.1 stands as recalled. */
    @Test
    void surfaceUnitsHaveTheWindOfTheDamageCheck() {
        assertThat(PublishedRules.of("moduSurface"))
                .filteredOn(c -> c.situation() != Situation.INTACT)
                .extracting(Criterion::windSpeed)
                .containsOnly(OptionalDouble.of(25.8));
        assertThat(published("moduSurface", "intact.leastGm").bound()).isEqualTo(0.05);
        assertThat(published("moduSurface", "intact.positiveArms").clause()).contains("3.3.1.3");
    }

    @Test
    void assumesTheCodeForColumnStabilizedUnitsWhereADocumentNamesNoRules() {
        ObjectNode document = Examples.platform();
        document.remove("criteria");
        StabilityRules rules = rules(document);
        assertThat(rules.assumed()).isTrue();
        assertThat(rules.rules()).isEqualTo("moduColumnStabilized");
        assertThat(rules.criteria()).isEqualTo(PublishedRules.of("moduColumnStabilized"));
        StabilityRules unnamed = rules(withCriteria("{ \"without\": [\"collision.range\"] }"));
        assertThat(unnamed.assumed()).isTrue();
        assertThat(unnamed.criteria()).hasSize(10);
    }

    @ParameterizedTest
    @ValueSource(strings = {"moduColumnStabilized", "moduSurface", "cfrColumnStabilized", "cfrSurface"})
    void takesTheRulesThatAreNamed(String name) {
        StabilityRules rules = rules(withCriteria("{ \"rules\": \"" + name + "\" }"));
        assertThat(rules).isEqualTo(new StabilityRules(name, false, PublishedRules.of(name)));
    }

    @Test
    void ownCriteriaReplaceThoseOfTheirNameAndAreAddedOtherwise() {
        StabilityRules rules = rules(Examples.platform());
        assertThat(rules.rules()).isEqualTo("moduSurface");
        assertThat(rules.assumed()).isFalse();
        assertThat(rules.criteria())
                .extracting(Criterion::name, Criterion::bound)
                .containsExactly(
                        tuple("intact.areaRatio", 1.4),
                        tuple("intact.positiveArms", 0.0),
                        tuple("intact.leastGm", 0.3),
                        tuple("flooding.openingsUnderWater", 0.0),
                        tuple("intact.heel", 15.0));
        assertThat(rules.criteria().get(4))
                .isEqualTo(new Criterion(
                        "intact.heel",
                        "owner's standing orders, 5",
                        Situation.INTACT,
                        Measure.INCLINATION,
                        15,
                        OptionalDouble.empty(),
                        LimitAngle.DOWNFLOODING,
                        Openings.NOT_WATERTIGHT));
        assertThat(rules.criteria().get(2).limitAngle()).isEqualTo(LimitAngle.LESSER);
        assertThat(rules.criteria().get(2).openings()).isEqualTo(Openings.NOT_WEATHERTIGHT);
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "rules | \"imo\" | MEANING | moduColumnStabilized, moduSurface, cfrColumnStabilized, cfrSurface",
                "rules | 3 | FORM | text",
                "rules | \"\" | FORM | empty",
                "own | {} | FORM | list",
                "own/0 | 1 | FORM | object",
                "own/0/name | 7 | FORM | text",
                "own/0/name | null | FORM | must be given",
                "own/0/clause | null | FORM | must be given",
                "own/0/clause | \" \" | FORM | empty",
                "own/0/situation | \"capsized\" | FORM | intact, collision, flooding",
                "own/0/situation | null | FORM | must be given",
                "own/0/measure | \"gm\" | FORM | areaRatio, leastArm, leastGm, inclination, range, armRatio, openingHeight",
                "own/0/measure | null | FORM | must be given",
                "own/0/bound | null | FORM | must be given",
                "own/0/bound | 1e400 | FORM | finite",
                "own/0/bound | 20000 | MEANING | from -10000 to 10000",
                "own/1/bound | -0.1 | MEANING | from 0 to 90",
                "own/1/bound | 91 | MEANING | from 0 to 90",
                "own/0/windSpeed | -1 | MEANING | 0 or more",
                "own/0/windSpeed | \"36\" | FORM | number",
                "own/0/limitAngle | \"capsize\" | FORM | downflooding, secondIntercept, lesser",
                "own/0/openings | \"all\" | FORM | notWeathertight, notWatertight",
                "own/1/name | \"intact.leastGm\" | MEANING | two criteria 'intact.leastGm'",
                "without | 2 | FORM | list",
                "without/0 | 2 | FORM | text",
                "without/0 | \"collision.range\" | MEANING | no criterion 'collision.range'; known: intact.areaRatio",
                "without/0 | \"intact.leastGm\" | MEANING | own criteria as well",
                "without/0 | \"intact.heel\" | MEANING | own criteria as well",
                "worst | true | FORM | unknown property",
                "own/0/unit | \"m\" | FORM | unknown property"
            })
    void pointsAtWhatIsWrongWithCriteria(String place, String value, Fault.Kind kind, String told) {
        ObjectNode document = with(Examples.platform(), "/criteria/" + place, Examples.parse(value));
        assertThat(faults(document)).singleElement().satisfies(fault -> {
            assertThat(fault.pointer()).isEqualTo("/criteria/" + place);
            assertThat(fault.kind()).isEqualTo(kind);
            assertThat(fault.detail()).contains(told);
        });
    }

    @ParameterizedTest
    @ValueSource(strings = {"areaRatio", "armRatio"})
    void aRatioMustBeOverNothing(String measure) {
        JsonNode criteria = Examples.parse("""
                { "own": [ { "name": "a", "clause": "b", "situation": "intact", "measure": "%s", "bound": 0 } ] }
                """.formatted(measure));
        assertThat(faults(with(Examples.platform(), "/criteria", criteria)))
                .singleElement()
                .satisfies(fault -> {
                    assertThat(fault.pointer()).isEqualTo("/criteria/own/0/bound");
                    assertThat(fault.detail()).isEqualTo("bound must be over 0, not 0");
                });
    }

    @Test
    void listsAllFaultsOfCriteriaAtOnce() {
        List<Fault> faults = faults(withCriteria("""
                { "rules": "moduSurface", "colour": "red", "without": ["flooding.range", "intact.areaRatio", "intact.areaRatio"],
                  "own": [ { "name": "a", "clause": "x", "situation": "ashore", "measure": "range", "bound": 100 },
                           { "name": "a", "situation": "intact", "measure": "leastGm", "bound": "small", "windSpeed": -5 } ] }
                """));
        assertThat(faults)
                .extracting(Fault::pointer)
                .containsExactlyInAnyOrder(
                        "/criteria/colour",
                        "/criteria/without/0",
                        "/criteria/without/2",
                        "/criteria/own/0/situation",
                        "/criteria/own/0/bound",
                        "/criteria/own/1/name",
                        "/criteria/own/1/clause",
                        "/criteria/own/1/bound",
                        "/criteria/own/1/windSpeed");
    }

    @Test
    void saysNothingOfWithoutWhereTheRulesAreUnknown() {
        assertThat(faults(withCriteria("{ \"rules\": \"imo\", \"without\": [\"collision.range\"] }")))
                .extracting(Fault::pointer)
                .containsExactly("/criteria/rules");
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "{",
                "{}",
                "{ \"moduColumnStabilized\": [] }",
                "{ \"moduColumnStabilized\": [ { \"name\": \"a\", \"situation\": \"intact\", \"measure\": \"range\", \"bound\": 7 } ] }",
                "{ \"moduColumnStabilized\": [ { \"name\": \"a\", \"clause\": \"b\", \"situation\": \"intact\", \"measure\": \"range\","
                        + " \"bound\": 95 } ] }"
            })
    void aBrokenResourceIsLoud(String broken) {
        assertThatThrownBy(() -> PublishedRules.read(broken.getBytes(StandardCharsets.UTF_8)))
                .isInstanceOf(IllegalStateException.class)
                .hasMessageContaining("rules.json");
    }
}
