package org.evendraft.stability;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Objects;
import java.util.OptionalDouble;
import java.util.function.DoubleUnaryOperator;
import org.apache.commons.math3.analysis.integration.SimpsonIntegrator;
import org.apache.commons.math3.analysis.solvers.BrentSolver;
import org.evendraft.platform.Criterion;
import org.evendraft.platform.Criterion.LimitAngle;
import org.evendraft.platform.Criterion.Measure;
import org.evendraft.platform.Opening.Closing;
import org.evendraft.platform.Situation;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/** Criteria on a wall-sided barge, where arms of righting and of wind have closed forms; areas by Commons Math's own quadrature. */
class AxisJudgeTest {
    private static final double SPEED = 60;
    private static final double AREA = 1200;
    private static final double MIDDLE = 13;
    /** An opening 3 m over the water at the starboard side, 10 m out: it meets the water at atan 0.3. */
    private static final double FLOODING = Math.atan(0.3);

    private static JudgedBarge barge() {
        return new JudgedBarge().house(11, 15, 0, AREA, 0).opening("vent", -10, 8, Closing.NONE);
    }

    private static Criterion criterion(Measure measure, double bound, LimitAngle limit) {
        return new JudgedBarge()
                .criterion(Situation.INTACT, measure, bound, SPEED, limit)
                .criteria
                .get(0);
    }

    private static Finding judge(JudgedBarge barge, Measure measure, LimitAngle limit) {
        RightingArms arms = RightingArms.fromUpright(barge.loaded(), RightingCurve.Request.usual(0));
        return new AxisJudge(new AxisStability(arms, barge.prepared().platform()), OptionalDouble.empty())
                .judge(criterion(measure, 1, limit));
    }

    private static double wind(double phi) {
        return JudgedBarge.windArm(SPEED, AREA, MIDDLE, phi);
    }

    private static double gz(double phi) {
        return JudgedBarge.gz(6, phi);
    }

    private static double integral(DoubleUnaryOperator f, double to) {
        return new SimpsonIntegrator(1e-12, 1e-12, 3, 60).integrate(1_000_000, f::applyAsDouble, 0, to);
    }

    private static double rest() {
        return new BrentSolver(1e-13).solve(200, phi -> gz(phi) - wind(phi), 0.001, FLOODING);
    }

    /** MODU Code 3.3.1.2: the areas up to the angle of downflooding. */
    @ParameterizedTest
    @EnumSource(names = {"DOWNFLOODING", "LESSER"})
    void areaRatioEndsAtTheOpening(LimitAngle limit) {
        Finding found = judge(barge(), Measure.AREA_RATIO, limit);
        double expected = integral(AxisJudgeTest::gz, FLOODING) / integral(AxisJudgeTest::wind, FLOODING);
        // Areas are good to 1e-5 m·rad a degree; these are of some 0.05 m·rad.
        assertThat(found.value().orElseThrow()).isCloseTo(expected, within(1e-3 * expected));
        assertThat(found.angle().orElseThrow()).isCloseTo(Math.toDegrees(FLOODING), within(1e-6));
        assertThat(found.note()).contains("vent");
    }

    @Test
    void areaRatioCanGoOnToTheSecondInterceptBeyondAnOpening() {
        JudgedBarge tender = barge();
        tender.kg = 7.5;
        Finding found = judge(tender, Measure.AREA_RATIO, LimitAngle.SECOND_INTERCEPT);
        assertThat(found.angle().orElseThrow()).isGreaterThan(Math.toDegrees(FLOODING) + 5);
        assertThat(found.note()).contains("second intercept");
    }

    @Test
    void inclinationIsThatOfTheFirstIntercept() {
        Finding found = judge(barge(), Measure.INCLINATION, LimitAngle.LESSER);
        assertThat(found.value().orElseThrow()).isCloseTo(Math.toDegrees(rest()), within(1e-6));
    }

    @Test
    void rangeGoesFromTheFirstInterceptToTheOpening() {
        Finding found = judge(barge(), Measure.RANGE, LimitAngle.LESSER);
        assertThat(found.value().orElseThrow()).isCloseTo(Math.toDegrees(FLOODING - rest()), within(1e-6));
    }

    /** On this barge righting grows faster than heeling up to the opening, so the greatest ratio is there. */
    @Test
    void armRatioIsTheGreatestWithinTheRange() {
        Finding found = judge(barge(), Measure.ARM_RATIO, LimitAngle.LESSER);
        assertThat(found.value().orElseThrow()).isCloseTo(gz(FLOODING) / wind(FLOODING), within(1e-6));
    }

    /** The water stands on the starboard side at 5 + 10·tan φ, seen square to it. */
    @Test
    void openingHeightIsOverTheWaterAtRestUnderTheWind() {
        Finding found = judge(barge(), Measure.OPENING_HEIGHT, LimitAngle.LESSER);
        double height = (8 - 5 - 10 * Math.tan(rest())) * Math.cos(rest());
        assertThat(found.value().orElseThrow()).isCloseTo(height, within(1e-7));
    }

