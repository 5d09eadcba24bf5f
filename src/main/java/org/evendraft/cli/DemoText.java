package org.evendraft.cli;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.Locale;
import java.util.Map;
import java.util.function.Predicate;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import java.util.stream.StreamSupport;
import org.evendraft.service.TextTable;

/** A condition and a plan in words and short tables. */
final class DemoText {
    private static final double PERCENT = 100;

    /** What fits on a line of a terminal, up to a space. */
    private static final Pattern LINE_END = Pattern.compile("(.{1,96})(?:\\s|$)");

    /** A number that rounds to zero has no sign. */
    private static final Pattern NEGATIVE_ZERO = Pattern.compile("-(0(?:\\.0+)?)(?!\\d|\\.)");

    /** Units of limits that are not lengths, by the last word of their names. */
    private static final Map<String, String> UNITS =
            Map.of("maxHeel", "°", "maxTrim", "°", "maxDeckLoad", "t", "maxLoad", "t", "maxPressure", "t/m²");

    private final JsonNode platform;

    /**
     * @param platform the platform's document
     */
    DemoText(JsonNode platform) {
        this.platform = platform;
    }

    /** How the platform floats in a condition. */
    String condition(JsonNode document, JsonNode result) {
        return paragraphs(
                platform.path("name").asText() + ", revision "
                        + result.path("platformRevision").asText() + ", in the condition \""
                        + document.path("name").asText() + "\"",
                floating(result),
                limits(result, limit -> true),
                list("Warnings", result.path("warnings")));
    }

    /** A suggested transfer, and how the platform floats after it. */
    String plan(JsonNode request, JsonNode plan) {
        JsonNode after = plan.path("after");
        return paragraphs(
                "Suggested transfer to " + target(request.path("target")),
                moves(plan.path("moves")),
                summary(plan),
                list("What the target lacks", plan.path("binding")),
                list("Warnings", plan.path("warnings")),
                "After the transfer, deck loads as they were",
                floating(after),
                limits(after, limit -> !limit.toLowerCase(Locale.ROOT).contains("deck")),
                list("Warnings", after.path("warnings")),
                wrapped(plan.path("caution").asText()));
    }

    /** The parts that are not empty, an empty line after each. */
    private static String paragraphs(String... parts) {
        return Stream.of(parts).filter(part -> !part.isEmpty()).collect(Collectors.joining("\n\n", "", "\n"));
    }

    private static String wrapped(String text) {
        return LINE_END.matcher(text).replaceAll("$1\n").strip();
    }

    private static String floating(JsonNode result) {
        JsonNode at = result.path("floating");
        JsonNode gm = result.path("gm");
        return String.join(
                "\n",
                format("  Mass          %.1f t", result.path("mass")),
                format(
                        "  Draft         %.2f m at the origin (%.2f m on even keel)",
                        at.path("draft"), result.path("evenKeelDraft")),
                "  Heel          " + angle(at.path("heelAngle"), "starboard down", "port down"),
                "  Trim          " + angle(at.path("trimAngle"), "bow down", "stern down"),
                "  Draft marks   " + marks(at.path("marks")),
                format(
                        "  GM corrected  transverse %.2f m, longitudinal %.2f m, least %.2f m (axis at %.0f°)",
                        gm.path("transverse").path("corrected"),
                        gm.path("longitudinal").path("corrected"),
                        gm.path("least").path("corrected"),
                        gm.path("least").path("azimuth")));
    }

    private static String marks(JsonNode marks) {
        return marks.properties().stream()
                .map(mark -> mark.getKey() + format(" %.2f m", mark.getValue()))
                .collect(Collectors.joining(", "));
    }

    private static String angle(JsonNode angle, String positive, String negative) {
        double value = angle.doubleValue();
        String size = String.format(Locale.ROOT, "%.2f°", Math.abs(value));
        return size.equals("0.00°") ? size : size + " " + (value > 0 ? positive : negative);
    }

