package org.evendraft.ballast.loadplan;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.evendraft.ballast.PlanRequest;
import org.evendraft.ballast.PlanRequestReader;
import org.evendraft.platform.Condition;
import org.evendraft.platform.ConditionReader;
import org.evendraft.platform.Fault;
import org.evendraft.platform.Faults;
import org.evendraft.platform.FaultyDocumentException;
import org.evendraft.platform.Fields;
import org.evendraft.platform.GmBound;
import org.evendraft.platform.Json;
import org.evendraft.platform.Mode;
import org.evendraft.platform.PreparedPlatform;
import org.evendraft.platform.Range;
import org.evendraft.stability.LoadedPlatform;

/** Reads load plan requests, every fault listed. */
public final class LoadPlanReader {
    /** More events than a day's work has. */
    static final int MOST_EVENTS = 50;

    /** Pointer of a start that is given with the request. */
    static final String START = "/start";

    private static final String CONDITION = "/condition";

    /** Properties that mean the same in a plan request, besides the target. */
    private static final List<String> LIKE_A_PLAN =
            List.of("objective", "operationLimits", "lockedTanks", "pumpsOutOfService");

    /** Greatest speed of a wind (m/s): over any on record. */
    private static final double STRONGEST_WIND = 150;

    private static final Range SPEED = new Range(0, false, STRONGEST_WIND);
    private static final Range AZIMUTH = new Range(-360, false, 360);

    private final PreparedPlatform prepared;
    private final Fields fields;
    private final Faults faults = new Faults();

    private LoadPlanReader(JsonNode document, PreparedPlatform prepared) {
        this.prepared = prepared;
        this.fields = Fields.of(document, "", faults);
    }

    /**
     * Reads a request.
     *
     * @param document the document
     * @param prepared the platform
     * @param stored the stored condition that the document names; empty when it names none or there is none
     * @throws FaultyDocumentException with all faults
     */
    public static LoadPlanRequest read(JsonNode document, PreparedPlatform prepared, Optional<Condition> stored) {
        return new LoadPlanReader(document, prepared).request(stored);
    }

    private LoadPlanRequest request(Optional<Condition> stored) {
        Optional<Condition> start = start(stored);
        String pointer = fields.has("start") ? START : CONDITION;
        SteadyWind wind = wind(fields.optionalObject("wind"), prepared);
        OptionalDouble draft = draft(start, pointer, wind);
        Optional<PlanRequest> ballast = ballast(start, draft);
        List<PlannedEvent> events = events(start, ballast);
        Ballasting ballasting = fields.choice("ballast", Ballasting.class, Ballasting.EACH_EVENT);
        String name = fields.text("name", start.map(Condition::name).orElse(""));
        fields.noOthers();
        faults.throwIfAny();
        return new LoadPlanRequest(
                name, prepared, start.orElseThrow(), pointer, wind, events, ballast.orElseThrow(), ballasting);
    }

    /** The loading at the start in the mode wanted; empty after a fault. */
    private Optional<Condition> start(Optional<Condition> stored) {
        Optional<JsonNode> given = fields.value("start");
        Optional<String> id = fields.optionalText("condition");
        Optional<Mode> mode = ConditionReader.mode(fields, prepared.platform().modes());
        if (given.isPresent() == id.isPresent()) {
            faults.form("", "exactly one of condition, the id of a stored one, and start, a condition, must be given");
            return Optional.empty();
        }
        if (id.isPresent() && !id.get().isBlank() && stored.isEmpty()) {
            faults.meaning(CONDITION, "there is no stored condition '" + id.get() + "' of this platform");
        }
        Optional<Condition> start =
                given.isPresent() ? gathered(START, () -> ConditionReader.read(given.get(), prepared)) : stored;
        return start.map(s -> mode.map(m -> Changes.inMode(s, m)).orElse(s));
    }

    private interface Reading<T> {
        T read();
    }

