package org.evendraft.platform;

/** What every output says of itself. */
public final class Caution {
    /** The caution, in two sentences. */
    public static final String TEXT =
            "Planning aid only. The approved stability documents of the unit, class and flag rules and local codes govern;"
                    + " the person in charge of ballast decides and verifies by soundings and draft marks.";

    private Caution() {}
}
