package org.evendraft.stability.damage;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Collectors;
import org.evendraft.geometry.Axis;
import org.evendraft.geometry.Solid;
import org.evendraft.geometry.Vec3;
import org.evendraft.platform.Body;
import org.evendraft.platform.Compartment;
import org.evendraft.platform.DamageCase;
import org.evendraft.platform.Lightship;
import org.evendraft.platform.Mode;
import org.evendraft.platform.Platform;
import org.evendraft.platform.PreparedPlatform;
import org.evendraft.platform.StabilityRules;

/** Simple layouts of columns and compartments. */
final class Layouts {
    private static final int ARC_STEPS = 60;

    private Layouts() {}

    /** A platform of bodies and compartments. */
    static PreparedPlatform platform(List<Body> hull, List<Compartment> compartments) {
        return new PreparedPlatform(new Platform(
                "test",
                "Test",
                1.025,
                hull,
                List.of(),
                new Lightship(1, Vec3.ZERO),
                List.of(),
                List.of(),
                List.of(),
                List.of(),
                List.of(),
                List.of(),
                compartments,
                StabilityRules.NONE,
                List.of()));
    }

    /** A mode of a range of drafts (m). */
    static Mode mode(double least, double greatest) {
        return mode(Optional.of(new Mode.DraftRange(least, greatest)));
    }

    static Mode mode(Optional<Mode.DraftRange> drafts) {
        OptionalDouble none = OptionalDouble.empty();
        return new Mode("test", "Test", drafts, Optional.empty(), List.of(), none, none, none, none);
    }

    static Solid box(double x0, double x1, double y0, double y1, double z0, double z1) {
        return Solid.box(new Vec3(x0, y0, z0), new Vec3(x1, y1, z1));
    }

    static Body body(String name, Solid solid) {
        return new Body(name, false, solid);
    }

    static Compartment compartment(String id, Solid solid) {
        return new Compartment(id, List.of(body(id, solid)), 0.95);
    }

    /** A round column about the z axis. */
    static Body roundColumn(double diameter, double height) {
        return body("column", Solid.cylinder(Vec3.ZERO, new Vec3(0, 0, height), diameter, diameter));
    }

    /** Sectors of a ring about the z axis, named R1, R2 and so on from the x axis towards y. */
    static List<Compartment> ring(double inner, double outer, double height, double... fromDegrees) {
        List<Compartment> sectors = new ArrayList<>();
        for (int i = 0; i < fromDegrees.length; i++) {
            double to = i + 1 < fromDegrees.length ? fromDegrees[i + 1] : fromDegrees[0] + 360;
            sectors.add(compartment("R" + (i + 1), sector(inner, outer, height, fromDegrees[i], to)));
        }
        return sectors;
    }

    private static Solid sector(double inner, double outer, double height, double from, double to) {
        List<double[]> outline = new ArrayList<>();
        for (int i = 0; i <= ARC_STEPS; i++) {
            double angle = Math.toRadians(from + (to - from) * i / ARC_STEPS);
            outline.add(new double[] {outer * Math.cos(angle), outer * Math.sin(angle)});
        }
        for (int i = ARC_STEPS; i >= 0; i--) {
            double angle = Math.toRadians(from + (to - from) * i / ARC_STEPS);
            outline.add(new double[] {inner * Math.cos(angle), inner * Math.sin(angle)});
        }
        return Solid.prism(Axis.Z, 0, height, outline, 0);
    }

    /** The sets of spaces flooded, each as its names with blanks between. */
    static Set<String> sets(GeneratedCases generated) {
        return generated.cases().stream().map(Layouts::names).collect(Collectors.toCollection(TreeSet::new));
    }

    /** The sets that do not come from lesser damage only. */
    static Set<String> fullSets(GeneratedCases generated) {
        Set<String> sets = new TreeSet<>();
        for (int i = 0; i < generated.cases().size(); i++) {
            if (!generated.reasons().get(i).startsWith("Lesser damage")) {
                sets.add(names(generated.cases().get(i)));
            }
        }
        return sets;
    }

    private static String names(DamageCase damage) {
        return String.join(" ", damage.flooded());
    }
}
