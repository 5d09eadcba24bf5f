package org.evendraft.stability;

import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import org.evendraft.platform.Criterion;
import org.evendraft.platform.Platform;

/** Judges criteria about one axis. */
final class AxisJudge {
    private static final Finding NO_REST = Finding.broken("the platform finds no rest under the wind within the curve");

    private static final Finding NO_HEELING =
            Finding.notJudged("no heeling moment about this axis: no wind, or no windage that meets it");

    /** The arm next to its zero tells nothing (rad). */
    private static final double FIRST_DEGREE = Math.toRadians(1);

    private final AxisStability axis;
    private final OptionalDouble modeWind;

    /** @param modeWind wind speed of the mode, or the one asked for (m/s) */
    AxisJudge(AxisStability axis, OptionalDouble modeWind) {
        this.axis = axis;
        this.modeWind = modeWind;
    }

    /** What each criterion comes to on a curve. */
    static List<Finding> findings(
            List<Criterion> criteria, RightingArms arms, Platform platform, OptionalDouble modeWind) {
        if (!arms.exists()) {
            Finding none = Finding.broken("about this axis the trim finds no stable rest where the platform floats");
            return criteria.stream().map(c -> none).toList();
        }
        return HeelStates.settled(() -> {
            AxisJudge judge = new AxisJudge(new AxisStability(arms, platform), modeWind);
            return criteria.stream().map(judge::judge).toList();
        });
    }

    /** The wind that a criterion counts (m/s); empty when it is that of a mode and none is known. */
    static OptionalDouble wind(Criterion criterion, OptionalDouble modeWind) {
        return criterion.windSpeed().isPresent() ? criterion.windSpeed() : modeWind;
    }

    /** What a criterion comes to about the axis; not for the least GM, which is found over all axes at once. */
    Finding judge(Criterion criterion) {
        OptionalDouble speed = wind(criterion, modeWind);
        if (speed.isEmpty()) {
            return Finding.notJudged("no wind speed: the condition's mode gives none, and none was asked for");
        }
        double wind = speed.getAsDouble();
        return switch (criterion.measure()) {
            case AREA_RATIO -> areaRatio(criterion, wind);
            case LEAST_ARM -> leastArm(wind);
            case INCLINATION -> inclination(wind);
            case RANGE -> range(criterion, wind);
            case ARM_RATIO -> armRatio(criterion, wind);
            case OPENING_HEIGHT -> openingHeight(criterion, wind);
            case LEAST_GM -> throw new IllegalArgumentException("least GM is not a matter of one axis");
        };
    }

    private Finding areaRatio(Criterion criterion, double wind) {
        if (!axis.isHeeledBy(wind)) {
            return NO_HEELING;
        }
        if (!axis.arms().reachesUpright()) {
            return Finding.broken("the platform has no rest upright about this axis, from where areas count");
        }
        AxisStability.Place limit = axis.limit(criterion, wind);
        if (limit.angleRad() <= 0) {
            return Finding.broken("upright already, " + limit.what());
        }
        return Finding.of(axis.areaRatio(wind, limit.angleRad()), limit.angleRad(), "to " + limit.what());
    }

    /**
     * The arm shall stay over 0 between rest and second intercept. It is 0 at the rest itself, so the first degree beyond is left out. Counted
     * from the platform's own rest where its upright position is stable, for a list is no lack of stability; else from upright.
     */
    private Finding leastArm(double wind) {
        if (!axis.isHeeledBy(wind)) {
            return NO_HEELING;
        }
        OptionalDouble own = axis.rest(0);
        if (own.isEmpty() || axis.rest(wind).isEmpty()) {
            return NO_REST;
        }
        RightingArms arms = axis.arms();
        double from = isUnstableUpright(arms) ? 0 : own.getAsDouble();
        OptionalDouble second = axis.secondIntercept(wind);
        AxisStability.Place end = axis.end();
        double to = second.orElse(end.angleRad());
        double least = arms.greatest(at -> -arms.arm(at), Math.min(to, from + FIRST_DEGREE), to);
        String what = second.isPresent() ? "the second intercept" : end.what();
        return Finding.of(arms.arm(arms.at(least)), least, "from a degree beyond its rest to " + what);
    }

    private static boolean isUnstableUpright(RightingArms arms) {
        return arms.reachesUpright()
                && arms.endRad() > FIRST_DEGREE
                && arms.arm(arms.at(FIRST_DEGREE)) < arms.arm(arms.at(0));
    }

    private Finding inclination(double wind) {
        OptionalDouble rest = axis.rest(wind);
        if (rest.isEmpty()) {
            return NO_REST;
        }
        double leaning = axis.arms().at(rest.getAsDouble()).slopes().inclination();
        return Finding.of(Math.toDegrees(leaning), rest.getAsDouble(), "inclination at rest under the wind");
    }

    private Finding range(Criterion criterion, double wind) {
        OptionalDouble rest = axis.rest(wind);
        if (rest.isEmpty()) {
            return NO_REST;
        }
        AxisStability.Place limit = axis.limit(criterion, wind);
        return Finding.of(
                Math.toDegrees(limit.angleRad() - rest.getAsDouble()), limit.angleRad(), "to " + limit.what());
    }

    private Finding armRatio(Criterion criterion, double wind) {
        if (!axis.isHeeledBy(wind)) {
            return NO_HEELING;
        }
        OptionalDouble rest = axis.rest(wind);
        if (rest.isEmpty()) {
            return NO_REST;
        }
        AxisStability.Place limit = axis.limit(criterion, wind);
        if (limit.angleRad() <= rest.getAsDouble()) {
            return Finding.broken("no range beyond the first intercept: " + limit.what());
        }
        double best = axis.bestRatio(wind, rest.getAsDouble(), limit.angleRad());
        return Finding.of(axis.ratio(axis.arms().at(best), wind), best, "within the range to " + limit.what());
    }

    private Finding openingHeight(Criterion criterion, double wind) {
        OptionalDouble rest = axis.rest(wind);
        if (rest.isEmpty()) {
            return NO_REST;
        }
        Optional<AxisStability.Lowest> lowest =
                axis.lowest(criterion.openings(), axis.arms().at(rest.getAsDouble()));
        return lowest.map(found -> Finding.of(
                        found.height(),
                        rest.getAsDouble(),
                        String.format(Locale.ROOT, "opening %s at rest under the wind", found.opening())))
                .orElseGet(() -> Finding.notJudged("the platform lists no opening that counts"));
    }
}
