package org.evendraft.service;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.time.DateTimeException;
import java.time.Duration;
import java.time.Instant;
import java.time.OffsetDateTime;
import java.time.temporal.ChronoUnit;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.stream.Stream;
import org.evendraft.platform.Calibration;
import org.evendraft.platform.ConditionReader;
import org.evendraft.platform.Fault;
import org.evendraft.platform.FaultyDocumentException;
import org.evendraft.platform.Fields;
import org.evendraft.platform.Fill;
import org.evendraft.platform.Json;
import org.evendraft.platform.PreparedPlatform;
import org.evendraft.store.Sounding;

/** Reads one reading of a tank. What it holds is spelt as a condition's fill is, and read in the same way. */
final class SoundingReader {
    /** Clocks of tablets go wrong by so much; a reading from further in the future is a mistake. */
    private static final Duration CLOCKS_APART = Duration.ofMinutes(5);

    private static final List<String> FIGURES =
            Stream.of(Sounding.Given.values()).map(Json::code).toList();
    private static final List<String> FILL = List.of("tank", "level", "volume", "mass", "fraction", "density");
    private static final String FIRST_FILL = "/fills/0";

    private final PreparedPlatform platform;
    private final Fields fields;
    private final JsonNode node;

    /**
     * @param platform the platform whose tanks are read
     * @param fields the reading's properties
     * @param node the same as JSON
     */
    SoundingReader(PreparedPlatform platform, Fields fields, JsonNode node) {
        this.platform = platform;
        this.fields = fields;
        this.node = node;
    }

    /**
     * The reading; empty, with faults, when something is wrong.
     *
     * @param source the batch's source, where the reading gives none
     * @param now the time, where the reading gives none
     */
    Optional<Sounding> read(String source, Instant now) {
        String taken = fields.text("source", source);
        Instant at = fields.optionalText("at").flatMap(text -> at(text, now)).orElse(now);
        Optional<Fill> fill = fill();
        fields.noOthers();
        return fill.map(f -> new Sounding(f.tank(), at, taken, contents(f)));
    }

    private Optional<Instant> at(String text, Instant now) {
        try {
            // No database keeps more than microseconds: what is answered is what is kept.
            Instant at = OffsetDateTime.parse(text).toInstant().truncatedTo(ChronoUnit.MICROS);
            if (at.isAfter(now.plus(CLOCKS_APART))) {
                fields.meaning("at", "at is in the future: " + text + " is after " + now);
            }
            return Optional.of(at);
        } catch (DateTimeException e) {
            fields.form("at", "at must be a time as 2026-06-12T06:00:00Z, not '" + text + "'");
            return Optional.empty();
        }
    }

    private Optional<Fill> fill() {
        ObjectNode fill = Json.mapper().createObjectNode();
        for (String name : FILL) {
            fields.value(name).ifPresent(value -> fill.set(name, value));
        }
        if (!node.isObject()) {
            return Optional.empty();
        }
        ObjectNode condition = Json.mapper().createObjectNode();
        condition.putArray("fills").add(fill);
        try {
            return ConditionReader.read(condition, platform).fills().stream().findFirst();
        } catch (FaultyDocumentException e) {
            e.faults().forEach(this::add);
            return Optional.empty();
        }
    }

    private void add(Fault fault) {
        String pointer = fields.pointer() + fault.pointer().substring(FIRST_FILL.length());
        String detail = fault.detail().replace("a fill must", "a reading must");
        if (fault.kind() == Fault.Kind.FORM) {
            fields.faults().form(pointer, detail);
        } else {
            fields.faults().meaning(pointer, detail);
        }
    }

    private Sounding.Contents contents(Fill fill) {
        Calibration calibration = platform.calibration(fill.tank());
        String given = FIGURES.stream().filter(node::hasNonNull).findFirst().orElseThrow();
        return new Sounding.Contents(
                Sounding.Given.valueOf(given.toUpperCase(Locale.ROOT)),
                calibration.holding(fill.volume()).level(),
                fill.volume(),
                fill.mass(),
                fill.volume() / calibration.fullVolume(),
                fill.density());
    }
}
