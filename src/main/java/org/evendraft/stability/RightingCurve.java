package org.evendraft.stability;

import java.util.List;
import org.evendraft.platform.Faults;
import org.jspecify.annotations.Nullable;

/**
 * Righting arms about one axis. Component names are those of the JSON answer.
 *
 * @param azimuth direction of the axis of rotation, from x towards y, right-hand rule: 0 turns starboard down, 90 bow down (degrees)
 * @param freeTrim whether the trim about the perpendicular axis is at rest, or else fixed at 0
 * @param liquids how liquids in slack tanks are counted
 * @param points the curve
 * @param endsAt the last angle at which the curve exists, where that is before the angle asked for (degrees)
 * @param endReason why it ends there
 * @param firstIntercept the angle, from 0 on, at which the arm passes 0 upwards: where the platform lies; 0 when it lies at or before upright; null if nowhere (degrees)
 * @param secondIntercept the next angle at which the arm passes 0 downwards, null if not on the curve (degrees)
 * @param range from the first intercept to the second, or to the end of the curve (degrees)
 * @param greatest the point of the greatest arm
 * @param area under the arms from the first intercept to the second or the end (m·rad)
 * @param areaTolerance bound of the error of the area (m·rad)
 */
public record RightingCurve(
        double azimuth,
        boolean freeTrim,
        LiquidTreatment liquids,
        List<RightingPoint> points,
        @Nullable Double endsAt,
        @Nullable String endReason,
        @Nullable Double firstIntercept,
        @Nullable Double secondIntercept,
        @Nullable Double range,
        @Nullable RightingPoint greatest,
        @Nullable Double area,
        double areaTolerance) {

    /** Copies the list. */
    public RightingCurve {
        points = List.copyOf(points);
    }

    /**
     * What curve is wanted.
     *
     * @param azimuth direction of the axis (degrees)
     * @param to greatest angle, over 0 to {@link #GREATEST_ANGLE} (degrees)
     * @param step between points (degrees)
     * @param freeTrim whether the trim about the perpendicular axis is free
     * @param liquids how liquids are counted
     */
    public record Request(double azimuth, double to, double step, boolean freeTrim, LiquidTreatment liquids) {
        /** Curves are not followed further (degrees). */
        public static final double GREATEST_ANGLE = 80;
        /** How far a curve usually goes (degrees). */
        public static final double USUAL_ANGLE = 60;

        private static final double LEAST_STEP = 0.01;

        /** To 60° by 1°, trim and liquids free. */
        public static Request usual(double azimuth) {
            return new Request(azimuth, USUAL_ANGLE, 1, true, LiquidTreatment.FREE);
        }

        /**
         * A request with its angles checked.
         *
         * @param faults is told of all that is out of range; the request must not be used then
         */
        public static Request checked(
                double azimuth, double to, double step, boolean freeTrim, LiquidTreatment liquids, Faults faults) {
            if (!(Math.abs(azimuth) <= 360)) {
                faults.meaning("", "azimuth must lie within 360°, not " + azimuth);
            }
            if (!(to > 0) || to > GREATEST_ANGLE) {
                faults.meaning("", "to must be over 0 and at most " + GREATEST_ANGLE + "°, not " + to);
            }
            if (!(step >= LEAST_STEP) || step > to) {
                faults.meaning(
                        "", "step must be at least " + LEAST_STEP + "° and at most the greatest angle, not " + step);
            }
            return new Request(azimuth, to, step, freeTrim, liquids);
        }

        /** The curve on which criteria are judged: as far and as fine as this, or as they need. */
        Request forCriteria() {
            return new Request(
                    azimuth,
                    Math.max(to, AllAround.GREATEST_ANGLE),
                    Math.min(step, AllAround.ANGLE_STEP),
                    freeTrim,
                    liquids);
        }

        /** The same about another axis (degrees). */
        public Request about(double otherAzimuth) {
            return new Request(otherAzimuth, to, step, freeTrim, liquids);
        }
    }
}
