package org.evendraft.ballast.loadplan;

import java.util.Locale;
import org.evendraft.platform.FaultyDocumentException;
import org.evendraft.stability.ConditionResult.Gm;
import org.evendraft.stability.Equilibrium.Afloat;
import org.evendraft.stability.Evaluation;
import org.evendraft.stability.LoadedPlatform;
import org.evendraft.stability.Waterplane;
import org.evendraft.stability.WindHeel;

/**
 * How a platform lies in a wind.
 *
 * @param waterplane draft, heel and trim, liquids free
 * @param gm metacentric heights on even keel
 */
record Stance(Waterplane waterplane, Gm gm) {

    /**
     * Where the platform comes to rest.
     *
     * @throws LostException when it does not
     */
    static Stance of(LoadedPlatform loaded, SteadyWind wind) {
        Afloat calm = calm(loaded);
        Waterplane at = wind.blows()
                ? WindHeel.rest(loaded, calm, wind.azimuth(), wind.speed()).orElseThrow(() -> laidOver(wind))
                : calm.waterplane();
        return new Stance(at, loaded.evenKeel().gm());
    }

    private static Afloat calm(LoadedPlatform loaded) {
        try {
            return Evaluation.afloat(loaded);
        } catch (FaultyDocumentException e) {
            throw new LostException(e.faults().get(0).detail());
        }
    }

    private static LostException laidOver(SteadyWind wind) {
        return new LostException(String.format(
                Locale.ROOT,
                "The %s lays the platform over: its righting arms withstand it at no angle.",
                wind.words()));
    }
}
