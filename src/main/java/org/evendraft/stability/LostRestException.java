package org.evendraft.stability;

/** Between two nodes of a curve of righting arms the trim turned out to have no rest. */
final class LostRestException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    LostRestException(double angleRad) {
        super("no rest at " + Math.toDegrees(angleRad) + "°");
    }
}
