package org.evendraft.service;

import java.util.Optional;
import org.evendraft.store.Database;
import org.evendraft.store.Health;

/** Tells whether the service can do its work. */
public final class CheckHealth {
    private final Database database;
    private final String engineVersion;

    CheckHealth(Database database, String engineVersion) {
        this.database = database;
        this.engineVersion = engineVersion;
    }

    /**
     * How the service is. Component names are those of the JSON.
     *
     * @param status up or down
     * @param database up or down
     * @param migration version of the last migration of the database, if it answers
     * @param engineVersion version of the program
     */
    public record ServiceHealth(String status, String database, Optional<String> migration, String engineVersion) {

        /** Whether everything works. */
        public boolean up() {
            return status.equals("up");
        }
    }

    /** How it is now. */
    public ServiceHealth check() {
        Health health = database.health();
        String state = health.reachable() && health.migration().isPresent() ? "up" : "down";
        return new ServiceHealth(state, health.reachable() ? "up" : "down", health.migration(), engineVersion);
    }
}
