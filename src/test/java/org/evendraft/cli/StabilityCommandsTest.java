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
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.evendraft.platform.Json;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** A box of 100 × 20 × 10 m, 6000 t at 3 m in fresh water, with a wall in the wind and two spaces that can be flooded. */
class StabilityCommandsTest {
    private static final String PLATFORM = """
            { "id": "box", "waterDensity": 1.0,
              "hull": { "bodies": [ { "name": "hull", "shape": "box", "min": [-50, -10, 0], "max": [50, 10, 10] } ] },
              "lightship": { "mass": 6000, "x": 0, "y": 0, "z": 5 },
              "windage": [ { "name": "wall", "x": 0, "y": 0, "zFrom": 10, "zTo": 14, "areaX": 0, "areaY": 240, "shapeCoefficient": 1 } ],
              "modes": [ { "id": "afloat", "draftRange": [2, 4], "windSpeed": 36 } ],
              "compartments": [
                { "id": "MID", "bodies": [ { "name": "MID", "shape": "box", "min": [-10, -10, 0], "max": [10, 10, 10] } ] },
                { "id": "TOP", "bodies": [ { "name": "TOP", "shape": "box", "min": [-50, -10, 2.5], "max": [50, 10, 10] } ] } ],
              "damageCases": [ { "id": "mid", "situation": "flooding", "flooded": [ "MID" ] } ],
              "criteria": { "rules": "moduColumnStabilized",
                "without": [ "intact.areaRatio", "intact.positiveArms", "intact.leastGm", "flooding.range", "collision.range" ], "own": [
                { "name": "heel", "clause": "standing orders", "situation": "intact", "measure": "inclination", "bound": 1 },
                { "name": "gm", "clause": "standing orders", "situation": "intact", "measure": "leastGm", "bound": BOUND } ] } }
            """;

    private final ByteArrayOutputStream out = new ByteArrayOutputStream();
    private final ByteArrayOutputStream err = new ByteArrayOutputStream();

    @TempDir
    private Path directory;

    private List<String> loading = List.of();

    @BeforeEach
    void writeFiles() throws IOException {
        String platform = file("p.json", PLATFORM.replace("BOUND", "2"));
        loading = List.of("--platform", platform, "--condition", file("c.json", "{ \"mode\": \"afloat\" }"));
    }

    private String file(String name, String text) throws IOException {
        return Files.writeString(directory.resolve(name), text).toString();
    }

    private int run(String... args) {
        out.reset();
        err.reset();
        return Program.run(new NoService(), new PrintStream(out, true), new PrintStream(err, true), args);
    }

    private int runLoaded(String command, String... more) {
        Stream<String> args = Stream.concat(Stream.of(command), loading.stream());
        return run(Stream.concat(args, Stream.of(more)).toArray(String[]::new));
    }

    private JsonNode answer() {
        return Json.parse(out.toByteArray());
    }

    private List<String> details() {
        return Json.parse(err.toByteArray()).path("errors").findValuesAsText("detail");
    }

    /** IMO MODU Code 2009, 3.2.3: ½ · 1.222 kg/m³ · V² · A; lever 9 m over the water and B 1.5 m under it. */
    @Test
    void windPrintsForceAndMoment() {
        assertThat(runLoaded("wind", "--azimuth", "0", "--to", "10")).isZero();
        double force = 0.611e-3 * 36 * 36 * 240;
        assertThat(answer().at("/afloat/force").doubleValue()).isCloseTo(force, within(1e-6));
        assertThat(answer().at("/afloat/moment").doubleValue()).isCloseTo(force * 10.5, within(1e-5));
        assertThat(answer().at("/curve/points")).hasSize(11);
        assertThat(answer().path("caution").textValue()).isNotBlank();
        assertThat(runLoaded("wind", "--azimuth", "0", "--to", "10", "--wind", "18"))
                .isZero();
        assertThat(answer().at("/afloat/force").doubleValue()).isCloseTo(force / 4, within(1e-6));
        assertThat(err.size()).isZero();
    }

    @Test
    void criteriaThatAreNotMetEndWithStatusThreeAndAreToldAllTheSame() {
        assertThat(runLoaded("criteria")).isZero();
        assertThat(answer().path("met").booleanValue()).isTrue();
        assertThat(answer().path("criteria").findValuesAsText("criterion")).containsExactly("gm", "heel");
        assertThat(runLoaded("criteria", "--wind", "100")).isEqualTo(3);
        assertThat(answer().path("met").booleanValue()).isFalse();
        assertThat(answer().at("/criteria/1/met").booleanValue()).isFalse();
        assertThat(err.size()).isZero();
    }

