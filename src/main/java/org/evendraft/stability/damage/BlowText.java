package org.evendraft.stability.damage;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.function.Predicate;
import org.evendraft.geometry.PlanLine;

/** Says in words where damage is, and what was taken for granted. */
final class BlowText {
    private final Layout layout;
    private final Extents extents;

    BlowText(Layout layout, Extents extents) {
        this.layout = layout;
        this.extents = extents;
    }

    private String name(Target target) {
        return layout.bodies().get(target.body()).name();
    }

    /** The body that is struck. */
    String place(Blow blow) {
        return name(blow.target());
    }

    /**
     * Where a blow falls and what it opens, in one sentence.
     *
     * @param opened names of the spaces opened
     */
    String reason(Blow blow, List<String> opened) {
        PlanLine line = blow.target().contour().outward(blow.place());
        String through = blow.throughBulkheads()
                ? String.format(
                        Locale.ROOT,
                        ", through bulkheads closer than %.2f m along the periphery",
                        blow.target().bulkheadSpacing(extents))
                : "";
        return String.format(
                Locale.ROOT,
                "Collision with %s about x %.2f, y %.2f m, between %.2f and %.2f m over the keel, %.2f m deep%s, opens %s.",
                place(blow),
                line.x(),
                line.y(),
                blow.window().from(),
                blow.window().to(),
                extents.penetration(),
                through,
                String.join(" and ", opened));
    }

    /** What the cases take for granted. */
    List<String> notes(List<Target> targets, List<Blow> blows) {
        List<String> notes = new ArrayList<>();
        addNames(notes, "Judged as columns by the spacing of their bulkheads: ", targets, Target::column);
        addNames(notes, "Judged as underwater hulls or braces: ", targets, target -> !target.column());
        List<Integer> opened =
                blows.stream().map(blow -> blow.target().body()).distinct().toList();
        addNames(
                notes,
                "In the zone of damage, but with no tank or compartment within reach of exposed shell, so taken as intact: ",
                targets,
                target -> !opened.contains(target.body()));
        notes.add(
                "Pipes, ventilation and trunks within the damage are not part of the platform's description (3.5.10.6).");
        return notes;
    }

    private void addNames(List<String> notes, String words, List<Target> targets, Predicate<Target> which) {
        List<String> names =
                targets.stream().filter(which).map(this::name).distinct().toList();
        if (!names.isEmpty()) {
            notes.add(words + String.join(", ", names) + ".");
        }
    }
}
