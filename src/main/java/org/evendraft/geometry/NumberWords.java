package org.evendraft.geometry;

import java.util.OptionalDouble;

/** Numbers in text files. */
final class NumberWords {
    private static final int LONGEST = 30;

    private NumberWords() {}

    /** The value of a word that is a finite number. */
    static OptionalDouble finite(String word) {
        try {
            double value = Double.parseDouble(word);
            return Double.isFinite(value) ? OptionalDouble.of(value) : OptionalDouble.empty();
        } catch (NumberFormatException e) {
            return OptionalDouble.empty();
        }
    }

    /** A word in quotation marks, cut short. */
    static String quote(String word) {
        return "'" + (word.length() > LONGEST ? word.substring(0, LONGEST) + "…" : word) + "'";
    }
}
