package org.evendraft;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import java.io.IOException;
import java.net.http.HttpResponse;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.Set;
import java.util.TreeMap;
import java.util.concurrent.ConcurrentHashMap;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.atomic.AtomicInteger;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** What has been acknowledged is there after the service was killed at any instant, and nothing is there by half. */
class DurabilityIT {
    private static final int KILLS = 52;
    /** Every so many kills one comes while the service starts, when it mends its file. */
    private static final int START_UP_KILL = 6;

    private static final int LATEST_START_UP_KILL_MS = 1500;
    private static final int LATEST_KILL_MS = 250;
    private static final int SENDERS = 4;
    private static final long SEED = 20260612;

    private static final String PLATFORM = "/api/v1/platforms/box";
    private static final String CONDITIONS = PLATFORM + "/conditions";
    private static final String DOCUMENT = """
            { "id": "box", "waterDensity": 1.0,
              "hull": { "bodies": [ { "name": "hull", "shape": "box", "min": [-50, -10, 0], "max": [50, 10, 10] } ] },
              "draftMarks": [ { "id": "F", "x": 50, "y": 0 } ],
              "lightship": { "mass": 6000, "x": 0, "y": 0, "z": 5 },
              "tanks": [ { "id": "T", "purpose": "ballast", "bodies": [ { "name": "T", "shape": "box", "min": [-20, -5, 0], "max": [20, 5, 5] } ] } ] }
            """;

    @TempDir
    private Path directory;

    /** Ids of conditions whose storing was acknowledged, with their names. */
    private final Map<String, String> acknowledged = new ConcurrentHashMap<>();

    /** Those of them that are not yet checked. */
    private final Set<String> latest = ConcurrentHashMap.newKeySet();

    private final AtomicInteger sent = new AtomicInteger();
    private final Random random = new Random(SEED);

    @Test
    void everyAcknowledgedConditionSurvivesKillsAndNoneIsHalfWritten() throws Exception {
        try (Jar.Service first = Jar.serve(directory, Map.of())) {
            assertThat(new Client(first.address()).put(PLATFORM, DOCUMENT).statusCode())
                    .isEqualTo(201);
        }
        for (int kill = 1; kill < KILLS; kill++) {
            if (kill % START_UP_KILL == 0) {
                killWhileStarting();
            } else {
                try (Jar.Service service = Jar.serve(directory, Map.of())) {
                    checkLatest(kill, new Client(service.address()));
                    killWhileStoring(service);
                }
            }
        }
        try (Jar.Service last = Jar.serve(directory, Map.of())) {
            checkAll(new Client(last.address()));
        }
    }

    private void killWhileStarting() throws InterruptedException {
        Process process = Jar.start(directory, Map.of("EVENDRAFT_HTTP_PORT", "0"), List.of(), "serve");
        Thread.sleep(random.nextInt(LATEST_START_UP_KILL_MS));
        process.destroyForcibly().waitFor();
    }

    private void killWhileStoring(Jar.Service service) throws InterruptedException {
        Client client = new Client(service.address());
        CountDownLatch oneIsStored = new CountDownLatch(1);
        ExecutorService senders = Executors.newFixedThreadPool(SENDERS);
        for (int i = 0; i < SENDERS; i++) {
            senders.execute(() -> send(client, oneIsStored));
        }
        oneIsStored.await();
        Thread.sleep(random.nextInt(LATEST_KILL_MS));
        service.kill();
        senders.shutdown();
        assertThat(senders.awaitTermination(2, TimeUnit.MINUTES)).isTrue();
    }

    /** Stores conditions one after the other until the service is gone. */
    private void send(Client client, CountDownLatch oneIsStored) {
        try {
            while (true) {
                String name = "condition " + sent.incrementAndGet();
                String document =
                        "{ \"name\": \"" + name + "\", \"fills\": [ { \"tank\": \"T\", \"fraction\": 0.5 } ] }";
                HttpResponse<String> answer = client.post(CONDITIONS, document);
                if (answer.statusCode() == 201) {
                    String id = Client.json(answer).path("id").textValue();
                    acknowledged.put(id, name);
                    latest.add(id);
                    oneIsStored.countDown();
                }
            }
        } catch (IOException gone) {
            // This one was not acknowledged.
        } catch (InterruptedException e) {
            throw new IllegalStateException(e);
        }
    }

    /** The conditions of the latest round; told at once, so that whoever looks for the cause knows after which kill. */
    private void checkLatest(int kill, Client client) throws IOException, InterruptedException {
        for (String id : latest) {
            assertThat(client.get(CONDITIONS + "/" + id + "/result").statusCode())
                    .as("%s, acknowledged before kill %d", acknowledged.get(id), kill - 1)
                    .isEqualTo(200);
        }
        latest.clear();
    }

    private void checkAll(Client client) throws Exception {
        Map<String, String> stored = new ConcurrentHashMap<>();
        int total = Integer.MAX_VALUE;
        for (int offset = 0; offset < total; offset += 1000) {
            JsonNode page = Client.json(client.get(CONDITIONS + "?limit=1000&offset=" + offset));
            total = page.path("total").intValue();
            page.path("conditions")
                    .forEach(c ->
                            stored.put(c.path("id").textValue(), c.path("name").textValue()));
        }
        assertThat(acknowledged).hasSizeGreaterThan(KILLS);
        Map<String, String> lost = new TreeMap<>(acknowledged);
        lost.keySet().removeAll(stored.keySet());
        assertThat(lost).as("acknowledged and lost").isEmpty();
        assertThat(stored).containsAllEntriesOf(acknowledged).hasSizeLessThanOrEqualTo(sent.get());
        for (String id : stored.keySet()) {
            HttpResponse<String> result = client.get(CONDITIONS + "/" + id + "/result");
            assertThat(result.statusCode()).isEqualTo(200);
            assertThat(Client.json(result).path("tanks")).hasSize(1);
            assertThat(Client.json(client.get(CONDITIONS + "/" + id))
                            .path("condition")
                            .path("fills"))
                    .hasSize(1);
        }
    }
}
