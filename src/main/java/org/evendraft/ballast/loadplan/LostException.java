package org.evendraft.ballast.loadplan;

/** The platform finds no rest: it sinks, capsizes or is laid over by the wind. The message says which. */
final class LostException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    LostException(String reason) {
        super(reason);
    }

    /** Why, in a sentence. */
    String reason() {
        String message = getMessage();
        return message == null ? "" : message;
    }
}
