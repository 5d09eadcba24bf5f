package org.evendraft.service;

import com.fasterxml.jackson.databind.JsonNode;
import java.nio.charset.StandardCharsets;
import org.evendraft.platform.Json;

/** Reads JSON text out of the store. */
final class StoredJson {
    private StoredJson() {}

    static JsonNode tree(String text) {
        return Json.parse(text.getBytes(StandardCharsets.UTF_8));
    }
}
