package org.evendraft.stability;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import org.apache.commons.math3.analysis.integration.SimpsonIntegrator;
import org.apache.commons.math3.analysis.solvers.BrentSolver;
import org.evendraft.geometry.Solid;
import org.evendraft.geometry.Vec3;
import org.evendraft.platform.Body;
import org.evendraft.platform.Fill;
import org.evendraft.platform.PreparedPlatform;
import org.evendraft.platform.Purpose;
import org.evendraft.platform.Tank;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Righting arms against closed forms, against published figures and against the potential energy. */
class RightingArmsTest {
    /** The trim is at rest to 1e-9 m of arm, and arms are sums of figures of 10 m in double precision. */
    private static final double EXACT = 1e-7;

    private static LoadedPlatform loaded(PreparedPlatform platform, Fill... fills) {
        return LoadedPlatform.of(platform, Floaters.condition(List.of(fills), List.of()));
    }

    private static RightingCurve.Request fixed(double azimuth, double to) {
        return new RightingCurve.Request(azimuth, to, 1, false, LiquidTreatment.FREE);
    }

    private static double armAt(RightingCurve curve, int degrees) {
        return curve.points().get(degrees).gz();
    }

    /** Wall-sided formula, Derrett and Barrass, Ship Stability for Masters and Mates, 5th ed., p. 130 ex. 2: 65 × 12 m at 4 m, KG 4 m. */
    @ParameterizedTest
    @CsvSource({"5, 0.088156", "25, 0.560461"})
    void boxVesselHasTheWallSidedArms(int angle, double gz) {
        LoadedPlatform box = loaded(Floaters.bargeAt(65, 12, 8, 4, 4));
        RightingCurve curve = RightingArms.curve(box, fixed(0, 30));
        double phi = Math.toRadians(angle);
        double formula = Math.sin(phi) * (1 + 0.5 * 3 * Math.pow(Math.tan(phi), 2));
        assertThat(armAt(curve, angle)).isCloseTo(formula, within(EXACT)).isCloseTo(gz, within(1e-6));
    }

    /**
     * A box beyond the immersion of its deck edge: a square section immersed to half, at 45°, floats with a diagonal in the water.
     * The immersed triangle is symmetric, so B lies straight under the centre and the arm is that of G about the centre (closed form).
     */
    @Test
    void squareBoxAtFortyFiveDegreesHasTheTrianglesArm() {
        double a = 10;
        double kg = 3;
        LoadedPlatform box = loaded(Floaters.bargeAt(60, a, a, a / 2, kg));
        RightingCurve curve = RightingArms.curve(box, fixed(0, 45));
        assertThat(armAt(curve, 45)).isCloseTo((a / 2 - kg) * Math.sin(Math.PI / 4), within(EXACT));
    }

    /** OC4 columns only, NREL/TP-5000-60601: wall-sided until a column top meets the water; arms for GM 7.40037 m, BM 10.65984 m. */
    @ParameterizedTest
    @CsvSource({"2, 0.258496", "5, 0.648541", "10, 1.313837", "15, 2.014400", "20, 2.772570"})
    void oc4ColumnsHaveTheTabulatedArms(int angle, double gz) {
        LoadedPlatform floater = loaded(
                Floaters.platform(Floaters.oc4(false), 1.025 * 13_556.7577, new Vec3(0, 0, 20 - 9.894), List.of()));
        assertThat(armAt(RightingArms.curve(floater, fixed(0, 20)), angle)).isCloseTo(gz, within(1e-6));
    }

    /** A lying cylinder's metacentre is its axis at every angle: GZ = (R − KG) sin φ (closed form). */
    @Test
    void lyingCylinderHasTheSineOfTheAngle() {
        double r = 5;
        Vec3 start = new Vec3(-20, 0, r);
        PreparedPlatform platform = Floaters.platform(
                List.of(Floaters.cylinder("log", start, new Vec3(20, 0, r), 2 * r)),
                1.025 * 1200,
                new Vec3(0, 0, 3),
                List.of());
        RightingCurve curve = RightingArms.curve(loaded(platform), fixed(0, 60));
        for (int angle : new int[] {1, 20, 45, 60}) {
            assertThat(armAt(curve, angle)).isCloseTo((r - 3) * Math.sin(Math.toRadians(angle)), within(EXACT));
        }
    }

