package org.evendraft.geometry;

import java.util.SplittableRandom;

/**
 * Upright lines through a rectangle, one at a random place in each cell of a grid, the places the same in every run; and where they
 * cross the surface of a space. A point lies inside where the sum of the crossings below it, in less out, is over 0: the caps of
 * shapes made here are fans that may overlap with opposite signs, which cancel in that sum.
 */
final class Rays {
    private static final long SEED = 20_260_612L;
    private static final int MOST_ALONG_A_SIDE = 128;
    private static final int FEWEST_ALONG_A_SIDE = 8;

    /** So many tests of a line against a triangle at most, or the grid gets coarser: they take about a second. */
    private static final long MOST_TESTS = 40_000_000;

    /** Reaches are widened by this part of the rectangle, so that no line is lost to rounding. */
    private static final double ROUNDING = 1e-9;

    private final double left;
    private final double front;
    private final double width;
    private final double depth;
    private final int side;
    private final double[] x;
    private final double[] y;

    private Rays(double left, double front, double width, double depth, int side) {
        this.left = left;
        this.front = front;
        this.width = width;
        this.depth = depth;
        this.side = side;
        this.x = new double[side * side];
        this.y = new double[side * side];
        SplittableRandom random = new SplittableRandom(SEED);
        for (int i = 0; i < x.length; i++) {
            int row = i / side;
            x[i] = left + width * (i - row * side + random.nextDouble()) / side;
            y[i] = front + depth * (row + random.nextDouble()) / side;
        }
    }

    /**
     * Lines through the rectangle {@code min.x ≤ x ≤ max.x, min.y ≤ y ≤ max.y}, as many as the spaces allow in reasonable time.
     *
     * @param spaces what the lines will be crossed with
     */
    static Rays through(Vec3 min, Vec3 max, Assembly... spaces) {
        for (int side = MOST_ALONG_A_SIDE; ; side /= 2) {
            Rays rays = new Rays(min.x(), min.y(), max.x() - min.x(), max.y() - min.y(), side);
            if (side <= FEWEST_ALONG_A_SIDE || rays.tests(spaces) <= MOST_TESTS) {
                return rays;
            }
        }
    }

    private long tests(Assembly... spaces) {
        long tests = 0;
        for (Assembly space : spaces) {
            for (Assembly.Part part : space.parts()) {
                Tester tester = new Tester(part.solid().mesh());
                for (int i = 0; i < part.solid().mesh().triangleCount(); i++) {
                    tests += tester.turnTo(i) ? tester.lines() : 0;
                }
            }
        }
        return tests;
    }

    /** How many lines there are. */
    int count() {
        return x.length;
    }

    /** The area that one line stands for (m²). */
    double cellArea() {
        return width * depth / x.length;
    }

    /** The corner of a line's cell with the least x and y; z is 0. */
    Vec3 cellMin(int ray) {
        int row = ray / side;
        return new Vec3(left + width * (ray - row * side) / side, front + depth * row / side, 0);
    }

    /** The corner of a line's cell with the greatest x and y; z is 0. */
    Vec3 cellMax(int ray) {
        return cellMin(ray).plus(new Vec3(width / side, depth / side, 0));
    }

    /** All crossings with the surface of a space. */
    Crossings crossings(Assembly space) {
        Crossings.Gatherer gatherer = new Crossings.Gatherer(x.length);
        for (Assembly.Part part : space.parts()) {
            Tester tester = new Tester(part.solid().mesh());
            for (int i = 0; i < part.solid().mesh().triangleCount(); i++) {
                if (tester.turnTo(i)) {
                    tester.cross(gatherer, part.cutOut());
                }
            }
        }
        return gatherer.sorted();
    }

    /** Tests the lines near one triangle after another. */
    private final class Tester {
        private final double[] xyz;
        private final int[] corners;
        private int a;
        private int b;
        private int c;
        private double doubleArea;
        private int columnFrom;
        private int columnTo;
        private int rowFrom;
        private int rowTo;
        private double low;
        private double high;
        private double leastX;
        private double greatestX;

        Tester(Mesh mesh) {
            this.xyz = mesh.rawCoordinates();
            this.corners = mesh.rawCorners();
        }

