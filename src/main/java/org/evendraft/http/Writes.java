package org.evendraft.http;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import java.util.function.Supplier;
import org.evendraft.platform.Faults;
import org.evendraft.service.Once;
import org.evendraft.service.Pending;
import org.evendraft.service.Reply;
import org.evendraft.store.IdempotentRequest;

/** Has writes carried out, once for each Idempotency-Key. */
final class Writes {
    private static final String KEY = "idempotency-key";

    private final Once once;

    Writes(Once once) {
        this.once = once;
    }

    /** Carries out a POST. */
    Answer post(Request request, Supplier<Pending<Reply>> work) {
        return answer(once.carryOut(key(request), work));
    }

    /** Answers a POST that stores nothing; with a key the answer itself is stored, and given again. */
    Answer read(Request request, Supplier<Reply> work) {
        return request.header(KEY).isPresent() ? post(request, () -> Pending.of(work.get())) : answer(work.get());
    }

    /** Carries out a PUT, which may be repeated as it is. */
    Answer put(Supplier<Pending<Reply>> work) {
        return answer(once.carryOut(Optional.empty(), work));
    }

    private static Optional<IdempotentRequest> key(Request request) {
        return request.header(KEY)
                .map(key -> IdempotentRequest.of(checked(key), request.method(), request.target(), request.body()));
    }

    private static String checked(String key) {
        Faults faults = new Faults();
        if (key.isBlank() || key.length() > Once.LONGEST_KEY) {
            faults.form("", "Idempotency-Key must have from 1 to " + Once.LONGEST_KEY + " characters");
        }
        faults.throwIfAny();
        return key;
    }

    private static Answer answer(Reply reply) {
        Map<String, String> headers = new LinkedHashMap<>();
        reply.location().ifPresent(location -> headers.put("Location", location));
        reply.etag().ifPresent(etag -> headers.put("ETag", etag));
        if (reply.replayed()) {
            headers.put("Idempotency-Replayed", "true");
        }
        return Answer.text(reply.status(), Answer.JSON, reply.body()).with(headers);
    }
}
