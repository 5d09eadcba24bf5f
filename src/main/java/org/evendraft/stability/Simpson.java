package org.evendraft.stability;

import java.util.function.DoubleUnaryOperator;

/**
 * Simpson's rule with steps halved until it settles; values asked for twice are cheap where the integrand remembers them.
 *
 * @param integrand by angle (rad)
 * @param tolerance error allowed for each radian (the integrand's unit)
 */
record Simpson(DoubleUnaryOperator integrand, double tolerance) {
    private static final int GREATEST_DEPTH = 10;

    /** The integral between two angles (rad). */
    double area(double from, double to) {
        double middle = (from + to) / 2;
        return area(from, at(from), to, at(to), at(middle), GREATEST_DEPTH);
    }

    private double at(double angleRad) {
        return integrand.applyAsDouble(angleRad);
    }

    private double area(double a, double atA, double b, double atB, double atMiddle, int depth) {
        double m = (a + b) / 2;
        double atLeft = at((a + m) / 2);
        double atRight = at((m + b) / 2);
        double whole = (b - a) / 6 * (atA + 4 * atMiddle + atB);
        double halves = (b - a) / 12 * (atA + 4 * atLeft + 2 * atMiddle + 4 * atRight + atB);
        if (depth == 0 || Math.abs(halves - whole) <= 15 * tolerance * (b - a)) {
            return halves + (halves - whole) / 15;
        }
        return area(a, atA, m, atMiddle, atLeft, depth - 1) + area(m, atMiddle, b, atB, atRight, depth - 1);
    }
}
