package org.evendraft.geometry;

import java.util.List;
import java.util.Optional;

/** A closed body with the integrals that never change: the whole volume, its first moments, its bounds. Immutable. */
public final class Solid {
    private final Mesh mesh;
    private final Optional<Extrusion> extrusion;
    private final double volume;
    private final Vec3 moment;
    private final Vec3 least;
    private final Vec3 greatest;
    private final Vec3 middle;
    private final Vec3 reach;

    private Solid(Mesh mesh, Optional<Extrusion> extrusion) {
        this.mesh = mesh;
        this.extrusion = extrusion;
        double[] x = span(Axis.X.direction());
        double[] y = span(Axis.Y.direction());
        double[] z = span(Axis.Z.direction());
        this.least = new Vec3(x[0], y[0], z[0]);
        this.greatest = new Vec3(x[1], y[1], z[1]);
        this.middle = least.plus(greatest).times(0.5);
        this.reach = greatest.minus(least).times(0.5);
        if (extrusion.isPresent()) {
            this.volume = extrusion.get().volume();
            this.moment = extrusion.get().moment();
        } else {
            Cut whole = new Cut(Plane.ofSlopes(z[1], 0, 0));
            whole.addMesh(1, mesh);
            this.volume = whole.volume();
            this.moment = whole.moment();
        }
    }

    private double[] span(Vec3 direction) {
        return extrusion.map(e -> e.span(direction)).orElseGet(() -> mesh.span(direction));
    }

    /** The body bounded by a mesh. */
    public static Solid ofMesh(Mesh mesh) {
        return new Solid(mesh, Optional.empty());
    }

    /** A box between two opposite corners, its edges along the axes (m). */
    public static Solid box(Vec3 min, Vec3 max) {
        return prism(
                Axis.Z,
                min.z(),
                max.z(),
                List.of(
                        new double[] {min.x(), min.y()},
                        new double[] {max.x(), min.y()},
                        new double[] {max.x(), max.y()},
                        new double[] {min.x(), max.y()}),
                0);
    }

    /**
     * An outline extruded along an axis.
     *
     * @param from first end on the axis (m)
     * @param to other end, greater than from (m)
     * @param outline the other two coordinates of each corner in the order (x, y), (y, z) or (x, z), in either sense (m)
     * @param cornerRadius radius of every corner (m), 0 for sharp ones
     * @throws IllegalArgumentException when the radius does not fit the edges
     */
    public static Solid prism(Axis axis, double from, double to, List<double[]> outline, double cornerRadius) {
        Outline shape = Outline.polygon(outline, cornerRadius);
        Vec3 first = axis.first();
        Vec3 second = axis.second();
        Vec3 along = first.cross(second);
        double startAt = along.dot(axis.direction()) > 0 ? from : to;
        Vec3 start = axis.direction()
                .times(startAt)
                .plus(first.times(shape.centroidP()))
                .plus(second.times(shape.centroidQ()));
        return extruded(shape, start, first, second, along, to - from);
    }

    /**
     * A cylinder, or a frustum of a cone when its diameters differ; an end diameter of 0 makes a cone.
     *
     * @param start centre of the first end (m)
     * @param end centre of the other end (m)
     * @param diameter at the start (m)
     * @param endDiameter at the end (m)
     */
    public static Solid cylinder(Vec3 start, Vec3 end, double diameter, double endDiameter) {
        Vec3 axis = end.minus(start).unit();
        Vec3 aside = Math.abs(axis.z()) < 0.9 ? new Vec3(0, 0, 1) : new Vec3(1, 0, 0);
        Vec3 p = aside.cross(axis).unit();
        Vec3 q = axis.cross(p);
        Outline unit = Outline.circle(0.5);
        if (diameter == endDiameter) {
            return extruded(
                    Outline.circle(diameter / 2),
                    start,
                    p,
                    q,
                    axis,
                    end.minus(start).norm());
        }
        return ofMesh(Loft.between(unit, start, diameter, end, endDiameter, p, q));
    }

    private static Solid extruded(Outline outline, Vec3 start, Vec3 p, Vec3 q, Vec3 axis, double length) {
        Mesh mesh = Loft.between(outline, start, 1, start.plus(axis.times(length)), 1, p, q);
        return new Solid(mesh, Optional.of(new Extrusion(outline, start, p, q, axis, length)));
    }

    /** The surface as triangles. */
    public Mesh mesh() {
        return mesh;
    }

    /** Whole volume (m³); negative when the normals point inward. */
    public double volume() {
        return volume;
    }

    /** Centroid of the whole (m). */
    public Vec3 centroid() {
        return moment.times(1 / volume);
    }

    /** The corner of the bounding box with the least coordinates (m). */
    public Vec3 least() {
        return least;
    }

    /** The corner of the bounding box with the greatest coordinates (m). */
    public Vec3 greatest() {
        return greatest;
    }

    /**
     * Height over the origin of a plane that stands just under the box round the body (m).
     *
     * @param slopeX rise of the plane per metre forward
     * @param slopeY rise per metre to port
     */
    double lowest(double slopeX, double slopeY) {
        return middle.z() - slopeX * middle.x() - slopeY * middle.y() - reach(slopeX, slopeY);
    }

    /** Height over the origin of a plane that stands just over it (m). */
    double highest(double slopeX, double slopeY) {
        return middle.z() - slopeX * middle.x() - slopeY * middle.y() + reach(slopeX, slopeY);
    }

    private double reach(double slopeX, double slopeY) {
        return Math.abs(slopeX) * reach.x() + Math.abs(slopeY) * reach.y() + reach.z();
    }

    /** Adds the integrals of what lies under the cut's plane, times the sign (−1 for a cut-out), by the cheapest exact way. */
    public void addBelow(Cut cut, double sign) {
        Vec3 n = cut.normal();
        double height = cut.height(middle);
        double over = Math.abs(n.x()) * reach.x() + Math.abs(n.y()) * reach.y() + Math.abs(n.z()) * reach.z();
        if (height - over > 0) {
            return;
        }
        if (height + over <= 0) {
            cut.addWhole(sign, volume, moment);
        } else if (extrusion.isPresent()) {
            cut.addPrism(sign, extrusion.get());
        } else {
            cut.addMesh(sign, mesh);
        }
    }

    /**
     * The same by clipping every triangle: the plain method. It equals the other on bodies with flat faces; curves are tessellated
     * here (see {@link Outline#STEP}).
     */
    public void addBelowByTriangles(Cut cut, double sign) {
        cut.addMesh(sign, mesh);
    }
}
