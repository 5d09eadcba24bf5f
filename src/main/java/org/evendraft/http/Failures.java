package org.evendraft.http;

import java.io.IOException;
import java.util.UUID;
import org.evendraft.platform.FaultyDocumentException;
import org.evendraft.service.Problem;
import org.evendraft.service.Reason;
import org.evendraft.service.Refusal;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;

/** Turns what was thrown into a problem response. */
final class Failures {
    private static final Logger LOG = LoggerFactory.getLogger(Failures.class);

    private static final String SOON = "5"; // s
    private static final String WHEN_A_JOB_MAY_BE_FINISHED = "30"; // s

    private Failures() {}

    /** The response; a bug goes to the log with an id that the client is given. */
    static Answer answer(Throwable thrown) {
        if (thrown instanceof FaultyDocumentException e) {
            return Answer.problem(Problem.of(e));
        }
        if (thrown instanceof Refusal e) {
            return refusal(e);
        }
        if (thrown.getCause() instanceof IOException && thrown.getMessage() != null) {
            LOG.debug("client went away", thrown);
            return Answer.problem(Problem.of(Reason.MALFORMED, "The request broke off."));
        }
        String errorId = UUID.randomUUID().toString();
        LOG.atError().setCause(thrown).addKeyValue("errorId", errorId).log("request failed");
        return Answer.problem(Problem.internal(errorId));
    }

    private static Answer refusal(Refusal refusal) {
        Answer answer = Answer.problem(Problem.of(refusal));
        return switch (refusal.reason()) {
            case UNAUTHORIZED -> answer.with("WWW-Authenticate", "Bearer");
            case TOO_LARGE -> answer.with("Connection", "close"); // the rest of the body is not read
            case UNAVAILABLE -> answer.with("Retry-After", SOON);
            case TOO_MANY -> answer.with("Retry-After", WHEN_A_JOB_MAY_BE_FINISHED);
            default -> answer;
        };
    }
}
