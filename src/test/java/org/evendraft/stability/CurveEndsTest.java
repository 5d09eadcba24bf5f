package org.evendraft.stability;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Objects;
import java.util.Optional;
import java.util.OptionalDouble;
import org.evendraft.geometry.Vec3;
import org.evendraft.platform.Criterion;
import org.evendraft.platform.Criterion.LimitAngle;
import org.evendraft.platform.Criterion.Measure;
import org.evendraft.platform.Load;
import org.evendraft.platform.Opening.Closing;
import org.evendraft.platform.Situation;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Curves that end where the trim loses its rest, begin before upright, or pass openings that are dry where the platform rests. */
class CurveEndsTest {
    private static RightingCurve.Request about(double azimuth, double step) {
        return new RightingCurve.Request(azimuth, 60, step, true, LiquidTreatment.FREE);
    }

    private static Finding judge(
            LoadedPlatform loaded, double azimuth, Measure measure, double wind, LimitAngle limit) {
        Criterion criterion = new JudgedBarge()
                .criterion(Situation.INTACT, measure, 1, wind, limit)
                .criteria
                .get(0);
        Equilibrium.Afloat afloat = Evaluation.afloat(loaded);
        RightingArms arms = RightingArms.fromRest(loaded, about(azimuth, 2), Slopes.of(afloat.waterplane()));
        return AxisJudge.findings(List.of(criterion), arms, loaded.prepared().platform(), OptionalDouble.empty())
                .get(0);
    }

    /** A barge that a load heels to port: m·y = Δ·GZ of the wall-sided formula at the angle asked for. */
    private static LoadedPlatform listing(JudgedBarge barge, double degreesToPort) {
        double phi = Math.toRadians(degreesToPort);
        double mass = 500;
        double kg = (JudgedBarge.MASS * barge.kg + mass * 10) / (JudgedBarge.MASS + mass);
        double draft = DRAFT_WITH_LOAD;
        double bm = 20.0 * 20 / 12 / draft;
        double gz = Math.sin(phi) * (draft / 2 + bm - kg + bm / 2 * Math.pow(Math.tan(phi), 2));
        double y = gz * (JudgedBarge.MASS + mass) / mass / Math.cos(phi);
        Load load = new Load(
                "load", Load.Kind.VARIABLE, Optional.empty(), mass, new Vec3(0, y, 10), OptionalDouble.empty());
        return LoadedPlatform.of(barge.prepared(), Floaters.condition(List.of(), List.of(load)));
    }

    private static final double DRAFT_WITH_LOAD = (JudgedBarge.MASS + 500) / 1.025 / 2000;

    /** The end does not depend on the step asked for: it is found to a hundredth of a degree. */
    @ParameterizedTest
    @ValueSource(doubles = {0.5, 1, 2, 5})
    void theEndOfACurveIsFoundWhateverTheStep(double step) {
        LoadedPlatform barge = new JudgedBarge().loaded();
        double end = RightingArms.fromUpright(barge, about(90, step)).endRad();
        double fine = RightingArms.fromUpright(barge, about(90, 0.1)).endRad();
        assertThat(Math.toDegrees(fine)).isBetween(1.0, 50.0);
        assertThat(Math.toDegrees(end)).isCloseTo(Math.toDegrees(fine), within(0.03));
    }

    /** With a list to port, starboard-down curves begin before upright and the rest is at the negative angle, exactly. */
    @Test
    void restBeforeUprightIsFound() {
        LoadedPlatform loaded = listing(new JudgedBarge(), 6);
        assertThat(Evaluation.afloat(loaded).waterplane().heelAngle()).isCloseTo(-6, within(1e-3));
        RightingArms arms = RightingArms.fromRest(
                loaded, about(0, 2), Slopes.of(Evaluation.afloat(loaded).waterplane()));
        assertThat(Math.toDegrees(arms.rest(at -> 0).orElseThrow())).isCloseTo(-6, within(1e-3));
        Finding inclination = judge(loaded, 0, Measure.INCLINATION, 0, LimitAngle.LESSER);
        assertThat(inclination.value().orElseThrow()).isCloseTo(6, within(1e-3));
    }

    /** An opening on the low side that is dry at rest, though wet before it: what comes after the rest counts. */
    @Test
    void openingDryAtRestIsNotMetBeforeIt() {
        JudgedBarge barge = new JudgedBarge().opening("port vent", 10, 6.6, Closing.NONE);
        LoadedPlatform loaded = listing(barge, 6);
        Finding height = judge(loaded, 0, Measure.OPENING_HEIGHT, 0, LimitAngle.LESSER);
        assertThat(height.value().orElseThrow()).isBetween(0.1, 0.5);
        Finding range = judge(loaded, 0, Measure.RANGE, 0, LimitAngle.LESSER);
        assertThat(range.value().orElseThrow()).isGreaterThan(20);
        assertThat(range.note()).doesNotContain("port vent");
        Finding toPort = judge(loaded, 180, Measure.RANGE, 0, LimitAngle.LESSER);
        assertThat(toPort.value().orElseThrow()).isBetween(0.1, 5.0);
        assertThat(toPort.note()).contains("port vent");
    }

    /** What needs only the rest is judged about every axis of a platform that floats, also where upright has none. */
    @Test
    void whatNeedsOnlyTheRestIsJudgedAboutEveryAxis() {
        JudgedBarge barge =
                new JudgedBarge().compartment("corner", 20, 50, -10, 0, 0.9).opening("vent", 0, 10, Closing.NONE);
        LoadedPlatform damaged = barge.loaded().withFlooded(List.of("corner"));
        double own = Math.toDegrees(
                Slopes.of(Evaluation.afloat(damaged).waterplane()).inclination());
        for (double azimuth : AllAround.azimuths()) {
            Finding found = judge(damaged, azimuth, Measure.INCLINATION, 0, LimitAngle.LESSER);
            assertThat(found.value().orElse(Double.NaN)).as("axis %s°", azimuth).isCloseTo(own, within(1e-4));
        }
    }

