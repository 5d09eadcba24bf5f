package org.evendraft.geometry;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Set;

/**
 * Reads the polygons of a Wavefront OBJ file: {@code v x y z} and {@code f} with three or more vertex numbers, from 1, or negative from
 * the latest back, each with texture and normal numbers after slashes or without (Wavefront, Advanced Visualizer Manual, appendix B1,
 * Object Files; from memory). Polygons become fans; lines on looks and groups are passed over.
 */
final class ObjReader {
    private static final Set<String> PASSED_OVER =
            Set.of("vn", "vt", "vp", "g", "o", "s", "mg", "usemtl", "mtllib", "l", "p", "lod", "bevel");

    private final Welder welder = new Welder(0);
    private final Triangles triangles = new Triangles();
    private int[] numbers = new int[256];
    private int count;
    private int line;

    private ObjReader() {}

    static Mesh read(byte[] bytes) throws MeshFormatException {
        ObjReader reader = new ObjReader();
        String text = new String(bytes, StandardCharsets.ISO_8859_1);
        String begun = "";
        for (String line : (Iterable<String>) text.lines()::iterator) {
            reader.line++;
            if (line.endsWith("\\")) {
                begun += line.substring(0, line.length() - 1) + " ";
            } else {
                reader.take(begun + line);
                begun = "";
            }
        }
        reader.take(begun);
        return reader.mesh();
    }

    private Mesh mesh() throws MeshFormatException {
        if (triangles.isEmpty()) {
            throw new MeshFormatException("the OBJ file has no faces");
        }
        return new Mesh(welder.coordinates(), triangles.corners()).tidied();
    }

    private void take(String text) throws MeshFormatException {
        int comment = text.indexOf('#');
        String content = (comment < 0 ? text : text.substring(0, comment)).strip();
        if (content.isEmpty()) {
            return;
        }
        String[] words = content.split("\\s+");
        switch (words[0]) {
            case "v" -> vertex(words);
            case "f" -> face(words);
            default -> {
                if (!PASSED_OVER.contains(words[0])) {
                    throw fault(NumberWords.quote(words[0]) + " is not known here");
                }
            }
        }
    }

    private void vertex(String[] words) throws MeshFormatException {
        if (words.length < 4) {
            throw fault("a vertex needs three coordinates");
        }
        if (count == numbers.length) {
            numbers = Arrays.copyOf(numbers, 2 * count);
        }
        numbers[count++] = welder.number(coordinate(words[1]), coordinate(words[2]), coordinate(words[3]));
    }

    private double coordinate(String word) throws MeshFormatException {
        return NumberWords.finite(word).orElseThrow(() -> fault(NumberWords.quote(word) + " is no finite number"));
    }

    private void face(String[] words) throws MeshFormatException {
        if (words.length < 4) {
            throw fault("a face needs three vertices or more");
        }
        List<Integer> polygon = new ArrayList<>();
        for (int i = 1; i < words.length; i++) {
            polygon.add(corner(words[i]));
        }
        int start = bestStart(polygon);
        int n = polygon.size();
        for (int i = 1; i + 1 < n; i++) {
            triangles.add(polygon.get(start), polygon.get((start + i) % n), polygon.get((start + i + 1) % n));
        }
    }

    private int corner(String word) throws MeshFormatException {
        int slash = word.indexOf('/');
        String number = slash < 0 ? word : word.substring(0, slash);
        try {
            int given = Integer.parseInt(number);
            int index = given < 0 ? count + given : given - 1;
            if (given != 0 && index >= 0 && index < count) {
                return numbers[index];
            }
        } catch (NumberFormatException e) {
            throw fault(NumberWords.quote(word) + " is no vertex number");
        }
        throw fault("there is no vertex " + number + " before this line, which has " + count);
    }

    /** The corner whose fan has no triangle without area, as a corner in a straight edge would make one; else the first. */
    private int bestStart(List<Integer> polygon) {
        int n = polygon.size();
        for (int start = 0; n > 3 && start < n; start++) {
            boolean good = true;
            for (int i = 1; i + 1 < n; i++) {
                good = good
                        && !isFlat(polygon.get(start), polygon.get((start + i) % n), polygon.get((start + i + 1) % n));
            }
            if (good) {
                return start;
            }
        }
        return 0;
    }

    private boolean isFlat(int a, int b, int c) {
        return MeshDefects.isFlat(welder.point(a), welder.point(b), welder.point(c));
    }

    private MeshFormatException fault(String detail) {
        return new MeshFormatException("line " + line + " of the OBJ file: " + detail);
    }
}
