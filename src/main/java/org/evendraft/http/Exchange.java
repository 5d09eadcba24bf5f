package org.evendraft.http;

import io.javalin.http.Context;
import io.micrometer.core.instrument.MeterRegistry;
import io.micrometer.core.instrument.Timer;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;

/** Carries a request from the web server to its route and the answer back, counting and logging it. */
final class Exchange {
    static final String NO_SNIFF = "X-Content-Type-Options";

    private static final Logger LOG = LoggerFactory.getLogger("org.evendraft.http.Access");

    private final Options options;
    private final Gate gate;
    private final Workers workers;
    private final MeterRegistry meters;

    Exchange(Options options, Workers workers, MeterRegistry meters) {
        this.options = options;
        this.gate = new Gate(options.token());
        this.workers = workers;
        this.meters = meters;
    }

    /** Answers a request to a route. */
    void carry(Route route, Context context) {
        Timer.Sample sample = Timer.start(meters);
        long start = System.nanoTime();
        Answer answer = answer(route, context);
        write(answer, context);
        sample.stop(Timer.builder("http.server.requests")
                .description("Requests by route and outcome")
                .tag("method", route.method())
                .tag("route", route.path())
                .tag("status", Integer.toString(answer.status()))
                .register(meters));
        log(context, answer.status(), start);
    }

    /** Answers a request to which no route belongs, or whose route could not be reached. */
    void turnDown(Answer answer, Context context) {
        write(answer, context);
        log(context, answer.status(), System.nanoTime());
    }

    // The edge of the program: whatever goes wrong inside becomes a problem response here.
    private Answer answer(Route route, Context context) {
        try {
            if (!route.open()) {
                gate.check(Optional.ofNullable(context.header("Authorization")));
            }
            Request request = request(route, context);
            return route.work() == Route.Work.LIGHT
                    ? route.handler().answer(request)
                    : workers.within(() -> route.handler().answer(request));
        } catch (RuntimeException e) {
            return Failures.answer(e);
        }
    }

    private Request request(Route route, Context context) {
        Map<String, String> headers = new HashMap<>();
        context.headerMap().forEach((name, value) -> headers.put(name.toLowerCase(Locale.ROOT), value));
        Optional<String> contentType = Optional.ofNullable(headers.get("content-type"));
        Request.MediaTypes mediaTypes = new Request.MediaTypes(
                Negotiation.body(contentType, route.reads()),
                Negotiation.answer(Optional.ofNullable(headers.get("accept")), route.writes()));
        byte[] body = route.reads().isEmpty()
                ? new byte[0]
                : new BodyReader(options.maxBodyBytes(), options.requestTime()).read(context.req());
        Map<String, List<String>> query = context.queryParamMap();
        return new Request(route.method(), context.path(), context.pathParamMap(), query, headers, mediaTypes, body);
    }

    private static void write(Answer answer, Context context) {
        context.status(answer.status());
        context.contentType(answer.contentType());
        context.header(NO_SNIFF, "nosniff");
        context.header("Cache-Control", "no-store");
        answer.headers().forEach(context::header);
        context.result(answer.body());
    }

    private static void log(Context context, int status, long start) {
        LOG.atInfo()
                .addKeyValue("method", context.method().name())
                .addKeyValue("path", context.path())
                .addKeyValue("status", status)
                .addKeyValue("milliseconds", (System.nanoTime() - start) / 1_000_000)
                .log("request");
    }
}
