package org.evendraft.store;

final class H2MemoryRepositoryTest extends RepositoryContract {
    @Override
    Database open() {
        return Database.open("jdbc:h2:mem:" + Samples.newId(), "sa", "");
    }
}
