package org.evendraft.cli;

import java.time.Clock;
import java.util.List;
import java.util.OptionalDouble;
import java.util.concurrent.Callable;
import org.evendraft.platform.Faults;
import org.evendraft.platform.Situation;
import org.evendraft.service.JudgeDamage;
import org.evendraft.service.JudgeDamage.Asked;
import org.evendraft.service.JudgeDamage.Cases;
import org.evendraft.service.JudgeDamage.TracedSurvey;
import org.evendraft.service.Provenance;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;

/** Judges damage. */
@Command(
        name = "damage",
        mixinStandardHelpOptions = true,
        description = {
            "Judges a platform with spaces open to the sea, case by case, and prints the cases as JSON.",
            "The exit status is 3 when it does not survive one of them: it sinks or capsizes, or breaks a criterion."
        })
final class DamageCommand implements Callable<Integer> {
    private final Launcher launcher;
    private final Console console;

    @Mixin
    private LoadingFiles files = new LoadingFiles();

    @Option(
            names = "--cases",
            paramLabel = "KIND",
            description =
                    "listed (default) in the platform's document; collision, by the extents of damage of the IMO MODU"
                            + " Code 2009 at the drafts of the condition's mode; or flooding of any one space.")
    private @Nullable Cases cases;

    @Option(
            names = "--flooded",
            paramLabel = "ID",
            split = ",",
            description = "One case of its own: tanks and compartments open to the sea, with commas.")
    private List<String> flooded = List.of();

    @Option(
            names = "--situation",
            paramLabel = "WHICH",
            description = "collision (default) or flooding: by which criteria the case of --flooded is judged.")
    private @Nullable Situation situation;

    @Mixin
    private WindOption wind = new WindOption();

    @Mixin
    private ProgressOption progress = new ProgressOption();

    DamageCommand(Launcher launcher, Console console) {
        this.launcher = launcher;
        this.console = console;
    }

    @Override
    public Integer call() {
        Faults faults = new Faults();
        Asked asked = asked(wind.speed(faults), faults);
        faults.throwIfAny();
        LoadingFiles.Loading loading = files.read();
        Provenance.Source source = new Provenance.Source(Clock.systemUTC(), launcher.version());
        TracedSurvey judged =
                JudgeDamage.survey(loading.platform(), loading.condition(), asked, progress.to(console), source);
        console.answer(judged);
        return Boolean.FALSE.equals(judged.survey().survived()) ? Console.CANNOT_BE_MET : Console.DONE;
    }

    private Asked asked(OptionalDouble speed, Faults faults) {
        Situation by = situation == null ? Situation.COLLISION : situation;
        if (by == Situation.INTACT) {
            faults.form("", "option --situation must be collision or flooding");
        }
        if (flooded.isEmpty()) {
            if (situation != null) {
                faults.form("", "option --situation goes with --flooded");
            }
            return Asked.cases(cases == null ? Cases.LISTED : cases, speed);
        }
        if (cases != null) {
            faults.form("", "option --cases cannot be given together with --flooded");
        }
        return Asked.flooded(flooded, by, speed);
    }
}
