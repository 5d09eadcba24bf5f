package org.evendraft.stability;

/** A computation was stopped because whoever asked for it no longer wants it. */
public final class StoppedException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    /** Stopped. */
    public StoppedException() {
        super("stopped");
    }
}