    private static String limits(JsonNode result, Predicate<String> which) {
        TextTable table = new TextTable("Limit", "value", "bound", "margin", "unit", "");
        for (JsonNode limit : result.path("limits")) {
            String name = limit.path("limit").asText();
            if (which.test(name)) {
                table.row(
                        name,
                        number(limit.path("value")),
                        number(limit.path("bound")),
                        signed(limit.path("margin")),
                        unit(name),
                        limit.path("met").booleanValue() ? "met" : "NOT MET");
            }
        }
        return table.toString();
    }

    /** The unit of a limit; lengths are in metres. */
    private static String unit(String limit) {
        return UNITS.getOrDefault(limit.substring(limit.lastIndexOf('.') + 1), "m");
    }

    private static String target(JsonNode target) {
        return format(
                "draft %.2f m, heel %.2f°, trim %.2f°",
                target.path("draft"), target.path("heelAngle"), target.path("trimAngle"));
    }

    private static String moves(JsonNode moves) {
        TextTable table = new TextTable(
                "Step", "from", "to", "t", "m³", "pump", "start min", "end min", "draft m", "heel °", "trim °", "GM m");
        for (JsonNode move : moves) {
            JsonNode after = move.path("after");
            table.row(
                    move.path("step").asText(),
                    move.path("from").asText(),
                    move.path("to").asText(),
                    format("%.1f", move.path("mass")),
                    format("%.1f", move.path("volume")),
                    move.path("pump").asText(),
                    format("%.1f", move.path("startMinute")),
                    format("%.1f", move.path("endMinute")),
                    number(after.path("draft")),
                    number(after.path("heelAngle")),
                    number(after.path("trimAngle")),
                    number(after.path("gmTransverse")));
        }
        return table.toString();
    }

    private static String summary(JsonNode plan) {
        JsonNode worst = plan.path("worst");
        JsonNode optimality = plan.path("optimality");
        String met = plan.path("feasible").booleanValue()
                ? "  The target is met."
                : "  The target cannot be met; this is the nearest that can.";
        return String.join(
                "\n",
                met,
                format(
                        "  Pumped        %.1f t, %.0f tanks touched, %.0f ballast tanks slack at the end, %.0f minutes",
                        plan.path("pumpedMass"),
                        plan.path("tanksTouched"),
                        plan.path("slackTanks"),
                        plan.path("durationMinutes")),
                format(
                                "  Cost          %.1f t, and no plan costs less than %.1f t",
                                plan.path("cost"), optimality.path("bound"))
                        + String.format(
                                Locale.ROOT,
                                " (gap %.1f %%)",
                                PERCENT * optimality.path("gap").doubleValue()),
                format(
                        "  On the way    heel at most %.2f° (minute %.0f), trim %.2f° (minute %.0f), GM at least %.2f m (minute %.0f)",
                        worst.path("heelAngle").path("value"),
                        worst.path("heelAngle").path("minute"),
                        worst.path("trimAngle").path("value"),
                        worst.path("trimAngle").path("minute"),
                        worst.path("gmTransverse").path("value"),
                        worst.path("gmTransverse").path("minute")));
    }

    private static String list(String title, JsonNode entries) {
        if (entries.isEmpty()) {
            return "";
        }
        return StreamSupport.stream(entries.spliterator(), false)
                .map(entry -> "  - " + (entry.isTextual() ? entry.textValue() : binding(entry)))
                .collect(Collectors.joining("\n", title + "\n", ""));
    }

    private static String binding(JsonNode binding) {
        return binding.path("limit").asText()
                + format(
                        ": %.2f where %.2f is wanted, %.2f short",
                        binding.path("value"), binding.path("bound"), binding.path("lack"));
    }

    private static String number(JsonNode value) {
        return value.isNumber() ? format("%.2f", value) : "–";
    }

    private static String signed(JsonNode value) {
        return value.isNumber() ? format("%+.2f", value) : "–";
    }

    private static String format(String pattern, JsonNode... values) {
        Object[] numbers = new Object[values.length];
        for (int i = 0; i < values.length; i++) {
            numbers[i] = values[i].doubleValue();
        }
        String text = String.format(Locale.ROOT, pattern, numbers);
        return NEGATIVE_ZERO.matcher(text).replaceAll("$1");
    }
}
