package org.evendraft.platform;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import org.evendraft.geometry.Mesh;
import org.evendraft.geometry.MeshDefects;
import org.evendraft.geometry.Solid;

/** Reads a body given by vertices and triangles. */
final class MeshReader {
    private MeshReader() {}

    static Optional<Solid> read(Fields fields) {
        int before = fields.faults().count();
        List<double[]> vertices = fields.rows("vertices", 3, Range.COORDINATE);
        int[] corners = corners(fields, fields.elements("triangles"), vertices.size());
        if (fields.faults().count() > before) {
            return Optional.empty();
        }
        if (corners.length == 0) {
            fields.form("triangles", "a mesh must have triangles");
            return Optional.empty();
        }
        double[] coordinates = vertices.stream().flatMapToDouble(Arrays::stream).toArray();
        Mesh mesh = new Mesh(coordinates, corners).tidied();
        List<String> defects = MeshDefects.of(mesh);
        defects.forEach(defect -> fields.meaning("triangles", defect));
        return defects.isEmpty() ? Optional.of(Solid.ofMesh(mesh)) : Optional.empty();
    }

    private static int[] corners(Fields fields, List<JsonNode> triangles, int vertices) {
        int[] corners = new int[3 * triangles.size()];
        for (int i = 0; i < triangles.size(); i++) {
            JsonNode triangle = triangles.get(i);
            if (!triangle.isArray() || triangle.size() != 3) {
                form(fields, i, "each triangle must be a list of 3 vertex numbers, not " + Words.what(triangle));
                continue;
            }
            for (int k = 0; k < 3; k++) {
                corners[3 * i + k] = corner(fields, i, triangle.get(k), vertices);
            }
        }
        return corners;
    }

    private static int corner(Fields fields, int triangle, JsonNode number, int vertices) {
        if (!number.isIntegralNumber()) {
            form(fields, triangle, "a vertex number must be a whole number, not " + Words.what(number));
            return 0;
        }
        if (!number.canConvertToInt() || number.intValue() < 0 || number.intValue() >= vertices) {
            fields.faults()
                    .meaning(
                            fields.pointer("triangles") + "/" + triangle,
                            "there is no vertex " + number.asText() + "; they are numbered from 0 to "
                                    + (vertices - 1));
            return 0;
        }
        return number.intValue();
    }

    private static void form(Fields fields, int triangle, String detail) {
        fields.faults().form(fields.pointer("triangles") + "/" + triangle, detail);
    }
}
