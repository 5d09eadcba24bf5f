package org.evendraft.stability;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.evendraft.geometry.Vec3;
import org.evendraft.platform.WindageElement;
import org.evendraft.stability.WindForce.Contribution;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Wind force by hand: IMO MODU Code 2009, 3.2.3 to 3.2.8; tables of 46 CFR 174.055, which has the same figures. */
class WindTest {
    private static final Vec3 STARBOARD = new Vec3(0, -1, 0);
    /** Sums of a few products in double precision. */
    private static final double EXACT = 1e-12;

    private static Inclination upright() {
        return Inclination.upright(new JudgedBarge().loaded());
    }

    private static WindForce onPlate(double height, double area, double shape, double speed) {
        double middle = JudgedBarge.DRAFT + height;
        WindageElement plate = new WindageElement("plate", 0, 0, middle - 0.1, middle + 0.1, 0, area, 0, shape);
        return new Wind(List.of(plate)).on(upright(), STARBOARD, speed);
    }

    /** 46 CFR table 174.055(a), heights in the middle of each interval; the last bound as IMO has it (from memory), 259 m. */
    @ParameterizedTest
    @CsvSource({
        "7, 1.00", "23, 1.10", "38, 1.20", "53, 1.30", "68, 1.37", "83, 1.43", "99, 1.48", "114, 1.52", "130, 1.56",
        "145, 1.60", "160, 1.63", "175, 1.67", "190, 1.70", "205, 1.72", "221, 1.75", "236, 1.77", "251, 1.79",
                "300, 1.80"
    })
    void eachHeightHasItsCoefficient(double height, double coefficient) {
        WindForce wind = onPlate(height, 100, 1, 36);
        double byHand = 0.5 * 1.0 * coefficient * 1.222 * 36 * 36 * 100 / 1000;
        assertThat(wind.force()).isCloseTo(byHand, within(EXACT * byHand));
        assertThat(wind.contributions().get(0).heightCoefficient()).isEqualTo(coefficient);
    }

    /** 46 CFR table 174.055(b): cylinders, deckhouses, clusters, derricks, girders, isolated shapes; and its formula with k = 0.0623 kgf·s²/m⁴. */
    @ParameterizedTest
    @CsvSource({"0.5", "1.0", "1.1", "1.25", "1.3", "1.5"})
    void forceAgreesWithTheFormulaOfTheUsRules(double shape) {
        double usRule = 0.0623 * 51.5 * 51.5 * shape * 1.1 * 80 * 9.80665 / 1000;
        // 0.0623 stands for 0.0623045: the constant itself has three digits.
        assertThat(onPlate(20, 80, shape, 51.5).force()).isCloseTo(usRule, within(2e-4 * usRule));
    }

    /** Pressures of ½·1.222·V², computed: 406.7, 791.9 and 1620.5 Pa at the Code's speeds (MODU Code 3.2.4, 3.4.3). */
    @ParameterizedTest
    @CsvSource({"25.8, 406.7", "36.0, 791.9", "51.5, 1620.5"})
    void basicPressuresAreTheCodes(double speed, double pascal) {
        assertThat(onPlate(5, 1, 1, speed).force() * 1000).isCloseTo(pascal, within(0.05));
    }

    /** By hand: a wall of 20 m from 10 to 20 m over the water is split at 15.3 m into 5.3 m of C_H 1.0 and 4.7 m of C_H 1.1. */
    @Test
    void elementIsSplitAtTheHeightBands() {
        WindageElement wall = new WindageElement("wall", 0, 0, 15, 25, 0, 200, 0, 1);
        WindForce wind = new Wind(List.of(wall)).on(upright(), STARBOARD, 36);
        double pressure = 0.5 * 1.222e-3 * 36 * 36;
        double low = pressure * 5.3 * 20;
        double high = pressure * 4.7 * 20 * 1.1;
        assertThat(wind.contributions()).extracting(Contribution::from).containsExactly(10.0, 15.3);
        assertThat(wind.contributions()).extracting(Contribution::to).containsExactly(15.3, 20.0);
        assertThat(wind.force()).isCloseTo(low + high, within(EXACT * 1000));
        // Levers from B, 2.5 m under the water, to the middles at 12.65 and 17.65 m.
        double moment = low * (12.65 + 2.5) + high * (17.65 + 2.5);
        assertThat(wind.moment()).isCloseTo(moment, within(1e-9 * moment));
        assertThat(wind.arm()).isCloseTo(moment / (10_250 * 9.80665), within(1e-9));
        assertThat(wind.resistanceDepth()).isCloseTo(2.5, within(1e-9));
    }

    @Test
    void whatLiesUnderWaterIsNotInTheWind() {
        WindageElement column = new WindageElement("column", 0, 0, 0, 20, 300, 400, 0, 1);
        WindForce wind = new Wind(List.of(column)).on(upright(), STARBOARD, 36);
        assertThat(wind.contributions()).hasSize(1);
        assertThat(wind.contributions().get(0).area()).isCloseTo(300, within(1e-9));
        assertThat(wind.contributions().get(0).from()).isZero();
    }

    /** A block shows areaX·|cos| + areaY·|sin| to a wind between x and y. */
    @ParameterizedTest
    @CsvSource({"0, 40", "90, 30", "180, 40", "30, 49.641016", "135, 49.497475"})
    void areaShownFollowsTheAzimuthOfTheAxis(double azimuth, double area) {
        Inclination at = upright();
        WindageElement block = new WindageElement("block", 0, 0, 10, 14, 30, 40, 0, 1);
        Vec3 leeward = new HeelPath(Math.toRadians(azimuth), true).leeward(at);
        assertThat(leeward.x()).isCloseTo(Math.sin(Math.toRadians(azimuth)), within(1e-12));
        assertThat(leeward.y()).isCloseTo(-Math.cos(Math.toRadians(azimuth)), within(1e-12));
        Contribution only =
                new Wind(List.of(block)).on(at, leeward, 36).contributions().get(0);
        assertThat(only.area()).isCloseTo(area, within(1e-6));
    }

    /** Heeled by φ an upright wall shows A·cos φ and a deck's underside A·sin φ (projection). */
    @ParameterizedTest
    @CsvSource({"5", "15", "25"})
    void inclinationShrinksWallsAndExposesUndersides(double degrees) {
        JudgedBarge barge = new JudgedBarge().house(12, 16, 0, 100, 0).house(11, 11.2, 0, 0, 500);
        RightingArms arms = RightingArms.fromUpright(barge.loaded(), RightingCurve.Request.usual(0));
        Inclination at = arms.at(Math.toRadians(degrees));
        WindForce wind = new Wind(barge.windage).on(at, arms.leeward(at), 36);
        double phi = Math.toRadians(degrees);
        assertThat(wind.contributions().get(0).area()).isCloseTo(100 * Math.cos(phi), within(1e-9));
        assertThat(wind.contributions().get(1).area()).isCloseTo(500 * Math.sin(phi), within(1e-9));
        assertThat(wind.contributions().get(0).from()).isCloseTo(7 * Math.cos(phi), within(1e-9));
        assertThat(wind.resistanceDepth()).isCloseTo(JudgedBarge.depthOfB(phi), within(1e-8));
    }
}
