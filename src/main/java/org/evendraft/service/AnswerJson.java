package org.evendraft.service;

import com.fasterxml.jackson.core.JsonProcessingException;
import java.nio.charset.StandardCharsets;
import org.evendraft.platform.Json;

/** Writes answers as JSON. */
public final class AnswerJson {
    private AnswerJson() {}

    /** The answer on one line. */
    public static String text(Object answer) {
        try {
            return Json.mapper().writeValueAsString(answer);
        } catch (JsonProcessingException e) {
            throw new IllegalStateException("an answer cannot be written", e);
        }
    }

    /** The answer on one line, as UTF-8. */
    public static byte[] bytes(Object answer) {
        return text(answer).getBytes(StandardCharsets.UTF_8);
    }

    /** The answer with line breaks and indents, for people and files. */
    public static String pretty(Object answer) {
        try {
            return Json.mapper().writerWithDefaultPrettyPrinter().writeValueAsString(answer);
        } catch (JsonProcessingException e) {
            throw new IllegalStateException("an answer cannot be written", e);
        }
    }
}
