package org.evendraft.cli;

import org.evendraft.platform.Faults;
import org.evendraft.stability.LiquidTreatment;
import org.evendraft.stability.RightingCurve;
import picocli.CommandLine.Option;

/** A curve about one axis as it is asked for on the command line, common to several commands. */
final class AxisOptions {
    @Option(
            names = "--azimuth",
            required = true,
            paramLabel = "A",
            description = "Direction of the axis, from x towards y (degrees): 0 turns starboard down, 90 bow down.")
    private double azimuth;

    @Option(
            names = "--to",
            paramLabel = "T",
            defaultValue = "60",
            description = "Greatest angle (degrees); 60 by default, at most 80.")
    private double to;

    @Option(
            names = "--step",
            paramLabel = "S",
            defaultValue = "1",
            description = "Between points (degrees); 1 by default.")
    private double step;

    @Option(names = "--fixed-trim", description = "Hold the trim about the perpendicular axis at 0.")
    private boolean fixedTrim;

    @Option(
            names = "--liquids",
            paramLabel = "HOW",
            defaultValue = "free",
            description = "free (default), actual_moment or maximum_moment: how liquids in slack tanks are counted.")
    private LiquidTreatment liquids = LiquidTreatment.FREE;

    /** The curve asked for; the faults are told of all that is out of range. */
    RightingCurve.Request curve(Faults faults) {
        return RightingCurve.Request.checked(azimuth, to, step, !fixedTrim, liquids, faults);
    }
}