    /** Wholly under water B stays where it is: GZ = BG sin φ about every axis (any textbook on submarines). */
    @ParameterizedTest
    @ValueSource(doubles = {0, 45, 90, 200})
    void submergedBodyHasTheArmOfBOverG(double azimuth) {
        // A small mast carries the reserve of buoyancy, so that the body under it is all under water.
        List<Body> hull = List.of(
                Floaters.box("hull", -20, 20, -5, 5, 0, 10), Floaters.box("mast", -0.01, 0.01, -0.01, 0.01, 10, 60));
        double mass = 1.025 * (4000 + 0.0004 * 15);
        LoadedPlatform body = loaded(Floaters.platform(hull, mass, new Vec3(0, 0, 4), List.of()));
        RightingCurve curve = RightingArms.curve(body, fixed(azimuth, 40));
        for (int angle : new int[] {5, 20, 40}) {
            assertThat(armAt(curve, angle)).isCloseTo(Math.sin(Math.toRadians(angle)), within(1e-4));
        }
    }

    @Test
    void armStartsWithTheSlopeOfTheCorrectedGmAboutEveryAxis() {
        LoadedPlatform floater = slackTwinPontoon(0);
        ConditionResult.Gm gm = floater.evenKeel().gm();
        for (double azimuth : new double[] {0, 90, 180, 270}) {
            RightingCurve curve = RightingArms.curve(
                    floater, new RightingCurve.Request(azimuth, 0.02, 0.01, false, LiquidTreatment.FREE));
            double slope = (curve.points().get(2).gz() - curve.points().get(0).gz()) / Math.toRadians(0.02);
            boolean heeling = azimuth % 180 == 0;
            double corrected =
                    heeling ? gm.transverse().corrected() : gm.longitudinal().corrected();
            assertThat(slope).isCloseTo(corrected, within(1e-3));
        }
    }

    /** The independent second method: the arm is the derivative of the potential energy along the path of free trim. */
    @Property(tries = 12, seed = "2026")
    void armIsTheDerivativeOfThePotentialEnergy(@ForAll @DoubleRange(min = 0, max = 359) double azimuth) {
        LoadedPlatform floater = slackTwinPontoon(400);
        RightingArms arms = RightingArms.fromUpright(
                floater, new RightingCurve.Request(azimuth, 50, 1, true, LiquidTreatment.FREE));
        assertThat(arms.exists()).isTrue();
        double step = Math.toRadians(0.01);
        for (double degrees = 2; degrees < Math.toDegrees(arms.endRad()) - 1; degrees += 7) {
            double angle = Math.toRadians(degrees);
            double before = arms.at(angle - step).energy().value();
            double after = arms.at(angle + step).energy().value();
            double turned = turnAbout(arms.at(angle - step), arms.at(angle + step), azimuth);
            assertThat((after - before) / turned).isCloseTo(arms.point(angle).gz(), within(1e-5));
        }
    }

    /** The angle that the vertical turns about the axis, seen in the waterplane, from one state to another (rad). */
    private static double turnAbout(Inclination from, Inclination to, double azimuth) {
        Vec3 a = from.waterplane().plane().normal();
        Vec3 b = to.waterplane().plane().normal();
        Vec3 middle = a.plus(b).unit();
        double rad = Math.toRadians(azimuth);
        Vec3 axis = new Vec3(Math.cos(rad), Math.sin(rad), 0);
        Vec3 seen = axis.minus(middle.times(axis.dot(middle))).unit();
        return b.minus(a).dot(middle.cross(seen));
    }

    @Test
    void firstInterceptAboutHeelAndTrimIsTheFloatingPosition() {
        LoadedPlatform floater = slackTwinPontoon(900);
        Waterplane at = Evaluation.afloat(floater).waterplane();
        assertThat(at.heelAngle()).isGreaterThan(0.5);
        RightingCurve curve = RightingArms.curve(floater, RightingCurve.Request.usual(0));
        assertThat(curve.firstIntercept()).isCloseTo(at.heelAngle(), within(1e-6));
    }

    @Test
    void oppositeAxesOfASymmetricPlatformHaveTheSameArms() {
        LoadedPlatform floater = slackTwinPontoon(0);
        RightingCurve starboard = RightingArms.curve(floater, RightingCurve.Request.usual(0));
        RightingCurve port = RightingArms.curve(floater, RightingCurve.Request.usual(180));
        for (int i = 0; i < starboard.points().size(); i++) {
            assertThat(armAt(port, i)).isCloseTo(armAt(starboard, i), within(1e-7));
        }
        assertThat(port.area()).isCloseTo(starboard.area(), within(1e-6));
    }

    @Test
    void areaUnderASineIsOneLessTheCosine() {
        PreparedPlatform platform = Floaters.platform(
                List.of(Floaters.cylinder("log", new Vec3(-20, 0, 5), new Vec3(20, 0, 5), 10)),
                1.025 * 1200,
                new Vec3(0, 0, 3),
                List.of());
        RightingCurve curve = RightingArms.curve(loaded(platform), fixed(0, 60));
        assertThat(curve.area()).isCloseTo(2 * (1 - Math.cos(Math.toRadians(60))), within(curve.areaTolerance()));
        assertThat(curve.firstIntercept()).isZero();
        assertThat(curve.secondIntercept()).isNull();
        assertThat(curve.greatest()).isNotNull();
        assertThat(curve.range()).isCloseTo(60, within(1e-9));
    }

