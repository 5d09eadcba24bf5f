package org.evendraft.stability;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.assertj.core.data.Offset;
import org.evendraft.geometry.Assembly;
import org.evendraft.geometry.Vec3;
import org.evendraft.platform.Body;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Published floaters and members, each with its source. */
class ReferenceFloatersTest {
    private static final double DENSITY = 1.025;
    /** Standard gravity, m/s² (CGPM 1901). */
    private static final double G = 9.80665;

    private static Assembly hull(List<Body> bodies) {
        return new Assembly(bodies.stream()
                .map(b -> new Assembly.Part(b.solid(), b.cutOut()))
                .toList());
    }

    private static HydrostaticRow row(List<Body> bodies, double draft) {
        return Hydrostatics.row(hull(bodies), DENSITY, new Waterplane(draft, 0, 0));
    }

    private static Offset<Double> relative(double value, double part) {
        return within(Math.abs(value) * part);
    }

    /** OC4-DeepCwind, NREL/TP-5000-60601: displaced volume 13 917 m³ at 20 m, C33 3.836e6 N/m, C44 −3.776e8 N·m/rad (buoyancy only, about the still water). */
    @Test
    void oc4WithItsBracesMatchesThePublishedHydrostatics() {
        HydrostaticRow row = row(Floaters.oc4(true), 20);
        assertThat(row.displacedVolume()).isCloseTo(13_917, relative(13_917, 3e-4));
        assertThat(20 - row.centreOfBuoyancy().z()).isCloseTo(13.175, within(0.002));
        double c33 = 1025 * G * row.waterplaneArea();
        assertThat(c33).isCloseTo(3.836e6, relative(3.836e6, 5e-3));
        double zb = row.centreOfBuoyancy().z() - 20;
        double c44 = 1025 * G * (row.inertiaT() + row.displacedVolume() * zb);
        assertThat(c44).isCloseTo(-3.776e8, relative(3.776e8, 1e-2));
        assertThat(row.inertiaT()).isCloseTo(145_465, relative(145_465, 5e-4));
    }

    /** OC4 columns only: closed forms of circles, displaced volume 13 556.7577 m³, waterplane 372.475 m². */
    @Test
    void oc4ColumnsMatchTheClosedForms() {
        HydrostaticRow row = row(Floaters.oc4(false), 20);
        assertThat(row.displacedVolume()).isCloseTo(13_556.7577, within(1e-3));
        assertThat(row.waterplaneArea()).isCloseTo(372.475, within(1e-3));
        assertThat(row.bmT()).isCloseTo(10.65984, relative(10.65984, 1e-5));
        assertThat(row.inertiaT()).isCloseTo(row.inertiaL(), relative(row.inertiaT(), 1e-5));
    }

    /**
     * OC4 columns only, heeled by a moment: between z = −14 m and the column tops the sides are vertical, so the wall-sided formula
     * (Derrett and Barrass, Ship Stability for Masters and Mates, 5th ed.) holds exactly; GZ tabulated for GM 7.40037, BM 10.65984 m.
     */
    @ParameterizedTest
    @CsvSource({"2, 0.258496", "5, 0.648541", "10, 1.313837", "15, 2.014400", "20, 2.772570"})
    void oc4HeelsToTheAngleWhoseRightingArmIsTabulated(double angle, double arm) {
        double kg = 20 - 9.894;
        // A centre of gravity so far off the centreline that heel is balanced: off·cos(angle) = GZ.
        double off = arm / Math.cos(Math.toRadians(angle));
        double mass = DENSITY * 13_556.7577;
        LoadedPlatform loaded = LoadedPlatform.of(
                Floaters.platform(Floaters.oc4(false), mass, new Vec3(0, -off, kg), List.of()),
                Floaters.condition(List.of(), List.of()));
        Waterplane at = Evaluation.afloat(loaded).waterplane();
        assertThat(at.heelAngle()).isCloseTo(angle, within(2e-4));
    }

