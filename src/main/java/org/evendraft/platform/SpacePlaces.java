package org.evendraft.platform;

import java.util.ArrayList;
import java.util.List;
import org.evendraft.geometry.Assembly;
import org.evendraft.geometry.Overlap;

/**
 * Where tanks and compartments lie: warnings for those that share a place, whose water would count twice, for those that reach outside
 * the hull, and for those that share an id.
 */
final class SpacePlaces {
    /** Spaces may share, or have outside, this part of themselves without a word: they are drawn to the moulded lines. */
    private static final double UNNOTICED = 0.01;

    private SpacePlaces() {}

    /**
     * A tank or compartment with its space.
     *
     * @param kind what it is
     */
    private record Placed(String kind, String id, Assembly space) {
        Placed(String kind, String id, List<Body> bodies) {
            this(kind, id, PreparedPlatform.assembly(bodies));
        }

        String named() {
            return kind + " " + id;
        }
    }

    /** The warnings on the tanks and compartments of a sound platform. */
    static List<String> warnings(Platform platform) {
        Assembly around = PreparedPlatform.assembly(platform.hull());
        List<Placed> placed = placed(platform);
        List<String> warnings = new ArrayList<>();
        for (int j = 0; j < placed.size(); j++) {
            for (int i = 0; i < j; i++) {
                pair(placed.get(i), placed.get(j), warnings);
            }
            double outside = Overlap.partOutside(placed.get(j).space(), around);
            if (outside > UNNOTICED) {
                warnings.add(placed.get(j).named() + " reaches outside the hull with about "
                        + Words.rough(100 * outside) + " % of its shape");
            }
        }
        sameIds(platform, warnings);
        return warnings;
    }

    private static List<Placed> placed(Platform platform) {
        List<Placed> placed = new ArrayList<>();
        for (Tank tank : platform.tanks()) {
            if (!tank.bodies().isEmpty()) {
                placed.add(new Placed("tank", tank.id(), tank.bodies()));
            }
        }
        for (Compartment compartment : platform.compartments()) {
            placed.add(new Placed("compartment", compartment.id(), compartment.bodies()));
        }
        return placed;
    }

    private static void pair(Placed one, Placed other, List<String> warnings) {
        double common = Overlap.volume(one.space(), other.space());
        if (common > UNNOTICED * Math.min(one.space().volume(), other.space().volume())) {
            String both = one.kind().equals(other.kind())
                    ? one.kind() + "s " + one.id() + " and " + other.id()
                    : one.named() + " and " + other.named();
            warnings.add(both + " overlap: about " + Words.rough(common) + " m³ in common");
        }
    }

    private static void sameIds(Platform platform, List<String> warnings) {
        List<String> tanks = platform.tanks().stream().map(Tank::id).toList();
        for (Compartment compartment : platform.compartments()) {
            if (tanks.contains(compartment.id())) {
                warnings.add("tank and compartment " + compartment.id()
                        + " have one id: no damage case can name either of them");
            }
        }
    }
}