    /** Wall-sided loll: GZ = sin φ (GM + ½ BM tan² φ) passes zero upwards at tan φ = √(−2 GM/BM) (Derrett and Barrass, pp. 228–229). */
    @Test
    void unstableBoxRightsItselfAtItsAngleOfLoll() {
        double bm = 12.0 * 12 / (12 * 4);
        double kg = 2 + bm + 0.1;
        RightingCurve curve = RightingArms.curve(loaded(Floaters.bargeAt(65, 12, 8, 4, kg)), fixed(0, 30));
        assertThat(curve.firstIntercept()).isCloseTo(Math.toDegrees(Math.atan(Math.sqrt(2 * 0.1 / bm))), within(1e-6));
        assertThat(armAt(curve, 5)).isNegative();
    }

    @Test
    void positiveArmsEndAtTheVanishingAngle() {
        LoadedPlatform box = loaded(Floaters.bargeAt(60, 10, 6, 3, 4.2));
        RightingCurve curve = RightingArms.curve(box, fixed(0, 80));
        double vanishing = Objects.requireNonNull(curve.secondIntercept());
        assertThat(vanishing).isBetween(10.0, 80.0);
        assertThat(armAt(curve, (int) Math.floor(vanishing))).isPositive();
        assertThat(armAt(curve, (int) Math.ceil(vanishing))).isNegative();
        assertThat(curve.range()).isCloseTo(vanishing, within(1e-9));
    }

    /** Rectangular tank: the constant correction is optimistic inside its range (exact moment of transfer FSM sin φ (1 + ½ tan² φ)). */
    @Test
    void liquidsByCorrectionDifferFromFreeLiquidsByTheMomentOfTransfer() {
        Tank tank = Floaters.tank("T", Floaters.box("T", -10, 10, -6, 6, 0, 6));
        PreparedPlatform platform = Floaters.platform(
                List.of(Floaters.box("hull", -40, 40, -12, 12, 0, 12)),
                1.025 * 80 * 24 * 4,
                new Vec3(0, 0, 7),
                List.of(tank));
        LoadedPlatform half = loaded(platform, new Fill("T", 20 * 12 * 3, 1.025));
        RightingCurve free = RightingArms.curve(half, fixed(0, 12));
        RightingCurve corrected =
                RightingArms.curve(half, new RightingCurve.Request(0, 12, 1, false, LiquidTreatment.ACTUAL_MOMENT));
        double moment = 1.025 * 20 * Math.pow(12, 3) / 12;
        for (int angle : new int[] {3, 7, 12}) {
            double phi = Math.toRadians(angle);
            double more = moment * Math.sin(phi) * 0.5 * Math.pow(Math.tan(phi), 2) / half.mass();
            assertThat(armAt(corrected, angle) - armAt(free, angle)).isCloseTo(more, within(EXACT));
        }
    }

    @Test
    void greatestMomentsNeverGiveMoreArmThanActualOnes() {
        Tank tank = new Tank(
                "T",
                "T",
                Purpose.BALLAST,
                1.025,
                List.of(Floaters.body("T", Solid.cylinder(new Vec3(-10, 0, 4), new Vec3(10, 0, 4), 8, 8))),
                List.of(),
                1,
                0.98,
                0,
                1,
                false);
        PreparedPlatform platform = Floaters.platform(
                List.of(Floaters.box("hull", -40, 40, -12, 12, 0, 12)),
                1.025 * 80 * 24 * 4,
                new Vec3(0, 0, 7),
                List.of(tank));
        LoadedPlatform low = loaded(platform, new Fill("T", 100, 1.025));
        RightingCurve actual =
                RightingArms.curve(low, new RightingCurve.Request(0, 10, 1, false, LiquidTreatment.ACTUAL_MOMENT));
        RightingCurve greatest =
                RightingArms.curve(low, new RightingCurve.Request(0, 10, 1, false, LiquidTreatment.MAXIMUM_MOMENT));
        assertThat(armAt(greatest, 10)).isLessThan(armAt(actual, 10) - 1e-4);
    }

