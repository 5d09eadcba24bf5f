package org.evendraft.ballast.loadplan;

import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.function.Function;
import java.util.stream.Collectors;
import org.evendraft.ballast.PlanRequest.OperationLimits;
import org.evendraft.ballast.loadplan.LoadEvent.Word;
import org.evendraft.geometry.Vec3;
import org.evendraft.platform.Condition;
import org.evendraft.platform.DeckArea;
import org.evendraft.platform.Fields;
import org.evendraft.platform.GmBound;
import org.evendraft.platform.Load;
import org.evendraft.platform.LoadReader;
import org.evendraft.platform.PreparedPlatform;
import org.evendraft.platform.Range;

/**
 * Reads the events of a load plan in their order and keeps account of what is aboard, so that an event that cannot happen is a fault. A load or
 * tank that a fault leaves in doubt is not asked about again. Used once, by one thread.
 */
final class EventReader {
    private static final String HANGS = "' hangs on the hook already; it can be slewed or set down";
    private static final String STANDS = "' hangs on no hook; it must be lifted first";

    private final PreparedPlatform prepared;
    private final List<DeckArea> areas;
    private final OperationLimits overall;
    private final Set<String> doubtful = new HashSet<>();
    private Optional<Condition> here;
    private OptionalDouble last = OptionalDouble.empty();

    /**
     * @param start the loading at the start; empty when it has faults, and then only the events' form is read
     * @param overall limits that an event without its own keeps to
     */
    EventReader(PreparedPlatform prepared, Optional<Condition> start, OperationLimits overall) {
        this.prepared = prepared;
        this.areas = prepared.platform().deckAreas();
        this.overall = overall;
        this.here = start;
    }

    /** Reads the next event; empty after a fault. */
    Optional<PlannedEvent> read(Fields fields) {
        int before = fields.faults().count();
        Optional<Word> word = fields.choice("event", Word.class);
        OptionalDouble minute = minute(fields);
        OperationLimits limits = limits(fields.optionalObject("limits"));
        Optional<LoadEvent> event = word.flatMap(w -> event(w, fields));
        if (word.isPresent()) {
            fields.noOthers();
        }
        if (fields.faults().count() > before) {
            return Optional.empty();
        }
        event.ifPresent(e -> here = here.map(loading -> e.at(loading, 1)));
        return event.map(e -> new PlannedEvent(e, minute, limits));
    }

    private OptionalDouble minute(Fields fields) {
        OptionalDouble minute = fields.optionalNumber("minute", Range.NOT_NEGATIVE);
        if (minute.isPresent() && last.isPresent() && minute.getAsDouble() < last.getAsDouble()) {
            fields.meaning(
                    "minute",
                    "events stand in the order of time: minute " + minute.getAsDouble() + " comes before minute "
                            + last.getAsDouble() + " of an event before it");
        } else if (minute.isPresent()) {
            last = minute;
        }
        return minute;
    }

    private OperationLimits limits(Optional<Fields> given) {
        if (given.isEmpty()) {
            return overall;
        }
        Fields fields = given.get();
        OptionalDouble heel = fields.optionalNumber("maxHeel", Range.ANGLE);
        OptionalDouble trim = fields.optionalNumber("maxTrim", Range.ANGLE);
        Optional<GmBound> gm = fields.optionalObject("minGm").map(GmBound::read);
        fields.noOthers();
        return new OperationLimits(
                heel.isPresent() ? heel : overall.maxHeel(),
                trim.isPresent() ? trim : overall.maxTrim(),
                gm.orElse(overall.minGm()));
    }

    private Optional<LoadEvent> event(Word word, Fields fields) {
        return switch (word) {
            case ABOARD -> aboard(fields);
            case LEAVES -> {
                OptionalDouble mass = fields.optionalNumber("mass", Range.POSITIVE);
                yield ofLoad(fields, Optional.empty(), load -> leaves(fields, load, mass));
            }
            case MOVES -> {
                Vec3 to = fields.position();
                Optional<String> area = LoadReader.area(fields, areas);
                yield ofLoad(
                        fields,
                        Optional.of(false),
                        load -> Optional.of(new LoadEvent.Moves(load.name(), to, area.or(() -> stillOn(load, to)))));
            }
            case LIFT -> {
                Optional<Vec3> tip = fields.point("boomTip");
                yield ofLoad(fields, Optional.of(false), load -> tip.map(t -> new LoadEvent.Lift(load.name(), t)));
            }
            case SLEW -> {
                Optional<Vec3> tip = fields.point("boomTip");
                Optional<Pivot> around =
                        fields.optionalNumbers("around", 2, Range.COORDINATE).map(n -> new Pivot(n[0], n[1]));
                yield ofLoad(
                        fields, Optional.of(true), load -> tip.map(t -> new LoadEvent.Slew(load.name(), t, around)));
            }
            case SET_DOWN -> {
                Vec3 to = fields.position();
                Optional<String> area = LoadReader.area(fields, areas);
                yield ofLoad(
                        fields, Optional.of(true), load -> Optional.of(new LoadEvent.SetDown(load.name(), to, area)));
            }
            case CONSUME, BUNKER -> new TankEventReader(prepared, doubtful).read(word, fields, here);
            case WIND -> Optional.of(new WindChange(LoadPlanReader.windIn(fields, prepared)));
        };
    }

