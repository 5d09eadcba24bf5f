package org.evendraft.http;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.net.URI;
import java.net.http.HttpClient;
import java.net.http.HttpRequest;
import java.net.http.HttpRequest.BodyPublisher;
import java.net.http.HttpRequest.BodyPublishers;
import java.net.http.HttpResponse;
import java.net.http.HttpResponse.BodyHandlers;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import org.evendraft.platform.Json;

/** Asks the service, and checks that every answer is as the OpenAPI description says. */
final class Api {
    static final Description DESCRIPTION = new Description();

    private static final HttpClient CLIENT = HttpClient.newHttpClient();

    private final String address;

    Api(String address) {
        this.address = address;
    }

    /**
     * An answer that keeps to the description.
     *
     * @param response as it came
     */
    record Reply(HttpResponse<String> response) {

        int status() {
            return response.statusCode();
        }

        String text() {
            return response.body();
        }

        JsonNode json() {
            return Json.parse(text().getBytes(StandardCharsets.UTF_8));
        }

        String header(String name) {
            return response.headers().firstValue(name).orElse("");
        }

        /** Pointers of all errors of a problem. */
        List<String> pointers() {
            return json().path("errors").findValuesAsText("pointer");
        }

        /** Sentences of all errors of a problem. */
        List<String> details() {
            return json().path("errors").findValuesAsText("detail");
        }

        Reply expect(int status) {
            assertThat(status()).as(text()).isEqualTo(status);
            return this;
        }
    }

    Reply get(String path, String... headers) {
        return send("GET", path, BodyPublishers.noBody(), headers);
    }

    Reply post(String path, String json, String... headers) {
        return send("POST", path, BodyPublishers.ofString(json), withJson(headers));
    }

    Reply put(String path, String json, String... headers) {
        return send("PUT", path, BodyPublishers.ofString(json), withJson(headers));
    }

    Reply delete(String path, String... headers) {
        return send("DELETE", path, BodyPublishers.noBody(), headers);
    }

    private static String[] withJson(String... headers) {
        String[] all = Arrays.copyOf(headers, headers.length + 2);
        all[headers.length] = "Content-Type";
        all[headers.length + 1] = "application/json";
        return all;
    }

    Reply send(String method, String path, BodyPublisher body, String... headers) {
        HttpRequest.Builder request =
                HttpRequest.newBuilder(URI.create(address + path)).method(method, body);
        if (headers.length > 0) {
            request.headers(headers);
        }
        try {
            HttpResponse<String> response = CLIENT.send(request.build(), BodyHandlers.ofString());
            check(method, path.split("\\?", 2)[0], response);
            return new Reply(response);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        } catch (InterruptedException e) {
            throw new IllegalStateException(e);
        }
    }

    private static void check(String method, String path, HttpResponse<String> response) {
        String contentType =
                response.headers().firstValue("Content-Type").orElse("").split(";", 2)[0];
        assertThat(response.headers().firstValue("X-Content-Type-Options")).contains("nosniff");
        Optional<String> operation = operation(method, path);
        if (operation.isPresent()) {
            assertThat(DESCRIPTION.deviations(operation.get(), response.statusCode(), contentType, response.body()))
                    .as(method + " " + path + " " + response.statusCode() + " " + response.body())
                    .isEmpty();
        } else if (!method.equals("HEAD")) {
            assertThat(DESCRIPTION.deviations("Problem", response.body())).isEmpty();
        }
    }

    /** The operation that the description has for a request. */
    private static Optional<String> operation(String method, String path) {
        return DESCRIPTION.operations().stream()
                .filter(o -> o.startsWith(method + " "))
                .filter(o -> path.matches(o.substring(method.length() + 1).replaceAll("\\{\\w+}", "[^/]+")))
                .findFirst();
    }
}
