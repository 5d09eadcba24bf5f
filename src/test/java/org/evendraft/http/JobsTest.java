package org.evendraft.http;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import java.nio.charset.StandardCharsets;
import java.time.Duration;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.concurrent.Callable;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import org.evendraft.platform.Fault;
import org.evendraft.platform.FaultyDocumentException;
import org.evendraft.platform.Json;
import org.evendraft.service.Reason;
import org.evendraft.service.Refusal;
import org.evendraft.service.SteppedWork;
import org.evendraft.store.NewJob;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;

class JobsTest {
    private static final String JOBS = "/api/v1/jobs";
    private static final String KEY = "idempotency-key";

    /** Jobs worked on at once and waiting: what the service takes. */
    private static final int PLACES = 18;

    private final TestService service = TestService.start();
    private final Api api = Barge.stored(service);
    private final Writes writes = new Writes(service.room().once());

    @AfterEach
    void stop() {
        service.close();
    }

    /** Asks for a job as a route does whose computation takes long. */
    private Answer ask(SteppedWork work, Map<String, String> headers) {
        Request request =
                new Request("POST", "/test", Map.of(), Map.of(), headers, new Request.MediaTypes("", ""), new byte[0]);
        NewJob job = new NewJob("allowableKg", Barge.ID, 1, "{}");
        try {
            return writes.post(
                    request, () -> service.room().jobs().prepare(job, work).then(JobRoutes::accepted));
        } catch (Refusal e) {
            return Failures.answer(e);
        }
    }

    private static JsonNode body(Answer answer) {
        return Json.parse(answer.body());
    }

    /** The address of a job that is accepted. */
    private String accepted(SteppedWork work) {
        Answer answer = ask(work, Map.of());
        assertThat(answer.status()).isEqualTo(202);
        return answer.headers().getOrDefault("Location", "");
    }

    private String running(SteppedWork work) {
        String address = accepted(work);
        work.awaitBegun();
        return address;
    }

    private JsonNode job(String address) {
        return api.get(address).expect(200).json();
    }

    private JsonNode await(String address, String state) {
        return SteppedWork.await(
                () -> job(address), job -> job.path("state").textValue().equals(state));
    }

    private JsonNode finished(SteppedWork work, String state) {
        return await(running(work), state);
    }

    @Test
    void aLongComputationIsAcceptedItsProgressSeenRisingAndItsResultRead() {
        SteppedWork work = new SteppedWork();
        Answer answer = ask(work, Map.of());
        assertThat(answer.status()).isEqualTo(202);
        assertThat(Api.DESCRIPTION.deviations("Job", new String(answer.body(), StandardCharsets.UTF_8)))
                .isEmpty();
        JsonNode queued = body(answer);
        String address = JOBS + "/" + queued.path("id").textValue();
        assertThat(answer.headers()).containsEntry("Location", address);
        assertThat(queued.path("state").textValue()).isEqualTo("queued");
        assertThat(queued.path("kind").textValue()).isEqualTo("allowableKg");
        assertThat(queued.path("platform").textValue()).isEqualTo(Barge.ID);
        assertThat(queued.path("createdAt").textValue()).isEqualTo(TestService.START.toString());
        assertThat(queued.at("/links/self").textValue()).isEqualTo(address);
        for (int step = 1; step <= 3; step++) {
            double part = step / 4.0;
            work.put(part, "draft " + step + " of 4");
            JsonNode seen = SteppedWork.await(
                    () -> job(address), job -> job.path("fraction").doubleValue() == part);
            assertThat(seen.path("doing").textValue()).isEqualTo("draft " + step + " of 4");
            assertThat(seen.path("state").textValue()).isEqualTo("running");
            assertThat(seen.path("startedAt").textValue()).isNotNull();
            assertThat(seen.path("finishedAt").isNull()).isTrue();
            assertThat(seen.at("/links/result").isNull()).isTrue();
        }
        service.pass(Duration.ofMinutes(1));
        work.finish(21.5);
        JsonNode done = await(address, "done");
        assertThat(done.path("fraction").doubleValue()).isEqualTo(1);
        assertThat(done.path("finishedAt").textValue())
                .isEqualTo(TestService.START.plusSeconds(60).toString());
        assertThat(done.at("/links/result").textValue()).isEqualTo(address + "/result");
        assertThat(api.get(address + "/result").expect(200).text()).isEqualTo("{\"kg\":21.5}");
    }

    @Test
    void aJobThatIsNotDoneHasNoResultAndSaysHowItStands() {
        List<SteppedWork> busy = List.of(new SteppedWork(), new SteppedWork());
        String running = running(busy.get(0));
        busy.get(0).put(0.4, "half of it");
        running(busy.get(1));
        SteppedWork.await(() -> job(running), job -> job.path("fraction").doubleValue() > 0);
        String waiting = accepted(new SteppedWork());
        assertThat(noResult(running)).contains("running, 40 % done");
        assertThat(noResult(waiting)).contains("waits for its turn");
        api.delete(waiting).expect(200);
        assertThat(noResult(waiting)).contains("cancelled");
        busy.get(1).finish(1);
        SteppedWork impossible = new SteppedWork();
        impossible.fail(FaultyDocumentException.impossible("/drafts/0", "draft 99 m is above the hull"));
        JsonNode failed = finished(impossible, "failed");
        assertThat(noResult(failed.at("/links/self").textValue()))
                .contains("failed", "/drafts/0: draft 99 m is above the hull");
    }

