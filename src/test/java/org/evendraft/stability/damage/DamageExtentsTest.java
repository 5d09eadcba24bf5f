package org.evendraft.stability.damage;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.evendraft.stability.damage.Layouts.body;
import static org.evendraft.stability.damage.Layouts.box;
import static org.evendraft.stability.damage.Layouts.compartment;
import static org.evendraft.stability.damage.Layouts.fullSets;
import static org.evendraft.stability.damage.Layouts.mode;
import static org.evendraft.stability.damage.Layouts.platform;
import static org.evendraft.stability.damage.Layouts.ring;
import static org.evendraft.stability.damage.Layouts.roundColumn;
import static org.evendraft.stability.damage.Layouts.sets;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import org.evendraft.geometry.Mesh;
import org.evendraft.geometry.Solid;
import org.evendraft.geometry.Vec3;
import org.evendraft.platform.Body;
import org.evendraft.platform.Compartment;
import org.evendraft.platform.Mode;
import org.evendraft.platform.PreparedPlatform;
import org.evendraft.platform.Situation;
import org.junit.jupiter.api.Test;

/** Layouts worked by hand from IMO MODU Code 2009 (res. A.1023(26)), 3.5.10, and 46 CFR 174.085. Zone at one draft d: d − 3 to d + 5. */
class DamageExtentsTest {
    private static final Mode AT_15 = mode(15, 15);

    private static PreparedPlatform ringed(double... fromDegrees) {
        List<Compartment> spaces = new ArrayList<>(ring(4.8, 6, 30, fromDegrees));
        spaces.add(compartment("core", Solid.cylinder(Vec3.ZERO, new Vec3(0, 0, 30), 8.9, 8.9)));
        return platform(List.of(roundColumn(12, 30)), spaces);
    }

    private static double[] equalSectors(int count) {
        return IntStream.range(0, count).mapToDouble(i -> 360.0 * i / count).toArray();
    }

    /** 3.5.10.3: quarters are 9.4 m apart, an eighth of the perimeter is 4.7 m. 3.5.10.4: the core lies 1.55 m deep. */
    @Test
    void ofARoundColumnEachQuarterOfTheRingFloodsAloneAndTheCoreStaysDry() {
        GeneratedCases cases = DamageExtents.collisionCases(ringed(equalSectors(4)), AT_15);
        assertThat(sets(cases)).containsExactly("R1", "R2", "R3", "R4");
        assertThat(cases.cases()).allMatch(c -> c.situation() == Situation.COLLISION);
        assertThat(cases.cases()).extracting(c -> c.id()).contains("column: R1");
    }

    /** 3.5.10.3: bulkheads a twelfth of the perimeter apart are closer than an eighth, every second one is not. */
    @Test
    void bulkheadsCloserThanAnEighthOfThePerimeterAreDisregarded() {
        GeneratedCases cases = DamageExtents.collisionCases(ringed(equalSectors(12)), AT_15);
        assertThat(fullSets(cases)).hasSize(24).contains("R1", "R1 R2 R3", "R1 R11 R12");
        assertThat(sets(cases)).contains("R1 R2", "R1 R3").doesNotContain("R1 R4", "R1 R2 R3 R4");
        assertThat(cases.reasons())
                .anyMatch(r -> r.contains("through bulkheads closer than 4.71 m along the periphery"));
    }

    /** 3.5.10.3 says "closer than", 46 CFR 174.085(a)(2) "equal to or less than" an eighth, for each two adjacent compartments. */
    @Test
    void bulkheadsAtJustAnEighthHoldUnderTheCodeButNotUnderTheRegulations() {
        PreparedPlatform platform = ringed(equalSectors(8));
        assertThat(sets(DamageExtents.collisionCases(platform, AT_15, Extents.MODU)))
                .hasSize(8)
                .contains("R1", "R8");
        assertThat(sets(DamageExtents.collisionCases(platform, AT_15, Extents.CFR)))
                .hasSize(16)
                .contains("R1", "R1 R2", "R1 R8")
                .doesNotContain("R1 R3");
    }

