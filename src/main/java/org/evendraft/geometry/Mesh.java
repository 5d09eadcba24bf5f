package org.evendraft.geometry;

import java.util.Arrays;

/**
 * A closed surface of triangles with outward normals (seen from outside the vertices of a triangle run anticlockwise). Immutable.
 * The caps of shapes made here may be fans whose triangles overlap with opposite signs: every integral stays exact.
 */
public final class Mesh {
    private final double[] coordinates;
    private final int[] corners;

    /**
     * A mesh from flat arrays, which are copied.
     *
     * @param coordinates x, y, z of each vertex in turn (m)
     * @param corners three vertex numbers for each triangle in turn
     * @throws IllegalArgumentException when a length is no multiple of three or a vertex number does not exist
     */
    public Mesh(double[] coordinates, int[] corners) {
        if (coordinates.length % 3 != 0 || corners.length % 3 != 0) {
            throw new IllegalArgumentException("lengths must be multiples of three");
        }
        for (int corner : corners) {
            if (corner < 0 || corner >= coordinates.length / 3) {
                throw new IllegalArgumentException("no vertex number " + corner);
            }
        }
        this.coordinates = coordinates.clone();
        this.corners = corners.clone();
    }

    /** The number of vertices. */
    public int vertexCount() {
        return coordinates.length / 3;
    }

    /** The number of triangles. */
    public int triangleCount() {
        return corners.length / 3;
    }

    /** Vertex number i. */
    public Vec3 vertex(int i) {
        return new Vec3(coordinates[3 * i], coordinates[3 * i + 1], coordinates[3 * i + 2]);
    }

    /**
     * The vertex number at a corner of a triangle.
     *
     * @param triangle number of the triangle
     * @param k 0, 1 or 2
     */
    public int corner(int triangle, int k) {
        return corners[3 * triangle + k];
    }

    /** Least and greatest reach of the vertices along a direction from the origin (m). */
    double[] span(Vec3 direction) {
        double[] span = {Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY};
        for (int i = 0; i < coordinates.length; i += 3) {
            double reach = direction.x() * coordinates[i]
                    + direction.y() * coordinates[i + 1]
                    + direction.z() * coordinates[i + 2];
            span[0] = Math.min(span[0], reach);
            span[1] = Math.max(span[1], reach);
        }
        return span;
    }

    /** The same surface seen from the other side: every normal reversed. */
    public Mesh reversed() {
        int[] flipped = corners.clone();
        for (int i = 0; i < flipped.length; i += 3) {
            flipped[i] = corners[i + 1];
            flipped[i + 1] = corners[i];
        }
        return new Mesh(coordinates, flipped);
    }

    /** The same triangles with vertices of the same coordinates made one, and vertices of no triangle left out. */
    public Mesh tidied() {
        Welder welder = new Welder(0);
        int[] renumbered = new int[corners.length];
        for (int i = 0; i < corners.length; i++) {
            int k = 3 * corners[i];
            renumbered[i] = welder.number(coordinates[k], coordinates[k + 1], coordinates[k + 2]);
        }
        return new Mesh(welder.coordinates(), renumbered);
    }

    /** Coordinates for loops that cannot afford an object for each vertex; never written to. */
    double[] rawCoordinates() {
        return coordinates;
    }

    /** Vertex numbers for the same loops; never written to. */
    int[] rawCorners() {
        return corners;
    }

    @Override
    public boolean equals(Object o) {
        return o instanceof Mesh m && Arrays.equals(coordinates, m.coordinates) && Arrays.equals(corners, m.corners);
    }

    @Override
    public int hashCode() {
        return 31 * Arrays.hashCode(coordinates) + Arrays.hashCode(corners);
    }
}
