package org.evendraft.service;

import com.fasterxml.jackson.annotation.JsonUnwrapped;
import org.evendraft.stability.ConditionResult;

/**
 * A condition's result and where it comes from, on one level of JSON.
 *
 * @param result the result
 * @param provenance where it comes from
 */
public record EvaluatedCondition(
        @JsonUnwrapped ConditionResult result,
        @JsonUnwrapped Provenance provenance) {}