    /** 3.5.10.3: of the two bulkheads 40° apart, under an eighth of the turn, both may go; the one across from them holds. */
    @Test
    void aSingleBulkheadHoldsWhereOthersAreClose() {
        GeneratedCases cases = DamageExtents.collisionCases(ringed(0, 40, 200), AT_15);
        assertThat(fullSets(cases)).containsExactly("R1", "R1 R2 R3", "R2", "R3");
    }

    private static PreparedPlatform stacked(double... flats) {
        List<Compartment> spaces = new ArrayList<>();
        for (int i = 0; i + 1 < flats.length; i++) {
            spaces.add(compartment("L" + (i + 1), box(-6, 6, -6, 6, flats[i], flats[i + 1])));
        }
        return platform(List.of(body("column", box(-6, 6, -6, 6, 0, 30))), spaces);
    }

    /** 3.5.10.2: the zone is 12 to 20 m; the flat at 16 m is in it, those at 9 m and 21 m are not. */
    @Test
    void aFlatInTheZoneFloodsBothSidesAndOneOutsideHolds() {
        GeneratedCases cases = DamageExtents.collisionCases(stacked(0, 9, 16, 21, 30), AT_15);
        assertThat(fullSets(cases)).containsExactly("L2", "L2 L3", "L3");
        assertThat(sets(cases)).isEqualTo(fullSets(cases));
    }

    /** 3.5.10.2: the zone itself ends at 12 m and 20 m; a flat there is taken to be within. */
    @Test
    void aFlatOnTheEdgeOfTheZoneIsInIt() {
        assertThat(fullSets(DamageExtents.collisionCases(stacked(0, 12, 20, 30), AT_15)))
                .containsExactly("L1 L2", "L2", "L2 L3");
    }

    /** 3.5.10.2: the damage is 3.0 m high. */
    @Test
    void twoFlatsGoTogetherWhenCloserThanTheVerticalExtent() {
        assertThat(sets(DamageExtents.collisionCases(stacked(0, 14, 16.9, 30), AT_15)))
                .contains("L1 L2 L3");
        assertThat(sets(DamageExtents.collisionCases(stacked(0, 14, 17.1, 30), AT_15)))
                .contains("L1 L2", "L2 L3")
                .doesNotContain("L1 L2 L3");
    }

    /** 3.5.10.2: the zone reaches from 3.0 m under the least to 5.0 m over the greatest draft. */
    @Test
    void theZoneCoversTheRangeOfDrafts() {
        PreparedPlatform platform = stacked(0, 9, 23, 30);
        assertThat(sets(DamageExtents.collisionCases(platform, mode(13, 17)))).containsExactly("L2");
        assertThat(sets(DamageExtents.collisionCases(platform, mode(11, 19)))).contains("L1", "L1 L2", "L2 L3");
    }

    private static PreparedPlatform doubleSkinned(double skin) {
        double in = 6 - skin;
        Body outer = body("wing", box(-6, 6, -6, 6, 0, 30));
        Solid inside = box(-in, in, -in, in, 0, 30);
        Compartment wing = new Compartment("wing", List.of(outer, new Body("inside", true, inside)), 0.95);
        return platform(
                List.of(body("column", box(-6, 6, -6, 6, 0, 30))), List.of(wing, compartment("inside", inside)));
    }

    /** 3.5.10.4: the penetration is 1.5 m. */
    @Test
    void anInnerSpaceIsReachedThroughASkinOfOneMetreButNotOfTwo() {
        assertThat(sets(DamageExtents.collisionCases(doubleSkinned(1), AT_15))).contains("inside wing");
        assertThat(sets(DamageExtents.collisionCases(doubleSkinned(2), AT_15))).containsExactly("wing");
        assertThat(sets(DamageExtents.collisionCases(doubleSkinned(1.5), AT_15)))
                .as("a bulkhead at just the depth of the damage")
                .containsExactly("wing");
    }

