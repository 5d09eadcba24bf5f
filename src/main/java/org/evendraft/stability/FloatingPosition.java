package org.evendraft.stability;

import java.util.Comparator;
import java.util.Optional;
import java.util.stream.DoubleStream;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.evendraft.stability.Equilibrium.Afloat;

/**
 * The search for the position in which weight equals buoyancy and G lies over B, liquids free: the potential energy, G's height
 * over B along the vertical at the displacement, is brought to a minimum over the two slopes by Newton's method with the analytic
 * stiffness, in steps so short that the search stays in the valley where it starts.
 */
final class FloatingPosition {
    /** Beyond this inclination a platform counts as capsized (rad). */
    static final double GREATEST_INCLINATION = Math.toRadians(60);
    /** G is brought this near to the vertical through B (m). */
    static final double ARM_TOLERANCE = 1e-9;

    private static final int MOST_STEPS = 200;
    /** Longest step of the slopes, about 6°. */
    private static final double LONGEST_STEP = 0.1;

    private static final double SHORTEST_STEP = 1e-13;
    /** Energies nearer than this are those of twins (m). */
    private static final double SAME_ENERGY = 1e-8;
    /** Slopes under this are none, when twins are compared. */
    private static final double SAME_SLOPE = 1e-6;

    private static final double[] RINGS = {3, 15, 40};
    private static final int DIRECTIONS = 12;

    private final LoadedPlatform platform;

    FloatingPosition(LoadedPlatform platform) {
        this.platform = platform;
    }

    Equilibrium find() {
        Inclination start = Inclination.upright(platform);
        // On even keel the energy's curvatures are the corrected GMs with the free surfaces that are really there.
        if (start.energy().leastCurvature() > 0) {
            return descend(start);
        }
        return starts().map(slopes -> descend(start.at(slopes)))
                .flatMap(
                        found -> found instanceof Afloat afloat && afloat.stable() ? Stream.of(afloat) : Stream.empty())
                .reduce(FloatingPosition::better)
                .map(Equilibrium.class::cast)
                .orElseGet(Equilibrium.Capsizes::new);
    }

    /** Slopes all around at several inclinations. */
    private static Stream<Slopes> starts() {
        return DoubleStream.of(RINGS)
                .map(ring -> Math.tan(Math.toRadians(ring)))
                .boxed()
                .flatMap(slope -> IntStream.range(0, DIRECTIONS)
                        .mapToDouble(i -> 2 * Math.PI * i / DIRECTIONS)
                        .mapToObj(direction -> new Slopes(Math.cos(direction), Math.sin(direction)).times(slope)));
    }

    /** The one of less energy; of twins the one with starboard, then bow, down. */
    private static Afloat better(Afloat a, Afloat b) {
        double difference = energy(a) - energy(b);
        if (Math.abs(difference) > SAME_ENERGY) {
            return difference < 0 ? a : b;
        }
        Comparator<Afloat> byHeel =
                Comparator.comparingDouble(p -> rounded(p.waterplane().heelRad()));
        Comparator<Afloat> order =
                byHeel.thenComparingDouble(p -> rounded(p.waterplane().trimRad()));
        return order.compare(a, b) >= 0 ? a : b;
    }

    private static double rounded(double angle) {
        return Math.rint(angle / SAME_SLOPE) * SAME_SLOPE;
    }

    private static double energy(Afloat position) {
        return position.centreOfGravity()
                .minus(position.centreOfBuoyancy())
                .dot(position.waterplane().plane().normal());
    }

    /** Downhill from a start. */
    private static Equilibrium descend(Inclination start) {
        Inclination here = start;
        double reach = LONGEST_STEP;
        for (int i = 0; i < MOST_STEPS && reach > SHORTEST_STEP; i++) {
            if (here.slopes().inclination() > GREATEST_INCLINATION) {
                return new Equilibrium.Capsizes();
            }
            if (here.arm() <= ARM_TOLERANCE) {
                Optional<Slopes> downhill = here.energy().wayOffSaddle();
                if (downhill.isEmpty()) {
                    return here.afloat();
                }
                here = here.moved(downhill.get().times(LONGEST_STEP / 2));
            } else {
                Slopes step = here.energy().newtonStep(reach);
                Inclination next = here.moved(step);
                boolean better = next.energy().value() < here.energy().value() || next.arm() < here.arm() / 2;
                here = better ? next : here;
                reach = better ? Math.min(LONGEST_STEP, 2 * reach) : step.norm() / 4;
            }
        }
        return here.arm() <= ARM_TOLERANCE ? here.afloat() : new Equilibrium.Unresolved(here.arm());
    }
}
