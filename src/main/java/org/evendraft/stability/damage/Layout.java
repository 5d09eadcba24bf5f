package org.evendraft.stability.damage;

import java.util.List;
import java.util.stream.Stream;
import org.evendraft.geometry.Assembly;
import org.evendraft.geometry.Solid;
import org.evendraft.geometry.Vec3;
import org.evendraft.platform.Body;
import org.evendraft.platform.Platform;
import org.evendraft.platform.Space;

/**
 * What can be struck and flooded.
 *
 * @param bodies bodies of the hull, cut-outs left out
 * @param spaces tanks and compartments of known shape
 * @param columns the outermost columns
 */
record Layout(List<Body> bodies, List<Space> spaces, OutermostColumns columns) {
    /** Greatest distance from one place tried along the periphery to the next (m). */
    private static final double WIDEST_STEP = 0.25;

    /** Least distance (m); bulkheads are found exactly, a space narrower than this in plan may be missed. */
    private static final double FINEST_STEP = 0.05;

    /** The layout of a platform. */
    static Layout of(Platform platform) {
        List<Body> bodies =
                platform.hull().stream().filter(body -> !body.cutOut()).toList();
        return new Layout(bodies, platform.spaces(), OutermostColumns.of(bodies));
    }

    /** A space as an assembly. */
    static Assembly assembly(Space space) {
        return new Assembly(space.bodies().stream()
                .map(body -> new Assembly.Part(body.solid(), body.cutOut()))
                .toList());
    }

    /** Distance between places tried along the periphery (m): half the narrowest body of a space, within bounds. */
    double step() {
        double narrowest = solidsOfSpaces()
                .map(solid -> solid.greatest().minus(solid.least()))
                .mapToDouble(size -> Math.min(size.x(), size.y()))
                .min()
                .orElse(WIDEST_STEP);
        return Math.max(FINEST_STEP, Math.min(WIDEST_STEP, narrowest / 2));
    }

    /** Heights where a body or space begins or ends (m), rising, each once. */
    double[] ends() {
        return Stream.concat(bodies.stream().map(Body::solid), solidsOfSpaces())
                .flatMap(solid -> Stream.of(solid.least(), solid.greatest()))
                .mapToDouble(Vec3::z)
                .sorted()
                .distinct()
                .toArray();
    }

    private Stream<Solid> solidsOfSpaces() {
        return spaces.stream().flatMap(space -> space.bodies().stream()).map(Body::solid);
    }
}
