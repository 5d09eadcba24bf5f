package org.evendraft.ballast.loadplan;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowableOfType;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import java.util.List;
import java.util.stream.Stream;
import org.evendraft.ballast.Plan;
import org.evendraft.platform.Fault;
import org.evendraft.platform.FaultyDocumentException;
import org.evendraft.platform.PreparedPlatform;
import org.junit.jupiter.api.Test;

final class LoadPlanReaderTest {
    private static final String CRATE =
            "{ \"event\": \"aboard\", \"name\": \"crate\", \"load\": { \"kind\": \"deck\", \"mass\": 200, \"x\": 0, \"y\": 0, \"z\": 14 } }";
    private static final String LIFT = "{ \"event\": \"lift\", \"load\": \"crate\", \"boomTip\": [0, 0, 44] }";
    private static final String SET_DOWN =
            "{ \"event\": \"setDown\", \"load\": \"crate\", \"x\": 0, \"y\": 0, \"z\": 14 }";
    private static final String BUNKER = "{ \"event\": \"bunker\", \"tank\": \"FUEL\", \"volume\": 300 }";

    private final PreparedPlatform platform = LiftBarge.ballasted();

    private List<String> faultsOf(String rest, String... events) {
        FaultyDocumentException thrown =
                catchThrowableOfType(FaultyDocumentException.class, () -> LiftBarge.request(platform, rest, events));
        assertThat(thrown).as("no fault").isNotNull();
        return thrown.faults().stream().map(Fault::pointer).toList();
    }

    private List<String> faultsOfEvents(String... events) {
        return faultsOf(LiftBarge.LIGHT, events);
    }

    @Test
    void whatIsLeftOutHasDefaults() {
        LoadPlanRequest request = LiftBarge.request(platform, LiftBarge.HALF_FULL, CRATE);
        assertThat(request.name()).isEqualTo("half");
        assertThat(request.ballasting()).isEqualTo(Ballasting.EACH_EVENT);
        assertThat(request.ballast().target().heelAngle()).isZero();
        double mass = 8000 + 4 * 18 * 8 * 3;
        assertThat(request.ballast().target().draft()).isEqualTo(mass / LiftBarge.AREA, within(1e-9));
        assertThat(request.ballast().operationLimits().maxHeel()).hasValue(5);
        assertThat(request.events().get(0).limits()).isEqualTo(request.ballast().operationLimits());
    }

    @Test
    void tanksAndPumpsLeftOutAreReadAsInAPlanRequest() {
        String leftOut = LiftBarge.LIGHT + ", \"lockedTanks\": [\"P1\"], \"pumpsOutOfService\": [\"pump\"]";
        LoadPlanRequest request = LiftBarge.request(platform, leftOut, CRATE);
        assertThat(request.ballast().lockedTanks()).containsExactly("P1");
        assertThat(request.ballast().pumpsOutOfService()).containsExactly("pump");
        assertThat(faultsOf(leftOut.replace("P1", "none").replace("[\"pump", "[\"P1"), CRATE))
                .containsExactlyInAnyOrder("/lockedTanks/0", "/pumpsOutOfService/0");
    }

    @Test
    void aTankLeftOutStaysOutOfEveryPlanOfTheSequence() {
        String crate = CRATE.replace("\"y\": 0", "\"y\": 12");
        for (String ballast : List.of("once", "eachEvent")) {
            String rest = LiftBarge.HALF_FULL + ", \"lockedTanks\": [\"S1\", \"P1\"], \"ballast\": \"" + ballast + "\"";
            LoadPlan plan = LiftBarge.plan(platform, rest, crate);
            List<String> touched = Stream.concat(
                            plan.preBallast().stream(),
                            plan.events().stream()
                                    .flatMap(event ->
                                            Stream.concat(event.planBefore().stream(), event.planAfter().stream())))
                    .flatMap(made -> made.fills().stream())
                    .map(Plan.EndFill::tank)
                    .toList();
            assertThat(touched).isNotEmpty().isSubsetOf("P2", "S2");
        }
    }

    @Test
    void anotherModeMayBeInForce() {
        LoadPlanRequest request = LiftBarge.request(platform, LiftBarge.LIGHT + ", \"mode\": \"afloat\"", CRATE);
        assertThat(request.start().mode()).isPresent();
        assertThat(request.ballast().operationLimits().maxTrim()).hasValue(5);
    }

    @Test
    void faultsOfAllPartsAreToldTogether() {
        String bad =
                "{ \"event\": \"aboard\", \"name\": \"a\", \"load\": { \"kind\": \"deck\", \"mass\": -1, \"x\": 0, \"y\": 0 } }";
        assertThat(faultsOf(
                        "\"start\": { \"fills\": [ { \"tank\": \"NONE\", \"mass\": 1 } ] }, \"target\": { \"draft\": 40 }, "
                                + "\"operationLimits\": { \"maxHeel\": 0 }, \"ballast\": \"often\", \"colour\": 1, \"wind\": { \"speed\": -1 }",
                        bad,
                        "{ \"event\": \"jump\" }"))
                .containsExactlyInAnyOrder(
                        "/start/fills/0/tank",
                        "/target/draft",
                        "/operationLimits/maxHeel",
                        "/ballast",
                        "/colour",
                        "/wind/speed",
                        "/events/0/load/mass",
                        "/events/0/load/z",
                        "/events/1/event");
    }

