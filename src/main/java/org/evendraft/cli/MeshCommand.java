package org.evendraft.cli;

import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.Callable;
import org.evendraft.geometry.Mesh;
import org.evendraft.geometry.MeshFiles;
import org.evendraft.geometry.MeshFormatException;
import org.evendraft.platform.Fault;
import org.evendraft.platform.FaultyDocumentException;
import org.evendraft.platform.MeshBodies;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** Turns a mesh file into a body. */
@Command(
        name = "mesh",
        mixinStandardHelpOptions = true,
        description = "Turns an STL or OBJ file (lengths in m, x forward, y to port, z up) into a mesh body as JSON.")
final class MeshCommand implements Callable<Integer> {
    private final Console console;

    @Parameters(paramLabel = "FILE", description = "A file whose name ends in .stl (text or binary) or .obj.")
    private Path file = Path.of("");

    @Option(names = "--name", required = true, paramLabel = "N", description = "The body's name.")
    private String name = "";

    MeshCommand(Console console) {
        this.console = console;
    }

    @Override
    public Integer call() {
        console.answer(MeshBodies.toJson(mesh(), name));
        return Console.DONE;
    }

    private Mesh mesh() {
        try {
            return MeshFiles.read(InputFile.bytes(file), file.toString());
        } catch (MeshFormatException e) {
            String detail = e.getMessage() == null ? "not a mesh file" : e.getMessage();
            Fault fault = new Fault("", detail, Fault.Kind.FORM);
            throw new FaultyFileException(file, new FaultyDocumentException(List.of(fault)));
        }
    }
}
