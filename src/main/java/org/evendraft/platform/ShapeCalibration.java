package org.evendraft.platform;

import java.util.List;
import org.evendraft.geometry.Assembly;
import org.evendraft.geometry.Cut;
import org.evendraft.geometry.Plane;
import org.evendraft.geometry.SecondMoments;
import org.evendraft.geometry.Vec3;

/** A tank known by its shape: everything computed exactly from the bodies; the table is made for those who read or plan by it. */
public final class ShapeCalibration implements Calibration {
    /** Under this part of the full volume the centroid is taken at this part, where it is still well defined. */
    private static final double LEAST_PART = 1e-9;

    private final Assembly shape;
    private final double permeability;
    private final double bottom;
    private final Vec3 middle;
    private final double fullVolume;
    private final List<TableRow> table;
    private final SecondMoments greatest;

    /**
     * @param shape the tank's bodies
     * @param permeability part of them that liquid can fill
     */
    ShapeCalibration(Assembly shape, double permeability) {
        this.shape = shape;
        this.permeability = permeability;
        this.bottom = shape.lowest();
        this.middle = shape.least().plus(shape.greatest()).times(0.5);
        this.fullVolume = permeability * shape.volume();
        this.table = new TableBuilder(shape, permeability).build();
        this.greatest = TableCalibration.greatest(table);
    }

    @Override
    public double fullVolume() {
        return fullVolume;
    }

    @Override
    public double leastLevel() {
        return 0;
    }

    @Override
    public double fullLevel() {
        return shape.highest() - bottom;
    }

    @Override
    public double volumeAt(double level) {
        if (!(level >= 0) || level > fullLevel()) {
            throw new IllegalArgumentException("level " + level + " of " + fullLevel() + " m");
        }
        double volume =
                permeability * shape.below(Plane.ofSlopes(bottom + level, 0, 0)).volume();
        return Math.max(0, Math.min(fullVolume, volume));
    }

    @Override
    public Liquid holding(double volume) {
        double gross = Math.min(Math.max(volume, LEAST_PART * fullVolume) / permeability, shape.volume());
        Cut cut = shape.holding(gross, 0, 0, Double.NaN);
        double surface = cut.plane().origin().z() - bottom;
        double level = volume == 0 ? 0 : Math.max(0, Math.min(fullLevel(), surface));
        return new Liquid(level, volume, cut.centroid(), cut.secondMoments().times(permeability));
    }

    @Override
    public Inclined inclined(double volume, double slopeX, double slopeY, double guess) {
        Cut cut = shape.holding(Math.min(volume / permeability, shape.volume()), slopeX, slopeY, guess);
        Vec3 moment = cut.moment().times(permeability);
        return new Inclined(
                moment,
                cut.projectedSecondMoments().times(permeability),
                cut.plane().origin().z());
    }

    @Override
    public void addInclined(InclinedLiquids gathered, int tank, Liquid upright, double density) {
        if (gathered.isLevel()) {
            gathered.add(density, upright.centre().times(upright.volume()), upright.surface());
            gathered.place(tank, new Vec3(middle.x(), middle.y(), bottom + upright.level()));
        } else {
            addCut(gathered, tank, upright.volume(), density);
        }
    }

    private void addCut(InclinedLiquids gathered, int tank, double volume, double density) {
        Cut cut = gathered.hold(tank, shape, Math.min(volume / permeability, shape.volume()));
        gathered.add(density * permeability, cut.moment(), cut.projectedSecondMoments());
    }

    /** As {@link #addInclined}, but only by how much the liquid's moments differ from those it has upright. */
    void addShift(InclinedLiquids gathered, int tank, double volume, double density) {
        Vec3 still = holding(volume).centre().times(-volume);
        addCut(gathered, tank, volume, density);
        gathered.add(density, still, SecondMoments.NONE);
    }

    @Override
    public SecondMoments greatestSurface() {
        return greatest;
    }

    @Override
    public List<TableRow> table() {
        return table;
    }
}
