package org.evendraft.http;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;

/**
 * A request that has arrived whole.
 *
 * @param method HTTP method
 * @param path its address, without the query
 * @param variables variables of the address
 * @param query parameters of the query
 * @param headers headers, by their names in small letters
 * @param mediaTypes what the body is and what the answer shall be
 * @param body the body, empty where there is none
 */
@SuppressWarnings("ArrayRecordComponent") // bytes as they came: never compared as such, never changed
record Request(
        String method,
        String path,
        Map<String, String> variables,
        Map<String, List<String>> query,
        Map<String, String> headers,
        MediaTypes mediaTypes,
        byte[] body) {

    /**
     * What the body is and what the answer shall be.
     *
     * @param body media type of the body, {@code ""} for none
     * @param answer media type that the client wants
     */
    record MediaTypes(String body, String answer) {}

    Request {
        variables = Map.copyOf(variables);
        query = Map.copyOf(query);
        headers = Map.copyOf(headers);
    }

    /** Its address with the parameters of the query, in the order of their names: what tells two questions apart. */
    String target() {
        return query.isEmpty() ? path : path + "?" + new TreeMap<>(query);
    }

    /** A variable of the address. */
    String variable(String name) {
        String value = variables.get(name);
        if (value == null) {
            throw new IllegalArgumentException("the address has no variable " + name);
        }
        return value;
    }

    /** A header, by its name in small letters. */
    Optional<String> header(String name) {
        return Optional.ofNullable(headers.get(name));
    }
}
