package org.evendraft.ballast.loadplan;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;
import java.util.stream.Stream;
import org.evendraft.ballast.Plan;
import org.evendraft.geometry.Vec3;
import org.evendraft.platform.Condition;
import org.evendraft.platform.Fill;
import org.evendraft.platform.Load;
import org.evendraft.platform.Mode;
import org.evendraft.platform.PreparedPlatform;

/** Loadings changed in one thing; all else stays as it was. */
final class Changes {
    private Changes() {}

    static Condition added(Condition before, Load load) {
        return with(
                before,
                before.fills(),
                Stream.concat(before.loads().stream(), Stream.of(load)).toList());
    }

    /** Another load, or none, in the place of the load of a name. */
    static Condition replaced(Condition before, String name, Function<Load, Optional<Load>> change) {
        List<Load> loads = new ArrayList<>();
        for (Load load : before.loads()) {
            (load.name().equals(name) ? change.apply(load) : Optional.of(load)).ifPresent(loads::add);
        }
        return with(before, before.fills(), loads);
    }

    static Condition filled(Condition before, Fill fill) {
        Map<String, Fill> fills = new LinkedHashMap<>();
        before.fills().forEach(f -> fills.put(f.tank(), f));
        fills.put(fill.tank(), fill);
        return with(before, List.copyOf(fills.values()), before.loads());
    }

    /** The loading when a ballast plan has been carried out. */
    static Condition pumped(PreparedPlatform prepared, Condition before, Plan plan) {
        Condition after = before;
        for (Plan.EndFill end : plan.fills()) {
            double full = prepared.calibration(end.tank()).fullVolume();
            after = filled(after, new Fill(end.tank(), Math.min(full, end.mass() / end.density()), end.density()));
        }
        return after;
    }

    /** What a tank holds, if anything is said of it. */
    static Optional<Fill> fill(Condition condition, String tank) {
        return condition.fills().stream().filter(f -> f.tank().equals(tank)).findFirst();
    }

    static Condition inMode(Condition before, Mode mode) {
        return new Condition(
                before.name(),
                Optional.of(mode),
                before.waterDensity(),
                before.freeSurface(),
                before.fills(),
                before.loads());
    }

    private static Condition with(Condition before, List<Fill> fills, List<Load> loads) {
        return new Condition(before.name(), before.mode(), before.waterDensity(), before.freeSurface(), fills, loads);
    }

    static Load withMass(Load load, double mass) {
        return new Load(load.name(), load.kind(), load.area(), mass, load.position(), load.footprint());
    }

    static Load placed(Load load, Load.Kind kind, Vec3 position, Optional<String> area) {
        return new Load(load.name(), kind, area, load.mass(), position, load.footprint());
    }

    /** A load on the hook, which acts where the hook hangs from. */
    static Load hanging(Load load, Vec3 boomTip) {
        return placed(load, Load.Kind.SUSPENDED, boomTip, Optional.empty());
    }

    /** A place on the straight line between two. */
    static Vec3 between(Vec3 from, Vec3 to, double part) {
        return part == 1 ? to : from.times(1 - part).plus(to.times(part));
    }
}
