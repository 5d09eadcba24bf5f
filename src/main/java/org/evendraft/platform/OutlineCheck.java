package org.evendraft.platform;

import java.util.List;
import java.util.Optional;

/** Whether a list of corners bounds an area. */
final class OutlineCheck {
    /** Every edge is compared with every other: more corners than these would take too long. */
    private static final int MOST_CORNERS = 4000;

    /** Corners nearer to each other are one (m). */
    private static final double SAME_POINT = 1e-6;

    private OutlineCheck() {}

    /** What is wrong with an outline, if anything: a sentence. */
    static Optional<String> fault(List<double[]> corners) {
        int n = corners.size();
        if (n < 3) {
            return Optional.of("an outline must have at least 3 corners, not " + n);
        }
        if (n > MOST_CORNERS) {
            return Optional.of("an outline may have at most " + MOST_CORNERS + " corners, not " + n);
        }
        for (int i = 0; i < n; i++) {
            double[] a = corners.get(i);
            double[] b = corners.get((i + 1) % n);
            if (Math.hypot(a[0] - b[0], a[1] - b[1]) < SAME_POINT) {
                return Optional.of("corners " + i + " and " + (i + 1) % n + " of the outline are the same point");
            }
        }
        return crossing(corners);
    }

    private static Optional<String> crossing(List<double[]> corners) {
        int n = corners.size();
        for (int i = 0; i < n; i++) {
            for (int j = i + 1; j < n; j++) {
                if (meet(corners, i, j)) {
                    return Optional.of("the outline crosses or touches itself: the edge from corner " + i
                            + " and the one from corner " + j);
                }
            }
        }
        return Optional.empty();
    }

    /** Whether the edges from corners i and j, i before j, meet elsewhere than at a common corner. */
    private static boolean meet(List<double[]> corners, int i, int j) {
        int n = corners.size();
        if (j == i + 1) {
            return turnsBack(corners, j);
        }
        if ((j + 1) % n == i) {
            return turnsBack(corners, i);
        }
        return cross(corners.get(i), corners.get(i + 1), corners.get(j), corners.get((j + 1) % n));
    }

    /** Whether the two edges at a corner lie on each other. */
    private static boolean turnsBack(List<double[]> corners, int at) {
        int n = corners.size();
        double[] before = corners.get((at + n - 1) % n);
        double[] corner = corners.get(at);
        double[] after = corners.get((at + 1) % n);
        double alongP = (before[0] - corner[0]) * (after[0] - corner[0]);
        double alongQ = (before[1] - corner[1]) * (after[1] - corner[1]);
        return alongP + alongQ > 0 && side(before, corner, after) == 0;
    }

    private static boolean cross(double[] a, double[] b, double[] c, double[] d) {
        int abc = side(a, b, c);
        int abd = side(a, b, d);
        int cda = side(c, d, a);
        int cdb = side(c, d, b);
        boolean apart = abc * abd > 0 || cda * cdb > 0;
        boolean onOneLine = abc == 0 && abd == 0 && cda == 0 && cdb == 0;
        return !apart && (!onOneLine || (overlap(a, b, c, d, 0) && overlap(a, b, c, d, 1)));
    }

    private static boolean overlap(double[] a, double[] b, double[] c, double[] d, int k) {
        return Math.max(a[k], b[k]) >= Math.min(c[k], d[k]) && Math.max(c[k], d[k]) >= Math.min(a[k], b[k]);
    }

    /** On which side of the line from a to b a point lies: 1 left, −1 right, 0 on it. */
    private static int side(double[] a, double[] b, double[] p) {
        double area = (b[0] - a[0]) * (p[1] - a[1]) - (b[1] - a[1]) * (p[0] - a[0]);
        double scale = Math.hypot(b[0] - a[0], b[1] - a[1]) * SAME_POINT * SAME_POINT;
        return Math.abs(area) <= scale ? 0 : (int) Math.signum(area);
    }
}
