package org.evendraft.http;

import jakarta.servlet.http.HttpServletRequest;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.time.Duration;
import org.evendraft.service.Reason;
import org.evendraft.service.Refusal;

/** Reads a request's body whole, up to a size and within a time, whether or not its length was announced. */
final class BodyReader {
    private static final int CHUNK = 1 << 16;
    private static final int MEGABYTE = 1_000_000;

    private final int most;
    private final Duration time;

    BodyReader(int most, Duration time) {
        this.most = most;
        this.time = time;
    }

    /**
     * Reads it.
     *
     * @throws Refusal when it is too large or comes too slowly
     */
    byte[] read(HttpServletRequest request) {
        long deadline = System.nanoTime() + time.toNanos();
        if (request.getContentLengthLong() > most) {
            throw tooLarge();
        }
        try (InputStream in = request.getInputStream()) {
            ByteArrayOutputStream out = new ByteArrayOutputStream();
            byte[] chunk = new byte[CHUNK];
            for (int n = in.read(chunk); n >= 0; n = in.read(chunk)) {
                if (System.nanoTime() > deadline) {
                    throw new Refusal(Reason.TOO_SLOW, "The body did not arrive within " + time.toSeconds() + " s.");
                }
                if (out.size() + n > most) {
                    drain(in, chunk, deadline);
                    throw tooLarge();
                }
                out.write(chunk, 0, n);
            }
            return out.toByteArray();
        } catch (IOException e) {
            throw new UncheckedIOException("the body broke off", e);
        }
    }

    /** Lets a client that is still sending come to its end, within reason, so that it reads the refusal. */
    private void drain(InputStream in, byte[] chunk, long deadline) throws IOException {
        long left = most;
        for (int n = in.read(chunk); n >= 0 && left > 0 && System.nanoTime() < deadline; n = in.read(chunk)) {
            left -= n;
        }
    }

    private Refusal tooLarge() {
        String size = most % MEGABYTE == 0 ? most / MEGABYTE + " MB" : most + " bytes";
        return new Refusal(Reason.TOO_LARGE, "The body is larger than the " + size + " allowed.");
    }
}
