package org.evendraft.geometry;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.assertj.core.data.Offset;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * Solids against their closed forms: elementary solid geometry, and M at the centre of every circle that the waterline cuts
 * (Derrett and Barrass, Ship Stability for Masters and Mates, 5th ed. 1999, chapters on KB, BM and metacentric diagrams).
 */
class ClosedFormsTest {
    /** Cones are integrated by their tessellation, which promises this for second moments; their areas and volumes are true. */
    private static final double TESSELLATED = 1e-4;
    /** Cylinders are integrated with their curves: only rounding remains. */
    private static final double CURVED = 1e-9;

    private static final double EXACT = 1e-11;

    static Cut below(Solid solid, double draft, double heel, double trim) {
        Assembly alone = new Assembly(List.of(new Assembly.Part(solid, false)));
        double slopeY = -Math.tan(Math.toRadians(heel));
        return alone.below(Plane.ofSlopes(draft, Math.tan(Math.toRadians(trim)), slopeY));
    }

    static Offset<Double> relative(double value, double part) {
        return within(Math.abs(value) * part);
    }

    /** The metacentre for heel: B raised by I/V along the normal. */
    static Vec3 metacentre(Cut cut) {
        double bm = cut.secondMoments().transverse() / cut.volume();
        return cut.centroid().plus(cut.plane().normal().times(bm));
    }

    @Test
    void boxOnEvenKeel() {
        Cut cut = below(Solid.box(new Vec3(-30, -6, 0), new Vec3(30, 6, 8)), 4, 0, 0);
        assertThat(cut.volume()).isCloseTo(60 * 12 * 4, relative(2880, EXACT));
        assertThat(cut.centroid().z()).isCloseTo(2, within(EXACT));
        assertThat(cut.area()).isCloseTo(720, relative(720, EXACT));
        assertThat(cut.secondMoments().transverse()).isCloseTo(60 * 1728 / 12.0, relative(8640, EXACT));
        assertThat(cut.secondMoments().longitudinal()).isCloseTo(12 * 216_000 / 12.0, relative(216_000, EXACT));
        assertThat(cut.secondMoments().product()).isCloseTo(0, within(1e-6));
    }

    /** While the waterline meets the sides only: section B/cos wide, B shifted by I·tan/V sideways and I·tan²/2V up (wall-sided rule). */
    @ParameterizedTest
    @CsvSource({"5", "20", "-30", "33.5"})
    void boxHeeledWithinItsSides(double heel) {
        double tan = Math.tan(Math.toRadians(heel));
        double cos = Math.cos(Math.toRadians(heel));
        Cut cut = below(Solid.box(new Vec3(-30, -6, 0), new Vec3(30, 6, 8)), 4, heel, 0);
        double shift = 12 * 12 / (12.0 * 4);
        assertThat(cut.volume()).isCloseTo(2880, relative(2880, EXACT));
        assertThat(cut.centroid().y()).isCloseTo(-shift * tan, within(1e-10));
        assertThat(cut.centroid().z()).isCloseTo(2 + shift * tan * tan / 2, within(1e-10));
        assertThat(cut.area()).isCloseTo(720 / cos, relative(720, EXACT));
        assertThat(cut.secondMoments().transverse()).isCloseTo(8640 / Math.pow(cos, 3), relative(8640, 1e-10));
        assertThat(cut.secondMoments().longitudinal()).isCloseTo(216_000 / cos, relative(216_000, 1e-10));
        assertThat(cut.projectedArea()).isCloseTo(720, relative(720, EXACT));
        assertThat(cut.projectedSecondMoments().transverse()).isCloseTo(8640, relative(8640, 1e-10));
        assertThat(cut.projectedSecondMoments().longitudinal()).isCloseTo(216_000, relative(216_000, 1e-10));
    }

    /** Half a square prism heeled by 45° about its own axis floats as a triangle: width B√2, B at a third of the depth. */
    @Test
    void boxOnItsEdge() {
        Cut cut = below(Solid.box(new Vec3(-10, -5, 0), new Vec3(10, 5, 10)), 5, 45, 0);
        double width = 10 * Math.sqrt(2);
        assertThat(cut.volume()).isCloseTo(1000, within(1e-9));
        assertThat(cut.area()).isCloseTo(20 * width, within(1e-9));
        assertThat(cut.secondMoments().transverse()).isCloseTo(20 * Math.pow(width, 3) / 12, within(1e-7));
        assertThat(cut.plane().height(cut.centroid())).isCloseTo(-width / 2 / 3, within(1e-10));
    }

