package org.evendraft.stability;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.evendraft.geometry.Vec3;
import org.evendraft.platform.Condition;
import org.evendraft.platform.Condition.FreeSurface;
import org.evendraft.platform.Fill;
import org.evendraft.platform.PreparedPlatform;
import org.evendraft.platform.Purpose;
import org.evendraft.platform.Tank;
import org.evendraft.stability.ConditionResult.TankResult;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;

/** States of tanks and what each lets its liquid do: the definitions of the domain, closed forms of boxes and lying cylinders. */
class TankStatesTest {
    private static final double SEA = 1.025;
    private static final double FULL = 20 * 12 * 5 * 0.95;

    private static final Tank BOX = new Tank(
            "T",
            "T",
            Purpose.BALLAST,
            SEA,
            List.of(Floaters.box("T", -10, 10, -6, 6, 1, 6)),
            List.of(),
            0.95,
            0.98,
            0.01,
            0.9,
            false);

    private static LoadedPlatform loaded(Tank tank, double volume, FreeSurface freeSurface) {
        PreparedPlatform platform = Floaters.platform(
                List.of(Floaters.box("hull", -50, 50, -15, 15, 0, 16)), 18_000, new Vec3(0, -0.2, 7), List.of(tank));
        List<Fill> fills = List.of(new Fill(tank.id(), volume, SEA));
        return LoadedPlatform.of(platform, new Condition("test", Optional.empty(), SEA, freeSurface, fills, List.of()));
    }

    private static ConditionResult evaluate(Tank tank, double volume, FreeSurface freeSurface) {
        LoadedPlatform loaded = loaded(tank, volume, freeSurface);
        List<Fill> fills = List.of(new Fill(tank.id(), volume, SEA));
        return Evaluation.evaluate(
                loaded.prepared(), new Condition("test", Optional.empty(), SEA, freeSurface, fills, List.of()));
    }

    @ParameterizedTest
    @CsvSource({
        "0, EMPTY",
        "0.9e-9, EMPTY",
        "1.1e-9, SLACK",
        "0.5, SLACK",
        "0.9799, SLACK",
        "0.98, PRESSED_UP",
        "0.99, PRESSED_UP",
        "1, PRESSED_UP"
    })
    void aTankIsEmptySlackOrPressedUpByItsFraction(double fraction, TankState state) {
        TankResult tank =
                evaluate(BOX, FULL * fraction, FreeSurface.ACTUAL).tanks().get(0);
        assertThat(tank.state()).isEqualTo(state);
        assertThat(tank.fraction()).isCloseTo(fraction, within(1e-12));
        assertThat(tank.mass()).isCloseTo(FULL * fraction * SEA, within(1e-9));
        // Permeability counts in the surface as in the volume.
        double moment = state == TankState.SLACK ? SEA * 0.95 * 20 * 1728 / 12 : 0;
        assertThat(tank.freeSurfaceMomentT()).isCloseTo(moment, within(1e-6));
        double lengthwise = state == TankState.SLACK ? SEA * 0.95 * 12 * 8000 / 12 : 0;
        assertThat(tank.freeSurfaceMomentL()).isCloseTo(lengthwise, within(1e-6));
    }

    @ParameterizedTest
    @CsvSource({"0.25, 1.25, 1.625", "0.5, 2.5, 2.25", "0.9, 4.5, 3.25"})
    void levelAndCentreFollowFromTheVolume(double fraction, double level, double z) {
        TankResult tank =
                evaluate(BOX, FULL * fraction, FreeSurface.ACTUAL).tanks().get(0);
        assertThat(tank.level()).isCloseTo(level, within(1e-9));
        assertThat(tank.centre().z()).isCloseTo(z, within(1e-9));
        assertThat(tank.volume()).isCloseTo(FULL * fraction, within(1e-9));
    }

    /** Liquid that is pressed up does not move: the platform heels as with a solid weight. */
    @Test
    void pressedUpLiquidIsFixed() {
        ConditionResult pressed = evaluate(BOX, FULL * 0.985, FreeSurface.ACTUAL);
        assertThat(pressed.gm().transverse().freeSurfaceCorrection()).isZero();
        double gm = pressed.gm().transverse().solid();
        double bm = pressed.km().transverse() - pressed.floating().draft() / 2;
        double t = Math.tan(Math.toRadians(pressed.floating().heelAngle()));
        // Wall-sided rule with G fixed.
        assertThat((gm + bm * t * t / 2) * t)
                .isCloseTo(-pressed.centreOfGravity().y(), within(1e-6));
        ConditionResult slack = evaluate(BOX, FULL * 0.975, FreeSurface.ACTUAL);
        assertThat(slack.floating().heelAngle())
                .isGreaterThan(pressed.floating().heelAngle() + 0.01);
    }

