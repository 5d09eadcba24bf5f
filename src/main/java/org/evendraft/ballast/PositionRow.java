package org.evendraft.ballast;

/**
 * One face of a band: draft or a slope must stay on its side of a value.
 *
 * @param limit name of the limit
 * @param response the answer of the platform to masses
 * @param component which component
 * @param sign 1 for an upper face, −1 for a lower one
 * @param value where the face is, in metres or as a slope
 * @param planeValue the component's value at the plane that the response starts from
 * @param tolerance half the band's breadth, same unit
 */
record PositionRow(
        String limit, Response response, int component, int sign, double value, double planeValue, double tolerance)
        implements Coupling {
    private static final double NEGLIGIBLE_PART = 1e-3;

    @Override
    public double effect(Contents liquid) {
        return sign * response.to(liquid)[component];
    }

    @Override
    public double room() {
        return sign * (value - planeValue - response.start(component));
    }

    @Override
    public double weight() {
        return 1 / tolerance;
    }

    @Override
    public double negligible() {
        return NEGLIGIBLE_PART * tolerance;
    }

    @Override
    public double over(ExactState state) {
        return sign * (state.component(component) - value);
    }
}
