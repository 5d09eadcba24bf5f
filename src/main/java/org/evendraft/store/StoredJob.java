package org.evendraft.store;

import java.time.Instant;
import java.util.Optional;

/**
 * A job as it stands, without its request and its result. Component names are those of the JSON.
 *
 * @param id its id
 * @param kind what is computed
 * @param platform id of the platform that it is computed for
 * @param platformRevision that platform's revision
 * @param state how far it has come
 * @param fraction part of the work that is done, 0 to 1
 * @param doing what was being done last, in words; none before anything was told
 * @param reason why it failed, in words, if it did
 * @param createdAt when it was asked for
 * @param startedAt when the work began, if it did
 * @param finishedAt when it came to its end, if it has
 */
public record StoredJob(
        String id,
        String kind,
        String platform,
        int platformRevision,
        JobState state,
        double fraction,
        Optional<String> doing,
        Optional<String> reason,
        Instant createdAt,
        Optional<Instant> startedAt,
        Optional<Instant> finishedAt) {}
