package org.evendraft.stability.damage;

import java.util.ArrayList;
import java.util.BitSet;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import org.evendraft.platform.Mode;
import org.evendraft.platform.Mode.DraftRange;
import org.evendraft.platform.Platform;
import org.evendraft.platform.PreparedPlatform;
import org.evendraft.platform.Situation;
import org.evendraft.platform.Space;

/**
 * Damage cases of a column-stabilized unit by the published extents of damage, for the tanks and compartments whose shape is known.
 * Heights are over the keel, coordinates in platform axes. Where the texts leave a choice, the one that floods more is taken.
 */
public final class DamageExtents {
    /** A watertight flat this close to the edge of the zone of damage is in it (m). */
    private static final double EDGE = 1e-3;

    /** A space must lie this far under water to be flooded (m). */
    private static final double LEAST_DEPTH = 1e-6;

    private DamageExtents() {}

    /** The collision cases of a mode by {@link Extents#MODU}; see the other method. */
    public static GeneratedCases collisionCases(PreparedPlatform prepared, Mode mode) {
        return collisionCases(prepared, mode, Extents.MODU);
    }

    /**
     * The collision cases of a mode.
     *
     * <p>Damage of the vertical extent lies anywhere in the zone about the mode's drafts, on shell of the periphery that is exposed;
     * the platform is taken as upright. It goes square into the shell, there where at each height the shell is. Shells that stand over
     * each other within the penetration (a column on the edge of a pontoon) are struck together. A space is flooded when the damage
     * goes into it, so a bulkhead just at its depth or end holds; a flat on the very edge of the zone counts as within it.
     *
     * <p>A body is a column where it is taller than wide and not more than three times as long as wide in plan, else an underwater
     * hull or a brace; draw a column as one body. It is on the periphery when it reaches the lines that join the centres of the
     * outermost columns. Whatever of the hull lies in the zone may be struck, in any mode: an underwater hull when the drafts bring
     * it there, also an upper hull. Lesser damage (each space alone, each two, and all but one) is added to every case, as the Code
     * asks of other types of unit; for columns from memory of it.
     *
     * @param prepared the platform
     * @param mode its drafts give the zone; without them there are no cases and a note
     * @param extents the extents of damage
     */
    public static GeneratedCases collisionCases(PreparedPlatform prepared, Mode mode, Extents extents) {
        Optional<DraftRange> drafts = mode.draftRange();
        if (drafts.isEmpty()) {
            return new GeneratedCases(
                    List.of(),
                    List.of(),
                    List.of("Mode " + mode.id()
                            + " has no draft range, so the levels of damage are not known: no cases."));
        }
        Layout layout = Layout.of(prepared.platform());
        double low = drafts.get().least() - extents.below();
        double high = drafts.get().greatest() + extents.above();
        List<Level> levels = Level.between(layout, low - EDGE, high + EDGE);
        List<Target> targets = Target.of(layout, levels, level -> level.to() > low && level.from() < high);
        List<Window> windows = Window.among(levels, extents.verticalExtent());
        List<Blow> blows = targets.stream()
                .flatMap(target -> Blows.on(target, windows, extents, layout).stream())
                .toList();
        CaseList cases = new CaseList(Situation.COLLISION, layout.spaces());
        BlowText text = new BlowText(layout, extents);
        blows.forEach(
                blow -> cases.add(text.place(blow), blow.opened(), text.reason(blow, cases.names(blow.opened()))));
        cases.addLesser();
        List<String> notes = new ArrayList<>(shapeNotes(prepared.platform()));
        notes.addAll(text.notes(targets, blows));
        return cases.with(notes);
    }

    /**
     * One case for each tank and compartment that lies wholly or partly below the waterline, IMO MODU Code 2009, 3.4.4. The Code asks
     * it of pump rooms, rooms with machinery cooled by sea water and compartments next to the sea; here it is every space, as a
     * document does not tell which those are, and that is not less severe.
     *
     * @param prepared the platform
     * @param draft even-keel draft (m)
     * @throws IllegalArgumentException when the draft is not finite
     */
    public static GeneratedCases floodingCases(PreparedPlatform prepared, double draft) {
        if (!Double.isFinite(draft)) {
            throw new IllegalArgumentException("draft " + draft);
        }
        List<Space> spaces = prepared.platform().spaces();
        CaseList cases = new CaseList(Situation.FLOODING, spaces);
        for (int i = 0; i < spaces.size(); i++) {
            Space space = spaces.get(i);
            double lowest = lowest(space);
            if (lowest < draft - LEAST_DEPTH) {
                BitSet one = new BitSet();
                one.set(i);
                cases.add("flooding", one, floodingReason(space.id(), lowest, draft));
            }
        }
        return cases.with(shapeNotes(prepared.platform()));
    }

    private static double lowest(Space space) {
        return space.bodies().stream()
                .filter(body -> !body.cutOut())
                .mapToDouble(body -> body.solid().least().z())
                .min()
                .orElse(Double.POSITIVE_INFINITY);
    }

    private static String floodingReason(String id, double lowest, double draft) {
        return String.format(
                Locale.ROOT,
                "%s reaches down to %.2f m over the keel, below the waterline at a draft of %.2f m.",
                id,
                lowest,
                draft);
    }

    private static List<String> shapeNotes(Platform platform) {
        List<String> notes = new ArrayList<>();
        List<String> tables = platform.tanks().stream()
                .filter(tank -> tank.bodies().isEmpty())
                .map(tank -> tank.id())
                .toList();
        if (!tables.isEmpty()) {
            notes.add("Known by a table only, so without a shape and in no case: " + String.join(", ", tables) + ".");
        }
        notes.add(
                "What belongs to no tank or compartment with a shape is taken as intact; bulkheads and flats count only"
                        + " where such a space ends.");
        return notes;
    }
}
