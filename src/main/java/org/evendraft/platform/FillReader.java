package org.evendraft.platform;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;

/** Reads fills, in whichever of the four spellings, and turns them into volumes by the tank's calibration. */
final class FillReader {
    /** A fill over the full tank by no more than this part of it is a full tank. */
    private static final double FORGIVEN = 1e-6;

    private final PreparedPlatform platform;
    private final Map<String, Tank> tanks = new HashMap<>();
    private final Set<String> filled = new HashSet<>();

    private FillReader(PreparedPlatform platform) {
        this.platform = platform;
        platform.platform().tanks().forEach(tank -> tanks.put(tank.id(), tank));
    }

    /** The four ways to tell how much a tank holds. */
    private enum Spelling {
        LEVEL,
        VOLUME,
        MASS,
        FRACTION
    }

    /** Reads all fills of a list; those with faults are left out. */
    static List<Fill> read(List<Fields> list, PreparedPlatform platform) {
        FillReader reader = new FillReader(platform);
        List<Fill> fills = new ArrayList<>();
        for (Fields fields : list) {
            Optional<Fill> fill = reader.fill(fields);
            fields.noOthers();
            fill.ifPresent(fills::add);
        }
        return fills;
    }

    private Optional<Fill> fill(Fields fields) {
        String id = fields.text("tank");
        Tank tank = tanks.get(id);
        if (tank == null && !id.isBlank()) {
            fields.meaning(
                    "tank",
                    "there is no tank " + Words.quote(id) + "; known: "
                            + Words.few(platform.platform().tanks().stream()
                                    .map(Tank::id)
                                    .toList()));
        } else if (tank != null && !filled.add(id)) {
            fields.meaning("tank", "tank " + id + " is filled twice");
        }
        double density = fields.number("density", Range.DENSITY, tank == null ? 1 : tank.density());
        Optional<Spelling> spelling = spelling(fields);
        if (spelling.isEmpty()) {
            return Optional.empty();
        }
        String name = Json.code(spelling.get());
        Range range = spelling.get() == Spelling.LEVEL ? Range.COORDINATE : Range.NOT_NEGATIVE;
        double value = fields.number(name, range);
        if (tank == null || Double.isNaN(value) || Double.isNaN(density)) {
            return Optional.empty();
        }
        OptionalDouble volume = volume(fields, tank, spelling.get(), value, density);
        return volume.isEmpty() ? Optional.empty() : Optional.of(new Fill(id, volume.getAsDouble(), density));
    }

    private static Optional<Spelling> spelling(Fields fields) {
        List<Spelling> given = new ArrayList<>();
        for (Spelling spelling : Spelling.values()) {
            if (fields.has(Json.code(spelling))) {
                given.add(spelling);
            }
        }
        if (given.size() != 1) {
            List<String> names = given.stream().map(Json::code).toList();
            fields.faults()
                    .form(
                            fields.pointer(),
                            "a fill must give exactly one of level, volume, mass and fraction; this one gives "
                                    + (names.isEmpty() ? "none" : String.join(" and ", names)));
            return Optional.empty();
        }
        return Optional.of(given.get(0));
    }

    private OptionalDouble volume(Fields fields, Tank tank, Spelling spelling, double value, double density) {
        Calibration calibration = platform.calibration(tank.id());
        double full = calibration.fullVolume();
        return switch (spelling) {
            case LEVEL -> ofLevel(fields, tank, calibration, value);
            case VOLUME -> within(fields, tank, "volume", value, full, " m³");
            case MASS -> scaled(within(fields, tank, "mass", value, full * density, " t"), 1 / density, full);
            case FRACTION -> scaled(within(fields, tank, "fraction", value, 1, ""), full, full);
        };
    }

    private static OptionalDouble ofLevel(Fields fields, Tank tank, Calibration calibration, double level) {
        double least = calibration.leastLevel();
        boolean dry = level >= 0 && level < least && calibration.volumeAt(least) == 0;
        if (level < least && !dry) {
            fields.meaning(
                    "level",
                    "a level of " + Words.given(level) + " m is under the least of tank " + tank.id() + ", "
                            + Words.rounded(least) + " m");
            return OptionalDouble.empty();
        }
        OptionalDouble checked = within(fields, tank, "level", level, calibration.fullLevel(), " m");
        return checked.isEmpty() || dry
                ? checked.isEmpty() ? checked : OptionalDouble.of(0)
                : OptionalDouble.of(calibration.volumeAt(checked.getAsDouble()));
    }

    private static OptionalDouble scaled(OptionalDouble value, double factor, double full) {
        return value.isEmpty() ? value : OptionalDouble.of(Math.min(full, value.getAsDouble() * factor));
    }

    /** The value, at most that of the full tank; empty, with a fault, when it is more than is forgiven. */
    private static OptionalDouble within(
            Fields fields, Tank tank, String name, double value, double full, String unit) {
        if (value > full + FORGIVEN * Math.abs(full)) {
            fields.meaning(
                    name,
                    "tank " + tank.id() + " is overfilled: a " + name + " of " + Words.given(value) + unit
                            + ", the full tank has " + Words.rounded(full) + unit);
            return OptionalDouble.empty();
        }
        return OptionalDouble.of(Math.min(value, full));
    }
}
