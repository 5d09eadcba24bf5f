package org.evendraft.stability;

import java.util.ArrayList;
import java.util.List;
import org.evendraft.geometry.Vec3;
import org.evendraft.platform.WindageElement;
import org.evendraft.stability.WindForce.Contribution;

/**
 * Steady wind on a platform: IMO MODU Code 2009 (res. A.1023(26)), 3.2.3 to 3.2.8, {@code F = ½·C_S·C_H·ρ·V²·A}. An element shows the
 * wind {@code areaX·|w_x| + areaY·|w_y| + areaZ·|w_z|}, w the wind's direction in the platform's axes, as a block does; what stands
 * upright thus shrinks with the inclination and what lies flat comes into the wind. Its part over the inclined water, taken at its
 * middle, is split at the height bands; no element shields another (the Code). The lever is measured from the lateral
 * resistance centre, taken at the height of the centre of buoyancy.
 */
final class Wind {
    /** Density of air, MODU Code 3.2.3 (t/m³). */
    static final double AIR_DENSITY = 1.222e-3;
    /** Standard gravity, 3rd CGPM 1901 (m/s²). */
    static final double GRAVITY = 9.80665;

    private final List<WindageElement> elements;

    Wind(List<WindageElement> elements) {
        this.elements = List.copyOf(elements);
    }

    /** Whether there is anything in the wind. */
    boolean meetsSomething() {
        return !elements.isEmpty();
    }

    /**
     * Its force.
     *
     * @param at how the platform is held
     * @param towards the horizontal direction in which it blows, a unit vector in the platform's axes
     * @param speed wind speed (m/s)
     */
    WindForce on(Inclination at, Vec3 towards, double speed) {
        Waterplane water = at.waterplane();
        double depth = -water.freeboard(at.centreOfBuoyancy());
        List<Contribution> parts = new ArrayList<>();
        for (WindageElement element : elements) {
            addParts(parts, element, new Stance(water, depth, towards, speed));
        }
        double force = parts.stream().mapToDouble(Contribution::force).sum();
        double moment = parts.stream().mapToDouble(Contribution::moment).sum();
        return new WindForce(speed, force, moment, moment / (at.mass() * GRAVITY), depth, parts);
    }

    /** How platform and wind stand to each other. */
    private record Stance(Waterplane water, double depth, Vec3 towards, double speed) {}

    private static void addParts(List<Contribution> parts, WindageElement element, Stance stance) {
        double foot = stance.water().freeboard(new Vec3(element.x(), element.y(), element.zFrom()));
        double top = stance.water().freeboard(new Vec3(element.x(), element.y(), element.zTo()));
        double shown = element.areaX() * Math.abs(stance.towards().x())
                + element.areaY() * Math.abs(stance.towards().y())
                + element.areaZ() * Math.abs(stance.towards().z());
        for (HeightBand band : HeightBand.ALL) {
            double from = Math.max(foot, band.from());
            double to = Math.min(top, band.to());
            if (to > from && shown > 0) {
                parts.add(part(element, band, from, to, shown * (to - from) / (top - foot), stance));
            }
        }
    }

    private static Contribution part(
            WindageElement element, HeightBand band, double from, double to, double area, Stance stance) {
        double pressure =
                0.5 * element.shapeCoefficient() * band.coefficient() * AIR_DENSITY * stance.speed() * stance.speed();
        double force = pressure * area;
        double lever = (from + to) / 2 + stance.depth();
        return new Contribution(
                element.name(),
                from,
                to,
                area,
                element.shapeCoefficient(),
                band.coefficient(),
                force,
                lever,
                force * lever);
    }
}
