package org.evendraft.ballast.loadplan;

import java.util.List;
import java.util.Map;
import org.evendraft.platform.Condition;
import org.evendraft.platform.FaultyDocumentException;
import org.evendraft.platform.PreparedPlatform;
import org.evendraft.stability.ConditionResult;
import org.evendraft.stability.ConditionResult.Gm;
import org.evendraft.stability.ConditionResult.LimitResult;
import org.evendraft.stability.Evaluation;
import org.evendraft.stability.LoadedPlatform;

/**
 * Where the platform lies between events. Component names are those of the JSON answer.
 *
 * @param mass mass afloat (t)
 * @param draft draft at the origin (m)
 * @param heelAngle starboard down positive (degrees)
 * @param trimAngle bow down positive (degrees)
 * @param marks reading of each draft mark (m)
 * @param gm metacentric heights on even keel
 * @param upright whether the least corrected GM on even keel is positive
 * @param wind the wind that it lies in; speed 0 for none
 * @param limits every limit in force, judged where it lies in that wind
 * @param warnings sentences on what deserves attention, of the platform without wind
 */
public record Position(
        double mass,
        double draft,
        double heelAngle,
        double trimAngle,
        Map<String, Double> marks,
        Gm gm,
        boolean upright,
        SteadyWind wind,
        List<LimitResult> limits,
        List<String> warnings) {

    /** Copies the lists. */
    public Position {
        limits = List.copyOf(limits);
        warnings = List.copyOf(warnings);
    }

    static Position of(PreparedPlatform prepared, Condition condition, ConditionResult calm, SteadyWind wind) {
        LoadedPlatform loaded = LoadedPlatform.of(prepared, condition);
        Stance stance = Stance.of(loaded, wind);
        return new Position(
                calm.mass(),
                stance.waterplane().draft(),
                stance.waterplane().heelAngle(),
                stance.waterplane().trimAngle(),
                Evaluation.marks(prepared, stance.waterplane()),
                stance.gm(),
                calm.floating().upright(),
                wind,
                wind.blows() ? Evaluation.limits(loaded, condition, stance.waterplane()) : calm.limits(),
                calm.warnings());
    }

    /**
     * The result of a condition in still water.
     *
     * @throws LostException when the platform does not float so
     */
    static ConditionResult calm(PreparedPlatform prepared, Condition condition) {
        try {
            return Evaluation.evaluate(prepared, condition);
        } catch (FaultyDocumentException e) {
            throw new LostException(e.faults().get(0).detail());
        }
    }

    boolean limitsMet() {
        return limits.stream().allMatch(LimitResult::met);
    }
}
