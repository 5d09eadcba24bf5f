package org.evendraft.store;

import com.zaxxer.hikari.HikariConfig;
import com.zaxxer.hikari.HikariDataSource;
import java.util.Optional;
import java.util.function.Function;
import org.flywaydb.core.Flyway;
import org.jdbi.v3.core.Handle;
import org.jdbi.v3.core.Jdbi;
import org.jdbi.v3.core.JdbiException;
import org.jdbi.v3.core.transaction.TransactionIsolationLevel;

/**
 * The database: a pool of connections to H2 or PostgreSQL with all migrations done. Safe from many threads.
 *
 * <p>A transaction that {@link #inTransaction} has returned from is on disk. PostgreSQL sees to that by itself. H2 keeps a commit
 * in memory for up to half a second and never asks the system to flush its file, so for a file the data are written and flushed
 * (fsync) after the commit and before the return. H2's own delay is left as it is: without it, H2 writes the file in more and
 * smaller pieces and stops its housekeeping, and the file grows.
 */
public final class Database implements AutoCloseable {
    private static final int CONNECTIONS = 10;

    /** How long a caller waits for a connection of the pool before the database counts as unreachable. */
    private static final int CONNECTION_TIMEOUT_MS = 10_000;

    /** How long a transaction waits for a row that another holds; none holds one while it computes. */
    private static final int LOCK_TIMEOUT_MS = 5_000;

    private final Engine engine;
    private final HikariDataSource pool;
    private final Jdbi jdbi;

    private Database(Engine engine, HikariDataSource pool) {
        this.engine = engine;
        this.pool = pool;
        this.jdbi = Jdbi.create(pool).registerArgument(new InstantBinding());
    }

    /**
     * Opens a database, makes an H2 file that does not exist, and does the migrations that are not yet done; of several
     * instances that start at once, one does them and the others wait.
     *
     * @param url JDBC address of H2 ({@code jdbc:h2:…}) or PostgreSQL ({@code jdbc:postgresql:…}); the user needs the rights to
     *     make tables, in H2 those of the administrator
     * @throws IllegalArgumentException when the address is of another database
     * @throws RuntimeException of the pool or of Flyway when the database cannot be reached or migrated
     */
    public static Database open(String url, String user, String password) {
        Engine engine = Engine.of(url);
        HikariDataSource pool = new HikariDataSource(poolOf(engine, url, user, password));
        boolean open = false;
        try {
            Flyway.configure()
                    .dataSource(pool)
                    .locations("classpath:db/migration")
                    .load()
                    .migrate();
            Database database = new Database(engine, pool);
            database.inTransaction(handle -> true);
            open = true;
            return database;
        } finally {
            if (!open) {
                pool.close();
            }
        }
    }

    private static HikariConfig poolOf(Engine engine, String url, String user, String password) {
        HikariConfig config = new HikariConfig();
        config.setPoolName("database");
        config.setJdbcUrl(engine.completed(url));
        config.setUsername(user);
        config.setPassword(password);
        config.setMaximumPoolSize(CONNECTIONS);
        config.setConnectionTimeout(CONNECTION_TIMEOUT_MS);
        config.setConnectionInitSql(engine.lockTimeout(LOCK_TIMEOUT_MS));
        config.setTransactionIsolation("TRANSACTION_READ_COMMITTED");
        if (engine == Engine.POSTGRESQL) {
            // rows of a batch go in few statements instead of one each
            config.addDataSourceProperty("reWriteBatchedInserts", "true");
        }
        return config;
    }

    /** The entry to Jdbi; what is written past {@link #inTransaction} is not promised to be on disk. */
    public Jdbi jdbi() {
        return jdbi;
    }

    /**
     * Does work in one transaction that reads what is committed. When this returns, the work is on disk; when it throws, the work
     * is undone, unless the flush itself failed.
     *
     * @param work what to do; repositories take its handle
     * @return what the work returns
     * @param <T> of that type
     * @throws JdbiException when the database fails
     */
    public <T> T inTransaction(Function<Handle, T> work) {
        try (Handle handle = jdbi.open()) {
            T answer = handle.inTransaction(work::apply);
            if (engine == Engine.H2_FILE) {
                handle.execute("CHECKPOINT SYNC");
            }
            return answer;
        }
    }

    /**
     * Does work in one transaction as {@link #inTransaction} does, but does not wait until it is on disk: for what a power cut makes
     * worthless anyway, as signs of life.
     *
     * @param work what to do; repositories take its handle
     * @return what the work returns
     * @param <T> of that type
     * @throws JdbiException when the database fails
     */
    public <T> T inPassing(Function<Handle, T> work) {
        return jdbi.inTransaction(work::apply);
    }

    /**
     * Has something done when the transaction of a handle has ended.
     *
     * @param committed done when it is committed, before it is known to be on disk
     * @param undone done when it is rolled back
     */
    public static void whenEnded(Handle handle, Runnable committed, Runnable undone) {
        handle.afterCommit(committed);
        handle.afterRollback(undone);
    }

    /** Whether no other process can have this database open. */
    public boolean exclusive() {
        return engine.exclusive(pool.getJdbcUrl());
    }

    /**
     * Reads from one snapshot of the database.
     *
     * @param work what to read
     * @return what the work returns
     * @param <T> of that type
     * @throws JdbiException when the database fails
     */
    public <T> T read(Function<Handle, T> work) {
        return jdbi.inTransaction(TransactionIsolationLevel.REPEATABLE_READ, work::apply);
    }

    /** Asks the database how it is. */
    public Health health() {
        try {
            return new Health(true, jdbi.withHandle(Database::migration));
        } catch (JdbiException unreachable) {
            return new Health(false, Optional.empty());
        }
    }

    private static Optional<String> migration(Handle handle) {
        return handle.createQuery("""
                        SELECT version FROM flyway_schema_history
                        WHERE success AND version IS NOT NULL ORDER BY installed_rank DESC LIMIT 1""").mapTo(String.class).findOne();
    }

    /** Closes the pool, and H2 with the last connection. */
    @Override
    public void close() {
        if (engine == Engine.H2_MEMORY && !pool.isClosed()) {
            jdbi.useHandle(handle -> handle.execute("SET DB_CLOSE_DELAY 0"));
        }
        pool.close();
    }
}