    /** 3.5.10.4: of a cone the shell lies 3 − z/10 m outside the inner space, within 1.5 m from 15 m up. */
    @Test
    void whereAColumnTapersThePenetrationCountsFromTheShellAtEachHeight() {
        Body cone = body("column", Solid.cylinder(Vec3.ZERO, new Vec3(0, 0, 30), 14, 8));
        PreparedPlatform platform = platform(
                List.of(cone), List.of(compartment("inside", Solid.cylinder(Vec3.ZERO, new Vec3(0, 0, 30), 8, 8))));
        assertThat(DamageExtents.collisionCases(platform, mode(9.5, 9.5)).cases())
                .isEmpty();
        assertThat(DamageExtents.collisionCases(platform, mode(10.5, 10.5)).cases())
                .hasSize(1);
    }

    private static Solid column(int sx, int sy) {
        return box(
                Math.min(25 * sx, 35 * sx),
                Math.max(25 * sx, 35 * sx),
                Math.min(25 * sy, 35 * sy),
                Math.max(25 * sy, 35 * sy),
                0,
                30);
    }

    /** Four columns 10 m square about (±30, ±30), the one port forward in quarters. */
    private static List<Compartment> quarters() {
        return List.of(
                compartment("corner", box(30, 35, 30, 35, 0, 30)),
                compartment("forward", box(30, 35, 25, 30, 0, 30)),
                compartment("port", box(25, 30, 30, 35, 0, 30)),
                compartment("inner", box(25, 30, 25, 30, 0, 30)));
    }

    private static List<Body> fourColumns() {
        return List.of(
                body("PF", column(1, 1)),
                body("PA", column(-1, 1)),
                body("SF", column(1, -1)),
                body("SA", column(-1, -1)));
    }

    /** 3.5.10.1: only the exposed portions; 46 CFR 174.085(a): only outboard of the planes through the columns' centrelines. */
    @Test
    void innerFacesOfFourColumnsAreNotExposed() {
        PreparedPlatform platform = platform(fourColumns(), quarters());
        assertThat(sets(DamageExtents.collisionCases(platform, AT_15))).containsExactly("corner", "forward", "port");
        assertThat(sets(DamageExtents.collisionCases(platform, AT_15, Extents.CFR)))
                .containsExactly("corner", "forward", "port");
    }

    @Test
    void aHullOfOneMeshGivesTheSameAsOneOfFourBodies() {
        List<Body> four = fourColumns();
        PreparedPlatform one = platform(List.of(body("hull", joined(four))), quarters());
        assertThat(sets(DamageExtents.collisionCases(one, AT_15)))
                .isEqualTo(sets(DamageExtents.collisionCases(platform(four, quarters()), AT_15)));
    }

    private static Solid joined(List<Body> bodies) {
        List<Double> xyz = new ArrayList<>();
        List<Integer> corners = new ArrayList<>();
        for (Body body : bodies) {
            Mesh mesh = body.solid().mesh();
            int before = xyz.size() / 3;
            for (int i = 0; i < mesh.vertexCount(); i++) {
                Vec3 v = mesh.vertex(i);
                xyz.addAll(List.of(v.x(), v.y(), v.z()));
            }
            for (int i = 0; i < 3 * mesh.triangleCount(); i++) {
                corners.add(before + mesh.corner(i / 3, i % 3));
            }
        }
        return Solid.ofMesh(new Mesh(
                xyz.stream().mapToDouble(Double::doubleValue).toArray(),
                corners.stream().mapToInt(Integer::intValue).toArray()));
    }

    /** 3.5.10.1: only columns on the periphery of the unit, though the sea is seen from the middle one between the others. */
    @Test
    void aColumnInTheMiddleIsNotStruck() {
        List<Body> hull = new ArrayList<>(fourColumns());
        hull.add(body("middle", box(-4, 4, -4, 4, 0, 30)));
        PreparedPlatform platform = platform(hull, List.of(compartment("middle", box(-4, 4, -4, 4, 0, 30))));
        assertThat(DamageExtents.collisionCases(platform, AT_15).cases()).isEmpty();
        assertThat(DamageExtents.collisionCases(platform, AT_15, Extents.CFR).cases())
                .isEmpty();
    }

