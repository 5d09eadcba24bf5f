package org.evendraft.cli;

import java.time.Clock;
import java.util.concurrent.Callable;
import org.evendraft.service.ComputeRighting;
import org.evendraft.service.Provenance;
import org.evendraft.stability.LiquidTreatment;
import org.evendraft.stability.RightingCurve;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;

/** Computes a curve of righting arms. */
@Command(
        name = "righting",
        mixinStandardHelpOptions = true,
        description = {
            "Prints a platform's righting arms about one horizontal axis as JSON.",
            "The displacement is kept, the trim about the perpendicular axis is at rest and liquids are free,"
                    + " unless told otherwise."
        })
final class RightingCommand implements Callable<Integer> {
    private final Launcher launcher;
    private final Console console;

    @Mixin
    private LoadingFiles files = new LoadingFiles();

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
            defaultValue = "FREE",
            description = "FREE (default), ACTUAL_MOMENT or MAXIMUM_MOMENT: how liquids in slack tanks are counted.")
    private LiquidTreatment liquids = LiquidTreatment.FREE;

    @Option(
            names = "--wind",
            paramLabel = "V",
            description = "Wind speed (m/s) in place of that of the condition's mode.")
    private @Nullable Double wind;

    RightingCommand(Launcher launcher, Console console) {
        this.launcher = launcher;
        this.console = console;
    }

    @Override
    public Integer call() {
        RightingCurve.Request request = RightingCurve.Request.checked(azimuth, to, step, !fixedTrim, liquids);
        LoadingFiles.Loading loading = files.read();
        Provenance.Source source = new Provenance.Source(Clock.systemUTC(), launcher.version());
        console.answer(ComputeRighting.curve(
                loading.platform(), loading.condition(), WindOption.speed(wind), request, source));
        return Console.DONE;
    }
}
