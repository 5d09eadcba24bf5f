package org.evendraft.stability;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.evendraft.geometry.Axis;
import org.evendraft.geometry.Mesh;
import org.evendraft.geometry.Solid;
import org.evendraft.geometry.Vec3;
import org.evendraft.platform.Body;
import org.evendraft.platform.Compartment;
import org.evendraft.platform.Condition;
import org.evendraft.platform.Condition.FreeSurface;
import org.evendraft.platform.Fill;
import org.evendraft.platform.Lightship;
import org.evendraft.platform.Load;
import org.evendraft.platform.Platform;
import org.evendraft.platform.PreparedPlatform;
import org.evendraft.platform.Purpose;
import org.evendraft.platform.StabilityRules;
import org.evendraft.platform.Tank;

/** Simple platforms and published floaters for tests, put together in code. */
public final class Floaters {
    private Floaters() {}

    /** A solid body. */
    public static Body body(String name, Solid solid) {
        return new Body(name, false, solid);
    }

    /** A box body between opposite corners (m). */
    public static Body box(String name, double x0, double x1, double y0, double y1, double z0, double z1) {
        return body(name, Solid.box(new Vec3(x0, y0, z0), new Vec3(x1, y1, z1)));
    }

    /** A round body (m). */
    public static Body cylinder(String name, Vec3 start, Vec3 end, double diameter) {
        return body(name, Solid.cylinder(start, end, diameter, diameter));
    }

    /** A tank of a body for ballast, permeability 1. */
    public static Tank tank(String id, Body body) {
        return new Tank(id, id, Purpose.BALLAST, 1.025, List.of(body), List.of(), 1, 0.98, 0, 1, false);
    }

    /** A platform of a hull, a lightship and tanks, nothing else. */
    public static PreparedPlatform platform(List<Body> hull, double mass, Vec3 centre, List<Tank> tanks) {
        return platform(hull, new Lightship(mass, centre), tanks, List.of());
    }

    /** A platform of a hull and a lightship with one compartment that may flood, permeability 1. */
    public static PreparedPlatform flooding(List<Body> hull, double mass, Vec3 centre, Body compartment) {
        Compartment whole = new Compartment(compartment.name(), List.of(compartment), 1);
        return platform(hull, new Lightship(mass, centre), List.of(), List.of(whole));
    }

    private static PreparedPlatform platform(
            List<Body> hull, Lightship lightship, List<Tank> tanks, List<Compartment> compartments) {
        return new PreparedPlatform(new Platform(
                "test",
                "Test",
                1.025,
                hull,
                List.of(),
                lightship,
                tanks,
                List.of(),
                List.of(),
                List.of(),
                List.of(),
                List.of(),
                compartments,
                StabilityRules.NONE,
                List.of()));
    }

    /** A condition in sea water, actual free surfaces, no mode. */
    public static Condition condition(List<Fill> fills, List<Load> loads) {
        return new Condition("test", Optional.empty(), 1.025, FreeSurface.ACTUAL, fills, loads);
    }

    /** A floating box, keel at z = 0, amidships at the origin, with its centre of gravity on the centreline. */
    public static PreparedPlatform bargeAt(double length, double breadth, double depth, double draft, double kg) {
        Body hull = box("hull", -length / 2, length / 2, -breadth / 2, breadth / 2, 0, depth);
        return platform(List.of(hull), 1.025 * length * breadth * draft, new Vec3(0, 0, kg), List.of());
    }

    /**
     * OC4-DeepCwind semi-submersible, origin moved to the keel (z + 20 m): Robertson et al., NREL/TP-5000-60601, members as in the
     * open HydroDyn input of the OpenFAST regression tests.
     */
    public static List<Body> oc4(boolean braces) {
        double keel = 20;
        List<Body> bodies = new ArrayList<>();
        bodies.add(cylinder("main column", new Vec3(0, 0, 0), new Vec3(0, 0, keel + 10), 6.5));
        double[][] axes = {{14.43376, 25.0}, {14.43376, -25.0}, {-28.86751, 0}};
        for (int i = 0; i < 3; i++) {
            double x = axes[i][0];
            double y = axes[i][1];
            bodies.add(cylinder("base column " + (i + 1), new Vec3(x, y, 0), new Vec3(x, y, keel - 14), 24));
            bodies.add(cylinder("upper column " + (i + 1), new Vec3(x, y, keel - 14), new Vec3(x, y, keel + 12), 12));
            if (braces) {
                addBraces(bodies, keel, Math.atan2(y, x), i + 1);
            }
        }
        return bodies;
    }

