package org.evendraft.geometry;

import java.util.ArrayList;
import java.util.List;

/** Bodies cut by a horizontal plane; curves are those of their meshes. Immutable. */
public final class HorizontalSection {
    private final List<Weighted> contours;

    private record Weighted(Contour contour, double weight) {}

    private HorizontalSection(List<Weighted> contours) {
        this.contours = List.copyOf(contours);
    }

    /**
     * The section of an assembly.
     *
     * @param z height of the plane (m)
     */
    public static HorizontalSection of(Assembly assembly, double z) {
        List<Weighted> found = new ArrayList<>();
        for (Assembly.Part part : assembly.parts()) {
            for (Contour contour : contours(part.solid(), z)) {
                found.add(new Weighted(contour, part.weight()));
            }
        }
        return new HorizontalSection(found);
    }

    /**
     * The section of one body.
     *
     * @param z height of the plane (m)
     */
    public static HorizontalSection of(Solid solid, double z) {
        return ofContours(contours(solid, z));
    }

    /** What contours bound together. */
    public static HorizontalSection ofContours(List<Contour> contours) {
        return new HorizontalSection(
                contours.stream().map(c -> new Weighted(c, 1)).toList());
    }

    private static List<Contour> contours(Solid solid, double z) {
        boolean cut = solid.least().z() <= z && z < solid.greatest().z();
        return cut ? ContourTracer.trace(solid.mesh(), z) : List.of();
    }

    /** The contours, those of cut-outs too. */
    public List<Contour> contours() {
        return contours.stream().map(Weighted::contour).toList();
    }

    /** The parts of a line inside, in the order along it; where bodies touch they are one. */
    public List<Chord> chords(PlanLine line) {
        Chords chords = null;
        for (Weighted w : contours) {
            if (w.contour().isNear(line)) {
                chords = chords == null ? new Chords() : chords;
                w.contour().addCrossings(line, w.weight(), chords);
            }
        }
        return chords == null ? List.of() : chords.inside();
    }

    /** Whether another section has the same contours in the same order, to within a tolerance (m). */
    public boolean isSame(HorizontalSection other, double tolerance) {
        if (contours.size() != other.contours.size()) {
            return false;
        }
        for (int i = 0; i < contours.size(); i++) {
            if (!contours.get(i).contour().isSame(other.contours.get(i).contour(), tolerance)) {
                return false;
            }
        }
        return true;
    }
}
