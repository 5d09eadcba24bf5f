package org.evendraft.store;

/**
 * Which part of a list is wanted.
 *
 * @param limit the most items, over 0
 * @param offset items to pass over, 0 or more
 */
public record PageRequest(int limit, long offset) {

    /**
     * Checks the numbers.
     *
     * @throws IllegalArgumentException when they make no page
     */
    public PageRequest {
        if (limit < 1 || offset < 0) {
            throw new IllegalArgumentException("limit " + limit + ", offset " + offset);
        }
    }
}
