package org.evendraft.http;

import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.Locale;
import java.util.Optional;
import org.evendraft.service.Reason;
import org.evendraft.service.Refusal;

/** Lets requests in that carry the token, or all where none is set. */
final class Gate {
    private static final String SCHEME = "bearer ";

    private final Optional<byte[]> digest;

    Gate(Optional<String> token) {
        this.digest = token.map(Gate::digest);
    }

    /**
     * Checks a request.
     *
     * @param authorization its Authorization header
     * @throws Refusal when it does not carry the token
     */
    void check(Optional<String> authorization) {
        if (digest.isEmpty()) {
            return;
        }
        Optional<byte[]> given = authorization
                .filter(a -> a.toLowerCase(Locale.ROOT).startsWith(SCHEME))
                .map(a -> digest(a.substring(SCHEME.length()).strip()));
        if (given.isEmpty() || !MessageDigest.isEqual(digest.get(), given.get())) {
            throw new Refusal(Reason.UNAUTHORIZED, "The request needs the header Authorization: Bearer TOKEN.");
        }
    }

    /** Digests have one length and are compared in constant time, so that nothing of the token can be measured. */
    private static byte[] digest(String token) {
        try {
            return MessageDigest.getInstance("SHA-256").digest(token.getBytes(StandardCharsets.UTF_8));
        } catch (NoSuchAlgorithmException e) {
            throw new IllegalStateException("every Java has SHA-256", e);
        }
    }
}
