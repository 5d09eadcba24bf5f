package org.evendraft.ballast;

import org.evendraft.geometry.Vec3;
import org.evendraft.platform.PreparedPlatform;

/** Tells where tanks lie in words, by the middle of the full tank. */
final class TankPlaces {
    /** Amidships is the middle third of the hull's length: this part of it to either side. */
    private static final double AMIDSHIPS = 1.0 / 6;
    /** A middle as near to the centreline as this part of the hull's breadth lies on neither side. */
    private static final double CENTRELINE = 1.0 / 20;

    private final double middleX;
    private final double amidships;
    private final double centreline;

    TankPlaces(PreparedPlatform prepared) {
        Vec3 least = prepared.hull().least();
        Vec3 greatest = prepared.hull().greatest();
        this.middleX = (least.x() + greatest.x()) / 2;
        this.amidships = AMIDSHIPS * (greatest.x() - least.x());
        this.centreline = CENTRELINE * (greatest.y() - least.y());
    }

    /** Side and length, as in "starboard aft". */
    String of(BallastTank tank) {
        Vec3 middle =
                tank.calibration().holding(tank.calibration().fullVolume()).centre();
        String length = length(middle.x() - middleX);
        if (Math.abs(middle.y()) <= centreline) {
            return length + " on the centreline";
        }
        return (middle.y() > 0 ? "port " : "starboard ") + length;
    }

    private String length(double forward) {
        if (Math.abs(forward) <= amidships) {
            return "amidships";
        }
        return forward > 0 ? "forward" : "aft";
    }
}
