package org.evendraft.geometry;

/**
 * Second moments of a plane area about its own centroid (m⁴).
 *
 * @param transverse ∫v² dA, v to port
 * @param longitudinal ∫u² dA, u forward
 * @param product ∫uv dA
 */
public record SecondMoments(double transverse, double longitudinal, double product) {

    /** Those of no area. */
    public static final SecondMoments NONE = new SecondMoments(0, 0, 0);

    /** Each of the three times a number. */
    public SecondMoments times(double k) {
        return new SecondMoments(k * transverse, k * longitudinal, k * product);
    }

    /** The sum, each about its own centroid: what free surfaces add up to. */
    public SecondMoments plus(SecondMoments o) {
        return new SecondMoments(transverse + o.transverse, longitudinal + o.longitudinal, product + o.product);
    }
}
