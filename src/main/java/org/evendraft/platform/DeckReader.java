package org.evendraft.platform;

import java.util.ArrayList;
import java.util.List;

/** Reads what lies on and over deck: areas, elements in the wind, openings; and draft marks. */
final class DeckReader {
    private DeckReader() {}

    static List<DeckArea> areas(List<Fields> list) {
        Ids ids = new Ids("deck area");
        List<DeckArea> areas = new ArrayList<>();
        for (Fields fields : list) {
            String id = ids.read(fields);
            int before = fields.faults().count();
            List<double[]> outline = fields.rows("outline", 2, Range.COORDINATE);
            if (fields.faults().count() == before) {
                OutlineCheck.fault(outline).ifPresent(fault -> fields.meaning("outline", fault));
            }
            areas.add(new DeckArea(
                    id,
                    outline.stream().map(c -> new DeckArea.Corner(c[0], c[1])).toList(),
                    fields.number("z", Range.COORDINATE),
                    fields.optionalNumber("maxLoad", Range.NOT_NEGATIVE),
                    fields.optionalNumber("maxPressure", Range.NOT_NEGATIVE)));
            fields.noOthers();
        }
        return areas;
    }

    static List<WindageElement> windage(List<Fields> list) {
        List<WindageElement> elements = new ArrayList<>();
        for (Fields fields : list) {
            WindageElement element = new WindageElement(
                    fields.text("name", "element " + (elements.size() + 1)),
                    fields.number("x", Range.COORDINATE),
                    fields.number("y", Range.COORDINATE),
                    fields.number("zFrom", Range.COORDINATE),
                    fields.number("zTo", Range.COORDINATE),
                    fields.number("areaX", Range.NOT_NEGATIVE),
                    fields.number("areaY", Range.NOT_NEGATIVE),
                    fields.number("areaZ", Range.NOT_NEGATIVE, 0),
                    fields.number("shapeCoefficient", Range.NOT_NEGATIVE));
            if (element.zFrom() >= element.zTo()) {
                fields.meaning(
                        "zTo",
                        "zTo must be greater than zFrom: " + Words.given(element.zTo()) + " is not greater than "
                                + Words.given(element.zFrom()));
            }
            fields.noOthers();
            elements.add(element);
        }
        return elements;
    }

    static List<Opening> openings(List<Fields> list) {
        Ids ids = new Ids("opening");
        List<Opening> openings = new ArrayList<>();
        for (Fields fields : list) {
            openings.add(new Opening(
                    ids.read(fields),
                    fields.position(),
                    fields.choice("closing", Opening.Closing.class).orElse(Opening.Closing.NONE)));
            fields.noOthers();
        }
        return openings;
    }

    static List<DraftMark> draftMarks(List<Fields> list) {
        Ids ids = new Ids("draft mark");
        List<DraftMark> marks = new ArrayList<>();
        for (Fields fields : list) {
            marks.add(new DraftMark(
                    ids.read(fields),
                    fields.number("x", Range.COORDINATE),
                    fields.number("y", Range.COORDINATE),
                    fields.number("zero", Range.COORDINATE, 0)));
            fields.noOthers();
        }
        return marks;
    }
}