    /** What is read by another reader, its faults put with ours. */
    private <T> Optional<T> gathered(String prefix, Reading<T> reading) {
        try {
            return Optional.of(reading.read());
        } catch (FaultyDocumentException e) {
            for (Fault fault : e.faults()) {
                if (fault.kind() == Fault.Kind.FORM) {
                    faults.form(prefix + fault.pointer(), fault.detail());
                } else {
                    faults.meaning(prefix + fault.pointer(), fault.detail());
                }
            }
            return Optional.empty();
        }
    }

    /** Reads a wind; none when it is absent. A platform without windage has nothing for it to blow on. */
    static SteadyWind wind(Optional<Fields> given, PreparedPlatform prepared) {
        if (given.isEmpty()) {
            return SteadyWind.CALM;
        }
        SteadyWind wind = windIn(given.get(), prepared);
        given.get().noOthers();
        return wind;
    }

    /** Reads the properties of a wind out of what has others too. */
    static SteadyWind windIn(Fields given, PreparedPlatform prepared) {
        double speed = given.number("speed", SPEED);
        if (speed > 0 && prepared.platform().windage().isEmpty()) {
            given.meaning("speed", "the platform lists no windage: there is nothing for the wind to blow on");
        }
        return new SteadyWind(speed, given.number("azimuth", AZIMUTH, 0));
    }

    /** The draft at the start without wind; empty, with a fault, when the platform finds no rest. */
    private OptionalDouble draft(Optional<Condition> start, String pointer, SteadyWind wind) {
        if (start.isEmpty()) {
            return OptionalDouble.empty();
        }
        LoadedPlatform loaded = LoadedPlatform.of(prepared, start.get());
        String at = pointer;
        try {
            double draft = Stance.of(loaded, SteadyWind.CALM).waterplane().draft();
            at = "/wind";
            Stance.of(loaded, wind);
            return OptionalDouble.of(draft);
        } catch (LostException e) {
            faults.meaning(at, e.reason());
            return OptionalDouble.empty();
        }
    }

    /** What ballast plans shall reach: by default the draft of the start on even keel. */
    private Optional<PlanRequest> ballast(Optional<Condition> start, OptionalDouble draft) {
        ObjectNode document = Json.mapper().createObjectNode();
        ObjectNode target = document.putObject("target");
        fields.value("target").ifPresent(node -> {
            if (node instanceof ObjectNode given) {
                target.setAll(given);
            } else {
                document.set("target", node);
            }
        });
        if (target.path("draft").isMissingNode() || target.path("draft").isNull()) {
            double middle = (prepared.hull().lowest() + prepared.hull().highest()) / 2;
            target.put("draft", draft.orElse(middle));
        }
        for (String name : LIKE_A_PLAN) {
            fields.value(name).ifPresent(node -> document.set(name, node));
        }
        Condition at = start.orElseGet(this::nothingAboard);
        return gathered("", () -> PlanRequestReader.read(document, prepared, at));
    }

    /** Stands in for a start with faults, so that the rest is read too. */
    private Condition nothingAboard() {
        return ConditionReader.read(Json.mapper().createObjectNode(), prepared);
    }

    private List<PlannedEvent> events(Optional<Condition> start, Optional<PlanRequest> ballast) {
        List<Fields> list = fields.someObjects("events");
        if (list.size() > MOST_EVENTS) {
            fields.meaning("events", "a load plan has at most " + MOST_EVENTS + " events, not " + list.size());
            return List.of();
        }
        PlanRequest.OperationLimits overall = ballast.map(PlanRequest::operationLimits)
                .orElseGet(() -> new PlanRequest.OperationLimits(
                        OptionalDouble.empty(),
                        OptionalDouble.empty(),
                        new GmBound(OptionalDouble.empty(), OptionalDouble.empty())));
        EventReader reader = new EventReader(prepared, start, overall);
        List<PlannedEvent> events = new ArrayList<>();
        list.forEach(event -> reader.read(event).ifPresent(events::add));
        return events;
    }
}
