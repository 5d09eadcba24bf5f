package org.evendraft.geometry;

import java.util.List;
import java.util.function.ToDoubleFunction;

/** Bodies that together make one space, cut-outs negative: a hull, whole or damaged, or the inside of a tank. Immutable. */
public final class Assembly {
    private static final int MOST_STEPS = 200;
    /** Volume is met to this part of the whole. */
    private static final double VOLUME_TOLERANCE = 1e-13;

    private final List<Part> parts;
    private final double volume;

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
        this.parts = List.copyOf(parts);
        this.volume = this.parts.stream()
                .mapToDouble(part -> part.weight() * part.solid().volume())
                .sum();
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
        for (Part part : parts) {
            part.solid().addBelow(cut, part.weight());
        }
        return cut;
    }

    /** The same by clipping every triangle: slow, for comparison. */
    public Cut belowByTriangles(Plane plane) {
        Cut cut = new Cut(plane);
        for (Part part : parts) {
            part.solid().addBelowByTriangles(cut, part.weight());
        }
        return cut;
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
        if (!(target >= 0) || target > volume) {
            throw new IllegalArgumentException("volume " + target + " of " + volume + " m³");
        }
        double low = lowest(slopeX, slopeY);
        double high = highest(slopeX, slopeY);
        double c = guess > low && guess < high ? guess : low + (high - low) * target / volume;
        Cut cut = below(Plane.ofSlopes(c, slopeX, slopeY));
        for (int i = 0; i < MOST_STEPS; i++) {
            double excess = cut.volume() - target;
            if (Math.abs(excess) <= VOLUME_TOLERANCE * volume || high - low <= Math.ulp(high) * 4) {
                return cut;
            }
            if (excess > 0) {
                high = c;
            } else {
                low = c;
            }
            double step = excess / (cut.area() * cut.plane().normal().z());
            if (Math.abs(step) <= Math.ulp(c)) {
                return cut;
            }
            c = c - step > low && c - step < high ? c - step : (low + high) / 2;
            cut = below(Plane.ofSlopes(c, slopeX, slopeY));
        }
        return cut;
    }

    private double lowest(double slopeX, double slopeY) {
        double least = Double.POSITIVE_INFINITY;
        for (Part part : parts) {
            Vec3 a = part.solid().least();
            Vec3 b = part.solid().greatest();
            double c = a.z() - Math.max(slopeX * a.x(), slopeX * b.x()) - Math.max(slopeY * a.y(), slopeY * b.y());
            least = Math.min(least, c);
        }
        return least;
    }

    private double highest(double slopeX, double slopeY) {
        double greatest = Double.NEGATIVE_INFINITY;
        for (Part part : parts) {
            Vec3 a = part.solid().least();
            Vec3 b = part.solid().greatest();
            double c = b.z() - Math.min(slopeX * a.x(), slopeX * b.x()) - Math.min(slopeY * a.y(), slopeY * b.y());
            greatest = Math.max(greatest, c);
        }
        return greatest;
    }
}
