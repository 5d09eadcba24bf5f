package org.evendraft.service;

import java.util.Locale;

/** Why a request is not carried out. */
public enum Reason {
    /** Not JSON, or of the wrong form. */
    MALFORMED(400, "Malformed request"),
    /** No valid token. */
    UNAUTHORIZED(401, "Token needed"),
    /** There is no such thing. */
    NOT_FOUND(404, "Not found"),
    /** The address knows other methods only. */
    METHOD_NOT_ALLOWED(405, "Method not allowed"),
    /** The answer does not exist in a form that the client accepts. */
    NOT_ACCEPTABLE(406, "Not acceptable"),
    /** The request did not arrive in time. */
    TOO_SLOW(408, "Request too slow"),
    /** Another write came first. */
    CONFLICT(409, "Conflict"),
    /** A job has no result, or none yet. */
    NO_RESULT(409, "No result"),
    /** What the client knows is no longer so. */
    STALE(412, "Stale revision"),
    /** The body is too large. */
    TOO_LARGE(413, "Body too large"),
    /** The body is of a kind that is not read here. */
    UNSUPPORTED_MEDIA_TYPE(415, "Unsupported media type"),
    /** Well-formed but impossible. */
    IMPOSSIBLE(422, "Impossible request"),
    /** The idempotency key has been used for another request. */
    KEY_REUSED(422, "Idempotency key reused"),
    /** As much is being worked on as can wait. */
    TOO_MANY(429, "Too many jobs"),
    /** A bug. */
    INTERNAL(500, "Internal error"),
    /** Not now. */
    UNAVAILABLE(503, "Not available now");

    private final int status;
    private final String title;

    Reason(int status, String title) {
        this.status = status;
        this.title = title;
    }

    /** The HTTP status (RFC 9110 and RFC 6585). */
    public int status() {
        return status;
    }

    /** A short title for people. */
    public String title() {
        return title;
    }

    /** The problem type of RFC 9457, which programs may tell reasons apart by. */
    public String type() {
        return "urn:evendraft:problem:" + name().toLowerCase(Locale.ROOT).replace('_', '-');
    }
}
