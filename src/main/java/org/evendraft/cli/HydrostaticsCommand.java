package org.evendraft.cli;

import java.nio.file.Path;
import java.time.Clock;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.Callable;
import org.evendraft.platform.PlatformReader;
import org.evendraft.service.HydrostaticPrint;
import org.evendraft.service.HydrostaticRequest;
import org.evendraft.service.HydrostaticTable;
import org.evendraft.service.PlatformAtRevision;
import org.evendraft.service.Provenance;
import org.evendraft.service.ReadHydrostatics;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;

/** Computes hydrostatics at a waterplane, or a table. */
@Command(
        name = "hydrostatics",
        mixinStandardHelpOptions = true,
        description = {
            "Prints a platform's hydrostatics: one row with --draft, a table with --from, --to and --step.",
            "A heel or trim is a number, a range from:to:step, or several of these with commas."
        })
final class HydrostaticsCommand implements Callable<Integer> {
    private static final String JSON = "json";
    private static final String CSV = "csv";
    private static final String TEXT = "text";

    private final Launcher launcher;
    private final Console console;

    @Option(names = "--platform", required = true, paramLabel = "P.json", description = "The platform's document.")
    private Path platform = Path.of("");

    @Option(names = "--draft", paramLabel = "D", description = "Draft at the origin (m).")
    private Optional<String> draft = Optional.empty();

    @Option(names = "--from", paramLabel = "F", description = "First draft of a table (m).")
    private Optional<String> from = Optional.empty();

    @Option(names = "--to", paramLabel = "T", description = "Last draft of a table, included (m).")
    private Optional<String> to = Optional.empty();

    @Option(names = "--step", paramLabel = "S", description = "Between the drafts of a table (m).")
    private Optional<String> step = Optional.empty();

    @Option(names = "--heel", paramLabel = "H", description = "Heel, positive starboard down (degrees); 0 by default.")
    private Optional<String> heel = Optional.empty();

    @Option(names = "--trim", paramLabel = "T", description = "Trim, positive bow down (degrees); 0 by default.")
    private Optional<String> trim = Optional.empty();

    @Option(
            names = "--water-density",
            paramLabel = "W",
            description = "Density of the water (t/m³); the platform's by default.")
    private Optional<String> waterDensity = Optional.empty();

    @Option(
            names = "--digits",
            paramLabel = "N",
            description = "Decimals of lengths (m), fewer for greater units; by default unrounded, in text 3.")
    private Optional<String> digits = Optional.empty();

    @Option(
            names = "--format",
            paramLabel = "FORMAT",
            description = "json (default), csv, or text that is ready to print.")
    private Optional<String> format = Optional.empty();

    HydrostaticsCommand(Launcher launcher, Console console) {
        this.launcher = launcher;
        this.console = console;
    }

    @Override
    public Integer call() {
        HydrostaticRequest request = request();
        PlatformAtRevision at = new PlatformAtRevision(0, InputFile.read(platform, PlatformReader::read));
        Provenance.Source source = new Provenance.Source(Clock.systemUTC(), launcher.version());
        HydrostaticTable table = ReadHydrostatics.table(at, request, source);
        switch (format.orElse(JSON)) {
            case CSV -> console.text(HydrostaticPrint.csv(table.rows(), request.digits()));
            case TEXT -> console.text(HydrostaticPrint.text(table, request.digits()));
            default -> console.answer(request.single() ? table.rows().get(0) : table);
        }
        return Console.DONE;
    }

    private HydrostaticRequest request() {
        OptionTexts options = new OptionTexts()
                .put("draft", draft)
                .put("from", from)
                .put("to", to)
                .put("step", step)
                .put("heel", heel)
                .put("trim", trim)
                .put("waterDensity", waterDensity)
                .put("digits", digits);
        HydrostaticRequest request = HydrostaticRequest.read(options);
        if (format.isPresent() && !List.of(JSON, CSV, TEXT).contains(format.get())) {
            options.fault("format", "must be json, csv or text, not '" + format.get() + "'");
        }
        options.done();
        return request;
    }
}
