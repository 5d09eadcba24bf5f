package org.evendraft.geometry;

/**
 * The integrals of what lies under a plane, gathered body by body: volume with its first moments, and the section in the plane
 * with its first and second moments. What lies in the plane counts as under it.
 *
 * <p>Volume integrals are taken over the wetted surface by the divergence theorem about the plane's origin, so that the section
 * itself contributes nothing (Mirtich, Fast and Accurate Computation of Polyhedral Mass Properties, J. Graphics Tools 1(2), 1996);
 * section integrals along its edges by Green's theorem. One thread at a time. Only {@link Assembly#hold} moves a cut to another
 * plane, of the same slopes: so that a search makes no object for each plane it tries.
 */
public final class Cut {
    private final Vec3 normal;
    private final Vec3 first;
    private final Vec3 second;
    private double oz;
    private double volume;
    private double momentX;
    private double momentY;
    private double momentZ;
    private double area;
    private double su;
    private double sv;
    private double suu;
    private double suv;
    private double svv;
    private double[] heights = {};
    private final Passage passage = new Passage(this);

    /** Nothing gathered yet under this plane. */
    public Cut(Plane plane) {
        this.normal = plane.normal();
        this.first = plane.first();
        this.second = plane.second();
        this.oz = plane.origin().z();
    }

    /** Lets everything go that was gathered, and begins again under a plane of the same slopes at another height (m). */
    void restart(double heightOverOrigin) {
        oz = heightOverOrigin;
        volume = 0;
        momentX = 0;
        momentY = 0;
        momentZ = 0;
        area = 0;
        su = 0;
        sv = 0;
        suu = 0;
        suv = 0;
        svv = 0;
    }

    /** The plane. */
    public Plane plane() {
        return new Plane(origin(), normal, first, second);
    }

    /** The upward unit normal of the plane. */
    public Vec3 normal() {
        return normal;
    }

    Vec3 first() {
        return first;
    }

    Vec3 second() {
        return second;
    }

    Vec3 origin() {
        return new Vec3(0, 0, oz);
    }

    /** Height of the plane over the platform's origin (m). */
    public double heightOverOrigin() {
        return oz;
    }

    /** Rise of the plane per metre forward. */
    double slopeX() {
        return -normal.x() / normal.z();
    }

    /** Rise of the plane per metre to port. */
    double slopeY() {
        return -normal.y() / normal.z();
    }

    /** The signed distance of a point over the plane (m). */
    double height(Vec3 point) {
        return point.x() * normal.x() + point.y() * normal.y() + (point.z() - oz) * normal.z();
    }

    /** Volume under the plane (m³). */
    public double volume() {
        return volume;
    }

    /** First moments of the volume about the platform's origin (m⁴). */
    public Vec3 moment() {
        return new Vec3(momentX, momentY, momentZ + oz * volume);
    }

    /** Centroid of the volume (m); not a number when the volume is 0. */
    public Vec3 centroid() {
        return new Vec3(momentX / volume, momentY / volume, momentZ / volume + oz);
    }

    /** Area of the section, in its own plane (m²). */
    public double area() {
        return area;
    }

    /** Centroid of the section (m); the plane's origin when the area is 0. */
    public Vec3 sectionCentroid() {
        double per = area == 0 ? 0 : 1 / area;
        return origin().plus(first.times(su * per)).plus(second.times(sv * per));
    }

    /** Second moments of the section about its own centroid, in its own plane. */
    public SecondMoments secondMoments() {
        double per = area == 0 ? 0 : 1 / area;
        double any = area == 0 ? 0 : 1;
        return new SecondMoments(any * svv - sv * sv * per, any * suu - su * su * per, any * suv - su * sv * per);
    }

    /** Area of the section seen from above, on the plane z = 0 (m²). */
    public double projectedArea() {
        return area * normal.z();
    }

    /** Second moments of the section seen from above, on the plane z = 0 along x and y, about its own centroid. */
    public SecondMoments projectedSecondMoments() {
        SecondMoments own = secondMoments();
        double nz = normal.z();
        double ux = first.x();
        double vx = second.x();
        double vy = second.y();
        return new SecondMoments(
                nz * vy * vy * own.transverse(),
                nz * (ux * ux * own.longitudinal() + 2 * ux * vx * own.product() + vx * vx * own.transverse()),
                nz * vy * (ux * own.product() + vx * own.transverse()));
    }

    /** Adds what of a prism lies under the plane. */
    void addPrism(double sign, Extrusion prism) {
        passage.through(prism, sign);
    }

    void addWhole(double sign, double bodyVolume, Vec3 bodyMoment) {
        volume += sign * bodyVolume;
        momentX += sign * bodyMoment.x();
        momentY += sign * bodyMoment.y();
        momentZ += sign * (bodyMoment.z() - oz * bodyVolume);
    }

    /** Adds a part's section integrals, given about the plane's origin in the plane's frame. */
    void addSection(double sign, double a, double au, double av, double auu, double auv, double avv) {
        area += sign * a;
        su += sign * au;
        sv += sign * av;
        suu += sign * auu;
        suv += sign * auv;
        svv += sign * avv;
    }

