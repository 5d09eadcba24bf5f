package org.evendraft.stability;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.TreeSet;
import org.evendraft.platform.Criterion;
import org.evendraft.platform.DamageCase;
import org.evendraft.platform.Mode;
import org.evendraft.platform.PreparedPlatform;
import org.evendraft.platform.Situation;
import org.evendraft.platform.StabilityRules;
import org.jspecify.annotations.Nullable;

/**
 * Finds the greatest KG at one draft for which every criterion holds about every axis, whole and in every damage case: one axis after
 * another lowers the limit that the ones before have left, by bisection to a millimetre, or leaves it. Then the axes about the
 * governing one are looked at more closely in the same way. A criterion that holds at a KG mostly holds at every lower one, but not
 * always, for a platform that is about to capsize has short curves; so each is also tried at lower KGs, and where it fails there the search
 * goes on below. Flooded tanks are taken as empty before, which loses the most buoyancy. One thread at a time.
 */
final class KgSearch {
    /** The limit is found to this (m). */
    static final double TOLERANCE = 1e-3;

    /** Bisection ends here (m). */
    private static final double CLOSENESS = TOLERANCE / 2;

    /** At which parts of a limit, from the keel, criteria are tried: close together for the whole hull, whose curves are longest. */
    private static final double[] TRIED_INTACT = {1, 0.9, 0.8, 0.7, 0.6, 0.5};

    private static final double[] TRIED_DAMAGED = {1, 0.9};

    /** First step down from a KG that breaks a criterion (m), doubled until one holds. */
    private static final double FIRST_STEP = 0.25;

    private static final int MOST_LOOKS = 5;

    /** How far from the governing axis others are looked at, in parts of the step between axes. */
    private static final double[] CLOSER = {-0.5, 0.5, -0.25, 0.25, -0.125, 0.125};

    private final PreparedPlatform prepared;
    private final KgRequest request;
    private final double draft;
    private final Progress progress;
    private final LoadedPlatform floating;
    private final EvenKeel evenKeel;
    private final Set<String> notJudged = new TreeSet<>();
    private double limit;
    private double breaksAt;
    private Governing governing;
    private @Nullable String lastCase;
    private double lastKg;
    private Optional<Slopes> lastPosition = Optional.empty();

    /**
     * What sets the limit.
     *
     * @param criterion its name
     * @param azimuth its axis (degrees); null where the criterion is of no axis
     */
    private record Governing(
            String criterion,
            String clause,
            @Nullable Hull hull,
            @Nullable Double azimuth) {}

    /**
     * A hull to be judged: whole, or damaged.
     *
     * @param damageCase the damage case; null for the whole one
     * @param criteria by what it is judged
     * @param afloat the platform on it, at any KG
     */
    private record Hull(@Nullable String damageCase, List<Criterion> criteria, LoadedPlatform afloat) {}

    KgSearch(PreparedPlatform prepared, KgRequest request, double draft, Progress progress) {
        this.prepared = prepared;
        this.request = request;
        this.draft = draft;
        this.progress = progress;
        this.floating = LoadedPlatform.upright(
                prepared, request.waterDensity(), draft, prepared.hull().lowest());
        this.evenKeel = floating.evenKeel();
        this.governing = new Governing("none", "", null, null);
    }

    /** The limit. */
    KgLimit find() {
        boundByGm();
        List<Hull> hulls = hulls();
        int done = 0;
        for (Hull hull : hulls) {
            for (double azimuth : AllAround.azimuths()) {
                String doing = hull.damageCase() == null ? "intact" : "damage case " + hull.damageCase();
                progress.reached(
                        done++ / (double) (hulls.size() * AllAround.azimuths().size()), doing);
                lowerBy(hull, azimuth);
            }
        }
        lookCloser();
        return answer();
    }

    private void boundByGm() {
        double lowest = prepared.hull().lowest();
        Optional<Mode> mode = Optional.of(request.mode());
        StabilityRules rules = prepared.platform().stabilityRules();
        limit = lowest + evenKeel.gm().least().corrected();
        governing = new Governing("positiveGm", "a platform of no GM does not float upright", null, null);
        for (CriterionResult gm : IntactStability.metacentric(rules, mode, evenKeel.gm())) {
            if (gm.margin() != null && lowest + gm.margin() < limit) {
                limit = lowest + gm.margin();
                governing = new Governing(gm.criterion(), gm.clause(), null, gm.azimuth());
            }
        }
        breaksAt = limit + CLOSENESS;
        if (limit < lowest) {
            limit = Double.NEGATIVE_INFINITY;
        }
    }

    private List<Hull> hulls() {
        StabilityRules rules = prepared.platform().stabilityRules();
        List<Hull> hulls = new ArrayList<>();
        List<Criterion> intact = rules.byAxis(Situation.INTACT);
        if (!intact.isEmpty()) {
            hulls.add(new Hull(null, intact, floating));
        }
        for (DamageCase damage : request.damageCases()) {
            List<Criterion> criteria = rules.byAxis(damage.situation());
            hulls.add(new Hull(damage.id(), criteria, floating.withFlooded(damage.flooded())));
        }
        return hulls;
    }

