package org.evendraft.service;

import com.fasterxml.jackson.annotation.JsonUnwrapped;
import com.fasterxml.jackson.databind.JsonNode;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import java.util.regex.Pattern;
import org.evendraft.platform.DamageCase;
import org.evendraft.platform.Fault;
import org.evendraft.platform.Faults;
import org.evendraft.platform.FaultyDocumentException;
import org.evendraft.platform.Fields;
import org.evendraft.platform.Json;
import org.evendraft.platform.KgCurves;
import org.evendraft.platform.Mode.KgPoint;
import org.evendraft.platform.PreparedPlatform;
import org.evendraft.platform.Range;
import org.evendraft.platform.StabilityRules;
import org.evendraft.stability.AllowableKgCurve;
import org.evendraft.stability.DamageSurvey.Question;
import org.evendraft.stability.KgLimit;
import org.evendraft.stability.KgRequest;
import org.evendraft.stability.KgRequestReader;
import org.evendraft.stability.KgRequestReader.Wanted;
import org.evendraft.stability.Progress;
import org.evendraft.store.JobState;
import org.evendraft.store.NewJob;
import org.evendraft.store.StoredJob;
import org.evendraft.store.StoredPlatform;
import org.jspecify.annotations.Nullable;

/** Computes curves of the greatest KG as jobs, and stores such a curve as that of a mode. */
public final class ComputeAllowableKg {
    private static final String KIND = "allowableKg";
    private static final Pattern CURVE = Pattern.compile("^/modes/\\d+/allowableKg");

    private final PlatformShelf shelf;
    private final StorePlatform storePlatform;
    private final Jobs jobs;
    private final Provenance.Source source;

    ComputeAllowableKg(PlatformShelf shelf, StorePlatform storePlatform, Jobs jobs, Provenance.Source source) {
        this.shelf = shelf;
        this.storePlatform = storePlatform;
        this.jobs = jobs;
        this.source = source;
    }

    /**
     * A curve of the greatest KG. Component names are those of the JSON.
     *
     * @param mode id of the mode
     * @param rules name of the rules that the criteria start from
     * @param rulesAssumed whether the platform names none and these were taken for want of better
     * @param windSpeed wind of the mode, or the one asked for (m/s)
     * @param waterDensity density of the sea (t/m³)
     * @param limits one for each draft
     * @param damageCases ids of the damage cases that had to be survived
     * @param notes what was left out or taken for granted
     * @param provenance where the figures come from
     */
    public record TracedKgCurve(
            String mode,
            String rules,
            boolean rulesAssumed,
            @Nullable Double windSpeed,
            double waterDensity,
            List<KgLimit> limits,
            List<String> damageCases,
            List<String> notes,
            @JsonUnwrapped Provenance provenance) {

        /** Copies the lists. */
        public TracedKgCurve {
            limits = List.copyOf(limits);
            damageCases = List.copyOf(damageCases);
            notes = List.copyOf(notes);
        }
    }

    /**
     * Has a curve computed for the current revision of a platform.
     *
     * @throws Refusal when there is no such platform
     * @throws FaultyDocumentException with all that is wrong with the request
     */
    public Pending<StoredJob> prepare(String platform, JsonNode request) {
        PlatformAtRevision at = shelf.current(platform);
        Wanted wanted = KgRequestReader.read(request, at.prepared());
        Question damage = damage(at.prepared(), wanted);
        return jobs.prepare(
                new NewJob(KIND, platform, at.revision(), AnswerJson.text(request)),
                progress -> compute(at, wanted.request(), damage, progress, source));
    }

    /**
     * The curve of a platform that need not be stored.
     *
     * @throws FaultyDocumentException with all that is wrong with the request
     */
    public static TracedKgCurve compute(
            PlatformAtRevision platform, JsonNode request, Progress progress, Provenance.Source source) {
        Wanted wanted = KgRequestReader.read(request, platform.prepared());
        return compute(platform, wanted.request(), damage(platform.prepared(), wanted), progress, source);
    }

    private static TracedKgCurve compute(
            PlatformAtRevision platform,
            KgRequest wanted,
            Question damage,
            Progress progress,
            Provenance.Source source) {
        KgRequest request = wanted.surviving(damage.cases());
        StabilityRules rules = platform.prepared().platform().stabilityRules();
        OptionalDouble wind = request.windSpeed().isPresent()
                ? request.windSpeed()
                : request.mode().windSpeed();
        return new TracedKgCurve(
                request.mode().id(),
                rules.rules(),
                rules.assumed(),
                wind.isPresent() ? Double.valueOf(wind.getAsDouble()) : null,
                request.waterDensity(),
                AllowableKgCurve.find(platform.prepared(), request, progress),
                damage.cases().stream().map(DamageCase::id).toList(),
                damage.notes(),
                source.of(platform.revision()));
    }

    private static Question damage(PreparedPlatform prepared, Wanted wanted) {
        KgRequest request = wanted.request();
        double deepest = request.drafts().get(request.drafts().size() - 1);
        return switch (wanted.damage()) {
            case NONE -> new Question(List.of(), List.of(), List.of("No damage was counted."));
            case LISTED -> JudgeDamage.listed(prepared.platform());
            case GENERATED ->
                JudgeDamage.collision(prepared, request.mode()).and(JudgeDamage.flooding(prepared, deepest));
        };
    }

