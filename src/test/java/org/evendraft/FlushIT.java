package org.evendraft;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.junit.jupiter.api.Assumptions;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The system calls show that data are flushed to disk between a request and its answer. */
class FlushIT {
    private static final String PLATFORM = "/api/v1/platforms/box";
    private static final String DOCUMENT = """
            { "id": "box",
              "hull": { "bodies": [ { "name": "hull", "shape": "box", "min": [-50, -10, 0], "max": [50, 10, 10] } ] },
              "lightship": { "mass": 6000, "x": 0, "y": 0, "z": 5 } }
            """;

    /** A flush that has succeeded, told on one line or, when another thread came between, on its second. */
    private static final Pattern FLUSHED = Pattern.compile("f(data)?sync(\\(\\d+\\)| resumed>\\))\\s+= 0");

    @TempDir
    private Path directory;

    @BeforeEach
    void straceIsThere() {
        boolean there = Stream.of(System.getenv("PATH").split(":"))
                .anyMatch(place -> Files.isExecutable(Path.of(place, "strace")));
        if (!Boolean.parseBoolean(System.getenv("EVENDRAFT_TEST_REQUIRE_ALL"))) {
            Assumptions.assumeTrue(there, "strace is not installed");
        }
        assertThat(there).as("strace is installed").isTrue();
    }

    @Test
    void aConditionIsOnDiskBeforeItIsAcknowledged() throws Exception {
        Path trace = directory.resolve("trace.txt");
        Jar.Service service = Jar.serve(
                directory,
                Map.of(),
                "strace",
                "-f",
                "-o",
                trace.toString(),
                "-s",
                "120",
                "-e",
                "trace=read,write,writev,recvfrom,sendto,recvmsg,sendmsg,fsync,fdatasync");
        try {
            Client client = new Client(service.address());
            assertThat(client.put(PLATFORM, DOCUMENT).statusCode()).isEqualTo(201);
            assertThat(client.post(PLATFORM + "/conditions", "{ \"name\": \"light\" }")
                            .statusCode())
                    .isEqualTo(201);
        } finally {
            service.process().descendants().forEach(ProcessHandle::destroyForcibly);
            service.kill();
        }
        assertFlushed(trace, "PUT " + PLATFORM);
        assertFlushed(trace, "POST " + PLATFORM + "/conditions");
    }

    private static void assertFlushed(Path trace, String request) throws IOException {
        List<String> calls = Files.readAllLines(trace);
        int asked = first(calls, 0, request);
        int answered = first(calls, asked, "HTTP/1.1 201");
        assertThat(calls.subList(asked, answered))
                .as("flushes between " + request + " and its answer")
                .anyMatch(call -> FLUSHED.matcher(call).find());
    }

    private static int first(List<String> calls, int from, String text) {
        for (int i = from; i < calls.size(); i++) {
            if (calls.get(i).contains(text)) {
                return i;
            }
        }
        throw new AssertionError("no call with " + text);
    }
}