    @Test
    void eitherAConditionOrAStartIsGiven() {
        assertThat(faultsOf("\"name\": \"x\"", CRATE)).containsExactly("");
        assertThat(faultsOf(LiftBarge.LIGHT + ", \"condition\": \"c\"", CRATE)).containsExactly("");
        assertThat(faultsOf("\"condition\": \"unknown\"", CRATE)).containsExactly("/condition");
    }

    @Test
    void aStartThatCapsizesIsAFaultOfTheStart() {
        assertThat(faultsOf(
                        "\"start\": { \"loads\": [ { \"kind\": \"variable\", \"mass\": 3000, \"x\": 0, \"y\": 10, \"z\": 200 } ] }",
                        CRATE))
                .containsExactly("/start");
    }

    @Test
    void aPlanWithoutEventsIsAFault() {
        assertThat(faultsOf(LiftBarge.LIGHT)).containsExactly("/events");
    }

    @Test
    void aDayHasOnlySoManyEvents() {
        String[] events = new String[LoadPlanReader.MOST_EVENTS + 1];
        Arrays.fill(events, "{ \"event\": \"wind\", \"speed\": 0 }");
        assertThat(faultsOfEvents(events)).containsExactly("/events");
    }

    @Test
    void eventsStandInTheOrderOfTime() {
        assertThat(faultsOfEvents(
                        "{ \"event\": \"wind\", \"speed\": 5, \"minute\": 10 }",
                        "{ \"event\": \"wind\", \"speed\": 6 }",
                        "{ \"event\": \"wind\", \"speed\": 7, \"minute\": 9 }",
                        "{ \"event\": \"wind\", \"speed\": 7, \"minute\": 10 }"))
                .containsExactly("/events/2/minute");
    }

    @Test
    void loadsMustBeAboardAndHangOrStandAsTheEventNeeds() {
        assertThat(faultsOfEvents(LIFT)).containsExactly("/events/0/load");
        assertThat(faultsOfEvents(CRATE, LIFT, LIFT)).containsExactly("/events/2/load");
        assertThat(faultsOfEvents(CRATE, SET_DOWN)).containsExactly("/events/1/load");
        assertThat(faultsOfEvents(CRATE, LIFT.replace("lift", "slew"))).containsExactly("/events/1/load");
        assertThat(faultsOfEvents(CRATE, LIFT, SET_DOWN.replace("setDown", "moves")))
                .containsExactly("/events/2/load");
        assertThat(faultsOfEvents(CRATE, "{ \"event\": \"leaves\", \"load\": \"crate\" }", LIFT))
                .containsExactly("/events/2/load");
    }

    @Test
    void aLoadThatComesAboardHangingCanBeSetDown() {
        String hanging = CRATE.replace("deck", "suspended");
        assertThat(LiftBarge.request(platform, LiftBarge.LIGHT, hanging, SET_DOWN)
                        .events())
                .hasSize(2);
    }

    @Test
    void namesOfLoadsMustNotClash() {
        assertThat(faultsOfEvents(CRATE, CRATE)).containsExactly("/events/1/name");
        assertThat(faultsOfEvents(CRATE.replace("\"name\": \"crate\", ", ""))).containsExactly("/events/0/name");
        assertThat(faultsOfEvents(CRATE.replace("\"kind\"", "\"name\": \"other\", \"kind\"")))
                .containsExactly("/events/0/name");
    }

    @Test
    void noMoreLeavesThanThereIs() {
        assertThat(faultsOfEvents(CRATE, "{ \"event\": \"leaves\", \"load\": \"crate\", \"mass\": 201 }"))
                .containsExactly("/events/1/mass");
    }

    @Test
    void aTankGivesAndTakesOnlyWhatItCan() {
        assertThat(faultsOfEvents("{ \"event\": \"consume\", \"tank\": \"FUEL\", \"mass\": 1 }"))
                .containsExactly("/events/0/mass");
        assertThat(faultsOfEvents(BUNKER, BUNKER)).containsExactly("/events/1/volume");
        assertThat(faultsOfEvents(BUNKER.replace("FUEL", "NONE"))).containsExactly("/events/0/tank");
        assertThat(faultsOfEvents(BUNKER.replace("FUEL", "P1"))).containsExactly("/events/0/tank");
        assertThat(faultsOfEvents(BUNKER.replace("300", "300, \"mass\": 2"))).containsExactly("/events/0");
        assertThat(faultsOfEvents("{ \"event\": \"bunker\", \"tank\": \"FUEL\" }"))
                .containsExactly("/events/0");
    }

    @Test
    void aFaultIsToldOnceAndNotAgainInTheEventsThatFollowFromIt() {
        String faulty = CRATE.replace("200", "\"heavy\"");
        assertThat(faultsOfEvents(faulty, LIFT, SET_DOWN)).containsExactly("/events/0/load/mass");
    }

    @Test
    void anEventsOwnPropertiesAreChecked() {
        assertThat(faultsOfEvents(
                        CRATE,
                        "{ \"event\": \"moves\", \"load\": \"crate\", \"x\": 1, \"y\": 1, \"area\": \"attic\", \"mass\": 3 }",
                        "{ \"event\": \"wind\", \"speed\": 999, \"limits\": { \"maxHeel\": -1, \"maxRoll\": 1 } }"))
                .containsExactlyInAnyOrder(
                        "/events/1/z",
                        "/events/1/area",
                        "/events/1/mass",
                        "/events/2/speed",
                        "/events/2/limits/maxHeel",
                        "/events/2/limits/maxRoll");
    }
}
