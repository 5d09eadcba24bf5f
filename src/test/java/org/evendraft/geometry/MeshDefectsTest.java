package org.evendraft.geometry;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Arrays;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;

class MeshDefectsTest {
    private static final Mesh CUBE = Shapes.cube();

    private static Mesh withCorners(int... corners) {
        return new Mesh(CUBE.rawCoordinates(), corners);
    }

    private static int[] joined(int[] a, int... b) {
        return IntStream.concat(Arrays.stream(a), Arrays.stream(b)).toArray();
    }

    /** The coordinates of two meshes and their triangles, the second moved along x. */
    private static Mesh both(Mesh a, Mesh b, double dx) {
        double[] moved = b.rawCoordinates().clone();
        for (int i = 0; i < moved.length; i += 3) {
            moved[i] += dx;
        }
        double[] xyz = java.util.stream.DoubleStream.concat(Arrays.stream(a.rawCoordinates()), Arrays.stream(moved))
                .toArray();
        int[] second =
                Arrays.stream(b.rawCorners()).map(c -> c + a.vertexCount()).toArray();
        return new Mesh(xyz, joined(a.rawCorners(), second));
    }

    @Test
    void aSoundMeshHasNone() {
        assertThat(MeshDefects.of(CUBE)).isEmpty();
        assertThat(MeshDefects.of(Shapes.sphere(2, 12))).isEmpty();
        assertThat(MeshDefects.of(both(CUBE, CUBE, 3))).isEmpty();
    }

    @Test
    void tellsOfAHoleAndWhereItIs() {
        Mesh open = withCorners(Arrays.copyOf(CUBE.rawCorners(), 33));
        assertThat(MeshDefects.of(open))
                .singleElement()
                .asString()
                .contains("3 edges lack a triangle on one side", "hole near (0.000");
    }

    @Test
    void tellsThatItIsInsideOut() {
        assertThat(MeshDefects.of(CUBE.reversed())).containsExactly("the mesh is inside out: its normals point inward");
    }

    @Test
    void tellsThatOneTriangleFacesTheOtherWay() {
        int[] corners = CUBE.rawCorners().clone();
        corners[0] = 2;
        corners[1] = 0;
        assertThat(MeshDefects.of(withCorners(corners)))
                .singleElement()
                .asString()
                .contains("3 edges lie between triangles that face opposite ways");
    }

    @Test
    void namesTrianglesWithoutArea() {
        Mesh flat = withCorners(joined(CUBE.rawCorners(), 0, 0, 1, 1, 0, 0));
        assertThat(MeshDefects.of(flat)).contains("2 triangles have no area: 12, 13");
        Mesh folded = withCorners(joined(CUBE.rawCorners(), 0, 0, 1));
        assertThat(MeshDefects.of(folded)).contains("triangle 12 has no area");
    }

    @Test
    void tellsOfSurfacesThatCrossOrOfAPartInsideOut() {
        assertThat(MeshDefects.of(both(CUBE, CUBE, 0.5)))
                .singleElement()
                .asString()
                .contains("crosses itself", "0.5");
        Mesh partly = both(Shapes.sphere(2, 12), CUBE.reversed(), 5);
        assertThat(MeshDefects.of(partly)).singleElement().asString().contains("inside out", "about 1");
        Mesh hollow = both(Shapes.sphere(4, 12), CUBE.reversed(), 0);
        assertThat(MeshDefects.of(hollow)).isEmpty();
    }

    @Test
    void tellsOfNumbersThatAreNone() {
        double[] xyz = CUBE.rawCoordinates().clone();
        xyz[4] = Double.NaN;
        assertThat(MeshDefects.of(new Mesh(xyz, CUBE.rawCorners())))
                .singleElement()
                .asString()
                .contains("not a finite");
    }

    @Test
    void tidyingMakesOneOfVerticesAtOnePlaceAndDropsTheUnused() {
        double[] loose = new double[3 * 37];
        int[] corners = new int[36];
        for (int i = 0; i < 36; i++) {
            System.arraycopy(CUBE.rawCoordinates(), 3 * CUBE.rawCorners()[i], loose, 3 * i, 3);
            corners[i] = i;
        }
        loose[108] = 99;
        Mesh mesh = new Mesh(loose, corners);
        assertThat(MeshDefects.of(mesh)).isNotEmpty();
        Mesh tidy = mesh.tidied();
        assertThat(tidy.vertexCount()).isEqualTo(8);
        assertThat(MeshDefects.of(tidy)).isEmpty();
    }
}
