package org.evendraft.service;

import org.evendraft.geometry.Vec3;
import org.evendraft.stability.HydrostaticRow;

/**
 * Rounds the figures of hydrostatics to the decimals of a printed table.
 *
 * @param digits decimals of lengths
 */
record HydrostaticRounding(int digits) {

    HydrostaticRow of(HydrostaticRow row) {
        return new HydrostaticRow(
                length(row.draft()),
                row.heelAngle(),
                row.trimAngle(),
                amount(row.displacedVolume()),
                amount(row.displacement()),
                point(row.centreOfBuoyancy()),
                amount(row.waterplaneArea()),
                point(row.centreOfFlotation()),
                inertia(row.inertiaT()),
                inertia(row.inertiaL()),
                inertia(row.inertiaTL()),
                length(row.bmT()),
                length(row.bmL()),
                length(row.kmT()),
                length(row.kmL()),
                Decimals.IMMERSION.number(row.tonnesPerCentimetre(), digits),
                amount(row.momentToHeelOneDegree()),
                amount(row.momentToTrimOneDegree()));
    }

    private double length(double value) {
        return Decimals.LENGTH.number(value, digits);
    }

    private double amount(double value) {
        return Decimals.AMOUNT.number(value, digits);
    }

    private double inertia(double value) {
        return Decimals.INERTIA.number(value, digits);
    }

    private Vec3 point(Vec3 point) {
        return new Vec3(length(point.x()), length(point.y()), length(point.z()));
    }
}
