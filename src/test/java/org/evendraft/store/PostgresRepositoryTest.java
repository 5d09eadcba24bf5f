package org.evendraft.store;

import java.util.Optional;
import org.junit.jupiter.api.AfterAll;
import org.testcontainers.DockerClientFactory;
import org.testcontainers.postgresql.PostgreSQLContainer;
import org.testcontainers.utility.DockerImageName;

/**
 * The contracts on PostgreSQL, in a container of the image that EVENDRAFT_TEST_POSTGRES_IMAGE names. Without a Docker engine they
 * are skipped, unless EVENDRAFT_TEST_REQUIRE_ALL is true: then they fail.
 */
final class PostgresRepositoryTest extends RepositoryContract {
    private static final String USUAL_IMAGE = "postgres:15";

    private Optional<PostgreSQLContainer> container = Optional.empty();

    @Override
    Database open() {
        Outside.skipWithout(DockerClientFactory.instance().isDockerAvailable(), "a Docker engine");
        String image = System.getenv().getOrDefault("EVENDRAFT_TEST_POSTGRES_IMAGE", USUAL_IMAGE);
        PostgreSQLContainer server =
                new PostgreSQLContainer(DockerImageName.parse(image).asCompatibleSubstituteFor("postgres"));
        container = Optional.of(server);
        server.start();
        return Database.open(server.getJdbcUrl(), server.getUsername(), server.getPassword());
    }

    @AfterAll
    void stopServer() {
        container.ifPresent(PostgreSQLContainer::stop);
    }
}
