package org.evendraft.geometry;

import java.nio.ByteBuffer;
import java.nio.ByteOrder;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;

/**
 * Reads STL. The binary form has a header of 80 bytes, the count of triangles, and 50 bytes for each: normal, three vertices (four-byte
 * floats, least byte first), two bytes more; the ASCII form lists the same in words (3D Systems, StereoLithography Interface
 * Specification, 1989; from memory). The normals are not used: the order of the vertices tells the outside.
 */
final class StlReader {
    private static final int HEADER = 80;
    private static final int START = HEADER + Integer.BYTES;
    private static final int RECORD = 50;
    private static final int NORMAL = 3 * Float.BYTES;

    /** Vertices closer than this part of the body's greatest extent are one. */
    private static final double SAME = 1e-6;

    private StlReader() {}

    static Mesh read(byte[] bytes) throws MeshFormatException {
        boolean saysSolid = new String(bytes, 0, Math.min(bytes.length, HEADER), StandardCharsets.ISO_8859_1)
                .stripLeading()
                .startsWith("solid");
        if (bytes.length >= START) {
            long count = Integer.toUnsignedLong(little(bytes).getInt(HEADER));
            if (bytes.length == START + RECORD * count) {
                return welded(binary(bytes, (int) count));
            }
            if (!saysSolid) {
                throw new MeshFormatException("the STL file tells of " + count + " triangles, which take "
                        + (START + RECORD * count) + " bytes, but has " + bytes.length + " bytes");
            }
        } else if (!saysSolid) {
            throw new MeshFormatException("the file is too short for STL: " + bytes.length + " bytes");
        }
        return welded(new StlText(bytes).vertices());
    }

    private static ByteBuffer little(byte[] bytes) {
        return ByteBuffer.wrap(bytes).order(ByteOrder.LITTLE_ENDIAN);
    }

    private static double[] binary(byte[] bytes, int count) throws MeshFormatException {
        ByteBuffer in = little(bytes);
        double[] vertices = new double[9 * count];
        for (int i = 0, k = 0; i < count; i++) {
            int at = START + RECORD * i + NORMAL;
            for (int j = 0; j < 9; j++, at += Float.BYTES) {
                vertices[k++] = finite(in.getFloat(at), at);
            }
        }
        return vertices;
    }

    private static double finite(float value, int offset) throws MeshFormatException {
        if (!Float.isFinite(value)) {
            throw new MeshFormatException(
                    "the coordinate at byte " + offset + " of the STL file is not a finite number");
        }
        return value;
    }

    /** A mesh of triangles that each bring their own three vertices. */
    private static Mesh welded(double[] vertices) throws MeshFormatException {
        double[] lo = new double[3];
        double[] hi = new double[3];
        Arrays.fill(lo, Double.POSITIVE_INFINITY);
        Arrays.fill(hi, Double.NEGATIVE_INFINITY);
        for (int i = 0; i < vertices.length; i++) {
            lo[i % 3] = Math.min(lo[i % 3], vertices[i]);
            hi[i % 3] = Math.max(hi[i % 3], vertices[i]);
        }
        double extent = Math.max(hi[0] - lo[0], Math.max(hi[1] - lo[1], hi[2] - lo[2]));
        Welder welder = new Welder(SAME * Math.max(0, extent));
        Triangles triangles = new Triangles();
        for (int i = 0; i < vertices.length; i += 9) {
            int a = welder.number(vertices[i], vertices[i + 1], vertices[i + 2]);
            int b = welder.number(vertices[i + 3], vertices[i + 4], vertices[i + 5]);
            int c = welder.number(vertices[i + 6], vertices[i + 7], vertices[i + 8]);
            triangles.add(a, b, c);
        }
        if (triangles.isEmpty()) {
            throw new MeshFormatException("the STL file has no triangles");
        }
        return new Mesh(welder.coordinates(), triangles.corners());
    }
}
