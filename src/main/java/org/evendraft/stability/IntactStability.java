package org.evendraft.stability;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Stream;
import org.evendraft.platform.Criterion;
import org.evendraft.platform.GmBound;
import org.evendraft.platform.Mode;
import org.evendraft.platform.Situation;
import org.evendraft.platform.StabilityRules;
import org.evendraft.stability.Equilibrium.Afloat;
import org.jspecify.annotations.Nullable;

/** Judges the intact platform by the criteria of its rules, over all horizontal axes. */
public final class IntactStability {
    private IntactStability() {}

    /**
     * The intact criteria, each about its worst axis.
     *
     * @param loaded the platform
     * @param afloat where it floats
     * @param mode the mode in force, whose wind and least GM count
     * @param windSpeed wind in place of the mode's (m/s)
     */
    public static List<CriterionResult> judge(
            LoadedPlatform loaded, Afloat afloat, Optional<Mode> mode, OptionalDouble windSpeed) {
        StabilityRules rules = loaded.prepared().platform().stabilityRules();
        List<Criterion> byAxis = rules.byAxis(Situation.INTACT);
        OptionalDouble wind = WindSpeed.counted(windSpeed, mode);
        AllAround around = new AllAround(loaded, Slopes.of(afloat.waterplane()), wind);
        return Stream.concat(
                        metacentric(rules, mode, loaded.evenKeel().gm()).stream(),
                        around.results(byAxis, null).stream())
                .toList();
    }

    /** The least GM over all axes by the rules, and the least GMs of the mode. */
    static List<CriterionResult> metacentric(StabilityRules rules, Optional<Mode> mode, ConditionResult.Gm gm) {
        List<CriterionResult> results = new ArrayList<>();
        rules.ofLeastGm()
                .forEach(c -> results.add(atLeast(
                        c.name(),
                        c.clause(),
                        gm.least().corrected(),
                        c.bound(),
                        gm.least().azimuth())));
        Optional<GmBound> bound = mode.flatMap(Mode::minGm);
        bound.ifPresent(b -> {
            b.transverse()
                    .ifPresent(least -> results.add(
                            ofMode("minGm.transverse", gm.transverse().corrected(), least, 0)));
            b.longitudinal()
                    .ifPresent(least -> results.add(
                            ofMode("minGm.longitudinal", gm.longitudinal().corrected(), least, 90)));
        });
        return results;
    }

    private static CriterionResult ofMode(String name, double value, double bound, double azimuth) {
        return atLeast(name, "limit of the mode", value, bound, azimuth);
    }

    private static CriterionResult atLeast(
            String name, String clause, double value, double bound, @Nullable Double azimuth) {
        return new CriterionResult(
                name,
                clause,
                null,
                value,
                bound,
                value - bound,
                value >= bound,
                azimuth,
                null,
                null,
                "corrected GM on even keel");
    }
}
