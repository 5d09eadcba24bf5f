package org.evendraft.stability;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Objects;
import java.util.OptionalDouble;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import org.apache.commons.math3.analysis.solvers.BrentSolver;
import org.evendraft.geometry.Assembly;
import org.evendraft.geometry.Cut;
import org.evendraft.geometry.Plane;
import org.evendraft.geometry.Vec3;
import org.evendraft.platform.Criterion.LimitAngle;
import org.evendraft.platform.Criterion.Measure;
import org.evendraft.platform.DamageCase;
import org.evendraft.platform.Fill;
import org.evendraft.platform.Opening.Closing;
import org.evendraft.platform.PreparedPlatform;
import org.evendraft.platform.Situation;
import org.evendraft.platform.Tank;
import org.evendraft.stability.DamageResult.DamagedPosition;
import org.evendraft.stability.DamageResult.Outcome;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Damage by lost buoyancy against worked examples, closed forms and the other method, that of added weight. */
class DamageStabilityTest {
    private static DamageResult judge(JudgedBarge barge, Situation situation, String... flooded) {
        return DamageStability.judge(
                barge.loaded(), new DamageCase("case", situation, List.of(flooded)), "why", OptionalDouble.empty());
    }

    /**
     * Bilged amidships compartments of box vessels, lost buoyancy: 40 × 6 m at 2 m, 10 m bilged, GM 0.6 m; 150 × 24 m at 5 m, 20 m
     * bilged, GM 0.9 m (Derrett and Barrass, Ship Stability for Masters and Mates, pp. 206–207). Exact values of the same sums.
     */
    @ParameterizedTest
    @CsvSource({"40, 6, 2, 10, 0.6, 0.666667, 2.458333, 0.558333", "150, 24, 5, 20, 0.9, 0.769231, 11.204615, 0.004615"
    })
    void bilgedBoxRisesAndKeepsTheGmOfTheExamples(
            double length,
            double breadth,
            double draft,
            double bilged,
            double intactGm,
            double rise,
            double km,
            double gm) {
        double kg = draft / 2 + breadth * breadth / (12 * draft) - intactGm;
        PreparedPlatform box = Floaters.flooding(
                List.of(Floaters.box("hull", -length / 2, length / 2, -breadth / 2, breadth / 2, 0, 3 * draft)),
                1.025 * length * breadth * draft,
                new Vec3(0, 0, kg),
                Floaters.box("C", -bilged / 2, bilged / 2, -breadth / 2, breadth / 2, 0, 3 * draft));
        EvenKeel damaged = LoadedPlatform.of(box, Floaters.condition(List.of(), List.of()))
                .withFlooded(List.of("C"))
                .evenKeel();
        assertThat(damaged.draft() - draft).isCloseTo(rise, within(1e-6));
        assertThat(damaged.km().transverse()).isCloseTo(km, within(1e-6));
        assertThat(damaged.gm().transverse().corrected()).isCloseTo(gm, within(1e-6));
    }

    /** What is left of a barge with 10 m of its bow open is a box of 90 m; its trim t solves a cubic of the wall-sided box. */
    private static double trimOfOpenBow(double kg) {
        double v = 10_000;
        double left = 90;
        double draftAtMiddle = v / (left * 20);
        double bm = left * left * left * 20 / 12 / v;
        double xb = -5;
        double t = new BrentSolver(1e-14)
                .solve(200, s -> (0 - xb - bm * s) + s * (kg - draftAtMiddle / 2 - bm * s * s / 2), 0, 0.3);
        return Math.toDegrees(Math.atan(t));
    }

    @Test
    void openBowTrimsAsTheShorterBoxDoes() {
        JudgedBarge barge = new JudgedBarge().compartment("bow", 40, 50, -10, 10, 1);
        DamagedPosition at =
                Objects.requireNonNull(judge(barge, Situation.COLLISION, "bow").floating());
        assertThat(at.trimAngle()).isCloseTo(trimOfOpenBow(6), within(1e-6));
        assertThat(at.heelAngle()).isCloseTo(0, within(1e-9));
        // Draft is read at the origin, 5 m forward of the middle of what is left.
        double atMiddle = at.draft() - 5 * Math.tan(Math.toRadians(at.trimAngle()));
        assertThat(atMiddle).isCloseTo(10_000.0 / 1800, within(1e-8));
    }

