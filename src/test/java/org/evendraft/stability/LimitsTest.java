package org.evendraft.stability;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.evendraft.geometry.Vec3;
import org.evendraft.platform.Condition;
import org.evendraft.platform.Condition.FreeSurface;
import org.evendraft.platform.DeckArea;
import org.evendraft.platform.DeckArea.Corner;
import org.evendraft.platform.DraftMark;
import org.evendraft.platform.Fill;
import org.evendraft.platform.GmBound;
import org.evendraft.platform.Lightship;
import org.evendraft.platform.Load;
import org.evendraft.platform.Mode;
import org.evendraft.platform.Mode.DraftRange;
import org.evendraft.platform.Mode.KgPoint;
import org.evendraft.platform.Opening;
import org.evendraft.platform.Opening.Closing;
import org.evendraft.platform.Platform;
import org.evendraft.platform.PreparedPlatform;
import org.evendraft.platform.StabilityRules;
import org.evendraft.platform.Tank;
import org.evendraft.stability.ConditionResult.LimitResult;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Limits with their names and margins, and warnings, on a box 65 × 12 × 8 m that floats at 4 m with KM 5, KG 4 and GM 1 m. */
class LimitsTest {
    private static final double MASS = 3198;

    private final List<DeckArea> areas = new ArrayList<>();
    private final List<Opening> openings = new ArrayList<>();
    private final List<Tank> tanks = new ArrayList<>();
    private final List<Load> loads = new ArrayList<>();
    private final List<Fill> fills = new ArrayList<>();
    private Vec3 centre = new Vec3(0, 0, 4);

    private ConditionResult evaluate(Mode mode) {
        Platform platform = new Platform(
                "test",
                "Test",
                1.025,
                List.of(Floaters.box("hull", -32.5, 32.5, -6, 6, 0, 8)),
                List.of(new DraftMark("PF", 30, 6, 0), new DraftMark("SA", -30, -6, -0.5)),
                new Lightship(MASS, centre),
                tanks,
                List.of(),
                areas,
                List.of(),
                openings,
                List.of(),
                List.of(),
                StabilityRules.NONE,
                List.of());
        return Evaluation.evaluate(
                new PreparedPlatform(platform),
                new Condition("test", Optional.of(mode), 1.025, FreeSurface.ACTUAL, fills, loads));
    }

    private static Mode mode(
            Optional<DraftRange> drafts,
            Optional<GmBound> gm,
            List<KgPoint> kg,
            OptionalDouble heel,
            OptionalDouble trim,
            OptionalDouble deck) {
        return new Mode("m", "Mode", drafts, gm, kg, heel, trim, deck, OptionalDouble.empty());
    }

    private static Mode none() {
        return kgCurve(List.of());
    }

    private static Mode kgCurve(List<KgPoint> curve) {
        return mode(
                Optional.empty(),
                Optional.empty(),
                curve,
                OptionalDouble.empty(),
                OptionalDouble.empty(),
                OptionalDouble.empty());
    }

    private static LimitResult limit(ConditionResult result, String name) {
        return result.limits().stream()
                .filter(l -> l.limit().equals(name))
                .findFirst()
                .orElseThrow(() -> new AssertionError(name + " not in " + result.limits()));
    }

    private static void assertLimit(ConditionResult result, String name, double value, double bound, double margin) {
        LimitResult limit = limit(result, name);
        assertThat(limit.value()).isCloseTo(value, within(1e-6));
        assertThat(limit.bound()).isCloseTo(bound, within(1e-12));
        assertThat(limit.margin()).isCloseTo(margin, within(1e-6));
        assertThat(limit.met()).isEqualTo(margin >= 0);
        assertThat(result.warnings().stream().anyMatch(w -> w.contains("Limit " + name + " is not met")))
                .isEqualTo(margin < 0);
    }

    @ParameterizedTest
    @CsvSource({"3.5, 4.5, 0.5, 0.5", "4.1, 4.5, -0.1, 0.5", "3, 3.75, 1, -0.25"})
    void draftRange(double least, double greatest, double toMin, double toMax) {
        ConditionResult result = evaluate(mode(
                Optional.of(new DraftRange(least, greatest)),
                Optional.empty(),
                List.of(),
                OptionalDouble.empty(),
                OptionalDouble.empty(),
                OptionalDouble.empty()));
        assertThat(result.limits()).hasSize(2);
        assertLimit(result, "draftRange.min", 4, least, toMin);
        assertLimit(result, "draftRange.max", 4, greatest, toMax);
    }

    @ParameterizedTest
    @CsvSource({"0.5, 50, 0.5, 36", "1.25, 100, -0.25, -14"})
    void minGm(double transverse, double longitudinal, double marginT, double marginL) {
        ConditionResult result = evaluate(mode(
                Optional.empty(),
                Optional.of(new GmBound(OptionalDouble.of(transverse), OptionalDouble.of(longitudinal))),
                List.of(),
                OptionalDouble.empty(),
                OptionalDouble.empty(),
                OptionalDouble.empty()));
        double gmL = 2 + 65.0 * 65 / 48 - 4;
        assertLimit(result, "minGm.transverse", 1, transverse, marginT);
        assertLimit(result, "minGm.longitudinal", gmL, longitudinal, gmL - longitudinal);
        assertThat(limit(result, "minGm.longitudinal").margin()).isCloseTo(marginL, within(0.03));
    }

