package org.evendraft.geometry;

import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.Locale;

/** Reads the words of an ASCII STL file. */
final class StlText {
    private static final int FIRST_LENGTH = 9 * 256;

    private final byte[] text;
    private int at;
    private int line = 1;
    private double[] vertices = new double[FIRST_LENGTH];
    private int size;

    StlText(byte[] text) {
        this.text = text;
    }

    /** Nine coordinates for each triangle in turn. */
    double[] vertices() throws MeshFormatException {
        expect("solid");
        skipLine();
        String word = word();
        while (!word.isEmpty()) {
            switch (word) {
                case "facet" -> facet();
                case "endsolid", "solid" -> skipLine();
                default -> throw fault("facet or endsolid", word);
            }
            word = word();
        }
        return Arrays.copyOf(vertices, size);
    }

    private void facet() throws MeshFormatException {
        expect("normal");
        for (int i = 0; i < 3; i++) {
            word();
        }
        expect("outer");
        expect("loop");
        for (int i = 0; i < 3; i++) {
            expect("vertex");
            add(number());
            add(number());
            add(number());
        }
        expect("endloop");
        expect("endfacet");
    }

    private void add(double coordinate) {
        if (size == vertices.length) {
            vertices = Arrays.copyOf(vertices, 2 * size);
        }
        vertices[size++] = coordinate;
    }

    private double number() throws MeshFormatException {
        String word = word();
        return NumberWords.finite(word).orElseThrow(() -> fault("a number", word));
    }

    private void expect(String wanted) throws MeshFormatException {
        String word = word();
        if (!word.equals(wanted)) {
            throw fault(wanted, word);
        }
    }

    private MeshFormatException fault(String wanted, String found) {
        return new MeshFormatException("line " + line + " of the STL file: expected " + wanted + ", found "
                + (found.isEmpty() ? "the end of the file" : NumberWords.quote(found)));
    }

    private void skipLine() {
        while (at < text.length && text[at] != '\n') {
            at++;
        }
    }

    /** The next word in small letters; empty at the end. */
    private String word() {
        while (at < text.length && text[at] <= ' ' && text[at] >= 0) {
            line += text[at] == '\n' ? 1 : 0;
            at++;
        }
        int from = at;
        while (at < text.length && (text[at] > ' ' || text[at] < 0)) {
            at++;
        }
        return new String(text, from, at - from, StandardCharsets.ISO_8859_1).toLowerCase(Locale.ROOT);
    }
}
