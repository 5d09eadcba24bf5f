package org.evendraft.store;

import java.util.Locale;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** The kinds of database that can be used, and where they differ. */
enum Engine {
    /** H2 that lives with the process and is gone after it. */
    H2_MEMORY,
    /** H2 in a file of this machine. */
    H2_FILE,
    /** PostgreSQL on a server. */
    POSTGRESQL;

    private static final String H2_PREFIX = "jdbc:h2:";

    /** Addresses of H2 that name a file, as its manual lists them: a path, absolute or from here or from home, with or without prefix. */
    private static final Pattern H2_FILE_ADDRESS = Pattern.compile("jdbc:h2:(?:file:)?([./~]|[A-Za-z]:[/\\\\])");

    /**
     * The way by which H2 reaches its file. Its usual one closes the file for good when a thread is interrupted while it reads,
     * as one is whose request takes too long; this one does not.
     */
    private static final String H2_FILE_PREFIX = "jdbc:h2:async:";

    private static final String POSTGRESQL_PREFIX = "jdbc:postgresql:";

    /**
     * What H2 must be told so that the same SQL runs on both engines, and so that no hook at the end of the process closes it
     * before the last answer is written: {@link Database#close} does.
     */
    private static final Map<String, String> H2_SETTINGS =
            Map.of("MODE", "PostgreSQL", "DATABASE_TO_LOWER", "TRUE", "DB_CLOSE_ON_EXIT", "FALSE");

    /** Keeps a database in memory alive at moments when the pool has no connection. */
    private static final Map<String, String> H2_MEMORY_SETTINGS = Map.of("DB_CLOSE_DELAY", "-1");

    /**
     * The engine of an address.
     *
     * @throws IllegalArgumentException when it is neither of H2 nor of PostgreSQL
     */
    static Engine of(String url) {
        if (url.startsWith(POSTGRESQL_PREFIX)) {
            return POSTGRESQL;
        }
        if (url.startsWith(H2_PREFIX)) {
            return url.startsWith(H2_PREFIX + "mem:") ? H2_MEMORY : H2_FILE;
        }
        throw new IllegalArgumentException(
                "database.url = " + url + ": must start with " + H2_PREFIX + " or " + POSTGRESQL_PREFIX);
    }

    /** The address with the settings that this engine needs and that the address leaves out, and with the way to the file. */
    String completed(String url) {
        if (this == POSTGRESQL) {
            return url;
        }
        Matcher file = H2_FILE_ADDRESS.matcher(url);
        StringBuilder completed =
                new StringBuilder(file.lookingAt() ? H2_FILE_PREFIX + url.substring(file.start(1)) : url);
        append(H2_SETTINGS, completed);
        if (this == H2_MEMORY) {
            append(H2_MEMORY_SETTINGS, completed);
        }
        return completed.toString();
    }

    private static void append(Map<String, String> settings, StringBuilder url) {
        String given = url.toString().toUpperCase(Locale.ROOT);
        settings.forEach((name, value) -> {
            if (!given.contains(";" + name + "=")) {
                url.append(';').append(name).append('=').append(value);
            }
        });
    }

    /** Whether nobody but this process can have the database open that an address names: H2 locks its file, unless told not to. */
    boolean exclusive(String url) {
        String settings = url.toUpperCase(Locale.ROOT);
        return this == H2_FILE
                && completed(url).startsWith(H2_FILE_PREFIX)
                && !settings.contains(";AUTO_SERVER=TRUE")
                && !settings.contains(";FILE_LOCK=NO");
    }

    /** The statement that sets how long one transaction waits for a row that another holds. */
    String lockTimeout(int milliseconds) {
        return (this == POSTGRESQL ? "SET lock_timeout = " : "SET LOCK_TIMEOUT ") + milliseconds;
    }
}
