package org.evendraft.platform;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.List;

/** Changes the curve of greatest KG in a platform's document. */
public final class KgCurves {
    private KgCurves() {}

    /**
     * The platform document with one mode's curve replaced; the rest as it was. It is for {@link PlatformReader} to check.
     *
     * @param document a platform document that has been read without fault; it is not changed
     * @param mode the mode's id
     * @param points the new curve
     * @throws IllegalArgumentException when there is no such mode
     */
    public static ObjectNode replaced(JsonNode document, String mode, List<Mode.KgPoint> points) {
        ObjectNode copy = document.deepCopy();
        for (JsonNode candidate : copy.path("modes")) {
            if (candidate instanceof ObjectNode node
                    && mode.equals(node.path("id").textValue())) {
                ArrayNode curve = node.putArray("allowableKg");
                points.forEach(p -> curve.addArray().add(p.draft()).add(p.kg()));
                return copy;
            }
        }
        throw new IllegalArgumentException("no mode " + mode);
    }
}
