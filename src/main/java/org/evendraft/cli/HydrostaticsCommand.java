package org.evendraft.cli;

import java.nio.file.Path;
import java.util.concurrent.Callable;
import org.evendraft.platform.PlatformReader;
import org.evendraft.service.ReadHydrostatics;
import org.evendraft.stability.Waterplane;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;

/** Computes hydrostatics at a waterplane. */
@Command(
        name = "hydrostatics",
        mixinStandardHelpOptions = true,
        description = "Prints a platform's hydrostatics at one draft, heel and trim, in its own water, as JSON.")
final class HydrostaticsCommand implements Callable<Integer> {
    private final Console console;

    @Option(names = "--platform", required = true, paramLabel = "P.json", description = "The platform's document.")
    private Path platform = Path.of("");

    @Option(names = "--draft", required = true, paramLabel = "D", description = "Draft at the origin (m).")
    private double draft;

    @Option(
            names = "--heel",
            paramLabel = "H",
            defaultValue = "0",
            description = "Heel, positive starboard down (degrees); 0 by default.")
    private double heel;

    @Option(
            names = "--trim",
            paramLabel = "T",
            defaultValue = "0",
            description = "Trim, positive bow down (degrees); 0 by default.")
    private double trim;

    HydrostaticsCommand(Console console) {
        this.console = console;
    }

    @Override
    public Integer call() {
        Waterplane at = Waterplane.ofDegrees(draft, heel, trim);
        console.answer(ReadHydrostatics.row(InputFile.read(platform, PlatformReader::read), at));
        return Console.DONE;
    }
}
