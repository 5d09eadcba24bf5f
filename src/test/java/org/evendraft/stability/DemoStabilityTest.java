package org.evendraft.stability;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.OptionalDouble;
import org.evendraft.platform.Condition;
import org.evendraft.platform.ConditionReader;
import org.evendraft.platform.Json;
import org.evendraft.platform.Mode;
import org.evendraft.platform.PlatformReader;
import org.evendraft.platform.PreparedPlatform;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** The demo platform holds together: invented data, so nothing here proves a formula. */
class DemoStabilityTest {
    private static final PreparedPlatform DEMO = PlatformReader.read(document("merganser.json"));

    /** The worst axis is found to a third of a degree, which leaves this of a margin (m, ratio). */
    private static final double CLOSER_LOOK = 0.02;

    private static JsonNode document(String name) {
        try {
            return Json.parse(Files.readAllBytes(Path.of("db/demo", name)));
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private static Condition condition() {
        return ConditionReader.read(document("condition.json"), DEMO);
    }

    /** The curve in the document keeps to what its criteria allow with the damage cases that it lists. */
    @ParameterizedTest
    @ValueSource(strings = {"operating", "survival"})
    void curvesOfGreatestKgKeepToTheCriteria(String id) {
        Mode mode = DEMO.platform().modes().stream()
                .filter(m -> m.id().equals(id))
                .findFirst()
                .orElseThrow();
        List<Double> drafts =
                mode.allowableKg().stream().map(Mode.KgPoint::draft).toList();
        KgRequest request = new KgRequest(
                mode,
                drafts,
                OptionalDouble.empty(),
                DEMO.platform().waterDensity(),
                OptionalDouble.empty(),
                DEMO.platform().damageCases());
        List<KgLimit> limits = AllowableKgCurve.find(DEMO, request, Progress.UNWATCHED);
        for (int i = 0; i < limits.size(); i++) {
            assertThat(limits.get(i).allowableKg())
                    .as("at %s m, by %s", drafts.get(i), limits.get(i).criterion())
                    .isGreaterThanOrEqualTo(mode.allowableKg().get(i).kg());
            assertThat(limits.get(i).notJudged()).isEmpty();
        }
    }

    /** What is kept about every axis in the condition is kept about one: the worst is no better than any curve asked for. */
    @ParameterizedTest
    @ValueSource(doubles = {0, 47, 90, 133, 251})
    void theWorstAxisIsNoBetterThanAnyOther(double azimuth) {
        LoadedPlatform loaded = LoadedPlatform.of(DEMO, condition());
        List<CriterionResult> worst = IntactStability.judge(
                loaded, Evaluation.afloat(loaded), condition().mode(), OptionalDouble.empty());
        AxisAnswer one = AxisAnswer.of(
                loaded,
                Evaluation.afloat(loaded),
                condition().mode(),
                OptionalDouble.empty(),
                RightingCurve.Request.usual(azimuth));
        assertThat(one.criteria()).hasSameSizeAs(worst);
        for (int i = 0; i < worst.size(); i++) {
            assertThat(worst.get(i).criterion()).isEqualTo(one.criteria().get(i).criterion());
            assertThat(worst.get(i).urgency())
                    .as(worst.get(i).criterion())
                    .isLessThanOrEqualTo(one.criteria().get(i).urgency() + CLOSER_LOOK);
        }
    }

    /** Twins port and starboard of a symmetric platform come to the same. */
    @Test
    void damageToTwinsIsTheSameOnBothSides() {
        JudgedBarge barge =
                new JudgedBarge().compartment("P", 30, 50, 2, 10, 0.9).compartment("S", 30, 50, -10, -2, 0.9);
        LoadedPlatform loaded = barge.loaded();
        Equilibrium.Afloat port =
                (Equilibrium.Afloat) loaded.withFlooded(List.of("P")).floatingPosition();
        Equilibrium.Afloat starboard =
                (Equilibrium.Afloat) loaded.withFlooded(List.of("S")).floatingPosition();
        assertThat(port.waterplane().heelAngle())
                .isNegative()
                .isCloseTo(-starboard.waterplane().heelAngle(), within(1e-8));
        assertThat(port.waterplane().draft()).isCloseTo(starboard.waterplane().draft(), within(1e-9));
    }
}
