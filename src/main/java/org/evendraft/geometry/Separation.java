package org.evendraft.geometry;

/** Quick proofs that two bodies have nothing in common but, at most, their surfaces. */
final class Separation {
    /** Bodies that reach into each other by less only touch (m). */
    static final double TOUCHING = 1e-6;

    /** So many vertices are compared with planes at most, then there is no proof. */
    private static final int MOST_TESTS = 50_000_000;

    private int tests;

    private Separation() {}

    /** Whether the bounding boxes, or the plane of some face of either, lie between two bodies. False when no such proof is found. */
    static boolean isProved(Solid a, Solid b) {
        Separation search = new Separation();
        return boxesApart(a, b) || search.faceBetween(a.mesh(), b.mesh()) || search.faceBetween(b.mesh(), a.mesh());
    }

    private static boolean boxesApart(Solid a, Solid b) {
        return apart(
                        a.least().x(),
                        a.greatest().x(),
                        b.least().x(),
                        b.greatest().x())
                || apart(
                        a.least().y(),
                        a.greatest().y(),
                        b.least().y(),
                        b.greatest().y())
                || apart(
                        a.least().z(),
                        a.greatest().z(),
                        b.least().z(),
                        b.greatest().z());
    }

    private static boolean apart(double fromA, double toA, double fromB, double toB) {
        return fromA >= toB - TOUCHING || fromB >= toA - TOUCHING;
    }

    private boolean faceBetween(Mesh own, Mesh other) {
        for (int i = 0; i < own.triangleCount() && tests < MOST_TESTS; i++) {
            Vec3 corner = own.vertex(own.corner(i, 0));
            Vec3 normal = own.vertex(own.corner(i, 1))
                    .minus(corner)
                    .cross(own.vertex(own.corner(i, 2)).minus(corner));
            double length = normal.norm();
            if (length > 0) {
                Vec3 unit = normal.times(1 / length);
                double height = unit.dot(corner);
                if (allBeyond(other, unit, height - TOUCHING) && allBeyond(own, unit.times(-1), -height - TOUCHING)) {
                    return true;
                }
            }
        }
        return false;
    }

    private boolean allBeyond(Mesh mesh, Vec3 normal, double height) {
        double[] xyz = mesh.rawCoordinates();
        for (int k = 0; k < xyz.length; k += 3) {
            tests++;
            if (xyz[k] * normal.x() + xyz[k + 1] * normal.y() + xyz[k + 2] * normal.z() < height) {
                return false;
            }
        }
        return true;
    }
}
