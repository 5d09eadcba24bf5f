package org.evendraft;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.Properties;

/** The version of this program, as the build wrote it down. */
final class Version {
    private static final String FILE = "version.properties";

    private Version() {}

    /** The version, as {@code 0.1.0}. */
    static String read() {
        try (InputStream in = Version.class.getResourceAsStream(FILE)) {
            if (in == null) {
                throw new IllegalStateException("the program lacks " + FILE);
            }
            Properties properties = new Properties();
            properties.load(in);
            return properties.getProperty("version", "unknown");
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
