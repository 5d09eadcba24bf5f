package org.evendraft.store;

import java.sql.ResultSet;
import java.sql.SQLException;
import java.time.InstantSource;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import org.evendraft.platform.Platform;
import org.evendraft.platform.TableRow;
import org.evendraft.platform.Tank;
import org.jdbi.v3.core.Handle;
import org.jdbi.v3.core.statement.PreparedBatch;

/** Keeps platforms: every revision stays as it was posted, numbered from 1, its tanks and tables as rows. Safe from many threads. */
public final class PlatformRepository {
    private static final String SELECT_REVISION = """
            SELECT r.platform_id, r.revision, r.name, r.document, r.created_at
            FROM platform_revision r JOIN platform p ON p.id = r.platform_id
            WHERE p.id = :id AND r.revision =
            """;

    private final InstantSource clock;

    /**
     * @param clock tells when a revision is stored
     */
    public PlatformRepository(InstantSource clock) {
        this.clock = clock;
    }

    /**
     * Stores a new revision. Of several at once that expect the same revision, one is stored.
     *
     * @param platform the platform, checked
     * @param document its JSON text as posted
     * @param expected the revision that must be the current one, 0 for a platform that must not exist; empty for whichever it is
     */
    public RevisionSaving save(Handle handle, Platform platform, String document, OptionalInt expected) {
        int current = lockCurrent(handle, platform.id());
        if (expected.isPresent() && expected.getAsInt() != current) {
            return new RevisionSaving.Stale(current);
        }
        if (current == 0) {
            // Another transaction may insert the same platform meanwhile: this waits for its end and then finds its
            // revision.
            insertPlatform(handle, platform.id());
            current = lockCurrent(handle, platform.id());
            if (expected.isPresent() && current != 0) {
                return new RevisionSaving.Stale(current);
            }
        }
        int revision = current + 1;
        insertRevision(handle, platform, revision, document);
        insertTanks(handle, platform, revision);
        setCurrent(handle, platform.id(), revision);
        return new RevisionSaving.Saved(revision);
    }

    private static int lockCurrent(Handle handle, String id) {
        return handle.createQuery("SELECT current_revision FROM platform WHERE id = :id FOR UPDATE")
                .bind("id", id)
                .mapTo(Integer.class)
                .findOne()
                .orElse(0);
    }

    private static void insertPlatform(Handle handle, String id) {
        handle.createUpdate("INSERT INTO platform (id, current_revision) VALUES (:id, 0) ON CONFLICT DO NOTHING")
                .bind("id", id)
                .execute();
    }

    private static void setCurrent(Handle handle, String id, int revision) {
        handle.createUpdate("UPDATE platform SET current_revision = :revision WHERE id = :id")
                .bind("id", id)
                .bind("revision", revision)
                .execute();
    }

    private void insertRevision(Handle handle, Platform platform, int revision, String document) {
        handle.createUpdate("""
                        INSERT INTO platform_revision (platform_id, revision, name, tank_count, document, created_at)
                        VALUES (:platform, :revision, :name, :tanks, :document, :now)""")
                .bind("platform", platform.id())
                .bind("revision", revision)
                .bind("name", platform.name())
                .bind("tanks", platform.tanks().size())
                .bind("document", document)
                .bind("now", clock.instant())
                .execute();
    }

    private static void insertTanks(Handle handle, Platform platform, int revision) {
        Batch.insert(
                handle,
                """
                INSERT INTO tank (platform_id, revision, id, ordinal, name, purpose, density, permeability,
                    pressed_up_fraction, least_pumpable_fraction, greatest_fraction, locked)
                VALUES (:platform, :revision, :id, :ordinal, :name, :purpose, :density, :permeability,
                    :pressedUp, :leastPumpable, :greatest, :locked)""",
                platform.tanks(),
                (row, tank) -> bindTank(row.bind("platform", platform.id()).bind("revision", revision), tank));
        for (Tank tank : platform.tanks()) {
            Batch.insert(
                    handle,
                    """
                    INSERT INTO tank_table_row (platform_id, revision, tank_id, ordinal, level, volume, x, y, z,
                        inertia_t, inertia_l, inertia_tl)
                    VALUES (:platform, :revision, :tank, :ordinal, :level, :volume, :x, :y, :z, :t, :l, :tl)""",
                    tank.table(),
                    (row, entry) -> bindTableRow(
                            row.bind("platform", platform.id())
                                    .bind("revision", revision)
                                    .bind("tank", tank.id()),
                            entry));
        }
    }

    private static void bindTank(PreparedBatch row, Tank tank) {
        row.bind("id", tank.id())
                .bind("name", tank.name())
                .bind("purpose", tank.purpose().name())
                .bind("density", tank.density())
                .bind("permeability", tank.permeability())
                .bind("pressedUp", tank.pressedUpFraction())
                .bind("leastPumpable", tank.leastPumpableFraction())
                .bind("greatest", tank.greatestFraction())
                .bind("locked", tank.locked());
    }

    private static void bindTableRow(PreparedBatch row, TableRow entry) {
        row.bind("level", entry.level())
                .bind("volume", entry.volume())
                .bind("x", entry.centre().x())
                .bind("y", entry.centre().y())
                .bind("z", entry.centre().z())
                .bind("t", entry.surface().transverse())
                .bind("l", entry.surface().longitudinal())
                .bind("tl", entry.surface().product());
    }

    /** The current revision of a platform. */
    public Optional<StoredPlatform> findLatest(Handle handle, String id) {
        return handle.createQuery(SELECT_REVISION + "p.current_revision")
                .bind("id", id)
                .map((row, context) -> platform(row))
                .findOne();
    }

    /** A revision of a platform. */
    public Optional<StoredPlatform> find(Handle handle, String id, int revision) {
        return handle.createQuery(SELECT_REVISION + ":revision")
                .bind("id", id)
                .bind("revision", revision)
                .map((row, context) -> platform(row))
                .findOne();
    }

    private static StoredPlatform platform(ResultSet row) throws SQLException {
        return new StoredPlatform(
                row.getString("platform_id"),
                row.getInt("revision"),
                row.getString("name"),
                row.getString("document"),
                InstantBinding.read(row, "created_at"));
    }

    /** All platforms by id. */
    public List<PlatformSummary> list(Handle handle) {
        return handle.createQuery("""
                        SELECT r.platform_id, r.revision, r.name, r.created_at, r.tank_count
                        FROM platform p JOIN platform_revision r ON r.platform_id = p.id AND r.revision = p.current_revision
                        ORDER BY r.platform_id""")
                .map((row, context) -> new PlatformSummary(
                        row.getString("platform_id"),
                        row.getString("name"),
                        row.getInt("revision"),
                        InstantBinding.read(row, "created_at"),
                        row.getInt("tank_count")))
                .list();
    }
}
