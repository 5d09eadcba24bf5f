package org.evendraft.platform;

import java.util.Arrays;
import org.evendraft.geometry.Assembly;
import org.evendraft.geometry.Cut;
import org.evendraft.geometry.Plane;
import org.evendraft.geometry.SecondMoments;
import org.evendraft.geometry.Vec3;

/**
 * The liquids of several tanks under surfaces of the same slopes, gathered tank by tank, and where each surface has its middle: from
 * there the search at neighbouring slopes starts. One thread gathers; after that it is only read.
 */
public final class InclinedLiquids {
    private static final int COORDINATES = 3;

    private final double slopeX;
    private final double slopeY;
    private final Cut cut;
    /** x, y and z of the middle of each tank's surface (m), not numbers where it is not known. */
    private final double[] middles;

    private double momentX;
    private double momentY;
    private double momentZ;
    private double transverse;
    private double longitudinal;
    private double product;

    private InclinedLiquids(double slopeX, double slopeY, double[] middles) {
        this.slopeX = slopeX;
        this.slopeY = slopeY;
        this.middles = middles;
        this.cut = new Cut(Plane.ofSlopes(0, slopeX, slopeY));
    }

    /** Nothing gathered yet from a number of tanks, the platform upright. */
    public static InclinedLiquids upright(int tanks) {
        double[] middles = new double[COORDINATES * tanks];
        Arrays.fill(middles, Double.NaN);
        return new InclinedLiquids(0, 0, middles);
    }

    /**
     * Nothing gathered yet from the same tanks at other slopes, the search for each surface starting from here.
     *
     * @param otherX rise of the surfaces per metre forward
     * @param otherY rise per metre to port
     */
    public InclinedLiquids at(double otherX, double otherY) {
        return new InclinedLiquids(otherX, otherY, middles.clone());
    }

    /** First moments of mass about the platform's origin (t·m). */
    public Vec3 moment() {
        return new Vec3(momentX, momentY, momentZ);
    }

    /** Second moments of the surfaces seen from above, each about its own centroid, times density (t·m). */
    public SecondMoments projected() {
        return new SecondMoments(transverse, longitudinal, product);
    }

    boolean isLevel() {
        return slopeX == 0 && slopeY == 0;
    }

    double slopeX() {
        return slopeX;
    }

    double slopeY() {
        return slopeY;
    }

    /** Adds a liquid by its integrals times a density. */
    void add(double density, Vec3 moment, SecondMoments projected) {
        momentX += density * moment.x();
        momentY += density * moment.y();
        momentZ += density * moment.z();
        transverse += density * projected.transverse();
        longitudinal += density * projected.longitudinal();
        product += density * projected.product();
    }

    /** Notes where the middle of a tank's surface is. */
    void place(int tank, Vec3 middle) {
        int i = COORDINATES * tank;
        middles[i] = middle.x();
        middles[i + 1] = middle.y();
        middles[i + 2] = middle.z();
    }

    /** The cut of a tank's shape with a volume under the surface; it holds until the next is asked for. */
    Cut hold(int tank, Assembly shape, double volume) {
        int i = COORDINATES * tank;
        shape.hold(cut, volume, middles[i + 2] - slopeX * middles[i] - slopeY * middles[i + 1]);
        place(tank, cut.sectionCentroid());
        return cut;
    }
}
