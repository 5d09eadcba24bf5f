package org.evendraft.service;

import java.util.List;
import java.util.function.ToDoubleFunction;
import java.util.stream.Stream;
import org.evendraft.stability.HydrostaticRow;

/**
 * A column of a table of hydrostatics.
 *
 * @param name its name in CSV: that of the JSON's property, with X, Y or Z for a coordinate of a point
 * @param head its head in a printed table, empty where it is not printed: the height of the centre of flotation lies in the waterplane
 * @param unit its unit there
 * @param decimals its rounding
 * @param value its value in a row
 */
record HydrostaticColumn(
        String name, String head, String unit, Decimals decimals, ToDoubleFunction<HydrostaticRow> value) {
    private static final String M = "m";
    private static final String M4 = "m⁴";
    private static final String MOMENT = "t·m/°";

    /** The angles, which stand over a block of a printed table. */
    private static final List<HydrostaticColumn> ANGLES = List.of(
            new HydrostaticColumn("heelAngle", "Heel", "°", Decimals.LENGTH, HydrostaticRow::heelAngle),
            new HydrostaticColumn("trimAngle", "Trim", "°", Decimals.LENGTH, HydrostaticRow::trimAngle));

    private static final HydrostaticColumn DRAFT =
            new HydrostaticColumn("draft", "Draft", M, Decimals.LENGTH, HydrostaticRow::draft);

    private static final List<HydrostaticColumn> FIGURES = List.of(
            new HydrostaticColumn("displacedVolume", "Volume", "m³", Decimals.AMOUNT, HydrostaticRow::displacedVolume),
            new HydrostaticColumn("displacement", "Displ.", "t", Decimals.AMOUNT, HydrostaticRow::displacement),
            new HydrostaticColumn(
                    "centreOfBuoyancyX",
                    "LCB",
                    M,
                    Decimals.LENGTH,
                    r -> r.centreOfBuoyancy().x()),
            new HydrostaticColumn(
                    "centreOfBuoyancyY",
                    "TCB",
                    M,
                    Decimals.LENGTH,
                    r -> r.centreOfBuoyancy().y()),
            new HydrostaticColumn(
                    "centreOfBuoyancyZ",
                    "VCB",
                    M,
                    Decimals.LENGTH,
                    r -> r.centreOfBuoyancy().z()),
            new HydrostaticColumn("waterplaneArea", "Area", "m²", Decimals.AMOUNT, HydrostaticRow::waterplaneArea),
            new HydrostaticColumn(
                    "centreOfFlotationX",
                    "LCF",
                    M,
                    Decimals.LENGTH,
                    r -> r.centreOfFlotation().x()),
            new HydrostaticColumn(
                    "centreOfFlotationY",
                    "TCF",
                    M,
                    Decimals.LENGTH,
                    r -> r.centreOfFlotation().y()),
            new HydrostaticColumn(
                    "centreOfFlotationZ",
                    "",
                    M,
                    Decimals.LENGTH,
                    r -> r.centreOfFlotation().z()),
            new HydrostaticColumn("inertiaT", "IT", M4, Decimals.INERTIA, HydrostaticRow::inertiaT),
            new HydrostaticColumn("inertiaL", "IL", M4, Decimals.INERTIA, HydrostaticRow::inertiaL),
            new HydrostaticColumn("inertiaTL", "ITL", M4, Decimals.INERTIA, HydrostaticRow::inertiaTL),
            new HydrostaticColumn("bmT", "BMT", M, Decimals.LENGTH, HydrostaticRow::bmT),
            new HydrostaticColumn("bmL", "BML", M, Decimals.LENGTH, HydrostaticRow::bmL),
            new HydrostaticColumn("kmT", "KMT", M, Decimals.LENGTH, HydrostaticRow::kmT),
            new HydrostaticColumn("kmL", "KML", M, Decimals.LENGTH, HydrostaticRow::kmL),
            new HydrostaticColumn(
                    "tonnesPerCentimetre", "TPC", "t/cm", Decimals.IMMERSION, HydrostaticRow::tonnesPerCentimetre),
            new HydrostaticColumn(
                    "momentToHeelOneDegree", "MH1", MOMENT, Decimals.AMOUNT, HydrostaticRow::momentToHeelOneDegree),
            new HydrostaticColumn(
                    "momentToTrimOneDegree", "MT1", MOMENT, Decimals.AMOUNT, HydrostaticRow::momentToTrimOneDegree));

    /** All columns, in the order of the JSON's properties. */
    static List<HydrostaticColumn> all() {
        return Stream.of(List.of(DRAFT), ANGLES, FIGURES).flatMap(List::stream).toList();
    }

    /** The columns of a printed table of one heel and trim. */
    static List<HydrostaticColumn> printed() {
        return Stream.of(List.of(DRAFT), FIGURES)
                .flatMap(List::stream)
                .filter(column -> !column.head().isEmpty())
                .toList();
    }

    /** The value in a row, unrounded. */
    String exact(HydrostaticRow row) {
        return Double.toString(value.applyAsDouble(row));
    }

    /**
     * The value in a row with its decimals.
     *
     * @param digits decimals of lengths
     */
    String rounded(HydrostaticRow row, int digits) {
        return decimals.rounded(value.applyAsDouble(row), digits).toPlainString();
    }
}
