package org.evendraft.http;

import io.micrometer.prometheusmetrics.PrometheusMeterRegistry;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.List;
import java.util.Map;
import org.evendraft.service.CheckHealth;

/** What the service tells of itself. */
final class ServiceRoutes {
    private static final String DESCRIPTION = "openapi.yaml";
    private static final String YAML = "application/yaml";
    private static final String METRICS = "text/plain";
    private static final int OK = 200;
    private static final int UNAVAILABLE = 503;

    private final CheckHealth checkHealth;
    private final PrometheusMeterRegistry meters;

    ServiceRoutes(CheckHealth checkHealth, PrometheusMeterRegistry meters) {
        this.checkHealth = checkHealth;
        this.meters = meters;
    }

    List<Route> routes() {
        return List.of(
                Route.get("/api/v1/openapi.yaml", r -> description())
                        .writing(YAML)
                        .light()
                        .withoutToken(),
                Route.get("/health", r -> health()).light().withoutToken(),
                Route.get("/metrics", r -> metrics()).writing(METRICS).light());
    }

    private static Answer description() {
        try (InputStream in = ServiceRoutes.class.getResourceAsStream(DESCRIPTION)) {
            if (in == null) {
                throw new IllegalStateException("the program lacks " + DESCRIPTION);
            }
            return new Answer(OK, YAML, Map.of(), in.readAllBytes());
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private Answer health() {
        CheckHealth.ServiceHealth health = checkHealth.check();
        return Answer.json(health.up() ? OK : UNAVAILABLE, health);
    }

    private Answer metrics() {
        return Answer.text(OK, METRICS + "; version=0.0.4; charset=utf-8", meters.scrape());
    }
}
