package org.evendraft.platform;

import static java.nio.charset.StandardCharsets.UTF_8;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.MissingNode;
import java.util.ArrayList;
import java.util.EnumSet;
import java.util.Iterator;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import org.evendraft.geometry.Vec3;

/**
 * Reads the properties of one JSON object strictly. Whatever is wrong goes to the {@link Faults} with its pointer, and a stand-in is
 * returned (not a number, an empty text or list) so that the rest is still read: whoever asks must look at the faults before using
 * what was read. A property that is {@code null} counts as absent. {@link #noOthers()} comes last. One thread at a time.
 */
public final class Fields {
    private static final int LONGEST_TEXT = 200;
    private static final double[] NO_NUMBERS = {};

    private final JsonNode node;
    private final String pointer;
    private final Faults faults;
    private final Set<String> known = new LinkedHashSet<>();

    private Fields(JsonNode node, String pointer, Faults faults) {
        this.node = node;
        this.pointer = pointer;
        this.faults = faults;
    }

    /**
     * The properties of a node; a fault when it is no object, and then everything counts as absent without further faults.
     *
     * @param node the object
     * @param pointer its JSON pointer, {@code ""} for the whole document
     * @param faults where faults go
     */
    public static Fields of(JsonNode node, String pointer, Faults faults) {
        if (!node.isObject()) {
            faults.form(pointer, "must be an object, not " + Words.what(node));
        }
        return new Fields(node, pointer, faults);
    }

    /** Where the faults go. */
    public Faults faults() {
        return faults;
    }

    /** The JSON pointer of this object. */
    public String pointer() {
        return pointer;
    }

    /** The JSON pointer of a property. */
    public String pointer(String name) {
        return pointer + "/" + name.replace("~", "~0").replace("/", "~1");
    }

    /** Adds a fault of form at a property. */
    public void form(String name, String detail) {
        faults.form(pointer(name), detail);
    }

    /** Adds a fault of meaning at a property. */
    public void meaning(String name, String detail) {
        faults.meaning(pointer(name), detail);
    }

    /** Whether the property is there and not null. */
    public boolean has(String name) {
        return value(name).isPresent();
    }

    /** The property as it stands, if it is there and not null. */
    public Optional<JsonNode> value(String name) {
        known.add(name);
        JsonNode value = node.get(name);
        return value == null || value.isNull() ? Optional.empty() : Optional.of(value);
    }

    private Optional<JsonNode> required(String name) {
        Optional<JsonNode> value = value(name);
        if (value.isEmpty() && node.isObject()) {
            form(name, name + " must be given");
        }
        return value;
    }

    /** A number that must be there; not a number after a fault. */
    public double number(String name, Range range) {
        return required(name).map(value -> number(name, value, range)).orElse(Double.NaN);
    }

    /** A number with a default; not a number after a fault. */
    public double number(String name, Range range, double otherwise) {
        return value(name).map(value -> number(name, value, range)).orElse(otherwise);
    }

    /** A number that may be absent. */
    public OptionalDouble optionalNumber(String name, Range range) {
        double value = number(name, range, Double.NaN);
        return Double.isNaN(value) ? OptionalDouble.empty() : OptionalDouble.of(value);
    }

    private double number(String name, JsonNode value, Range range) {
        return number(pointer(name), name, value, range);
    }

    private double number(String at, String name, JsonNode value, Range range) {
        if (!value.isNumber()) {
            faults.form(at, name + " must be a number, not " + Words.what(value));
            return Double.NaN;
        }
        double number = value.doubleValue();
        if (!Double.isFinite(number)) {
            faults.form(at, name + " must be a finite number; this one is too large");
            return Double.NaN;
        }
        if (!range.allows(number)) {
            faults.meaning(at, name + " must be " + range.words() + ", not " + Words.given(number));
            return Double.NaN;
        }
        return number;
    }

    /** A text that must be there and not blank; empty after a fault. */
    public String text(String name) {
        return required(name).map(value -> text(pointer(name), name, value)).orElse("");
    }

