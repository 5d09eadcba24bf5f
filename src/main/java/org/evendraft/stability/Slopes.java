package org.evendraft.stability;

/**
 * The slopes of the waterplane seen from the platform.
 *
 * @param heel tan(heel), starboard down positive
 * @param trim tan(trim), bow down positive
 */
record Slopes(double heel, double trim) {

    static final Slopes LEVEL = new Slopes(0, 0);

    /** Those of a waterplane. */
    static Slopes of(Waterplane at) {
        return new Slopes(Math.tan(at.heelRad()), Math.tan(at.trimRad()));
    }

    Slopes plus(Slopes o) {
        return new Slopes(heel + o.heel, trim + o.trim);
    }

    Slopes times(double k) {
        return new Slopes(k * heel, k * trim);
    }

    double dot(Slopes o) {
        return heel * o.heel + trim * o.trim;
    }

    double norm() {
        return Math.hypot(heel, trim);
    }

    /** The direction a quarter turn on, from heel towards trim. */
    Slopes quarterTurn() {
        return new Slopes(-trim, heel);
    }

    /** Angle between the platform's and the true vertical (rad). */
    double inclination() {
        return Math.atan(norm());
    }
}