    /** The deck area that a load stands on and does not leave. */
    private Optional<String> stillOn(Load load, Vec3 to) {
        return load.area()
                .filter(id -> areas.stream().anyMatch(area -> area.id().equals(id) && area.contains(to.x(), to.y())));
    }

    private Optional<LoadEvent> aboard(Fields fields) {
        int before = fields.faults().count();
        Fields document = fields.object("load");
        Optional<String> given = fields.optionalText("name");
        boolean named = document.has("name");
        Load load = LoadReader.one(document, areas);
        String name = given.orElse(named ? load.name() : "");
        if (fields.faults().count() == before && name.isBlank()) {
            fields.form("name", "name must be given: later events tell the load by it");
        } else if (given.isPresent() && named && !given.get().equals(load.name())) {
            fields.meaning("name", "the load is named both '" + given.get() + "' and '" + load.name() + "'");
        } else if (!named(name).isEmpty()) {
            String detail = "there is a load '" + name + "' aboard already; the one that comes needs another name";
            fields.faults().meaning(given.isPresent() ? fields.pointer("name") : document.pointer("name"), detail);
        }
        if (fields.faults().count() > before) {
            doubtful.add(name);
            return Optional.empty();
        }
        return Optional.of(new LoadEvent.Aboard(
                new Load(name, load.kind(), load.area(), load.mass(), load.position(), load.footprint())));
    }

    private List<Load> named(String name) {
        return here.map(loading -> loading.loads().stream()
                        .filter(load -> load.name().equals(name))
                        .toList())
                .orElse(List.of());
    }

    private Optional<LoadEvent> leaves(Fields fields, Load load, OptionalDouble mass) {
        if (mass.isPresent() && mass.getAsDouble() > load.mass()) {
            fields.meaning(
                    "mass",
                    "more leaves than there is: " + mass.getAsDouble() + " t of load '" + load.name() + "', which has "
                            + load.mass() + " t");
        }
        boolean all = mass.isPresent() && mass.getAsDouble() == load.mass();
        return Optional.of(new LoadEvent.Leaves(load.name(), all ? OptionalDouble.empty() : mass));
    }

    /** An event of a load that is aboard, and hangs or stands as it must; a fault before or in it leaves the load in doubt. */
    private Optional<LoadEvent> ofLoad(
            Fields fields, Optional<Boolean> hanging, Function<Load, Optional<LoadEvent>> event) {
        int before = fields.faults().count();
        String name = fields.text("load");
        Optional<LoadEvent> found = doubtful.contains(name) || here.isEmpty() || name.isBlank()
                ? Optional.empty()
                : load(fields, name, hanging).flatMap(event);
        if (fields.faults().count() > before) {
            doubtful.add(name);
        }
        return found;
    }

    private Optional<Load> load(Fields fields, String name, Optional<Boolean> hanging) {
        List<Load> found = named(name);
        if (found.isEmpty()) {
            fields.meaning("load", "there is no load '" + name + "' aboard then; there are " + all());
            return Optional.empty();
        }
        if (found.size() > 1) {
            fields.meaning("load", found.size() + " loads are named '" + name + "'; events tell loads by their names");
            return Optional.empty();
        }
        boolean hangs = found.get(0).kind() == Load.Kind.SUSPENDED;
        if (hanging.isPresent() && hanging.get() != hangs) {
            fields.meaning("load", "load '" + name + (hangs ? HANGS : STANDS));
            return Optional.empty();
        }
        return Optional.of(found.get(0));
    }

    private String all() {
        String names = here.map(
                        loading -> loading.loads().stream().map(Load::name).collect(Collectors.joining(", ")))
                .orElse("");
        return names.isEmpty() ? "none" : names;
    }
}