    @Test
    void oneDirectionOfGmAloneMayBeBounded() {
        ConditionResult result = evaluate(mode(
                Optional.empty(),
                Optional.of(new GmBound(OptionalDouble.of(0.3), OptionalDouble.empty())),
                List.of(),
                OptionalDouble.empty(),
                OptionalDouble.empty(),
                OptionalDouble.empty()));
        assertThat(result.limits()).extracting(LimitResult::limit).containsExactly("minGm.transverse");
    }

    /** KG with the free-surface correction against the curve, linear between its points. */
    @ParameterizedTest
    @CsvSource({"3, 5, 5, 4, 0.5", "3, 4, 5, 3, -0.5", "4.0, 4.2, 5, 3, 0.2"})
    void allowableKgIsReadBetweenItsPoints(double d0, double kg0, double d1, double kg1, double margin) {
        ConditionResult result = evaluate(kgCurve(List.of(new KgPoint(d0, kg0), new KgPoint(d1, kg1))));
        double bound = kg0 + (4 - d0) / (d1 - d0) * (kg1 - kg0);
        LimitResult limit = limit(result, "allowableKg");
        assertThat(limit.value()).isCloseTo(4, within(1e-9));
        assertThat(limit.bound()).isCloseTo(bound, within(1e-6));
        assertThat(limit.margin()).isCloseTo(margin, within(1e-6));
    }

    @Test
    void allowableKgCountsTheFreeSurface() {
        tanks.add(Floaters.tank("T", Floaters.box("T", -10, 10, -3, 3, 0, 2)));
        fills.add(new Fill("T", 120, 1.025));
        ConditionResult result = evaluate(kgCurve(List.of(new KgPoint(1, 9), new KgPoint(7, 9))));
        double mass = MASS + 120 * 1.025;
        double kg = (MASS * 4 + 120 * 1.025 * 0.5) / mass;
        double correction = 1.025 * 20 * 216 / 12 / mass;
        assertLimit(result, "allowableKg", kg + correction, 9, 9 - kg - correction);
    }

    @ParameterizedTest
    @CsvSource({"4.5, 6", "1, 3.9"})
    void outsideItsDraftsTheAllowableKgIsNotMet(double from, double to) {
        ConditionResult result = evaluate(kgCurve(List.of(new KgPoint(from, 9), new KgPoint(to, 9))));
        LimitResult limit = limit(result, "allowableKg");
        assertThat(limit.bound()).isNull();
        assertThat(limit.margin()).isNull();
        assertThat(limit.met()).isFalse();
        assertThat(result.warnings()).anyMatch(w -> w.contains("allowableKg") && w.contains("does not reach"));
    }

    @Test
    void theCurveIsDefinedAtItsEndsAndNowhereBeyond() {
        List<KgPoint> curve = List.of(new KgPoint(2, 9), new KgPoint(3, 8), new KgPoint(5, 6));
        assertThat(AllowableKg.at(curve, 2)).hasValue(9);
        assertThat(AllowableKg.at(curve, 3)).hasValue(8);
        assertThat(AllowableKg.at(curve, 5)).hasValue(6);
        assertThat(AllowableKg.at(curve, 4).orElseThrow()).isCloseTo(7, within(1e-12));
        assertThat(AllowableKg.at(curve, 1.999_999)).isEmpty();
        assertThat(AllowableKg.at(curve, 5.000_001)).isEmpty();
        assertThat(AllowableKg.at(List.of(), 3)).isEmpty();
        assertThat(AllowableKg.at(List.of(new KgPoint(3, 7)), 3)).hasValue(7);
    }

    /** Heel and trim count by size, to either side: G 0.05 m off heels 2.85° (the wall-sided rule), 1 m forward trims 0.7°. */
    @ParameterizedTest
    @CsvSource({"0.05, 1", "-0.05, -1"})
    void maxHeelAndMaxTrim(double y, double x) {
        centre = new Vec3(x, y, 4);
        ConditionResult result = evaluate(mode(
                Optional.empty(),
                Optional.empty(),
                List.of(),
                OptionalDouble.of(3),
                OptionalDouble.of(0.5),
                OptionalDouble.empty()));
        double heel = Math.abs(result.floating().heelAngle());
        assertThat(heel).isCloseTo(2.85, within(0.02));
        assertThat(Math.signum(result.floating().heelAngle())).isEqualTo(-Math.signum(y));
        assertThat(Math.signum(result.floating().trimAngle())).isEqualTo(Math.signum(x));
        assertLimit(result, "maxHeel", heel, 3, 3 - heel);
        double trim = Math.abs(result.floating().trimAngle());
        assertLimit(result, "maxTrim", trim, 0.5, 0.5 - trim);
    }

