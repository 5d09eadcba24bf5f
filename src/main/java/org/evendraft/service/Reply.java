package org.evendraft.service;

import java.util.Optional;
import org.evendraft.store.IdempotentAnswer;

/**
 * What answers a write, and answers it again when it is repeated.
 *
 * @param status HTTP status
 * @param location address of what was stored, if it has one
 * @param etag its entity tag, if it has one
 * @param body the answer's JSON text
 * @param replayed whether this is the first answer given once more
 */
public record Reply(int status, Optional<String> location, Optional<String> etag, String body, boolean replayed) {

    /** What was stored has an address. */
    public static Reply created(String location, Object content) {
        return new Reply(201, Optional.of(location), Optional.empty(), AnswerJson.text(content), false);
    }

    /** What was stored is being worked on, and its address tells how far that is. */
    public static Reply accepted(String location, Object content) {
        return new Reply(202, Optional.of(location), Optional.empty(), AnswerJson.text(content), false);
    }

    /** Nothing was stored. */
    public static Reply ok(Object content) {
        return new Reply(200, Optional.empty(), Optional.empty(), AnswerJson.text(content), false);
    }

    IdempotentAnswer toStore() {
        return new IdempotentAnswer(status, location, etag, Optional.empty(), body);
    }

    static Reply stored(IdempotentAnswer answer) {
        return new Reply(answer.status(), answer.location(), answer.etag(), answer.body(), true);
    }
}