    /**
     * Checks a curve that a mode shall have.
     *
     * @param request {@code {"job": id}} for the result of a job, with {@code "despiteGaps": true} even when something could not be judged;
     *     or {@code {"points": [[draft, kg], …]}}
     * @param expected the platform's revision that it is for; empty for the current one
     * @throws Refusal when there is no such platform, mode or job, or the job has no result
     * @throws FaultyDocumentException when the curve is not one that the platform can have
     */
    public Pending<StorePlatform.StoredRevision> replace(
            String platform, String mode, JsonNode request, OptionalInt expected) {
        StoredPlatform stored = shelf.stored(platform, OptionalInt.empty());
        requireMode(shelf.at(platform, stored.revision()), mode);
        List<KgPoint> points = points(stored, mode, request);
        byte[] text = stored.document().getBytes(StandardCharsets.UTF_8);
        JsonNode changed = KgCurves.replaced(Json.parse(text), mode, points);
        // The rest of the document is that of the revision read, so that must still be the current one.
        OptionalInt basis = expected.isPresent() ? expected : OptionalInt.of(stored.revision());
        try {
            return storePlatform.prepare(platform, AnswerJson.text(changed), changed, basis);
        } catch (FaultyDocumentException e) {
            throw inRequest(e, request.has("job") ? "/job" : "/points");
        }
    }

    /** What is wrong with the platform's document is wrong with the curve, for the rest of it was stored as it is. */
    private static FaultyDocumentException inRequest(FaultyDocumentException inDocument, String curve) {
        return new FaultyDocumentException(inDocument.faults().stream()
                .map(f -> new Fault(CURVE.matcher(f.pointer()).replaceFirst(curve), f.detail(), f.kind()))
                .toList());
    }

    private static void requireMode(PlatformAtRevision platform, String mode) {
        if (platform.prepared().platform().modes().stream().noneMatch(m -> m.id().equals(mode))) {
            throw Refusal.notFound("Platform " + platform.id() + " has no mode " + mode + ".");
        }
    }

    private List<KgPoint> points(StoredPlatform platform, String mode, JsonNode request) {
        Faults faults = new Faults();
        Fields fields = Fields.of(request, "", faults);
        boolean byJob = fields.has("job");
        if (byJob == fields.has("points")) {
            faults.form("", "exactly one of job and points must be given");
        }
        String job = fields.text("job", "none");
        List<KgPoint> points = fields.rows("points", 2, Range.COORDINATE).stream()
                .map(row -> new KgPoint(row[0], row[1]))
                .toList();
        boolean despiteGaps = fields.flag("despiteGaps", false);
        fields.noOthers();
        if (fields.has("points") && points.isEmpty() && faults.count() == 0) {
            fields.form("points", "points must have at least one entry");
        }
        faults.throwIfAny();
        return byJob ? ofJob(platform, mode, job, despiteGaps) : points;
    }

    private List<KgPoint> ofJob(StoredPlatform platform, String mode, String id, boolean despiteGaps) {
        StoredJob job = jobs.read(id);
        if (!job.kind().equals(KIND) || !job.platform().equals(platform.id())) {
            throw fault("job " + id + " did not compute a greatest KG of platform " + platform.id());
        }
        if (job.platformRevision() != platform.revision()) {
            throw fault("job " + id + " was computed for revision " + job.platformRevision()
                    + ", and the platform is at revision " + platform.revision() + "; compute it again");
        }
        if (job.state() != JobState.DONE) {
            throw fault("job " + id + " has no result");
        }
        JsonNode result = StoredJson.tree(jobs.result(id));
        if (!despiteGaps) {
            refuseGaps(result);
        }
        if (!mode.equals(result.path("mode").textValue())) {
            throw fault("job " + id + " was computed for mode "
                    + result.path("mode").textValue());
        }
        return ofResult(result);
    }

    /** A curve that leaves something out is not made a limit unless whoever asks says so. */
    private static void refuseGaps(JsonNode result) {
        if (result.path("rulesAssumed").booleanValue()) {
            throw fault("the platform's document names no rules, and "
                    + result.path("rules").textValue() + " were assumed; name them, or say despiteGaps");
        }
        for (JsonNode limit : result.path("limits")) {
            if (!limit.path("notJudged").isEmpty()) {
                throw fault("not everything could be judged: "
                        + limit.path("notJudged").get(0).textValue() + "; mend the document, or say despiteGaps");
            }
        }
    }

    private static List<KgPoint> ofResult(JsonNode result) {
        List<KgPoint> points = new ArrayList<>();
        for (JsonNode limit : result.path("limits")) {
            if (!limit.path("allowableKg").isNumber()) {
                throw fault("no KG was found at the draft of " + limit.path("draft") + " m; a curve cannot have a gap");
            }
            points.add(new KgPoint(
                    limit.path("draft").doubleValue(), limit.path("allowableKg").doubleValue()));
        }
        return points;
    }

    private static FaultyDocumentException fault(String detail) {
        return new FaultyDocumentException(List.of(new Fault("/job", detail, Fault.Kind.MEANING)));
    }
}
