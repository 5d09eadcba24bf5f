package org.evendraft.platform;

import java.util.List;
import java.util.Optional;
import java.util.function.ToDoubleFunction;
import org.evendraft.geometry.SecondMoments;
import org.evendraft.geometry.Vec3;

/**
 * A tank known by its table: every column is linear in volume between two rows and never leaves the rows' range. Under an inclined
 * surface the liquid moves as the shape tells, where the tank has one too, else as in a tank with vertical walls.
 */
public final class TableCalibration implements Calibration {
    private final List<TableRow> rows;
    private final Optional<ShapeCalibration> shape;
    private final SecondMoments greatest;

    /**
     * @param rows rows with levels and volumes rising, at least two
     * @param shape the tank's shape, if known
     */
    TableCalibration(List<TableRow> rows, Optional<ShapeCalibration> shape) {
        this.rows = List.copyOf(rows);
        this.shape = shape;
        this.greatest = greatest(rows);
    }

    static SecondMoments greatest(List<TableRow> rows) {
        double transverse = 0;
        double longitudinal = 0;
        for (TableRow row : rows) {
            transverse = Math.max(transverse, row.surface().transverse());
            longitudinal = Math.max(longitudinal, row.surface().longitudinal());
        }
        return new SecondMoments(transverse, longitudinal, 0);
    }

    /** Reads between two rows at a volume. */
    static Liquid between(TableRow low, TableRow high, double volume) {
        double span = high.volume() - low.volume();
        double part = span > 0 ? Math.min(1, Math.max(0, (volume - low.volume()) / span)) : 0;
        Vec3 centre = low.centre().times(1 - part).plus(high.centre().times(part));
        SecondMoments surface =
                low.surface().times(1 - part).plus(high.surface().times(part));
        return new Liquid((1 - part) * low.level() + part * high.level(), volume, centre, surface);
    }

    @Override
    public double fullVolume() {
        return rows.get(rows.size() - 1).volume();
    }

    @Override
    public double leastLevel() {
        return rows.get(0).level();
    }

    @Override
    public double fullLevel() {
        return rows.get(rows.size() - 1).level();
    }

    @Override
    public double volumeAt(double level) {
        if (!(level >= rows.get(0).level()) || level > fullLevel()) {
            throw new IllegalArgumentException("level " + level + " of " + fullLevel() + " m");
        }
        int i = segment(TableRow::level, level);
        TableRow low = rows.get(i);
        TableRow high = rows.get(i + 1);
        double part = (level - low.level()) / (high.level() - low.level());
        return low.volume() + part * (high.volume() - low.volume());
    }

    @Override
    public Liquid holding(double volume) {
        if (!(volume >= 0) || volume > fullVolume()) {
            throw new IllegalArgumentException("volume " + volume + " of " + fullVolume() + " m³");
        }
        int i = segment(TableRow::volume, volume);
        return between(rows.get(i), rows.get(i + 1), volume);
    }

    /** The number of the row under the value that the column takes. */
    private int segment(ToDoubleFunction<TableRow> column, double value) {
        int low = 0;
        int high = rows.size() - 1;
        while (high - low > 1) {
            int middle = (low + high) / 2;
            if (column.applyAsDouble(rows.get(middle)) <= value) {
                low = middle;
            } else {
                high = middle;
            }
        }
        return low;
    }

    @Override
    public Inclined inclined(double volume, double slopeX, double slopeY, double guess) {
        Liquid upright = holding(volume);
        Vec3 moment = upright.centre().times(volume);
        if (shape.isPresent()) {
            double held = Math.min(volume, shape.get().fullVolume());
            Inclined moved = shape.get().inclined(held, slopeX, slopeY, guess);
            Vec3 still = shape.get().inclined(held, 0, 0, Double.NaN).moment();
            return new Inclined(moment.plus(moved.moment()).minus(still), moved.projected(), moved.height());
        }
        return new Inclined(moment.plus(shift(upright.surface(), slopeX, slopeY)), upright.surface(), Double.NaN);
    }

    /** By how much the first moments of the liquid in a tank with vertical walls change when its surface inclines (m⁴). */
    private static Vec3 shift(SecondMoments surface, double slopeX, double slopeY) {
        double byX = surface.longitudinal() * slopeX + surface.product() * slopeY;
        double byY = surface.product() * slopeX + surface.transverse() * slopeY;
        return new Vec3(byX, byY, (slopeX * byX + slopeY * byY) / 2);
    }

    @Override
    public void addInclined(InclinedLiquids gathered, int tank, Liquid upright, double density) {
        gathered.add(density, upright.centre().times(upright.volume()), SecondMoments.NONE);
        if (shape.isPresent()) {
            double held = Math.min(upright.volume(), shape.get().fullVolume());
            shape.get().addShift(gathered, tank, held, density);
        } else {
            SecondMoments surface = upright.surface();
            gathered.add(density, shift(surface, gathered.slopeX(), gathered.slopeY()), surface);
        }
    }

    @Override
    public SecondMoments greatestSurface() {
        return greatest;
    }

    @Override
    public List<TableRow> table() {
        return rows;
    }
}