    /** The synthetic twin-pontoon hull with a slack tank at each quarter and a moment to starboard (t·m per m of its lever). */
    private static LoadedPlatform slackTwinPontoon(double toStarboard) {
        List<Tank> tanks = List.of(
                Floaters.tank("PF", Floaters.box("PF", 20, 45, 24, 36, 0, 8)),
                Floaters.tank("PA", Floaters.box("PA", -45, -20, 24, 36, 0, 8)),
                Floaters.tank("SF", Floaters.box("SF", 20, 45, -36, -24, 0, 8)),
                Floaters.tank("SA", Floaters.box("SA", -45, -20, -36, -24, 0, 8)));
        double ballast = 4 * 25 * 12 * 3 * 1.025;
        double light = 1.025 * 30_912 - ballast;
        PreparedPlatform platform =
                Floaters.platform(Floaters.twinPontoon(), light, new Vec3(0, -toStarboard / light * 10, 22), tanks);
        return loaded(
                platform,
                new Fill("PF", 900, 1.025),
                new Fill("PA", 900, 1.025),
                new Fill("SF", 900, 1.025),
                new Fill("SA", 900, 1.025));
    }

    /** Wall-sided barge: the area from upright to φ is ∫sin φ·(GM + ½·BM·tan² φ), by Commons Math; differences give any part. */
    @Test
    void pointsCarryTheAreaFromUpright() {
        RightingCurve curve = RightingArms.curve(loaded(Floaters.bargeAt(100, 20, 10, 5, 6)), fixed(0, 25));
        SimpsonIntegrator rule = new SimpsonIntegrator(1e-13, 1e-13, 3, 60);
        double to20 = rule.integrate(1_000_000, phi -> JudgedBarge.gz(6, phi), 0, Math.toRadians(20));
        double from10 =
                rule.integrate(1_000_000, phi -> JudgedBarge.gz(6, phi), Math.toRadians(10), Math.toRadians(20));
        List<RightingPoint> points = curve.points();
        assertThat(points.get(0).area()).isZero();
        assertThat(points.get(20).area()).isCloseTo(to20, within(curve.areaTolerance()));
        assertThat(points.get(20).area() - points.get(10).area()).isCloseTo(from10, within(curve.areaTolerance()));
    }

    /** Boxes of 20 × 8 m at 5 m and of 12 × 15 m at 11 m, through deck immersion and bilge emergence to 80°: against {@link Section}. */
    @ParameterizedTest
    @CsvSource({"20, 8, 5, 4, 400", "12, 15, 11, 6, 100", "12, 15, 4, 5.5, 60"})
    void boxHasTheArmsOfItsSectionAtAnyAngle(double breadth, double depth, double draft, double kg, double length) {
        LoadedPlatform box = loaded(Floaters.bargeAt(length, breadth, depth, draft, kg));
        RightingCurve curve = RightingArms.curve(box, fixed(0, 80));
        assertThat(curve.points()).hasSize(81);
        for (RightingPoint point : curve.points()) {
            double arm = Section.arm(breadth, depth, draft, kg, Math.toRadians(point.angle()));
            assertThat(point.gz()).as("at %s°", point.angle()).isCloseTo(arm, within(EXACT));
        }
    }

    /** A rectangle heeled in the water: cut by a line, its area and centroid by the shoelace formula, the line's height by Brent's method. */
    private static final class Section {
        static double arm(double breadth, double depth, double draft, double kg, double phi) {
            double b = breadth / 2;
            double[][] corners = {{-b, 0}, {b, 0}, {b, depth}, {-b, depth}};
            double reach = breadth + depth;
            double height = new BrentSolver(1e-13)
                    .solve(500, c -> moments(corners, phi, c)[0] - breadth * draft, -reach, reach);
            double[] m = moments(corners, phi, height);
            return -m[1] / m[0] * Math.cos(phi) - (kg - m[2] / m[0]) * Math.sin(phi);
        }

        /** Area and first moments by y and z of the part with y·sin φ + z·cos φ under a height. */
        private static double[] moments(double[][] corners, double phi, double height) {
            List<double[]> wet = new ArrayList<>();
            for (int i = 0; i < corners.length; i++) {
                double[] p = corners[i];
                double[] q = corners[(i + 1) % corners.length];
                double hp = p[0] * Math.sin(phi) + p[1] * Math.cos(phi) - height;
                double hq = q[0] * Math.sin(phi) + q[1] * Math.cos(phi) - height;
                if (hp <= 0) {
                    wet.add(p);
                }
                if (hp * hq < 0) {
                    double part = hp / (hp - hq);
                    wet.add(new double[] {p[0] + part * (q[0] - p[0]), p[1] + part * (q[1] - p[1])});
                }
            }
            double[] m = new double[3];
            for (int i = 0; i < wet.size(); i++) {
                double[] p = wet.get(i);
                double[] q = wet.get((i + 1) % wet.size());
                double twice = p[0] * q[1] - q[0] * p[1];
                m[0] += twice / 2;
                m[1] += twice * (p[0] + q[0]) / 6;
                m[2] += twice * (p[1] + q[1]) / 6;
            }
            return m;
        }
    }
}