    private String noResult(String address) {
        JsonNode problem = api.get(address + "/result").expect(409).json();
        assertThat(problem.path("type").textValue()).isEqualTo("urn:evendraft:problem:no-result");
        return problem.path("detail").textValue();
    }

    @Test
    void workThatFailsSaysWhyAndABugKeepsItsInternals() {
        SteppedWork faulty = new SteppedWork();
        faulty.fail(new FaultyDocumentException(
                List.of(new Fault("/a", "one", Fault.Kind.MEANING), new Fault("", "two", Fault.Kind.MEANING))));
        assertThat(finished(faulty, "failed").path("reason").textValue()).isEqualTo("/a: one; two");
        SteppedWork refused = new SteppedWork();
        refused.fail(new Refusal(Reason.NOT_FOUND, "There is no mode x."));
        assertThat(finished(refused, "failed").path("reason").textValue()).isEqualTo("There is no mode x.");
        SteppedWork broken = new SteppedWork();
        broken.put(0.5, "half");
        broken.fail(new IllegalStateException("secret"));
        JsonNode failed = finished(broken, "failed");
        assertThat(failed.path("reason").textValue())
                .startsWith("internal error")
                .doesNotContain("secret")
                .doesNotContain("Exception");
        assertThat(failed.path("fraction").doubleValue()).isEqualTo(0.5);
        assertThat(failed.path("finishedAt").textValue()).isNotNull();
    }

    @Test
    void aRunningJobThatIsCancelledStopsAndASecondTimeIsAnsweredTheSame() {
        SteppedWork work = new SteppedWork();
        String address = running(work);
        work.put(0.3, "draft 3 of 10");
        SteppedWork.await(() -> job(address), job -> job.path("fraction").doubleValue() == 0.3);
        Api.Reply cancelled = api.delete(address).expect(200);
        assertThat(cancelled.json().path("state").textValue()).isEqualTo("cancelled");
        assertThat(cancelled.json().path("doing").textValue()).isEqualTo("draft 3 of 10");
        assertThat(cancelled.json().has("note")).isFalse();
        work.awaitStopped();
        service.pass(Duration.ofMinutes(5));
        assertThat(api.delete(address).expect(200).text()).isEqualTo(cancelled.text());
        assertThat(job(address)).isEqualTo(cancelled.json());
    }

    @Test
    void aWaitingJobThatIsCancelledNeverBegins() {
        List<SteppedWork> busy = List.of(new SteppedWork(), new SteppedWork());
        busy.forEach(this::running);
        SteppedWork unwanted = new SteppedWork();
        String address = accepted(unwanted);
        SteppedWork wanted = new SteppedWork();
        String last = accepted(wanted);
        JsonNode cancelled = api.delete(address).expect(200).json();
        assertThat(cancelled.path("state").textValue()).isEqualTo("cancelled");
        assertThat(cancelled.path("startedAt").isNull()).isTrue();
        busy.forEach(work -> work.finish(1));
        wanted.finish(2);
        await(last, "done");
        assertThat(unwanted.runs()).isZero();
    }

    @Test
    void aFinishedJobCannotBeCancelledAndSaysSo() {
        SteppedWork work = new SteppedWork();
        work.finish(21.5);
        JsonNode done = finished(work, "done");
        String address = done.at("/links/self").textValue();
        JsonNode after = api.delete(address).expect(200).json();
        assertThat(after.path("state").textValue()).isEqualTo("done");
        assertThat(after.path("note").textValue()).contains("is done, and its result stays");
        assertThat(job(address)).isEqualTo(done);
        api.get(address + "/result").expect(200);
        SteppedWork failing = new SteppedWork();
        failing.fail(new Refusal(Reason.IMPOSSIBLE, "No."));
        JsonNode failed = finished(failing, "failed");
        JsonNode still =
                api.delete(failed.at("/links/self").textValue()).expect(200).json();
        assertThat(still.path("state").textValue()).isEqualTo("failed");
        assertThat(still.path("note").textValue()).contains("has failed");
    }

