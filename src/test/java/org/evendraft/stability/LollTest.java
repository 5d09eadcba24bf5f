package org.evendraft.stability;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Locale;
import org.evendraft.geometry.Vec3;
import org.evendraft.platform.Body;
import org.evendraft.platform.FaultyDocumentException;
import org.evendraft.platform.PreparedPlatform;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * Platforms that do not float upright. Angle of loll of a wall-sided hull, tan = √(−2·GM/BM): Derrett and Barrass, Ship Stability
 * for Masters and Mates, 5th ed. 1999, pp. 228-229.
 */
class LollTest {
    private static ConditionResult evaluate(PreparedPlatform platform) {
        return Evaluation.evaluate(platform, Floaters.condition(List.of(), List.of()));
    }

    /** A box 60 × 12 m at 4 m has KM 5 m and BM 3 m. */
    @ParameterizedTest
    @CsvSource({"5.001", "5.02", "5.1", "5.25", "5.5"})
    void aBoxLollsToStarboardByTheWallSidedAngle(double kg) {
        ConditionResult result = evaluate(Floaters.bargeAt(60, 12, 12, 4, kg));
        double loll = Math.toDegrees(Math.atan(Math.sqrt(-2 * (5 - kg) / 3)));
        assertThat(result.gm().transverse().corrected()).isCloseTo(5 - kg, within(1e-9));
        assertThat(result.floating().heelAngle()).isCloseTo(loll, within(1e-4));
        assertThat(result.floating().trimAngle()).isCloseTo(0, within(1e-6));
        assertThat(result.floating().upright()).isFalse();
        assertThat(result.floating().stable()).isTrue();
        assertThat(result.estimate().heelAngle()).isNull();
        assertThat(result.estimate().trimAngle()).isCloseTo(0.0, within(1e-9));
        assertThat(result.warnings())
                .anyMatch(
                        w -> w.contains("angle of loll") && w.contains(String.format(Locale.ROOT, "heel %.2f°", loll)))
                .anyMatch(w -> w.contains("No estimate of heel"));
    }

    /** The same box turned by a quarter trims instead; of its twins the one with the bow down is given. */
    @Test
    void aBoxWeakLengthwiseTrimsBowDown() {
        ConditionResult result = evaluate(Floaters.bargeAt(12, 60, 12, 4, 5.1));
        assertThat(result.floating().trimAngle())
                .isCloseTo(Math.toDegrees(Math.atan(Math.sqrt(0.2 / 3))), within(1e-4));
        assertThat(result.floating().heelAngle()).isCloseTo(0, within(1e-6));
        assertThat(result.gm().least().azimuth()).isCloseTo(90, within(1e-6));
        assertThat(result.estimate().trimAngle()).isNull();
    }

    /** A small weight to port settles which of the two positions is the lower. */
    @Test
    void aWeightOffTheCentrelineDecidesTheSide() {
        Body hull = Floaters.box("hull", -30, 30, -6, 6, 0, 12);
        double mass = 1.025 * 60 * 12 * 4;
        ConditionResult port = evaluate(Floaters.platform(List.of(hull), mass, new Vec3(0, 0.001, 5.1), List.of()));
        assertThat(port.floating().heelAngle()).isLessThan(-14);
        ConditionResult starboard =
                evaluate(Floaters.platform(List.of(hull), mass, new Vec3(0, -0.001, 5.1), List.of()));
        assertThat(starboard.floating().heelAngle()).isCloseTo(-port.floating().heelAngle(), within(1e-6));
    }

    /** Just as weak about every axis, a round column lies equally well on all sides: starboard down is given, with no trim. */
    @ParameterizedTest
    @ValueSource(doubles = {0.01, 0.05, 0.2})
    void aRoundColumnLollsToStarboard(double lack) {
        double d = 20;
        double draft = 10;
        // KM = T/2 + D²/(16T), BM = D²/(16T).
        double bm = d * d / (16 * draft);
        double kg = draft / 2 + bm + lack;
        List<Body> hull = List.of(Floaters.cylinder("column", Vec3.ZERO, new Vec3(0, 0, 20), d));
        double mass = 1.025 * Math.PI * d * d / 4 * draft;
        ConditionResult result = evaluate(Floaters.platform(hull, mass, new Vec3(0, 0, kg), List.of()));
        double loll = Math.toDegrees(Math.atan(Math.sqrt(2 * lack / bm)));
        assertThat(result.floating().heelAngle()).isCloseTo(loll, within(0.01));
        assertThat(result.floating().trimAngle()).isCloseTo(0, within(0.01));
        assertThat(result.floating().stable()).isTrue();
    }

