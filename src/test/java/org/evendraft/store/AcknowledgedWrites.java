package org.evendraft.store;

import java.util.OptionalInt;

/** A process that stores revisions and says so on standard output, for a trace of its system calls. */
public final class AcknowledgedWrites {
    static final int REVISIONS = 5;

    private AcknowledgedWrites() {}

    /** Stores revisions in the database whose address is the first argument. */
    public static void main(String[] arguments) {
        try (Database database = Database.open(arguments[0], "sa", "")) {
            PlatformRepository platforms = new PlatformRepository(Samples.AT_NOON);
            for (int i = 1; i <= REVISIONS; i++) {
                say("asked " + i);
                database.inTransaction(handle ->
                        platforms.save(handle, Samples.platform("p"), "x".repeat(10_000), OptionalInt.empty()));
                say("answered " + i);
            }
        }
    }

    private static void say(String line) {
        System.out.println(line);
        System.out.flush();
    }
}
