package org.evendraft.store;

import java.nio.file.Path;
import org.junit.jupiter.api.io.TempDir;

final class H2FileRepositoryTest extends RepositoryContract {
    @TempDir
    static Path folder = Path.of("");

    @Override
    Database open() {
        return Database.open("jdbc:h2:file:" + folder.resolve("store"), "sa", "");
    }
}
