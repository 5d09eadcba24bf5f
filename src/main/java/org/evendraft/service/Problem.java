package org.evendraft.service;

import com.fasterxml.jackson.annotation.JsonInclude;
import java.util.List;
import java.util.Optional;
import org.evendraft.platform.Fault;
import org.evendraft.platform.FaultyDocumentException;

/**
 * What went wrong, as RFC 9457 writes it. Component names are those of the JSON.
 *
 * @param type for programs
 * @param title a short title for people
 * @param status the HTTP status
 * @param detail a sentence for people
 * @param errors all that is wrong with a document; empty for other problems
 * @param errorId where the log tells more, for a bug
 */
public record Problem(
        String type,
        String title,
        int status,
        String detail,
        List<Entry> errors,
        @JsonInclude(JsonInclude.Include.NON_ABSENT) Optional<String> errorId) {

    /** The media type of a problem. */
    public static final String MEDIA_TYPE = "application/problem+json";

    /**
     * One thing that is wrong with a document.
     *
     * @param pointer JSON pointer (RFC 6901) of the property concerned, {@code ""} for the whole
     * @param detail a sentence for people
     */
    public record Entry(String pointer, String detail) {}

    /** Copies the list. */
    public Problem {
        errors = List.copyOf(errors);
    }

    /** The problem of a request that is not carried out. */
    public static Problem of(Reason reason, String detail) {
        return new Problem(reason.type(), reason.title(), reason.status(), detail, List.of(), Optional.empty());
    }

    /** The problem of a refusal. */
    public static Problem of(Refusal refusal) {
        return of(refusal.reason(), refusal.detail());
    }

    /** The problem of a document with faults: malformed if any fault is one of form. */
    public static Problem of(FaultyDocumentException e) {
        Reason reason = e.malformed() ? Reason.MALFORMED : Reason.IMPOSSIBLE;
        List<Entry> entries = e.faults().stream().map(Problem::entry).toList();
        String detail = entries.size() == 1 ? entries.get(0).detail() : entries.size() + " things are wrong.";
        return new Problem(reason.type(), reason.title(), reason.status(), detail, entries, Optional.empty());
    }

    /** The problem of a bug: no internals, only where the log tells more. */
    public static Problem internal(String errorId) {
        String detail = "The service failed. Whoever runs it finds the cause in its log under " + errorId + ".";
        return new Problem(
                Reason.INTERNAL.type(),
                Reason.INTERNAL.title(),
                Reason.INTERNAL.status(),
                detail,
                List.of(),
                Optional.of(errorId));
    }

    private static Entry entry(Fault fault) {
        return new Entry(fault.pointer(), fault.detail());
    }
}
