package org.evendraft.cli;

import com.fasterxml.jackson.databind.JsonNode;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.function.Function;
import org.evendraft.platform.Fault;
import org.evendraft.platform.FaultyDocumentException;
import org.evendraft.platform.Json;

/** Reads files that commands are given; faults are told with the file's name. */
final class InputFile {
    private InputFile() {}

    /**
     * Reads a document.
     *
     * @param file the file
     * @param reader turns the document into a record
     * @throws FaultyFileException with all that is wrong
     */
    static <T> T read(Path file, Function<JsonNode, T> reader) {
        try {
            return reader.apply(Json.parse(bytes(file)));
        } catch (FaultyDocumentException e) {
            throw new FaultyFileException(file, e);
        }
    }

    static byte[] bytes(Path file) {
        try {
            return Files.readAllBytes(file);
        } catch (IOException e) {
            String detail = Files.exists(file) ? "the file cannot be read" : "there is no such file";
            throw new FaultyFileException(
                    file, new FaultyDocumentException(List.of(new Fault("", detail, Fault.Kind.FORM))));
        }
    }
}
