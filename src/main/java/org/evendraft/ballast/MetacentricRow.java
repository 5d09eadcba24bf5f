package org.evendraft.ballast;

import org.evendraft.geometry.Cut;
import org.evendraft.geometry.SecondMoments;
import org.evendraft.platform.Condition.FreeSurface;
import org.evendraft.platform.PreparedPlatform;

/**
 * A least corrected metacentric height on even keel. With Δ the displacement, GM·Δ = ρ(I + ∫z dV) − Σ(m·z) − Σ(ρi); the first term depends on the displacement
 * only and is taken as linear near a given one, the others add up tank by tank. The row is divided by that displacement, to be in metres.
 */
final class MetacentricRow implements Coupling {
    private static final double WEIGHT = 1 / 0.1;
    private static final double NEGLIGIBLE = 2e-4;
    /** The slope over displacement is taken across this part of it to both sides. */
    private static final double SPAN = 1e-3;

    private final boolean transverse;
    private final FreeSurface freeSurface;
    private final double bound;
    private final double displacement;
    private final double slope;
    private final double room;

    /**
     * @param prepared the platform
     * @param water density of the sea and how free surfaces count
     * @param stowage what is aboard at the start
     * @param displacement the displacement near which the row holds (t)
     * @param transverse whether heeling, not trimming
     * @param bound the least height (m)
     */
    MetacentricRow(
            PreparedPlatform prepared,
            Water water,
            Stowage stowage,
            double displacement,
            boolean transverse,
            double bound) {
        this.transverse = transverse;
        this.freeSurface = water.freeSurface();
        this.bound = bound;
        this.displacement = displacement;
        double whole = water.density() * prepared.hull().volume();
        double low = displacement * (1 - SPAN);
        double high = Math.min(displacement * (1 + SPAN), whole);
        double atLow = hullPart(prepared, water.density(), low);
        double atHigh = hullPart(prepared, water.density(), high);
        this.slope = (atHigh - atLow) / (high - low);
        double mass = stowage.mass();
        double aboard = stowage.fixedMoment().z()
                + stowage.liquids().stream().mapToDouble(this::moment).sum();
        this.room = (atLow + slope * (mass - low) - aboard) / displacement;
    }

    private double hullPart(PreparedPlatform prepared, double density, double mass) {
        Cut cut = prepared.hull().holding(mass / density, 0, 0, Double.NaN);
        SecondMoments inertia = cut.secondMoments();
        double i = transverse ? inertia.transverse() : inertia.longitudinal();
        return density * (i + cut.moment().z()) - bound * mass;
    }

    private double moment(Contents liquid) {
        SecondMoments surface = liquid.surface(freeSurface);
        return liquid.moment(0, 0).z() + (transverse ? surface.transverse() : surface.longitudinal());
    }

    @Override
    public String limit() {
        return transverse ? "minGm.transverse" : "minGm.longitudinal";
    }

    @Override
    public double effect(Contents liquid) {
        return (moment(liquid) - slope * liquid.mass()) / displacement;
    }

    @Override
    public double room() {
        return room;
    }

    @Override
    public double weight() {
        return WEIGHT;
    }

    @Override
    public double negligible() {
        return NEGLIGIBLE;
    }

    @Override
    public double over(ExactState state) {
        return bound - state.gm(transverse);
    }
}
