package org.evendraft.cli;

import java.util.OptionalDouble;
import org.evendraft.platform.Faults;
import org.evendraft.stability.KgRequestReader;
import org.jspecify.annotations.Nullable;

/** A wind speed given on the command line. */
final class WindOption {
    private WindOption() {}

    /**
     * The speed (m/s), if one is given.
     *
     * @throws org.evendraft.platform.FaultyDocumentException when it is out of range
     */
    static OptionalDouble speed(@Nullable Double given) {
        if (given == null) {
            return OptionalDouble.empty();
        }
        if (!KgRequestReader.WIND.allows(given)) {
            Faults faults = new Faults();
            faults.meaning("", "wind must be " + KgRequestReader.WIND.words() + " m/s, not " + given);
            faults.throwIfAny();
        }
        return OptionalDouble.of(given);
    }
}