    /** 3.5.10.5 with 3.5.6: bulkheads of an underwater hull count from 3.0 m apart on; 46 CFR 174.085(b): each compartment by itself. */
    @Test
    void bulkheadsOfAnUnderwaterHullCountFromThreeMetresApartOn() {
        assertThat(fullSets(DamageExtents.collisionCases(pontoon(2.9), mode(5, 5))))
                .containsExactly("A", "A B C", "B", "C");
        assertThat(fullSets(DamageExtents.collisionCases(pontoon(3.1), mode(5, 5))))
                .containsExactly("A", "B", "C");
        assertThat(sets(DamageExtents.collisionCases(pontoon(2.9), mode(5, 5), Extents.CFR)))
                .containsExactly("A", "B", "C");
    }

    private static PreparedPlatform pontoon(double middle) {
        double half = middle / 2;
        return platform(
                List.of(body("pontoon", box(-40, 40, -7, 7, 0, 8))),
                List.of(
                        compartment("A", box(-40, -half, -7, 7, 0, 8)),
                        compartment("B", box(-half, half, -7, 7, 0, 8)),
                        compartment("C", box(half, 40, -7, 7, 0, 8))));
    }

    /** 3.5.10.2: a column's foot in the zone is a flat; it stands 1.0 m, or 2.0 m, in from the side of the pontoon. */
    @Test
    void columnAndPontoonAreStruckTogetherWhereTheirSidesAreWithinThePenetration() {
        assertThat(sets(DamageExtents.collisionCases(columnOnPontoon(6), mode(8, 8))))
                .contains("foot tank");
        assertThat(sets(DamageExtents.collisionCases(columnOnPontoon(5), mode(8, 8))))
                .containsExactly("foot", "tank");
    }

    private static PreparedPlatform columnOnPontoon(double side) {
        return platform(
                List.of(body("pontoon", box(-40, 40, -7, 7, 0, 8)), body("column", box(-5, 5, -side, side, 8, 30))),
                List.of(
                        compartment("tank", box(-40, 40, -7, 7, 0, 8)),
                        compartment("foot", box(-5, 5, -side, side, 8, 30))));
    }

    /** Lesser damage: asked for in 3.5 of other types of unit, for columns from memory. */
    @Test
    void lesserDamageOfEveryCaseIsACaseToo() {
        GeneratedCases cases = DamageExtents.collisionCases(stacked(0, 13, 14, 15, 30), AT_15);
        assertThat(fullSets(cases)).contains("L1 L2 L3 L4").doesNotContain("L1 L4", "L1 L2 L4", "L2");
        assertThat(sets(cases)).hasSize(15).contains("L1 L4", "L1 L2 L4", "L2");
        assertThat(cases.reasons()).hasSameSizeAs(cases.cases());
    }

    @Test
    void withoutDraftsThereAreNoCasesAndANoteSaysSo() {
        GeneratedCases cases = DamageExtents.collisionCases(stacked(0, 14, 30), mode(Optional.empty()));
        assertThat(cases.cases()).isEmpty();
        assertThat(cases.notes()).singleElement().asString().contains("no draft range");
    }

    @Test
    void cutOutsOfTheHullAreNotStruckAndBodiesWithoutSpacesAreNamed() {
        List<Body> hull =
                List.of(body("column", box(-6, 6, -6, 6, 0, 30)), new Body("trunk", true, box(-1, 1, -1, 1, 0, 30)));
        PreparedPlatform platform = platform(hull, List.of(compartment("next to the trunk", box(1, 3, -1, 1, 0, 30))));
        GeneratedCases cases = DamageExtents.collisionCases(platform, AT_15);
        assertThat(cases.cases()).isEmpty();
        assertThat(cases.notes()).anyMatch(n -> n.endsWith("so taken as intact: column."));
    }

    @Test
    void extentsThatMakeNoSenseAreRefused() {
        assertThatThrownBy(() -> new Extents(3, 1, 1, 1.5, 0.125, 3, Extents.Text.IMO))
                .isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> new Extents(3, 5, 3, 0, 0.125, 3, Extents.Text.IMO))
                .isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> new Extents(3, 5, 3, 1.5, 1, 3, Extents.Text.IMO))
                .isInstanceOf(IllegalArgumentException.class);
    }
}
