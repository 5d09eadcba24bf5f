package org.evendraft.store;

/**
 * A long computation to be kept as a job.
 *
 * @param kind what is computed, in the lowerCamelCase of programs
 * @param platformId id of the platform that it is computed for
 * @param platformRevision that platform's revision
 * @param requestJson JSON text of the request
 */
public record NewJob(String kind, String platformId, int platformRevision, String requestJson) {}
