package org.evendraft.stability;

import java.util.Map;
import java.util.NavigableMap;
import java.util.Optional;
import java.util.TreeMap;
import java.util.function.Supplier;
import org.evendraft.stability.HeelPath.Reached;
import org.jspecify.annotations.Nullable;

/**
 * The states of a platform along a heel path, known at nodes a step apart and wherever else they were asked for. They grow both ways
 * from one state, as far as is asked for or the path goes. One thread at a time.
 */
final class HeelStates {
    /** So small a part of a step is none. */
    private static final double SAME_NODE = 1e-9;

    private final HeelPath path;
    private final double stepRad;
    private final double lastRad;
    private final double seedRad;
    private final NavigableMap<Double, Inclination> known = new TreeMap<>();
    private boolean endedAbove;
    private boolean endedBelow;

    /**
     * @param seedRad angle of the state from which they grow (rad)
     * @param seed that state; empty when there is none, and then there are no states at all
     * @param stepRad between nodes (rad)
     * @param lastRad the furthest angle to either side (rad)
     */
    HeelStates(HeelPath path, double seedRad, Optional<Inclination> seed, double stepRad, double lastRad) {
        this.path = path;
        this.stepRad = stepRad;
        this.lastRad = lastRad;
        this.seedRad = seedRad;
        seed.ifPresent(state -> known.put(seedRad, state));
    }

    boolean areThere() {
        return !known.isEmpty();
    }

    /** The angle of the state from which they grew (rad). */
    double seedRad() {
        return seedRad;
    }

    /** The least angle known so far (rad). */
    double startRad() {
        return known.firstKey();
    }

    /** The last angle that there is (rad). */
    double endRad() {
        reach(lastRad);
        return known.lastKey();
    }

    double stepRad() {
        return stepRad;
    }

    /** Whether they go on to the furthest angle. */
    boolean areComplete() {
        return reach(lastRad);
    }

    /** The next node over an angle (rad), on the path or beyond it. */
    double nextNode(double angleRad) {
        return (Math.floor(angleRad / stepRad + SAME_NODE) + 1) * stepRad;
    }

    /** The next node under an angle (rad), on the path or beyond it. */
    double lowerNode(double angleRad) {
        return (Math.ceil(angleRad / stepRad - SAME_NODE) - 1) * stepRad;
    }

    /** Grows as far as an angle (rad); false when the path ends before. */
    boolean reach(double angleRad) {
        while (!endedAbove && known.lastKey() < angleRad) {
            double top = known.lastKey();
            double target = Math.min(lastRad, nextNode(top));
            endedAbove = target <= top || !grow(known.lastEntry(), known.lowerEntry(top), target);
        }
        while (!endedBelow && known.firstKey() > angleRad) {
            double bottom = known.firstKey();
            double target = Math.max(-lastRad, lowerNode(bottom));
            endedBelow = target >= bottom || !grow(known.firstEntry(), known.higherEntry(bottom), target);
        }
        return known.firstKey() <= angleRad && angleRad <= known.lastKey();
    }

    private boolean grow(
            Map.Entry<Double, Inclination> end, Map.@Nullable Entry<Double, Inclination> inner, double target) {
        Reached from = reached(end);
        Reached to = path.follow(from, inner == null ? from : reached(inner), target);
        known.put(to.angleRad(), to.state());
        return to.angleRad() == target;
    }

    private static Reached reached(Map.Entry<Double, Inclination> entry) {
        return new Reached(entry.getKey(), entry.getValue());
    }

    /**
     * The platform at an angle on the path (rad), found from the nearest state known, or else from the one on the angle's other side.
     *
     * @throws IllegalArgumentException when the path does not go there
     * @throws LostRestException when the trim finds no rest from either: no other angle's state stands in, and from then on the path
     *     ends where it was last found
     */
    Inclination at(double angleRad) {
        if (!reach(angleRad)) {
            throw new IllegalArgumentException(Math.toDegrees(angleRad) + "° is beyond the curve");
        }
        Map.Entry<Double, Inclination> under = known.floorEntry(angleRad);
        Map.Entry<Double, Inclination> over = known.ceilingEntry(angleRad);
        if (under.getKey() == angleRad) {
            return under.getValue();
        }
        boolean nearUnder = angleRad - under.getKey() <= over.getKey() - angleRad;
        Reached near = reached(nearUnder ? under : over);
        Reached other = reached(nearUnder ? over : under);
        Reached found = path.follow(near, other, angleRad);
        found = found.angleRad() == angleRad ? found : path.follow(other, near, angleRad);
        if (found.angleRad() != angleRad) {
            throw lost(angleRad, reached(angleRad > seedRad ? under : over));
        }
        known.put(angleRad, found.state());
        return found.state();
    }

    private LostRestException lost(double angleRad, Reached inner) {
        Reached end = path.follow(inner, inner, angleRad);
        if (angleRad > seedRad) {
            known.tailMap(angleRad).clear();
            endedAbove = true;
        } else {
            known.headMap(angleRad).clear();
            endedBelow = true;
        }
        known.put(end.angleRad(), end.state());
        return new LostRestException(angleRad);
    }

    /** Something found on the path; when the path turns out to end earlier than its states told, found again on what is left of it. */
    static <T> T settled(Supplier<T> search) {
        while (true) {
            try {
                return search.get();
            } catch (LostRestException e) {
                // The path is shorter now, so this comes to an end.
            }
        }
    }
}
