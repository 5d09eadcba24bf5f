package org.evendraft.platform;

import java.util.ArrayList;
import java.util.List;
import org.evendraft.geometry.Assembly;
import org.evendraft.geometry.Overlap;

/** Where tanks lie: warnings for those that share a place or reach outside the hull. */
final class TankPlaces {
    /** Tanks may share, or have outside, this part of themselves without a word: tanks are drawn to the moulded lines. */
    private static final double UNNOTICED = 0.01;

    private TankPlaces() {}

    /** A tank with its space. */
    private record Placed(Tank tank, Assembly space) {}

    /** The warnings on the tanks of a sound platform. */
    static List<String> warnings(List<Body> hull, List<Tank> tanks) {
        Assembly around = PreparedPlatform.assembly(hull);
        List<Placed> placed = tanks.stream()
                .filter(tank -> !tank.bodies().isEmpty())
                .map(tank -> new Placed(tank, PreparedPlatform.assembly(tank.bodies())))
                .toList();
        List<String> warnings = new ArrayList<>();
        for (int j = 0; j < placed.size(); j++) {
            for (int i = 0; i < j; i++) {
                pair(placed.get(i), placed.get(j), warnings);
            }
            double outside = Overlap.partOutside(placed.get(j).space(), around);
            if (outside > UNNOTICED) {
                warnings.add("tank " + placed.get(j).tank().id() + " reaches outside the hull with about "
                        + Words.rough(100 * outside) + " % of its shape");
            }
        }
        return warnings;
    }

    private static void pair(Placed one, Placed other, List<String> warnings) {
        double common = Overlap.volume(one.space(), other.space());
        if (common > UNNOTICED * Math.min(one.space().volume(), other.space().volume())) {
            warnings.add("tanks " + one.tank().id() + " and " + other.tank().id() + " overlap: about "
                    + Words.rough(common) + " m³ in common");
        }
    }
}
