package org.evendraft.http;

import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.stream.Stream;
import org.evendraft.service.Reason;
import org.evendraft.service.Refusal;

/** Which media types a request and its answer have (RFC 9110, 8.3 and 12.5.1). */
final class Negotiation {
    private Negotiation() {}

    /**
     * The media type of a body.
     *
     * @throws Refusal when it is none of those that are read here, or not in UTF-8
     */
    static String body(Optional<String> contentType, List<String> reads) {
        if (reads.isEmpty()) {
            return "";
        }
        String given = contentType.orElse("");
        String type = bare(given);
        if (!reads.contains(type) || !utf8(given)) {
            String found = given.isBlank() ? "none is given" : "it is " + given;
            throw new Refusal(
                    Reason.UNSUPPORTED_MEDIA_TYPE,
                    "Content-Type must be " + String.join(" or ", reads) + " in UTF-8; " + found + ".");
        }
        return type;
    }

    /**
     * The first of the media types written here that the client accepts most.
     *
     * @throws Refusal when it accepts none of them
     */
    static String answer(Optional<String> accept, List<String> writes) {
        if (accept.isEmpty() || accept.get().isBlank()) {
            return writes.get(0);
        }
        List<Range> ranges =
                Stream.of(accept.get().split(",", -1)).map(Range::of).toList();
        String best = "";
        double most = 0;
        for (String type : writes) {
            double weight = weight(ranges, type);
            if (weight > most) {
                best = type;
                most = weight;
            }
        }
        if (best.isEmpty()) {
            throw new Refusal(
                    Reason.NOT_ACCEPTABLE,
                    "This address answers with " + String.join(" or ", writes) + ", and Accept is " + accept.get()
                            + ".");
        }
        return best;
    }

    /** The weight of a media type: that of the most specific range that covers it. */
    private static double weight(List<Range> ranges, String type) {
        double weight = 0;
        int closest = -1;
        for (Range range : ranges) {
            if (range.covers(type) && range.closeness() > closest) {
                closest = range.closeness();
                weight = range.weight();
            }
        }
        return weight;
    }

    private static String bare(String value) {
        return value.split(";", -1)[0].strip().toLowerCase(Locale.ROOT);
    }

    private static boolean utf8(String contentType) {
        return Stream.of(contentType.split(";", -1))
                .skip(1)
                .map(p -> p.strip().toLowerCase(Locale.ROOT).replace("\"", ""))
                .filter(p -> p.startsWith("charset="))
                .allMatch(p -> p.equals("charset=utf-8") || p.equals("charset=us-ascii"));
    }

    /**
     * A media range of an Accept header.
     *
     * @param type media type, with {@code *} for any
     * @param weight its weight, 0 to 1
     */
    private record Range(String type, double weight) {

        static Range of(String text) {
            double weight = Stream.of(text.split(";", -1))
                    .skip(1)
                    .map(String::strip)
                    .filter(p -> p.matches("[qQ]=[01](\\.\\d{0,3})?"))
                    .mapToDouble(p -> Double.parseDouble(p.substring(2)))
                    .findFirst()
                    .orElse(1);
            return new Range(bare(text), weight);
        }

        boolean covers(String other) {
            return type.equals("*/*")
                    || type.equals(other)
                    || (type.endsWith("/*") && other.startsWith(type.substring(0, type.length() - 1)));
        }

        int closeness() {
            if (type.equals("*/*")) {
                return 0;
            }
            return type.endsWith("/*") ? 1 : 2;
        }
    }
}
