package org.evendraft.platform;

import java.util.ArrayList;
import java.util.List;
import java.util.NavigableSet;
import java.util.TreeSet;
import java.util.function.ToDoubleFunction;
import org.evendraft.geometry.Assembly;
import org.evendraft.geometry.Cut;
import org.evendraft.geometry.Mesh;
import org.evendraft.geometry.Plane;
import org.evendraft.geometry.SecondMoments;
import org.evendraft.geometry.Vec3;

/**
 * Makes a table from a shape: rows are added, by halving, until what is read between two rows differs from the exact value by at
 * most 0.1 %: volume and second moments of themselves, the centroid's height of its height over the bottom, its x and y of the
 * tank's length and breadth. Within a millionth of the full volume from empty and from full nothing is refined: there sections may
 * shrink to a point.
 */
final class TableBuilder {
    private static final double TOLERANCE = 1e-3;
    /** The rows are placed with half the tolerance: it is only checked at a few points between them. */
    private static final double AIM = TOLERANCE / 2;

    private static final double[] CHECKED = {0.2, 0.5, 0.8};
    private static final double NEGLIGIBLE_PART = 1e-6;
    private static final int GREATEST_DEPTH = 24;
    private static final int MOST_STEPS_OF_FORM = 64;
    /** Rows at both sides of a step of the form lie this part of the height apart. */
    private static final double STEP_GAP = 1e-9;

    private final Assembly shape;
    private final double permeability;
    private final double bottom;
    private final double top;
    private final double length;
    private final double breadth;
    private final List<TableRow> rows = new ArrayList<>();

    TableBuilder(Assembly shape, double permeability) {
        this.shape = shape;
        this.permeability = permeability;
        this.bottom = shape.lowest();
        this.top = shape.highest();
        this.length = extent(Vec3::x);
        this.breadth = extent(Vec3::y);
    }

    List<TableRow> build() {
        double gap = STEP_GAP * (top - bottom);
        List<Double> levels = new ArrayList<>(stepsOfForm());
        TableRow previous = rowAt(levels.get(0) + gap, 0);
        rows.add(previous);
        for (int i = 1; i < levels.size(); i++) {
            TableRow below = i == levels.size() - 1 ? full(gap) : rowAt(levels.get(i) - gap);
            refine(previous, below, GREATEST_DEPTH);
            rows.add(below);
            if (i < levels.size() - 1) {
                previous = rowAt(levels.get(i) + gap);
                rows.add(previous);
            }
        }
        return rising(rows);
    }

    /** The rows without those that add nothing to the one before, as between two bodies one over the other; first and last stay. */
    private static List<TableRow> rising(List<TableRow> rows) {
        TableRow last = rows.get(rows.size() - 1);
        List<TableRow> kept = new ArrayList<>(List.of(rows.get(0)));
        for (TableRow row : rows.subList(1, rows.size() - 1)) {
            if (isOver(row, kept.get(kept.size() - 1)) && isOver(last, row)) {
                kept.add(row);
            }
        }
        kept.add(last);
        return List.copyOf(kept);
    }

    private static boolean isOver(TableRow row, TableRow other) {
        return row.level() > other.level() && row.volume() > other.volume();
    }

    /** Heights at which the form may change abruptly: those of vertices, or of the parts' ends where curves make too many. */
    private NavigableSet<Double> stepsOfForm() {
        NavigableSet<Double> all = new TreeSet<>();
        NavigableSet<Double> ends = new TreeSet<>();
        for (Assembly.Part part : shape.parts()) {
            Mesh mesh = part.solid().mesh();
            for (int i = 0; i < mesh.vertexCount() && all.size() <= MOST_STEPS_OF_FORM; i++) {
                addUnlessNear(all, mesh.vertex(i).z());
            }
            addUnlessNear(ends, part.solid().least().z());
            addUnlessNear(ends, part.solid().greatest().z());
        }
        return all.size() <= MOST_STEPS_OF_FORM ? all : ends;
    }

    private void addUnlessNear(NavigableSet<Double> heights, double z) {
        double near = 4 * STEP_GAP * (top - bottom);
        Double below = heights.floor(z);
        Double above = heights.ceiling(z);
        if ((below == null || z - below > near) && (above == null || above - z > near)) {
            heights.add(z);
        }
    }

    private void refine(TableRow low, TableRow high, int depth) {
        double full = permeability * shape.volume();
        double negligible = NEGLIGIBLE_PART * full;
        if (depth == 0 || high.volume() <= negligible || low.volume() >= full - negligible) {
            return;
        }
        double mean = bottom + (low.level() + high.level()) / 2;
        boolean good = true;
        for (double part : CHECKED) {
            double level = low.level() + part * (high.level() - low.level());
            good = good && within(rowAt(bottom + level), low, high);
        }
        if (!good) {
            TableRow middle = rowAt(mean);
            refine(low, middle, depth - 1);
            rows.add(middle);
            refine(middle, high, depth - 1);
        }
    }

    private boolean within(TableRow exact, TableRow low, TableRow high) {
        double levelPart = (exact.level() - low.level()) / (high.level() - low.level());
        double volume = low.volume() + levelPart * (high.volume() - low.volume());
        Liquid read = TableCalibration.between(low, high, exact.volume());
        Vec3 off = read.centre().minus(exact.centre());
        return Math.abs(volume - exact.volume()) <= AIM * exact.volume()
                && Math.abs(off.x()) <= AIM * length
                && Math.abs(off.y()) <= AIM * breadth
                && Math.abs(off.z()) <= AIM * (exact.centre().z() - bottom)
                && near(read.surface(), exact.surface());
    }

    private boolean near(SecondMoments read, SecondMoments exact) {
        double scale = Math.sqrt(exact.transverse() * exact.longitudinal());
        return Math.abs(read.transverse() - exact.transverse()) <= AIM * exact.transverse()
                && Math.abs(read.longitudinal() - exact.longitudinal()) <= AIM * exact.longitudinal()
                && Math.abs(read.product() - exact.product()) <= AIM * scale;
    }

    private double extent(ToDoubleFunction<Vec3> coordinate) {
        double least = Double.POSITIVE_INFINITY;
        double greatest = Double.NEGATIVE_INFINITY;
        for (Assembly.Part part : shape.parts()) {
            least = Math.min(least, coordinate.applyAsDouble(part.solid().least()));
            greatest = Math.max(greatest, coordinate.applyAsDouble(part.solid().greatest()));
        }
        return greatest - least;
    }

    private TableRow rowAt(double height) {
        return rowAt(height, Double.NaN);
    }

    /** The row at a height, its volume and level set to a value that is known where one is given. */
    private TableRow rowAt(double height, double known) {
        Cut cut = shape.below(Plane.ofSlopes(height, 0, 0));
        boolean measured = Double.isNaN(known);
        return new TableRow(
                measured ? height - bottom : known,
                measured ? permeability * cut.volume() : known,
                cut.centroid(),
                sound(cut.secondMoments().times(permeability)));
    }

    /** Second moments without what rounding adds to those of a section that is next to nothing. */
    private static SecondMoments sound(SecondMoments s) {
        double transverse = Math.max(0, s.transverse());
        double longitudinal = Math.max(0, s.longitudinal());
        double most = Math.sqrt(transverse * longitudinal);
        return new SecondMoments(transverse, longitudinal, Math.max(-most, Math.min(most, s.product())));
    }

    /** The last row: the full tank, with the free surface just under its top. */
    private TableRow full(double gap) {
        TableRow under = rowAt(top - gap);
        return new TableRow(top - bottom, permeability * shape.volume(), shape.centroid(), under.surface());
    }
}