        /** Takes up a triangle; false when no line can cross it. */
        boolean turnTo(int triangle) {
            a = 3 * corners[3 * triangle];
            b = 3 * corners[3 * triangle + 1];
            c = 3 * corners[3 * triangle + 2];
            rowFrom = cell((least(1) - front) / depth);
            rowTo = cell((greatest(1) - front) / depth);
            doubleArea = cross(a, b, xyz[c], xyz[c + 1]);
            boolean outside =
                    greatest(0) < left || least(0) > left + width || greatest(1) < front || least(1) > front + depth;
            return doubleArea != 0 && !outside;
        }

        private int cell(double part) {
            return (int) Math.max(0, Math.min(side - 1, Math.floor(part * side)));
        }

        private double least(int k) {
            return Math.min(xyz[a + k], Math.min(xyz[b + k], xyz[c + k]));
        }

        private double greatest(int k) {
            return Math.max(xyz[a + k], Math.max(xyz[b + k], xyz[c + k]));
        }

        /** How many lines come near the triangle. */
        long lines() {
            long lines = 0;
            for (int row = rowFrom; row <= rowTo; row++) {
                turnToRow(row);
                lines += columnTo - columnFrom + 1;
            }
            return lines;
        }

        void cross(Crossings.Gatherer gatherer, boolean cutOut) {
            boolean up = doubleArea > 0;
            for (int row = rowFrom; row <= rowTo; row++) {
                turnToRow(row);
                for (int column = columnFrom; column <= columnTo; column++) {
                    int ray = row * side + column;
                    if (isInside(up, x[ray], y[ray])) {
                        gatherer.add(ray, height(x[ray], y[ray]), up == cutOut);
                    }
                }
            }
        }

        /** The columns that the triangle reaches in a row: a long narrow one has few of them. */
        private void turnToRow(int row) {
            low = front + depth * row / side;
            high = front + depth * (row + 1) / side;
            leastX = Double.POSITIVE_INFINITY;
            greatestX = Double.NEGATIVE_INFINITY;
            reach(a, b);
            reach(b, c);
            reach(c, a);
            double rim = width * ROUNDING;
            columnFrom = cell((leastX - rim - left) / width);
            columnTo = leastX > greatestX ? columnFrom - 1 : cell((greatestX + rim - left) / width);
        }

        /** Widens the reach by an edge's part in the row. */
        private void reach(int from, int to) {
            double y0 = xyz[from + 1];
            double y1 = xyz[to + 1];
            if (Math.max(y0, y1) < low || Math.min(y0, y1) > high) {
                return;
            }
            double slope = y1 == y0 ? 0 : (xyz[to] - xyz[from]) / (y1 - y0);
            double x0 = y1 == y0 ? xyz[from] : xyz[from] + slope * (Math.max(low, Math.min(high, y0)) - y0);
            double x1 = y1 == y0 ? xyz[to] : xyz[from] + slope * (Math.max(low, Math.min(high, y1)) - y0);
            leastX = Math.min(leastX, Math.min(x0, x1));
            greatestX = Math.max(greatestX, Math.max(x0, x1));
        }

        /** Each edge is judged the same way from both its triangles, so that no line slips between them. */
        private boolean isInside(boolean up, double px, double py) {
            return isLeft(a, b, px, py) == up && isLeft(b, c, px, py) == up && isLeft(c, a, px, py) == up;
        }

        private boolean isLeft(int from, int to, double px, double py) {
            boolean ordered = xyz[from] < xyz[to] || (xyz[from] == xyz[to] && xyz[from + 1] < xyz[to + 1]);
            return ordered ? cross(from, to, px, py) >= 0 : !(cross(to, from, px, py) >= 0);
        }

        private double cross(int from, int to, double px, double py) {
            return (xyz[to] - xyz[from]) * (py - xyz[from + 1]) - (xyz[to + 1] - xyz[from + 1]) * (px - xyz[from]);
        }

        private double height(double px, double py) {
            double atA = cross(b, c, px, py) / doubleArea;
            double atB = cross(c, a, px, py) / doubleArea;
            double z = xyz[c + 2] + atA * (xyz[a + 2] - xyz[c + 2]) + atB * (xyz[b + 2] - xyz[c + 2]);
            return Math.max(least(2), Math.min(greatest(2), z));
        }
    }
}
