package org.evendraft.ballast.loadplan;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowableOfType;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import org.evendraft.ballast.Plan;
import org.evendraft.platform.Condition;
import org.evendraft.platform.ConditionReader;
import org.evendraft.platform.Fault;
import org.evendraft.platform.FaultyDocumentException;
import org.evendraft.platform.Json;
import org.evendraft.platform.PreparedPlatform;
import org.evendraft.stability.Evaluation;
import org.evendraft.stability.LoadedPlatform;
import org.evendraft.stability.RightingCurve;
import org.evendraft.stability.WindAnswer;
import org.junit.jupiter.api.Test;

final class LoadPlannerTest {
    private static final String NO_BALLAST = ", \"ballast\": \"none\"";
    private static final String CRATE =
            "{ \"event\": \"aboard\", \"load\": { \"name\": \"crate\", \"kind\": \"deck\", \"area\": \"deck\", \"mass\": 200, \"x\": 0, \"y\": 10, \"z\": 14 } }";
    private static final String CRATE_AMIDSHIPS = CRATE.replace("\"y\": 10", "\"y\": 0");
    private static final String LIFT = "{ \"event\": \"lift\", \"load\": \"crate\", \"boomTip\": [0, 0, 44] }";

    private final PreparedPlatform bare = LiftBarge.bare();
    private final PreparedPlatform ballasted = LiftBarge.ballasted();

    private LoadPlan unballasted(String... events) {
        return LiftBarge.plan(bare, LiftBarge.LIGHT + NO_BALLAST, events);
    }

    /** First order: tan heel = m·y/(Δ·GM); the curvature of the righting arms takes off less than 1 in 500 here. */
    @Test
    void aLoadToPortHeelsByItsMomentOverDisplacementAndGm() {
        EventOutcome outcome = unballasted(CRATE).events().get(0);
        double gm = LiftBarge.gm(8200, (8000 * 6 + 200 * 14) / 8200.0);
        assertThat(outcome.position().gm().transverse().corrected()).isCloseTo(gm, within(1e-9));
        assertThat(Math.tan(Math.toRadians(outcome.position().heelAngle())))
                .isCloseTo(-200 * 10 / (8200 * gm), within(2e-3 * 200 * 10 / (8200 * gm)));
        assertThat(outcome.position().mass()).isCloseTo(8200, within(1e-9));
    }

    /** The wall-sided formula, GZ = sin φ·(GM + ½·BM·tan² φ), is exact for a box whose bilge and deck stay where they are. */
    @Test
    void theHeelIsThatOfTheWallSidedFormula() {
        EventOutcome outcome = unballasted(CRATE).events().get(0);
        double draft = 8200 / LiftBarge.AREA;
        double bm = LiftBarge.BREADTH * LiftBarge.BREADTH / 12 / draft;
        double tan = Math.tan(Math.toRadians(-outcome.position().heelAngle()));
        double gm = outcome.position().gm().transverse().corrected();
        assertThat(tan * (gm + bm * tan * tan / 2)).isCloseTo(200 * 10 / 8200.0, within(1e-8));
        assertThat(outcome.position().marks().get("P"))
                .isCloseTo(outcome.position().draft() + 20 * tan, within(1e-9));
    }

    @Test
    void aHookLoadActsAtTheBoomTip() {
        LoadPlan plan = unballasted(CRATE_AMIDSHIPS, LIFT);
        double before = plan.events().get(0).position().gm().transverse().corrected();
        double after = plan.events().get(1).position().gm().transverse().corrected();
        assertThat(before - after).isCloseTo(200 * (44 - 14) / 8200.0, within(1e-9));
        assertThat(plan.events().get(1).worst().gmLeast().what()).isEqualTo("crate hangs at the boom tip");
    }

    @Test
    void aLoadSetDownWhereItStoodLeavesAllAsItWas() {
        LoadPlan plan = unballasted(
                CRATE,
                LIFT,
                "{ \"event\": \"setDown\", \"load\": \"crate\", \"area\": \"deck\", \"x\": 0, \"y\": 10, \"z\": 14 }");
        assertThat(plan.events().get(2).position())
                .isEqualTo(plan.events().get(0).position());
    }

