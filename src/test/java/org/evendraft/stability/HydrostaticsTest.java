package org.evendraft.stability;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.tuple;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.evendraft.geometry.Assembly;
import org.evendraft.geometry.Solid;
import org.evendraft.geometry.Vec3;
import org.evendraft.platform.FaultyDocumentException;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Rows and tables of hydrostatics, inclined ones by the domain's definition: true section, KM along the waterplane's normal. */
class HydrostaticsTest {
    private static Assembly of(Solid solid) {
        return new Assembly(List.of(new Assembly.Part(solid, false)));
    }

    /** A lying cylinder heeled about its axis: M stays on the axis, so KM along the normal from the keel is R·cos(heel). */
    @ParameterizedTest
    @CsvSource({"4, 0", "5, 15", "6, -40", "3, 55"})
    void kmIsMeasuredAlongTheNormal(double draft, double heel) {
        Assembly hull = of(Solid.cylinder(new Vec3(-20, 0, 5), new Vec3(20, 0, 5), 10, 10));
        HydrostaticRow row = Hydrostatics.row(hull, 1.025, Waterplane.ofDegrees(draft, heel, 0));
        assertThat(row.kmT()).isCloseTo(5 * Math.cos(Math.toRadians(heel)), within(1e-8));
        assertThat(row.heelAngle()).isCloseTo(heel, within(1e-12));
        assertThat(row.bmT()).isCloseTo(row.inertiaT() / row.displacedVolume(), within(1e-12));
        assertThat(row.displacement()).isCloseTo(1.025 * row.displacedVolume(), within(1e-9));
    }

    /** A box 60 × 12 m trimmed within its sides: the section is longer by 1/cos, its area seen from above sinks the box. */
    @Test
    void aTrimmedBoxHasItsTrueSection() {
        Assembly hull = of(Solid.box(new Vec3(-30, -6, 0), new Vec3(30, 6, 8)));
        double trim = 5;
        double cos = Math.cos(Math.toRadians(trim));
        HydrostaticRow row = Hydrostatics.row(hull, 1.025, Waterplane.ofDegrees(4, 0, trim));
        assertThat(row.waterplaneArea()).isCloseTo(720 / cos, within(1e-9));
        assertThat(row.inertiaL()).isCloseTo(12 * Math.pow(60 / cos, 3) / 12, within(1e-6));
        assertThat(row.inertiaT()).isCloseTo(60 / cos * 1728 / 12, within(1e-8));
        assertThat(row.tonnesPerCentimetre()).isCloseTo(7.38, within(1e-9));
        assertThat(row.centreOfFlotation().z()).isCloseTo(4, within(1e-9));
        // Bow down carries the centre of buoyancy forward by I·tan/V.
        assertThat(row.centreOfBuoyancy().x()).isCloseTo(216_000 * Math.tan(Math.toRadians(trim)) / 2880, within(1e-9));
    }

    @Test
    void aTableIsOrderedByTrimThenHeelThenDraft() {
        Assembly hull = of(Solid.box(new Vec3(-30, -6, 0), new Vec3(30, 6, 8)));
        HydrostaticGrid grid = new HydrostaticGrid(List.of(3.0, 4.0), List.of(-3.0, 0.0, 7.0), List.of(0.0, 1.1));
        List<HydrostaticRow> rows = Hydrostatics.table(hull, 1.025, grid);
        assertThat(grid.count()).isEqualTo(12);
        assertThat(rows)
                .extracting(HydrostaticRow::trimAngle, HydrostaticRow::heelAngle, HydrostaticRow::draft)
                .containsExactly(
                        tuple(0.0, -3.0, 3.0),
                        tuple(0.0, -3.0, 4.0),
                        tuple(0.0, 0.0, 3.0),
                        tuple(0.0, 0.0, 4.0),
                        tuple(0.0, 7.0, 3.0),
                        tuple(0.0, 7.0, 4.0),
                        tuple(1.1, -3.0, 3.0),
                        tuple(1.1, -3.0, 4.0),
                        tuple(1.1, 0.0, 3.0),
                        tuple(1.1, 0.0, 4.0),
                        tuple(1.1, 7.0, 3.0),
                        tuple(1.1, 7.0, 4.0));
        // Between keel and deck a wall-sided box at rest about its middle keeps its volume.
        assertThat(rows).allSatisfy(r -> assertThat(r.displacedVolume()).isCloseTo(720 * r.draft(), within(1e-9)));
    }

    @Test
    void stepsReachBothEndsInPlainDecimals() {
        assertThat(HydrostaticGrid.steps(1, 2.25, 0.5)).containsExactly(1.0, 1.5, 2.0, 2.25);
        assertThat(HydrostaticGrid.steps(0.1, 0.5, 0.1)).containsExactly(0.1, 0.2, 0.3, 0.4, 0.5);
        assertThat(HydrostaticGrid.steps(-0.2, 0.1, 0.1)).containsExactly(-0.2, -0.1, 0.0, 0.1);
        assertThat(HydrostaticGrid.steps(0, 1, 1 / 3.0)).hasSize(4).endsWith(1.0);
        assertThat(HydrostaticGrid.steps(2, 2, 0.1)).containsExactly(2.0);
        assertThat(HydrostaticGrid.steps(2, 2.05, 0.1)).containsExactly(2.0, 2.05);
    }

    @Test
    void aHullOutOfTheWaterHasNoHydrostatics() {
        Assembly hull = of(Solid.box(new Vec3(-30, -6, 0), new Vec3(30, 6, 8)));
        assertThatThrownBy(() -> Hydrostatics.row(hull, 1.025, new Waterplane(-0.1, 0, 0)))
                .isInstanceOf(FaultyDocumentException.class)
                .hasMessageContaining("under water");
        assertThatThrownBy(() -> Hydrostatics.row(hull, 1.025, new Waterplane(0, 0, 0)))
                .isInstanceOf(FaultyDocumentException.class);
        assertThatThrownBy(() -> Hydrostatics.row(hull, 1.025, Waterplane.ofDegrees(-10, 30, 0.5)))
                .hasMessageContaining("a heel of 30.00° and a trim of 0.50°");
    }
}
