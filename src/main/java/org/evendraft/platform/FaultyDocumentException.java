package org.evendraft.platform;

import java.util.List;
import java.util.stream.Collectors;

/** A document with faults: the client's to mend, never a bug. */
public final class FaultyDocumentException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    private final transient List<Fault> faults;

    /** All faults found, at least one. */
    public FaultyDocumentException(List<Fault> faults) {
        super(faults.stream().map(f -> f.pointer() + ": " + f.detail()).collect(Collectors.joining("; ")));
        this.faults = List.copyOf(faults);
    }

    /** A single fault of meaning. */
    public static FaultyDocumentException impossible(String pointer, String detail) {
        return new FaultyDocumentException(List.of(new Fault(pointer, detail, Fault.Kind.MEANING)));
    }

    /** All that is wrong. */
    public List<Fault> faults() {
        return faults;
    }

    /** Whether any fault is one of form. */
    public boolean malformed() {
        return faults.stream().anyMatch(f -> f.kind() == Fault.Kind.FORM);
    }
}
