package org.evendraft.platform;

/**
 * A part exposed to the wind.
 *
 * @param name its name
 * @param x forward position of its middle (m)
 * @param y position to port (m)
 * @param zFrom its foot (m)
 * @param zTo its top (m)
 * @param areaX area seen along x, spread evenly over the height (m²)
 * @param areaY area seen along y, likewise (m²)
 * @param areaZ area seen along z, likewise: what only inclination exposes, such as the underside of a deck (m²)
 * @param shapeCoefficient shape coefficient
 */
public record WindageElement(
        String name,
        double x,
        double y,
        double zFrom,
        double zTo,
        double areaX,
        double areaY,
        double areaZ,
        double shapeCoefficient) {}
