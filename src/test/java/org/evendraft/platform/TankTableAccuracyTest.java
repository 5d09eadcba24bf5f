package org.evendraft.platform;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.Scale;
import org.assertj.core.data.Offset;
import org.evendraft.geometry.Assembly;
import org.evendraft.geometry.Axis;
import org.evendraft.geometry.SecondMoments;
import org.evendraft.geometry.Solid;
import org.evendraft.geometry.Vec3;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/** A table made from a shape, read by linear interpolation, against the shape itself: within 0.1 % all the way. */
class TankTableAccuracyTest {
    private static final double TOLERANCE = 1e-3;
    private static final double PERMEABILITY = 0.97;

    /** A depth of liquid whose thousandth is of no account (m). */
    private static final double FLAT = 1e-4;

    /** Shapes of tanks: straight, curved, pointed, with a step, round a corner, cut out. */
    enum Shape {
        BOX(box(3, 15, -4, 2, 1, 6)),
        LYING_CYLINDER(Solid.cylinder(new Vec3(-5, 3, 4), new Vec3(9, 3, 4), 5, 5)),
        SLANTING_CYLINDER(Solid.cylinder(new Vec3(-5, 3, 4), new Vec3(3, 5, 9), 4, 4)),
        CONE_ON_ITS_TIP(Solid.cylinder(new Vec3(2, -3, 1), new Vec3(2, -3, 9), 0, 6)),
        CONE_ON_ITS_BASE(Solid.cylinder(new Vec3(2, -3, 1), new Vec3(2, -3, 9), 6, 0)),
        LYING_FRUSTUM(Solid.cylinder(new Vec3(0, 0, 4), new Vec3(10, 0, 4), 5, 3)),
        ROUNDED_PRISM(Solid.prism(
                Axis.X,
                -6,
                6,
                List.of(new double[] {-5, 0}, new double[] {5, 0}, new double[] {5, 7}, new double[] {-5, 7}),
                2)),
        WEDGE(Solid.prism(Axis.Y, -2, 5, List.of(new double[] {0, 0}, new double[] {8, 6}, new double[] {0, 6}), 0)),
        L_SHAPE(box(0, 12, 0, 5, 0, 2), box(0, 4, 0, 5, 2, 9)),
        TWO_WELLS(box(0, 4, 0, 4, 0, 3), box(10, 12, 0, 4, 1, 5)),
        ONE_OVER_THE_OTHER(box(0, 4, 0, 4, 0, 3), box(1, 3, 1, 5, 5, 8));

        private final Assembly space;
        private final ShapeCalibration exact;
        private final TableCalibration table;

        Shape(Solid... solids) {
            space = new Assembly(List.of(solids).stream()
                    .map(s -> new Assembly.Part(s, false))
                    .toList());
            exact = new ShapeCalibration(space, PERMEABILITY);
            table = new TableCalibration(exact.table(), java.util.Optional.empty());
        }
    }

    private static Solid box(double x0, double x1, double y0, double y1, double z0, double z1) {
        return Solid.box(new Vec3(x0, y0, z0), new Vec3(x1, y1, z1));
    }

    @Provide
    Arbitrary<Shape> shapes() {
        return Arbitraries.of(Shape.class);
    }

    private static Offset<Double> of(double scale) {
        return within(TOLERANCE * scale);
    }

    @Property(tries = 1500, seed = "20260612")
    void liquidReadByVolumeIsWithinAThousandthOfTheExact(
            @ForAll("shapes") Shape shape, @ForAll @DoubleRange(min = 2e-6, max = 1) @Scale(7) double fraction) {
        double volume = fraction * shape.exact.fullVolume();
        Liquid exact = shape.exact.holding(volume);
        Liquid read = shape.table.holding(volume);
        Vec3 size = shape.space.greatest().minus(shape.space.least());
        assertThat(read.centre().x()).isCloseTo(exact.centre().x(), of(size.x()));
        assertThat(read.centre().y()).isCloseTo(exact.centre().y(), of(size.y()));
        double bottom = shape.space.lowest();
        assertThat(read.centre().z())
                .isCloseTo(exact.centre().z(), of(exact.centre().z() - bottom + FLAT));
        if (fraction < 1 - 2e-6) {
            sameSurface(read.surface(), exact.surface());
        }
    }

    private static void sameSurface(SecondMoments read, SecondMoments exact) {
        assertThat(read.transverse()).isCloseTo(exact.transverse(), of(exact.transverse()));
        assertThat(read.longitudinal()).isCloseTo(exact.longitudinal(), of(exact.longitudinal()));
        double scale = Math.sqrt(exact.transverse() * exact.longitudinal());
        assertThat(read.product()).isCloseTo(exact.product(), of(scale));
    }

    @Property(tries = 1500, seed = "20260612")
    void volumeReadByLevelIsWithinAThousandthOfTheExact(
            @ForAll("shapes") Shape shape, @ForAll @DoubleRange(min = 0, max = 1) @Scale(7) double part) {
        double level = part * shape.exact.fullLevel();
        double exact = shape.exact.volumeAt(level);
        if (exact > 2e-6 * shape.exact.fullVolume()) {
            assertThat(shape.table.volumeAt(level)).isCloseTo(exact, of(exact));
            double back = shape.exact.holding(exact).level();
            assertThat(shape.exact.volumeAt(back)).isCloseTo(exact, within(1e-12 * shape.exact.fullVolume()));
        }
    }

    @ParameterizedTest
    @EnumSource
    void theTableIsOneThatCanBeReadBack(Shape shape) {
        List<TableRow> rows = shape.exact.table();
        assertThat(TableCheck.faults(rows)).isEmpty();
        assertThat(TankTables.fromJson(TankTables.toJson(rows))).isEqualTo(rows);
        assertThat(rows).hasSizeLessThan(500);
        assertThat(rows.get(0).volume()).isZero();
        assertThat(rows.get(rows.size() - 1).volume()).isEqualTo(shape.exact.fullVolume());
        assertThat(rows.get(rows.size() - 1).level()).isEqualTo(shape.exact.fullLevel());
    }

    @ParameterizedTest
    @EnumSource
    void theGreatestSurfaceIsThatOfTheLevelWithMost(Shape shape) {
        double transverse = 0;
        double longitudinal = 0;
        for (int i = 1; i < 1000; i++) {
            SecondMoments s =
                    shape.exact.holding(shape.exact.fullVolume() * i / 1000).surface();
            transverse = Math.max(transverse, s.transverse());
            longitudinal = Math.max(longitudinal, s.longitudinal());
        }
        SecondMoments greatest = shape.exact.greatestSurface();
        assertThat(greatest.transverse()).isBetween(transverse * (1 - 1e-3), transverse * (1 + 1e-2));
        assertThat(greatest.longitudinal()).isBetween(longitudinal * (1 - 1e-3), longitudinal * (1 + 1e-2));
    }

    /** Closed forms of a lying cylinder that is half full (centroid of a half circle: 4r/3π under its chord). */
    @Test
    void aHalfFullLyingCylinderIsKnownInClosedForm() {
        TableCalibration table = Shape.LYING_CYLINDER.table;
        double r = 2.5;
        Liquid half = table.holding(table.fullVolume() / 2);
        assertThat(half.level()).isCloseTo(r, within(1e-3 * r));
        assertThat(half.centre().z()).isCloseTo(4 - 4 * r / (3 * Math.PI), within(1e-3 * r));
        double iT = PERMEABILITY * 14 * Math.pow(2 * r, 3) / 12;
        assertThat(half.surface().transverse()).isCloseTo(iT, within(1e-3 * iT));
    }
}