    /** 80 m of the length carry the 6000 t at 3.75 m; 2.5 m of the depth carry 5000 t and no more. */
    @Test
    void damageThatIsNotSurvivedEndsWithStatusThree() {
        assertThat(runLoaded("damage")).isZero();
        assertThat(answer().at("/cases/0/damageCase").textValue()).isEqualTo("mid");
        assertThat(answer().at("/cases/0/floating/draft").doubleValue()).isCloseTo(3.75, within(1e-7));
        assertThat(err.size()).isZero();
        assertThat(runLoaded("damage", "--flooded", "MID", "--situation", "flooding"))
                .isZero();
        assertThat(answer().at("/cases/0/situation").textValue()).isEqualTo("flooding");
        assertThat(runLoaded("damage", "--flooded", "TOP", "--progress")).isEqualTo(3);
        assertThat(answer().at("/cases/0/outcome").textValue()).isEqualTo("sinks");
        assertThat(err.toString(StandardCharsets.UTF_8)).contains("0 % damage case asked");
        assertThat(runLoaded("damage", "--cases", "flooding")).isEqualTo(3);
        assertThat(answer().path("cases")).hasSize(2);
    }

    /** The metacentre over a box stands at T/2 + B²/12T; the criterion asks for 2 m under it, and a heel of 1° at 36 m/s for less. */
    @Test
    void allowableKgPrintsACurve() throws IOException {
        String request = file("r.json", "{ \"mode\": \"afloat\", \"drafts\": [3, 4], \"damage\": \"none\" }");
        assertThat(run("allowable-kg", "--platform", loading.get(1), "--request", request, "--progress"))
                .isZero();
        assertThat(answer().at("/limits/0/allowableKg").doubleValue()).isCloseTo(1.5 + 400 / 36.0 - 2, within(1e-3));
        assertThat(answer().at("/limits/1/criterion").textValue()).isEqualTo("gm");
        assertThat(err.toString(StandardCharsets.UTF_8)).contains(" % intact");
        String strict = file("strict.json", PLATFORM.replace("BOUND", "300"));
        assertThat(run("allowable-kg", "--platform", strict, "--request", request))
                .isEqualTo(3);
        assertThat(answer().at("/limits/0/allowableKg").isNull()).isTrue();
        assertThat(answer().at("/limits/0/criterion").textValue()).isEqualTo("gm");
        assertThat(err.size()).isZero();
    }

    @Test
    void allThatIsWrongIsToldWithStatusTwo() throws IOException {
        assertThat(runLoaded("righting", "--azimuth", "400", "--to", "99", "--wind", "200"))
                .isEqualTo(2);
        assertThat(details()).hasSize(3).anyMatch(d -> d.startsWith("wind must be from 0 to 150 m/s"));
        assertThat(runLoaded("damage", "--flooded", "MID", "--cases", "listed", "--situation", "intact"))
                .isEqualTo(2);
        assertThat(details()).hasSize(2);
        assertThat(runLoaded("damage", "--situation", "flooding")).isEqualTo(2);
        assertThat(details()).containsExactly("option --situation goes with --flooded");
        assertThat(runLoaded("damage", "--cases", "all")).isEqualTo(2);
        assertThat(runLoaded("damage", "--flooded", "GHOST,MID")).isEqualTo(2);
        assertThat(Json.parse(err.toByteArray()).at("/errors/0/pointer").textValue())
                .isEqualTo("/flooded/0");
        assertThat(out.size()).isZero();
        String request = file("r.json", "{ \"mode\": \"ghost\", \"drafts\": [12] }");
        assertThat(run("allowable-kg", "--platform", loading.get(1), "--request", request))
                .isEqualTo(2);
        assertThat(Json.parse(err.toByteArray()).path("errors").findValuesAsText("pointer"))
                .containsExactly("/mode", "/drafts/0");
        assertThat(Json.parse(err.toByteArray()).path("detail").textValue()).contains("r.json");
        assertThat(out.size()).isZero();
        file("c.json", "{}");
        for (String command : List.of("criteria", "wind --azimuth=0")) {
            String[] parts = command.split(" ", -1);
            assertThat(runLoaded(
                            parts[0], List.of(parts).subList(1, parts.length).toArray(String[]::new)))
                    .isEqualTo(2);
            assertThat(details()).singleElement().asString().contains("no wind speed");
        }
    }

    /** None of these commands needs the service. */
    private static final class NoService implements Launcher {
        @Override
        public Station open(Optional<Path> config) {
            throw new IllegalStateException("the service is not needed");
        }

        @Override
        public String version() {
            return "1.2.3";
        }
    }
}
