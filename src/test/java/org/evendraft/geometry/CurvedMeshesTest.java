package org.evendraft.geometry;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.evendraft.geometry.ClosedFormsTest.below;
import static org.evendraft.geometry.ClosedFormsTest.metacentre;
import static org.evendraft.geometry.ClosedFormsTest.relative;

import java.util.List;
import java.util.function.DoubleUnaryOperator;
import org.apache.commons.math3.analysis.integration.IterativeLegendreGaussIntegrator;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Curved bodies given as meshes, and prisms with rounded corners, against closed forms and independent integration. */
class CurvedMeshesTest {
    private static final double R = 10;
    private static final Solid SPHERE = Solid.ofMesh(Meshes.sphere(R, new Vec3(0, 0, R), 7));

    /** Spherical cap: V π·T²(3R − T)/3, KB T(8R − 3T)/(4(3R − T)), waterplane π(2RT − T²), I π·a⁴/4, KM = R. */
    @ParameterizedTest
    @CsvSource({
        "6, 904.778684, 3.875, 263.893783, 5541.76944",
        "10, 2094.395102, 6.25, 314.159265, 7853.98163",
        "14, 3284.011521, 8.3125, 263.893783, 5541.76944"
    })
    void sphereMatchesTheSphericalCap(double draft, double volume, double kb, double area, double inertia) {
        Cut cut = below(SPHERE, draft, 0, 0);
        assertThat(cut.volume()).isCloseTo(volume, relative(volume, 4e-4));
        assertThat(cut.centroid().z()).isCloseTo(kb, relative(kb, 4e-4));
        assertThat(cut.area()).isCloseTo(area, relative(area, 4e-4));
        assertThat(cut.secondMoments().transverse()).isCloseTo(inertia, relative(inertia, 8e-4));
        assertThat(metacentre(cut).z()).isCloseTo(R, within(5e-3));
    }

    /** KM = R at every draft and every heel: the metacentre is the centre of the sphere. */
    @ParameterizedTest
    @CsvSource({"6, 20, 0", "6, -35, 10", "12, 50, 0", "14, 0, 45", "10, 12, -17"})
    void sphereKeepsItsMetacentreWhateverItsInclination(double draft, double heel, double trim) {
        Vec3 m = metacentre(below(SPHERE, draft, heel, trim));
        assertThat(m.minus(new Vec3(0, 0, R)).norm()).isLessThan(5e-3);
    }

    /** The error of a mesh inscribed in a curved surface falls with the square of its panels. */
    @Test
    void sphereConvergesWithTheSquareOfItsPanels() {
        double exact = Math.PI * 36 * 24 / 3;
        double[] errors = new double[4];
        for (int i = 0; i < errors.length; i++) {
            Mesh mesh = Meshes.sphere(R, new Vec3(0, 0, R), 3 + i);
            errors[i] = exact - below(Solid.ofMesh(mesh), 6, 0, 0).volume();
        }
        for (int i = 1; i < errors.length; i++) {
            assertThat(errors[i - 1] / errors[i]).isBetween(3.5, 4.5);
        }
    }

    /** Wigley hull L 100, B 10, T 6.25 m: V = 4LBT/9, KB 5T/8, Aw 2LB/3, I_T 4LB³/105, I_L BL³/30 (integrals of its polynomial). */
    @Test
    void wigleyHullMatchesTheIntegralsOfItsPolynomial() {
        Cut cut = below(Solid.ofMesh(Meshes.wigley(100, 10, 6.25, 2, 400, 100)), 6.25, 0, 0);
        assertThat(cut.volume()).isCloseTo(2777.777778, relative(2777.8, 1e-4));
        assertThat(cut.centroid().z()).isCloseTo(3.90625, relative(3.9, 1e-4));
        assertThat(cut.centroid().x()).isCloseTo(0, within(1e-6));
        assertThat(cut.area()).isCloseTo(666.666667, relative(666.7, 1e-4));
        assertThat(cut.secondMoments().transverse()).isCloseTo(3809.52381, relative(3809.5, 1e-4));
        assertThat(cut.secondMoments().longitudinal()).isCloseTo(333_333.3333, relative(333_333, 1e-4));
        assertThat(cut.secondMoments().transverse() / cut.volume()).isCloseTo(1.371429, within(2e-4));
        assertThat(cut.secondMoments().longitudinal() / cut.volume()).isCloseTo(120, within(1e-2));
    }

    @Test
    void wigleyHullConvergesWithTheSquareOfItsPanels() {
        double coarse = below(Solid.ofMesh(Meshes.wigley(100, 10, 6.25, 2, 40, 20)), 6.25, 0, 0)
                .volume();
        double fine = below(Solid.ofMesh(Meshes.wigley(100, 10, 6.25, 2, 80, 40)), 6.25, 0, 0)
                .volume();
        double exact = 4 * 100 * 10 * 6.25 / 9;
        assertThat((exact - coarse) / (exact - fine)).isCloseTo(4, within(0.05));
    }

