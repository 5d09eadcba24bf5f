package org.evendraft.store;

import org.junit.jupiter.api.Assumptions;

/** Programs that some tests need beside the JDK. */
final class Outside {
    private Outside() {}

    /** Skips the test when a program is missing, unless EVENDRAFT_TEST_REQUIRE_ALL is true. */
    static void skipWithout(boolean available, String program) {
        boolean required = Boolean.parseBoolean(System.getenv("EVENDRAFT_TEST_REQUIRE_ALL"));
        Assumptions.assumeTrue(required || available, program + " is missing");
    }
}
