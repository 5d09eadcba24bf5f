package org.evendraft;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowableOfType;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.evendraft.platform.Fault;
import org.evendraft.platform.FaultyDocumentException;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class SettingsReaderTest {
    private static final String TOKEN = "correct-horse-battery";

    @TempDir
    private Path directory;

    private Path file(String yaml) throws IOException {
        return Files.writeString(directory.resolve("test.yaml"), yaml);
    }

    private static Settings read(Path file, Map<String, String> environment) {
        return SettingsReader.read(Optional.of(file), environment);
    }

    private static List<Fault> faults(Path file, Map<String, String> environment) {
        return catchThrowableOfType(FaultyDocumentException.class, () -> read(file, environment))
                .faults();
    }

    @Test
    void defaultsListenOnTheLoopbackAddressAndKeepDataInAFile() throws IOException {
        Settings settings = read(file(""), Map.of());
        assertThat(settings.host()).isEqualTo("127.0.0.1");
        assertThat(settings.port()).isEqualTo(7070);
        assertThat(settings.maxBodyBytes()).isEqualTo(20_000_000);
        assertThat(settings.requestTime()).isEqualTo(Duration.ofSeconds(60));
        assertThat(settings.database().url()).isEqualTo("jdbc:h2:file:./data/evendraft");
        assertThat(settings.token()).isEmpty();
        assertThat(settings.logFormat()).isEqualTo("text");
    }

    @Test
    void theFileOverridesTheDefaultsAndTheEnvironmentOverridesTheFile() throws IOException {
        Path file = file("http:\n  port: 1234\n  requestSeconds: 5\nlog:\n  format: json\n");
        Settings settings = read(file, Map.of("EVENDRAFT_HTTP_PORT", "4321", "PATH", "/bin", "EVENDRAFT_TEST_X", "1"));
        assertThat(settings.port()).isEqualTo(4321);
        assertThat(settings.requestTime()).isEqualTo(Duration.ofSeconds(5));
        assertThat(settings.logFormat()).isEqualTo("json");
    }

    @Test
    void everyKeyHasAVariable() throws IOException {
        Settings settings = read(
                file(""),
                Map.ofEntries(
                        Map.entry("EVENDRAFT_HTTP_HOST", "0.0.0.0"),
                        Map.entry("EVENDRAFT_HTTP_PORT", "0"),
                        Map.entry("EVENDRAFT_HTTP_MAXBODYMEGABYTES", "2"),
                        Map.entry("EVENDRAFT_HTTP_REQUESTSECONDS", "7"),
                        Map.entry("EVENDRAFT_DATABASE_URL", "jdbc:postgresql://db/x"),
                        Map.entry("EVENDRAFT_DATABASE_USER", "u"),
                        Map.entry("EVENDRAFT_DATABASE_PASSWORD", "p"),
                        Map.entry("EVENDRAFT_ACCESS_MODE", "token"),
                        Map.entry("EVENDRAFT_ACCESS_TOKEN", TOKEN),
                        Map.entry("EVENDRAFT_LOG_FORMAT", "json"),
                        Map.entry("EVENDRAFT_LOG_LEVEL", "debug")));
        assertThat(settings)
                .isEqualTo(new Settings(
                        "0.0.0.0",
                        0,
                        2_000_000,
                        Duration.ofSeconds(7),
                        new Settings.DatabaseSettings("jdbc:postgresql://db/x", "u", "p"),
                        Optional.of(TOKEN),
                        "json",
                        "debug"));
        assertThat(settings.toString()).doesNotContain(TOKEN).doesNotContain("p}");
    }

    @Test
    void unknownKeysAndVariablesAndWrongValuesAreAllNamed() throws IOException {
        Path file = file("http:\n  prot: 1\n  port: \"7070\"\nlog: loud\ncolour: blue\n");
        List<Fault> faults = faults(file, Map.of("EVENDRAFT_HTTP_PROT", "1", "EVENDRAFT_LOG_LEVEL", "loud"));
        assertThat(faults)
                .extracting(Fault::pointer)
                .containsExactlyInAnyOrder("/http/prot", "/http/port", "/log", "/colour", "", "/log/level");
        assertThat(faults)
                .anyMatch(f -> f.detail().contains("http.prot"))
                .anyMatch(f -> f.detail().contains("EVENDRAFT_HTTP_PROT"))
                .anyMatch(f -> f.detail().contains("one of error, warn, info, debug, trace"));
    }

    @Test
    void openAccessIsRefusedWhereOthersCanReachTheAddress() throws IOException {
        assertThat(faults(file("http:\n  host: 0.0.0.0\n"), Map.of()))
                .extracting(Fault::pointer)
                .containsExactly("/access/mode");
        assertThat(faults(file(""), Map.of("EVENDRAFT_HTTP_HOST", ""))).hasSize(1);
        assertThat(read(file("http:\n  host: localhost\n"), Map.of()).token()).isEmpty();
        assertThat(read(file("http:\n  host: \"::1\"\n"), Map.of()).token()).isEmpty();
    }

    @Test
    void aTokenMustBeLongEnoughAndIsNeverTold() throws IOException {
        List<Fault> faults = faults(file("access:\n  mode: token\n  token: hunter2\n"), Map.of());
        assertThat(faults).extracting(Fault::pointer).containsExactly("/access/token");
        assertThat(faults.get(0).detail()).doesNotContain("hunter2");
    }

    @Test
    void aFileThatIsMissingOrNoYamlIsAFault() throws IOException {
        assertThat(faults(directory.resolve("none.yaml"), Map.of()))
                .singleElement()
                .satisfies(f -> assertThat(f.detail()).contains("none.yaml"));
        assertThat(faults(file("http: [\n"), Map.of()))
                .singleElement()
                .satisfies(f -> assertThat(f.detail()).contains("not YAML"));
    }
}
