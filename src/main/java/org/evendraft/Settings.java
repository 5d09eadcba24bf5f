package org.evendraft;

import java.time.Duration;
import java.util.Optional;

/**
 * What the configuration says, checked.
 *
 * @param host address to listen on
 * @param port port to listen on, 0 for any free one
 * @param maxBodyBytes greatest size of a request's body (bytes)
 * @param requestTime longest time that a request may take
 * @param database where the data are
 * @param token what requests must carry; none in the open mode
 * @param logFormat how log lines look
 * @param logLevel the least level that is logged
 */
record Settings(
        String host,
        int port,
        int maxBodyBytes,
        Duration requestTime,
        DatabaseSettings database,
        Optional<String> token,
        String logFormat,
        String logLevel) {

    /**
     * Where the data are.
     *
     * @param url JDBC address
     * @param user the database's user
     * @param password that user's password
     */
    record DatabaseSettings(String url, String user, String password) {

        @Override
        public String toString() {
            return url + " as " + user;
        }
    }

    /** Leaves the secrets out. */
    @Override
    public String toString() {
        return "http://" + host + ":" + port + ", " + database;
    }
}
