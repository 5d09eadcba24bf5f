package org.evendraft.http;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;

class IdempotencyTest {
    private static final String CONDITIONS = Barge.PATH + "/conditions";
    private static final String KEY = "Idempotency-Key";

    private final TestService service = TestService.start();
    private final Api api = Barge.stored(service);

    @AfterEach
    void stop() {
        service.close();
    }

    @Test
    void aRetryGetsTheFirstAnswerByteForByteAndStoresNothing() {
        Api.Reply first = api.post(CONDITIONS, Barge.CONDITION, KEY, "tablet-1").expect(201);
        service.pass(Duration.ofMinutes(5));
        Api.Reply retry = api.post(CONDITIONS, Barge.CONDITION, KEY, "tablet-1").expect(201);
        assertThat(retry.text()).isEqualTo(first.text());
        assertThat(retry.header("Location")).isEqualTo(first.header("Location"));
        assertThat(first.header("Idempotency-Replayed")).isEmpty();
        assertThat(retry.header("Idempotency-Replayed")).isEqualTo("true");
        assertThat(stored()).isEqualTo(1);
    }

    @Test
    void anotherBodyOrAddressUnderTheSameKeyIsRefused() {
        api.post(CONDITIONS, Barge.CONDITION, KEY, "tablet-1").expect(201);
        api.post(CONDITIONS, "{ \"name\": \"other\" }", KEY, "tablet-1").expect(422);
        api.post(
                        Barge.PATH + "/soundings",
                        "{ \"readings\": [ { \"tank\": \"PORT\", \"level\": 1 } ] }",
                        KEY,
                        "tablet-1")
                .expect(422);
        assertThat(stored()).isEqualTo(1);
        api.post(CONDITIONS, Barge.CONDITION, KEY, "tablet-2").expect(201);
        assertThat(stored()).isEqualTo(2);
    }

    @Test
    void otherParametersUnderTheSameKeyAreRefusedAndTheSameInAnotherOrderAreNot() {
        String righting = Barge.PATH + "/righting?to=2&step=1&azimuth=";
        String first = api.post(righting + "0", Barge.CONDITION, KEY, "tablet-1")
                .expect(200)
                .text();
        api.post(righting + "90", Barge.CONDITION, KEY, "tablet-1").expect(422);
        Api.Reply retry = api.post(Barge.PATH + "/righting?azimuth=0&step=1&to=2", Barge.CONDITION, KEY, "tablet-1");
        assertThat(retry.expect(200).text()).isEqualTo(first);
        assertThat(retry.header("Idempotency-Replayed")).isEqualTo("true");
    }

    @Test
    void aRefusedRequestDoesNotUseItsKeyUp() {
        api.post(CONDITIONS, "{ \"mode\": \"submerged\" }", KEY, "tablet-1").expect(422);
        api.post(CONDITIONS, Barge.CONDITION, KEY, "tablet-1").expect(201);
    }

    @Test
    void everyPostTakesAKey() {
        String condition = api.post(CONDITIONS, Barge.CONDITION).header("Location");
        String sounding = "{ \"readings\": [ { \"tank\": \"PORT\", \"level\": 1 } ] }";
        assertReplayed(Barge.PATH + "/soundings", sounding);
        assertReplayed(condition + "/plans", Barge.PLAN_REQUEST);
        assertThat(api.get(Barge.PATH + "/soundings").json().path("total").intValue())
                .isEqualTo(1);
        assertThat(api.get(condition + "/plans").json().path("plans")).hasSize(1);
        Api.Reply evaluated =
                api.post(Barge.PATH + "/evaluate", Barge.CONDITION, KEY, "any").expect(200);
        service.pass(Duration.ofMinutes(5));
        Api.Reply again =
                api.post(Barge.PATH + "/evaluate", Barge.CONDITION, KEY, "any").expect(200);
        assertThat(again.text()).isEqualTo(evaluated.text());
        assertThat(again.header("Idempotency-Replayed")).isEqualTo("true");
    }

    private void assertReplayed(String path, String body) {
        Api.Reply first = api.post(path, body, KEY, path).expect(201);
        Api.Reply retry = api.post(path, body, KEY, path).expect(201);
        assertThat(retry.text()).isEqualTo(first.text());
        assertThat(retry.header("Idempotency-Replayed")).isEqualTo("true");
    }

    @Test
    void simultaneousDuplicatesMakeOneRowAndGetOneAnswer() throws Exception {
        int threads = 8;
        for (int round = 0; round < 5; round++) {
            String key = "storm-" + round;
            CountDownLatch start = new CountDownLatch(1);
            ExecutorService senders = Executors.newFixedThreadPool(threads);
            List<Future<Api.Reply>> replies = new ArrayList<>();
            for (int i = 0; i < threads; i++) {
                replies.add(senders.submit(() -> {
                    start.await();
                    return api.post(CONDITIONS, Barge.CONDITION, KEY, key);
                }));
            }
            start.countDown();
            String answer = replies.get(0).get().text();
            for (Future<Api.Reply> reply : replies) {
                assertThat(reply.get().expect(201).text()).isEqualTo(answer);
            }
            senders.shutdown();
            assertThat(stored()).isEqualTo(round + 1);
        }
    }

    @Test
    void aKeyThatIsTooLongIsRefused() {
        api.post(CONDITIONS, Barge.CONDITION, KEY, "k".repeat(256)).expect(400);
        assertThat(stored()).isZero();
    }

    private int stored() {
        return api.get(CONDITIONS).json().path("total").intValue();
    }
}
