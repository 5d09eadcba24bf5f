package org.evendraft.platform;

import java.util.OptionalDouble;

/**
 * A requirement of stability, judged about every horizontal axis.
 *
 * @param name its name, unique among those of a platform
 * @param clause where it stands
 * @param situation what is flooded
 * @param measure what is measured
 * @param bound what the measure must reach, or not exceed (unit of the measure)
 * @param windSpeed speed of the wind that heels the platform (m/s), 0 for none; empty for that of the mode
 * @param limitAngle where areas and ranges end
 * @param openings which openings count
 */
public record Criterion(
        String name,
        String clause,
        Situation situation,
        Measure measure,
        double bound,
        OptionalDouble windSpeed,
        LimitAngle limitAngle,
        Openings openings) {

    /** What is measured. */
    public enum Measure {
        /** Area under the righting arms over that under the wind's heeling arms, both from upright to the limit angle; at least. */
        AREA_RATIO,
        /** The least righting arm from where the platform lies to the second intercept (m); over. */
        LEAST_ARM,
        /** The least corrected metacentric height over all axes, on even keel (m); at least. */
        LEAST_GM,
        /** Inclination where the platform lies under the wind, its free trim counted (degrees); at most. */
        INCLINATION,
        /** From where it lies under the wind to the limit angle (degrees); at least. */
        RANGE,
        /** The greatest ratio of righting to heeling arm at one angle within that range; at least. */
        ARM_RATIO,
        /** Height over the water, where the platform lies under the wind, of the lowest opening that counts (m); at least. */
        OPENING_HEIGHT;

        /** Whether the bound is the greatest value allowed, not the least. */
        public boolean isAtMost() {
            return this == INCLINATION;
        }

        /** Whether the value must lie beyond the bound itself. */
        public boolean isStrict() {
            return this == LEAST_ARM;
        }
    }

    /** Where areas and ranges end. */
    public enum LimitAngle {
        /** Where the first opening that counts meets the water. */
        DOWNFLOODING,
        /** Where righting and heeling arms cross for the second time. */
        SECOND_INTERCEPT,
        /** The lesser of both. */
        LESSER
    }

    /** Which openings count. */
    public enum Openings {
        /** Those that nothing closes. */
        NOT_WEATHERTIGHT,
        /** Those and the ones that are only weathertight. */
        NOT_WATERTIGHT;

        /** Whether an opening counts. */
        public boolean count(Opening opening) {
            return switch (opening.closing()) {
                case NONE -> true;
                case WEATHERTIGHT -> this == NOT_WATERTIGHT;
                case WATERTIGHT -> false;
            };
        }
    }
}