    @ParameterizedTest
    @CsvSource({"0, 0", "10, 0", "0, -25", "18, 12"})
    void verticalCylinderCutThroughItsSide(double heel, double trim) {
        double draft = 10;
        double radius = 10;
        Cut cut = below(Solid.cylinder(Vec3.ZERO, new Vec3(0, 0, 20), 2 * radius, 2 * radius), draft, heel, trim);
        double area = Math.PI * radius * radius;
        double quarter = area * radius * radius / 4;
        double t = Math.tan(Math.toRadians(trim));
        double h = Math.tan(Math.toRadians(heel));
        assertThat(cut.volume()).isCloseTo(area * draft, relative(area * draft, EXACT));
        assertThat(cut.projectedArea()).isCloseTo(area, relative(area, EXACT));
        assertThat(cut.projectedSecondMoments().transverse()).isCloseTo(quarter, relative(quarter, CURVED));
        assertThat(cut.projectedSecondMoments().longitudinal()).isCloseTo(quarter, relative(quarter, CURVED));
        assertThat(cut.centroid().x()).isCloseTo(t * 2.5, within(CURVED));
        assertThat(cut.centroid().y()).isCloseTo(-h * 2.5, within(CURVED));
        assertThat(cut.centroid().z()).isCloseTo(5 + (t * t + h * h) * 1.25, within(CURVED));
        double stretch = Math.sqrt(1 + t * t + h * h);
        assertThat(cut.area()).isCloseTo(area * stretch, relative(area, 1e-10));
        SecondMoments own = cut.secondMoments();
        // An ellipse of half axes r and r·stretch: trace and determinant of its second moments do not depend on the
        // frame.
        double trace = quarter * stretch * (1 + stretch * stretch);
        assertThat(own.transverse() + own.longitudinal()).isCloseTo(trace, relative(trace, CURVED));
        double determinant = own.transverse() * own.longitudinal() - own.product() * own.product();
        double expected = quarter * quarter * Math.pow(stretch, 4);
        assertThat(determinant).isCloseTo(expected, relative(expected, CURVED));
    }

    /**
     * Closed forms of the circular segment. Between 2 and 98 % of the diameter rounding stays under 1e-9; nearer to the ends breadth
     * and area, small differences of large numbers, lose figures as the chord goes to nothing.
     */
    @ParameterizedTest
    @ValueSource(doubles = {0.02, 0.0213, 0.05, 0.1, 0.25, 0.4, 0.5, 0.617, 0.75, 0.9, 0.95, 0.9871, 0.98})
    void lyingCylinderFromTwoToNinetyEightPercent(double part) {
        double r = 5;
        double length = 40;
        Solid solid = Solid.cylinder(new Vec3(-20, 0, r), new Vec3(20, 0, r), 2 * r, 2 * r);
        double draft = 2 * r * part;
        double s = Math.acos((r - draft) / r);
        double segment = r * r * (s - Math.sin(s) * Math.cos(s));
        double breadth = 2 * r * Math.sin(s);
        double kb = r - 2 * Math.pow(r * Math.sin(s), 3) / (3 * segment);
        Cut cut = below(solid, draft, 0, 0);
        assertThat(cut.volume()).isCloseTo(length * segment, relative(length * segment, CURVED));
        assertThat(cut.centroid().z()).isCloseTo(kb, relative(kb, CURVED));
        assertThat(cut.area()).isCloseTo(breadth * length, relative(breadth * length, CURVED));
        double it = length * Math.pow(breadth, 3) / 12;
        assertThat(cut.secondMoments().transverse()).isCloseTo(it, relative(it, CURVED));
        double il = breadth * Math.pow(length, 3) / 12;
        assertThat(cut.secondMoments().longitudinal()).isCloseTo(il, relative(il, CURVED));
        assertThat(metacentre(cut).z()).isCloseTo(r, within(2 * r * CURVED));
    }

