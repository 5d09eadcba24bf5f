package org.evendraft.service;

/** A request that is not carried out, for a reason that is the client's to mend or to wait for; never a bug. */
public final class Refusal extends RuntimeException {
    private static final long serialVersionUID = 1L;

    private final Reason reason;

    /**
     * @param reason why, for programs
     * @param detail why, in a sentence for people
     */
    public Refusal(Reason reason, String detail) {
        super(detail);
        this.reason = reason;
    }

    /** There is no such thing. */
    public static Refusal notFound(String detail) {
        return new Refusal(Reason.NOT_FOUND, detail);
    }

    /** Why, for programs. */
    public Reason reason() {
        return reason;
    }

    /** Why, in a sentence for people. */
    public String detail() {
        String message = getMessage();
        return message == null ? reason.title() : message;
    }
}