    /** Without anything in the wind the arms are not judged by it, and a wind beyond all arms breaks them. */
    @Test
    void leastArmNeedsAWindThatThePlatformWithstands() {
        LoadedPlatform bare = new JudgedBarge().loaded();
        Finding windless = judge(bare, 0, Measure.LEAST_ARM, 40, LimitAngle.LESSER);
        assertThat(windless.value()).isEmpty();
        assertThat(windless.broken()).isFalse();
        LoadedPlatform sail = new JudgedBarge().house(11, 15, 0, 60_000, 0).loaded();
        assertThat(judge(sail, 0, Measure.LEAST_ARM, 60, LimitAngle.LESSER).broken())
                .isTrue();
    }

    /** A wall seen only from the side meets no wind about the transverse axis: ratios are not judged there, and never infinite. */
    @Test
    void noHeelingMomentAboutAnAxisIsNotJudged() {
        LoadedPlatform barge = new JudgedBarge().house(11, 15, 0, 500, 0).loaded();
        for (Measure measure : List.of(Measure.AREA_RATIO, Measure.ARM_RATIO)) {
            Finding found = judge(barge, 90, measure, 40, LimitAngle.LESSER);
            assertThat(found.value()).as(measure.name()).isEmpty();
            assertThat(found.note()).as(measure.name()).contains("no heeling moment");
        }
    }

    /** Nothing judged is neither met nor broken. */
    @Test
    void nothingJudgedIsNotMet() {
        JudgedBarge bare =
                new JudgedBarge().criterion(Situation.INTACT, Measure.AREA_RATIO, 1.3, 40, LimitAngle.LESSER);
        LoadedPlatform loaded = bare.loaded();
        CriteriaAnswer answer =
                CriteriaAnswer.of(loaded, Evaluation.afloat(loaded), Optional.empty(), OptionalDouble.of(40));
        assertThat(answer.met()).isNull();
        assertThat(answer.notJudged()).containsExactly("AREA_RATIO");
        DamageSurvey survey = DamageSurvey.of(
                loaded,
                new DamageSurvey.Question(List.of(), List.of(), List.of()),
                OptionalDouble.empty(),
                Progress.UNWATCHED);
        assertThat(survey.survived()).isNull();
    }

    /** Limits of KG hold below as well: at no lower KG of a row of them is a criterion broken. */
    @Test
    void greatestKgHoldsBelowAsWell() {
        JudgedBarge barge = new JudgedBarge()
                .house(11, 25, 300, 1500, 0)
                .opening("vent", -10, 9, Closing.NONE)
                .criterion(Situation.INTACT, Measure.AREA_RATIO, 1.4, 40, LimitAngle.LESSER)
                .criterion(Situation.INTACT, Measure.INCLINATION, 12, 40, LimitAngle.LESSER);
        KgRequest request = new KgRequest(
                JudgedBarge.mode(OptionalDouble.of(40)),
                List.of(3.0, 5.0),
                OptionalDouble.empty(),
                1.025,
                OptionalDouble.empty(),
                List.of());
        for (KgLimit limit : AllowableKgCurve.find(barge.prepared(), request, Progress.UNWATCHED)) {
            double kg = Objects.requireNonNull(limit.allowableKg());
            for (double part : new double[] {1, 0.97, 0.85, 0.66}) {
                LoadedPlatform at = LoadedPlatform.upright(barge.prepared(), 1.025, limit.draft(), part * kg);
                for (double azimuth : AllAround.azimuths()) {
                    List<Finding> findings =
                            new AllAround(at, Slopes.LEVEL, OptionalDouble.of(40)).findings(barge.criteria, azimuth);
                    for (int i = 0; i < findings.size(); i++) {
                        assertThat(findings.get(i).isKept(barge.criteria.get(i)))
                                .as(
                                        "%s at KG %s, axis %s°",
                                        barge.criteria.get(i).name(), part * kg, azimuth)
                                .isTrue();
                    }
                }
            }
        }
    }

    /** Between drafts the straight line is held to the truth within what was asked for. */
    @Test
    void draftsArePutWhereTheStraightLineAllowsTooMuch() {
        JudgedBarge barge = new JudgedBarge().criterion(Situation.INTACT, Measure.LEAST_GM, 0.05, 0, LimitAngle.LESSER);
        KgRequest request = new KgRequest(
                JudgedBarge.mode(OptionalDouble.of(0)),
                List.of(4.0, 8.0),
                OptionalDouble.empty(),
                1.025,
                OptionalDouble.of(0.05),
                List.of());
        List<KgLimit> limits = AllowableKgCurve.find(barge.prepared(), request, Progress.UNWATCHED);
        assertThat(limits).hasSizeGreaterThan(2);
        for (int i = 1; i < limits.size(); i++) {
            double draft = (limits.get(i - 1).draft() + limits.get(i).draft()) / 2;
            double chord = (Objects.requireNonNull(limits.get(i - 1).allowableKg())
                            + Objects.requireNonNull(limits.get(i).allowableKg()))
                    / 2;
            // KM of the wall-sided box: T/2 + B²/(12·T)
            double truth = draft / 2 + 400 / (12 * draft) - 0.05;
            assertThat(chord - truth).as("at %s m", draft).isLessThanOrEqualTo(0.05);
        }
    }
}
