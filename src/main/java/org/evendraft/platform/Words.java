package org.evendraft.platform;

import com.fasterxml.jackson.databind.JsonNode;
import java.math.BigDecimal;
import java.math.MathContext;
import java.util.Collection;
import java.util.stream.Collectors;

/** How values and names are spelt in messages. */
final class Words {
    private static final int MOST_NAMES = 8;
    private static final int LONGEST_QUOTE = 40;
    private static final MathContext SIX_DIGITS = new MathContext(6);
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
        return Double.isFinite(value)
                ? given(new BigDecimal(value).round(SIX_DIGITS).doubleValue())
                : "unknown";
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
