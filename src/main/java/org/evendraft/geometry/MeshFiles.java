package org.evendraft.geometry;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Locale;

/**
 * Reads meshes from files of other programs: STL, ASCII or binary, with vertices within a millionth of the body's size made one, and
 * Wavefront OBJ, with vertices of the same coordinates made one. Coordinates are taken as metres in platform axes. Whether the mesh
 * is closed and faces outward is for {@link MeshDefects}.
 */
public final class MeshFiles {
    private MeshFiles() {}

    /**
     * Reads a file.
     *
     * @throws MeshFormatException when it is not what its name tells, with the line or the byte
     * @throws IOException when it cannot be read
     */
    public static Mesh read(Path file) throws IOException {
        return read(Files.readAllBytes(file), String.valueOf(file.getFileName()));
    }

    /**
     * Reads the bytes of a file.
     *
     * @param name its name, which ends in .stl or .obj in any case of letters
     * @throws MeshFormatException when they are not what the name tells, with the line or the byte
     */
    public static Mesh read(byte[] bytes, String name) throws MeshFormatException {
        String lower = name.toLowerCase(Locale.ROOT);
        if (lower.endsWith(".stl")) {
            return StlReader.read(bytes);
        }
        if (lower.endsWith(".obj")) {
            return ObjReader.read(bytes);
        }
        throw new MeshFormatException("the name of a mesh file must end in .stl or .obj, not " + name);
    }
}
