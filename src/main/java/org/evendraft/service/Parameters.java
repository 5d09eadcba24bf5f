package org.evendraft.service;

import java.util.Optional;

/** Named values as a query or a command line gives them. Each is asked for once. */
public interface Parameters {
    /** The value of a parameter, if it is given. */
    Optional<String> text(String name);

    /** Adds a fault of a parameter; all of them are told together. */
    void fault(String name, String detail);
}