    /** ∫q² of a rectangle a × b with corners of radius r: the rectangle less four squares, plus four quarter circles. */
    private static double roundedMoment(double a, double b, double r) {
        double q = b / 2 - r;
        double square = r * (Math.pow(b / 2, 3) - Math.pow(q, 3)) / 3;
        double quarter = q * q * Math.PI * r * r / 4 + 2 * q * r * r * r / 3 + Math.PI * Math.pow(r, 4) / 16;
        return a * b * b * b / 12 - 4 * (square - quarter);
    }

    private static List<double[]> rectangle(double p0, double p1, double q0, double q1) {
        return List.of(new double[] {p0, q0}, new double[] {p1, q0}, new double[] {p1, q1}, new double[] {p0, q1});
    }

    @ParameterizedTest
    @CsvSource({"12.5, 12.5, 2.5", "20, 8, 1", "20, 8, 4", "10, 10, 5"})
    void columnWithRoundedCorners(double a, double b, double r) {
        Solid column = Solid.prism(Axis.Z, 2, 30, rectangle(7, 7 + a, -3, -3 + b), r);
        double area = a * b - (4 - Math.PI) * r * r;
        Cut cut = below(column, 15, 4, -6);
        double middle = 15 - (7 + a / 2) * Math.tan(Math.toRadians(6)) - (b / 2 - 3) * Math.tan(Math.toRadians(4));
        assertThat(cut.volume()).isCloseTo(area * (middle - 2), relative(area * middle, 1e-10));
        assertThat(cut.projectedArea()).isCloseTo(area, relative(area, 1e-10));
        double it = roundedMoment(a, b, r);
        double il = roundedMoment(b, a, r);
        assertThat(cut.projectedSecondMoments().transverse()).isCloseTo(it, relative(it, 1e-9));
        assertThat(cut.projectedSecondMoments().longitudinal()).isCloseTo(il, relative(il, 1e-9));
        assertThat(cut.projectedSecondMoments().product()).isCloseTo(0, within(1e-9 * it));
    }

    /** Breadth at a height z over the foot of a lying prism, b broad and d deep, with corners of radius r. */
    private static DoubleUnaryOperator breadth(double b, double d, double r) {
        return z -> {
            double into = Math.max(0, Math.max(r - z, z - (d - r)));
            return b - 2 * r + 2 * Math.sqrt(Math.max(0, r * r - into * into));
        };
    }

    private static double integral(DoubleUnaryOperator f, double to, double r, double d) {
        IterativeLegendreGaussIntegrator gauss = new IterativeLegendreGaussIntegrator(12, 1e-10, 1e-12);
        double sum = 0;
        double[] breaks = {0, Math.min(to, r), Math.min(to, d - r), to};
        for (int i = 0; i < 3; i++) {
            if (breaks[i + 1] > breaks[i]) {
                sum += gauss.integrate(10_000_000, f::applyAsDouble, breaks[i], breaks[i + 1]);
            }
        }
        return sum;
    }

    /** A pontoon with rounded bilges, cut through its corners and between them: integrated over its height by Commons Math. */
    @ParameterizedTest
    @ValueSource(doubles = {0.05, 0.3, 1.0, 2.0, 2.4999, 2.5, 4.0, 6.1, 7.5, 8.3, 8.49})
    void lyingPrismCutThroughItsRoundedCorners(double draft) {
        double b = 14;
        double d = 8.5;
        double r = 2.5;
        double length = 96;
        Solid pontoon = Solid.prism(Axis.X, -48, 48, rectangle(22, 36, 0, d), r);
        DoubleUnaryOperator w = breadth(b, d, r);
        double area = integral(w, draft, r, d);
        double moment = integral(z -> z * w.applyAsDouble(z), draft, r, d);
        double across = w.applyAsDouble(draft);
        Cut cut = below(pontoon, draft, 0, 0);
        assertThat(cut.volume()).isCloseTo(length * area, relative(length * area, 1e-8));
        assertThat(cut.centroid().z()).isCloseTo(moment / area, relative(moment / area, 1e-8));
        assertThat(cut.centroid().y()).isCloseTo(29, within(1e-8));
        assertThat(cut.area()).isCloseTo(length * across, relative(length * across, 1e-8));
        double it = length * across * across * across / 12;
        assertThat(cut.secondMoments().transverse()).isCloseTo(it, relative(it, 1e-8));
        double il = Math.pow(length, 3) * across / 12;
        assertThat(cut.secondMoments().longitudinal()).isCloseTo(il, relative(il, 1e-8));
    }
}
