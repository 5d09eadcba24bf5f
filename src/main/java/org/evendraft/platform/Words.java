package org.evendraft.platform;

import com.fasterxml.jackson.databind.JsonNode;
import java.math.BigDecimal;
import java.math.MathContext;
import java.util.Collection;
import java.util.OptionalDouble;
import java.util.regex.Pattern;
import java.util.stream.Collectors;

/** How values and names are spelt in messages. */
final class Words {
    private static final int MOST_NAMES = 8;
    private static final Pattern DECIMAL =
            Pattern.compile("[-+]?(\\d{1,40}\\.?\\d{0,40}|\\.\\d{1,40})([eE][-+]?\\d{1,4})?");
    private static final int LONGEST_QUOTE = 40;
    private static final MathContext SIX_DIGITS = new MathContext(6);
    private static final MathContext TWO_DIGITS = new MathContext(2);
    private static final double PLAIN_UNDER = 1e9;
    private static final double PLAIN_OVER = 1e-4;

    private Words() {}

    /** A number as it was given. */
    static String given(double value) {
        double size = Math.abs(value);
        if (value == 0) {
            return "0";
        }
        boolean plain = size <= PLAIN_UNDER && size >= PLAIN_OVER;
        return plain ? BigDecimal.valueOf(value).stripTrailingZeros().toPlainString() : Double.toString(value);
    }

    /** A computed number, to six digits. */
    static String rounded(double value) {
        return rounded(value, SIX_DIGITS);
    }

    /** An estimated number, to two digits. */
    static String rough(double value) {
        return rounded(value, TWO_DIGITS);
    }

    private static String rounded(double value, MathContext digits) {
        return Double.isFinite(value)
                ? given(new BigDecimal(value).round(digits).doubleValue())
                : "unknown";
    }

    /** The value of a word that is a finite number in plain decimal spelling. */
    static OptionalDouble number(String word) {
        if (!DECIMAL.matcher(word).matches()) {
            return OptionalDouble.empty();
        }
        double value = Double.parseDouble(word);
        return Double.isFinite(value) ? OptionalDouble.of(value) : OptionalDouble.empty();
    }

    /** The first few of some names. */
    static String few(Collection<String> names) {
        if (names.isEmpty()) {
            return "none";
        }
        String first = names.stream().limit(MOST_NAMES).collect(Collectors.joining(", "));
        return names.size() > MOST_NAMES ? first + " and " + (names.size() - MOST_NAMES) + " more" : first;
    }

    /** A text in quotation marks, cut short, without control characters. */
    static String quote(String text) {
        String clean = text.replaceAll("\\p{Cntrl}", "?");
        if (clean.length() <= LONGEST_QUOTE) {
            return "'" + clean + "'";
        }
        return "'" + clean.substring(0, clean.offsetByCodePoints(0, clean.codePointCount(0, LONGEST_QUOTE))) + "…'";
    }

    /** What stands in the document where something else was expected. */
    static String what(JsonNode node) {
        return switch (node.getNodeType()) {
            case ARRAY -> "a list";
            case OBJECT -> "an object";
            case STRING -> "the text " + quote(node.textValue());
            case NUMBER, BOOLEAN -> node.asText();
            default -> "null";
        };
    }
}
