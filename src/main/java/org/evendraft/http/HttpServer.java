package org.evendraft.http;

import io.javalin.Javalin;
import io.javalin.config.JavalinConfig;
import io.javalin.http.Context;
import io.javalin.http.HandlerType;
import io.javalin.http.HttpResponseException;
import io.javalin.util.JavalinBindException;
import io.micrometer.core.instrument.MeterRegistry;
import io.micrometer.prometheusmetrics.PrometheusMeterRegistry;
import jakarta.servlet.http.HttpServletResponse;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.time.Duration;
import java.util.List;
import java.util.stream.Collectors;
import org.eclipse.jetty.server.Server;
import org.eclipse.jetty.server.handler.GracefulHandler;
import org.evendraft.service.ControlRoom;
import org.evendraft.service.Problem;
import org.evendraft.service.Reason;
import org.evendraft.service.Refusal;

/** The service, listening. */
public final class HttpServer implements AutoCloseable {
    /** How long requests in progress may take when the service stops. */
    private static final Duration LAST_REQUESTS = Duration.ofSeconds(10);

    private static final int NOT_FOUND = 404;

    private final Options options;
    private final List<Route> routes;
    private final Workers workers;
    private final Exchange exchange;
    private final Javalin javalin;

    private HttpServer(Options options, List<Route> routes, MeterRegistry meters) {
        this.options = options;
        this.routes = List.copyOf(routes);
        this.workers = new Workers(options.requestTime());
        this.exchange = new Exchange(options, workers, meters);
        this.javalin = Javalin.create(this::configure);
    }

    /**
     * Starts to listen; when it returns, requests are answered.
     *
     * @throws Refusal when the address is taken
     */
    public static HttpServer start(Options options, ControlRoom room) {
        PrometheusMeterRegistry meters = Meters.open();
        HttpServer server = new HttpServer(options, Routes.of(room, meters), meters);
        try {
            server.javalin.start(options.host(), options.port());
        } catch (JavalinBindException e) {
            server.workers.close();
            throw new Refusal(
                    Reason.UNAVAILABLE,
                    "The address " + options.host() + ":" + options.port()
                            + " cannot be listened at; is another program there? Set http.port (EVENDRAFT_HTTP_PORT).");
        }
        return server;
    }

    private void configure(JavalinConfig config) {
        config.startup.showJavalinBanner = false;
        config.startup.startupWatcherEnabled = false;
        config.jetty.modifyServer(HttpServer::prepare);
        for (Route route : routes) {
            for (HandlerType method : methods(route)) {
                config.routes.addHttpHandler(method, route.path(), c -> exchange.carry(route, c));
            }
        }
        config.routes.exception(HttpResponseException.class, (e, c) -> turnDown(e.getStatus(), c));
        config.routes.exception(Exception.class, (e, c) -> exchange.turnDown(Failures.answer(e), c));
        config.router.javaLangErrorHandler(HttpServer::failed);
    }

    /** The last resort, for what is thrown past every handler: memory or stack at their ends. */
    private static void failed(HttpServletResponse response, Error error) {
        Answer answer = Failures.answer(error);
        response.setStatus(answer.status());
        response.setContentType(answer.contentType());
        response.setHeader(Exchange.NO_SNIFF, "nosniff");
        try {
            response.getOutputStream().write(answer.body());
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** Whoever may GET may also HEAD; the web server leaves the body out. */
    private static List<HandlerType> methods(Route route) {
        HandlerType method = HandlerType.findOrCreate(route.method());
        return method.equals(HandlerType.GET) ? List.of(method, HandlerType.HEAD) : List.of(method);
    }

    private static void prepare(Server server) {
        server.setHandler(new GracefulHandler());
        server.setStopTimeout(LAST_REQUESTS.toMillis());
        server.setErrorHandler(new ErrorPages());
    }

    private void turnDown(int status, Context context) {
        List<String> methods = routes.stream()
                .filter(route -> matches(route.path(), context.path()))
                .map(Route::method)
                .distinct()
                .toList();
        if (status == NOT_FOUND && !methods.isEmpty()) {
            String allowed = methods.stream().sorted().collect(Collectors.joining(", "));
            String detail = context.path() + " answers to " + allowed + " only.";
            Answer answer = Answer.problem(Problem.of(Reason.METHOD_NOT_ALLOWED, detail));
            exchange.turnDown(answer.with("Allow", allowed), context);
        } else {
            Problem problem = Problem.of(Reason.NOT_FOUND, "There is nothing at " + context.path() + ".");
            exchange.turnDown(Answer.problem(problem), context);
        }
    }

    private static boolean matches(String pattern, String path) {
        String[] wanted = pattern.split("/", -1);
        String[] found = path.split("/", -1);
        if (wanted.length != found.length) {
            return false;
        }
        for (int i = 0; i < wanted.length; i++) {
            if (!wanted[i].startsWith("{") && !wanted[i].equals(found[i])) {
                return false;
            }
        }
        return true;
    }

    /** The port it listens on. */
    public int port() {
        return javalin.port();
    }

    /** Its address for a browser or another program on this machine. */
    public String address() {
        String host = options.host().contains(":") ? "[" + options.host() + "]" : options.host();
        return "http://" + host + ":" + port();
    }

    /** Stops: takes no new requests and lets those in progress come to their end. */
    @Override
    public void close() {
        javalin.stop();
        workers.close();
    }
}
