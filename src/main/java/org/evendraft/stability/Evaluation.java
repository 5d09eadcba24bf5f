package org.evendraft.stability;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import org.evendraft.geometry.SecondMoments;
import org.evendraft.geometry.Vec3;
import org.evendraft.platform.Condition;
import org.evendraft.platform.DraftMark;
import org.evendraft.platform.FaultyDocumentException;
import org.evendraft.platform.PreparedPlatform;
import org.evendraft.stability.ConditionResult.Estimate;
import org.evendraft.stability.ConditionResult.Floating;
import org.evendraft.stability.ConditionResult.LimitResult;
import org.evendraft.stability.ConditionResult.TankResult;
import org.evendraft.stability.Equilibrium.Afloat;

/** Computes all that is asked of a condition. */
public final class Evaluation {
    private Evaluation() {}

    /**
     * The result of a condition.
     *
     * @throws FaultyDocumentException when the platform would sink or capsize, or no position can be computed to its accuracy
     */
    public static ConditionResult evaluate(PreparedPlatform prepared, Condition condition) {
        LoadedPlatform loaded = LoadedPlatform.of(prepared, condition);
        Afloat afloat = afloat(loaded);
        EvenKeel evenKeel = loaded.evenKeel();
        Estimate estimate = estimate(loaded, evenKeel);
        List<LimitResult> limits = Limits.judge(prepared, condition, loaded, evenKeel, afloat.waterplane());
        return new ConditionResult(
                loaded.mass(),
                loaded.centreOfGravity(),
                evenKeel.draft(),
                evenKeel.km(),
                evenKeel.gm(),
                estimate,
                floating(prepared, evenKeel, afloat),
                loaded.tanks().stream().map(t -> tankResult(loaded, t)).toList(),
                limits,
                Warnings.of(prepared.platform(), condition, loaded, evenKeel, afloat, limits, estimate));
    }

    /**
     * The floating position of a loaded platform.
     *
     * @throws FaultyDocumentException when there is none
     */
    public static Afloat afloat(LoadedPlatform loaded) {
        Equilibrium found = loaded.floatingPosition();
        if (found instanceof Afloat afloat) {
            return afloat;
        }
        throw FaultyDocumentException.impossible("", reason(found));
    }

    /**
     * Every limit in force, judged where the platform lies at a waterplane that need not be its own rest, as under a wind.
     *
     * @param loaded the platform in the condition, which can float
     * @param at where it lies
     */
    public static List<LimitResult> limits(LoadedPlatform loaded, Condition condition, Waterplane at) {
        return Limits.judge(loaded.prepared(), condition, loaded, loaded.evenKeel(), at);
    }

    /** Why a platform does not float, in a sentence. */
    static String reason(Equilibrium found) {
        if (found instanceof Equilibrium.Sinks sinks && sinks.mass() <= 0) {
            return String.format(Locale.ROOT, "The corrections leave a mass of %.1f t: nothing floats.", sinks.mass());
        }
        if (found instanceof Equilibrium.Sinks sinks) {
            return String.format(
                    Locale.ROOT,
                    "The platform sinks: its mass of %.1f t is more than the %.1f t that its whole hull displaces.",
                    sinks.mass(),
                    sinks.buoyancy());
        }
        if (found instanceof Equilibrium.Unresolved unresolved) {
            return String.format(
                    Locale.ROOT,
                    "No floating position was found to the accuracy promised: G stays %.2g m off the vertical through B.",
                    unresolved.residualArm());
        }
        return "The platform capsizes: no stable floating position within 60° of upright.";
    }

    private static Estimate estimate(LoadedPlatform loaded, EvenKeel evenKeel) {
        Vec3 off = loaded.centreOfGravity().minus(evenKeel.centreOfBuoyancy());
        double gmT = evenKeel.gm().transverse().corrected();
        double gmL = evenKeel.gm().longitudinal().corrected();
        return new Estimate(
                gmT > 0 ? Math.toDegrees(Math.atan(-off.y() / gmT)) : null,
                gmL > 0 ? Math.toDegrees(Math.atan(off.x() / gmL)) : null);
    }

    private static Floating floating(PreparedPlatform prepared, EvenKeel evenKeel, Afloat afloat) {
        Waterplane at = afloat.waterplane();
        return new Floating(
                at.draft(),
                at.heelAngle(),
                at.trimAngle(),
                afloat.displacedVolume(),
                afloat.centreOfBuoyancy(),
                marks(prepared, at),
                evenKeel.gm().least().corrected() > 0,
                afloat.stable());
    }

    /** What each draft mark reads (m). */
    public static Map<String, Double> marks(PreparedPlatform prepared, Waterplane at) {
        Map<String, Double> readings = new LinkedHashMap<>();
        for (DraftMark mark : prepared.platform().draftMarks()) {
            readings.put(mark.id(), at.heightAt(mark.x(), mark.y()) - mark.zero());
        }
        return readings;
    }

    private static TankResult tankResult(LoadedPlatform loaded, TankContents t) {
        SecondMoments moments = loaded.freeSurfaceMoments(t);
        return new TankResult(
                t.tank().id(),
                t.liquid().level(),
                t.liquid().volume(),
                t.mass(),
                t.fraction(),
                t.state(),
                t.liquid().centre(),
                moments.transverse(),
                moments.longitudinal());
    }
}
