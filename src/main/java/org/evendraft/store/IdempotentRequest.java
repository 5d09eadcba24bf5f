package org.evendraft.store;

import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;

/**
 * A request that its sender may repeat.
 *
 * @param key the sender's key, at most 255 characters
 * @param method the method, as {@code POST}
 * @param path the path, with the parameters of its query if it has any
 * @param bodySha256 SHA-256 of the body, 64 hexadecimal digits
 */
public record IdempotentRequest(String key, String method, String path, String bodySha256) {

    /** The request with a body. */
    public static IdempotentRequest of(String key, String method, String path, byte[] body) {
        return new IdempotentRequest(key, method, path, HexFormat.of().formatHex(sha256().digest(body)));
    }

    private static MessageDigest sha256() {
        try {
            return MessageDigest.getInstance("SHA-256");
        } catch (NoSuchAlgorithmException impossible) {
            throw new IllegalStateException("every Java platform has SHA-256", impossible);
        }
    }
}
