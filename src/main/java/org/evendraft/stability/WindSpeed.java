package org.evendraft.stability;

import java.util.Optional;
import java.util.OptionalDouble;
import org.evendraft.platform.Mode;

/** Which wind is counted. */
public final class WindSpeed {
    private WindSpeed() {}

    /** The one asked for, else that of the mode (m/s); empty when neither is known. */
    public static OptionalDouble counted(OptionalDouble asked, Optional<Mode> mode) {
        return asked.isPresent() ? asked : mode.map(Mode::windSpeed).orElseGet(OptionalDouble::empty);
    }
}
