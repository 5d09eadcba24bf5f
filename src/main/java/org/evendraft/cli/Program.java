package org.evendraft.cli;

import java.io.PrintStream;
import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import java.util.List;
import org.evendraft.platform.Fault;
import org.evendraft.platform.FaultyDocumentException;
import org.evendraft.service.Problem;
import org.evendraft.service.Refusal;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;
import picocli.CommandLine;
import picocli.CommandLine.ParameterException;

/** The commands of the program and their exit statuses. */
public final class Program {
    private static final Logger LOG = LoggerFactory.getLogger(Program.class);

    private Program() {}

    /**
     * Carries out a command.
     *
     * @param launcher starts the service where a command needs it
     * @param out where answers go
     * @param err where problems go
     * @param args the command with its options
     * @return 0 when done, 1 after a bug, 2 after bad input, 3 when a target cannot be met or criteria are not
     */
    public static int run(Launcher launcher, PrintStream out, PrintStream err, String... args) {
        Console console = new Console(out, err);
        return commandLine(launcher, console)
                .setParameterExceptionHandler((e, given) -> misspelt(e, console))
                .setExecutionExceptionHandler((e, line, parsed) -> failed(e, console))
                .execute(args);
    }

    static CommandLine commandLine(Launcher launcher, Console console) {
        CommandLine line = new CommandLine(new RootCommand())
                .addSubcommand(new DemoCommand(launcher, console))
                .addSubcommand(new ServeCommand(launcher, console))
                .addSubcommand(new EvaluateCommand(launcher, console))
                .addSubcommand(new PlanCommand(launcher, console))
                .addSubcommand(new LoadPlanCommand(launcher, console))
                .addSubcommand(new HydrostaticsCommand(launcher, console))
                .addSubcommand(new RightingCommand(launcher, console))
                .addSubcommand(new WindCommand(launcher, console))
                .addSubcommand(new CriteriaCommand(launcher, console))
                .addSubcommand(new DamageCommand(launcher, console))
                .addSubcommand(new AllowableKgCommand(launcher, console))
                .addSubcommand(new MeshCommand(console))
                .addSubcommand(new CommandLine.HelpCommand());
        line.getCommandSpec().version("evendraft " + launcher.version());
        line.getSubcommands().values().forEach(sub -> sub.setUsageHelpAutoWidth(true));
        line.setCaseInsensitiveEnumValuesAllowed(true);
        return line.setUsageHelpAutoWidth(true).setOut(new PrintWriter(console.out(), true, StandardCharsets.UTF_8));
    }

    private static int misspelt(ParameterException e, Console console) {
        String command = e.getCommandLine().getCommandSpec().qualifiedName(" ");
        String detail = e.getMessage() + " (" + command + " --help tells how)";
        return failed(new FaultyDocumentException(List.of(new Fault("", detail, Fault.Kind.FORM))), console);
    }

    private static int failed(Exception e, Console console) {
        if (e instanceof FaultyFileException faulty) {
            console.problem(faulty.problem());
        } else if (e instanceof FaultyDocumentException faulty) {
            console.problem(Problem.of(faulty));
        } else if (e instanceof Refusal refusal) {
            console.problem(Problem.of(refusal));
        } else {
            LOG.error("the command failed", e);
            return Console.BUG;
        }
        return Console.BAD_INPUT;
    }
}
