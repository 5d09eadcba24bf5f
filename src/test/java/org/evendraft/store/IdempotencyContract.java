package org.evendraft.store;

import static java.nio.charset.StandardCharsets.UTF_8;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.atomic.AtomicInteger;
import org.junit.jupiter.api.Test;

/** What holds of repeated requests on every engine. */
interface IdempotencyContract extends StoreContract {
    int DUPLICATES = 8;

    private IdempotencyRepository answers() {
        return new IdempotencyRepository(Samples.AT_NOON);
    }

    private IdempotentRequest request(String key, String body) {
        return IdempotentRequest.of(key, "POST", "/api/v1/platforms/p/conditions", body.getBytes(UTF_8));
    }

    private IdempotentAnswer answer(String body) {
        return new IdempotentAnswer(
                201, Optional.of("/where"), Optional.of("\"1\""), Optional.of("application/json"), body);
    }

    private Claim claimAndAnswer(IdempotentRequest request, IdempotentAnswer answer) {
        return database().inTransaction(handle -> {
            Claim claim = answers().claim(handle, request);
            if (claim instanceof Claim.Claimed) {
                answers().answer(handle, request, answer);
            }
            return claim;
        });
    }

    private Optional<Claim> find(IdempotentRequest request) {
        return database().read(handle -> answers().find(handle, request));
    }

    @Test
    default void theSameRequestGetsTheFirstAnswer() {
        IdempotentRequest request = request(Samples.newId(), "{}");
        assertThat(find(request)).isEmpty();
        assertThat(claimAndAnswer(request, answer("first"))).isEqualTo(new Claim.Claimed());
        assertThat(claimAndAnswer(request, answer("second"))).isEqualTo(new Claim.Answered(answer("first")));
        assertThat(find(request)).contains(new Claim.Answered(answer("first")));
    }

    @Test
    default void anAnswerWithoutHeadersIsKept() {
        IdempotentRequest request = request(Samples.newId(), "{}");
        IdempotentAnswer bare = new IdempotentAnswer(204, Optional.empty(), Optional.empty(), Optional.empty(), "");
        claimAndAnswer(request, bare);
        assertThat(find(request)).contains(new Claim.Answered(bare));
    }

    @Test
    default void anotherRequestWithTheSameKeyIsToldApart() {
        String key = Samples.newId();
        IdempotentRequest first = request(key, "{}");
        claimAndAnswer(first, answer("first"));
        List<IdempotentRequest> others = List.of(
                request(key, "{ }"),
                new IdempotentRequest(key, "PUT", first.path(), first.bodySha256()),
                new IdempotentRequest(key, first.method(), "/elsewhere", first.bodySha256()));
        for (IdempotentRequest other : others) {
            assertThat(claimAndAnswer(other, answer("other"))).isEqualTo(new Claim.OtherRequest());
            assertThat(find(other)).contains(new Claim.OtherRequest());
        }
        assertThat(find(first)).contains(new Claim.Answered(answer("first")));
    }

    @Test
    default void theHashIsSha256InHexadecimalDigits() {
        // FIPS 180-4 example: SHA-256 of "abc".
        assertThat(request("k", "abc").bodySha256())
                .isEqualTo("ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad");
    }

    @Test
    default void aKeyIsFreeAgainWhenItsTransactionRollsBack() {
        IdempotentRequest request = request(Samples.newId(), "{}");
        assertThatThrownBy(() -> database().inTransaction(handle -> {
                    answers().claim(handle, request);
                    throw new IllegalStateException("on purpose");
                }))
                .hasMessage("on purpose");
        assertThat(claimAndAnswer(request, answer("later"))).isEqualTo(new Claim.Claimed());
    }

    @Test
    default void ofSimultaneousDuplicatesOneWritesAndAllGetItsAnswer() throws ExecutionException, InterruptedException {
        String platform = Samples.newId();
        IdempotentRequest request = request(Samples.newId(), "{}");
        AtomicInteger claims = new AtomicInteger();
        List<IdempotentAnswer> given = Simultaneously.run(
                DUPLICATES,
                i -> database().inTransaction(handle -> {
                    Claim claim = answers().claim(handle, request);
                    if (claim instanceof Claim.Answered answered) {
                        return answered.answer();
                    }
                    assertThat(claim).isEqualTo(new Claim.Claimed());
                    claims.incrementAndGet();
                    new PlatformRepository(Samples.AT_NOON)
                            .save(handle, Samples.platform(platform), "{}", OptionalInt.empty());
                    answers().answer(handle, request, answer("by " + i));
                    return answer("by " + i);
                }));
        assertThat(claims).hasValue(1);
        assertThat(given).hasSize(DUPLICATES).containsOnly(given.get(0));
        assertThat(Samples.rows(database(), "SELECT revision FROM platform_revision WHERE platform_id = :id", platform))
                .containsExactly("1");
        assertThat(Samples.rows(
                        database(),
                        "SELECT COUNT(*) FROM idempotent_answer WHERE idempotency_key = :id",
                        request.key()))
                .containsExactly("1");
    }

    @Test
    default void aKeyThatStaysClaimedIsBusyAndTheWaitingTransactionGoesOn() {
        IdempotentRequest request = request(Samples.newId(), "{}");
        IdempotentRequest another = request(Samples.newId(), "{}");
        database().inTransaction(holder -> {
            answers().claim(holder, request);
            Claim waited = database().inTransaction(handle -> {
                Claim claim = answers().claim(handle, request);
                answers().claim(handle, another);
                answers().answer(handle, another, answer("after waiting"));
                return claim;
            });
            assertThat(waited).isEqualTo(new Claim.Busy());
            answers().answer(holder, request, answer("at last"));
            return waited;
        });
        assertThat(find(request)).contains(new Claim.Answered(answer("at last")));
        assertThat(find(another)).contains(new Claim.Answered(answer("after waiting")));
    }

    @Test
    default void onlyAClaimedKeyCanBeAnswered() {
        IdempotentRequest request = request(Samples.newId(), "{}");
        assertThatThrownBy(() -> database().inTransaction(handle -> {
                    answers().answer(handle, request, answer("unasked"));
                    return true;
                }))
                .isInstanceOf(IllegalStateException.class)
                .hasMessageContaining(request.key());
    }

    @Test
    default void oldAnswersAreForgotten() {
        IdempotentRequest request = request(Samples.newId(), "{}");
        claimAndAnswer(request, answer("first"));
        database().inTransaction(handle -> answers().forgetBefore(handle, Samples.NOON));
        assertThat(find(request)).isPresent();
        int forgotten = database().inTransaction(handle -> answers().forgetBefore(handle, Samples.NOON.plusSeconds(1)));
        assertThat(forgotten).isPositive();
        assertThat(find(request)).isEmpty();
    }
}
