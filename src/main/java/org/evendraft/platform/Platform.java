package org.evendraft.platform;

import java.util.List;
import java.util.stream.Stream;

/**
 * A platform as its document describes it, checked.
 *
 * @param id the name in addresses
 * @param name the name for people
 * @param waterDensity density of the sea where a condition gives none (t/m³)
 * @param hull bodies of the hull
 * @param draftMarks draft marks
 * @param lightship the empty platform
 * @param tanks tanks
 * @param pumps pumps
 * @param deckAreas areas of the deck with their limits
 * @param windage elements exposed to the wind
 * @param openings openings through which water may enter
 * @param modes modes of operation with their limits
 * @param compartments spaces that damage may flood
 * @param stabilityRules criteria of stability
 * @param damageCases spaces that are flooded together, listed by hand
 */
public record Platform(
        String id,
        String name,
        double waterDensity,
        List<Body> hull,
        List<DraftMark> draftMarks,
        Lightship lightship,
        List<Tank> tanks,
        List<Pump> pumps,
        List<DeckArea> deckAreas,
        List<WindageElement> windage,
        List<Opening> openings,
        List<Mode> modes,
        List<Compartment> compartments,
        StabilityRules stabilityRules,
        List<DamageCase> damageCases) {

    /** Copies the lists. */
    public Platform {
        hull = List.copyOf(hull);
        draftMarks = List.copyOf(draftMarks);
        tanks = List.copyOf(tanks);
        pumps = List.copyOf(pumps);
        deckAreas = List.copyOf(deckAreas);
        windage = List.copyOf(windage);
        openings = List.copyOf(openings);
        modes = List.copyOf(modes);
        compartments = List.copyOf(compartments);
        damageCases = List.copyOf(damageCases);
    }

    /** All that damage may flood and whose shape is known: tanks with bodies, then compartments. */
    public List<Space> spaces() {
        Stream<Space> ofTanks = tanks.stream()
                .filter(tank -> !tank.bodies().isEmpty())
                .map(tank -> new Space(tank.id(), tank.bodies(), tank.permeability()));
        Stream<Space> others = compartments.stream().map(c -> new Space(c.id(), c.bodies(), c.permeability()));
        return Stream.concat(ofTanks, others).toList();
    }
}