    /** Adds a body by clipping each of its triangles. */
    void addMesh(double sign, Mesh mesh) {
        double[] xyz = mesh.rawCoordinates();
        int[] corners = mesh.rawCorners();
        double[] h = heightsOf(xyz);
        for (int i = 0; i < corners.length; i += 3) {
            int a = corners[i];
            int b = corners[i + 1];
            int c = corners[i + 2];
            int wet = (h[a] <= 0 ? 1 : 0) + (h[b] <= 0 ? 2 : 0) + (h[c] <= 0 ? 4 : 0);
            switch (wet) {
                case 7 -> addTriangle(sign, xyz, a, b, c);
                case 1 -> addOneWet(sign, xyz, h, a, b, c);
                case 2 -> addOneWet(sign, xyz, h, b, c, a);
                case 4 -> addOneWet(sign, xyz, h, c, a, b);
                case 3 -> addTwoWet(sign, xyz, h, a, b, c);
                case 6 -> addTwoWet(sign, xyz, h, b, c, a);
                case 5 -> addTwoWet(sign, xyz, h, c, a, b);
                default -> {}
            }
        }
    }

    private double[] heightsOf(double[] xyz) {
        int n = xyz.length / 3;
        if (heights.length < n) {
            heights = new double[n];
        }
        double nx = normal.x();
        double ny = normal.y();
        double nz = normal.z();
        for (int i = 0, k = 0; i < n; i++, k += 3) {
            heights[i] = xyz[k] * nx + xyz[k + 1] * ny + (xyz[k + 2] - oz) * nz;
        }
        return heights;
    }

    private void addTriangle(double sign, double[] xyz, int a, int b, int c) {
        addTetrahedron(
                sign,
                xyz[3 * a],
                xyz[3 * a + 1],
                xyz[3 * a + 2] - oz,
                xyz[3 * b],
                xyz[3 * b + 1],
                xyz[3 * b + 2] - oz,
                xyz[3 * c],
                xyz[3 * c + 1],
                xyz[3 * c + 2] - oz);
    }

    /** The triangle a, b, c with only a wet: the corner at a is added, and its edge in the plane. */
    private void addOneWet(double sign, double[] xyz, double[] h, int a, int b, int c) {
        double ax = xyz[3 * a];
        double ay = xyz[3 * a + 1];
        double az = xyz[3 * a + 2] - oz;
        double s = h[a] / (h[a] - h[b]);
        double px = ax + s * (xyz[3 * b] - ax);
        double py = ay + s * (xyz[3 * b + 1] - ay);
        double pz = az + s * (xyz[3 * b + 2] - oz - az);
        double t = h[a] / (h[a] - h[c]);
        double qx = ax + t * (xyz[3 * c] - ax);
        double qy = ay + t * (xyz[3 * c + 1] - ay);
        double qz = az + t * (xyz[3 * c + 2] - oz - az);
        addTetrahedron(sign, ax, ay, az, px, py, pz, qx, qy, qz);
        addEdge(sign, qx, qy, qz, px, py, pz);
    }

    /** The triangle a, b, c with a and b wet: the quadrilateral under the plane is added, and its edge in the plane. */
    private void addTwoWet(double sign, double[] xyz, double[] h, int a, int b, int c) {
        double ax = xyz[3 * a];
        double ay = xyz[3 * a + 1];
        double az = xyz[3 * a + 2] - oz;
        double bx = xyz[3 * b];
        double by = xyz[3 * b + 1];
        double bz = xyz[3 * b + 2] - oz;
        double cx = xyz[3 * c];
        double cy = xyz[3 * c + 1];
        double cz = xyz[3 * c + 2] - oz;
        double s = h[b] / (h[b] - h[c]);
        double px = bx + s * (cx - bx);
        double py = by + s * (cy - by);
        double pz = bz + s * (cz - bz);
        double t = h[a] / (h[a] - h[c]);
        double qx = ax + t * (cx - ax);
        double qy = ay + t * (cy - ay);
        double qz = az + t * (cz - az);
        addTetrahedron(sign, ax, ay, az, bx, by, bz, px, py, pz);
        addTetrahedron(sign, ax, ay, az, px, py, pz, qx, qy, qz);
        addEdge(sign, qx, qy, qz, px, py, pz);
    }

    /** The tetrahedron from the plane's origin over a triangle, by its signed volume and centroid. */
    private void addTetrahedron(
            double sign,
            double ax,
            double ay,
            double az,
            double bx,
            double by,
            double bz,
            double cx,
            double cy,
            double cz) {
        double six = sign * (ax * (by * cz - bz * cy) + ay * (bz * cx - bx * cz) + az * (bx * cy - by * cx));
        volume += six / 6;
        momentX += six / 24 * (ax + bx + cx);
        momentY += six / 24 * (ay + by + cy);
        momentZ += six / 24 * (az + bz + cz);
    }

    /** A directed edge of the section from p to q, the section on its left seen from above. */
    private void addEdge(double sign, double px, double py, double pz, double qx, double qy, double qz) {
        Vec3 e = first;
        Vec3 f = second;
        double u0 = px * e.x() + py * e.y() + pz * e.z();
        double v0 = px * f.x() + py * f.y() + pz * f.z();
        double u1 = qx * e.x() + qy * e.y() + qz * e.z();
        double v1 = qx * f.x() + qy * f.y() + qz * f.z();
        double c = sign * (u0 * v1 - u1 * v0);
        area += c / 2;
        su += c * (u0 + u1) / 6;
        sv += c * (v0 + v1) / 6;
        suu += c * (u0 * u0 + u0 * u1 + u1 * u1) / 12;
        svv += c * (v0 * v0 + v0 * v1 + v1 * v1) / 12;
        suv += c * (u0 * v1 + 2 * u0 * v0 + 2 * u1 * v1 + u1 * v0) / 24;
    }
}
