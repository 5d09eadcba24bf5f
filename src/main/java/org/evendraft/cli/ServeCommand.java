package org.evendraft.cli;

import java.nio.file.Path;
import java.util.Optional;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;

/** Runs the service. */
@Command(
        name = "serve",
        mixinStandardHelpOptions = true,
        description = {
            "Runs the service.",
            "Prints one line with its address when it is ready; log lines go to standard error. Stops gracefully on SIGTERM and Ctrl-C."
        })
final class ServeCommand implements Callable<Integer> {
    private final Launcher launcher;
    private final Console console;

    @Option(
            names = "--config",
            paramLabel = "FILE",
            description = "Configuration file; without it config/evendraft.yaml, if it is there.")
    private Optional<Path> config = Optional.empty();

    ServeCommand(Launcher launcher, Console console) {
        this.launcher = launcher;
        this.console = console;
    }

    @Override
    public Integer call() {
        try (Station station = launcher.open(config)) {
            console.line("Evendraft listens at " + station.listen());
            station.awaitStop();
        }
        return Console.DONE;
    }
}