    /** OC4-DeepCwind's columns (NREL/TP-5000-60601) are as stiff about every axis: BM 10.65984 m, wall-sided to 21.2°. */
    @ParameterizedTest
    @ValueSource(doubles = {0.05, 0.3})
    void threeColumnsLollByTheWallSidedAngle(double lack) {
        double kg = 20 - 9.894 + 7.40037 + lack;
        double mass = 1.025 * 13_556.7577;
        ConditionResult result = evaluate(Floaters.platform(Floaters.oc4(false), mass, new Vec3(0, 0, kg), List.of()));
        double h = Math.tan(Math.toRadians(result.floating().heelAngle()));
        double t = Math.tan(Math.toRadians(result.floating().trimAngle()));
        assertThat(Math.hypot(h, t)).isCloseTo(Math.sqrt(2 * lack / 10.65984), within(1e-3));
        assertThat(result.floating().stable()).isTrue();
    }

    /** With GM 0 a wall-sided box rests upright within what 1e-9 m of arm can tell: BM·tan³/2 under 1e-9 m. */
    @ParameterizedTest
    @ValueSource(doubles = {0, 1e-12, -1e-12, 1e-9, -1e-9, 1e-6, -1e-6})
    void nearlyNoGmIsNoMoreThanNearlyUpright(double gm) {
        ConditionResult result = evaluate(Floaters.bargeAt(60, 12, 12, 4, 5 - gm));
        double loll = Math.toDegrees(Math.atan(Math.sqrt(Math.max(0, -2 * gm) / 3)));
        assertThat(result.floating().heelAngle()).isCloseTo(loll, within(0.1));
        assertThat(result.floating().displacedVolume()).isCloseTo(2880, within(1e-6));
    }

    @Test
    void aPlatformHeavierThanItsHullSinks() {
        assertThatThrownBy(() -> evaluate(Floaters.bargeAt(60, 12, 8, 8.001, 4)))
                .isInstanceOf(FaultyDocumentException.class)
                .hasMessageContaining("sinks");
        LoadedPlatform loaded =
                LoadedPlatform.of(Floaters.bargeAt(60, 12, 8, 8.001, 4), Floaters.condition(List.of(), List.of()));
        assertThat(loaded.floatingPosition()).isInstanceOfSatisfying(Equilibrium.Sinks.class, sinks -> {
            assertThat(sinks.mass()).isCloseTo(1.025 * 60 * 12 * 8.001, within(1e-6));
            assertThat(sinks.buoyancy()).isCloseTo(1.025 * 60 * 12 * 8, within(1e-6));
        });
        assertThatThrownBy(loaded::evenKeel).isInstanceOf(IllegalStateException.class);
    }

    /** A wall on edge, or a weight far outside the waterline, finds no rest before 60°. */
    @Test
    void aPlatformWithoutAPositionWithinSixtyDegreesCapsizes() {
        assertThatThrownBy(() -> evaluate(Floaters.bargeAt(60, 6, 30, 15, 20)))
                .isInstanceOf(FaultyDocumentException.class)
                .hasMessageContaining("capsizes");
        Body hull = Floaters.box("hull", -30, 30, -6, 6, 0, 8);
        PreparedPlatform lopsided =
                Floaters.platform(List.of(hull), 1.025 * 60 * 12 * 4, new Vec3(0, 5.9, 4), List.of());
        assertThatThrownBy(() -> evaluate(lopsided))
                .isInstanceOf(FaultyDocumentException.class)
                .hasMessageContaining("capsizes");
    }
}
