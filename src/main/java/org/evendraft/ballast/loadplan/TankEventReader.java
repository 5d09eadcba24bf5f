package org.evendraft.ballast.loadplan;

import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import org.evendraft.ballast.loadplan.LoadEvent.Word;
import org.evendraft.platform.Condition;
import org.evendraft.platform.Fields;
import org.evendraft.platform.Fill;
import org.evendraft.platform.PreparedPlatform;
import org.evendraft.platform.Purpose;
import org.evendraft.platform.Range;
import org.evendraft.platform.Tank;

/**
 * Reads events of liquids.
 *
 * @param prepared the platform
 * @param doubtful ids of tanks whose contents faults leave in doubt
 */
record TankEventReader(PreparedPlatform prepared, Set<String> doubtful) {
    /** So small a part over what there is, or over a full tank, is rounding, as in a fill. */
    private static final double FORGIVEN = 1e-6;

    private static final String MASS = "mass";
    private static final String VOLUME = "volume";

    /**
     * Reads an event.
     *
     * @param here the loading then; empty when it is in doubt
     */
    Optional<LoadEvent> read(Word word, Fields fields, Optional<Condition> here) {
        int before = fields.faults().count();
        String id = fields.text("tank");
        Optional<Tank> tank = tank(fields, id);
        OptionalDouble mass = fields.optionalNumber(MASS, Range.POSITIVE);
        OptionalDouble volume = fields.optionalNumber(VOLUME, Range.POSITIVE);
        OptionalDouble density =
                word == Word.BUNKER ? fields.optionalNumber("density", Range.DENSITY) : OptionalDouble.empty();
        if (fields.has(MASS) == fields.has(VOLUME)) {
            fields.faults().form(fields.pointer(), "exactly one of mass and volume must be given");
        }
        Optional<LoadEvent> event = Optional.empty();
        if (fields.faults().count() == before && here.isPresent() && !doubtful.contains(id)) {
            Fill present = Changes.fill(here.get(), id)
                    .orElse(new Fill(id, 0, tank.orElseThrow().density()));
            double moved = density.orElse(
                    present.volume() > 0
                            ? present.density()
                            : tank.orElseThrow().density());
            double taken = volume.orElse(mass.orElse(0) / moved);
            event = word == Word.CONSUME ? consumed(fields, present, taken) : bunkered(fields, present, taken, moved);
        }
        if (fields.faults().count() > before) {
            doubtful.add(id);
        }
        return event;
    }

    private Optional<Tank> tank(Fields fields, String id) {
        Optional<Tank> tank = prepared.platform().tanks().stream()
                .filter(t -> t.id().equals(id))
                .findFirst();
        if (tank.isEmpty() && !id.isBlank()) {
            fields.meaning("tank", "there is no tank '" + id + "'");
        } else if (tank.map(t -> t.purpose() == Purpose.BALLAST).orElse(false)) {
            fields.meaning("tank", "tank " + id + " holds ballast, which the ballast plans move; it is not consumed");
        }
        return tank;
    }

    private static Optional<LoadEvent> consumed(Fields fields, Fill present, double volume) {
        if (volume > present.volume() * (1 + FORGIVEN)) {
            fields.meaning(
                    amount(fields),
                    "more is consumed than there is: tank " + present.tank() + " holds " + present.volume() + " m³, "
                            + present.mass() + " t");
            return Optional.empty();
        }
        double left = Math.max(0, present.volume() - volume);
        return Optional.of(new TankChange(Word.CONSUME, new Fill(present.tank(), left, present.density())));
    }

    /** What is in the tank and what comes mix to one density. */
    private Optional<LoadEvent> bunkered(Fields fields, Fill present, double volume, double density) {
        double full = prepared.calibration(present.tank()).fullVolume();
        double sum = present.volume() + volume;
        if (sum > full * (1 + FORGIVEN)) {
            fields.meaning(
                    amount(fields),
                    "tank " + present.tank() + " is overfilled: it holds " + present.volume()
                            + " m³, and its full volume is " + full + " m³");
            return Optional.empty();
        }
        double mixed = (present.mass() + volume * density) / sum;
        return Optional.of(new TankChange(Word.BUNKER, new Fill(present.tank(), Math.min(full, sum), mixed)));
    }

    private static String amount(Fields fields) {
        return fields.has(MASS) ? MASS : VOLUME;
    }
}