    /**
     * The other method: with the water that has run in counted as weight, the whole hull must float in the same position: weight equals
     * buoyancy, and the common centre of gravity lies over B.
     */
    @Property(tries = 25, seed = "2026")
    void lostBuoyancyAndAddedWeightAgree(
            @ForAll @DoubleRange(min = -45, max = 30) double from,
            @ForAll @DoubleRange(min = 3, max = 15) double length,
            @ForAll @DoubleRange(min = -10, max = 5) double side,
            @ForAll @DoubleRange(min = 0.3, max = 1) double permeability) {
        JudgedBarge barge = new JudgedBarge().compartment("C", from, from + length, side, 10, permeability);
        LoadedPlatform intact = barge.loaded();
        Equilibrium found = intact.withFlooded(List.of("C")).floatingPosition();
        assertThat(found).isInstanceOf(Equilibrium.Afloat.class);
        Plane water = ((Equilibrium.Afloat) found).waterplane().plane();
        Cut hull = intact.hull().below(water);
        Assembly space = new Assembly(barge.compartments.get(0).bodies().stream()
                .map(b -> new Assembly.Part(b.solid(), false))
                .toList());
        Cut inside = space.below(water);
        double ranIn = 1.025 * permeability * inside.volume();
        assertThat(1.025 * hull.volume()).isCloseTo(JudgedBarge.MASS + ranIn, within(1e-6));
        Vec3 g = intact.centreOfGravity()
                .times(JudgedBarge.MASS)
                .plus(inside.centroid().times(ranIn))
                .times(1 / (JudgedBarge.MASS + ranIn));
        Vec3 off = g.minus(hull.centroid());
        Vec3 aside = off.minus(water.normal().times(off.dot(water.normal())));
        assertThat(aside.norm()).isCloseTo(0, within(1e-8));
    }

    @Test
    void contentOfAFloodedTankIsLostToTheSea() {
        JudgedBarge barge = new JudgedBarge();
        Tank tank = Floaters.tank("T", Floaters.box("T", -10, 10, -10, 10, 0, 4));
        barge.tanks.add(tank);
        LoadedPlatform full =
                LoadedPlatform.of(barge.prepared(), Floaters.condition(List.of(new Fill("T", 500, 1.025)), List.of()));
        LoadedPlatform empty = barge.loaded();
        DamageCase damage = new DamageCase("T open", Situation.FLOODING, List.of("T"));
        DamageResult lost = DamageStability.judge(full, damage, "why", OptionalDouble.empty());
        DamageResult was = DamageStability.judge(empty, damage, "why", OptionalDouble.empty());
        assertThat(lost.lostContent()).isCloseTo(512.5, within(1e-9));
        assertThat(Objects.requireNonNull(lost.floating()).draft())
                .isCloseTo(Objects.requireNonNull(was.floating()).draft(), within(1e-9));
        // By hand: 20 × 20 × 4 m are under water whole: the draft rises by 1600 m³ over 2000 m².
        assertThat(lost.floating().draft()).isCloseTo(5.8, within(1e-9));
    }

    @Test
    void whatSinksOrCapsizesIsAnAnswerThatSaysSo() {
        JudgedBarge barge = new JudgedBarge().compartment("most", -30, 40, -10, 10, 1);
        DamageResult sunk = judge(barge, Situation.COLLISION, "most");
        assertThat(sunk.outcome()).isEqualTo(Outcome.SINKS);
        assertThat(sunk.reason()).contains("sinks");
        assertThat(sunk.floating()).isNull();
        assertThat(sunk.survives()).isFalse();

        JudgedBarge tender = new JudgedBarge().compartment("side", -50, 50, 0, 10, 0.9);
        tender.kg = 8.9;
        DamageResult over = judge(tender, Situation.COLLISION, "side");
        assertThat(over.outcome()).isIn(Outcome.CAPSIZES, Outcome.SINKS);
        assertThat(over.survives()).isFalse();
    }

    /** The damaged platform's own list counts: without wind the inclination about any axis is that of its rest. */
    @Test
    void inclinationWithoutWindIsThatOfTheDamagedPosition() {
        JudgedBarge barge = new JudgedBarge()
                .compartment("corner", 30, 50, 0, 10, 0.8)
                .criterion(Situation.FLOODING, Measure.INCLINATION, 25, 0, LimitAngle.LESSER);
        DamageResult result = judge(barge, Situation.FLOODING, "corner");
        CriterionResult inclination = result.criteria().get(0);
        double own = Objects.requireNonNull(result.floating()).inclination();
        assertThat(own).isGreaterThan(1);
        assertThat(inclination.value()).isCloseTo(own, within(1e-4));
        assertThat(inclination.met()).isTrue();
    }

    @Test
    void theWorstCaseIsNamedWithItsReason() {
        JudgedBarge barge = new JudgedBarge()
                .compartment("corner", 30, 50, 0, 10, 0.9)
                .compartment("small", 45, 50, 0, 10, 0.9)
                .opening("vent", 10, 9, Closing.NONE)
                .criterion(Situation.COLLISION, Measure.OPENING_HEIGHT, 0, 0, LimitAngle.LESSER);
        List<DamageCase> cases = List.of(
                new DamageCase("small", Situation.COLLISION, List.of("small")),
                new DamageCase("corner", Situation.COLLISION, List.of("corner")));
        DamageSurvey survey = DamageSurvey.of(
                barge.loaded(),
                new DamageSurvey.Question(cases, List.of("a", "b"), List.of()),
                OptionalDouble.empty(),
                Progress.UNWATCHED);
        assertThat(survey.worstCase()).isEqualTo("corner");
        assertThat(survey.why()).contains("OPENING_HEIGHT").contains("vent");
        assertThat(survey.cases()).extracting(DamageResult::why).containsExactly("a", "b");
        assertThat(survey.worst()).hasSize(1);
    }
}
