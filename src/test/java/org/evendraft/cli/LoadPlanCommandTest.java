package org.evendraft.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Optional;
import org.evendraft.platform.Json;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class LoadPlanCommandTest {
    private static final String PLATFORM = """
            { "id": "box", "waterDensity": 1.0,
              "hull": { "bodies": [ { "name": "hull", "shape": "box", "min": [-50, -10, 0], "max": [50, 10, 10] } ] },
              "lightship": { "mass": 6000, "x": 0, "y": 0, "z": 5 } }
            """;
    private static final String REQUEST = """
            { "start": { "name": "light" }, "ballast": "none",
              "events": [ { "event": "aboard", "name": "crate", "load": { "kind": "variable", "mass": 200, "x": 0, "y": 1, "z": 11 } } ] }
            """;

    @TempDir
    private Path directory;

    private final ByteArrayOutputStream out = new ByteArrayOutputStream();
    private final ByteArrayOutputStream err = new ByteArrayOutputStream();

    private int run(Path platform, String request) throws IOException {
        Path file = Files.writeString(directory.resolve("r.json"), request);
        return Program.run(
                new NoService(),
                new PrintStream(out, true),
                new PrintStream(err, true),
                "load-plan",
                "--platform",
                platform.toString(),
                "--request",
                file.toString());
    }

    private int run(String request) throws IOException {
        return run(Files.writeString(directory.resolve("p.json"), PLATFORM), request);
    }

    private JsonNode answer() {
        return Json.parse(out.toByteArray());
    }

    @Test
    void aSequenceIsFollowedAndPrinted() throws IOException {
        assertThat(run(REQUEST)).isZero();
        JsonNode position = answer().path("events").path(0).path("position");
        assertThat(position.path("mass").doubleValue()).isCloseTo(6200, within(1e-9));
        assertThat(position.path("heelAngle").doubleValue()).isNegative();
        assertThat(answer().path("platformRevision").intValue()).isZero();
        assertThat(answer().path("caution").textValue()).contains("Planning aid only");
        assertThat(err.size()).isZero();
    }

    @Test
    void aLimitThatIsNotKeptIsToldInTheExitStatus() throws IOException {
        assertThat(run(REQUEST.replace("\"ballast\"", "\"operationLimits\": { \"maxHeel\": 0.1 }, \"ballast\"")))
                .isEqualTo(Console.CANNOT_BE_MET);
        assertThat(answer().path("limitsKept").booleanValue()).isFalse();
    }

    @Test
    void faultsAreToldWithTheFilesName() throws IOException {
        assertThat(run(REQUEST.replace("aboard", "overboard"))).isEqualTo(Console.BAD_INPUT);
        assertThat(err.toString(StandardCharsets.UTF_8)).contains("r.json", "/events/0/event");
        assertThat(out.size()).isZero();
    }

    /** The preventer comes over the port side: laid over to starboard beforehand, Merganser heels half as much and keeps her limits. */
    @Test
    void theDemonstrationsLiftPassesThroughEvenKeel() throws IOException {
        String request = Files.readString(Path.of("db", "demo", "load-plan.json"));
        assertThat(run(Path.of("db", "demo", "merganser.json"), request)).isZero();
        JsonNode plan = answer();
        assertThat(plan.path("limitsKept").booleanValue()).isTrue();
        double with = plan.path("worst").path("heelAngle").path("heelAngle").doubleValue();
        double without = plan.path("worstWithoutBallast")
                .path("heelAngle")
                .path("heelAngle")
                .doubleValue();
        assertThat(Math.abs(with)).isLessThan(0.6 * Math.abs(without));
        double before = plan.path("preBallast")
                .path("after")
                .path("floating")
                .path("heelAngle")
                .doubleValue();
        assertThat(before).isPositive();
        assertThat(plan.path("events")
                        .path(0)
                        .path("position")
                        .path("heelAngle")
                        .doubleValue())
                .isNegative();
    }

    /** Nothing here starts the service. */
    private static final class NoService implements Launcher {
        @Override
        public Station open(Optional<Path> config) {
            throw new IllegalStateException("the command needs no service");
        }

        @Override
        public String version() {
            return "1.2.3";
        }
    }
}
