package org.evendraft.cli;

import java.time.Clock;
import java.util.OptionalDouble;
import java.util.concurrent.Callable;
import org.evendraft.platform.Faults;
import org.evendraft.service.JudgeStability;
import org.evendraft.service.Provenance;
import org.evendraft.stability.RightingCurve;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;

/** Computes the wind on a platform. */
@Command(
        name = "wind",
        mixinStandardHelpOptions = true,
        description = {
            "Prints the force and the heeling moment of the wind on a platform about one horizontal axis as JSON:",
            "where it floats, with what each windage element adds in each height band, and over the inclination.",
            "Force in kN, moment in kN·m, by the IMO MODU Code 2009, chapter 3."
        })
final class WindCommand implements Callable<Integer> {
    private final Launcher launcher;
    private final Console console;

    @Mixin
    private LoadingFiles files = new LoadingFiles();

    @Mixin
    private AxisOptions axis = new AxisOptions();

    @Mixin
    private WindOption wind = new WindOption();

    WindCommand(Launcher launcher, Console console) {
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
        console.answer(JudgeStability.wind(loading.platform(), loading.condition(), speed, curve, source));
        return Console.DONE;
    }
}