    private static Load load(Load.Kind kind, String area, double mass, double x, OptionalDouble footprint) {
        return new Load(
                kind + " " + mass,
                kind,
                Optional.ofNullable(area.isEmpty() ? null : area),
                mass,
                new Vec3(x, 0, 8),
                footprint);
    }

    /** The mode's deck load sums loads of kind deck, the area's all that stands on it; exactly on a bound is inside. */
    @Test
    void deckLoads() {
        List<Corner> outline = List.of(new Corner(-10, -5), new Corner(10, -5), new Corner(10, 5), new Corner(-10, 5));
        areas.add(new DeckArea("pipe", outline, 8, OptionalDouble.of(60), OptionalDouble.of(0.3)));
        areas.add(new DeckArea("open", outline, 8, OptionalDouble.empty(), OptionalDouble.empty()));
        loads.add(load(Load.Kind.DECK, "pipe", 40, 0, OptionalDouble.empty()));
        loads.add(load(Load.Kind.VARIABLE, "pipe", 20, 3, OptionalDouble.empty()));
        loads.add(load(Load.Kind.SUSPENDED, "pipe", 10, 3, OptionalDouble.empty()));
        loads.add(load(Load.Kind.DECK, "", 5, 3, OptionalDouble.empty()));
        loads.add(load(Load.Kind.DECK, "pipe", 0, 12, OptionalDouble.empty()));
        ConditionResult result = evaluate(mode(
                Optional.empty(),
                Optional.empty(),
                List.of(),
                OptionalDouble.empty(),
                OptionalDouble.empty(),
                OptionalDouble.of(45)));
        assertLimit(result, "maxDeckLoad", 45, 45, 0);
        assertLimit(result, "deckArea.pipe.maxLoad", 60, 60, 0);
        assertLimit(result, "deckArea.pipe.maxPressure", 0.3, 0.3, 0);
        assertThat(result.limits()).hasSize(3);
        assertThat(result.warnings())
                .anyMatch(w -> w.contains("DECK 5.0 names no deck area"))
                .anyMatch(w -> w.contains("DECK 0.0 names deck area pipe but lies outside it"))
                .noneMatch(w -> w.contains("DECK 40.0"));
    }

    /** A load with a footprint presses by itself: 20 t on 10 m² is 2 t/m² though the area bears 0.1 t/m² on the mean. */
    @Test
    void aFootprintPressesHarderThanTheMean() {
        List<Corner> outline = List.of(new Corner(-10, -5), new Corner(10, -5), new Corner(10, 5), new Corner(-10, 5));
        areas.add(new DeckArea("pipe", outline, 8, OptionalDouble.of(60), OptionalDouble.of(1.5)));
        loads.add(load(Load.Kind.DECK, "pipe", 20, 0, OptionalDouble.of(10)));
        assertLimit(evaluate(none()), "deckArea.pipe.maxPressure", 2, 1.5, -0.5);
    }

    @Test
    void openingsUnderWaterAreNamedUnlessWatertight() {
        openings.add(new Opening("under", new Vec3(10, 0, 3.5), Closing.NONE));
        openings.add(new Opening("weather", new Vec3(10, 0, 3), Closing.WEATHERTIGHT));
        openings.add(new Opening("tight", new Vec3(10, 0, 3), Closing.WATERTIGHT));
        openings.add(new Opening("over", new Vec3(10, 0, 4.5), Closing.NONE));
        List<String> warnings = evaluate(none()).warnings();
        assertThat(warnings).hasSize(2).anyMatch(w -> w.contains("Opening under lies 0.50 m under water"));
        assertThat(warnings).anyMatch(w -> w.contains("Opening weather lies 1.00 m under water"));
        centre = new Vec3(0, -0.05, 4);
        openings.clear();
        openings.add(new Opening("low side", new Vec3(0, -6, 4.1), Closing.NONE));
        openings.add(new Opening("high side", new Vec3(0, 6, 4.1), Closing.NONE));
        assertThat(evaluate(none()).warnings()).hasSize(1).allMatch(w -> w.contains("low side"));
    }

    /** A mark at (x, y) with its zero at z₀ reads draft + x·tan(trim) − y·tan(heel) − z₀. */
    @Test
    void marksReadThePlaneAtTheirPlaces() {
        centre = new Vec3(1, -0.05, 4);
        ConditionResult result = evaluate(none());
        double h = Math.tan(Math.toRadians(result.floating().heelAngle()));
        double t = Math.tan(Math.toRadians(result.floating().trimAngle()));
        double draft = result.floating().draft();
        assertThat(h).isPositive();
        assertThat(t).isPositive();
        assertThat(result.floating().marks().get("PF")).isCloseTo(draft + 30 * t - 6 * h, within(1e-12));
        assertThat(result.floating().marks().get("SA")).isCloseTo(draft - 30 * t + 6 * h + 0.5, within(1e-12));
    }
}
