package org.evendraft.cli;

import java.nio.file.Path;
import org.evendraft.platform.Condition;
import org.evendraft.platform.ConditionReader;
import org.evendraft.platform.PlatformReader;
import org.evendraft.service.PlatformAtRevision;
import picocli.CommandLine.Option;

/** The two files that tell how a platform is loaded, common to several commands. */
final class LoadingFiles {
    @Option(names = "--platform", required = true, paramLabel = "P.json", description = "The platform's document.")
    private Path platform = Path.of("");

    @Option(names = "--condition", required = true, paramLabel = "C.json", description = "The condition's document.")
    private Path condition = Path.of("");

    /**
     * A platform and its loading.
     *
     * @param platform the platform, which is not stored
     * @param condition the loading
     */
    record Loading(PlatformAtRevision platform, Condition condition) {}

    /**
     * Reads both.
     *
     * @throws FaultyFileException with all that is wrong
     */
    Loading read() {
        PlatformAtRevision read = new PlatformAtRevision(0, InputFile.read(platform, PlatformReader::read));
        return new Loading(read, InputFile.read(condition, json -> ConditionReader.read(json, read.prepared())));
    }
}
