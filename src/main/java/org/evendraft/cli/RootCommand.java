package org.evendraft.cli;

import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Spec;

/** The program itself, which does nothing without a command. */
@Command(
        name = "evendraft",
        mixinStandardHelpOptions = true,
        description = {
            "Ballast planning for offshore floating platforms: how a loaded platform floats, and which ballast to move.",
            "",
            "Units: m, t, t/m³, degrees.",
            "Axes: x forward, y to port, z up from the keel.",
            "Heel is positive starboard down, trim is positive bow down.",
            ""
        },
        synopsisSubcommandLabel = "COMMAND",
        footer = {
            "",
            "Exit status: 0 done, 2 bad input (a problem in JSON on standard error), 3 the target cannot be met, or a",
            "criterion is not.",
            "A planning aid only: approved stability documents, class and flag rules and local codes govern."
        })
final class RootCommand implements Runnable {
    @Spec
    private CommandSpec spec = CommandSpec.create();

    @Override
    public void run() {
        throw new ParameterException(spec.commandLine(), "a command is needed");
    }
}
