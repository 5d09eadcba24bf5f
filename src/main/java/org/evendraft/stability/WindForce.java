package org.evendraft.stability;

import java.util.List;

/**
 * The force of a steady wind on a platform held at an inclination, and the moment with which it heels it. Component names are those
 * of the JSON answer.
 *
 * @param speed wind speed (m/s)
 * @param force horizontal force (kN)
 * @param moment moment about the lateral resistance centre (kN·m)
 * @param arm the moment over the platform's weight (m)
 * @param resistanceDepth depth of the lateral resistance centre under the water (m)
 * @param contributions what each element adds in each height band
 */
public record WindForce(
        double speed,
        double force,
        double moment,
        double arm,
        double resistanceDepth,
        List<Contribution> contributions) {

    /** Copies the list. */
    public WindForce {
        contributions = List.copyOf(contributions);
    }

    /**
     * What an element adds in a height band.
     *
     * @param element name of the windage element
     * @param from lower bound of its part in the band, over the water (m)
     * @param to upper bound (m)
     * @param area projected area of the part (m²)
     * @param shapeCoefficient shape coefficient C_S
     * @param heightCoefficient height coefficient C_H
     * @param force force (kN)
     * @param lever height of the part's middle over the lateral resistance centre (m)
     * @param moment force times lever (kN·m)
     */
    public record Contribution(
            String element,
            double from,
            double to,
            double area,
            double shapeCoefficient,
            double heightCoefficient,
            double force,
            double lever,
            double moment) {}
}
