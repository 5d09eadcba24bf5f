package org.evendraft.stability.damage;

import java.util.ArrayList;
import java.util.List;
import java.util.TreeSet;

/**
 * A vertical extent of damage.
 *
 * @param from lower end (m)
 * @param to upper end (m)
 * @param levels levels that it meets
 */
record Window(double from, double to, List<Level> levels) {
    /** Ends closer than this are one (m). */
    private static final double SAME = 1e-9;

    /** Copies the list. */
    Window {
        levels = List.copyOf(levels);
    }

    /**
     * Windows of a height anywhere among adjoining levels: one for each choice of levels that a window can meet.
     *
     * @param levels from the lowest to the highest
     */
    static List<Window> among(List<Level> levels, double height) {
        double low = levels.get(0).from();
        double high = levels.get(levels.size() - 1).to() - height;
        if (high <= low) {
            return List.of(new Window(low, high + height, levels));
        }
        List<Window> windows = new ArrayList<>();
        for (double start : starts(levels, low, high, height)) {
            Window window = new Window(start, start + height, met(levels, start, start + height));
            if (windows.stream().noneMatch(w -> w.levels().equals(window.levels()))) {
                windows.add(window);
            }
        }
        return windows;
    }

    /** Where windows may start (m): lowest and highest, and between every two starts at which an end passes from level to level. */
    private static List<Double> starts(List<Level> levels, double low, double high, double height) {
        TreeSet<Double> turns = new TreeSet<>(List.of(low, high));
        for (Level level : levels) {
            turns.add(Math.min(high, Math.max(low, level.from())));
            turns.add(Math.min(high, Math.max(low, level.from() - height)));
        }
        List<Double> starts = new ArrayList<>(List.of(low));
        double before = low;
        for (double turn : turns) {
            if (turn - before > SAME) {
                starts.add((before + turn) / 2);
            }
            before = turn;
        }
        starts.add(high);
        return starts;
    }

    private static List<Level> met(List<Level> levels, double from, double to) {
        return levels.stream()
                .filter(level -> Math.min(level.to(), to) - Math.max(level.from(), from) > SAME)
                .toList();
    }
}
