package org.evendraft.http;

import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.stream.Stream;
import org.evendraft.service.ReadPlatforms;
import org.evendraft.service.Reason;
import org.evendraft.service.Refusal;

/** Entity tags of platform revisions, and the conditions that requests make of them (RFC 9110, 8.8.3 and 13.1). */
final class Tags {
    private static final String ANY = "*";

    private Tags() {}

    /** The strong entity tag of a revision. */
    static String of(int revision) {
        return "\"rev-" + revision + "\"";
    }

    /** Whether a client that knows the tags of If-None-Match has this revision. */
    static boolean known(Optional<String> ifNoneMatch, int revision) {
        return ifNoneMatch.isPresent()
                && list(ifNoneMatch.get()).stream()
                        .anyMatch(
                                tag -> tag.equals(ANY) || tag.replace("W/", "").equals(of(revision)));
    }

    /**
     * The revision that a write may replace, 0 for none; empty for whichever is there.
     *
     * @throws Refusal when the conditions cannot hold
     */
    static OptionalInt expected(Request request, ReadPlatforms platforms, String platform) {
        Optional<String> ifMatch = request.header("if-match");
        Optional<String> ifNoneMatch = request.header("if-none-match");
        if (ifMatch.isEmpty() && ifNoneMatch.isEmpty()) {
            return OptionalInt.empty();
        }
        int current = current(platforms, platform);
        if (ifNoneMatch.isPresent() && current > 0 && known(ifNoneMatch, current)) {
            throw stale("Platform " + platform + " exists, at revision " + current + ".");
        }
        if (ifMatch.isPresent() && !matches(list(ifMatch.get()), current)) {
            String state = current == 0 ? "does not exist" : "is at revision " + current;
            throw stale("Platform " + platform + " " + state + ", and If-Match is " + ifMatch.get() + ".");
        }
        return OptionalInt.of(current);
    }

    private static boolean matches(List<String> tags, int current) {
        return current > 0 && tags.stream().anyMatch(tag -> tag.equals(ANY) || tag.equals(of(current)));
    }

    private static int current(ReadPlatforms platforms, String platform) {
        return platforms.list().platforms().stream()
                .filter(p -> p.id().equals(platform))
                .findFirst()
                .map(p -> p.revision())
                .orElse(0);
    }

    private static Refusal stale(String detail) {
        return new Refusal(Reason.STALE, detail);
    }

    private static List<String> list(String header) {
        return Stream.of(header.split(",", -1)).map(String::strip).toList();
    }
}
