package org.evendraft.cli;

import java.util.HashMap;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import org.evendraft.platform.Faults;
import org.evendraft.platform.FaultyDocumentException;
import org.evendraft.service.Parameters;

/** Options of a command as they were typed, whose faults are told together. */
final class OptionTexts implements Parameters {
    private final Map<String, Optional<String>> given = new HashMap<>();
    private final Faults faults = new Faults();

    /** Adds an option under the name of the parameter that it gives. */
    OptionTexts put(String name, Optional<String> text) {
        given.put(name, text);
        return this;
    }

    @Override
    public Optional<String> text(String name) {
        return given.getOrDefault(name, Optional.empty());
    }

    @Override
    public void fault(String name, String detail) {
        String option = name.replaceAll("([A-Z])", "-$1").toLowerCase(Locale.ROOT);
        faults.form("", "option --" + option + " " + detail);
    }

    /**
     * Ends the reading.
     *
     * @throws FaultyDocumentException with all that is wrong
     */
    void done() {
        faults.throwIfAny();
    }
}
