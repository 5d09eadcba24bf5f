package org.evendraft.cli;

import java.nio.file.Path;
import java.time.Clock;
import java.util.concurrent.Callable;
import org.evendraft.platform.Condition;
import org.evendraft.platform.ConditionReader;
import org.evendraft.platform.PlatformReader;
import org.evendraft.service.EvaluateCondition;
import org.evendraft.service.PlatformAtRevision;
import org.evendraft.service.Provenance;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;

/** Evaluates a condition. */
@Command(
        name = "evaluate",
        mixinStandardHelpOptions = true,
        description = {
            "Evaluates a condition of a platform and prints the result as JSON.",
            "The result has mass, centre of gravity, GM, the exact floating position, draft marks, tanks, limits with"
                    + " their margins, and warnings."
        })
final class EvaluateCommand implements Callable<Integer> {
    private final Launcher launcher;
    private final Console console;

    @Option(names = "--platform", required = true, paramLabel = "P.json", description = "The platform's document.")
    private Path platform = Path.of("");

    @Option(names = "--condition", required = true, paramLabel = "C.json", description = "The condition's document.")
    private Path condition = Path.of("");

    EvaluateCommand(Launcher launcher, Console console) {
        this.launcher = launcher;
        this.console = console;
    }

    @Override
    public Integer call() {
        PlatformAtRevision read = new PlatformAtRevision(0, InputFile.read(platform, PlatformReader::read));
        Condition loading = InputFile.read(condition, json -> ConditionReader.read(json, read.prepared()));
        Provenance.Source source = new Provenance.Source(Clock.systemUTC(), launcher.version());
        console.answer(EvaluateCondition.evaluate(read, loading, source));
        return Console.DONE;
    }
}
