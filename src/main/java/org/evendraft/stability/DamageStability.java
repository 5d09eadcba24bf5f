package org.evendraft.stability;

import java.util.List;
import java.util.OptionalDouble;
import org.evendraft.platform.DamageCase;
import org.evendraft.platform.Platform;
import org.evendraft.stability.DamageResult.DamagedPosition;
import org.evendraft.stability.DamageResult.OpeningHeight;
import org.evendraft.stability.DamageResult.Outcome;
import org.evendraft.stability.Equilibrium.Afloat;

/**
 * Judges a platform with spaces open to the sea by the method of lost buoyancy: their volume, by its permeability, no longer keeps
 * the platform afloat, and what the flooded tanks held is lost. Mass and centre of gravity of the rest stay. Nothing is pumped,
 * counter-flooded or held by moorings (MODU Code 3.4).
 */
public final class DamageStability {
    private DamageStability() {}

    /**
     * What becomes of a platform in a damage case.
     *
     * @param intact the platform before
     * @param why where the case comes from, in a sentence
     * @param modeWind wind speed for criteria that give none of their own (m/s)
     */
    public static DamageResult judge(LoadedPlatform intact, DamageCase damage, String why, OptionalDouble modeWind) {
        LoadedPlatform damaged = intact.withFlooded(damage.flooded());
        Equilibrium found = damaged.floatingPosition();
        double lost = intact.mass() - damaged.mass();
        if (!(found instanceof Afloat afloat)) {
            return new DamageResult(
                    damage.id(),
                    why,
                    damage.situation(),
                    damage.flooded(),
                    lost,
                    outcome(found),
                    Evaluation.reason(found),
                    null,
                    List.of(),
                    List.of());
        }
        Platform platform = damaged.prepared().platform();
        Waterplane at = afloat.waterplane();
        return new DamageResult(
                damage.id(),
                why,
                damage.situation(),
                damage.flooded(),
                lost,
                Outcome.AFLOAT,
                null,
                position(damaged, at),
                platform.openings().stream()
                        .map(o -> new OpeningHeight(o.id(), o.closing(), at.freeboard(o.position())))
                        .toList(),
                new AllAround(damaged, Slopes.of(at), modeWind)
                        .results(platform.stabilityRules().byAxis(damage.situation()), damage.id()));
    }

    private static DamagedPosition position(LoadedPlatform damaged, Waterplane at) {
        return new DamagedPosition(
                at.draft(),
                at.heelAngle(),
                at.trimAngle(),
                Math.toDegrees(Slopes.of(at).inclination()),
                damaged.mass(),
                Evaluation.marks(damaged.prepared(), at));
    }

    private static Outcome outcome(Equilibrium found) {
        if (found instanceof Equilibrium.Sinks) {
            return Outcome.SINKS;
        }
        return found instanceof Equilibrium.Capsizes ? Outcome.CAPSIZES : Outcome.UNRESOLVED;
    }
}
