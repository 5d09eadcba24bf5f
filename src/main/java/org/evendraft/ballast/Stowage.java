package org.evendraft.ballast;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.function.Function;
import java.util.stream.Collectors;
import org.evendraft.geometry.Vec3;
import org.evendraft.platform.Condition;
import org.evendraft.platform.Fill;
import org.evendraft.platform.Load;
import org.evendraft.platform.PreparedPlatform;
import org.evendraft.platform.Tank;
import org.evendraft.stability.TankState;

/**
 * All masses aboard in a condition, with what decides how liquids move. Immutable.
 *
 * @param fixedMass lightship and loads (t)
 * @param fixedMoment their first moments (t·m)
 * @param liquids the liquids in all tanks
 */
record Stowage(double fixedMass, Vec3 fixedMoment, List<Contents> liquids) {

    static Stowage of(PreparedPlatform prepared, Condition condition) {
        double mass = prepared.platform().lightship().mass();
        Vec3 moment = prepared.platform().lightship().centre().times(mass);
        for (Load load : condition.loads()) {
            mass += load.mass();
            moment = moment.plus(load.position().times(load.mass()));
        }
        Map<String, Tank> tanks =
                prepared.platform().tanks().stream().collect(Collectors.toMap(Tank::id, Function.identity()));
        List<Contents> liquids = new ArrayList<>();
        for (Fill fill : condition.fills()) {
            Tank tank = tanks.get(fill.tank());
            if (tank != null && fill.volume() > 0) {
                double fraction =
                        fill.volume() / prepared.calibration(fill.tank()).fullVolume();
                boolean free = TankState.of(fraction, tank.pressedUpFraction()) == TankState.SLACK;
                liquids.add(new Contents(prepared.calibration(fill.tank()), fill.density(), fill.volume(), free));
            }
        }
        return new Stowage(mass, moment, List.copyOf(liquids));
    }

    double mass() {
        return fixedMass + liquids.stream().mapToDouble(Contents::mass).sum();
    }

    /** First moments of all masses, liquids under a surface of given slopes (t·m). */
    Vec3 moment(double slopeX, double slopeY) {
        Vec3 moment = fixedMoment;
        for (Contents liquid : liquids) {
            moment = moment.plus(liquid.moment(slopeX, slopeY));
        }
        return moment;
    }
}
