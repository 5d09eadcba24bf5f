package org.evendraft.platform;

import java.util.List;

/**
 * A pump: it moves water from any one of its suctions to any one of its deliveries.
 *
 * @param id its name
 * @param rate what it moves (m³/h)
 * @param from tanks, or {@link #SEA}, that it draws from
 * @param to tanks, or {@link #SEA}, that it delivers to
 */
public record Pump(String id, double rate, List<String> from, List<String> to) {

    /** The reserved end that stands for the sea. */
    public static final String SEA = "sea";

    /** Copies the lists. */
    public Pump {
        from = List.copyOf(from);
        to = List.copyOf(to);
    }
}