    /** Sample values of the same closed form, radius 5 m, length 40 m: volume, KB, waterplane, I_T, BM_L. */
    @ParameterizedTest
    @CsvSource({
        "3, 792.673425, 1.7625477, 366.606056, 2566.24239, 61.665758",
        "5, 1570.796327, 2.8779341, 400.0, 3333.33333, 33.953055",
        "8, 2694.297436, 4.3665634, 320.0, 1706.66667, 15.835916"
    })
    void lyingCylinderSamples(double draft, double volume, double kb, double area, double it, double bmL) {
        Cut cut = below(Solid.cylinder(new Vec3(-20, 0, 5), new Vec3(20, 0, 5), 10, 10), draft, 0, 0);
        assertThat(cut.volume()).isCloseTo(volume, relative(volume, 1e-8));
        assertThat(cut.centroid().z()).isCloseTo(kb, relative(kb, 1e-7));
        assertThat(cut.area()).isCloseTo(area, relative(area, 1e-8));
        assertThat(cut.secondMoments().transverse()).isCloseTo(it, relative(it, 1e-8));
        assertThat(cut.secondMoments().longitudinal() / cut.volume()).isCloseTo(bmL, relative(bmL, 1e-7));
    }

    /** Heeled about its own axis a lying cylinder is the same body: M stays on the axis. */
    @ParameterizedTest
    @CsvSource({"3, 10", "5, 37", "8, -55", "2, 59"})
    void lyingCylinderHeeledAboutItsAxisKeepsItsMetacentre(double depth, double heel) {
        double cos = Math.cos(Math.toRadians(heel));
        Solid solid = Solid.cylinder(new Vec3(-20, 0, 5), new Vec3(20, 0, 5), 10, 10);
        // The plane's distance from the axis is the same as upright at that depth.
        double draft = 5 + (depth - 5) / cos;
        Cut upright = below(solid, depth, 0, 0);
        Cut heeled = below(solid, draft, heel, 0);
        assertThat(heeled.volume()).isCloseTo(upright.volume(), relative(upright.volume(), CURVED));
        assertThat(heeled.secondMoments().transverse())
                .isCloseTo(
                        upright.secondMoments().transverse(),
                        relative(upright.secondMoments().transverse(), 2 * CURVED));
        assertThat(metacentre(heeled).y()).isCloseTo(0, within(5 * CURVED));
        assertThat(metacentre(heeled).z()).isCloseTo(5, within(5 * CURVED));
    }

    /**
     * The hoof that a plane through a diameter of the base cuts off a cylinder: V 2r³·tan/3, centroid at 3πr/16 and 3πr·tan/32, its
     * section half an ellipse of half axes r and r/cos (Archimedes, The Method; any table of solids).
     */
    @ParameterizedTest
    @ValueSource(doubles = {10, 30, 45, 59})
    void hoofOfACylinderCutThroughItsBase(double heel) {
        double r = 4;
        double tan = Math.tan(Math.toRadians(heel));
        double cos = Math.cos(Math.toRadians(heel));
        Cut cut = below(Solid.cylinder(Vec3.ZERO, new Vec3(0, 0, 20), 2 * r, 2 * r), 0, -heel, 0);
        double volume = 2 * r * r * r * tan / 3;
        assertThat(cut.volume()).isCloseTo(volume, relative(volume, CURVED));
        assertThat(cut.centroid().x()).isCloseTo(0, within(CURVED));
        assertThat(cut.centroid().y()).isCloseTo(3 * Math.PI * r / 16, within(1e-8));
        assertThat(cut.centroid().z()).isCloseTo(3 * Math.PI * r * tan / 32, within(1e-8));
        double area = Math.PI * r * r / 2 / cos;
        assertThat(cut.area()).isCloseTo(area, relative(area, CURVED));
        double off = 4 * r / (3 * Math.PI);
        double it = Math.PI * Math.pow(r, 4) / 8 - Math.PI * r * r / 2 * off * off;
        assertThat(cut.projectedSecondMoments().transverse()).isCloseTo(it, relative(it, 1e-8));
        assertThat(cut.projectedSecondMoments().longitudinal())
                .isCloseTo(Math.PI * Math.pow(r, 4) / 8, relative(it, 1e-8));
    }

