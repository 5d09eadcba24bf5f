package org.evendraft;

import com.fasterxml.jackson.databind.JsonNode;
import java.io.IOException;
import java.net.URI;
import java.net.http.HttpClient;
import java.net.http.HttpRequest;
import java.net.http.HttpRequest.BodyPublishers;
import java.net.http.HttpResponse;
import java.net.http.HttpResponse.BodyHandlers;
import java.nio.charset.StandardCharsets;
import java.time.Duration;
import org.evendraft.platform.Json;

/** Asks a service in another process. */
final class Client {
    private static final Duration PATIENCE = Duration.ofSeconds(60);

    private final HttpClient http =
            HttpClient.newBuilder().connectTimeout(PATIENCE).build();
    private final String address;

    Client(String address) {
        this.address = address;
    }

    HttpResponse<String> get(String path) throws IOException, InterruptedException {
        return http.send(request(path).GET().build(), BodyHandlers.ofString());
    }

    HttpResponse<String> post(String path, String json) throws IOException, InterruptedException {
        return http.send(request(path).POST(BodyPublishers.ofString(json)).build(), BodyHandlers.ofString());
    }

    HttpResponse<String> put(String path, String json) throws IOException, InterruptedException {
        return http.send(request(path).PUT(BodyPublishers.ofString(json)).build(), BodyHandlers.ofString());
    }

    private HttpRequest.Builder request(String path) {
        return HttpRequest.newBuilder(URI.create(address + path))
                .timeout(PATIENCE)
                .header("Content-Type", "application/json");
    }

    static JsonNode json(HttpResponse<String> response) {
        return Json.parse(response.body().getBytes(StandardCharsets.UTF_8));
    }
}
