package org.evendraft.service;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import java.util.TreeSet;
import java.util.stream.Stream;
import org.evendraft.platform.Range;
import org.evendraft.stability.HydrostaticGrid;

/** Reads which hydrostatics are wanted; whatever is wrong goes to the parameters' faults, and a stand-in is taken. */
final class HydrostaticRequestReader {
    /** Beyond this the waterplane stands so steep that its section means nothing (degrees). */
    private static final int STEEPEST = 80;

    /** No platform is deeper (m). */
    private static final int DEEPEST = 10_000;

    private static final int MOST_DIGITS = 9;
    private static final int MOST_ROWS = HydrostaticRequest.MOST_ROWS;
    private static final List<Double> NONE = List.of();

    private final Parameters given;
    private boolean sound = true;

    HydrostaticRequestReader(Parameters given) {
        this.given = given;
    }

    HydrostaticRequest read() {
        Optional<String> draft = given.text("draft");
        Optional<String> from = given.text("from");
        Optional<String> to = given.text("to");
        Optional<String> step = given.text("step");
        boolean range = Stream.of(from, to, step).anyMatch(Optional::isPresent);
        if (range && draft.isPresent()) {
            fault("draft", "cannot be given together with from, to and step");
            depth("draft", draft);
        }
        List<Double> drafts = range ? drafts(from, to, step) : List.of(depth("draft", draft));
        HydrostaticGrid grid = new HydrostaticGrid(drafts, angles("heel"), angles("trim"));
        if (sound && grid.count() > MOST_ROWS) {
            fault(
                    range ? "step" : "heel",
                    "makes a table of " + grid.count() + " rows with these heels and trims; at most " + MOST_ROWS
                            + " rows are given");
        }
        return new HydrostaticRequest(grid, !range && grid.count() == 1, waterDensity(), digits());
    }

    private List<Double> drafts(Optional<String> fromText, Optional<String> toText, Optional<String> stepText) {
        double from = depth("from", fromText);
        double to = depth("to", toText);
        double step = required("step", stepText);
        if (to < from) {
            fault("to", "must not be less than from");
        }
        if (step <= 0) {
            fault("step", "must be over 0");
        } else if (isTooMany(from, to, step)) {
            fault("step", "makes more than " + MOST_ROWS + " rows; take a larger one");
        }
        return sound ? HydrostaticGrid.steps(from, to, step) : NONE;
    }

    private static boolean isTooMany(double from, double to, double step) {
        return (to - from) / step > MOST_ROWS - 1;
    }

    private double depth(String name, Optional<String> text) {
        double depth = required(name, text);
        if (Math.abs(depth) > DEEPEST) {
            fault(name, "must lie within " + DEEPEST + " m");
        }
        return depth;
    }

    private double required(String name, Optional<String> text) {
        if (text.isEmpty()) {
            boolean alone = name.equals("draft");
            fault(name, alone ? "must be given, or from, to and step for a table" : "must be given");
            return Double.NaN;
        }
        return number(name, text.get());
    }

    /** A finite number; not a number after a fault. */
    private double number(String name, String text) {
        double value = finite(text);
        if (Double.isNaN(value)) {
            fault(name, "must be a finite number, not '" + text + "'");
        }
        return value;
    }

    private static double finite(String text) {
        try {
            double value = Double.parseDouble(text);
            return Double.isFinite(value) ? value : Double.NaN;
        } catch (NumberFormatException e) {
            return Double.NaN;
        }
    }

    /** Angles in rising order, each once. */
    private List<Double> angles(String name) {
        TreeSet<Double> angles = new TreeSet<>();
        for (String entry : given.text(name).orElse("0").split(",", -1)) {
            angles.addAll(entry(name, entry.strip()));
        }
        return List.copyOf(angles);
    }

    private List<Double> entry(String name, String entry) {
        if (entry.isEmpty()) {
            fault(name, "has an empty entry");
            return NONE;
        }
        double[] parts = Stream.of(entry.split(":", -1))
                .mapToDouble(HydrostaticRequestReader::finite)
                .toArray();
        if (Stream.of(1, 3).noneMatch(n -> n == parts.length) || hasFault(parts)) {
            fault(
                    name,
                    "must be a finite number, a range from:to:step, or several of these with commas, not '" + entry
                            + "'");
            return NONE;
        }
        double last = parts.length == 1 ? parts[0] : parts[1];
        if (Math.abs(parts[0]) > STEEPEST || Math.abs(last) > STEEPEST) {
            fault(name, "must lie within " + STEEPEST + " degrees, unlike '" + entry + "'");
            return NONE;
        }
        // adding 0 makes 0 of -0
        return parts.length == 1 ? List.of(parts[0] + 0.0) : range(name, entry, parts);
    }

    private static boolean hasFault(double[] numbers) {
        for (double number : numbers) {
            if (Double.isNaN(number)) {
                return true;
            }
        }
        return false;
    }

    private List<Double> range(String name, String entry, double[] parts) {
        boolean falls = parts[1] < parts[0];
        boolean stands = parts[2] <= 0;
        if (falls) {
            fault(name, "has a range whose end is less than its start: '" + entry + "'");
        }
        if (stands) {
            fault(name, "has a range whose step is not over 0: '" + entry + "'");
        } else if (isTooMany(parts[0], parts[1], parts[2])) {
            fault(name, "makes more than " + MOST_ROWS + " rows with '" + entry + "'; take a larger step");
            return NONE;
        }
        return falls || stands ? NONE : HydrostaticGrid.steps(parts[0], parts[1], parts[2]);
    }

    private OptionalDouble waterDensity() {
        Optional<String> text = given.text("waterDensity");
        if (text.isEmpty()) {
            return OptionalDouble.empty();
        }
        double density = number("waterDensity", text.get());
        if (!Double.isNaN(density) && !Range.DENSITY.allows(density)) {
            fault("waterDensity", "must be " + Range.DENSITY.words() + " t/m³");
        }
        return OptionalDouble.of(density);
    }

    private OptionalInt digits() {
        Optional<String> text = given.text("digits");
        if (text.isEmpty()) {
            return OptionalInt.empty();
        }
        if (!text.get().matches("\\d")) {
            fault("digits", "must be a whole number from 0 to " + MOST_DIGITS + ", not '" + text.get() + "'");
            return OptionalInt.empty();
        }
        return OptionalInt.of(Integer.parseInt(text.get()));
    }

    private void fault(String name, String detail) {
        sound = false;
        given.fault(name, detail);
    }
}
