package org.evendraft.stability;

import java.util.List;
import java.util.Locale;
import org.evendraft.geometry.Assembly;
import org.evendraft.geometry.Cut;
import org.evendraft.geometry.SecondMoments;
import org.evendraft.geometry.Vec3;
import org.evendraft.platform.FaultyDocumentException;

/** Hydrostatics of a hull: BM = I/V about axes through the centre of flotation (Bouguer's theorem; any textbook). */
public final class Hydrostatics {
    private static final double ONE_DEGREE = Math.tan(Math.toRadians(1));
    private static final double CENTIMETRES = 100;
    private static final double DEGREE_DECIMALS = 1e12;

    private Hydrostatics() {}

    /**
     * The row at a waterplane.
     *
     * @param hull the hull
     * @param waterDensity density of the water (t/m³)
     * @param at the waterplane
     * @throws FaultyDocumentException when no part of the hull is under water
     */
    public static HydrostaticRow row(Assembly hull, double waterDensity, Waterplane at) {
        Cut cut = hull.below(at.plane());
        double volume = cut.volume();
        if (!(volume > 0)) {
            throw dry(at);
        }
        double displacement = waterDensity * volume;
        SecondMoments inertia = cut.secondMoments();
        Vec3 buoyancy = cut.centroid();
        double height = buoyancy.dot(cut.plane().normal());
        double bmT = inertia.transverse() / volume;
        double bmL = inertia.longitudinal() / volume;
        return new HydrostaticRow(
                at.draft(),
                given(at.heelAngle()),
                given(at.trimAngle()),
                volume,
                displacement,
                buoyancy,
                cut.area(),
                cut.sectionCentroid(),
                inertia.transverse(),
                inertia.longitudinal(),
                inertia.product(),
                bmT,
                bmL,
                height + bmT,
                height + bmL,
                waterDensity * cut.projectedArea() / CENTIMETRES,
                displacement * bmT * ONE_DEGREE,
                displacement * bmL * ONE_DEGREE);
    }

    /**
     * The rows of a table, by trim, then heel, then draft.
     *
     * @param hull the hull
     * @param waterDensity density of the water (t/m³)
     * @param grid the drafts, heels and trims
     * @throws FaultyDocumentException when no part of the hull is under water at one of them
     */
    public static List<HydrostaticRow> table(Assembly hull, double waterDensity, HydrostaticGrid grid) {
        return grid.waterplanes().stream()
                .map(at -> row(hull, waterDensity, at))
                .toList();
    }

    private static FaultyDocumentException dry(Waterplane at) {
        String inclined = at.heelRad() == 0 && at.trimRad() == 0
                ? ""
                : String.format(Locale.ROOT, ", a heel of %.2f° and a trim of %.2f°", at.heelAngle(), at.trimAngle());
        return FaultyDocumentException.impossible(
                "",
                String.format(
                        Locale.ROOT,
                        "At a draft of %.3f m%s no part of the hull is under water.",
                        at.draft(),
                        inclined));
    }

    /** An angle as it was given: the way to radians and back leaves a last digit. */
    private static double given(double degrees) {
        return Math.rint(degrees * DEGREE_DECIMALS) / DEGREE_DECIMALS;
    }
}