    /** A lying cylinder's surface is broadest at half depth; asked for the maximum, a slack tank counts that at every level. */
    @ParameterizedTest
    @CsvSource({"0.1", "0.5", "0.9"})
    void theGreatestFreeSurfaceCountsWhereItIsAskedFor(double fraction) {
        Tank lying = Floaters.tank("C", Floaters.cylinder("C", new Vec3(-10, 0, 4), new Vec3(10, 0, 4), 6));
        double volume = Math.PI * 9 * 20 * fraction;
        double greatest = SEA * 20 * 216 / 12;
        TankResult maximum =
                evaluate(lying, volume, FreeSurface.MAXIMUM).tanks().get(0);
        assertThat(maximum.freeSurfaceMomentT()).isCloseTo(greatest, within(1e-3 * greatest));
        TankResult actual = evaluate(lying, volume, FreeSurface.ACTUAL).tanks().get(0);
        if (fraction == 0.5) {
            assertThat(actual.freeSurfaceMomentT()).isCloseTo(greatest, within(1e-4 * greatest));
        } else {
            assertThat(actual.freeSurfaceMomentT()).isLessThan(0.8 * greatest);
        }
    }

    /** The greatest free surface is for the correction; in the exact position the liquid lies as it does. */
    @Test
    void countingTheGreatestFreeSurfaceLeavesTheExactPosition() {
        Tank lying = Floaters.tank("C", Floaters.cylinder("C", new Vec3(-10, 0, 4), new Vec3(10, 0, 4), 6));
        ConditionResult actual = evaluate(lying, 60, FreeSurface.ACTUAL);
        ConditionResult maximum = evaluate(lying, 60, FreeSurface.MAXIMUM);
        assertThat(maximum.floating()).isEqualTo(actual.floating());
        assertThat(maximum.gm().transverse().solid())
                .isEqualTo(actual.gm().transverse().solid());
        assertThat(maximum.gm().transverse().corrected())
                .isLessThan(actual.gm().transverse().corrected());
    }

    @ParameterizedTest
    @EnumSource(FreeSurface.class)
    void emptyAndPressedUpTanksHaveNoFreeSurfaceHoweverItIsCounted(FreeSurface which) {
        for (double fraction : new double[] {0, 0.99, 1}) {
            ConditionResult result = evaluate(BOX, FULL * fraction, which);
            assertThat(result.gm().transverse().freeSurfaceCorrection()).isZero();
            assertThat(result.gm().longitudinal().freeSurfaceCorrection()).isZero();
        }
    }

    @Test
    void aTankOverItsGreatestFractionIsWarnedOf() {
        assertThat(evaluate(BOX, FULL * 0.95, FreeSurface.ACTUAL).warnings())
                .anyMatch(w -> w.contains("Tank T is filled to 95.0 %, over its greatest allowed 90.0 %"));
        assertThat(evaluate(BOX, FULL * 0.9, FreeSurface.ACTUAL).warnings()).noneMatch(w -> w.contains("Tank T"));
    }

    /** 0.98 of a volume in decimals is seldom 0.98 in binary: a billionth under it is still pressed up, a millionth is not. */
    @Test
    void roundingDoesNotMakeAPressedUpTankSlack() {
        assertThat(TankState.of(Math.nextDown(0.98), 0.98)).isEqualTo(TankState.PRESSED_UP);
        assertThat(TankState.of(Math.nextDown(1.0), 1)).isEqualTo(TankState.PRESSED_UP);
        assertThat(TankState.of(0.98 - 1e-6, 0.98)).isEqualTo(TankState.SLACK);
    }

    /** A tank that a pump works on counts as slack up to its brim, and not when empty. */
    @Test
    void aTankBeingMovedIsSlackWhateverItsLevel() {
        double moment = SEA * 0.95 * 20 * 1728 / 12;
        LoadedPlatform full = loaded(BOX, FULL * 0.99, FreeSurface.ACTUAL);
        assertThat(full.evenKeel().gm().transverse().freeSurfaceCorrection()).isZero();
        LoadedPlatform moving = full.withMoving(Set.of("T"));
        assertThat(moving.evenKeel().gm().transverse().freeSurfaceCorrection())
                .isCloseTo(moment / full.mass(), within(1e-9));
        assertThat(moving.withMoving(Set.of()).evenKeel()).isEqualTo(full.evenKeel());
        LoadedPlatform empty = loaded(BOX, 0, FreeSurface.ACTUAL).withMoving(Set.of("T"));
        assertThat(empty.evenKeel().gm().transverse().freeSurfaceCorrection()).isZero();
    }

    /** Other contents give what a condition with those contents gives; an empty tank takes sea water. */
    @Test
    void otherContentsAreThoseOfAnotherCondition() {
        LoadedPlatform half = loaded(BOX, FULL / 2, FreeSurface.ACTUAL);
        LoadedPlatform quarter = loaded(BOX, FULL / 4, FreeSurface.ACTUAL);
        LoadedPlatform byVolume = half.withVolumes(Map.of("T", FULL / 4));
        LoadedPlatform byFill = half.withFills(List.of(new Fill("T", FULL / 4, SEA)));
        LoadedPlatform fromEmpty = loaded(BOX, 0, FreeSurface.ACTUAL).withVolumes(Map.of("T", FULL / 4));
        for (LoadedPlatform other : List.of(byVolume, byFill, fromEmpty)) {
            assertThat(other.mass()).isCloseTo(quarter.mass(), within(1e-9));
            assertThat(other.evenKeel()).isEqualTo(quarter.evenKeel());
            assertThat(other.floatingPosition()).isEqualTo(quarter.floatingPosition());
        }
    }
}
