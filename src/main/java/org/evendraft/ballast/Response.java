package org.evendraft.ballast;

import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.LUDecomposition;
import org.apache.commons.math3.linear.RealMatrix;
import org.evendraft.geometry.Cut;
import org.evendraft.geometry.Plane;
import org.evendraft.geometry.SecondMoments;
import org.evendraft.geometry.Vec3;
import org.evendraft.platform.PreparedPlatform;

/**
 * How draft and slopes answer to masses, from a given waterplane.
 *
 * <p>At the plane z = c + p·x + q·y the hull displaces V with first moments (Bx, By, Bz). With M the mass and (Sx, Sy, Sz) the first moments of
 * mass, liquids lying level with the sea, and W = S − ρB, what is out of balance is r = (M − ρV, Wx + p·Wz, Wy + q·Wz): weight
 * over buoyancy, and the moment of both in the plane. The platform floats at the plane exactly when r = 0. To first order the
 * platform comes to rest at (c, p, q) + K⁻¹r, where K = −∂r/∂(c, p, q) is made of the waterplane's area and moments, of Wz
 * (which is −Δ·(KB − KG)) and of the free surfaces: on even keel its diagonal is ρA, Δ·GM_L, Δ·GM_T. Since r is linear in what each
 * tank adds, so is the answer; and its sign at the face of a band tells exactly on which side of the face the platform floats.
 */
final class Response {
    /** Order of the answer's components. */
    static final int DRAFT = 0;

    static final int SLOPE_X = 1;
    static final int SLOPE_Y = 2;

    /** The stiffness counts with at least this metacentric height, so that its inverse exists and keeps its sign (m). */
    private static final double LEAST_GM = 0.3;
    /** A waterplane of less than this area cannot hold a draft (m²). */
    private static final double LEAST_AREA = 1e-6;

    private final double slopeX;
    private final double slopeY;
    private final double[][] inverse;
    private final double[] start;

    /**
     * @param prepared the platform
     * @param density density of the sea (t/m³)
     * @param plane the plane to start from
     * @param stowage what is aboard at the start
     * @param reference what is aboard when the stiffness is taken
     * @param spareHeight height at which a mass missing from the reference is put (m)
     */
    Response(
            PreparedPlatform prepared,
            double density,
            Plane plane,
            Stowage stowage,
            Stowage reference,
            double spareHeight) {
        this.slopeX = slopeX(plane);
        this.slopeY = slopeY(plane);
        Cut cut = prepared.hull().below(plane);
        this.inverse = new LUDecomposition(stiffness(cut, density, reference, spareHeight))
                .getSolver()
                .getInverse()
                .getData();
        Vec3 off = stowage.moment(slopeX, slopeY).minus(cut.moment().times(density));
        this.start = answer(stowage.mass() - density * cut.volume(), off);
    }

    static double slopeX(Plane plane) {
        return -plane.normal().x() / plane.normal().z();
    }

    static double slopeY(Plane plane) {
        return -plane.normal().y() / plane.normal().z();
    }

    private RealMatrix stiffness(Cut cut, double density, Stowage reference, double spareHeight) {
        double area = Math.max(LEAST_AREA, cut.projectedArea());
        Vec3 f = cut.sectionCentroid();
        SecondMoments own = cut.projectedSecondMoments();
        double[] byVolume = {area, area * f.x(), area * f.y()};
        double xy = own.product() + area * f.x() * f.y();
        double[] byX = {byVolume[1], own.longitudinal() + area * f.x() * f.x(), xy};
        double[] byY = {byVolume[2], xy, own.transverse() + area * f.y() * f.y()};
        double c = cut.plane().origin().z();
        double displaced = density * cut.volume();
        double spare = (displaced - reference.mass()) * spareHeight;
        double lift = reference.moment(slopeX, slopeY).z()
                + spare
                - density * cut.moment().z();
        SecondMoments surfaces = surfaces(reference);
        double[][] k = new double[3][3];
        for (int j = 0; j < 3; j++) {
            double byZ = c * byVolume[j] + slopeX * byX[j] + slopeY * byY[j];
            k[DRAFT][j] = density * byVolume[j];
            k[SLOPE_X][j] = density * (byX[j] + slopeX * byZ);
            k[SLOPE_Y][j] = density * (byY[j] + slopeY * byZ);
        }
        k[SLOPE_X][SLOPE_X] -= lift + surfaces.longitudinal();
        k[SLOPE_Y][SLOPE_Y] -= lift + surfaces.transverse();
        k[SLOPE_X][SLOPE_Y] -= surfaces.product();
        k[SLOPE_Y][SLOPE_X] -= surfaces.product();
        stiffen(k, SLOPE_X, LEAST_GM * displaced);
        stiffen(k, SLOPE_Y, LEAST_GM * displaced);
        return new Array2DRowRealMatrix(k, false);
    }

    private static SecondMoments surfaces(Stowage reference) {
        return reference.liquids().stream().map(Contents::surface).reduce(SecondMoments.NONE, SecondMoments::plus);
    }

    /** Raises a diagonal entry so that, the draft being free, it is at least a value. */
    private static void stiffen(double[][] k, int row, double least) {
        double own = k[row][row] - k[row][DRAFT] * k[DRAFT][row] / k[DRAFT][DRAFT];
        k[row][row] += Math.max(0, least - own);
    }

    private double[] answer(double mass, Vec3 moment) {
        double byX = moment.x() + slopeX * moment.z();
        double byY = moment.y() + slopeY * moment.z();
        double[] answer = new double[3];
        for (int i = 0; i < 3; i++) {
            answer[i] = inverse[i][0] * mass + inverse[i][1] * byX + inverse[i][2] * byY;
        }
        return answer;
    }

    /** Where the platform comes to rest, as it is loaded at the start: draft and slopes less those of the plane. */
    double start(int component) {
        return start[component];
    }

    /** What a liquid alone adds to draft and slopes. */
    double[] to(Contents liquid) {
        return answer(liquid.mass(), liquid.moment(slopeX, slopeY));
    }
}
