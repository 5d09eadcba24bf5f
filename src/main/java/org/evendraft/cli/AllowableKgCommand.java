package org.evendraft.cli;

import java.nio.file.Path;
import java.time.Clock;
import java.util.concurrent.Callable;
import org.evendraft.platform.PlatformReader;
import org.evendraft.service.ComputeAllowableKg;
import org.evendraft.service.ComputeAllowableKg.TracedKgCurve;
import org.evendraft.service.PlatformAtRevision;
import org.evendraft.service.Provenance;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;

/** Finds the greatest KG. */
@Command(
        name = "allowable-kg",
        mixinStandardHelpOptions = true,
        description = {
            "Finds the greatest KG at each of several drafts for which every criterion holds, intact and damaged, and prints",
            "them as JSON with what sets them. The exit status is 3 when there is a draft at which no KG will do."
        })
final class AllowableKgCommand implements Callable<Integer> {
    private final Launcher launcher;
    private final Console console;

    @Option(names = "--platform", required = true, paramLabel = "P.json", description = "The platform's document.")
    private Path platform = Path.of("");

    @Option(
            names = "--request",
            required = true,
            paramLabel = "R.json",
            description = "What is wanted: mode, drafts, damage (none, listed or generated), windSpeed, waterDensity.")
    private Path request = Path.of("");

    @Mixin
    private ProgressOption progress = new ProgressOption();

    AllowableKgCommand(Launcher launcher, Console console) {
        this.launcher = launcher;
        this.console = console;
    }

    @Override
    public Integer call() {
        PlatformAtRevision read = new PlatformAtRevision(0, InputFile.read(platform, PlatformReader::read));
        Provenance.Source source = new Provenance.Source(Clock.systemUTC(), launcher.version());
        TracedKgCurve curve =
                InputFile.read(request, json -> ComputeAllowableKg.compute(read, json, progress.to(console), source));
        console.answer(curve);
        boolean everywhere = curve.limits().stream().allMatch(limit -> limit.allowableKg() != null);
        return everywhere ? Console.DONE : Console.CANNOT_BE_MET;
    }
}
