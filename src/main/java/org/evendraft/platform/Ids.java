package org.evendraft.platform;

import java.util.HashSet;
import java.util.Set;
import java.util.regex.Pattern;

/** The ids of one kind of thing, each given once. */
final class Ids {
    /** The first character is none of the marks: an id is a part of addresses, where {@code .} and {@code ..} mean something else. */
    private static final Pattern FORM = Pattern.compile("[A-Za-z0-9][A-Za-z0-9._-]{0,63}");

    private final String kind;
    private final Set<String> taken = new HashSet<>();

    /**
     * @param kind what has these ids, for messages
     */
    Ids(String kind) {
        this.kind = kind;
    }

    /** Reads the id of one of them. */
    String read(Fields fields) {
        String id = checked(fields);
        if (!id.isEmpty() && !taken.add(id)) {
            fields.meaning("id", "there are two of " + kind + " " + id + "; each id must be given once");
        }
        return id;
    }

    /** Reads an id by its form alone; empty after a fault. */
    static String checked(Fields fields) {
        int before = fields.faults().count();
        String id = fields.text("id");
        if (fields.faults().count() == before
                && !id.isEmpty()
                && !FORM.matcher(id).matches()) {
            fields.form(
                    "id",
                    "id must be 1 to 64 letters, digits, dots, hyphens or underscores, the first of them a letter or a digit, not "
                            + Words.quote(id));
            return "";
        }
        return id;
    }
}