    /** Lowers the limit to where a hull's criteria hold about an axis, there and at the lower KGs where they are tried. */
    private void lowerBy(Hull hull, double azimuth) {
        double tried = limit;
        for (double part : hull.damageCase() == null ? TRIED_INTACT : TRIED_DAMAGED) {
            double kg =
                    prepared.hull().lowest() + part * (tried - prepared.hull().lowest());
            if (limit > Double.NEGATIVE_INFINITY && kg <= limit && !holds(hull, azimuth, kg)) {
                lowerFrom(hull, azimuth, kg);
            }
        }
    }

    /** Lowers the limit from a KG at which a hull's criteria do not hold about an axis. */
    private void lowerFrom(Hull hull, double azimuth, double broken) {
        double high = broken;
        double low = holding(hull, azimuth, high);
        while (low > Double.NEGATIVE_INFINITY && high - low > CLOSENESS) {
            double middle = (low + high) / 2;
            if (holds(hull, azimuth, middle)) {
                low = middle;
            } else {
                high = middle;
            }
        }
        limit = low;
        breaksAt = high;
        Broken what = broken(hull, azimuth, high).orElseThrow();
        governing = new Governing(what.criterion(), what.clause(), hull, azimuth);
    }

    /** A lower KG for which the criteria hold; −∞ when they do not hold even with G at the lowest point of the hull. */
    private double holding(Hull hull, double azimuth, double from) {
        double lowest = prepared.hull().lowest();
        for (double step = FIRST_STEP; from - step > lowest; step *= 2) {
            if (holds(hull, azimuth, from - step)) {
                return from - step;
            }
        }
        return from > lowest && holds(hull, azimuth, lowest) ? lowest : Double.NEGATIVE_INFINITY;
    }

    private boolean holds(Hull hull, double azimuth, double kg) {
        return broken(hull, azimuth, kg).isEmpty();
    }

    /** What is not kept. */
    private record Broken(String criterion, String clause) {}

    /** The first criterion that a hull breaks about an axis. */
    private Optional<Broken> broken(Hull hull, double azimuth, double kg) {
        LoadedPlatform loaded = hull.afloat().withKg(kg);
        Optional<Slopes> near = position(hull, kg);
        if (near.isEmpty()) {
            return Optional.of(new Broken("afloat", "the damaged platform floats"));
        }
        OptionalDouble wind = WindSpeed.counted(request.windSpeed(), Optional.of(request.mode()));
        List<Finding> findings = new AllAround(loaded, near.get(), wind).findings(hull.criteria(), azimuth);
        for (int i = 0; i < findings.size(); i++) {
            Criterion criterion = hull.criteria().get(i);
            Finding finding = findings.get(i);
            if (!finding.isKept(criterion)) {
                return Optional.of(new Broken(criterion.name(), criterion.clause()));
            }
            if (finding.value().isEmpty()) {
                notJudged.add(criterion.name() + ": " + finding.note());
            }
        }
        return Optional.empty();
    }

    /** Where the platform floats; the position found last is remembered, for axis after axis is judged at the same limit. */
    private Optional<Slopes> position(Hull hull, double kg) {
        if (hull.damageCase() == null) {
            return Optional.of(Slopes.LEVEL);
        }
        if (!hull.damageCase().equals(lastCase) || kg != lastKg) {
            lastCase = hull.damageCase();
            lastKg = kg;
            lastPosition = hull.afloat().withKg(kg).floatingPosition() instanceof Equilibrium.Afloat afloat
                    ? Optional.of(Slopes.of(afloat.waterplane()))
                    : Optional.empty();
        }
        return lastPosition;
    }

    /** Looks at axes about the governing one, and about the one that governs then, until none lowers the limit. */
    private void lookCloser() {
        double before = Double.NaN;
        for (int i = 0; i < MOST_LOOKS && limit != before; i++) {
            before = limit;
            Hull hull = governing.hull();
            Double azimuth = governing.azimuth();
            if (hull == null || azimuth == null) {
                return;
            }
            for (double part : CLOSER) {
                lowerBy(hull, azimuth + part * AllAround.AZIMUTH_STEP);
            }
        }
    }

    private KgLimit answer() {
        Hull hull = governing.hull();
        Double azimuth = governing.azimuth();
        boolean found = limit > Double.NEGATIVE_INFINITY;
        return new KgLimit(
                draft,
                floating.mass(),
                evenKeel.km().transverse(),
                evenKeel.km().longitudinal(),
                found ? Double.valueOf(limit) : null,
                found ? Double.valueOf(breaksAt) : null,
                governing.criterion(),
                governing.clause(),
                hull == null ? null : hull.damageCase(),
                azimuth == null ? null : Double.valueOf((azimuth + 360) % 360),
                List.copyOf(notJudged));
    }
}
