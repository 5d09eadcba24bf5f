package org.evendraft.platform;

import java.util.ArrayList;
import java.util.List;

/** Gathers what is wrong with a document while it is read, so that all of it is told at once. One thread at a time. */
public final class Faults {
    private final List<Fault> list = new ArrayList<>();
    private final List<String> warnings = new ArrayList<>();

    /** Nothing gathered yet. */
    public Faults() {}

    /**
     * Adds a fault of form: missing, unknown, of the wrong type.
     *
     * @param pointer JSON pointer of the property concerned
     * @param detail a sentence for people
     */
    public void form(String pointer, String detail) {
        list.add(new Fault(pointer, detail, Fault.Kind.FORM));
    }

    /**
     * Adds a fault of meaning: well-formed but impossible.
     *
     * @param pointer JSON pointer of the property concerned
     * @param detail a sentence for people
     */
    public void meaning(String pointer, String detail) {
        list.add(new Fault(pointer, detail, Fault.Kind.MEANING));
    }

    /** Adds a sentence on what deserves attention but is no fault. */
    public void warn(String sentence) {
        warnings.add(sentence);
    }

    /** The sentences on what deserves attention. */
    public List<String> warnings() {
        return List.copyOf(warnings);
    }

    /** How many faults there are so far: unchanged after a part that had none. */
    public int count() {
        return list.size();
    }

    /** All so far. */
    public List<Fault> list() {
        return List.copyOf(list);
    }

    /**
     * Ends the reading.
     *
     * @throws FaultyDocumentException with all faults, if there are any
     */
    public void throwIfAny() {
        if (!list.isEmpty()) {
            throw new FaultyDocumentException(list);
        }
    }
}
