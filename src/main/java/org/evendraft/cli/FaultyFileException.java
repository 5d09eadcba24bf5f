package org.evendraft.cli;

import java.nio.file.Path;
import org.evendraft.platform.FaultyDocumentException;
import org.evendraft.service.Problem;

/** A file with faults. */
final class FaultyFileException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    private final transient Problem problem;

    FaultyFileException(Path file, FaultyDocumentException cause) {
        super(cause);
        Problem bare = Problem.of(cause);
        this.problem = new Problem(
                bare.type(), bare.title(), bare.status(), file + ": " + bare.detail(), bare.errors(), bare.errorId());
    }

    /** The problem, with the name of the file. */
    Problem problem() {
        return problem;
    }
}
