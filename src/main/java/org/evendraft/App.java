package org.evendraft;

import java.nio.file.Path;
import java.util.Optional;
import org.evendraft.cli.Launcher;
import org.evendraft.cli.Program;
import org.evendraft.cli.Station;

/** The program. */
public final class App implements Launcher {
    private final String version = Version.read();

    private App() {}

    /** Carries out the command that the arguments name; {@code --help} lists them. */
    public static void main(String[] args) {
        Logging.start("text", "warn");
        int status = Program.run(new App(), System.out, System.err, args);
        if (status != 0) {
            System.exit(status);
        }
    }

    @Override
    public Station open(Optional<Path> config) {
        Settings settings = SettingsReader.read(config, System.getenv());
        Logging.start(settings.logFormat(), settings.logLevel());
        return RunningStation.open(settings, version);
    }

    @Override
    public String version() {
        return version;
    }
}
