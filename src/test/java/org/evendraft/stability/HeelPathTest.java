package org.evendraft.stability;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import org.evendraft.geometry.Vec3;
import org.evendraft.platform.Fill;
import org.evendraft.platform.Tank;

/** The free trim on the way of a platform that is turned: the same whichever states it is foreseen from. */
class HeelPathTest {
    /** The trim is brought to rest within 1e-10 m of arm; metacentric heights here are metres. */
    private static final double SAME = 1e-9;

    private static LoadedPlatform loaded() {
        Tank tank = Floaters.tank("T", Floaters.box("T", 10, 40, 24, 36, 0, 8));
        return LoadedPlatform.of(
                Floaters.platform(Floaters.twinPontoon(), 27_000, new Vec3(-0.4, -0.9, 14), List.of(tank)),
                Floaters.condition(List.of(new Fill("T", 900, 1.025)), List.of()));
    }

    @Property(tries = 300, seed = "20261201")
    void theTrimDoesNotDependOnWhatItIsForeseenFrom(
            @ForAll @DoubleRange(min = 0, max = 360) double azimuth,
            @ForAll @DoubleRange(min = 0.1, max = 12) double angle,
            @ForAll @DoubleRange(min = 0.01, max = 4) double first,
            @ForAll @DoubleRange(min = 0.01, max = 4) double second) {
        HeelPath path = new HeelPath(Math.toRadians(azimuth), true);
        Inclination upright = path.at(Inclination.upright(loaded()), 0).orElseThrow();
        double at = Math.toRadians(angle);
        Inclination direct = path.at(upright, at).orElseThrow();
        Inclination before = path.at(upright, Math.toRadians(angle - first)).orElseThrow();
        Inclination after = path.at(upright, Math.toRadians(angle + second)).orElseThrow();
        for (Inclination found : List.of(
                path.at(before, after, at).orElseThrow(),
                path.at(after, before, at).orElseThrow(),
                path.at(before, upright, at).orElseThrow())) {
            assertThat(found.slopes().trim()).isCloseTo(direct.slopes().trim(), within(SAME));
            assertThat(path.arm(found)).isCloseTo(path.arm(direct), within(SAME));
            assertThat(found.waterplane().draft()).isCloseTo(direct.waterplane().draft(), within(1e-7));
        }
    }
}