    /** The boom swings from bow over port to stern: at both ends the barge has no heel, in the middle that of 200 t at y = 30 m. */
    @Test
    void theWorstOfASlewLiesBetweenItsEnds() {
        String hang = LIFT.replace("[0, 0, 44]", "[30, 0, 44]");
        String slew =
                "{ \"event\": \"slew\", \"load\": \"crate\", \"boomTip\": [-30, 0.000001, 44], \"around\": [0, 0] }";
        LoadPlan plan = unballasted(CRATE_AMIDSHIPS, hang, slew);
        Instant worst = plan.events().get(2).worst().heelAngle();
        double gm = plan.events().get(1).position().gm().transverse().corrected();
        double bm = LiftBarge.BREADTH * LiftBarge.BREADTH / 12 / (8200 / LiftBarge.AREA);
        double tan = Math.tan(Math.toRadians(-worst.heelAngle()));
        assertThat(tan * (gm + bm * tan * tan / 2)).isCloseTo(200 * 30 / 8200.0, within(1e-6));
        assertThat(worst.what()).isEqualTo("crate is slewed, 50 % done");
        assertThat(plan.events().get(2).position().heelAngle()).isCloseTo(0, within(1e-4));
        assertThat(plan.worst().heelAngle()).isEqualTo(worst);
    }

    @Test
    void withoutAPivotTheBoomTipGoesStraight() {
        String hang = LIFT.replace("[0, 0, 44]", "[30, 0, 44]");
        String slew = "{ \"event\": \"slew\", \"load\": \"crate\", \"boomTip\": [-30, 0, 44] }";
        LoadPlan plan = unballasted(CRATE_AMIDSHIPS, hang, slew);
        assertThat(plan.events().get(2).worst().heelAngle().heelAngle()).isCloseTo(0, within(1e-9));
    }

    @Test
    void massIsConservedThroughAllEvents() {
        LoadPlan plan = unballasted(
                CRATE,
                "{ \"event\": \"bunker\", \"tank\": \"FUEL\", \"mass\": 160 }",
                "{ \"event\": \"consume\", \"tank\": \"FUEL\", \"volume\": 50 }",
                "{ \"event\": \"moves\", \"load\": \"crate\", \"x\": 5, \"y\": 5, \"z\": 14 }",
                "{ \"event\": \"leaves\", \"load\": \"crate\", \"mass\": 80 }",
                "{ \"event\": \"leaves\", \"load\": \"crate\" }");
        assertThat(plan.events())
                .extracting(outcome -> Math.round(outcome.position().mass() * 1e6) / 1e6)
                .containsExactly(8200.0, 8360.0, 8320.0, 8320.0, 8240.0, 8120.0);
        assertThat(plan.events().get(3).loading().loads().get(0).area()).contains("deck");
        assertThat(plan.events().get(5).loading().loads()).isEmpty();
    }

    /** A tank of 10 × 10 m that is filled whole has no free surface at either end; just before the end it takes ρ·i/Δ off GM. */
    @Test
    void aTankIsSlackWhileItIsFilled() {
        LoadPlan plan = unballasted("{ \"event\": \"bunker\", \"tank\": \"FUEL\", \"volume\": 400 }");
        EventOutcome outcome = plan.events().get(0);
        assertThat(outcome.position().gm().transverse().freeSurfaceCorrection()).isZero();
        double part = 35 / 36.0;
        double mass = 8000 + part * 320;
        double solid = LiftBarge.gm(mass, (8000 * 6 + part * 320 * part * 2) / mass);
        assertThat(outcome.worst().gmLeast().what()).isEqualTo("tank FUEL is being filled, 97 % done");
        assertThat(outcome.worst().gmLeast().gmTransverse()).isCloseTo(solid - 0.8 * 1e4 / 12 / mass, within(1e-9));
    }

    @Test
    void aMixtureHasTheDensityOfItsParts() {
        LoadPlan plan = unballasted(
                "{ \"event\": \"bunker\", \"tank\": \"FUEL\", \"volume\": 100 }",
                "{ \"event\": \"bunker\", \"tank\": \"FUEL\", \"volume\": 100, \"density\": 0.9 }");
        assertThat(plan.events().get(1).loading().fills().get(0).density()).isCloseTo(0.85, within(1e-12));
    }

    @Test
    void withoutBallastNoPlanIsMade() {
        LoadPlan plan = LiftBarge.plan(ballasted, LiftBarge.HALF_FULL + NO_BALLAST, CRATE);
        assertThat(plan.events().get(0).planAfter()).isEmpty();
        assertThat(plan.feasible()).isTrue();
        assertThat(plan.limitsKept()).isTrue();
    }

