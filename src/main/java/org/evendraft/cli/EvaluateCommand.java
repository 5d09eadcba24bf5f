package org.evendraft.cli;

import java.time.Clock;
import java.util.concurrent.Callable;
import org.evendraft.service.EvaluateCondition;
import org.evendraft.service.Provenance;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;

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

    @Mixin
    private LoadingFiles files = new LoadingFiles();

    EvaluateCommand(Launcher launcher, Console console) {
        this.launcher = launcher;
        this.console = console;
    }

    @Override
    public Integer call() {
        LoadingFiles.Loading loading = files.read();
        Provenance.Source source = new Provenance.Source(Clock.systemUTC(), launcher.version());
        console.answer(EvaluateCondition.evaluate(loading.platform(), loading.condition(), source));
        return Console.DONE;
    }
}
