package org.evendraft.stability;

import java.util.ArrayList;
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
            throw FaultyDocumentException.impossible(
                    "",
                    String.format(Locale.ROOT, "At a draft of %.3f m no part of the hull is under water.", at.draft()));
        }
        double displacement = waterDensity * volume;
        SecondMoments inertia = cut.secondMoments();
        Vec3 buoyancy = cut.centroid();
        double height = buoyancy.dot(cut.plane().normal());
        double bmT = inertia.transverse() / volume;
        double bmL = inertia.longitudinal() / volume;
        return new HydrostaticRow(
                at.draft(),
                at.heelAngle(),
                at.trimAngle(),
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
     * Rows from one draft to another, both included, at one heel and trim.
     *
     * @param from first draft (m)
     * @param to last draft, at least the first (m)
     * @param step between drafts, positive (m)
     */
    public static List<HydrostaticRow> table(
            Assembly hull, double waterDensity, double from, double to, double step, Waterplane inclined) {
        int steps = (int) Math.ceil((to - from) / step - 1e-9);
        List<HydrostaticRow> rows = new ArrayList<>();
        for (int i = 0; i <= steps; i++) {
            double draft = Math.min(from + i * step, to);
            rows.add(row(hull, waterDensity, new Waterplane(draft, inclined.heelRad(), inclined.trimRad())));
        }
        return rows;
    }
}
