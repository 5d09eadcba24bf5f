package org.evendraft.http;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import java.io.ByteArrayInputStream;
import java.io.InputStream;
import java.net.InetAddress;
import java.net.Socket;
import java.net.http.HttpRequest.BodyPublishers;
import java.nio.charset.StandardCharsets;
import java.time.Duration;
import org.junit.jupiter.api.Test;

class ServerTest {
    private static final Duration LONG = Duration.ofSeconds(60);

    @Test
    void unknownAddressesAndMethodsAreProblems() {
        try (TestService service = TestService.start()) {
            Api api = service.api();
            assertThat(api.get("/nothing/here")
                            .expect(404)
                            .json()
                            .path("detail")
                            .textValue())
                    .contains("/nothing/here");
            Api.Reply wrong = api.send("DELETE", "/api/v1/platforms", BodyPublishers.noBody())
                    .expect(405);
            assertThat(wrong.header("Allow")).isEqualTo("GET");
            Api.Reply patch =
                    api.send("PATCH", Barge.PATH, BodyPublishers.ofString("{}")).expect(405);
            assertThat(patch.header("Allow")).isEqualTo("GET, PUT");
            api.get("/api/v1/platforms?verbose=1").expect(400);
        }
    }

    @Test
    void aRequestThatIsNoHttpIsAProblemToo() throws Exception {
        try (TestService service = TestService.start();
                Socket socket = new Socket(InetAddress.getLoopbackAddress(), service.port())) {
            socket.getOutputStream().write("GET /%zz HTTP/1.1\r\nHost: x\r\n\r\n".getBytes(StandardCharsets.US_ASCII));
            socket.shutdownOutput();
            String answer = new String(socket.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
            assertThat(answer).startsWith("HTTP/1.1 400").contains("application/problem+json");
        }
    }

    @Test
    void headAnswersAsGetWithoutBody() {
        try (TestService service = TestService.start()) {
            Api.Reply head = service.api().send("HEAD", "/health", BodyPublishers.noBody());
            assertThat(head.status()).isEqualTo(200);
            assertThat(head.header("Content-Type")).isEqualTo("application/json");
            assertThat(head.text()).isEmpty();
        }
    }

    @Test
    void healthTellsOfDatabaseAndMigrations() {
        try (TestService service = TestService.start()) {
            JsonNode health = service.api().get("/health").expect(200).json();
            assertThat(health.path("status").textValue()).isEqualTo("up");
            assertThat(health.path("migration").textValue()).matches("\\d+");
            assertThat(health.path("engineVersion").textValue()).isEqualTo(TestService.VERSION);
            service.database().close();
            JsonNode down = service.api().get("/health").expect(503).json();
            assertThat(down.path("database").textValue()).isEqualTo("down");
        }
    }

    @Test
    void metricsCountRequestsByRoute() {
        try (TestService service = TestService.start()) {
            Api api = Barge.stored(service);
            api.get(Barge.PATH).expect(200);
            assertThat(api.get("/metrics").expect(200).text())
                    .containsPattern(
                            "http_server_requests_seconds_count\\{.*route=\"/api/v1/platforms/\\{platform}\".*} 1")
                    .contains("jvm_memory_used_bytes");
        }
    }

    @Test
    void theDescriptionIsServed() {
        try (TestService service = TestService.start()) {
            Api.Reply description = service.api().get("/api/v1/openapi.yaml").expect(200);
            assertThat(description.text()).startsWith("openapi: 3.1.0");
        }
    }

    @Test
    void aBodyThatIsTooLargeIsRefusedWithOrWithoutAnnouncedLength() {
        try (TestService service = TestService.startWith(10_000, LONG)) {
            Api api = service.api();
            String large = "{ \"name\": \"" + "x".repeat(20_000) + "\" }";
            api.post(Barge.PATH + "/evaluate", large).expect(413);
            InputStream stream = new ByteArrayInputStream(large.getBytes(StandardCharsets.UTF_8));
            api.send(
                            "POST",
                            Barge.PATH + "/evaluate",
                            BodyPublishers.ofInputStream(() -> stream),
                            "Content-Type",
                            "application/json")
                    .expect(413);
            api.post(Barge.PATH + "/evaluate", "{}").expect(404);
        }
    }

    @Test
    void aBodyAnnouncedAsTooLargeIsRefusedBeforeAnyOfItComes() throws Exception {
        try (TestService service = TestService.startWith(10_000, LONG);
                Socket socket = new Socket(InetAddress.getLoopbackAddress(), service.port())) {
            socket.setSoTimeout(10_000); // less than the time a body may take
            String head = "POST " + Barge.PATH + "/evaluate HTTP/1.1\r\nHost: x\r\n"
                    + "Content-Type: application/json\r\nContent-Length: 10001\r\n\r\n";
            socket.getOutputStream().write(head.getBytes(StandardCharsets.US_ASCII));
            String answer = new String(socket.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
            assertThat(answer)
                    .startsWith("HTTP/1.1 413")
                    .containsIgnoringCase("Connection: close")
                    .contains("application/problem+json", "10000 bytes");
        }
    }

    @Test
    void aBodyOfExactlyTheGreatestSizeIsRead() {
        try (TestService service = TestService.startWith(10_000, LONG)) {
            Api api = Barge.stored(service);
            String fits = "{ }" + " ".repeat(9_997);
            api.post(Barge.PATH + "/evaluate", fits).expect(200);
            api.post(Barge.PATH + "/evaluate", fits + " ").expect(413);
        }
    }

    @Test
    void workThatTakesTooLongIsGivenUpOn() {
        try (TestService service = TestService.startWith(20_000_000, Duration.ofNanos(1))) {
            Api.Reply late = service.api().get("/api/v1/platforms").expect(503);
            assertThat(late.header("Retry-After")).isNotEmpty();
            service.api().get("/health").expect(200);
        }
    }

    @Test
    void aBugIsToldWithAnIdAndNoInternals() {
        try (TestService service = TestService.start()) {
            service.database().close();
            Api.Reply bug = service.api().get("/api/v1/platforms").expect(500);
            assertThat(bug.json().path("errorId").textValue()).hasSize(36);
            assertThat(bug.text())
                    .doesNotContain("jdbi")
                    .doesNotContain("Exception")
                    .doesNotContain("Hikari");
        }
    }

    @Test
    void aTokenIsNeededWhereOneIsSet() {
        String token = "correct-horse-battery";
        try (TestService service = TestService.startWithToken(token)) {
            Api api = service.api();
            Api.Reply refused = api.get("/api/v1/platforms").expect(401);
            assertThat(refused.header("WWW-Authenticate")).isEqualTo("Bearer");
            api.get("/api/v1/platforms", "Authorization", "Bearer wrong").expect(401);
            api.get("/api/v1/platforms", "Authorization", "Basic " + token).expect(401);
            api.get("/api/v1/platforms", "Authorization", "Bearer " + token).expect(200);
            api.put(Barge.PATH, Barge.PLATFORM).expect(401);
            api.get("/metrics").expect(401);
            api.get("/health").expect(200);
        }
    }
}