    @Test
    void ballastAfterAnEventRestoresTheTarget() {
        LoadPlan plan = LiftBarge.plan(ballasted, LiftBarge.HALF_FULL, CRATE);
        Plan after = plan.events().get(0).planAfter().orElseThrow();
        assertThat(after.feasible()).isTrue();
        double draft = plan.start().position().draft();
        assertThat(after.after().floating().draft()).isCloseTo(draft, within(0.01));
        assertThat(after.after().floating().heelAngle()).isCloseTo(0, within(0.02));
        assertThat(after.after().floating().trimAngle()).isCloseTo(0, within(0.02));
        Condition reached = read(ballasted, plan.events().get(0).loading());
        assertThat(Evaluation.evaluate(ballasted, reached).mass())
                .isCloseTo(after.after().mass(), within(1e-6));
    }

    private static Condition read(PreparedPlatform platform, LoadingDocument document) {
        JsonNode json = Json.mapper().valueToTree(document);
        return ConditionReader.read(json, platform);
    }

    @Test
    void anEventThatKeepsTheTargetNeedsNoBallast() {
        String feather = CRATE_AMIDSHIPS.replace("200", "10");
        LoadPlan plan = LiftBarge.plan(ballasted, LiftBarge.HALF_FULL, feather);
        assertThat(plan.events().get(0).planAfter()).isEmpty();
    }

    @Test
    void anEventThatWouldBreakALimitIsPreparedFor() {
        String limits = ", \"operationLimits\": { \"maxHeel\": 0.3 }";
        LoadPlan unprepared = LiftBarge.plan(ballasted, LiftBarge.HALF_FULL + limits + NO_BALLAST, CRATE);
        assertThat(unprepared.events().get(0).broken())
                .singleElement()
                .satisfies(breach -> assertThat(breach.limit()).isEqualTo("operationLimits.maxHeel"));
        assertThat(unprepared.limitsKept()).isFalse();
        LoadPlan prepared = LiftBarge.plan(ballasted, LiftBarge.HALF_FULL + limits, CRATE);
        assertThat(prepared.events().get(0).planBefore()).isPresent();
        assertThat(prepared.events().get(0).broken()).isEmpty();
        assertThat(prepared.limitsKept()).isTrue();
    }

    @Test
    void aLimitOfOneEventHoldsForThatEventAlone() {
        String strict = CRATE.replace("{ \"event\"", "{ \"limits\": { \"maxHeel\": 0.1 }, \"event\"");
        String away = "{ \"event\": \"leaves\", \"load\": \"crate\" }";
        LoadPlan plan = unballasted(strict, away);
        assertThat(plan.events().get(0).broken()).hasSize(1);
        assertThat(plan.events().get(1).broken()).isEmpty();
    }

    @Test
    void oneBallastPlanBeforehandHalvesTheHeel() {
        String out = "{ \"event\": \"leaves\", \"load\": \"crate\" }";
        String once = ", \"ballast\": \"once\", \"target\": { \"tolerance\": { \"draft\": 0.01, \"angle\": 0.005 } }";
        LoadPlan plan = LiftBarge.plan(ballasted, LiftBarge.HALF_FULL + once, CRATE, out);
        double without = plan.worstWithoutBallast().orElseThrow().heelAngle().heelAngle();
        assertThat(Math.abs(plan.worst().heelAngle().heelAngle())).isCloseTo(Math.abs(without) / 2, within(0.02));
        Plan before = plan.preBallast().orElseThrow();
        assertThat(before.after().floating().heelAngle()).isCloseTo(-without / 2, within(0.02));
        assertThat(plan.events()).allSatisfy(outcome -> {
            assertThat(outcome.planBefore()).isEmpty();
            assertThat(outcome.planAfter()).isEmpty();
        });
    }

    @Test
    void onceMovesNothingWhereThereIsNothingToGain() {
        LoadPlan plan = LiftBarge.plan(ballasted, LiftBarge.HALF_FULL + ", \"ballast\": \"once\"", CRATE_AMIDSHIPS);
        assertThat(plan.preBallast()).isEmpty();
        assertThat(plan.warnings()).anyMatch(sentence -> sentence.startsWith("No ballast moved"));
    }

