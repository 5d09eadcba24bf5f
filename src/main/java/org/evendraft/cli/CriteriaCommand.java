package org.evendraft.cli;

import java.time.Clock;
import java.util.OptionalDouble;
import java.util.concurrent.Callable;
import org.evendraft.platform.Faults;
import org.evendraft.service.JudgeStability;
import org.evendraft.service.JudgeStability.TracedCriteria;
import org.evendraft.service.Provenance;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;

/** Judges the intact criteria. */
@Command(
        name = "criteria",
        mixinStandardHelpOptions = true,
        description = {
            "Judges the intact criteria of a platform's rules over all horizontal axes and prints them as JSON, each about its",
            "worst axis. The exit status is 3 when one of them is not met."
        })
final class CriteriaCommand implements Callable<Integer> {
    private final Launcher launcher;
    private final Console console;

    @Mixin
    private LoadingFiles files = new LoadingFiles();

    @Mixin
    private WindOption wind = new WindOption();

    CriteriaCommand(Launcher launcher, Console console) {
        this.launcher = launcher;
        this.console = console;
    }

    @Override
    public Integer call() {
        Faults faults = new Faults();
        OptionalDouble speed = wind.speed(faults);
        faults.throwIfAny();
        LoadingFiles.Loading loading = files.read();
        Provenance.Source source = new Provenance.Source(Clock.systemUTC(), launcher.version());
        TracedCriteria judged = JudgeStability.criteria(loading.platform(), loading.condition(), speed, source);
        console.answer(judged);
        return Boolean.FALSE.equals(judged.answer().met()) ? Console.CANNOT_BE_MET : Console.DONE;
    }
}