    @Test
    void leastArmIsPositiveOnASoundBarge() {
        Finding found = judge(barge(), Measure.LEAST_ARM, LimitAngle.LESSER);
        assertThat(found.value().orElseThrow()).isCloseTo(gz(Math.toRadians(1)), within(1e-4));
    }

    /** GM = KM − 9.5 m < 0: up to the angle of loll, tan² = −2·GM/BM, the arms are negative (Derrett and Barrass, pp. 228–229). */
    @Test
    void leastArmIsNegativeShortOfTheAngleOfLoll() {
        JudgedBarge tender = barge();
        tender.kg = 9.5;
        Finding found = judge(tender, Measure.LEAST_ARM, LimitAngle.LESSER);
        double loll = Math.atan(Math.sqrt(-2 * (JudgedBarge.KM - 9.5) / JudgedBarge.BM));
        assertThat(found.value().orElseThrow()).isNegative();
        assertThat(found.angle().orElseThrow()).isBetween(0.0, Math.toDegrees(loll));
        assertThat(found.isKept(criterion(Measure.LEAST_ARM, 0, LimitAngle.LESSER)))
                .isFalse();
    }

    @Test
    void windBeyondAllArmsIsAFailureNotANumber() {
        JudgedBarge sail = new JudgedBarge().house(11, 15, 0, 60_000, 0);
        for (Measure measure : List.of(Measure.INCLINATION, Measure.RANGE, Measure.ARM_RATIO)) {
            Finding found = judge(sail, measure, LimitAngle.LESSER);
            assertThat(found.value()).as(measure.name()).isEmpty();
            assertThat(found.broken()).as(measure.name()).isTrue();
            assertThat(found.note()).as(measure.name()).contains("no rest");
        }
    }

    @Test
    void withoutWindageOrOpeningsWhatNeedsThemIsNotJudged() {
        JudgedBarge bare = new JudgedBarge();
        assertThat(judge(bare, Measure.AREA_RATIO, LimitAngle.LESSER).note()).contains("no windage");
        assertThat(judge(bare, Measure.ARM_RATIO, LimitAngle.LESSER).value()).isEmpty();
        Finding heights = judge(bare, Measure.OPENING_HEIGHT, LimitAngle.LESSER);
        assertThat(heights.note()).contains("no opening");
        assertThat(heights.isKept(criterion(Measure.OPENING_HEIGHT, 0, LimitAngle.LESSER)))
                .isTrue();
    }

    @Test
    void aWatertightOpeningDoesNotCountAndAWeathertightOneOnlyWhereItIsSaid() {
        JudgedBarge barge = new JudgedBarge()
                .house(11, 15, 0, AREA, 0)
                .opening("hatch", -10, 6, Closing.WATERTIGHT)
                .opening("door", -10, 7, Closing.WEATHERTIGHT)
                .opening("vent", -10, 8, Closing.NONE);
        AxisStability axis = new AxisStability(
                RightingArms.fromUpright(barge.loaded(), RightingCurve.Request.usual(0)),
                barge.prepared().platform());
        assertThat(axis.downflooding(Criterion.Openings.NOT_WEATHERTIGHT))
                .hasValueSatisfying(p -> assertThat(p.angleRad()).isCloseTo(Math.atan(0.3), within(1e-9)));
        assertThat(axis.downflooding(Criterion.Openings.NOT_WATERTIGHT))
                .hasValueSatisfying(p -> assertThat(p.angleRad()).isCloseTo(Math.atan(0.2), within(1e-9)));
    }

    /** Of all axes the one along the barge, starboard down, brings the opening at the starboard side nearest to the water. */
    @Test
    void theWorstAxisIsFoundAndNamed() {
        JudgedBarge barge = barge().criterion(Situation.INTACT, Measure.OPENING_HEIGHT, 1, SPEED, LimitAngle.LESSER);
        CriterionResult result = new AllAround(barge.loaded(), Slopes.LEVEL, OptionalDouble.empty())
                .results(barge.criteria, null)
                .get(0);
        double height = (3 - 10 * Math.tan(rest())) * Math.cos(rest());
        double azimuth = Objects.requireNonNull(result.azimuth());
        assertThat(Math.min(azimuth, 360 - azimuth)).isLessThan(1);
        assertThat(result.value()).isCloseTo(height, within(1e-4));
        assertThat(result.margin()).isCloseTo(Objects.requireNonNull(result.value()) - 1, within(1e-12));
        assertThat(result.windSpeed()).isEqualTo(SPEED);
    }

    @Test
    void criterionOfTheModesWindWithoutAModeIsNotJudged() {
        Criterion ofMode = new Criterion(
                "areaRatio",
                "test",
                Situation.INTACT,
                Measure.AREA_RATIO,
                1.3,
                OptionalDouble.empty(),
                LimitAngle.LESSER,
                Criterion.Openings.NOT_WEATHERTIGHT);
        Finding found = new AllAround(barge().loaded(), Slopes.LEVEL, OptionalDouble.empty())
                .findings(List.of(ofMode), 0)
                .get(0);
        CriterionResult result = found.result(ofMode, null, 0.0, OptionalDouble.empty());
        assertThat(result.met()).isNull();
        assertThat(result.note()).contains("no wind speed");
    }
}
