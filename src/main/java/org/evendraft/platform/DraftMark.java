package org.evendraft.platform;

/**
 * A draft mark.
 *
 * @param id its name
 * @param x forward (m)
 * @param y to port (m)
 * @param zero height of the mark's zero (m)
 */
public record DraftMark(String id, double x, double y, double zero) {}
