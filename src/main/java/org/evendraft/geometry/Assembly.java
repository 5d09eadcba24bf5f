package org.evendraft.geometry;

import java.util.List;
import java.util.function.ToDoubleFunction;

/** Bodies that together make one space, cut-outs negative: a hull, whole or damaged, or the inside of a tank. Immutable. */
public final class Assembly {
    private static final int MOST_STEPS = 200;
    /** Volume is met to this part of the whole. */
    private static final double VOLUME_TOLERANCE = 1e-13;

    private final List<Part> parts;
    /** The same parts, for loops that shall make no iterator. */
    private final Part[] run;

    private final double volume;
    private final boolean shortCuts;

    /**
     * A body with its weight.
     *
     * @param solid the body
     * @param weight how often it counts: 1 for a body, −1 for a cut-out, −permeability for a space of it that the sea has flooded
     */
    public record Part(Solid solid, double weight) {
        /** A body, or a cut-out, which counts negative. */
        public Part(Solid solid, boolean cutOut) {
            this(solid, cutOut ? -1 : 1);
        }

        /** Whether it counts negative. */
        public boolean cutOut() {
            return weight < 0;
        }
    }

    /** All parts together. */
    public Assembly(List<Part> parts) {
        this(parts, true);
    }

    private Assembly(List<Part> parts, boolean shortCuts) {
        this.parts = List.copyOf(parts);
        this.run = parts.toArray(new Part[0]);
        this.shortCuts = shortCuts;
        this.volume = this.parts.stream()
                .mapToDouble(part -> part.weight() * part.solid().volume())
                .sum();
    }

    /** The same without short cuts, every triangle clipped for every plane: slow, for comparison. */
    public Assembly byTriangles() {
        return new Assembly(parts, false);
    }

    /** The parts. */
    public List<Part> parts() {
        return parts;
    }

    /** Whole volume, cut-outs taken off (m³). */
    public double volume() {
        return volume;
    }

    /** Centroid of the whole (m). */
    public Vec3 centroid() {
        Vec3 moment = Vec3.ZERO;
        for (Part part : parts) {
            moment = moment.plus(
                    part.solid().centroid().times(part.weight() * part.solid().volume()));
        }
        return moment.times(1 / volume);
    }

    /** The integrals under a plane. */
    public Cut below(Plane plane) {
        Cut cut = new Cut(plane);
        gather(cut);
        return cut;
    }

    private void gather(Cut cut) {
        for (Part part : run) {
            if (shortCuts) {
                part.solid().addBelow(cut, part.weight());
            } else {
                part.solid().addBelowByTriangles(cut, part.weight());
            }
        }
    }

    /** The same by clipping every triangle: slow, for comparison. */
    public Cut belowByTriangles(Plane plane) {
        return byTriangles().below(plane);
    }

    /** The corner of the box round all parts with the least coordinates (m). */
    public Vec3 least() {
        return new Vec3(
                least(p -> p.solid().least().x()),
                least(p -> p.solid().least().y()),
                least(p -> p.solid().least().z()));
    }

    /** The corner of the box round all parts with the greatest coordinates (m). */
    public Vec3 greatest() {
        return new Vec3(
                -least(p -> -p.solid().greatest().x()),
                -least(p -> -p.solid().greatest().y()),
                -least(p -> -p.solid().greatest().z()));
    }

    private double least(ToDoubleFunction<Part> coordinate) {
        return parts.stream().mapToDouble(coordinate).min().orElse(0);
    }

    /** Height of the lowest point (m). */
    public double lowest() {
        return lowest(0, 0);
    }

    /** Height of the highest point (m). */
    public double highest() {
        return highest(0, 0);
    }

    /**
     * The cut with a given volume under a plane of given slopes: Newton with the section as slope, kept inside a bracket.
     *
     * @param target volume under the plane (m³), from 0 to the whole
     * @param slopeX rise of the plane per metre forward
     * @param slopeY rise per metre to port
     * @param guess height of the plane over the origin to start from (m); not a number when there is none
     * @throws IllegalArgumentException when the volume is negative or more than the whole
     */
    public Cut holding(double target, double slopeX, double slopeY, double guess) {
        Cut cut = new Cut(Plane.ofSlopes(0, slopeX, slopeY));
        hold(cut, target, guess);
        return cut;
    }

    /**
     * Moves a cut, its slopes kept, to the height at which a given volume lies under its plane, as {@link #holding} finds it.
     *
     * @param cut what was gathered in it is let go
     * @param target volume under the plane (m³), from 0 to the whole
     * @param guess height of the plane over the origin to start from (m); not a number when there is none
     * @throws IllegalArgumentException when the volume is negative or more than the whole
     */
    public void hold(Cut cut, double target, double guess) {
        if (!(target >= 0) || target > volume) {
            throw new IllegalArgumentException("volume " + target + " of " + volume + " m³");
        }
        double c = guess;
        if (!Double.isNaN(guess) && meets(cut, target, c)) {
            return;
        }
        double low = lowest(cut.slopeX(), cut.slopeY());
        double high = highest(cut.slopeX(), cut.slopeY());
        if (!(c > low && c < high)) {
            c = low + (high - low) * target / volume;
            gatherAt(cut, c);
        }
        for (int i = 0; i < MOST_STEPS; i++) {
            double excess = cut.volume() - target;
            if (Math.abs(excess) <= VOLUME_TOLERANCE * volume || high - low <= Math.ulp(high) * 4) {
                return;
            }
            if (excess > 0) {
                high = c;
            } else {
                low = c;
            }
            double step = excess / (cut.area() * cut.normal().z());
            if (Math.abs(step) <= Math.ulp(c)) {
                return;
            }
            c = c - step > low && c - step < high ? c - step : (low + high) / 2;
            gatherAt(cut, c);
        }
    }

    /** Moves the cut, and tells whether it then has the volume: so it is at once where the guess is a good one. */
    private boolean meets(Cut cut, double target, double heightOverOrigin) {
        gatherAt(cut, heightOverOrigin);
        return Math.abs(cut.volume() - target) <= VOLUME_TOLERANCE * volume;
    }

    private void gatherAt(Cut cut, double heightOverOrigin) {
        cut.restart(heightOverOrigin);
        gather(cut);
    }

    private double lowest(double slopeX, double slopeY) {
        double least = Double.POSITIVE_INFINITY;
        for (Part part : run) {
            least = Math.min(least, part.solid().lowest(slopeX, slopeY));
        }
        return least;
    }

    private double highest(double slopeX, double slopeY) {
        double greatest = Double.NEGATIVE_INFINITY;
        for (Part part : run) {
            greatest = Math.max(greatest, part.solid().highest(slopeX, slopeY));
        }
        return greatest;
    }
}
