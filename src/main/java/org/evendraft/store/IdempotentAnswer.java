package org.evendraft.store;

import java.util.Optional;

/**
 * The first answer to a request.
 *
 * @param status status code
 * @param location value of Location, if any
 * @param etag value of ETag, if any
 * @param contentType value of Content-Type, if any
 * @param body the body
 */
public record IdempotentAnswer(
        int status, Optional<String> location, Optional<String> etag, Optional<String> contentType, String body) {}
