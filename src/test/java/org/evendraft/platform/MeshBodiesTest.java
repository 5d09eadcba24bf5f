package org.evendraft.platform;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.List;
import org.evendraft.geometry.Mesh;
import org.evendraft.geometry.Solid;
import org.evendraft.geometry.Vec3;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class MeshBodiesTest {
    private static final Mesh TETRAHEDRON =
            new Mesh(new double[] {0, 0, 0, 6, 0, 0, 0, 6, 0, 0, 0, 6}, new int[] {0, 2, 1, 0, 1, 3, 1, 2, 3, 2, 0, 3});

    private static ObjectNode platformOf(ObjectNode body) {
        ObjectNode document = Examples.object("{ \"id\": \"p\", \"hull\": { \"bodies\": [] },"
                + " \"lightship\": { \"mass\": 10, \"x\": 0, \"y\": 0, \"z\": 1 } }");
        ((ArrayNode) document.at("/hull/bodies")).add(body);
        return document;
    }

    @Test
    void aMeshWrittenAsABodyReadsBack() {
        PreparedPlatform read = PlatformReader.read(platformOf(MeshBodies.toJson(TETRAHEDRON, "fin")));
        assertThat(read.platform().hull().get(0).name()).isEqualTo("fin");
        assertThat(read.hull().volume()).isCloseTo(36, within(1e-12));
        assertThat(read.platform().hull().get(0).solid().mesh()).isEqualTo(TETRAHEDRON.tidied());
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "triangles | [[0, 2, 1], [0, 1, 3], [1, 2, 3]] | /triangles | MEANING | hole",
                "triangles | [[0, 1, 2], [0, 3, 1], [1, 3, 2], [2, 3, 0]] | /triangles | MEANING | inside out",
                "triangles | [[0, 2, 1], [0, 1, 3], [1, 2, 3], [2, 0, 3], [1, 1, 1]] | /triangles | MEANING | triangle 4 has no area",
                "triangles | [[0, 2, 1], [0, 1, 3], [1, 2, 3], [2, 0, 7]] | /triangles/3 | MEANING | no vertex 7",
                "triangles | [[0, 2, 1], [0, 1, 3], [1, 2, 3], [2, 0, 1.5]] | /triangles/3 | FORM | whole number",
                "triangles | [[0, 2]] | /triangles/0 | FORM | 3 vertex numbers",
                "triangles | [] | /triangles | FORM | must have triangles",
                "triangles | null | /triangles | FORM | must have triangles",
                "vertices | [[0, 0, 0], [1, 2]] | /vertices/1 | FORM | 3 numbers",
                "vertices | [[0, 0, 1e400], [6, 0, 0], [0, 6, 0], [0, 0, 6]] | /vertices/0/2 | FORM | finite"
            })
    void tellsWhatIsWrongWithAMesh(String property, String value, String at, Fault.Kind kind, String words) {
        ObjectNode body = MeshBodies.toJson(TETRAHEDRON, "fin");
        body.set(property, Examples.parse(value));
        List<Fault> faults = PlatformReaderTest.faults(platformOf(body));
        assertThat(faults).anySatisfy(fault -> {
            assertThat(fault.pointer()).isEqualTo("/hull/bodies/0" + at);
            assertThat(fault.kind()).isEqualTo(kind);
            assertThat(fault.detail()).contains(words);
        });
    }

    /** A cylinder of as many triangles as come near a million takes the whole way from document to platform. */
    @Test
    void readsABodyOfAMillionTriangles() {
        Mesh fine = Solid.cylinder(Vec3.ZERO, new Vec3(0, 0, 40), 20, 20).mesh();
        while (fine.triangleCount() < 1_000_000) {
            fine = quartered(fine);
        }
        PreparedPlatform read = PlatformReader.read(platformOf(MeshBodies.toJson(fine, "column")));
        assertThat(read.platform().hull().get(0).solid().mesh().triangleCount()).isGreaterThan(1_000_000);
        assertThat(read.hull().volume()).isCloseTo(4000 * Math.PI, within(1e-6));
    }

    private static Mesh quartered(Mesh mesh) {
        int n = mesh.triangleCount();
        double[] xyz = new double[18 * n];
        int[] corners = new int[12 * n];
        for (int i = 0; i < n; i++) {
            for (int k = 0; k < 3; k++) {
                Vec3 a = mesh.vertex(mesh.corner(i, k));
                Vec3 b = mesh.vertex(mesh.corner(i, (k + 1) % 3));
                put(xyz, 6 * i + k, a);
                put(xyz, 6 * i + 3 + k, a.plus(b).times(0.5));
            }
            int[] four = {0, 3, 5, 1, 4, 3, 2, 5, 4, 3, 4, 5};
            for (int k = 0; k < 12; k++) {
                corners[12 * i + k] = 6 * i + four[k];
            }
        }
        return new Mesh(xyz, corners).tidied();
    }

    private static void put(double[] xyz, int i, Vec3 v) {
        xyz[3 * i] = v.x();
        xyz[3 * i + 1] = v.y();
        xyz[3 * i + 2] = v.z();
    }
}
