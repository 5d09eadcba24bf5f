package org.evendraft.platform;

import java.util.List;
import org.evendraft.geometry.SecondMoments;
import org.evendraft.geometry.Vec3;

/** What a tank's shape or table tells of its contents, by level or volume. Immutable. */
public sealed interface Calibration permits ShapeCalibration, TableCalibration {

    /** The full volume, permeability counted (m³). */
    double fullVolume();

    /** The least level that the calibration knows (m): 0, or that of the table's first row. */
    double leastLevel();

    /** The level of the full tank (m). */
    double fullLevel();

    /**
     * The volume at a level.
     *
     * @param level level (m), from the least to that of the full tank
     * @throws IllegalArgumentException outside that
     */
    double volumeAt(double level);

    /**
     * The liquid of a volume, the platform upright.
     *
     * @param volume volume (m³), from 0 to the full volume
     * @throws IllegalArgumentException outside that
     */
    Liquid holding(double volume);

    /**
     * The liquid of a volume under a surface of given slopes.
     *
     * @param volume volume (m³)
     * @param slopeX rise of the surface per metre forward
     * @param slopeY rise of the surface per metre to port
     * @param guess height of the surface over the platform's origin, to start from (m); not a number when there is none
     */
    Inclined inclined(double volume, double slopeX, double slopeY, double guess);

    /**
     * Adds the liquid under a surface of the slopes at which liquids are gathered.
     *
     * @param gathered where to
     * @param tank number of the tank there
     * @param upright the liquid with the platform upright, as {@link #holding} tells it
     * @param density its density (t/m³)
     */
    void addInclined(InclinedLiquids gathered, int tank, Liquid upright, double density);

    /** The greatest transverse and the greatest longitudinal second moment over all levels, each by itself; product 0 (m⁴). */
    SecondMoments greatestSurface();

    /**
     * Rows between which volume, centroid and second moments are linear within 0.1 % of the exact value, from empty to full.
     */
    List<TableRow> table();

    /**
     * Liquid under an inclined surface, permeability counted.
     *
     * @param moment first moments of the liquid about the platform's origin (m⁴)
     * @param projected second moments of the surface seen from above, on the plane z = 0, about its own centroid (m⁴)
     * @param height height of the surface over the platform's origin (m), a guess for the next call; not a number where none is known
     */
    record Inclined(Vec3 moment, SecondMoments projected, double height) {}
}
