package org.evendraft.stability;

import java.util.List;
import java.util.OptionalDouble;
import java.util.stream.IntStream;
import org.evendraft.platform.Criterion;
import org.jspecify.annotations.Nullable;

/** Judges criteria about axes all around and closer about the worst of them. Immutable. */
final class AllAround {
    /** Criteria are judged to this angle (degrees). */
    static final double GREATEST_ANGLE = 60;
    /** Between the nodes of their curves (degrees). */
    static final double ANGLE_STEP = 2;
    /** Between axes, before the worst is looked at more closely (degrees). */
    static final double AZIMUTH_STEP = 10;

    private static final double GOLDEN = (Math.sqrt(5) - 1) / 2;
    /** Divides the twenty degrees about the worst axis down to half a degree. */
    private static final int CLOSER_LOOKS = 8;

    private final LoadedPlatform loaded;
    private final Slopes near;
    private final OptionalDouble modeWind;

    /**
     * @param near slopes at which the platform floats, or nearly
     * @param modeWind wind speed of the mode, or the one asked for (m/s)
     */
    AllAround(LoadedPlatform loaded, Slopes near, OptionalDouble modeWind) {
        this.loaded = loaded;
        this.near = near;
        this.modeWind = modeWind;
    }

    /**
     * A criterion about one axis.
     *
     * @param azimuth direction of the axis (degrees)
     */
    private record Seen(double azimuth, Finding finding) {}

    /** Axes all around (degrees). */
    static List<Double> azimuths() {
        return IntStream.range(0, (int) Math.round(360 / AZIMUTH_STEP))
                .mapToObj(i -> i * AZIMUTH_STEP)
                .toList();
    }

    /** What each criterion comes to about an axis (degrees). */
    List<Finding> findings(List<Criterion> criteria, double azimuth) {
        RightingCurve.Request curve =
                new RightingCurve.Request(azimuth, GREATEST_ANGLE, ANGLE_STEP, true, LiquidTreatment.FREE);
        return AxisJudge.findings(
                criteria,
                RightingArms.fromRest(loaded, curve, near),
                loaded.prepared().platform(),
                modeWind);
    }

    /** The criteria about their worst axes; the least GM is not among them. */
    List<CriterionResult> results(List<Criterion> criteria, @Nullable String damageCase) {
        List<List<Finding>> seen =
                azimuths().parallelStream().map(a -> findings(criteria, a)).toList();
        return IntStream.range(0, criteria.size())
                .parallel()
                .mapToObj(i -> result(
                        criteria.get(i), seen.stream().map(list -> list.get(i)).toList(), damageCase))
                .toList();
    }

    /** The criterion about its worst axis, from what it comes to about each of the axes all around. */
    private CriterionResult result(Criterion criterion, List<Finding> coarse, @Nullable String damageCase) {
        Seen worst = IntStream.range(0, coarse.size())
                .mapToObj(i -> new Seen(azimuths().get(i), coarse.get(i)))
                .reduce((a, b) -> b.finding().margin(criterion) < a.finding().margin(criterion) ? b : a)
                .orElseThrow();
        Seen closer = worst.finding().value().isPresent() ? closer(criterion, worst) : worst;
        double azimuth = (closer.azimuth() + 360) % 360;
        return closer.finding().result(criterion, damageCase, azimuth, AxisJudge.wind(criterion, modeWind));
    }

    /** The worst axis within one step of another, by golden section. */
    private Seen closer(Criterion criterion, Seen worst) {
        double low = worst.azimuth() - AZIMUTH_STEP;
        double high = worst.azimuth() + AZIMUTH_STEP;
        Seen best = worst;
        Seen left = look(criterion, high - GOLDEN * (high - low));
        Seen right = look(criterion, low + GOLDEN * (high - low));
        for (int i = 0; i < CLOSER_LOOKS; i++) {
            boolean leftWorse =
                    left.finding().margin(criterion) < right.finding().margin(criterion);
            Seen worse = leftWorse ? left : right;
            best = worse.finding().margin(criterion) < best.finding().margin(criterion) ? worse : best;
            if (leftWorse) {
                high = right.azimuth();
                right = left;
                left = look(criterion, high - GOLDEN * (high - low));
            } else {
                low = left.azimuth();
                left = right;
                right = look(criterion, low + GOLDEN * (high - low));
            }
        }
        return best;
    }

    private Seen look(Criterion criterion, double azimuth) {
        return new Seen(azimuth, findings(List.of(criterion), azimuth).get(0));
    }
}
