package org.evendraft.stability.damage;

import java.util.ArrayList;
import java.util.BitSet;
import java.util.Collections;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeSet;

/** Goes round a target and finds what damage anywhere on it opens. */
final class Blows {
    private final Target target;
    private final Extents extents;
    private final Layout layout;
    private final Disregarded.Rule rule;
    private final Map<Level, Round> rounds = new HashMap<>();
    private final List<Blow> found = new ArrayList<>();

    private Blows(Target target, Extents extents, Layout layout) {
        this.target = target;
        this.extents = extents;
        this.layout = layout;
        this.rule = new Disregarded.Rule(target.bulkheadSpacing(extents), extents.text());
    }

    /** Blows on a target in any of the windows, those that open nothing left out. */
    static List<Blow> on(Target target, List<Window> windows, Extents extents, Layout layout) {
        Blows blows = new Blows(target, extents, layout);
        for (Window window : windows) {
            if (!Collections.disjoint(window.levels(), target.levels())) {
                blows.addBetweenBulkheads(window);
                blows.addThroughBulkheads(window);
            }
        }
        return blows.found;
    }

    private Round round(Level level) {
        return rounds.computeIfAbsent(
                level,
                key -> Round.along(
                        target.contour(), layout.step(), line -> key.touch(line, layout.columns(), extents)));
    }

    private void add(Window window, double place, BitSet opened, boolean throughBulkheads) {
        if (!opened.isEmpty()) {
            found.add(new Blow(target, window, place, opened, throughBulkheads));
        }
    }

    /** The middle of each part of the contour on which no level of a window changes (m), that of the longest first. */
    private List<Double> places(Window window) {
        TreeSet<Double> ends = new TreeSet<>();
        window.levels().forEach(level -> ends.addAll(round(level).ends()));
        List<Part> parts = new ArrayList<>();
        double before = ends.last() - target.contour().perimeter();
        for (double end : ends) {
            if (end - before > Round.ASIDE) {
                parts.add(new Part(before, end));
            }
            before = end;
        }
        parts.sort(Comparator.comparing(Part::steps).reversed());
        return parts.stream().map(Part::middle).toList();
    }

    /** A part of the contour (m). */
    private record Part(double from, double to) {

        /** Its length in whole steps, in which parts of equal length do not differ by rounding. */
        long steps() {
            return Math.round((to - from) / Round.ASIDE);
        }

        double middle() {
            return (from + to) / 2;
        }
    }

    private void addBetweenBulkheads(Window window) {
        for (double place : places(window)) {
            BitSet opened = new BitSet();
            window.levels().forEach(level -> round(level).at(place).addTo(opened));
            add(window, place, opened, false);
        }
    }

    private void addThroughBulkheads(Window window) {
        for (Level level : window.levels()) {
            if (target.levels().contains(level)) {
                for (Disregarded damage : rule.on(round(level))) {
                    addThrough(window, round(level), damage);
                }
            }
        }
    }

    /** Adds damage through bulkheads of one level; at other levels it is wherever within the same length of the periphery. */
    private void addThrough(Window window, Round round, Disregarded damage) {
        List<Double> beside =
                new ArrayList<>(List.of(damage.from() - Round.ASIDE, damage.from() + damage.length() + Round.ASIDE));
        places(window).stream()
                .filter(place -> round.ahead(damage.from(), place) <= rule.reach(damage))
                .forEach(beside::add);
        for (double place : beside) {
            BitSet opened = new BitSet();
            window.levels().forEach(level -> addOpened(opened, level, damage, place));
            add(window, damage.from() + damage.length() / 2, opened, true);
        }
    }

    /** Bulkheads are disregarded only at levels where the target itself stands; elsewhere the damage is at the place alone. */
    private void addOpened(BitSet opened, Level level, Disregarded damage, double place) {
        Optional<Disregarded> own =
                target.levels().contains(level) ? rule.from(damage.from(), round(level)) : Optional.empty();
        if (own.isPresent()) {
            round(level).addTo(opened, own.get().from(), own.get().length());
        } else {
            round(level).at(place).addTo(opened);
        }
    }
}
