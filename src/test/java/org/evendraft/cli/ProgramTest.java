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
import java.time.Clock;
import java.util.Optional;
import java.util.UUID;
import java.util.stream.Stream;
import org.evendraft.platform.Json;
import org.evendraft.service.ControlRoom;
import org.evendraft.store.Database;
import org.evendraft.store.PageRequest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class ProgramTest {
    private static final String PLATFORM = """
            { "id": "box", "waterDensity": 1.0,
              "hull": { "bodies": [ { "name": "hull", "shape": "box", "min": [-50, -10, 0], "max": [50, 10, 10] } ] },
              "lightship": { "mass": 6000, "x": 0, "y": 0, "z": 5 } }
            """;

    @TempDir
    private Path directory;

    private final ByteArrayOutputStream out = new ByteArrayOutputStream();
    private final ByteArrayOutputStream err = new ByteArrayOutputStream();

    private int run(String... args) {
        Launcher launcher = new MemoryLauncher(directory.getFileName().toString());
        return Program.run(launcher, new PrintStream(out, true), new PrintStream(err, true), args);
    }

    private String file(String name, String text) throws IOException {
        return Files.writeString(directory.resolve(name), text).toString();
    }

    private String out() {
        return out.toString(StandardCharsets.UTF_8);
    }

    private String err() {
        return err.toString(StandardCharsets.UTF_8);
    }

    private static JsonNode json(String text) {
        return Json.parse(text.getBytes(StandardCharsets.UTF_8));
    }

    @Test
    void evaluatePrintsTheResultAloud() throws IOException {
        String condition = file("c.json", "{ \"name\": \"light\" }");
        assertThat(run("evaluate", "--platform", file("p.json", PLATFORM), "--condition", condition))
                .isZero();
        JsonNode result = json(out());
        assertThat(result.path("evenKeelDraft").doubleValue()).isCloseTo(3, within(1e-9));
        assertThat(result.path("platformRevision").intValue()).isZero();
        assertThat(result.path("engineVersion").textValue()).isEqualTo("1.2.3");
        assertThat(err()).isEmpty();
    }

    @Test
    void hydrostaticsPrintsARow() throws IOException {
        assertThat(run("hydrostatics", "--platform", file("p.json", PLATFORM), "--draft", "4", "--heel", "1.5"))
                .isZero();
        JsonNode row = json(out());
        assertThat(row.path("displacedVolume").doubleValue()).isCloseTo(8000, within(1e-6));
        assertThat(row.path("heelAngle").doubleValue()).isCloseTo(1.5, within(1e-12));
    }

    @Test
    void hydrostaticsPrintsATableInThreeForms() throws IOException {
        String[] table = {
            "hydrostatics",
            "--platform",
            file("p.json", PLATFORM),
            "--from",
            "3",
            "--to",
            "4",
            "--step",
            "1",
            "--heel",
            "-2:2:2",
            "--trim",
            "-1,0",
            "--format"
        };
        assertThat(runWith(table, "json", "--water-density", "1.025")).isZero();
        JsonNode json = json(out());
        assertThat(json.path("rows")).hasSize(12);
        assertThat(json.path("rows").path(11).path("displacedVolume").doubleValue())
                .isCloseTo(8000, within(1e-8));
        assertThat(json.path("rows").path(0).path("displacement").doubleValue()).isCloseTo(6150, within(1e-8));
        assertThat(json.path("platformRevision").intValue()).isZero();
        assertThat(json.path("engineVersion").textValue()).isEqualTo("1.2.3");
        assertThat(json.path("caution").textValue()).isNotBlank();
        out.reset();
        assertThat(runWith(table, "csv", "--digits", "2")).isZero();
        assertThat(out().lines()).hasSize(13).element(1).asString().startsWith("3.00,-2.00,-1.00,6000,6000,");
        out.reset();
        assertThat(runWith(table, "text")).isZero();
        assertThat(out()).contains("box (box), not stored", "Trim -1°, heel -2°", "Planning aid only");
        assertThat(err()).isEmpty();
    }

    private int runWith(String[] args, String... more) {
        return run(Stream.concat(Stream.of(args), Stream.of(more)).toArray(String[]::new));
    }

    @Test
    void hydrostaticsTellsAllThatIsWrongWithItsOptions() throws IOException {
        String platform = file("p.json", PLATFORM);
        assertThat(run("hydrostatics", "--platform", platform)).isEqualTo(2);
        assertThat(json(err()).path("errors").findValuesAsText("detail"))
                .containsExactly("option --draft must be given, or from, to and step for a table");
        err.reset();
        String[] wrong = {
            "--draft",
            "4",
            "--from",
            "3",
            "--to",
            "2",
            "--step",
            "0",
            "--heel",
            "0,,1",
            "--trim",
            "nan",
            "--water-density",
            "-1",
            "--format",
            "pdf"
        };
        assertThat(runWith(new String[] {"hydrostatics", "--platform", platform}, wrong))
                .isEqualTo(2);
        assertThat(json(err()).path("errors").findValuesAsText("detail"))
                .extracting(detail -> detail.split(" ", 3)[1])
                .containsExactly("--draft", "--to", "--step", "--heel", "--trim", "--water-density", "--format");
        assertThat(out()).isEmpty();
    }

    /** Wall-sided formula by hand: 100 × 20 m at 3 m, KB 1.5, BM 400/36, KG 5 m. */
    @Test
    void rightingPrintsACurve() throws IOException {
        String condition = file("c.json", "{ \"name\": \"light\" }");
        String platform = file("p.json", PLATFORM);
        assertThat(run("righting", "--platform", platform, "--condition", condition, "--azimuth", "0", "--to", "10"))
                .isZero();
        double bm = 400 / 36.0;
        double phi = Math.toRadians(10);
        double arm = Math.sin(phi) * (1.5 + bm - 5 + bm / 2 * Math.pow(Math.tan(phi), 2));
        assertThat(json(out()).path("points").path(10).path("gz").doubleValue()).isCloseTo(arm, within(1e-7));
        assertThat(run("righting", "--platform", platform, "--condition", condition, "--azimuth", "0", "--to", "99"))
                .isEqualTo(2);
        assertThat(err()).contains("at most 80");
    }

    @Test
    void faultsOfAFileAreAProblemOnStandardErrorWithStatusTwo() throws IOException {
        String condition = file("c.json", "{ \"mode\": \"ghost\", \"fills\": [ { \"tank\": \"T\", \"level\": 1 } ] }");
        assertThat(run("evaluate", "--platform", file("p.json", PLATFORM), "--condition", condition))
                .isEqualTo(2);
        assertThat(out()).isEmpty();
        JsonNode problem = json(err());
        assertThat(problem.path("status").intValue()).isEqualTo(422);
        assertThat(problem.path("detail").textValue()).contains("c.json");
        assertThat(problem.path("errors").findValuesAsText("pointer")).containsExactly("/mode", "/fills/0/tank");
    }

    @Test
    void whatSinksIsAProblemWithStatusTwo() throws IOException {
        String load =
                "{ \"loads\": [ { \"name\": \"x\", \"kind\": \"variable\", \"mass\": 90000, \"x\": 0, \"y\": 0, \"z\": 1 } ] }";
        assertThat(run("evaluate", "--platform", file("p.json", PLATFORM), "--condition", file("c.json", load)))
                .isEqualTo(2);
        assertThat(json(err()).path("errors").path(0).path("pointer").textValue())
                .isEmpty();
    }

    @Test
    void missingFilesAndMisspeltOptionsAreProblemsToo() {
        assertThat(run("hydrostatics", "--platform", "none.json", "--draft", "4"))
                .isEqualTo(2);
        assertThat(json(err()).path("detail").textValue()).contains("none.json").contains("no such file");
        err.reset();
        assertThat(run("hydrostatics", "--draft", "deep")).isEqualTo(2);
        assertThat(json(err()).path("status").intValue()).isEqualTo(400);
        err.reset();
        assertThat(run("fly")).isEqualTo(2);
        assertThat(run()).isEqualTo(2);
        assertThat(out()).isEmpty();
    }

    @Test
    void helpTellsEveryCommandAndItsUnits() {
        assertThat(run("--help")).isZero();
        assertThat(out()).contains("demo", "serve", "evaluate", "plan", "hydrostatics", "mesh", "Exit status");
        out.reset();
        assertThat(run("hydrostatics", "--help")).isZero();
        assertThat(out()).contains("starboard down (degrees)").contains("origin (m)");
        out.reset();
        assertThat(run("--version")).isZero();
        assertThat(out()).contains("evendraft 1.2.3");
    }

    @Test
    void meshTurnsAFileIntoABody() throws IOException {
        String obj = "v 0 0 0\nv 1 0 0\nv 0 1 0\nv 0 0 1\nf 1 3 2\nf 1 2 4\nf 2 3 4\nf 3 1 4\n";
        assertThat(run("mesh", file("t.obj", obj), "--name", "tetrahedron")).isZero();
        JsonNode body = json(out());
        assertThat(body.path("shape").textValue()).isEqualTo("mesh");
        assertThat(body.path("name").textValue()).isEqualTo("tetrahedron");
        assertThat(body.path("vertices")).hasSize(4);
        assertThat(body.path("triangles")).hasSize(4);
        assertThat(run("mesh", file("t.stl", "no mesh"), "--name", "x")).isEqualTo(2);
        assertThat(json(err()).path("detail").textValue()).contains("t.stl");
    }

    @Test
    void theDemoIsReadableAndAddsNothingTheSecondTime() {
        try (Database keeper =
                Database.open(MemoryLauncher.url(directory.getFileName().toString()), "sa", "")) {
            assertThat(run("demo", "--once")).isZero();
            assertThat(out())
                    .contains("Merganser, revision 1")
                    .contains("Draft marks   PF ")
                    .contains("starboard down")
                    .contains("minGm.transverse")
                    .contains("Suggested transfer to draft 18.50 m")
                    .contains("start min")
                    .contains("After the transfer")
                    .contains("Planning aid only");
            String first = out();
            out.reset();
            assertThat(run("demo", "--once")).isZero();
            assertThat(out()).isEqualTo(first);
            ControlRoom room = new ControlRoom(
                    keeper, Clock.systemUTC(), () -> UUID.randomUUID().toString(), "x");
            assertThat(room.readPlatforms().list().platforms())
                    .singleElement()
                    .satisfies(p -> assertThat(p.revision()).isEqualTo(1));
            assertThat(room.readConditions()
                            .page("merganser", new PageRequest(9, 0))
                            .total())
                    .isEqualTo(1);
        }
    }

    /**
     * Opens a database in memory that lives as long as someone else has it open.
     *
     * @param name the database's name
     */
    private record MemoryLauncher(String name) implements Launcher {

        static String url(String name) {
            return "jdbc:h2:mem:" + name;
        }

        @Override
        public Station open(Optional<Path> config) {
            Database database = Database.open(url(name), "sa", "");
            ControlRoom room = new ControlRoom(
                    database, Clock.systemUTC(), () -> UUID.randomUUID().toString(), version());
            return new Station() {
                @Override
                public ControlRoom controlRoom() {
                    return room;
                }

                @Override
                public String listen() {
                    throw new IllegalStateException("no test listens");
                }

                @Override
                public void awaitStop() {}

                @Override
                public void close() {}
            };
        }

        @Override
        public String version() {
            return "1.2.3";
        }
    }
}
