package org.evendraft.geometry;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.ByteOrder;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class MeshFilesTest {
    private static final String OBJ_CUBE = """
            # a cube
            mtllib none.mtl
            o cube
            v 0 0 0
            v 1 0 0
            v 1 1 0
            v 0 1 0
            v 0 0 1 1.0
            v 1 0 1
            v 1 1 1
            v 0 1 1
            vn 0 0 1
            f 1 4 3 2
            f 5/1 6/2 7/3 8/4
            f 1//1 2//1 6//1 5//1
            f 2/1/1 3/1/1 7/1/1 6/1/1
            f 3 4 8 \\
              7
            f -5 -8 -4 -1
            """;

    private static byte[] ascii(String text) {
        return text.getBytes(StandardCharsets.US_ASCII);
    }

    private static String asciiStl(Mesh mesh) {
        StringBuilder text = new StringBuilder("solid any name here\n");
        for (int i = 0; i < mesh.triangleCount(); i++) {
            text.append("  facet normal 0 0 0\n    outer loop\n");
            for (int k = 0; k < 3; k++) {
                Vec3 v = mesh.vertex(mesh.corner(i, k));
                text.append("      vertex ")
                        .append(v.x())
                        .append(' ')
                        .append(v.y())
                        .append(' ')
                        .append(v.z())
                        .append('\n');
            }
            text.append("    endloop\n  endfacet\n");
        }
        return text.append("endsolid any name here\n").toString();
    }

    private static byte[] binaryStl(Mesh mesh, double jitter) {
        ByteBuffer out = ByteBuffer.allocate(84 + 50 * mesh.triangleCount()).order(ByteOrder.LITTLE_ENDIAN);
        out.put(ascii("solid by name, binary by form"));
        out.position(80);
        out.putInt(mesh.triangleCount());
        for (int i = 0; i < mesh.triangleCount(); i++) {
            out.putFloat(0).putFloat(0).putFloat(0);
            for (int k = 0; k < 3; k++) {
                Vec3 v = mesh.vertex(mesh.corner(i, k));
                float off = (float) (jitter * (i % 3 - 1));
                out.putFloat((float) v.x() + off).putFloat((float) v.y() - off).putFloat((float) v.z());
            }
            out.putShort((short) 0);
        }
        return out.array();
    }

    private static void isTheCube(Mesh mesh) {
        assertThat(mesh.vertexCount()).isEqualTo(8);
        assertThat(mesh.triangleCount()).isEqualTo(12);
        assertThat(MeshDefects.of(mesh)).isEmpty();
        assertThat(Solid.ofMesh(mesh).volume()).isCloseTo(1, within(1e-5));
    }

    @Test
    void readsObjWithEverySpellingOfAFace() throws IOException {
        isTheCube(MeshFiles.read(ascii(OBJ_CUBE), "cube.obj"));
    }

    @Test
    void readsAsciiStl() throws IOException {
        isTheCube(MeshFiles.read(ascii(asciiStl(Shapes.cube())), "Cube.STL"));
    }

    @Test
    void readsBinaryStlEvenWhenItsHeaderSaysSolid() throws IOException {
        isTheCube(MeshFiles.read(binaryStl(Shapes.cube(), 0), "cube.stl"));
    }

    @Test
    void makesOneOfStlVerticesThatDifferByRoundingOnly() throws IOException {
        isTheCube(MeshFiles.read(binaryStl(Shapes.cube(), 4e-7), "cube.stl"));
        Mesh apart = MeshFiles.read(binaryStl(Shapes.cube(), 1e-3), "cube.stl");
        assertThat(apart.vertexCount()).isGreaterThan(8);
    }

    @Test
    void readsAFile(@TempDir Path folder) throws IOException {
        Path file = folder.resolve("body.obj");
        Files.writeString(file, OBJ_CUBE);
        isTheCube(MeshFiles.read(file));
    }

    @Test
    void startsAFanWhereNoTriangleIsWithoutArea() throws IOException {
        String text = OBJ_CUBE.replace("f 1 4 3 2", "v 0.5 0 0\nf 9 1 4 3 2")
                .replace("f 1//1 2//1 6//1 5//1", "f 1 9 2 6 5")
                .replace("f -5 -8 -4 -1", "f 4 1 5 8");
        Mesh mesh = MeshFiles.read(ascii(text), "cube.obj");
        assertThat(mesh.vertexCount()).isEqualTo(9);
        assertThat(MeshDefects.of(mesh)).isEmpty();
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "v 0 0 | line 1 | three coordinates",
                "v 0 0 x | line 1 | 'x'",
                "v 0 0 NaN | line 1 | 'NaN'",
                "f 1 2 3 | line 1 | no vertex 1",
                "f 1 2 | line 1 | three vertices",
                "f a b c | line 1 | 'a'",
                "curv 0 1 | line 1 | 'curv'",
                "# nothing | no faces | OBJ"
            })
    void tellsTheLineOfAnObjFileThatIsWrong(String text, String place, String word) {
        assertThatThrownBy(() -> MeshFiles.read(ascii(text), "x.obj"))
                .isInstanceOf(MeshFormatException.class)
                .hasMessageContainingAll(place, word);
    }

    @ParameterizedTest
    @CsvSource({
        "vertex 1.0, vertex one, 'a number, found ''one'''",
        "endloop, end loop, 'expected endloop'",
        "outer, inner, 'expected outer'"
    })
    void tellsTheLineOfAnAsciiStlFileThatIsWrong(String right, String wrong, String words) {
        String text = asciiStl(Shapes.cube()).replaceFirst(right, wrong);
        assertThatThrownBy(() -> MeshFiles.read(ascii(text), "x.stl"))
                .isInstanceOf(MeshFormatException.class)
                .hasMessageContaining("line ")
                .hasMessageContaining(words);
    }

    @Test
    void tellsThatAnStlFileIsCutShort() {
        byte[] whole = binaryStl(Shapes.cube(), 0);
        whole[0] = 'x';
        byte[] cut = java.util.Arrays.copyOf(whole, whole.length - 7);
        assertThatThrownBy(() -> MeshFiles.read(cut, "x.stl")).hasMessageContainingAll("12 triangles", "684", "677");
        String text = asciiStl(Shapes.cube());
        assertThatThrownBy(() -> MeshFiles.read(ascii(text.substring(0, 300)), "x.stl"))
                .hasMessageContaining("line ");
        assertThatThrownBy(() -> MeshFiles.read(new byte[10], "x.stl")).hasMessageContaining("too short");
        assertThatThrownBy(() -> MeshFiles.read(new byte[84], "x.stl")).hasMessageContaining("no triangles");
    }

    @Test
    void tellsTheByteOfACoordinateThatIsNoNumber() {
        byte[] bytes = binaryStl(Shapes.cube(), 0);
        ByteBuffer.wrap(bytes).order(ByteOrder.LITTLE_ENDIAN).putFloat(96, Float.NaN);
        assertThatThrownBy(() -> MeshFiles.read(bytes, "x.stl")).hasMessageContaining("byte 96");
    }

    @Test
    void refusesOtherNames() {
        assertThatThrownBy(() -> MeshFiles.read(new byte[0], "x.step")).hasMessageContaining("x.step");
    }
}
