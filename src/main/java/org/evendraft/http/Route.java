package org.evendraft.http;

import java.util.List;

/**
 * An address with a method and what answers it.
 *
 * @param method HTTP method
 * @param path address with its variables in braces, as the OpenAPI description spells it
 * @param reads media types of a body that it reads; none for no body
 * @param writes media types that it can answer with, the usual one first
 * @param work how it is worked on
 * @param open whether it needs no token
 * @param handler what answers
 */
record Route(
        String method, String path, List<String> reads, List<String> writes, Work work, boolean open, Handler handler) {

    /** What answers a request. */
    @FunctionalInterface
    interface Handler {
        /** The answer; problems come as exceptions. */
        Answer answer(Request request);
    }

    /** How a request is worked on. */
    enum Work {
        /** At once, so that health can be asked of a busy service. */
        LIGHT,
        /** By the pool of workers, within the time limit. */
        HEAVY
    }

    private static final List<String> JSON = List.of("application/json");

    Route {
        reads = List.copyOf(reads);
        writes = List.copyOf(writes);
    }

    static Route get(String path, Handler handler) {
        return new Route("GET", path, List.of(), JSON, Work.HEAVY, false, handler);
    }

    static Route post(String path, Handler handler) {
        return new Route("POST", path, JSON, JSON, Work.HEAVY, false, handler);
    }

    static Route put(String path, Handler handler) {
        return new Route("PUT", path, JSON, JSON, Work.HEAVY, false, handler);
    }

    static Route delete(String path, Handler handler) {
        return new Route("DELETE", path, List.of(), JSON, Work.HEAVY, false, handler);
    }

    Route reading(String... mediaTypes) {
        return new Route(method, path, List.of(mediaTypes), writes, work, open, handler);
    }

    Route writing(String... mediaTypes) {
        return new Route(method, path, reads, List.of(mediaTypes), work, open, handler);
    }

    Route light() {
        return new Route(method, path, reads, writes, Work.LIGHT, open, handler);
    }

    Route withoutToken() {
        return new Route(method, path, reads, writes, work, true, handler);
    }
}
