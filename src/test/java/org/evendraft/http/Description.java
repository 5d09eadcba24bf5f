package org.evendraft.http;

import com.fasterxml.jackson.core.JsonPointer;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;
import com.fasterxml.jackson.dataformat.yaml.YAMLMapper;
import com.networknt.schema.Error;
import com.networknt.schema.Schema;
import com.networknt.schema.SchemaRegistry;
import com.networknt.schema.SpecificationVersion;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.ConcurrentHashMap;

/** The OpenAPI description, and whether answers keep to it. */
final class Description {
    private static final String DRAFT = "https://json-schema.org/draft/2020-12/schema";

    private final JsonNode document;
    private final SchemaRegistry registry = SchemaRegistry.withDefaultDialect(SpecificationVersion.DRAFT_2020_12);
    private final Map<String, Schema> schemas = new ConcurrentHashMap<>();

    Description() {
        try (InputStream in = Description.class.getResourceAsStream("openapi.yaml")) {
            this.document = new YAMLMapper().readTree(in);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    JsonNode document() {
        return document;
    }

    /** Methods and addresses described, as {@code GET /health}. */
    List<String> operations() {
        List<String> operations = new ArrayList<>();
        document.path("paths")
                .properties()
                .forEach(path -> path.getValue().fieldNames().forEachRemaining(name -> {
                    if (!name.equals("parameters")) {
                        operations.add(name.toUpperCase(Locale.ROOT) + " " + path.getKey());
                    }
                }));
        return operations;
    }

    /**
     * What in an answer is not as described.
     *
     * @param operation method and address pattern
     * @param status status of the answer
     * @param contentType its media type without parameters; empty where it has no body
     * @param body its body
     */
    List<String> deviations(String operation, int status, String contentType, String body) {
        String[] parts = operation.split(" ", 2);
        JsonNode responses = document.path("paths")
                .path(parts[1])
                .path(parts[0].toLowerCase(Locale.ROOT))
                .path("responses");
        JsonNode response = resolved(responses.path(responses.has("" + status) ? "" + status : "default"));
        if (response.isMissingNode()) {
            return List.of(operation + " does not describe status " + status);
        }
        if (!responses.has("" + status) && status < 400) {
            return List.of(operation + " does not describe success " + status);
        }
        if (body.isEmpty()) {
            return response.has("content") && !contentType.isEmpty() ? List.of("no body") : List.of();
        }
        JsonNode content = response.path("content").path(contentType);
        if (content.isMissingNode()) {
            return List.of(operation + " " + status + " does not describe " + contentType);
        }
        return contentType.contains("json") ? against(content.path("schema"), body) : List.of();
    }

    /** What in a document is not as a named schema describes it. */
    List<String> deviations(String schema, String document) {
        ObjectNode reference = JsonNodeFactory.instance.objectNode();
        reference.put("$ref", "#/components/schemas/" + schema);
        return against(reference, document);
    }

    private JsonNode resolved(JsonNode node) {
        return Optional.ofNullable(node.path("$ref").textValue())
                .map(ref -> document.at(JsonPointer.compile(ref.substring(1))))
                .orElse(node);
    }

    private List<String> against(JsonNode schema, String body) {
        Schema compiled = schemas.computeIfAbsent(schema.toString(), text -> compiled((ObjectNode) schema));
        try {
            return compiled.validate(new YAMLMapper().readTree(body)).stream()
                    .map(Error::toString)
                    .toList();
        } catch (IOException e) {
            return List.of("not JSON: " + body);
        }
    }

    private Schema compiled(ObjectNode schema) {
        ObjectNode whole = schema.deepCopy();
        whole.put("$schema", DRAFT);
        whole.set("components", document.path("components"));
        return registry.getSchema(whole);
    }
}
