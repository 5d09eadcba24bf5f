package org.evendraft.ballast;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.io.InputStream;
import java.util.Objects;
import org.evendraft.platform.Condition;
import org.evendraft.platform.ConditionReader;
import org.evendraft.platform.Json;
import org.evendraft.platform.PlatformReader;
import org.evendraft.platform.PreparedPlatform;
import org.junit.jupiter.api.Test;

/** The demo platform's plan: on target, proven, limits kept on the way. */
final class DemoPlanTest {

    private static JsonNode document(String name) throws IOException {
        try (InputStream in = DemoPlanTest.class.getResourceAsStream("/db/demo/" + name)) {
            return Json.parse(Objects.requireNonNull(in).readAllBytes());
        }
    }

    @Test
    void theDemoIsBroughtOnTargetInsideItsLimits() throws IOException {
        PreparedPlatform prepared = PlatformReader.read(document("merganser.json"));
        Condition condition = ConditionReader.read(document("condition.json"), prepared);
        PlanRequest request = PlanRequestReader.read(document("request.json"), prepared, condition);
        Plan plan = BallastPlanner.plan(prepared, condition, request);
        assertThat(plan.feasible()).isTrue();
        assertThat(plan.optimality().proven()).isTrue();
        assertThat(plan.moves()).isNotEmpty();
        assertThat(plan.binding()).isEmpty();
        assertThat(plan.warnings()).noneMatch(warning -> warning.startsWith("On the way"));
        assertThat(plan.after().floating().draft()).isCloseTo(18.5, within(0.02));
        assertThat(plan.after().floating().heelAngle()).isCloseTo(0, within(0.05));
        assertThat(plan.after().floating().trimAngle()).isCloseTo(0, within(0.05));
        assertThat(plan.worst().heelAngle().value()).isLessThanOrEqualTo(3);
        assertThat(plan.worst().trimAngle().value()).isLessThanOrEqualTo(3);
        assertThat(plan.caution()).contains("Planning aid only");
    }

    /** The start lies outside these limits: heel and trim may not grow until they are inside, so one pump has to start later. */
    @Test
    void theWayBackInsideTightLimitsIsFoundInOneMoveForEachTank() throws IOException {
        PreparedPlatform prepared = PlatformReader.read(document("merganser.json"));
        Condition condition = ConditionReader.read(document("condition.json"), prepared);
        ObjectNode tight = (ObjectNode) document("request.json");
        ((ObjectNode) tight.path("operationLimits")).put("maxHeel", 1.0).put("maxTrim", 1.0);
        Plan plan = BallastPlanner.plan(prepared, condition, PlanRequestReader.read(tight, prepared, condition));
        assertThat(plan.feasible()).isTrue();
        assertThat(plan.binding()).isEmpty();
        assertThat(plan.moves()).hasSize(plan.tanksTouched());
        assertThat(plan.moves()).anyMatch(move -> move.startMinute() > 5);
        assertThat(plan.worst().heelAngle().minute()).isZero();
    }
}