    private static void addBraces(List<Body> bodies, double keel, double direction, int number) {
        double d = 1.6;
        bodies.add(cylinder(
                "upper Y " + number, polar(3.25, direction, keel + 10), polar(22.87, direction, keel + 10), d));
        bodies.add(cylinder(
                "lower Y " + number, polar(3.25, direction, keel - 17), polar(16.87, direction, keel - 17), d));
        bodies.add(cylinder(
                "cross brace " + number, polar(3.25, direction, keel - 16.2), polar(22.87, direction, keel + 9.13), d));
        double turn = 2 * Math.PI / 3 * number;
        bodies.add(cylinder(
                "upper delta " + number, turned(9.2376, 22, keel + 10, turn), turned(-23.6713, 3, keel + 10, turn), d));
        bodies.add(cylinder(
                "lower delta " + number,
                turned(4.04145, 19, keel - 17, turn),
                turned(-18.4752, 6, keel - 17, turn),
                d));
    }

    private static Vec3 polar(double r, double direction, double z) {
        return new Vec3(r * Math.cos(direction), r * Math.sin(direction), z);
    }

    private static Vec3 turned(double x, double y, double z, double turn) {
        return new Vec3(x * Math.cos(turn) - y * Math.sin(turn), x * Math.sin(turn) + y * Math.cos(turn), z);
    }

    /** ITI Energy barge with its moonpool: Jonkman, NREL/TP-500-41958. */
    public static List<Body> itiBarge() {
        return List.of(
                box("barge", -20, 20, -20, 20, 0, 10),
                new Body("moonpool", true, Solid.box(new Vec3(-5, -5, 0), new Vec3(5, 5, 10))));
    }

    /** A synthetic twin-pontoon hull: pontoons 100 × 15 × 8 m at y = ±30 m, four square columns of 12 m at x = ±35 m. */
    public static List<Body> twinPontoon() {
        List<Body> bodies = new ArrayList<>();
        for (int side : new int[] {1, -1}) {
            bodies.add(box("pontoon " + side, -50, 50, side * 30 - 7.5, side * 30 + 7.5, 0, 8));
            for (int end : new int[] {1, -1}) {
                bodies.add(box(
                        "column " + side + " " + end, end * 35 - 6, end * 35 + 6, side * 30 - 6, side * 30 + 6, 8, 30));
            }
        }
        return bodies;
    }

    /** A prism along x of a given outline in (y, z). */
    public static Solid along(double x0, double x1, List<double[]> outline, double radius) {
        return Solid.prism(Axis.X, x0, x1, outline, radius);
    }

    /** A closed mesh over a grid of a sphere. */
    public static Mesh sphere(double radius, Vec3 centre, int rings, int spokes) {
        int n = 2 + (rings - 1) * spokes;
        double[] xyz = new double[3 * n];
        put(xyz, 0, centre.plus(new Vec3(0, 0, -radius)));
        put(xyz, n - 1, centre.plus(new Vec3(0, 0, radius)));
        for (int r = 1; r < rings; r++) {
            double latitude = -Math.PI / 2 + Math.PI * r / rings;
            for (int k = 0; k < spokes; k++) {
                double longitude = 2 * Math.PI * k / spokes;
                Vec3 v = new Vec3(
                        Math.cos(latitude) * Math.cos(longitude),
                        Math.cos(latitude) * Math.sin(longitude),
                        Math.sin(latitude));
                put(xyz, 1 + (r - 1) * spokes + k, centre.plus(v.times(radius)));
            }
        }
        List<Integer> corners = new ArrayList<>();
        for (int k = 0; k < spokes; k++) {
            int next = (k + 1) % spokes;
            corners.addAll(List.of(0, 1 + next, 1 + k));
            corners.addAll(List.of(n - 1, n - 1 - spokes + k, n - 1 - spokes + next));
            for (int r = 1; r < rings - 1; r++) {
                int low = 1 + (r - 1) * spokes;
                int high = low + spokes;
                corners.addAll(List.of(low + k, low + next, high + next));
                corners.addAll(List.of(low + k, high + next, high + k));
            }
        }
        return new Mesh(xyz, corners.stream().mapToInt(Integer::intValue).toArray());
    }

    private static void put(double[] xyz, int i, Vec3 v) {
        xyz[3 * i] = v.x();
        xyz[3 * i + 1] = v.y();
        xyz[3 * i + 2] = v.z();
    }
}
