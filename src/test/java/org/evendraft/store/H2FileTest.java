package org.evendraft.store;

import static java.nio.charset.StandardCharsets.UTF_8;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.File;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.sql.DriverManager;
import java.sql.SQLException;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalInt;
import java.util.concurrent.ExecutionException;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** What H2 does with its file. */
final class H2FileTest {
    /** The calls that matter, as strace prints them with -y: the path stands after the descriptor. */
    private static final Pattern CALL = Pattern.compile("(pwrite64|fsync|fdatasync|write)\\(\\d+<([^>]*)>(.*)");

    @TempDir
    Path folder = Path.of("");

    private String url() {
        return "jdbc:h2:file:" + folder.resolve("store");
    }

    @Test
    void aTraceOfSystemCallsShowsThatDataIsFlushedBeforeTheAnswer() throws IOException, InterruptedException {
        List<String> events = new ArrayList<>();
        boolean written = false;
        boolean flushed = false;
        for (String line : trace()) {
            Matcher call = CALL.matcher(line);
            if (!call.find()) {
                continue;
            }
            boolean onDatabase = call.group(2).endsWith("store.mv.db");
            if (call.group(1).equals("pwrite64") && onDatabase) {
                written = true;
                flushed = false;
            } else if (call.group(1).endsWith("sync") && onDatabase) {
                flushed = true;
            } else if (call.group(3).contains("asked")) {
                written = false;
            } else if (call.group(3).contains("answered")) {
                events.add(written && flushed ? "durable" : "not durable: " + line);
            }
        }
        assertThat(events).hasSize(AcknowledgedWrites.REVISIONS).containsOnly("durable");
    }

    private List<String> trace() throws IOException, InterruptedException {
        Outside.skipWithout(hasStrace(), "strace");
        Path trace = folder.resolve("trace");
        Process process = new ProcessBuilder(
                        "strace",
                        "-f",
                        "-y",
                        "-e",
                        "trace=pwrite64,write,fsync,fdatasync",
                        "-o",
                        trace.toString(),
                        Path.of(System.getProperty("java.home"), "bin", "java").toString(),
                        "-cp",
                        System.getProperty("java.class.path"),
                        AcknowledgedWrites.class.getName(),
                        url())
                .redirectErrorStream(true)
                .start();
        String output = new String(process.getInputStream().readAllBytes(), UTF_8);
        assertThat(process.waitFor()).as(output).isZero();
        return Files.readAllLines(trace, UTF_8);
    }

    private static boolean hasStrace() {
        return Pattern.compile(File.pathSeparator)
                .splitAsStream(System.getenv("PATH"))
                .anyMatch(place -> Files.isExecutable(Path.of(place, "strace")));
    }

    @Test
    void anInterruptedRequestDoesNotCostTheDatabase() throws ExecutionException, InterruptedException {
        try (Database database = Database.open(url(), "sa", "")) {
            PlatformRepository platforms = new PlatformRepository(Samples.AT_NOON);
            String document = "x".repeat(1_000_000);
            Simultaneously.run(1, i -> {
                database.inTransaction(handle -> {
                    Thread.currentThread().interrupt();
                    return platforms.save(handle, Samples.platform("p"), document, OptionalInt.empty());
                });
                return Thread.interrupted();
            });
            assertThat(database.health().reachable()).isTrue();
            assertThat(database.read(handle -> platforms.findLatest(handle, "p"))
                            .orElseThrow()
                            .document())
                    .isEqualTo(document);
        }
    }

    @Test
    void onlyOneOpensTheFile() throws SQLException {
        try (Database database = Database.open(url(), "sa", "")) {
            assertThat(database.health().reachable()).isTrue();
            assertThatThrownBy(
                            () -> DriverManager.getConnection(url(), "sa", "").close())
                    .isInstanceOf(SQLException.class)
                    .hasMessageContaining("already in use");
        }
    }

    @Test
    void whatWasStoredIsThereAfterReopening() {
        try (Database database = Database.open(url(), "sa", "")) {
            Samples.storedPlatform(database);
        }
        try (Database database = Database.open(url(), "sa", "")) {
            assertThat(Samples.rows(database, "SELECT COUNT(*) FROM platform_revision WHERE '' = :id", ""))
                    .containsExactly("1");
        }
    }
}
