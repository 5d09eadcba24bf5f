package org.evendraft.stability;

import java.util.List;
import java.util.Map;
import org.evendraft.platform.Opening;
import org.evendraft.platform.Situation;
import org.jspecify.annotations.Nullable;

/**
 * A platform with spaces open to the sea. Component names are those of the JSON answer.
 *
 * @param damageCase id of the case
 * @param why where the case comes from
 * @param situation by which criteria it is judged
 * @param flooded ids of the tanks and compartments open to the sea
 * @param lostContent what the flooded tanks held and is lost to the sea (t)
 * @param outcome what becomes of the platform
 * @param reason why it does not float, in a sentence
 * @param floating the exact position, without wind; null where it does not float
 * @param openings every opening over the water there
 * @param criteria the criteria of the situation about their worst axes; none where it does not float
 */
public record DamageResult(
        String damageCase,
        String why,
        Situation situation,
        List<String> flooded,
        double lostContent,
        Outcome outcome,
        @Nullable String reason,
        @Nullable DamagedPosition floating,
        List<OpeningHeight> openings,
        List<CriterionResult> criteria) {

    /** Copies the lists. */
    public DamageResult {
        flooded = List.copyOf(flooded);
        openings = List.copyOf(openings);
        criteria = List.copyOf(criteria);
    }

    /** What becomes of a damaged platform. */
    public enum Outcome {
        /** It floats. */
        AFLOAT,
        /** What is left of its buoyancy does not carry it. */
        SINKS,
        /** No stable position within 60° of upright. */
        CAPSIZES,
        /** No position was found to the accuracy promised. */
        UNRESOLVED
    }

    /**
     * The exact position of a damaged platform.
     *
     * @param draft at the origin (m)
     * @param heelAngle starboard down positive (degrees)
     * @param trimAngle bow down positive (degrees)
     * @param inclination between the platform's and the true vertical (degrees)
     * @param mass mass afloat, what was lost taken off (t)
     * @param marks reading of each draft mark (m)
     */
    public record DamagedPosition(
            double draft,
            double heelAngle,
            double trimAngle,
            double inclination,
            double mass,
            Map<String, Double> marks) {}

    /**
     * An opening over the water.
     *
     * @param opening its id
     * @param closing how it can be closed
     * @param height its height over the water, negative under it (m)
     */
    public record OpeningHeight(String opening, Opening.Closing closing, double height) {}

    /** Whether it floats and no criterion is broken. */
    public boolean survives() {
        return outcome == Outcome.AFLOAT && criteria.stream().noneMatch(CriterionResult::isBroken);
    }
}
