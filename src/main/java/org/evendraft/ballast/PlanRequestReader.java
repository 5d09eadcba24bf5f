package org.evendraft.ballast;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.function.Function;
import java.util.stream.Collectors;
import org.evendraft.ballast.PlanRequest.Objective;
import org.evendraft.ballast.PlanRequest.OperationLimits;
import org.evendraft.ballast.PlanRequest.Target;
import org.evendraft.ballast.PlanRequest.Tolerance;
import org.evendraft.platform.Condition;
import org.evendraft.platform.Faults;
import org.evendraft.platform.FaultyDocumentException;
import org.evendraft.platform.Fields;
import org.evendraft.platform.GmBound;
import org.evendraft.platform.Mode;
import org.evendraft.platform.Platform;
import org.evendraft.platform.PreparedPlatform;
import org.evendraft.platform.Pump;
import org.evendraft.platform.Range;
import org.evendraft.platform.Tank;

/** Reads plan requests, every fault listed. */
public final class PlanRequestReader {
    private static final double DEFAULT_PENALTY = 20;
    private static final double DEFAULT_DRAFT_TOLERANCE = 0.01;
    private static final double DEFAULT_ANGLE_TOLERANCE = 0.02;
    /** Beyond this no platform is meant to float (degrees). */
    private static final double STEEPEST = 30;

    private static final Range TARGET_ANGLE = new Range(-STEEPEST, false, STEEPEST);
    private static final Range ANGLE_TOLERANCE = new Range(0, true, STEEPEST);
    private static final GmBound NOTHING = new GmBound(OptionalDouble.empty(), OptionalDouble.empty());

    private PlanRequestReader() {}

    /**
     * Reads a request.
     *
     * @param document the document
     * @param prepared the platform
     * @param condition the condition that the plan starts from: its mode gives limits that the request leaves out
     * @throws FaultyDocumentException with all faults
     */
    public static PlanRequest read(JsonNode document, PreparedPlatform prepared, Condition condition) {
        Faults faults = new Faults();
        Fields fields = Fields.of(document, "", faults);
        Platform platform = prepared.platform();
        PlanRequest request = new PlanRequest(
                target(fields.object("target"), prepared, condition.mode()),
                fields.optionalObject("objective")
                        .map(PlanRequestReader::objective)
                        .orElse(new Objective(DEFAULT_PENALTY, DEFAULT_PENALTY)),
                limits(fields.optionalObject("operationLimits"), condition.mode()),
                named(fields, "lockedTanks", ids(platform.tanks(), Tank::id)),
                named(fields, "pumpsOutOfService", ids(platform.pumps(), Pump::id)));
        fields.noOthers();
        faults.throwIfAny();
        return request;
    }

    private static <T> Set<String> ids(List<T> list, Function<T, String> id) {
        return list.stream().map(id).collect(Collectors.toSet());
    }

    /** The names of a list, each that of something the platform has, and each once. */
    private static List<String> named(Fields fields, String property, Set<String> known) {
        List<String> names = fields.texts(property);
        Set<String> seen = new HashSet<>();
        for (int i = 0; i < names.size(); i++) {
            String name = names.get(i);
            String at = fields.pointer(property) + "/" + i;
            if (name.isBlank()) {
                continue;
            }
            if (!known.contains(name)) {
                fields.faults().meaning(at, "the platform has no '" + name + "' to name in " + property);
            }
            if (!seen.add(name)) {
                fields.faults().meaning(at, "'" + name + "' is named twice");
            }
        }
        return names;
    }

    private static Target target(Fields fields, PreparedPlatform prepared, Optional<Mode> mode) {
        Range depth = new Range(prepared.hull().lowest(), true, prepared.hull().highest());
        Target target = new Target(
                fields.number("draft", depth),
                fields.number("heelAngle", TARGET_ANGLE, 0),
                fields.number("trimAngle", TARGET_ANGLE, 0),
                minGm(Optional.of(fields), mode),
                fields.optionalObject("tolerance")
                        .map(PlanRequestReader::tolerance)
                        .orElse(new Tolerance(DEFAULT_DRAFT_TOLERANCE, DEFAULT_ANGLE_TOLERANCE)));
        fields.noOthers();
        return target;
    }

    private static GmBound minGm(Optional<Fields> fields, Optional<Mode> mode) {
        return fields.flatMap(f -> f.optionalObject("minGm"))
                .map(GmBound::read)
                .or(() -> mode.flatMap(Mode::minGm))
                .orElse(NOTHING);
    }

    private static Tolerance tolerance(Fields fields) {
        Tolerance tolerance = new Tolerance(
                fields.number("draft", Range.POSITIVE, DEFAULT_DRAFT_TOLERANCE),
                fields.number("angle", ANGLE_TOLERANCE, DEFAULT_ANGLE_TOLERANCE));
        fields.noOthers();
        return tolerance;
    }

    private static Objective objective(Fields fields) {
        Objective objective = new Objective(
                fields.number("touchPenalty", Range.NOT_NEGATIVE, DEFAULT_PENALTY),
                fields.number("slackPenalty", Range.NOT_NEGATIVE, DEFAULT_PENALTY));
        fields.noOthers();
        return objective;
    }

    private static OperationLimits limits(Optional<Fields> fields, Optional<Mode> mode) {
        OperationLimits limits = new OperationLimits(
                or(angle(fields, "maxHeel"), mode.map(Mode::maxHeel)),
                or(angle(fields, "maxTrim"), mode.map(Mode::maxTrim)),
                minGm(fields, mode));
        fields.ifPresent(Fields::noOthers);
        return limits;
    }

    private static OptionalDouble angle(Optional<Fields> fields, String name) {
        return fields.map(f -> f.optionalNumber(name, Range.ANGLE)).orElse(OptionalDouble.empty());
    }

    private static OptionalDouble or(OptionalDouble given, Optional<OptionalDouble> otherwise) {
        return given.isPresent() ? given : otherwise.orElse(OptionalDouble.empty());
    }
}