    /** A text with a default. */
    public String text(String name, String otherwise) {
        return value(name).map(value -> text(pointer(name), name, value)).orElse(otherwise);
    }

    /** A text that may be absent. */
    public Optional<String> optionalText(String name) {
        return value(name).map(value -> text(pointer(name), name, value));
    }

    private String text(String at, String name, JsonNode value) {
        if (!value.isTextual()) {
            faults.form(at, name + " must be a text, not " + Words.what(value));
            return "";
        }
        String text = value.textValue();
        if (text.isBlank()) {
            faults.form(at, name + " must not be empty");
        } else if (text.length() > LONGEST_TEXT) {
            faults.form(at, name + " must have at most " + LONGEST_TEXT + " characters, not " + text.length());
        } else if (text.chars().anyMatch(Character::isISOControl)
                || !UTF_8.newEncoder().canEncode(text)) {
            faults.form(at, name + " must not hold control characters or halves of characters");
        }
        return text;
    }

    /** True or false, with a default. */
    public boolean flag(String name, boolean otherwise) {
        Optional<JsonNode> value = value(name);
        if (value.isPresent() && !value.get().isBoolean()) {
            form(name, name + " must be true or false, not " + Words.what(value.get()));
        }
        return value.map(JsonNode::booleanValue).orElse(otherwise);
    }

    /** A constant by its code that must be there; empty after a fault. */
    public <E extends Enum<E>> Optional<E> choice(String name, Class<E> type) {
        return required(name).flatMap(value -> choice(name, value, EnumSet.allOf(type)));
    }

    /** A constant by its code, with a default. */
    public <E extends Enum<E>> E choice(String name, Class<E> type, E otherwise) {
        return choice(name, EnumSet.allOf(type), otherwise);
    }

    /** One of some constants by its code, with a default. */
    public <E extends Enum<E>> E choice(String name, Set<E> allowed, E otherwise) {
        return value(name).flatMap(value -> choice(name, value, allowed)).orElse(otherwise);
    }

    private <E extends Enum<E>> Optional<E> choice(String name, JsonNode value, Set<E> allowed) {
        for (E constant : allowed) {
            if (value.isTextual() && value.textValue().equals(Json.code(constant))) {
                return Optional.of(constant);
            }
        }
        List<String> codes = allowed.stream().map(Json::code).toList();
        form(name, name + " must be one of " + String.join(", ", codes) + ", not " + Words.what(value));
        return Optional.empty();
    }

    /** An object that must be there; one without properties and without further faults after a fault. */
    public Fields object(String name) {
        JsonNode value = required(name).orElse(MissingNode.getInstance());
        return value.isMissingNode() ? new Fields(value, pointer(name), faults) : of(value, pointer(name), faults);
    }

    /** An object that may be absent. */
    public Optional<Fields> optionalObject(String name) {
        return value(name).map(value -> of(value, pointer(name), faults));
    }

    /** The objects of a list; an absent list is empty. */
    public List<Fields> objects(String name) {
        List<Fields> objects = new ArrayList<>();
        String start = pointer(name) + "/";
        for (JsonNode element : elements(name)) {
            objects.add(of(element, start + objects.size(), faults));
        }
        return objects;
    }

    /** The objects of a list that must have at least one. */
    public List<Fields> someObjects(String name) {
        int before = faults.count();
        List<Fields> objects = objects(name);
        if (objects.isEmpty() && faults.count() == before && node.isObject()) {
            form(name, name + " must have at least one entry");
        }
        return objects;
    }

    /** The texts of a list; an absent list is empty. */
    public List<String> texts(String name) {
        List<String> texts = new ArrayList<>();
        for (JsonNode element : elements(name)) {
            texts.add(text(pointer(name) + "/" + texts.size(), "each entry of " + name, element));
        }
        return texts;
    }

    /** The texts of a list that must have at least one. */
    public List<String> someTexts(String name) {
        int before = faults.count();
        List<String> texts = texts(name);
        if (texts.isEmpty() && faults.count() == before && node.isObject()) {
            form(name, name + " must have at least one entry");
        }
        return texts;
    }

