package org.evendraft.geometry;

import java.util.List;

/**
 * What two spaces have in common. Exact where a plane separates them; else by upright lines on a grid, each measured exactly, which is
 * good to about one percent of what is found and misses what is narrower than a hundredth of the box that they share.
 */
public final class Overlap {
    /** When less than this part of the lines found something, the grid is laid again round those that did. */
    private static final double SPARSE = 0.25;

    private static final int MOST_CLOSER_LOOKS = 3;

    private Overlap() {}

    /** The volume in common of two bodies (m³). */
    public static double volume(Solid a, Solid b) {
        return volume(space(a), space(b));
    }

    /** The volume in common of two spaces (m³), cut-outs taken off. */
    public static double volume(Assembly a, Assembly b) {
        if (areApart(a, b)) {
            return 0;
        }
        Vec3 min = greater(a.least(), b.least());
        Vec3 max = lesser(a.greatest(), b.greatest());
        Found found = common(Rays.through(min, max, a, b), a, b);
        for (int i = 0; i < MOST_CLOSER_LOOKS && found.isSparse(); i++) {
            Found closer = common(Rays.through(found.min, found.max, a, b), a, b);
            found = closer.lines > 0 ? closer : found;
        }
        return found.volume;
    }

    /**
     * The part of a space that lies outside another, 0 to 1.
     *
     * @param inner the space that should lie inside
     * @param outer the other
     */
    public static double partOutside(Assembly inner, Assembly outer) {
        Rays rays = Rays.through(inner.least(), inner.greatest(), inner, outer);
        Crossings ofInner = rays.crossings(inner);
        double whole = common(rays, ofInner, ofInner).volume;
        double within = common(rays, ofInner, rays.crossings(outer)).volume;
        return whole > 0 ? Math.max(0, 1 - within / whole) : 0;
    }

    /** The volume that a body's surface winds round otherwise than once: where it crosses itself, or is partly inside out (m³). */
    static double folded(Solid solid) {
        Assembly space = space(solid);
        Rays rays = Rays.through(space.least(), space.greatest(), space);
        Crossings crossings = rays.crossings(space);
        double length = 0;
        for (int ray = 0; ray < rays.count(); ray++) {
            int winding = 0;
            for (int i = crossings.start(ray); i < crossings.start(ray + 1); i++) {
                if (winding < 0 || winding > 1) {
                    length += crossings.height(i) - crossings.height(i - 1);
                }
                winding += crossings.step(i);
            }
        }
        return length * rays.cellArea();
    }

    private static Assembly space(Solid solid) {
        return new Assembly(List.of(new Assembly.Part(solid, false)));
    }

    private static boolean areApart(Assembly a, Assembly b) {
        return a.parts().stream()
                .filter(part -> !part.cutOut())
                .allMatch(one -> b.parts().stream()
                        .filter(part -> !part.cutOut())
                        .allMatch(other -> Separation.isProved(one.solid(), other.solid())));
    }

    private static Found common(Rays rays, Assembly a, Assembly b) {
        return common(rays, rays.crossings(a), rays.crossings(b));
    }

    private static Found common(Rays rays, Crossings a, Crossings b) {
        Found found = new Found(rays.count());
        for (int ray = 0; ray < rays.count(); ray++) {
            double length = commonLength(ray, a, b);
            if (length > 0) {
                found.add(length * rays.cellArea(), rays.cellMin(ray), rays.cellMax(ray));
            }
        }
        return found;
    }

    private static double commonLength(int ray, Crossings a, Crossings b) {
        int i = a.start(ray);
        int j = b.start(ray);
        int inA = 0;
        int inB = 0;
        double length = 0;
        double last = 0;
        while (i < a.start(ray + 1) && j < b.start(ray + 1)) {
            boolean first = a.height(i) <= b.height(j);
            double height = first ? a.height(i) : b.height(j);
            length += inA > 0 && inB > 0 ? height - last : 0;
            last = height;
            if (first) {
                inA += a.step(i++);
            } else {
                inB += b.step(j++);
            }
        }
        return length;
    }

    private static Vec3 lesser(Vec3 a, Vec3 b) {
        return new Vec3(Math.min(a.x(), b.x()), Math.min(a.y(), b.y()), Math.min(a.z(), b.z()));
    }

    private static Vec3 greater(Vec3 a, Vec3 b) {
        return new Vec3(Math.max(a.x(), b.x()), Math.max(a.y(), b.y()), Math.max(a.z(), b.z()));
    }

    /** What the lines found: the volume, and the rectangle round the cells of those that found some. */
    private static final class Found {
        private final int all;
        private int lines;
        private double volume;
        private Vec3 min = new Vec3(Double.POSITIVE_INFINITY, Double.POSITIVE_INFINITY, 0);
        private Vec3 max = new Vec3(Double.NEGATIVE_INFINITY, Double.NEGATIVE_INFINITY, 0);

        Found(int all) {
            this.all = all;
        }

        void add(double more, Vec3 cellMin, Vec3 cellMax) {
            lines++;
            volume += more;
            Vec3 rim = cellMax.minus(cellMin);
            min = lesser(min, cellMin.minus(rim));
            max = greater(max, cellMax.plus(rim));
        }

        boolean isSparse() {
            return lines > 0 && lines < SPARSE * all;
        }
    }
}
