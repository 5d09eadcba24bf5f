package org.evendraft.stability;

import org.evendraft.geometry.SecondMoments;

/**
 * Metacentric height as it depends on the axis of inclination: about (cos a, sin a) it is {@code uᵀ·M·u}. The hull gives
 * {@code [[I_T, −I_TL], [−I_TL, I_L]]/V + (KB − KG)}, free liquids take off the same form with {@code Σρi/Δ}.
 *
 * @param transverse GM about the longitudinal axis (m)
 * @param longitudinal GM about the transverse axis (m)
 * @param product the negative of the matrix's off-diagonal element (m)
 */
record MetacentricMatrix(double transverse, double longitudinal, double product) {

    /** From second moments over a divisor, plus a multiple of the unit matrix. */
    static MetacentricMatrix of(SecondMoments moments, double divisor, double height) {
        return new MetacentricMatrix(
                moments.transverse() / divisor + height,
                moments.longitudinal() / divisor + height,
                moments.product() / divisor);
    }

    MetacentricMatrix minus(MetacentricMatrix o) {
        return new MetacentricMatrix(transverse - o.transverse, longitudinal - o.longitudinal, product - o.product);
    }

    /** The smaller eigenvalue: the least over all axes (m). */
    double least() {
        return (transverse + longitudinal) / 2 - Math.hypot((transverse - longitudinal) / 2, product);
    }

    /** Direction of the axis of the least, from x towards y, in [0, 180) (degrees). */
    double leastAzimuth() {
        double ofGreatest = Math.atan2(-2 * product, transverse - longitudinal) / 2;
        double degrees = Math.toDegrees(ofGreatest) + 90;
        double folded = degrees - 180 * Math.floor(degrees / 180);
        return transverse == longitudinal && product == 0 ? 0 : folded;
    }
}
