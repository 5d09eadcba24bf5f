package org.evendraft.http;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.List;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;

class PlansTest {
    private final TestService service = TestService.start();
    private final Api api = Barge.stored(service);
    private final String condition =
            api.post(Barge.PATH + "/conditions", Barge.CONDITION).header("Location");

    @AfterEach
    void stop() {
        service.close();
    }

    @Test
    void aPlanIsMadeStoredListedAndRead() {
        Api.Reply made = api.post(condition + "/plans", Barge.PLAN_REQUEST).expect(201);
        JsonNode plan = made.json();
        assertThat(plan.path("feasible").booleanValue()).isTrue();
        assertThat(plan.path("caution").textValue()).contains("Planning aid only");
        assertThat(plan.path("platformRevision").intValue()).isEqualTo(1);
        assertThat(condition).endsWith(plan.path("condition").textValue());
        assertThat(made.header("Location"))
                .isEqualTo(condition + "/plans/" + plan.path("id").textValue());
        assertThat(plan.path("moves").findValuesAsText("explanation"))
                .isNotEmpty()
                .allMatch(sentence -> sentence.contains("by itself"));
        assertThat(api.get(made.header("Location")).expect(200).json()).isEqualTo(plan);
        JsonNode list = api.get(condition + "/plans").expect(200).json().path("plans");
        assertThat(list.findValuesAsText("id")).containsExactly(plan.path("id").textValue());
    }

    @Test
    void aTargetThatCannotBeMetIsAnsweredHonestly() {
        String deep = Barge.PLAN_REQUEST.replace("3.5", "9.9");
        JsonNode plan = api.post(condition + "/plans", deep).expect(201).json();
        assertThat(plan.path("feasible").booleanValue()).isFalse();
        assertThat(plan.path("binding")).isNotEmpty();
        assertThat(api.get(condition + "/plans")
                        .json()
                        .path("plans")
                        .path(0)
                        .path("feasible")
                        .booleanValue())
                .isFalse();
    }

    @Test
    void aPlanWithTanksLockedOrPumpsOutOfServiceIsAnsweredHonestly() {
        JsonNode free =
                api.post(condition + "/plans", Barge.PLAN_REQUEST).expect(201).json();
        assertThat(free.path("feasible").booleanValue()).isTrue();
        for (String leftOut : List.of("\"lockedTanks\": [\"PORT\", \"STBD\"]", "\"pumpsOutOfService\": [\"P1\"]")) {
            String request = Barge.PLAN_REQUEST.replaceFirst("\\{", "{ " + leftOut + ",");
            JsonNode plan = api.post(condition + "/plans", request).expect(201).json();
            assertThat(plan.path("feasible").booleanValue()).isFalse();
            assertThat(plan.path("moves")).isEmpty();
            assertThat(plan.path("binding")).isNotEmpty();
        }
        Api.Reply refused = api.post(
                condition + "/plans",
                Barge.PLAN_REQUEST.replaceFirst("\\{", "{ \"lockedTanks\": [\"X\"], \"pumpsOutOfService\": [\"Y\"],"));
        refused.expect(422);
        assertThat(refused.pointers()).containsExactlyInAnyOrder("/lockedTanks/0", "/pumpsOutOfService/0");
    }

    @Test
    void faultsOfTheRequestAreToldAndNothingIsStored() {
        Api.Reply refused = api.post(
                condition + "/plans",
                "{ \"target\": { \"draft\": \"deep\", \"heelAngle\": 0, \"colour\": 1 }, \"x\": 2 }");
        refused.expect(400);
        assertThat(refused.pointers()).containsExactlyInAnyOrder("/target/draft", "/target/colour", "/x");
        assertThat(api.get(condition + "/plans").json().path("plans")).isEmpty();
    }

    @Test
    void plansOfNothingAreNotFound() {
        api.post(Barge.PATH + "/conditions/nobody/plans", Barge.PLAN_REQUEST).expect(404);
        api.get(Barge.PATH + "/conditions/nobody/plans").expect(404);
        api.get(condition + "/plans/nobody").expect(404);
    }
}
