package org.evendraft;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.concurrent.TimeUnit;

/** Runs the packaged program as a process of its own. */
final class Jar {
    private static final Path JAR = Path.of("target", "evendraft.jar").toAbsolutePath();
    private static final String JAVA =
            Path.of(System.getProperty("java.home"), "bin", "java").toString();
    private static final String READY = "Evendraft listens at ";
    private static final long PATIENCE_SECONDS = 120;

    private Jar() {}

    /**
     * What a command left behind.
     *
     * @param status its exit status
     * @param out standard output
     * @param err standard error
     */
    record Outcome(int status, String out, String err) {}

    /**
     * A service that is ready.
     *
     * @param process its process
     * @param address where it listens
     */
    record Service(Process process, String address) implements AutoCloseable {

        /** Ends it with SIGKILL. */
        void kill() {
            process.destroyForcibly();
            ended();
        }

        /** Ends it whatever became of the test. */
        @Override
        public void close() {
            kill();
        }

        /** Asks it to end with SIGTERM; the exit status. */
        int stop() {
            // Process.destroy would close the streams before they are read.
            process.toHandle().destroy();
            return ended();
        }

        private int ended() {
            try {
                if (!process.waitFor(PATIENCE_SECONDS, TimeUnit.SECONDS)) {
                    throw new IllegalStateException("the service does not end");
                }
                return process.exitValue();
            } catch (InterruptedException e) {
                throw new IllegalStateException(e);
            }
        }

        /** What it has printed since it was ready, once it has ended. */
        String rest() {
            try {
                return new String(process.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
            } catch (IOException e) {
                throw new UncheckedIOException(e);
            }
        }
    }

    /** Starts a process; standard error goes to {@code err.txt} in its directory. */
    static Process start(Path directory, Map<String, String> environment, List<String> before, String... args) {
        List<String> command = new ArrayList<>(before);
        // Start-up is most of what these tests take: no second compiler.
        command.addAll(List.of(JAVA, "-XX:TieredStopAtLevel=1", "-Xshare:auto", "-jar", JAR.toString()));
        command.addAll(List.of(args));
        ProcessBuilder builder = new ProcessBuilder(command).directory(directory.toFile());
        builder.redirectError(directory.resolve("err.txt").toFile());
        builder.environment().keySet().removeIf(name -> name.startsWith("EVENDRAFT_"));
        builder.environment().putAll(environment);
        try {
            return builder.start();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** Runs a command to its end. */
    static Outcome run(Path directory, Map<String, String> environment, String... args) {
        Process process = start(directory, environment, List.of(), args);
        try {
            String out = new String(process.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
            int status = process.waitFor();
            return new Outcome(status, out, Files.readString(directory.resolve("err.txt")));
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        } catch (InterruptedException e) {
            throw new IllegalStateException(e);
        }
    }

    /** Starts the service on a free port, in a directory that has its data, and waits until it is ready. */
    static Service serve(Path directory, Map<String, String> environment, String... before) {
        Map<String, String> all = new HashMap<>(environment);
        all.putIfAbsent("EVENDRAFT_HTTP_PORT", "0");
        Process process = start(directory, all, List.of(before), "serve");
        return new Service(process, address(process, directory));
    }

    private static String address(Process process, Path directory) {
        try {
            BufferedReader reader = process.inputReader(StandardCharsets.UTF_8);
            String line = reader.readLine();
            if (line == null || !line.startsWith(READY)) {
                process.destroyForcibly();
                throw new IllegalStateException(line + "\n" + Files.readString(directory.resolve("err.txt")));
            }
            return line.substring(READY.length());
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
