package org.evendraft.ballast.loadplan;

import com.fasterxml.jackson.annotation.JsonIgnore;
import java.util.Locale;

/**
 * A steady wind. Component names are those of the JSON.
 *
 * @param speed its speed (m/s)
 * @param azimuth direction of the axis about which it heels the platform, from x towards y: 0 turns starboard down (degrees)
 */
public record SteadyWind(double speed, double azimuth) {
    /** No wind at all. */
    static final SteadyWind CALM = new SteadyWind(0, 0);

    /** Whether it blows. */
    @JsonIgnore
    boolean blows() {
        return speed > 0;
    }

    /** The wind in words. */
    String words() {
        return blows()
                ? String.format(Locale.ROOT, "wind of %.1f m/s about the axis at %.0f°", speed, azimuth)
                : "no wind";
    }
}
