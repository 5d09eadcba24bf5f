package org.evendraft;

import java.util.List;
import java.util.Locale;
import java.util.stream.Stream;

/** A key of the configuration, with what its value may be. */
enum SettingKey {
    HTTP_HOST("http.host"),
    HTTP_PORT("http.port", 0, 65_535),
    HTTP_MAX_BODY_MEGABYTES("http.maxBodyMegabytes", 1, 2_000),
    HTTP_REQUEST_SECONDS("http.requestSeconds", 1, 3_600),
    DATABASE_URL("database.url"),
    DATABASE_USER("database.user"),
    DATABASE_PASSWORD("database.password"),
    ACCESS_MODE("access.mode", List.of("open", "token")),
    ACCESS_TOKEN("access.token"),
    LOG_FORMAT("log.format", List.of("text", "json")),
    LOG_LEVEL("log.level", List.of("error", "warn", "info", "debug", "trace"));

    /** What the names of environment variables begin with. */
    static final String PREFIX = "EVENDRAFT_";

    private final String key;
    private final List<String> choices;
    private final boolean number;
    private final int least;
    private final int greatest;

    SettingKey(String key) {
        this(key, List.of());
    }

    SettingKey(String key, List<String> choices) {
        this.key = key;
        this.choices = choices;
        this.number = false;
        this.least = 0;
        this.greatest = 0;
    }

    SettingKey(String key, int least, int greatest) {
        this.key = key;
        this.choices = List.of();
        this.number = true;
        this.least = least;
        this.greatest = greatest;
    }

    /** The key as the file spells it, with a dot between the levels. */
    String key() {
        return key;
    }

    /** The key as a JSON pointer. */
    String pointer() {
        return "/" + key.replace('.', '/');
    }

    /** The environment variable that overrides it. */
    String variable() {
        return PREFIX + key.replace('.', '_').toUpperCase(Locale.ROOT);
    }

    /** Whether the value is a whole number. */
    boolean number() {
        return number;
    }

    /** Whether a value, given as text, is allowed. */
    boolean allows(String value) {
        if (number) {
            return value.matches("\\d{1,9}") && Integer.parseInt(value) >= least && Integer.parseInt(value) <= greatest;
        }
        return choices.isEmpty() || choices.contains(value);
    }

    /** What is allowed, in words. */
    String allowed() {
        if (number) {
            return "a whole number from " + least + " to " + greatest;
        }
        return choices.isEmpty() ? "a text" : "one of " + String.join(", ", choices);
    }

    static Stream<SettingKey> all() {
        return Stream.of(values());
    }
}
