package org.evendraft.stability.damage;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.evendraft.stability.damage.Layouts.fullSets;
import static org.evendraft.stability.damage.Layouts.sets;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Collectors;
import org.evendraft.platform.Json;
import org.evendraft.platform.Mode;
import org.evendraft.platform.PlatformReader;
import org.evendraft.platform.PreparedPlatform;
import org.evendraft.platform.Situation;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;

/** The demo platform by IMO MODU Code 2009, 3.5.10 and 3.4.4. Its column tanks lie 1.25 m from the shell, inner pontoon tanks 7 m. */
class DemoDamageTest {
    private static PreparedPlatform demo;

    @BeforeAll
    static void read() throws IOException {
        demo = PlatformReader.read(Json.parse(Files.readAllBytes(Path.of("db/demo/merganser.json"))));
    }

    private static GeneratedCases collisions(String mode) {
        Mode found = demo.platform().modes().stream()
                .filter(m -> m.id().equals(mode))
                .findFirst()
                .orElseThrow();
        return DamageExtents.collisionCases(demo, found);
    }

    /** Names of the port side with those of the starboard side, which mirrors it. */
    private static Set<String> bothSides(String... port) {
        Set<String> sets = new TreeSet<>(List.of(port));
        for (String set : port) {
            sets.add(List.of(set.split(" ")).stream()
                    .map(DemoDamageTest::toStarboard)
                    .collect(Collectors.joining(" ")));
        }
        return sets;
    }

    private static String toStarboard(String name) {
        if (name.startsWith("PB")) {
            return "S" + name.substring(1);
        }
        return name.startsWith("CP")
                ? "CS" + name.substring(2)
                : name.substring(0, name.length() - 2) + "S" + name.charAt(name.length() - 1);
    }

    /** Operating at 17.5 to 19.5 m: the zone is 14.5 to 24.5 m, and the flat between tank and void is at 14.5 m, on its edge. */
    @Test
    void operatingFloodsTheColumnVoidsAndAtTheEdgeOfTheZoneTheTanksUnderThem() {
        GeneratedCases cases = collisions("operating");
        assertThat(fullSets(cases))
                .isEqualTo(bothSides("column-void-PF", "column-void-PF CPF", "column-void-PA", "column-void-PA CPA"));
        assertThat(cases.cases()).extracting(c -> c.id()).contains("column PF: column-void-PF + CPF");
        assertThat(sets(cases)).hasSize(12).contains("CPF");
    }

    /** Survival at 15 to 17 m: the zone is 12 to 22 m, below the tops of the voids and above the pontoons. */
    @Test
    void survivalFloodsVoidAndTankOfEachColumn() {
        assertThat(sets(collisions("survival")))
                .isEqualTo(bothSides(
                        "column-void-PF", "column-void-PF CPF", "CPF", "column-void-PA", "column-void-PA CPA", "CPA"));
    }

    /**
     * Transit at 7.0 to 8.4 m: the zone is 4.0 to 13.4 m. The outer sides and ends of the pontoons are exposed (3.5.10.5), and the
     * pontoon's top under a column, 0.75 m in from its side, is a flat in the zone.
     */
    @Test
    void transitFloodsTheOuterPontoonTanksAndTheFeetOfTheColumns() {
        assertThat(sets(collisions("transit")))
                .isEqualTo(bothSides(
                        "PB1",
                        "pump-room-PF",
                        "PB2",
                        "PB4",
                        "PB5",
                        "PB7",
                        "pump-room-PA",
                        "PB9",
                        "CPF",
                        "CPA",
                        "CPF pump-room-PF",
                        "CPF PB2",
                        "CPA PB7",
                        "CPA pump-room-PA"));
    }

    @Test
    void notesNameTanksWithoutAShapeAndBracesWithoutASpace() {
        assertThat(collisions("transit").notes())
                .anyMatch(n -> n.endsWith("in no case: PFO, SFO, PFW, SFW."))
                .anyMatch(n -> n.endsWith("so taken as intact: brace F, brace A, brace P, brace S."))
                .anyMatch(n -> n.equals("Judged as columns by the spacing of their bulkheads: column PF, column PA,"
                        + " column SF, column SA."));
    }

    @Test
    void reasonsTellWhereTheDamageIs() {
        GeneratedCases cases = collisions("survival");
        int whole = cases.cases().stream().map(c -> c.id()).toList().indexOf("column PF: column-void-PF + CPF");
        assertThat(cases.reasons().get(whole))
                .startsWith("Collision with column PF about x ")
                .contains("between 12.00 and 15.00 m over the keel, 1.50 m deep, opens column-void-PF and CPF.");
        int lesser = cases.cases().stream().map(c -> c.id()).toList().indexOf("column PF: CPF");
        assertThat(cases.reasons().get(lesser))
                .isEqualTo("Lesser damage than \"column PF: column-void-PF + CPF\": only CPF open to the sea.");
    }

    @Test
    void theSamePlatformGivesTheSameCasesInTheSameOrder() {
        assertThat(collisions("transit")).isEqualTo(collisions("transit"));
    }

    /** 3.4.4: any one compartment wholly or partly below the waterline; pontoons reach to 8.5 m, column tanks from there, voids from 14.5 m. */
    @Test
    void floodingTakesEachSpaceThatReachesBelowTheWaterline() {
        GeneratedCases transit = DamageExtents.floodingCases(demo, 8.4);
        assertThat(transit.cases()).hasSize(24).allMatch(c -> c.situation() == Situation.FLOODING);
        assertThat(sets(transit)).contains("PB3", "pump-room-SA", "SDW").doesNotContain("CPF", "MUD1");
        assertThat(sets(DamageExtents.floodingCases(demo, 8.5))).hasSize(24);
        assertThat(sets(DamageExtents.floodingCases(demo, 18.5)))
                .hasSize(32)
                .contains("CPF", "column-void-SA")
                .doesNotContain("MUD1");
        assertThat(transit.cases().get(0).id()).isEqualTo("flooding: PB1");
        assertThat(transit.reasons().get(0))
                .isEqualTo("PB1 reaches down to 0.00 m over the keel, below the waterline at a draft of 8.40 m.");
        assertThatThrownBy(() -> DamageExtents.floodingCases(demo, Double.NaN))
                .isInstanceOf(IllegalArgumentException.class);
    }
}
