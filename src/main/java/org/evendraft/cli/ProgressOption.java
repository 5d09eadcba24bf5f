package org.evendraft.cli;

import java.util.concurrent.atomic.AtomicInteger;
import org.evendraft.stability.Progress;
import picocli.CommandLine.Option;

/** Tells on standard error how far a long computation is, common to several commands. */
final class ProgressOption {
    @Option(names = "--progress", description = "Tell on standard error how far it is.")
    private boolean wanted;

    /** Tells a line for each further percent, if that is wanted. */
    Progress to(Console console) {
        if (!wanted) {
            return Progress.UNWATCHED;
        }
        AtomicInteger told = new AtomicInteger(-1);
        return (fraction, doing) -> {
            int percent = (int) Math.round(100 * fraction);
            if (told.getAndSet(percent) != percent) {
                console.remark(percent + " % " + doing);
            }
        };
    }
}
