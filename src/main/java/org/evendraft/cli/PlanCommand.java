package org.evendraft.cli;

import java.nio.file.Path;
import java.time.Clock;
import java.util.concurrent.Callable;
import org.evendraft.service.MakePlan;
import org.evendraft.service.Provenance;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;

/** Makes a ballast plan. */
@Command(
        name = "plan",
        mixinStandardHelpOptions = true,
        description = {
            "Makes a ballast plan from a condition to a target and prints it as JSON.",
            "A target that cannot be met is answered with feasible false, the nearest plan that can and what binds; the exit"
                    + " status is then 3."
        })
final class PlanCommand implements Callable<Integer> {
    private final Launcher launcher;
    private final Console console;

    @Mixin
    private LoadingFiles files = new LoadingFiles();

    @Option(names = "--request", required = true, paramLabel = "R.json", description = "The plan request.")
    private Path request = Path.of("");

    PlanCommand(Launcher launcher, Console console) {
        this.launcher = launcher;
        this.console = console;
    }

    @Override
    public Integer call() {
        LoadingFiles.Loading loading = files.read();
        Provenance.Source source = new Provenance.Source(Clock.systemUTC(), launcher.version());
        MakePlan.TracedPlan plan =
                InputFile.read(request, json -> MakePlan.make(loading.platform(), loading.condition(), json, source));
        console.answer(plan);
        return plan.plan().feasible() ? Console.DONE : Console.CANNOT_BE_MET;
    }
}
