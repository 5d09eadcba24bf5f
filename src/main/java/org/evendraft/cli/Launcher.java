package org.evendraft.cli;

import java.nio.file.Path;
import java.util.Optional;

/** Starts the service for the commands that need it. */
public interface Launcher {

    /**
     * Reads the configuration and opens the database; does not listen yet.
     *
     * @param config the configuration file, if not the usual one
     * @throws org.evendraft.platform.FaultyDocumentException when the configuration has faults
     */
    Station open(Optional<Path> config);

    /** The version of the program. */
    String version();
}
