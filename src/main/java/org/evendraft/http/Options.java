package org.evendraft.http;

import java.time.Duration;
import java.util.Optional;

/**
 * How the service listens.
 *
 * @param host address to listen on
 * @param port port, 0 for any free one
 * @param maxBodyBytes greatest size of a body (bytes)
 * @param requestTime longest time that a request may take
 * @param token what requests must carry, if anything
 */
public record Options(String host, int port, int maxBodyBytes, Duration requestTime, Optional<String> token) {

    /** Leaves the token out. */
    @Override
    public String toString() {
        return host + ":" + port;
    }
}
