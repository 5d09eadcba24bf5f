package org.evendraft.platform;

import com.fasterxml.jackson.annotation.JsonFormat;
import com.fasterxml.jackson.annotation.JsonPropertyOrder;
import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonLocation;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.StreamReadConstraints;
import com.fasterxml.jackson.core.StreamReadFeature;
import com.fasterxml.jackson.core.exc.StreamConstraintsException;
import com.fasterxml.jackson.core.io.JsonEOFException;
import com.fasterxml.jackson.databind.DeserializationFeature;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.SerializationFeature;
import com.fasterxml.jackson.databind.cfg.MapperConfig;
import com.fasterxml.jackson.databind.introspect.AnnotatedClass;
import com.fasterxml.jackson.databind.introspect.JacksonAnnotationIntrospector;
import com.fasterxml.jackson.databind.json.JsonMapper;
import com.fasterxml.jackson.databind.module.SimpleModule;
import com.fasterxml.jackson.datatype.jdk8.Jdk8Module;
import com.fasterxml.jackson.datatype.jsr310.JavaTimeModule;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.ByteBuffer;
import java.nio.CharBuffer;
import java.nio.charset.CharsetDecoder;
import java.nio.charset.CoderResult;
import java.nio.charset.CodingErrorAction;
import java.nio.charset.StandardCharsets;
import java.util.Locale;
import org.evendraft.geometry.Vec3;

/**
 * JSON as all of Evendraft reads and writes it: strict UTF-8, no property twice, nothing after the document, nesting limited;
 * points as {@code [x, y, z]}, enums as the lowerCamelCase of their constant, instants in ISO 8601, what is absent or not a finite
 * number as {@code null}.
 */
public final class Json {
    /** Deepest nesting of a document; the deepest of ours has eight. */
    private static final int DEEPEST = 64;

    private static final String BYTE_ORDER_MARK = "\uFEFF";
    private static final ObjectMapper MAPPER = newMapper();

    private Json() {}

    /** The one mapper, safe from many threads. Its configuration must not be changed. */
    public static ObjectMapper mapper() {
        return MAPPER;
    }

    /**
     * The spelling of a constant in documents, {@code PRESSED_UP} as {@code pressedUp}.
     *
     * @param constant the constant of an enum
     */
    public static String code(Enum<?> constant) {
        String[] words = constant.name().toLowerCase(Locale.ROOT).split("_", -1);
        StringBuilder code = new StringBuilder(words[0]);
        for (int i = 1; i < words.length; i++) {
            code.append(Character.toUpperCase(words[i].charAt(0))).append(words[i], 1, words[i].length());
        }
        return code.toString();
    }

    /**
     * Reads a document.
     *
     * @param utf8 the bytes as they came; a byte order mark is let pass
     * @throws FaultyDocumentException when they are not UTF-8, or not one whole JSON value; the sentence tells line and column
     */
    public static JsonNode parse(byte[] utf8) {
        try (JsonParser parser = MAPPER.createParser(text(utf8))) {
            return tree(parser);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private static JsonNode tree(JsonParser parser) throws IOException {
        try {
            JsonNode node = MAPPER.readTree(parser);
            if (node == null || node.isMissingNode()) {
                throw malformed("", "the document is empty; a JSON object is expected");
            }
            if (parser.nextToken() != null) {
                throw malformed(
                        "", "something follows the end of the JSON document" + at(parser.currentTokenLocation()));
            }
            return node;
        } catch (JsonEOFException e) {
            throw malformed(
                    "", "the document ends before its JSON is complete" + at(e.getLocation()) + "; is it cut short?");
        } catch (StreamConstraintsException e) {
            throw malformed(
                    "",
                    "the document goes over a limit" + at(parser.currentLocation()) + ": at most " + DEEPEST
                            + " levels of nesting and 1000 characters in a number");
        } catch (JsonProcessingException e) {
            throw notJson(parser, e);
        }
    }

    private static FaultyDocumentException notJson(JsonParser parser, JsonProcessingException e) {
        String place = parser.getParsingContext().pathAsPointer().toString();
        String at = at(e.getLocation());
        if (e.getOriginalMessage().startsWith("Duplicate")) {
            return malformed(place, "the property is given twice in one object" + at);
        }
        return malformed(
                "",
                "the document is not JSON" + at + (place.isEmpty() ? "" : ", near " + place)
                        + "; numbers must be finite and plain, texts in double quotes");
    }

    private static String at(JsonLocation location) {
        return " (line " + location.getLineNr() + ", column " + location.getColumnNr() + ")";
    }

    /**
     * The text of a document.
     *
     * @throws FaultyDocumentException when the bytes are not UTF-8; the sentence tells where
     */
    static String text(byte[] utf8) {
        CharsetDecoder decoder = StandardCharsets.UTF_8
                .newDecoder()
                .onMalformedInput(CodingErrorAction.REPORT)
                .onUnmappableCharacter(CodingErrorAction.REPORT);
        ByteBuffer in = ByteBuffer.wrap(utf8);
        CharBuffer out = CharBuffer.allocate(utf8.length + 1);
        CoderResult result = decoder.decode(in, out, true);
        if (result.isError()) {
            throw malformed("", "the document is not UTF-8: byte " + in.position() + " begins no character");
        }
        String text = out.flip().toString();
        return text.startsWith(BYTE_ORDER_MARK) ? text.substring(1) : text;
    }

    private static FaultyDocumentException malformed(String pointer, String detail) {
        Faults faults = new Faults();
        faults.form(pointer, detail);
        return new FaultyDocumentException(faults.list());
    }

    private static ObjectMapper newMapper() {
        JsonFactory factory = JsonFactory.builder()
                .enable(StreamReadFeature.STRICT_DUPLICATE_DETECTION)
                .disable(StreamReadFeature.INCLUDE_SOURCE_IN_LOCATION)
                .streamReadConstraints(
                        StreamReadConstraints.builder().maxNestingDepth(DEEPEST).build())
                .build();
        return JsonMapper.builder(factory)
                .enable(DeserializationFeature.FAIL_ON_NULL_FOR_PRIMITIVES)
                .disable(SerializationFeature.WRITE_DATES_AS_TIMESTAMPS)
                .annotationIntrospector(new EnumCodes())
                .addMixIn(Vec3.class, Triple.class)
                .addModule(new Jdk8Module())
                .addModule(new JavaTimeModule())
                .addModule(new SimpleModule()
                        .addSerializer(double.class, new FiniteSerializer())
                        .addSerializer(Double.class, new FiniteSerializer()))
                .build();
    }

    /** A point as a list of its three coordinates. */
    @JsonFormat(shape = JsonFormat.Shape.ARRAY)
    @JsonPropertyOrder({"x", "y", "z"})
    private interface Triple {}

    /** Enums by their codes, written and read. */
    private static final class EnumCodes extends JacksonAnnotationIntrospector {
        private static final long serialVersionUID = 1L;

        @Override
        public String[] findEnumValues(
                MapperConfig<?> config, AnnotatedClass type, Enum<?>[] constants, String[] names) {
            for (int i = 0; i < constants.length; i++) {
                names[i] = code(constants[i]);
            }
            return names;
        }
    }
}
