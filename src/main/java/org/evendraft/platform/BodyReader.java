package org.evendraft.platform;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.evendraft.geometry.Axis;
import org.evendraft.geometry.Solid;
import org.evendraft.geometry.Vec3;

/** Reads bodies: box, cylinder, prism and mesh. */
final class BodyReader {
    /** No body is thinner (m): a slip of units shows up here. */
    private static final double THINNEST = 1e-3;

    private BodyReader() {}

    /** The shapes that a body may have. */
    private enum Shape {
        BOX,
        CYLINDER,
        PRISM,
        MESH
    }

    /**
     * A body with its place in the document.
     *
     * @param pointer its JSON pointer
     */
    record Placed(String pointer, Body body) {}

    /** Reads all bodies of a list; those with faults are left out. */
    static List<Placed> read(List<Fields> list) {
        List<Placed> bodies = new ArrayList<>();
        for (int i = 0; i < list.size(); i++) {
            Fields fields = list.get(i);
            String name = fields.text("name", "body " + (i + 1));
            boolean cutOut = fields.flag("cutOut", false);
            solid(fields).ifPresent(s -> bodies.add(new Placed(fields.pointer(), new Body(name, cutOut, s))));
        }
        return bodies;
    }

    private static Optional<Solid> solid(Fields fields) {
        int before = fields.faults().count();
        Optional<Shape> shape = fields.choice("shape", Shape.class);
        if (shape.isEmpty()) {
            return Optional.empty();
        }
        Optional<Solid> solid = switch (shape.get()) {
            case BOX -> box(fields);
            case CYLINDER -> cylinder(fields);
            case PRISM -> prism(fields);
            case MESH -> MeshReader.read(fields);
        };
        fields.noOthers();
        return solid.filter(s -> fields.faults().count() == before && isThickEnough(fields, s));
    }

    private static boolean isThickEnough(Fields fields, Solid solid) {
        Vec3 size = solid.greatest().minus(solid.least());
        double least = Math.min(size.x(), Math.min(size.y(), size.z()));
        boolean enough = least >= THINNEST && solid.volume() > 0;
        if (!enough) {
            fields.faults()
                    .meaning(
                            fields.pointer(),
                            "the body is thinner than " + Words.given(THINNEST) + " m, or has no volume");
        }
        return enough;
    }

    private static Optional<Solid> box(Fields fields) {
        Optional<Vec3> min = fields.point("min");
        Optional<Vec3> max = fields.point("max");
        if (min.isEmpty() || max.isEmpty()) {
            return Optional.empty();
        }
        rising(fields, "x", min.get().x(), max.get().x());
        rising(fields, "y", min.get().y(), max.get().y());
        rising(fields, "z", min.get().z(), max.get().z());
        return Optional.of(Solid.box(min.get(), max.get()));
    }

    private static void rising(Fields fields, String axis, double from, double to) {
        if (from >= to) {
            fields.meaning(
                    "max",
                    axis + " of max must be greater than that of min: " + Words.given(to) + " is not greater than "
                            + Words.given(from));
        }
    }

    private static Optional<Solid> cylinder(Fields fields) {
        Optional<Vec3> start = fields.point("start");
        Optional<Vec3> end = fields.point("end");
        double diameter = fields.number("diameter", Range.NOT_NEGATIVE);
        double endDiameter = fields.number("endDiameter", Range.NOT_NEGATIVE, diameter);
        if (diameter == 0 && endDiameter == 0) {
            fields.meaning("diameter", "one diameter at least must be over 0");
        }
        if (start.isEmpty() || end.isEmpty() || !(Math.max(diameter, endDiameter) > 0)) {
            return Optional.empty();
        }
        if (end.get().minus(start.get()).norm() < THINNEST) {
            fields.meaning("end", "end must be at another place than start");
            return Optional.empty();
        }
        return Optional.of(Solid.cylinder(start.get(), end.get(), diameter, endDiameter));
    }

    private static Optional<Solid> prism(Fields fields) {
        int before = fields.faults().count();
        Optional<Axis> axis = fields.choice("axis", Axis.class);
        double from = fields.number("from", Range.COORDINATE);
        double to = fields.number("to", Range.COORDINATE);
        List<double[]> outline = fields.rows("outline", 2, Range.COORDINATE);
        double radius = fields.number("cornerRadius", Range.NOT_NEGATIVE, 0);
        if (from >= to) {
            fields.meaning(
                    "to",
                    "to must be greater than from: " + Words.given(to) + " is not greater than " + Words.given(from));
        }
        if (fields.faults().count() == before) {
            OutlineCheck.fault(outline).ifPresent(fault -> fields.meaning("outline", fault));
        }
        if (axis.isEmpty() || fields.faults().count() > before) {
            return Optional.empty();
        }
        try {
            return Optional.of(Solid.prism(axis.get(), from, to, outline, radius));
        } catch (IllegalArgumentException e) {
            fields.meaning("cornerRadius", String.valueOf(e.getMessage()));
            return Optional.empty();
        }
    }
}