    @Test
    void moreJobsThanCanWaitAreTurnedDownAndACancelledOneMakesRoom() {
        List<String> taken = new ArrayList<>();
        for (int i = 0; i < PLACES; i++) {
            taken.add(accepted(new SteppedWork()));
        }
        Answer full = ask(new SteppedWork(), Map.of(KEY, "tablet-1"));
        assertThat(full.status()).isEqualTo(429);
        assertThat(full.headers()).containsKey("Retry-After");
        assertThat(body(full).path("type").textValue()).isEqualTo("urn:evendraft:problem:too-many");
        assertThat(api.get(JOBS).json().path("total").intValue()).isEqualTo(PLACES);
        api.delete(taken.get(PLACES - 1)).expect(200);
        assertThat(ask(new SteppedWork(), Map.of(KEY, "tablet-1")).status()).isEqualTo(202);
        assertThat(ask(new SteppedWork(), Map.of()).status()).isEqualTo(429);
        // the first answer is given again even while there is no room
        assertThat(ask(new SteppedWork(), Map.of(KEY, "tablet-1")).status()).isEqualTo(202);
    }

    @Test
    void theSameKeyTwiceMakesOneJob() {
        SteppedWork work = new SteppedWork();
        Answer first = ask(work, Map.of(KEY, "tablet-1"));
        work.awaitBegun();
        Answer retry = ask(work, Map.of(KEY, "tablet-1"));
        assertThat(retry.status()).isEqualTo(202);
        assertThat(retry.body()).isEqualTo(first.body());
        assertThat(retry.headers())
                .containsEntry("Idempotency-Replayed", "true")
                .containsEntry("Location", first.headers().get("Location"));
        assertThat(api.get(JOBS).json().path("total").intValue()).isEqualTo(1);
    }

    @Test
    void racingRequestsWithOneKeyMakeOneJobThatRunsOnce() throws Exception {
        SteppedWork work = new SteppedWork();
        List<Answer> answers = atOnce(8, () -> ask(work, Map.of(KEY, "storm")));
        Set<String> ids = new HashSet<>();
        for (Answer answer : answers) {
            assertThat(answer.status()).isEqualTo(202);
            ids.add(body(answer).path("id").textValue());
        }
        assertThat(ids).hasSize(1);
        work.finish(1);
        await(JOBS + "/" + ids.iterator().next(), "done");
        assertThat(work.runs()).isEqualTo(1);
        assertThat(api.get(JOBS).json().path("total").intValue()).isEqualTo(1);
    }

    @Test
    void racingRequestsWithoutAKeyNeverTakeMorePlacesThanThereAre() throws Exception {
        List<Answer> answers = atOnce(PLACES + 6, () -> ask(new SteppedWork(), Map.of()));
        assertThat(answers.stream().filter(a -> a.status() == 202)).hasSize(PLACES);
        assertThat(answers.stream().filter(a -> a.status() == 429)).hasSize(6);
    }

    private static List<Answer> atOnce(int number, Callable<Answer> question) throws Exception {
        CountDownLatch start = new CountDownLatch(1);
        ExecutorService senders = Executors.newFixedThreadPool(number);
        List<Future<Answer>> futures = new ArrayList<>();
        for (int i = 0; i < number; i++) {
            futures.add(senders.submit(() -> {
                start.await();
                return question.call();
            }));
        }
        start.countDown();
        List<Answer> answers = new ArrayList<>();
        for (Future<Answer> future : futures) {
            answers.add(future.get());
        }
        senders.shutdown();
        return answers;
    }

    @Test
    void racingCancellationsAreAnsweredTheSame() throws Exception {
        SteppedWork work = new SteppedWork();
        String address = running(work);
        List<Answer> answers = atOnce(4, () -> {
            Api.Reply reply = api.delete(address).expect(200);
            return Answer.text(reply.status(), Answer.JSON, reply.text());
        });
        assertThat(answers.stream().map(a -> body(a).toString()).distinct()).hasSize(1);
        assertThat(body(answers.get(0)).path("state").textValue()).isEqualTo("cancelled");
    }

    @Test
    void jobsAreListedNewestFirstByPlatformAndPage() {
        String first = accepted(new SteppedWork());
        service.pass(Duration.ofSeconds(1));
        String second = accepted(new SteppedWork());
        service.pass(Duration.ofSeconds(1));
        String third = accepted(new SteppedWork());
        assertThat(selves(JOBS)).containsExactly(third, second, first);
        assertThat(selves(JOBS + "?platform=barge&limit=1&offset=1")).containsExactly(second);
        JsonNode none = api.get(JOBS + "?platform=nobody").expect(200).json();
        assertThat(none.path("jobs")).isEmpty();
        assertThat(none.path("total").intValue()).isZero();
        api.get(JOBS + "?limit=0&state=done").expect(400);
    }

    private List<String> selves(String address) {
        return api.get(address).expect(200).json().path("jobs").findValuesAsText("self");
    }

    @Test
    void whatIsNoJobIsNotFound() {
        api.get(JOBS + "/nobody").expect(404);
        api.get(JOBS + "/nobody/result").expect(404);
        assertThat(api.delete(JOBS + "/nobody")
                        .expect(404)
                        .json()
                        .path("detail")
                        .textValue())
                .contains("nobody");
        assertThat(api.post(JOBS, "{}").expect(405).header("Allow")).isEqualTo("GET");
        api.delete(JOBS + "/nobody?force=true").expect(400);
    }
}
