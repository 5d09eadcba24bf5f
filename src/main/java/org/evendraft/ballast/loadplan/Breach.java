package org.evendraft.ballast.loadplan;

/**
 * An operation limit that an event breaks. Component names are those of the JSON answer.
 *
 * @param limit its name
 * @param value the worst value
 * @param bound what is allowed
 * @param lack by how much the value misses the bound, positive
 * @param what what is going on at that instant
 */
public record Breach(String limit, double value, double bound, double lack, String what) {}
