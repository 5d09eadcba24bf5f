package org.evendraft.stability;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.evendraft.platform.Condition;
import org.evendraft.platform.DeckArea;
import org.evendraft.platform.Load;
import org.evendraft.platform.Mode;
import org.evendraft.platform.PreparedPlatform;
import org.evendraft.stability.ConditionResult.Gm;
import org.evendraft.stability.ConditionResult.LimitResult;

/** Judges a condition by the limits of its mode and of the deck areas. Margins are positive inside. */
final class Limits {
    /** Name of the limit that a mode's curve of KG sets. */
    static final String ALLOWABLE_KG = "allowableKg";

    private final Condition condition;
    private final List<LimitResult> results = new ArrayList<>();

    private Limits(Condition condition) {
        this.condition = condition;
    }

    /** All limits in force. */
    static List<LimitResult> judge(
            PreparedPlatform prepared,
            Condition condition,
            LoadedPlatform loaded,
            EvenKeel evenKeel,
            Waterplane floating) {
        Limits limits = new Limits(condition);
        condition
                .mode()
                .ifPresent(
                        mode -> limits.judgeMode(mode, loaded.centreOfGravity().z(), evenKeel, floating));
        prepared.platform().deckAreas().forEach(limits::judgeArea);
        return List.copyOf(limits.results);
    }

    private void judgeMode(Mode mode, double kg, EvenKeel evenKeel, Waterplane floating) {
        Gm gm = evenKeel.gm();
        mode.draftRange().ifPresent(range -> {
            atLeast("draftRange.min", floating.draft(), range.least());
            atMost("draftRange.max", floating.draft(), range.greatest());
        });
        mode.minGm().ifPresent(bound -> {
            bound.transverse()
                    .ifPresent(b -> atLeast("minGm.transverse", gm.transverse().corrected(), b));
            bound.longitudinal()
                    .ifPresent(
                            b -> atLeast("minGm.longitudinal", gm.longitudinal().corrected(), b));
        });
        if (!mode.allowableKg().isEmpty()) {
            judgeKg(mode, kg + gm.transverse().freeSurfaceCorrection(), evenKeel.draft());
        }
        mode.maxHeel().ifPresent(b -> atMost("maxHeel", Math.abs(floating.heelAngle()), b));
        mode.maxTrim().ifPresent(b -> atMost("maxTrim", Math.abs(floating.trimAngle()), b));
        mode.maxDeckLoad().ifPresent(b -> atMost("maxDeckLoad", deckLoad(), b));
    }

    private void judgeKg(Mode mode, double correctedKg, double draft) {
        OptionalDouble allowable = AllowableKg.at(mode.allowableKg(), draft);
        if (allowable.isPresent()) {
            atMost(ALLOWABLE_KG, correctedKg, allowable.getAsDouble());
        } else {
            results.add(new LimitResult(ALLOWABLE_KG, correctedKg, null, null, false));
        }
    }

    private double deckLoad() {
        return condition.loads().stream()
                .filter(load -> load.kind() == Load.Kind.DECK)
                .mapToDouble(Load::mass)
                .sum();
    }

    private void judgeArea(DeckArea area) {
        List<Load> standing = condition.loads().stream()
                .filter(load -> load.kind() != Load.Kind.SUSPENDED)
                .filter(load -> load.area().filter(area.id()::equals).isPresent())
                .toList();
        double mass = standing.stream().mapToDouble(Load::mass).sum();
        double pressure = standing.stream()
                .filter(load -> load.footprint().isPresent())
                .mapToDouble(load -> load.mass() / load.footprint().getAsDouble())
                .reduce(mass / area.size(), Math::max);
        String name = "deckArea." + area.id();
        area.maxLoad().ifPresent(bound -> atMost(name + ".maxLoad", mass, bound));
        area.maxPressure().ifPresent(bound -> atMost(name + ".maxPressure", pressure, bound));
    }

    private void atLeast(String limit, double value, double bound) {
        results.add(new LimitResult(limit, value, bound, value - bound, value >= bound));
    }

    private void atMost(String limit, double value, double bound) {
        results.add(new LimitResult(limit, value, bound, bound - value, value <= bound));
    }
}
