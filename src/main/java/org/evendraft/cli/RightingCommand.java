package org.evendraft.cli;

import java.time.Clock;
import java.util.OptionalDouble;
import java.util.concurrent.Callable;
import org.evendraft.platform.Faults;
import org.evendraft.service.ComputeRighting;
import org.evendraft.service.Provenance;
import org.evendraft.stability.RightingCurve;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;

/** Computes a curve of righting arms. */
@Command(
        name = "righting",
        mixinStandardHelpOptions = true,
        description = {
            "Prints a platform's righting arms about one horizontal axis as JSON, with wind, openings and criteria there.",
            "The displacement is kept, the trim about the perpendicular axis is at rest and liquids are free,"
                    + " unless told otherwise."
        })
final class RightingCommand implements Callable<Integer> {
    private final Launcher launcher;
    private final Console console;

    @Mixin
    private LoadingFiles files = new LoadingFiles();

    @Mixin
    private AxisOptions axis = new AxisOptions();

    @Mixin
    private WindOption wind = new WindOption();

    RightingCommand(Launcher launcher, Console console) {
        this.launcher = launcher;
        this.console = console;
    }

    @Override
    public Integer call() {
        Faults faults = new Faults();
        RightingCurve.Request curve = axis.curve(faults);
        OptionalDouble speed = wind.speed(faults);
        faults.throwIfAny();
        LoadingFiles.Loading loading = files.read();
        Provenance.Source source = new Provenance.Source(Clock.systemUTC(), launcher.version());
        console.answer(ComputeRighting.curve(loading.platform(), loading.condition(), speed, curve, source));
        return Console.DONE;
    }
}