    /** The elements of a list; none after a fault, or when it is absent. */
    List<JsonNode> elements(String name) {
        Optional<JsonNode> value = value(name);
        if (value.isPresent() && !value.get().isArray()) {
            form(name, name + " must be a list, not " + Words.what(value.get()));
            return List.of();
        }
        List<JsonNode> elements = new ArrayList<>();
        value.ifPresent(list -> list.forEach(elements::add));
        return elements;
    }

    /** A list of as many numbers as the width tells that must be there; empty after a fault. */
    public Optional<double[]> numbers(String name, int width, Range range) {
        return required(name)
                .map(value -> numbers(pointer(name), name, value, width, range))
                .filter(n -> n.length == width);
    }

    /** The same, where it may be absent. */
    public Optional<double[]> optionalNumbers(String name, int width, Range range) {
        return has(name) ? numbers(name, width, range) : Optional.empty();
    }

    /** A list of numbers that must be there with at least one; those with faults are left out. */
    public List<Double> numberList(String name, Range range) {
        int before = faults.count();
        List<Double> numbers = new ArrayList<>();
        int i = 0;
        for (JsonNode element : elements(name)) {
            double number = number(pointer(name) + "/" + i++, "each entry of " + name, element, range);
            if (!Double.isNaN(number)) {
                numbers.add(number);
            }
        }
        if (i == 0 && faults.count() == before) {
            form(name, name + " must have at least one entry");
        }
        return numbers;
    }

    /** A list of lists of numbers, as an outline or a curve; lists with faults are left out. */
    public List<double[]> rows(String name, int width, Range range) {
        List<double[]> rows = new ArrayList<>();
        int i = 0;
        for (JsonNode element : elements(name)) {
            double[] row = quick(element, width, range);
            if (row.length == 0) {
                row = numbers(pointer(name) + "/" + i, "each entry of " + name, element, width, range);
            }
            if (row.length == width) {
                rows.add(row);
            }
            i++;
        }
        return rows;
    }

    /** The numbers of a list without fault, with no pointer made: meshes have millions of them. Empty when there is a fault. */
    private static double[] quick(JsonNode list, int width, Range range) {
        double[] numbers = new double[width];
        for (int i = 0; i < width; i++) {
            JsonNode value = list.get(i);
            if (value == null || !value.isNumber() || !range.allows(value.doubleValue())) {
                return NO_NUMBERS;
            }
            numbers[i] = value.doubleValue();
        }
        return list.size() == width ? numbers : NO_NUMBERS;
    }

    private double[] numbers(String at, String name, JsonNode value, int width, Range range) {
        if (!value.isArray() || value.size() != width) {
            String found = value.isArray() ? value.size() + " of them" : Words.what(value);
            faults.form(at, name + " must be a list of " + width + " numbers, not " + found);
            return NO_NUMBERS;
        }
        int before = faults.count();
        double[] numbers = new double[width];
        for (int i = 0; i < width; i++) {
            numbers[i] = number(at + "/" + i, name, value.get(i), range);
        }
        return faults.count() == before ? numbers : NO_NUMBERS;
    }

    /** A point {@code [x, y, z]} that must be there (m). */
    public Optional<Vec3> point(String name) {
        return numbers(name, 3, Range.COORDINATE).map(n -> new Vec3(n[0], n[1], n[2]));
    }

    /** The position given by the properties x, y and z (m). */
    public Vec3 position() {
        return new Vec3(number("x", Range.COORDINATE), number("y", Range.COORDINATE), number("z", Range.COORDINATE));
    }

    /** Adds a fault for each property that was not asked for. */
    public void noOthers() {
        for (Iterator<String> names = node.fieldNames(); names.hasNext(); ) {
            String name = names.next();
            if (!known.contains(name)) {
                form(name, "unknown property " + Words.quote(name) + "; known here: " + String.join(", ", known));
            }
        }
    }
}
