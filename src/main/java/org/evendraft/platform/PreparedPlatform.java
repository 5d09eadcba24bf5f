package org.evendraft.platform;

import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.UnaryOperator;
import java.util.stream.Collectors;
import org.evendraft.geometry.Assembly;

/** A checked platform with what is computed once from it: the hull's assembly and each tank's calibration. Immutable. */
public final class PreparedPlatform {
    private final Platform platform;
    private final Assembly hull;
    private final Map<String, Calibration> calibrations;
    private final List<String> warnings;

    /** Prepares a platform that has been checked. */
    public PreparedPlatform(Platform platform) {
        this(platform, List.of());
    }

    /**
     * Prepares a platform that has been checked.
     *
     * @param warnings sentences on what deserves attention in it
     */
    public PreparedPlatform(Platform platform, List<String> warnings) {
        this(platform, warnings, UnaryOperator.identity());
    }

    /**
     * Prepares a platform with its spaces changed in the way they are integrated.
     *
     * @param way what is made of the hull and of the shape of each tank
     */
    PreparedPlatform(Platform platform, List<String> warnings, UnaryOperator<Assembly> way) {
        this.warnings = List.copyOf(warnings);
        this.platform = platform;
        this.hull = way.apply(assembly(platform.hull()));
        this.calibrations =
                platform.tanks().stream().collect(Collectors.toUnmodifiableMap(Tank::id, tank -> calibrate(tank, way)));
    }

    /** Bodies put together. */
    static Assembly assembly(List<Body> bodies) {
        return new Assembly(bodies.stream()
                .map(body -> new Assembly.Part(body.solid(), body.cutOut()))
                .toList());
    }

    /** The calibration of a tank: by its table where it has one, else by its shape. */
    private static Calibration calibrate(Tank tank, UnaryOperator<Assembly> way) {
        Optional<ShapeCalibration> shape = tank.bodies().isEmpty()
                ? Optional.empty()
                : Optional.of(new ShapeCalibration(way.apply(assembly(tank.bodies())), tank.permeability()));
        return tank.table().isEmpty() ? shape.orElseThrow() : new TableCalibration(tank.table(), shape);
    }

    /** The platform. */
    public Platform platform() {
        return platform;
    }

    /** Sentences on what deserves attention in the platform itself: tanks outside the hull, bodies that graze each other. */
    public List<String> warnings() {
        return warnings;
    }

    /** The hull. */
    public Assembly hull() {
        return hull;
    }

    /**
     * The hull with spaces open to the sea: of each only what its permeability leaves keeps the platform afloat (lost buoyancy).
     *
     * @param spaces ids of tanks and compartments whose shape is known
     * @throws IllegalArgumentException when there is no such space
     */
    public Assembly hullWithout(Collection<String> spaces) {
        List<Assembly.Part> parts = new ArrayList<>(hull.parts());
        for (String id : spaces) {
            Space space = platform.spaces().stream()
                    .filter(s -> s.id().equals(id))
                    .findFirst()
                    .orElseThrow(() -> new IllegalArgumentException("no space " + id));
            for (Assembly.Part part : assembly(space.bodies()).parts()) {
                parts.add(new Assembly.Part(part.solid(), -space.permeability() * part.weight()));
            }
        }
        return new Assembly(parts);
    }

    /**
     * The calibration of a tank.
     *
     * @throws IllegalArgumentException when there is no such tank
     */
    public Calibration calibration(String tank) {
        Calibration calibration = calibrations.get(tank);
        if (calibration == null) {
            throw new IllegalArgumentException("no tank " + tank);
        }
        return calibration;
    }
}
