package org.evendraft.platform;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** Reads the modes of operation of a platform. */
final class ModeReader {
    private ModeReader() {}

    /** Reads all modes of a list. */
    static List<Mode> read(List<Fields> list) {
        Ids ids = new Ids("mode");
        List<Mode> modes = new ArrayList<>();
        for (Fields fields : list) {
            modes.add(mode(fields, ids.read(fields)));
        }
        return modes;
    }

    private static Mode mode(Fields fields, String id) {
        Mode mode = new Mode(
                id,
                fields.text("name", id),
                draftRange(fields),
                fields.optionalObject("minGm").map(GmBound::read),
                allowableKg(fields),
                fields.optionalNumber("maxHeel", Range.ANGLE),
                fields.optionalNumber("maxTrim", Range.ANGLE),
                fields.optionalNumber("maxDeckLoad", Range.NOT_NEGATIVE),
                fields.optionalNumber("windSpeed", Range.NOT_NEGATIVE));
        fields.noOthers();
        return mode;
    }

    private static Optional<Mode.DraftRange> draftRange(Fields fields) {
        Optional<Mode.DraftRange> range =
                fields.optionalNumbers("draftRange", 2, Range.COORDINATE).map(r -> new Mode.DraftRange(r[0], r[1]));
        if (range.isPresent() && range.get().least() >= range.get().greatest()) {
            fields.meaning(
                    "draftRange",
                    "the least draft must come first: "
                            + Words.given(range.get().least()) + " is not less than "
                            + Words.given(range.get().greatest()));
        }
        return range;
    }

    private static List<Mode.KgPoint> allowableKg(Fields fields) {
        int before = fields.faults().count();
        List<Mode.KgPoint> curve = fields.rows("allowableKg", 2, Range.COORDINATE).stream()
                .map(r -> new Mode.KgPoint(r[0], r[1]))
                .toList();
        for (int i = 1; i < curve.size() && fields.faults().count() == before; i++) {
            if (curve.get(i).draft() <= curve.get(i - 1).draft()) {
                fields.faults()
                        .meaning(
                                fields.pointer("allowableKg") + "/" + i + "/0",
                                "drafts must rise: " + Words.given(curve.get(i).draft()) + " follows "
                                        + Words.given(curve.get(i - 1).draft()));
            }
        }
        return curve;
    }
}
