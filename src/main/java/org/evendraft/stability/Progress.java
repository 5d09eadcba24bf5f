package org.evendraft.stability;

/** Is told how far a long computation has come, and may stop it. Called from one thread at a time. */
@FunctionalInterface
public interface Progress {
    /** Lets everything run. */
    Progress UNWATCHED = (fraction, doing) -> {};

    /**
     * Takes notice.
     *
     * @param fraction part of the work that is done, 0 to 1
     * @param doing what is being done, in words
     * @throws StoppedException when the work shall stop
     */
    void reached(double fraction, String doing);
}
