package org.evendraft;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import org.evendraft.platform.Json;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The packaged program as people and scripts run it. */
class CommandsIT {
    private static final Path DEMO = Path.of("db", "demo").toAbsolutePath();
    private static final String PLATFORM = DEMO.resolve("merganser.json").toString();
    private static final String CONDITION = DEMO.resolve("condition.json").toString();
    private static final String REQUEST = DEMO.resolve("request.json").toString();

    @TempDir
    private Path directory;

    private Jar.Outcome run(String... args) {
        return Jar.run(directory, Map.of(), args);
    }

    private static JsonNode json(String text) {
        return Json.parse(text.getBytes(StandardCharsets.UTF_8));
    }

    @Test
    void evaluatePrintsJsonAloneWithStatusZero() {
        Jar.Outcome outcome = run("evaluate", "--platform", PLATFORM, "--condition", CONDITION);
        assertThat(outcome.err()).isEmpty();
        assertThat(outcome.status()).isZero();
        assertThat(json(outcome.out()).path("floating").path("heelAngle").isNumber())
                .isTrue();
    }

    @Test
    void badInputIsAProblemOnStandardErrorWithStatusTwo() throws Exception {
        Path wrong = Files.writeString(directory.resolve("wrong.json"), "{ \"mode\": 7, \"colour\": 1 }");
        Jar.Outcome outcome = run("evaluate", "--platform", PLATFORM, "--condition", wrong.toString());
        assertThat(outcome.status()).isEqualTo(2);
        assertThat(outcome.out()).isEmpty();
        assertThat(json(outcome.err()).path("errors").findValuesAsText("pointer"))
                .containsExactlyInAnyOrder("/mode", "/colour");
    }

    @Test
    void aPlanThatMeetsItsTargetHasStatusZeroAndOneThatCannotHasStatusThree() throws Exception {
        Jar.Outcome met = run("plan", "--platform", PLATFORM, "--condition", CONDITION, "--request", REQUEST);
        assertThat(met.status()).as(met.err()).isZero();
        assertThat(json(met.out()).path("feasible").booleanValue()).isTrue();
        // At 5 m the hull displaces less than the lightship alone.
        Path shallow = Files.writeString(directory.resolve("shallow.json"), "{ \"target\": { \"draft\": 5 } }");
        Jar.Outcome unmet =
                run("plan", "--platform", PLATFORM, "--condition", CONDITION, "--request", shallow.toString());
        assertThat(unmet.status()).as(unmet.err()).isEqualTo(3);
        assertThat(json(unmet.out()).path("feasible").booleanValue()).isFalse();
        assertThat(json(unmet.out()).path("binding")).isNotEmpty();
    }

    @Test
    void hydrostaticsPrintsARow() {
        Jar.Outcome outcome = run("hydrostatics", "--platform", PLATFORM, "--draft", "18.5", "--trim", "-0.5");
        assertThat(outcome.status()).isZero();
        assertThat(json(outcome.out()).path("trimAngle").doubleValue()).isNegative();
    }

    @Test
    void theDemoRunsTwiceOnTheSameData() {
        Jar.Outcome first = run("demo", "--once");
        assertThat(first.status()).as(first.err()).isZero();
        assertThat(first.out()).contains("Merganser, revision 1").contains("Planning aid only");
        assertThat(directory.resolve("data")).isDirectory();
        Jar.Outcome second = run("demo", "--once");
        assertThat(second.status()).as(second.err()).isZero();
        assertThat(second.out()).isEqualTo(first.out());
    }

    @Test
    void serveSaysOneLineLogsJsonAndStopsGracefully() throws Exception {
        try (Jar.Service service = Jar.serve(directory, Map.of("EVENDRAFT_LOG_FORMAT", "json"))) {
            assertThat(new Client(service.address()).get("/health").statusCode())
                    .isEqualTo(200);
            // 128 + 15: ended by SIGTERM, after what had to be done at the end
            assertThat(service.stop()).isEqualTo(143);
            assertThat(service.rest()).isEmpty();
        }
        List<String> lines = Files.readAllLines(directory.resolve("err.txt"));
        assertThat(lines)
                .isNotEmpty()
                .allSatisfy(
                        line -> assertThat(json(line).path("level").textValue()).isNotBlank());
        assertThat(lines)
                .anyMatch(line -> json(line).findValuesAsText("path").contains("/health"))
                .anyMatch(line -> line.contains("stopped"));
    }

    @Test
    void aConfigurationWithFaultsIsRefusedWithAllOfThem() throws Exception {
        Path file = Files.writeString(directory.resolve("c.yaml"), "http:\n  prot: 1\n");
        Jar.Outcome outcome =
                Jar.run(directory, Map.of("EVENDRAFT_HTTP_HOST", "0.0.0.0"), "serve", "--config", file.toString());
        assertThat(outcome.status()).isEqualTo(2);
        assertThat(json(outcome.err()).path("errors").findValuesAsText("pointer"))
                .containsExactlyInAnyOrder("/http/prot", "/access/mode");
    }

    @Test
    void anAddressOrADataFileThatIsTakenIsToldInASentence() throws Exception {
        try (Jar.Service service = Jar.serve(directory, Map.of())) {
            String port = service.address().substring(service.address().lastIndexOf(':') + 1);
            Path other = Files.createDirectory(directory.resolve("other"));
            Jar.Outcome address = Jar.run(other, Map.of("EVENDRAFT_HTTP_PORT", port), "serve");
            assertThat(address.status()).isEqualTo(2);
            assertThat(json(address.err()).path("detail").textValue()).contains("EVENDRAFT_HTTP_PORT");
            String taken = "jdbc:h2:file:" + directory.resolve("data/evendraft");
            Jar.Outcome data = Jar.run(other, Map.of("EVENDRAFT_DATABASE_URL", taken), "serve");
            assertThat(data.status()).isEqualTo(2);
            assertThat(json(data.err()).path("detail").textValue()).contains("cannot be opened");
        }
    }
}
