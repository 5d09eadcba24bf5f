package org.evendraft.cli;

import java.nio.file.Path;
import java.time.Clock;
import java.util.concurrent.Callable;
import org.evendraft.platform.PlatformReader;
import org.evendraft.service.MakeLoadPlan;
import org.evendraft.service.PlatformAtRevision;
import org.evendraft.service.Provenance;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;

/** Makes a load plan. */
@Command(
        name = "load-plan",
        mixinStandardHelpOptions = true,
        description = {
            "Follows a sequence of loads, lifts, liquids and wind from the loading in the request's start, plans the ballast that it"
                    + " needs and prints all of it as JSON.",
            "When the platform would be lost, a ballast plan cannot meet its target or a limit is not kept, the answer says so and"
                    + " the exit status is 3."
        })
final class LoadPlanCommand implements Callable<Integer> {
    private final Launcher launcher;
    private final Console console;

    @Option(names = "--platform", required = true, paramLabel = "P.json", description = "The platform's document.")
    private Path platform = Path.of("");

    @Option(names = "--request", required = true, paramLabel = "R.json", description = "The load plan request.")
    private Path request = Path.of("");

    LoadPlanCommand(Launcher launcher, Console console) {
        this.launcher = launcher;
        this.console = console;
    }

    @Override
    public Integer call() {
        PlatformAtRevision read = new PlatformAtRevision(0, InputFile.read(platform, PlatformReader::read));
        Provenance.Source source = new Provenance.Source(Clock.systemUTC(), launcher.version());
        MakeLoadPlan.TracedLoadPlan made = InputFile.read(request, json -> MakeLoadPlan.make(read, json, source));
        console.answer(made);
        return made.plan().feasible() && made.plan().limitsKept() ? Console.DONE : Console.CANNOT_BE_MET;
    }
}
