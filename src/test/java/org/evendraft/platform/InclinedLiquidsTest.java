package org.evendraft.platform;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import org.assertj.core.data.Offset;
import org.evendraft.geometry.Assembly;
import org.evendraft.geometry.SecondMoments;
import org.evendraft.geometry.Solid;
import org.evendraft.geometry.Vec3;

/** Liquids gathered tank by tank are the sum of each tank's own, wherever the search for their surfaces starts. */
class InclinedLiquidsTest {
    private static final double PERMEABILITY = 0.97;
    private static final double[] DENSITIES = {1.025, 0.85, 1.4, 1.0};
    /** Volumes are met to 1e-13 of the whole; near the crown of a round tank the surface answers steeply to what is missing. */
    private static final Offset<Double> EXACT = within(1e-6);

    private static final ShapeCalibration BOX = shape(Solid.box(new Vec3(3, -4, 1), new Vec3(15, 2, 6)));
    private static final ShapeCalibration ROUND = shape(Solid.cylinder(new Vec3(-5, 3, 4), new Vec3(9, 3, 4), 5, 5));
    private static final List<Calibration> TANKS = List.of(
            BOX,
            ROUND,
            new TableCalibration(BOX.table(), Optional.empty()),
            new TableCalibration(ROUND.table(), Optional.of(ROUND)));

    private static ShapeCalibration shape(Solid solid) {
        return new ShapeCalibration(new Assembly(List.of(new Assembly.Part(solid, false))), PERMEABILITY);
    }

    private static Liquid liquid(Calibration tank, double fraction) {
        return tank.holding(fraction * tank.fullVolume());
    }

    private static void gather(InclinedLiquids gathered, double fraction) {
        for (int i = 0; i < TANKS.size(); i++) {
            TANKS.get(i).addInclined(gathered, i, liquid(TANKS.get(i), fraction), DENSITIES[i]);
        }
    }

    private static void assertIsTheSum(InclinedLiquids gathered, double fraction, double slopeX, double slopeY) {
        Vec3 moment = Vec3.ZERO;
        SecondMoments projected = SecondMoments.NONE;
        for (int i = 0; i < TANKS.size(); i++) {
            Calibration tank = TANKS.get(i);
            Calibration.Inclined own = tank.inclined(fraction * tank.fullVolume(), slopeX, slopeY, Double.NaN);
            moment = moment.plus(own.moment().times(DENSITIES[i]));
            projected = projected.plus(own.projected().times(DENSITIES[i]));
        }
        assertThat(gathered.moment().minus(moment).norm()).isCloseTo(0, EXACT);
        assertThat(gathered.projected().transverse()).isCloseTo(projected.transverse(), EXACT);
        assertThat(gathered.projected().longitudinal()).isCloseTo(projected.longitudinal(), EXACT);
        assertThat(gathered.projected().product()).isCloseTo(projected.product(), EXACT);
    }

    @Property(tries = 500, seed = "20261201")
    void whatIsGatheredIsTheSumOfTheTanks(
            @ForAll @DoubleRange(min = 0.01, max = 0.97) double fraction,
            @ForAll @DoubleRange(min = -1, max = 1) double slopeX,
            @ForAll @DoubleRange(min = -1, max = 1) double slopeY,
            @ForAll @DoubleRange(min = -1, max = 1) double otherX) {
        InclinedLiquids upright = InclinedLiquids.upright(TANKS.size());
        gather(upright, fraction);
        assertIsTheSum(upright, fraction, 0, 0);
        InclinedLiquids near = upright.at(slopeX, slopeY);
        gather(near, fraction);
        assertIsTheSum(near, fraction, slopeX, slopeY);
        InclinedLiquids far = near.at(otherX, -slopeY);
        gather(far, fraction);
        assertIsTheSum(far, fraction, otherX, -slopeY);
    }
}
