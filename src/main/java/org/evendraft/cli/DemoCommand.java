package org.evendraft.cli;

import com.fasterxml.jackson.databind.JsonNode;
import java.nio.file.Path;
import java.util.Optional;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;

/** Shows what the program does, on the demo platform. */
@Command(
        name = "demo",
        mixinStandardHelpOptions = true,
        description = {
            "Stores the demo platform, evaluates its condition, suggests a transfer of ballast, then serves.",
            "The database is the configured one, an embedded one under data/ by default. Repeating it adds nothing."
        })
final class DemoCommand implements Callable<Integer> {
    private final Launcher launcher;
    private final Console console;

    @Option(names = "--once", description = "Ends after the text and does not serve.")
    private boolean once;

    @Option(
            names = "--config",
            paramLabel = "FILE",
            description = "Configuration file; without it config/evendraft.yaml, if it is there.")
    private Optional<Path> config = Optional.empty();

    DemoCommand(Launcher launcher, Console console) {
        this.launcher = launcher;
        this.console = console;
    }

    @Override
    public Integer call() {
        try (Station station = launcher.open(config)) {
            Demo demo = new Demo(station.controlRoom(), launcher.version());
            DemoText text = new DemoText(demo.platform());
            JsonNode condition = demo.condition();
            console.line(text.condition(demo.document(), condition));
            console.line(
                    text.plan(demo.request(), demo.plan(condition.path("id").textValue())));
            if (!once) {
                console.line("Evendraft listens at " + station.listen() + " (Ctrl-C stops it)");
                station.awaitStop();
            }
        }
        return Console.DONE;
    }
}
