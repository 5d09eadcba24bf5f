package org.evendraft.store;

import java.util.Optional;

/**
 * Whether the database can be used.
 *
 * @param reachable whether it answers
 * @param migration version of the last migration done, if it answers
 */
public record Health(boolean reachable, Optional<String> migration) {}