    @Test
    void aSequenceEndsWhereThePlatformWouldCapsize() {
        String tower = CRATE.replace("200", "3000").replace("14 }", "200 }");
        LoadPlan plan = unballasted(CRATE.replace("crate", "box"), tower, LIFT);
        assertThat(plan.feasible()).isFalse();
        assertThat(plan.limitsKept()).isFalse();
        assertThat(plan.events()).hasSize(1);
        LoadPlan.Ended ended = plan.ended().orElseThrow();
        assertThat(ended.event()).isEqualTo(2);
        assertThat(ended.reason()).contains("capsizes");
    }

    @Test
    void aSequenceEndsWhereThePlatformWouldSink() {
        LoadPlan plan = unballasted(CRATE_AMIDSHIPS.replace("200", "30000").replace("14 }", "1 }"));
        assertThat(plan.ended().orElseThrow().event()).isEqualTo(1);
        assertThat(plan.ended().orElseThrow().reason()).contains("sinks");
        assertThat(plan.events()).isEmpty();
    }

    @Test
    void windHeelsToTheFirstInterceptAndLastsUntilItChanges() {
        LoadPlan plan = unballasted(
                "{ \"event\": \"wind\", \"speed\": 40, \"azimuth\": 0 }",
                CRATE_AMIDSHIPS,
                "{ \"event\": \"wind\", \"speed\": 0 }");
        Condition light = ConditionReader.read(LiftBarge.json("{}"), bare);
        LoadedPlatform loaded = LoadedPlatform.of(bare, light);
        Double intercept = WindAnswer.of(loaded, Evaluation.afloat(loaded), 40, RightingCurve.Request.usual(0))
                .curve()
                .firstIntercept();
        assertThat(intercept).isNotNull().isPositive();
        assertThat(plan.events().get(0).position().heelAngle()).isCloseTo(intercept, within(1e-6));
        assertThat(plan.events().get(1).position().heelAngle()).isPositive();
        assertThat(plan.events().get(2).position().heelAngle()).isCloseTo(0, within(1e-9));
    }

    /** Ballast against a wind would be wrong as soon as the wind veers. */
    @Test
    void windAloneCallsForNoBallast() {
        LoadPlan plan = LiftBarge.plan(
                ballasted, LiftBarge.HALF_FULL, "{ \"event\": \"wind\", \"speed\": 40, \"azimuth\": 0 }");
        assertThat(plan.events().get(0).position().heelAngle()).isGreaterThan(0.02);
        assertThat(plan.events().get(0).planAfter()).isEmpty();
    }

    @Test
    void limitsAreJudgedWhereThePlatformLiesInTheWind() {
        String strict = LiftBarge.HALF_FULL + NO_BALLAST + ", \"operationLimits\": { \"maxHeel\": 60 }";
        LoadPlan plan = LiftBarge.plan(ballasted, strict, "{ \"event\": \"wind\", \"speed\": 145, \"azimuth\": 0 }");
        assertThat(plan.events().get(0).position().limits())
                .filteredOn(limit -> limit.limit().equals("maxHeel"))
                .singleElement()
                .satisfies(limit -> assertThat(limit.value())
                        .isCloseTo(plan.events().get(0).position().heelAngle(), within(1e-9)));
    }

    @Test
    void pumpingThatTakesLongerThanThereIsTimeIsTold() {
        String soon = CRATE.replace("{ \"event\"", "{ \"minute\": 0, \"event\"");
        String next = "{ \"event\": \"leaves\", \"load\": \"crate\", \"minute\": 1 }";
        LoadPlan plan = LiftBarge.plan(ballasted, LiftBarge.HALF_FULL, soon, next);
        assertThat(plan.warnings()).anyMatch(sentence -> sentence.contains("before event 2 takes"));
    }

    @Test
    void ballastThatIsNoSeaWaterIsAFaultOfTheStart() {
        String salt =
                LiftBarge.HALF_FULL.replace("\"P2\", \"fraction\": 0.5", "\"P2\", \"fraction\": 0.5, \"density\": 1.1");
        FaultyDocumentException thrown =
                catchThrowableOfType(FaultyDocumentException.class, () -> LiftBarge.plan(ballasted, salt, CRATE));
        assertThat(thrown).isNotNull();
        assertThat(thrown.faults()).extracting(Fault::pointer).containsExactly("/start/fills/1/density");
    }

    @Test
    void theSameQuestionHasTheSamePlan() {
        LoadPlan first = LiftBarge.plan(ballasted, LiftBarge.HALF_FULL, CRATE, LIFT);
        assertThat(LiftBarge.plan(ballasted, LiftBarge.HALF_FULL, CRATE, LIFT)).isEqualTo(first);
    }
}