    /** ITI Energy barge, NREL/TP-500-41958: displacement 6 000 m³ at 4 m; I = (40⁴ − 10⁴)/12, BM 35.4167 m. */
    @Test
    void itiBargeWithItsMoonpoolMatchesThePublishedFigures() {
        HydrostaticRow row = row(Floaters.itiBarge(), 4);
        assertThat(row.displacedVolume()).isCloseTo(6000, within(1e-8));
        assertThat(row.waterplaneArea()).isCloseTo(1500, within(1e-9));
        assertThat(row.inertiaT()).isCloseTo(212_500, within(1e-6));
        assertThat(row.bmL()).isCloseTo(212_500.0 / 6000, within(1e-10));
        assertThat(1025 * G * row.displacedVolume()).isCloseTo(6.03109e7, relative(6.03109e7, 1e-5));
    }

    /** Synthetic twin-pontoon hull across its pontoon deck: exact arithmetic on boxes. */
    @ParameterizedTest
    @CsvSource({
        "7, 21000, 3.5, 3000, 2756250, 2500000, 134.75, 122.547619",
        "7.9999999, 24000, 4.0, 3000, 2756250, 2500000, 118.84375, 108.166667",
        "8.0000001, 24000, 4.0, 576, 525312, 712512, 25.888, 33.688",
        "20, 30912, 6.236025, 576, 525312, 712512, 23.229814, 29.285714"
    })
    void twinPontoonHullJumpsAtItsPontoonDeck(
            double draft, double v, double kb, double area, double it, double il, double kmT, double kmL) {
        HydrostaticRow row = row(Floaters.twinPontoon(), draft);
        assertThat(row.displacedVolume()).isCloseTo(v, relative(v, 1e-7));
        assertThat(row.centreOfBuoyancy().z()).isCloseTo(kb, within(1e-6));
        assertThat(row.waterplaneArea()).isCloseTo(area, within(1e-6));
        assertThat(row.inertiaT()).isCloseTo(it, relative(it, 1e-9));
        assertThat(row.inertiaL()).isCloseTo(il, relative(il, 1e-9));
        assertThat(row.kmT()).isCloseTo(kmT, relative(kmT, 1e-6));
        assertThat(row.kmL()).isCloseTo(kmL, relative(kmL, 1e-6));
    }

    /** Single members of the open RAFT regression data (g 9.81 there): stiffness about the still-water origin, buoyancy only. */
    @Test
    void singleMembersMatchTheOpenRegressionData() {
        double weight = 1025 * 9.81;
        List<Body> round = List.of(Floaters.cylinder("member", new Vec3(0, 0, 0), new Vec3(0, 0, 35), 9.85));
        HydrostaticRow vertical = row(round, 20);
        assertThat(weight * vertical.displacedVolume()).isCloseTo(1.53244611e7, relative(1.5e7, 1e-8));
        assertThat(weight * vertical.waterplaneArea()).isCloseTo(7.66223055e5, relative(7.7e5, 1e-8));
        double zb = vertical.centreOfBuoyancy().z() - 20;
        assertThat(weight * (vertical.inertiaT() + vertical.displacedVolume() * zb))
                .isCloseTo(-1.48598306e8, relative(1.5e8, 1e-7));
        List<Body> box = List.of(Floaters.box("member", -9.85 / 2, 9.85 / 2, -3, 3, 0, 35));
        HydrostaticRow square = row(box, 20);
        assertThat(weight * (square.inertiaT() - square.displacedVolume() * 10))
                .isCloseTo(-1.17070259e8, relative(1.2e8, 1e-8));
        assertThat(weight * (square.inertiaL() - square.displacedVolume() * 10))
                .isCloseTo(-1.14048296e8, relative(1.2e8, 1e-8));
        List<Body> lying = List.of(Floaters.cylinder("member", new Vec3(-17.5, 0, 5), new Vec3(17.5, 0, 5), 9.85));
        HydrostaticRow deep = row(lying, 25);
        assertThat(weight * deep.displacedVolume()).isCloseTo(2.68178069e7, relative(2.7e7, 1e-8));
        assertThat(deep.waterplaneArea()).isZero();
    }
}
