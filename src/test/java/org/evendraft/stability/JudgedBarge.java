package org.evendraft.stability;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.evendraft.geometry.Vec3;
import org.evendraft.platform.Compartment;
import org.evendraft.platform.Criterion;
import org.evendraft.platform.Criterion.LimitAngle;
import org.evendraft.platform.Criterion.Measure;
import org.evendraft.platform.Criterion.Openings;
import org.evendraft.platform.DamageCase;
import org.evendraft.platform.GmBound;
import org.evendraft.platform.Lightship;
import org.evendraft.platform.Mode;
import org.evendraft.platform.Opening;
import org.evendraft.platform.Platform;
import org.evendraft.platform.PreparedPlatform;
import org.evendraft.platform.Situation;
import org.evendraft.platform.StabilityRules;
import org.evendraft.platform.Tank;
import org.evendraft.platform.WindageElement;

/**
 * A box barge of 100 × 20 × 10 m at 5 m in water of 1.025 t/m³, wall-sided to 26.5° of heel, with what tests hang on it. Its closed forms
 * about the longitudinal axis: V = 10,000 m³, BM = 20²/(12·5) m, KB = 2.5 m.
 */
final class JudgedBarge {
    static final double DRAFT = 5;
    static final double MASS = 10_250;
    static final double BM = 400.0 / 60;
    static final double KM = DRAFT / 2 + BM;

    final List<WindageElement> windage = new ArrayList<>();
    final List<Opening> openings = new ArrayList<>();
    final List<Criterion> criteria = new ArrayList<>();
    final List<Compartment> compartments = new ArrayList<>();
    final List<Tank> tanks = new ArrayList<>();
    final List<DamageCase> cases = new ArrayList<>();
    double kg = 6;
    double x;

    PreparedPlatform prepared() {
        return new PreparedPlatform(new Platform(
                "barge",
                "Barge",
                1.025,
                List.of(Floaters.box("hull", -50, 50, -10, 10, 0, 10)),
                List.of(),
                new Lightship(MASS, new Vec3(x, 0, kg)),
                tanks,
                List.of(),
                List.of(),
                windage,
                openings,
                List.of(mode(OptionalDouble.empty())),
                compartments,
                new StabilityRules("test", false, criteria),
                cases));
    }

    LoadedPlatform loaded() {
        return LoadedPlatform.of(prepared(), Floaters.condition(List.of(), List.of()));
    }

    /** A mode with nothing but a wind. */
    static Mode mode(OptionalDouble windSpeed) {
        return new Mode(
                "mode",
                "mode",
                Optional.empty(),
                Optional.<GmBound>empty(),
                List.of(),
                OptionalDouble.empty(),
                OptionalDouble.empty(),
                OptionalDouble.empty(),
                windSpeed);
    }

    JudgedBarge house(double zFrom, double zTo, double areaX, double areaY, double areaZ) {
        windage.add(new WindageElement("house", 0, 0, zFrom, zTo, areaX, areaY, areaZ, 1));
        return this;
    }

    JudgedBarge opening(String id, double y, double z, Opening.Closing closing) {
        openings.add(new Opening(id, new Vec3(0, y, z), closing));
        return this;
    }

    JudgedBarge criterion(Situation situation, Measure measure, double bound, double wind, LimitAngle limit) {
        criteria.add(new Criterion(
                measure.name(),
                "test",
                situation,
                measure,
                bound,
                OptionalDouble.of(wind),
                limit,
                Openings.NOT_WEATHERTIGHT));
        return this;
    }

    JudgedBarge compartment(String id, double x0, double x1, double y0, double y1, double permeability) {
        compartments.add(new Compartment(id, List.of(Floaters.box(id, x0, x1, y0, y1, 0, 10)), permeability));
        return this;
    }

    /** Righting arm of the wall-sided barge: GZ = sin φ·(GM + ½·BM·tan² φ), any textbook (m). */
    static double gz(double kg, double phi) {
        return Math.sin(phi) * (KM - kg + BM / 2 * Math.pow(Math.tan(phi), 2));
    }

    /** Depth of B under the inclined water (m). */
    static double depthOfB(double phi) {
        return (DRAFT / 2 + BM / 2 * Math.pow(Math.tan(phi), 2)) * Math.cos(phi);
    }

    /**
     * Heeling arm of a wind on a house amidships under the first height band's upper bound, broadside on: ½·ρ·V²·A over the weight, with
     * the area and the height of its middle turned by φ (m).
     */
    static double windArm(double speed, double area, double middle, double phi) {
        double force = 0.5 * 1.222e-3 * speed * speed * area * Math.cos(phi);
        double lever = (middle - DRAFT) * Math.cos(phi) + depthOfB(phi);
        return force * lever / (MASS * 9.80665);
    }
}
