package org.evendraft.http;

import java.nio.charset.StandardCharsets;
import java.util.LinkedHashMap;
import java.util.Map;
import org.evendraft.service.AnswerJson;
import org.evendraft.service.Problem;

/**
 * What goes back to the client.
 *
 * @param status HTTP status
 * @param contentType media type of the body
 * @param headers further headers
 * @param body the body
 */
@SuppressWarnings("ArrayRecordComponent") // bytes on their way out: never compared, never changed
record Answer(int status, String contentType, Map<String, String> headers, byte[] body) {
    static final String JSON = "application/json";

    Answer {
        headers = Map.copyOf(headers);
    }

    /** An answer that carries out the request. */
    static Answer ok(Object content) {
        return json(200, content);
    }

    static Answer json(int status, Object content) {
        return new Answer(status, JSON, Map.of(), AnswerJson.bytes(content));
    }

    static Answer text(int status, String contentType, String text) {
        return new Answer(status, contentType, Map.of(), text.getBytes(StandardCharsets.UTF_8));
    }

    static Answer problem(Problem problem) {
        return new Answer(problem.status(), Problem.MEDIA_TYPE, Map.of(), AnswerJson.bytes(problem));
    }

    Answer with(String header, String value) {
        return with(Map.of(header, value));
    }

    Answer with(Map<String, String> further) {
        Map<String, String> more = new LinkedHashMap<>(headers);
        more.putAll(further);
        return new Answer(status, contentType, more, body);
    }
}
