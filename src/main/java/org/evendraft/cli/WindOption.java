package org.evendraft.cli;

import java.util.OptionalDouble;
import org.evendraft.platform.Faults;
import org.evendraft.stability.KgRequestReader;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Option;

/** A wind speed given on the command line, common to several commands. */
final class WindOption {
    @Option(
            names = "--wind",
            paramLabel = "V",
            description = "Wind speed (m/s) in place of that of the condition's mode.")
    private @Nullable Double speed;

    /** The speed (m/s), if one is given; the faults are told when it is out of range. */
    OptionalDouble speed(Faults faults) {
        OptionalDouble given = speed == null ? OptionalDouble.empty() : OptionalDouble.of(speed);
        KgRequestReader.checkWind(given, faults);
        return given;
    }
}
