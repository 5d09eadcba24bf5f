package org.evendraft.platform;

/**
 * One thing that is wrong with a document.
 *
 * @param pointer JSON pointer (RFC 6901) of the property concerned, {@code ""} for the whole
 * @param detail a sentence that a barge master understands, with the names and values concerned
 * @param kind whether the form is wrong or the meaning
 */
public record Fault(String pointer, String detail, Kind kind) {

    /** What is wrong. */
    public enum Kind {
        /** Missing, unknown, of the wrong type, not a finite number. */
        FORM,
        /** Well-formed but impossible: unknown tank, overfilled, would sink. */
        MEANING
    }
}
