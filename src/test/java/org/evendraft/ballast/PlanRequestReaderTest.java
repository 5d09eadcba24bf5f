package org.evendraft.ballast;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowableOfType;

import java.util.List;
import org.evendraft.platform.Condition;
import org.evendraft.platform.Fault;
import org.evendraft.platform.FaultyDocumentException;
import org.evendraft.platform.PreparedPlatform;
import org.junit.jupiter.api.Test;

final class PlanRequestReaderTest {
    private final PreparedPlatform prepared =
            BoxBarge.withPairs(1).pumpOnEachSide(1, 500).platform();
    private final Condition condition = BoxBarge.withPairs(1).condition(prepared);

    private PlanRequest read(String json) {
        return BoxBarge.request(json, prepared, condition);
    }

    private List<String> faultsOf(String json) {
        FaultyDocumentException thrown =
                catchThrowableOfType(FaultyDocumentException.class, () -> BoxBarge.request(json, prepared, condition));
        assertThat(thrown).isNotNull();
        return thrown.faults().stream().map(Fault::pointer).toList();
    }

    @Test
    void whatIsLeftOutHasTheDefaultsOfTheContract() {
        PlanRequest request = read("{\"target\":{\"draft\":6}}");
        assertThat(request.target().heelAngle()).isZero();
        assertThat(request.target().trimAngle()).isZero();
        assertThat(request.target().tolerance()).isEqualTo(new PlanRequest.Tolerance(0.01, 0.02));
        assertThat(request.objective()).isEqualTo(new PlanRequest.Objective(20, 20));
        assertThat(request.operationLimits().maxHeel()).isEmpty();
        assertThat(request.lockedTanks()).isEmpty();
        assertThat(request.pumpsOutOfService()).isEmpty();
    }

    @Test
    void whatIsGivenIsRead() {
        PlanRequest request =
                read("{\"target\":{\"draft\":6,\"heelAngle\":-1,\"trimAngle\":0.5,\"minGm\":{\"transverse\":2}},"
                        + "\"objective\":{\"touchPenalty\":5,\"slackPenalty\":0},"
                        + "\"operationLimits\":{\"maxHeel\":1,\"maxTrim\":2,\"minGm\":{\"longitudinal\":0.5}}}");
        assertThat(request.target().heelAngle()).isEqualTo(-1);
        assertThat(request.target().minGm().transverse()).hasValue(2);
        assertThat(request.objective()).isEqualTo(new PlanRequest.Objective(5, 0));
        assertThat(request.operationLimits().maxTrim()).hasValue(2);
        assertThat(request.operationLimits().minGm().longitudinal()).hasValue(0.5);
    }

    @Test
    void everyFaultIsListedWithItsPointer() {
        assertThat(
                        faultsOf(
                                "{\"target\":{\"draft\":40,\"heelAngle\":\"1\",\"tolerance\":{\"draft\":0,\"angle\":-1},\"x\":1},"
                                        + "\"objective\":{\"touchPenalty\":-1,\"slackPenalty\":-2},\"operationLimits\":{\"maxHeel\":0}}"))
                .containsExactlyInAnyOrder(
                        "/target/draft",
                        "/target/heelAngle",
                        "/target/tolerance/draft",
                        "/target/tolerance/angle",
                        "/target/x",
                        "/objective/touchPenalty",
                        "/objective/slackPenalty",
                        "/operationLimits/maxHeel");
    }

    @Test
    void tanksAndPumpsLeftOutOfAPlanAreRead() {
        PlanRequest request =
                read("{\"target\":{\"draft\":6},\"lockedTanks\":[\"S1\",\"P1\"],\"pumpsOutOfService\":[\"pump-P\"]}");
        assertThat(request.lockedTanks()).containsExactly("S1", "P1");
        assertThat(request.pumpsOutOfService()).containsExactly("pump-P");
    }

    @Test
    void tanksAndPumpsThatAreUnknownOrNamedTwiceAreAllFaults() {
        assertThat(faultsOf(
                        "{\"target\":{\"draft\":40},\"lockedTanks\":[\"X\",\"P1\",\"S1\",\"P1\",\"pump-P\",\"sea\",\"\",7],"
                                + "\"pumpsOutOfService\":[\"pump-P\",\"pump-P\",\"P1\"]}"))
                .containsExactlyInAnyOrder(
                        "/target/draft",
                        "/lockedTanks/0",
                        "/lockedTanks/3",
                        "/lockedTanks/4",
                        "/lockedTanks/5",
                        "/lockedTanks/6",
                        "/lockedTanks/7",
                        "/pumpsOutOfService/1",
                        "/pumpsOutOfService/2");
    }

    @Test
    void tanksAndPumpsLeftOutMustBeLists() {
        assertThat(faultsOf("{\"target\":{\"draft\":6},\"lockedTanks\":\"P1\",\"pumpsOutOfService\":{}}"))
                .containsExactlyInAnyOrder("/lockedTanks", "/pumpsOutOfService");
    }

    @Test
    void aRequestWithoutTargetIsAFault() {
        assertThat(faultsOf("{}")).containsExactly("/target");
    }

    @Test
    void aTargetWithoutDraftIsAFault() {
        assertThat(faultsOf("{\"target\":{}}")).containsExactly("/target/draft");
    }
}
