package org.evendraft.store;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

final class EngineTest {
    @ParameterizedTest
    @ValueSource(strings = {"jdbc:h2:file:./data/store", "jdbc:h2:./data/store", "jdbc:h2:async:./data/store"})
    void everySpellingOfAFileIsReachedInTheWayThatBearsInterruption(String url) {
        assertThat(Engine.of(url)).isEqualTo(Engine.H2_FILE);
        assertThat(Engine.H2_FILE.completed(url))
                .startsWith("jdbc:h2:async:./data/store;")
                .contains(";MODE=PostgreSQL", ";DATABASE_TO_LOWER=TRUE", ";DB_CLOSE_ON_EXIT=FALSE");
    }

    @Test
    void settingsThatTheAddressGivesAreLeftAlone() {
        assertThat(Engine.H2_MEMORY.completed("jdbc:h2:mem:x;db_close_delay=5"))
                .contains("db_close_delay=5")
                .doesNotContain("DB_CLOSE_DELAY=-1");
        String server = "jdbc:postgresql://localhost/evendraft";
        assertThat(Engine.POSTGRESQL.completed(server)).isEqualTo(server);
    }

    @Test
    void aFileBelongsToOneProcessUnlessItsAddressSaysOtherwise() {
        assertThat(Engine.H2_FILE.exclusive("jdbc:h2:file:./data/store")).isTrue();
        assertThat(Engine.H2_FILE.exclusive(Engine.H2_FILE.completed("jdbc:h2:./data/store")))
                .isTrue();
        assertThat(Engine.H2_FILE.exclusive("jdbc:h2:file:./data/store;auto_server=true"))
                .isFalse();
        assertThat(Engine.H2_FILE.exclusive("jdbc:h2:file:./data/store;FILE_LOCK=NO"))
                .isFalse();
        assertThat(Engine.H2_FILE.exclusive("jdbc:h2:tcp://localhost/store")).isFalse();
        assertThat(Engine.POSTGRESQL.exclusive("jdbc:postgresql://localhost/evendraft"))
                .isFalse();
    }

    @Test
    void anotherDatabaseIsRefusedByName() {
        assertThatThrownBy(() -> Engine.of("jdbc:sqlite:x"))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("jdbc:sqlite:x");
    }
}