    /** Apex down, half angle 30°, draft 9 m: V 254.469005 m³, KB 3T/4, I π·r⁴/4, KM 3T/(4·cos²q). */
    @Test
    void coneWithItsApexDown() {
        double height = 15;
        double tan = Math.tan(Math.toRadians(30));
        Cut cut = below(Solid.cylinder(Vec3.ZERO, new Vec3(0, 0, height), 0, 2 * height * tan), 9, 0, 0);
        assertThat(cut.volume()).isCloseTo(254.469005, within(1e-6));
        assertThat(cut.centroid().z()).isCloseTo(6.75, within(1e-10));
        assertThat(cut.area()).isCloseTo(84.823002, within(1e-6));
        assertThat(cut.secondMoments().transverse()).isCloseTo(572.55526, relative(572.55526, TESSELLATED / 10));
        assertThat(metacentre(cut).z()).isCloseTo(9.0, within(1e-4));
    }

    @ParameterizedTest
    @CsvSource({"12, 6", "6, 12", "24, 12", "0, 8", "8, 0"})
    void frustumCutBetweenItsEnds(double foot, double top) {
        double height = 20;
        double draft = 12;
        Cut cut = below(Solid.cylinder(new Vec3(3, -2, 0), new Vec3(3, -2, height), foot, top), draft, 0, 0);
        double at = foot + (top - foot) * draft / height;
        double sum = foot * foot + foot * at + at * at;
        double volume = Math.PI * draft * sum / 12;
        double kb = draft * (foot * foot + 2 * foot * at + 3 * at * at) / (4 * sum);
        assertThat(cut.volume()).isCloseTo(volume, relative(volume, EXACT));
        assertThat(cut.centroid().z()).isCloseTo(kb, within(1e-9));
        assertThat(cut.centroid().x()).isCloseTo(3, within(1e-9));
        assertThat(cut.centroid().y()).isCloseTo(-2, within(1e-9));
        assertThat(cut.area()).isCloseTo(Math.PI * at * at / 4, relative(at * at, EXACT));
        double inertia = Math.PI * Math.pow(at, 4) / 64;
        assertThat(cut.secondMoments().transverse()).isCloseTo(inertia, relative(inertia, TESSELLATED / 10));
        assertThat(cut.secondMoments().longitudinal()).isCloseTo(inertia, relative(inertia, TESSELLATED / 10));
    }

    /** A cone of half angle q cut by an inclined plane: V = π·a·b·d/3 with the ellipse's half axes and the apex's distance. */
    @Test
    void coneCutByAnInclinedPlane() {
        double q = Math.toRadians(35);
        double heel = Math.toRadians(20);
        Solid cone = Solid.cylinder(Vec3.ZERO, new Vec3(0, 0, 20), 0, 40 * Math.tan(q));
        double draft = 8;
        Cut cut = below(cone, draft, 20, 0);
        // Lines of the cone in the plane x = 0 meet z = draft − y·tan(heel) at these distances from the apex.
        double near = draft * Math.cos(heel) / Math.cos(q - heel);
        double far = draft * Math.cos(heel) / Math.cos(q + heel);
        double a = Math.sqrt(near * near + far * far - 2 * near * far * Math.cos(2 * q)) / 2;
        double b = Math.sqrt(near * far) * Math.sin(q);
        double depth = draft * Math.cos(heel);
        double volume = Math.PI * a * b * depth / 3;
        assertThat(cut.area()).isCloseTo(Math.PI * a * b, relative(a * b, TESSELLATED / 10));
        assertThat(cut.volume()).isCloseTo(volume, relative(volume, TESSELLATED / 10));
        assertThat(cut.secondMoments().transverse())
                .isCloseTo(Math.PI * a * a * a * b / 4, relative(a * a * a * b, TESSELLATED));
        assertThat(cut.secondMoments().longitudinal())
                .isCloseTo(Math.PI * a * b * b * b / 4, relative(a * b * b * b, TESSELLATED));
        assertThat(cut.plane().height(cut.centroid())).isCloseTo(-depth / 4, relative(depth, TESSELLATED));
    }
}
