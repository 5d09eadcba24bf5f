package org.evendraft.http;

import java.time.DateTimeException;
import java.time.Instant;
import java.time.OffsetDateTime;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import java.util.Set;
import java.util.stream.Collectors;
import org.evendraft.platform.Faults;
import org.evendraft.platform.FaultyDocumentException;
import org.evendraft.platform.Json;
import org.evendraft.service.Parameters;
import org.evendraft.store.PageRequest;

/**
 * Reads the parameters of a query; whatever is wrong is gathered, a stand-in is returned, and {@link #done()}, which must come before
 * anything is used, tells all of it at once.
 */
final class Query implements Parameters {
    private static final int USUAL_PAGE = 50;
    private static final int LONGEST_PAGE = 1000;
    private static final int LAST_OFFSET = 1_000_000_000;

    private final Map<String, List<String>> given;
    private final Set<String> known = new LinkedHashSet<>();
    private final Faults faults = new Faults();

    Query(Map<String, List<String>> given) {
        this.given = given;
    }

    /** A text, if it is given. */
    @Override
    public Optional<String> text(String name) {
        known.add(name);
        List<String> values = given.getOrDefault(name, List.of());
        if (values.size() > 1) {
            fault(name, "is given " + values.size() + " times");
        }
        return values.stream().findFirst();
    }

    /** A finite number, if it is given. */
    OptionalDouble number(String name) {
        Optional<String> text = text(name);
        if (text.isEmpty()) {
            return OptionalDouble.empty();
        }
        try {
            double value = Double.parseDouble(text.get());
            if (Double.isFinite(value)) {
                return OptionalDouble.of(value);
            }
        } catch (NumberFormatException e) {
            // told below, together with what is not finite
        }
        fault(name, "must be a finite number, not '" + text.get() + "'");
        return OptionalDouble.empty();
    }

    /** A number that must be given; 0 after a fault. */
    double required(String name) {
        if (!given.containsKey(name)) {
            known.add(name);
            fault(name, "must be given");
            return 0;
        }
        return number(name).orElse(0);
    }

    /** A whole number of a range, if it is given. */
    OptionalInt whole(String name, int least, int greatest) {
        Optional<String> text = text(name);
        if (text.isEmpty()) {
            return OptionalInt.empty();
        }
        if (text.get().matches("\\d{1,9}")
                && Integer.parseInt(text.get()) >= least
                && Integer.parseInt(text.get()) <= greatest) {
            return OptionalInt.of(Integer.parseInt(text.get()));
        }
        fault(name, "must be a whole number from " + least + " to " + greatest + ", not '" + text.get() + "'");
        return OptionalInt.empty();
    }

    /** A moment, if it is given. */
    Optional<Instant> instant(String name) {
        Optional<String> text = text(name);
        try {
            return text.map(t -> OffsetDateTime.parse(t).toInstant());
        } catch (DateTimeException e) {
            fault(name, "must be a time as 2026-06-12T06:00:00Z, not '" + text.orElse("") + "'");
            return Optional.empty();
        }
    }

    /** A constant by its code, with a default. */
    <E extends Enum<E>> E choice(String name, Set<E> allowed, E otherwise) {
        Optional<String> text = text(name);
        if (text.isEmpty()) {
            return otherwise;
        }
        Optional<E> found =
                allowed.stream().filter(e -> Json.code(e).equals(text.get())).findFirst();
        if (found.isEmpty()) {
            String codes = allowed.stream().map(Json::code).collect(Collectors.joining(", "));
            fault(name, "must be one of " + codes + ", not '" + text.get() + "'");
        }
        return found.orElse(otherwise);
    }

    /** Which part of a list is wanted. */
    PageRequest page() {
        int limit = whole("limit", 1, LONGEST_PAGE).orElse(USUAL_PAGE);
        int offset = whole("offset", 0, LAST_OFFSET).orElse(0);
        return new PageRequest(limit, offset);
    }

    /** Whether any of these parameters is given. */
    boolean hasAny(String... names) {
        return Set.of(names).stream().anyMatch(given::containsKey);
    }

    /** Where what is wrong is gathered. */
    Faults faults() {
        return faults;
    }

    /** Whether nothing has been found wrong so far. */
    boolean sound() {
        return faults.count() == 0;
    }

    /** Adds a fault. */
    @Override
    public void fault(String name, String detail) {
        faults.form("", "parameter " + name + " " + detail);
    }

    /**
     * Ends the reading.
     *
     * @throws FaultyDocumentException with all that is wrong, parameters that were not asked for included
     */
    void done() {
        for (String name : given.keySet()) {
            if (!known.contains(name)) {
                String names = known.isEmpty() ? "none" : String.join(", ", known);
                fault(name, "is unknown; known here: " + names);
            }
        }
        faults.throwIfAny();
    }
}
