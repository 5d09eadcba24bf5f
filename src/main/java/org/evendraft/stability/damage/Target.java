package org.evendraft.stability.damage;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Predicate;
import org.evendraft.geometry.Contour;

/**
 * A part of the periphery that may be struck: the contour of a body over the levels where it is the same.
 *
 * @param body number of the body in the layout
 * @param contour the contour
 * @param column whether it is that of a column
 * @param levels levels where the body has this contour
 */
record Target(int body, Contour contour, boolean column, List<Level> levels) {

    /** All targets on the periphery of the unit, body by body, from below. */
    static List<Target> of(Layout layout, List<Level> levels, Predicate<Level> struck) {
        List<Target> targets = new ArrayList<>();
        for (int body = 0; body < layout.bodies().size(); body++) {
            List<Target> own = new ArrayList<>();
            for (Level level : levels) {
                if (struck.test(level)) {
                    addContours(own, layout, body, level);
                }
            }
            targets.addAll(own);
        }
        targets.removeIf(target -> !layout.columns().isReachedBy(target.contour, layout.step()));
        return targets;
    }

    private static void addContours(List<Target> own, Layout layout, int body, Level level) {
        for (Contour contour : level.body(body).contours()) {
            if (contour.area() <= 0) {
                continue;
            }
            own.stream()
                    .filter(target -> target.contour.isSame(contour, Level.SAME))
                    .findFirst()
                    .ifPresentOrElse(target -> target.levels.add(level), () -> {
                        boolean column =
                                OutermostColumns.isColumn(layout.bodies().get(body), contour);
                        own.add(new Target(body, contour, column, new ArrayList<>(List.of(level))));
                    });
        }
    }

    /** Distance at which bulkheads are too close to count (m). */
    double bulkheadSpacing(Extents extents) {
        return column ? extents.perimeterPart() * contour.perimeter() : extents.hullBulkheads();
    }
}
