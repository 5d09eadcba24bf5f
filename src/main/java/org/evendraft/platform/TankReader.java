package org.evendraft.platform;

import java.util.ArrayList;
import java.util.List;

/** Reads the tanks of a platform. */
final class TankReader {
    private static final double DEFAULT_PRESSED_UP = 0.98;

    /** A table may hold more than the shape by this part of it before it is a fault. */
    private static final double TABLE_TOLERANCE = 1e-3;

    private final double waterDensity;
    private final Ids ids = new Ids("tank");

    private TankReader(double waterDensity) {
        this.waterDensity = waterDensity;
    }

    /**
     * Reads all tanks of a list.
     *
     * @param waterDensity density of a tank's liquid where none is given (t/m³)
     */
    static List<Tank> read(List<Fields> list, double waterDensity) {
        TankReader reader = new TankReader(waterDensity);
        List<Tank> tanks = new ArrayList<>();
        for (Fields fields : list) {
            tanks.add(reader.tank(fields));
        }
        return tanks;
    }

    private Tank tank(Fields fields) {
        String id = ids.read(fields);
        if (id.equals(Pump.SEA)) {
            fields.meaning("id", "the id " + Pump.SEA + " is reserved for the sea as an end of pumps");
        }
        int before = fields.faults().count();
        Tank tank = new Tank(
                id,
                fields.text("name", id),
                fields.choice("purpose", Purpose.class).orElse(Purpose.OTHER),
                fields.number("density", Range.DENSITY, waterDensity),
                BodyCheck.read(fields.objects("bodies"), fields, "bodies"),
                TableReader.read(fields),
                fields.number("permeability", Range.POSITIVE_FRACTION, 1),
                fields.number("pressedUpFraction", Range.POSITIVE_FRACTION, DEFAULT_PRESSED_UP),
                fields.number("leastPumpableFraction", Range.FRACTION, 0),
                fields.number("greatestFraction", Range.POSITIVE_FRACTION, 1),
                fields.flag("locked", false));
        fields.noOthers();
        checkOrder(fields, tank);
        if (fields.faults().count() == before) {
            checkContents(fields, tank);
        }
        return tank;
    }

    private static void checkOrder(Fields fields, Tank tank) {
        double least = tank.leastPumpableFraction();
        if (least >= tank.greatestFraction()) {
            fields.meaning("leastPumpableFraction", notBelow(least, "greatestFraction", tank.greatestFraction()));
        }
        if (least >= tank.pressedUpFraction()) {
            fields.meaning("leastPumpableFraction", notBelow(least, "pressedUpFraction", tank.pressedUpFraction()));
        }
    }

    private static String notBelow(double least, String name, double bound) {
        return "leastPumpableFraction must be less than " + name + ": " + Words.given(least) + " is not less than "
                + Words.given(bound);
    }

    private static void checkContents(Fields fields, Tank tank) {
        if (tank.bodies().isEmpty() && tank.table().isEmpty()) {
            fields.faults().form(fields.pointer(), "tank " + tank.id() + " has neither bodies nor a table");
            return;
        }
        if (tank.bodies().isEmpty()) {
            return;
        }
        double full =
                tank.permeability() * PreparedPlatform.assembly(tank.bodies()).volume();
        if (full < BodyCheck.LEAST_VOLUME) {
            fields.faults().meaning(fields.pointer(), "tank " + tank.id() + " has no volume to fill");
        }
        for (int i = 0; i < tank.table().size(); i++) {
            if (tank.table().get(i).volume() > full * (1 + TABLE_TOLERANCE)) {
                fields.faults()
                        .meaning(
                                fields.pointer("table") + "/" + i + "/volume",
                                "the table of tank " + tank.id() + " holds "
                                        + Words.given(tank.table().get(i).volume()) + " m³, its shape only "
                                        + Words.rounded(full) + " m³");
                return;
            }
        }
    }
}
