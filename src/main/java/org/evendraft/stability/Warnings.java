package org.evendraft.stability;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.function.Function;
import java.util.stream.Collectors;
import org.evendraft.platform.Condition;
import org.evendraft.platform.DeckArea;
import org.evendraft.platform.Load;
import org.evendraft.platform.Opening;
import org.evendraft.platform.Platform;
import org.evendraft.stability.ConditionResult.Estimate;
import org.evendraft.stability.ConditionResult.LimitResult;

/** What deserves attention in a condition, each in a sentence. */
final class Warnings {
    private final List<String> sentences = new ArrayList<>();

    private void add(String sentence, Object... values) {
        sentences.add(String.format(Locale.ROOT, sentence, values));
    }

    static List<String> of(
            Platform platform,
            Condition condition,
            LoadedPlatform loaded,
            EvenKeel evenKeel,
            Equilibrium.Afloat afloat,
            List<LimitResult> limits,
            Estimate estimate) {
        Warnings warnings = new Warnings();
        boolean upright = Inclination.upright(loaded).energy().leastCurvature() > 0;
        warnings.onStability(upright, evenKeel, afloat, estimate);
        warnings.onLimits(condition, limits, evenKeel);
        warnings.onKg(limits, evenKeel);
        warnings.onTanks(loaded);
        warnings.onLoads(platform, condition);
        warnings.onOpenings(platform, afloat.waterplane());
        return List.copyOf(warnings.sentences);
    }

    private void onStability(boolean upright, EvenKeel evenKeel, Equilibrium.Afloat afloat, Estimate estimate) {
        ConditionResult.LeastGm least = evenKeel.gm().least();
        if (least.corrected() <= 0 && upright) {
            add(
                    "The least corrected GM on even keel is %.3f m (axis %.0f°) with the greatest free-surface moments asked for; with those"
                            + " at the actual levels the platform still floats upright, and the position given is that one.",
                    least.corrected(), least.azimuth());
        } else if (least.corrected() <= 0) {
            add(
                    "The platform does not float upright: its least corrected GM on even keel is %.3f m (axis %.0f°). The position"
                            + " given is an angle of loll, heel %.2f° and trim %.2f°; do not correct it by weights on the high side alone.",
                    least.corrected(),
                    least.azimuth(),
                    afloat.waterplane().heelAngle(),
                    afloat.waterplane().trimAngle());
        }
        if (estimate.heelAngle() == null) {
            add("No estimate of heel: the corrected transverse GM is not positive.");
        }
        if (estimate.trimAngle() == null) {
            add("No estimate of trim: the corrected longitudinal GM is not positive.");
        }
        if (!afloat.stable()) {
            add("The position found is not stable: the least disturbance makes the platform leave it.");
        }
    }

    private void onLimits(Condition condition, List<LimitResult> limits, EvenKeel evenKeel) {
        if (condition.mode().isEmpty()) {
            add("The condition names no mode of operation: no limit of a mode was judged.");
        }
        for (LimitResult limit : limits) {
            Double bound = limit.bound();
            Double margin = limit.margin();
            if (bound == null || margin == null) {
                add(
                        "Limit %s cannot be met: its curve does not reach the even-keel draft of %.2f m.",
                        limit.limit(), evenKeel.draft());
            } else if (!limit.met()) {
                add(
                        "Limit %s is not met: it is %.3f where the bound is %.3f, %.3f beyond it.",
                        limit.limit(), limit.value(), bound, -margin);
            }
        }
    }

    /** The curve of KG holds about every axis, and the limit counts the transverse correction, as the trade does. */
    private void onKg(List<LimitResult> limits, EvenKeel evenKeel) {
        double more = evenKeel.gm().longitudinal().freeSurfaceCorrection()
                - evenKeel.gm().transverse().freeSurfaceCorrection();
        for (LimitResult limit : limits) {
            Double margin = limit.margin();
            if (limit.limit().equals(Limits.ALLOWABLE_KG) && margin != null && margin >= 0 && margin < more) {
                add(
                        "Limit allowableKg is met with the transverse free-surface correction; with the longitudinal one, %.3f m greater, it"
                                + " is not.",
                        more);
            }
        }
    }

    private void onTanks(LoadedPlatform loaded) {
        for (TankContents t : loaded.tanks()) {
            if (t.fraction() > t.tank().greatestFraction() * (1 + 1e-9)) {
                add(
                        "Tank %s is filled to %.1f %%, over its greatest allowed %.1f %%.",
                        t.tank().id(), 100 * t.fraction(), 100 * t.tank().greatestFraction());
            }
        }
    }

    private void onLoads(Platform platform, Condition condition) {
        Map<String, DeckArea> areas =
                platform.deckAreas().stream().collect(Collectors.toMap(DeckArea::id, Function.identity()));
        for (Load load : condition.loads()) {
            DeckArea area = load.area().map(areas::get).orElse(null);
            if (area == null && load.kind() == Load.Kind.DECK && !areas.isEmpty()) {
                add("Deck load %s names no deck area: no limit of an area counts it.", load.name());
            } else if (area != null
                    && !area.contains(load.position().x(), load.position().y())) {
                add(
                        "Load %s names deck area %s but lies outside it, at x = %.2f m, y = %.2f m.",
                        load.name(),
                        area.id(),
                        load.position().x(),
                        load.position().y());
            }
        }
    }

    private void onOpenings(Platform platform, Waterplane waterplane) {
        for (Opening opening : platform.openings()) {
            double freeboard = waterplane.freeboard(opening.position());
            if (opening.closing() != Opening.Closing.WATERTIGHT && freeboard < 0) {
                add("Opening %s lies %.2f m under water and is not watertight.", opening.id(), -freeboard);
            }
        }
    }
}
