package org.evendraft.geometry;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;

class HorizontalSectionTest {
    private static final double ROUNDING = 1e-9;

    private static final PlanLine ALONG_X = new PlanLine(0, 0.1, 1, 0);

    private static final Solid BOX = Solid.box(new Vec3(-2, -3, 0), new Vec3(4, 3, 5));

    /** A trough along x: two legs 1 m wide, 5 m apart, on a floor 1 m thick. */
    private static final Solid TROUGH = Solid.prism(
            Axis.X,
            0,
            10,
            List.of(
                    new double[] {0, 0},
                    new double[] {7, 0},
                    new double[] {7, 4},
                    new double[] {6, 4},
                    new double[] {6, 1},
                    new double[] {1, 1},
                    new double[] {1, 4},
                    new double[] {0, 4}),
            0);

    private static double area(Solid solid, double z) {
        return HorizontalSection.of(solid, z).contours().stream()
                .mapToDouble(Contour::area)
                .sum();
    }

    @Test
    void aBoxIsCutInItsRectangle() {
        List<Contour> contours = HorizontalSection.of(BOX, 2).contours();
        assertThat(contours).singleElement().satisfies(c -> {
            assertThat(c.perimeter()).isCloseTo(24, within(ROUNDING));
            assertThat(c.area()).isCloseTo(36, within(ROUNDING));
            assertThat(c.centroid()).containsExactly(new double[] {1, 0}, within(ROUNDING));
            assertThat(c.lesserWidth()).isEqualTo(6);
        });
        assertThat(HorizontalSection.of(BOX, 5.1).contours()).isEmpty();
    }

    /** An independent way to the same area: the section that the engine integrates along its edges. */
    @Test
    void contoursBoundTheAreaThatTheCutOfTheSameMeshHas() {
        Solid cone = Solid.cylinder(new Vec3(1, 2, 0), new Vec3(4, 1, 9), 6, 3);
        Solid lying = Solid.cylinder(new Vec3(-5, 0, 3), new Vec3(5, 2, 4), 4, 4);
        for (Solid solid : List.of(BOX, TROUGH, cone, lying)) {
            for (double z : new double[] {0.7, 2.3, 3.9}) {
                Cut cut = new Cut(Plane.ofSlopes(z, 0, 0));
                cut.addMesh(1, solid.mesh());
                assertThat(area(solid, z)).isCloseTo(cut.area(), within(ROUNDING));
            }
        }
    }

    @Test
    void aLineMeetsEachLegOfATrough() {
        HorizontalSection legs = HorizontalSection.of(TROUGH, 2);
        List<Chord> chords = legs.chords(new PlanLine(5, -1, 0, 1));
        assertThat(chords).hasSize(2);
        assertThat(chords.get(0).from()).isCloseTo(1, within(ROUNDING));
        assertThat(chords.get(0).to()).isCloseTo(2, within(ROUNDING));
        assertThat(chords.get(1).within(0, 7.5)).isCloseTo(0.5, within(ROUNDING));
    }

    @Test
    void bodiesThatTouchMakeOneChordAndACutOutPartsIt() {
        Assembly pair = new Assembly(List.of(
                new Assembly.Part(BOX, false),
                new Assembly.Part(Solid.box(new Vec3(4, -1, 0), new Vec3(9, 1, 5)), false),
                new Assembly.Part(Solid.box(new Vec3(0, -1, 0), new Vec3(1, 1, 5)), true)));
        List<Chord> chords = HorizontalSection.of(pair, 2).chords(ALONG_X);
        assertThat(chords).hasSize(2);
        assertThat(chords.get(0).from()).isCloseTo(-2, within(ROUNDING));
        assertThat(chords.get(0).to()).isCloseTo(0, within(ROUNDING));
        assertThat(chords.get(1).from()).isCloseTo(1, within(ROUNDING));
        assertThat(chords.get(1).to()).isCloseTo(9, within(ROUNDING));
    }

    @Test
    void linesSquareToAContourPointAwayFromItsInside() {
        Contour contour = HorizontalSection.of(Solid.cylinder(new Vec3(3, 1, 0), new Vec3(3, 1, 5), 4, 4), 2)
                .contours()
                .get(0);
        for (double s = 0.01; s < 2 * contour.perimeter(); s += 0.4) {
            PlanLine line = contour.outward(s);
            double distance = Math.hypot(line.x() - 3, line.y() - 1);
            assertThat(distance).isCloseTo(2, within(1e-4));
            assertThat(line.dx() * (line.x() - 3) + line.dy() * (line.y() - 1)).isCloseTo(2, within(1e-4));
        }
    }
}
