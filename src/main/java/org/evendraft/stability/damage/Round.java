package org.evendraft.stability.damage;

import java.util.ArrayList;
import java.util.BitSet;
import java.util.Comparator;
import java.util.List;
import java.util.function.Function;
import org.evendraft.geometry.Contour;
import org.evendraft.geometry.PlanLine;

/** What damage touches all round a contour at one level: stretches of the periphery, each touching the same. */
final class Round {
    /** Ends of stretches are found to this (m). */
    private static final double PRECISION = 1e-4;

    /** Ends closer than this are at the same place, and this far from an end one is within a stretch (m). */
    static final double ASIDE = 1e-3;

    /** Places tried at least: enough to meet all sides of a small contour. */
    private static final int FEWEST_PLACES = 24;

    private final double perimeter;
    /** In rising order; each lasts until the next begins, the last one until the first. */
    private final List<Stretch> stretches;

    /**
     * A stretch.
     *
     * @param from where it begins along the contour (m)
     * @param touch what damage touches on it
     * @param bulkhead whether a vertical bulkhead stands where it begins
     */
    record Stretch(double from, Touch touch, boolean bulkhead) {}

    private Round(double perimeter, List<Stretch> stretches) {
        this.perimeter = perimeter;
        this.stretches = List.copyOf(stretches);
    }

    /**
     * Goes round a contour.
     *
     * @param step greatest distance between places tried (m)
     * @param touching what damage touches at a place
     */
    static Round along(Contour contour, double step, Function<PlanLine, Touch> touching) {
        double perimeter = contour.perimeter();
        int count = Math.max(FEWEST_PLACES, (int) Math.ceil(perimeter / step));
        double pitch = perimeter / count;
        Function<Double, Touch> at = s -> touching.apply(contour.outward(s));
        Touch first = at.apply(pitch / 2);
        Touch before = first;
        List<Stretch> stretches = new ArrayList<>();
        for (int k = 1; k <= count; k++) {
            Touch here = k < count ? at.apply((k + 0.5) * pitch) : first;
            if (!here.equals(before)) {
                double end = end(at, before, (k - 0.5) * pitch, (k + 0.5) * pitch);
                stretches.add(new Stretch(end < perimeter ? end : end - perimeter, here, before.isPartedFrom(here)));
            }
            before = here;
        }
        if (stretches.isEmpty()) {
            stretches.add(new Stretch(0, first, false));
        }
        stretches.sort(Comparator.comparingDouble(Stretch::from));
        return new Round(perimeter, stretches);
    }

    /** Where a stretch ends between two places of which only the first lies on it. */
    private static double end(Function<Double, Touch> at, Touch stretch, double from, double to) {
        double low = from;
        double high = to;
        while (high - low > PRECISION) {
            double middle = (low + high) / 2;
            if (at.apply(middle).equals(stretch)) {
                low = middle;
            } else {
                high = middle;
            }
        }
        return (low + high) / 2;
    }

    /** What damage touches at a place (m along the contour, whole turns taken off). */
    Touch at(double place) {
        double s = turned(place);
        Touch touch = stretches.get(stretches.size() - 1).touch();
        for (Stretch stretch : stretches) {
            if (stretch.from() > s) {
                break;
            }
            touch = stretch.touch();
        }
        return touch;
    }

    /** Distance from one place ahead to another (m). */
    double ahead(double from, double to) {
        return turned(to - from);
    }

    private double turned(double s) {
        return s - perimeter * Math.floor(s / perimeter);
    }

    /** Where stretches begin (m). */
    List<Double> ends() {
        return stretches.stream().map(Stretch::from).toList();
    }

    /** Where vertical bulkheads meet the shell (m). */
    List<Double> bulkheads() {
        return stretches.stream().filter(Stretch::bulkhead).map(Stretch::from).toList();
    }

    /** Adds all that a collision opens from just before one place to just after another, ahead of it by a length (m). */
    void addTo(BitSet opened, double from, double length) {
        at(from - ASIDE).addTo(opened);
        at(from + length + ASIDE).addTo(opened);
        for (Stretch stretch : stretches) {
            if (ahead(from, stretch.from()) <= length) {
                stretch.touch().addTo(opened);
            }
        }
    }
}
