package org.evendraft.stability.damage;

import java.util.ArrayList;
import java.util.BitSet;
import java.util.List;
import java.util.stream.IntStream;
import org.evendraft.geometry.Chord;
import org.evendraft.geometry.HorizontalSection;
import org.evendraft.geometry.PlanLine;

/** A range of heights in which the plan of the platform is that of its middle. Compared by identity. */
final class Level {
    /** A space that damage reaches by less than this stays closed (m): a bulkhead just at the depth of the penetration holds. */
    private static final double LEAST_REACH = 1e-3;

    /** Sections whose contours differ by less than this are the same (m). */
    static final double SAME = 1e-6;

    /** Greatest height of a level in which the plan changes with height (m). */
    private static final double THIN = 0.5;

    /** Places, as parts of a level's height, where the plan is compared with that in the middle. */
    private static final double[] COMPARED = {0.02, 0.37};

    private final double from;
    private final double to;
    private final List<HorizontalSection> bodies;
    private final HorizontalSection hull;
    private final List<HorizontalSection> spaces;

    /**
     * The plan at the middle of a range.
     *
     * @param from lower end (m)
     * @param to upper end (m)
     */
    Level(Layout layout, double from, double to) {
        this.from = from;
        this.to = to;
        double z = (from + to) / 2;
        this.bodies = bodies(layout, z);
        this.hull = HorizontalSection.ofContours(
                bodies.stream().flatMap(body -> body.contours().stream()).toList());
        this.spaces = spaces(layout, z);
    }

    private static List<HorizontalSection> bodies(Layout layout, double z) {
        return layout.bodies().stream()
                .map(body -> HorizontalSection.of(body.solid(), z))
                .toList();
    }

    private static List<HorizontalSection> spaces(Layout layout, double z) {
        return layout.spaces().stream()
                .map(space -> HorizontalSection.of(Layout.assembly(space), z))
                .toList();
    }

    /** Whether the plan at another height is the same as in the middle. */
    boolean isLike(Layout layout, double z) {
        return areSame(bodies, bodies(layout, z)) && areSame(spaces, spaces(layout, z));
    }

    private static boolean areSame(List<HorizontalSection> some, List<HorizontalSection> others) {
        return IntStream.range(0, some.size()).allMatch(i -> some.get(i).isSame(others.get(i), SAME));
    }

    /** Lower end (m). */
    double from() {
        return from;
    }

    /** Upper end (m). */
    double to() {
        return to;
    }

    /** The plan of a body of the layout, by its number. */
    HorizontalSection body(int number) {
        return bodies.get(number);
    }

    /**
     * What damage touches at a place.
     *
     * @param line from the place outward; the shell is looked for within the penetration to both sides of the place, so that bodies
     *     which stand out a little over or under each other are struck together
     */
    Touch touch(PlanLine line, OutermostColumns columns, Extents extents) {
        List<Near> near = near(line, extents.penetration());
        if (near.isEmpty()) {
            return Touch.NO_SPACES;
        }
        List<Chord> chords = hull.chords(line);
        int outer = chords.size() - 1;
        while (outer >= 0 && chords.get(outer).to() > extents.penetration() + SAME) {
            outer--;
        }
        if (outer < 0 || chords.get(outer).to() < -extents.penetration() - SAME) {
            return Touch.NO_SHELL;
        }
        double shell = chords.get(outer).to();
        boolean exposed = extents.text() == Extents.Text.CFR
                ? columns.isOutboard(line, shell)
                : outer == chords.size() - 1 && !columns.isInward(line);
        return touch(near, shell, exposed, extents.penetration());
    }

    /** A part of a line inside a space. */
    private record Near(int space, Chord chord) {}

    /** What may be in reach from shell within the penetration to both sides of a place. */
    private List<Near> near(PlanLine line, double penetration) {
        List<Near> near = new ArrayList<>();
        for (int i = 0; i < spaces.size(); i++) {
            for (Chord chord : spaces.get(i).chords(line)) {
                if (chord.within(-2 * penetration, penetration) > LEAST_REACH) {
                    near.add(new Near(i, chord));
                }
            }
        }
        return near;
    }

    private static Touch touch(List<Near> near, double shell, boolean exposed, double penetration) {
        BitSet reached = new BitSet();
        int first = Touch.NO_SPACE;
        double outermost = Double.NEGATIVE_INFINITY;
        for (Near one : near) {
            if (one.chord().within(shell - penetration, shell) > LEAST_REACH) {
                reached.set(one.space());
                if (one.chord().to() > outermost) {
                    outermost = one.chord().to();
                    first = one.space();
                }
            }
        }
        return new Touch(true, exposed, first, reached);
    }

    /** Levels without gaps between two heights: parted where bodies and spaces begin or end, thin where the plan changes with height. */
    static List<Level> between(Layout layout, double from, double to) {
        List<Level> levels = new ArrayList<>();
        double low = from;
        for (double end : layout.ends()) {
            if (end > low && end < to) {
                addLevels(levels, layout, low, end);
                low = end;
            }
        }
        addLevels(levels, layout, low, to);
        return levels;
    }

    private static void addLevels(List<Level> levels, Layout layout, double from, double to) {
        Level whole = new Level(layout, from, to);
        boolean constant = true;
        for (double part : COMPARED) {
            constant &= whole.isLike(layout, from + part * (to - from));
        }
        if (constant) {
            levels.add(whole);
            return;
        }
        int count = (int) Math.ceil((to - from) / THIN);
        for (int i = 0; i < count; i++) {
            levels.add(new Level(layout, from + (to - from) * i / count, from + (to - from) * (i + 1) / count));
        }
    }
}
