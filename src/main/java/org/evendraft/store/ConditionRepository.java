package org.evendraft.store;

import java.sql.ResultSet;
import java.sql.SQLException;
import java.time.Instant;
import java.time.InstantSource;
import java.util.List;
import java.util.Optional;
import java.util.function.Supplier;
import org.evendraft.platform.Fill;
import org.evendraft.platform.Load;
import org.evendraft.platform.Mode;
import org.jdbi.v3.core.Handle;
import org.jdbi.v3.core.statement.PreparedBatch;

/** Keeps conditions and every result computed of them; none is ever changed. Safe from many threads. */
public final class ConditionRepository {
    private final InstantSource clock;
    private final Supplier<String> ids;

    /**
     * @param clock tells when a condition is stored
     * @param ids makes the ids of conditions and results, UUIDs
     */
    public ConditionRepository(InstantSource clock, Supplier<String> ids) {
        this.clock = clock;
        this.ids = ids;
    }

    /** Stores a condition with its first result. */
    public StoredCondition save(Handle handle, NewCondition condition, NewResult result) {
        StoredCondition stored = new StoredCondition(
                ids.get(),
                condition.platformId(),
                condition.platformRevision(),
                condition.condition().name(),
                condition.document(),
                InstantBinding.toMicros(clock.instant()));
        insertCondition(handle, stored, condition);
        insertFills(handle, stored, condition.condition().fills());
        insertLoads(handle, stored, condition.condition().loads());
        ResultRows.insert(handle, stored.platformId(), store(stored.id(), result), result.result());
        return stored;
    }

    /**
     * Stores another result of a condition.
     *
     * @throws IllegalStateException when there is no such condition
     */
    public StoredResult addResult(Handle handle, String conditionId, NewResult result) {
        String platformId = handle.createQuery("SELECT platform_id FROM condition WHERE id = :id")
                .bind("id", conditionId)
                .mapTo(String.class)
                .one();
        StoredResult stored = store(conditionId, result);
        ResultRows.insert(handle, platformId, stored, result.result());
        return stored;
    }

    private StoredResult store(String conditionId, NewResult result) {
        return new StoredResult(
                ids.get(),
                conditionId,
                InstantBinding.toMicros(result.computedAt()),
                result.engineVersion(),
                result.platformRevision(),
                result.document());
    }

    private static void insertCondition(Handle handle, StoredCondition stored, NewCondition condition) {
        handle.createUpdate("""
                        INSERT INTO condition (id, platform_id, platform_revision, name, mode_id, water_density,
                            free_surface, document, created_at)
                        VALUES (:id, :platform, :revision, :name, :mode, :density, :freeSurface, :document, :now)""")
                .bind("id", stored.id())
                .bind("platform", stored.platformId())
                .bind("revision", stored.platformRevision())
                .bind("name", stored.name())
                .bind("mode", condition.condition().mode().map(Mode::id).orElse(null))
                .bind("density", condition.condition().waterDensity())
                .bind("freeSurface", condition.condition().freeSurface().name())
                .bind("document", stored.document())
                .bind("now", stored.createdAt())
                .execute();
    }

    private static void insertFills(Handle handle, StoredCondition condition, List<Fill> fills) {
        Batch.insert(
                handle,
                """
                INSERT INTO condition_fill (condition_id, ordinal, platform_id, platform_revision, tank_id, volume, density)
                VALUES (:condition, :ordinal, :platform, :revision, :tank, :volume, :density)""",
                fills,
                (row, fill) -> row.bind("condition", condition.id())
                        .bind("platform", condition.platformId())
                        .bind("revision", condition.platformRevision())
                        .bind("tank", fill.tank())
                        .bind("volume", fill.volume())
                        .bind("density", fill.density()));
    }

    private static void insertLoads(Handle handle, StoredCondition condition, List<Load> loads) {
        Batch.insert(handle, """
                INSERT INTO condition_load (condition_id, ordinal, name, kind, area_id, mass, x, y, z, footprint)
                VALUES (:condition, :ordinal, :name, :kind, :area, :mass, :x, :y, :z, :footprint)""", loads, (row, load) -> bindLoad(row.bind("condition", condition.id()), load));
    }

    private static void bindLoad(PreparedBatch row, Load load) {
        row.bind("name", load.name())
                .bind("kind", load.kind().name())
                .bind("area", load.area().orElse(null))
                .bind("mass", load.mass())
                .bind("x", load.position().x())
                .bind("y", load.position().y())
                .bind("z", load.position().z())
                .bind("footprint", load.footprint());
    }

    /** A condition of a platform. */
    public Optional<StoredCondition> find(Handle handle, String platformId, String id) {
        return handle.createQuery("""
                        SELECT id, platform_id, platform_revision, name, document, created_at
                        FROM condition WHERE id = :id AND platform_id = :platform""")
                .bind("id", id)
                .bind("platform", platformId)
                .map((row, context) -> condition(row))
                .findOne();
    }

    private static StoredCondition condition(ResultSet row) throws SQLException {
        return new StoredCondition(
                row.getString("id"),
                row.getString("platform_id"),
                row.getInt("platform_revision"),
                row.getString("name"),
                row.getString("document"),
                InstantBinding.read(row, "created_at"));
    }

    /** The conditions of a platform, newest first. */
    public Page<ConditionSummary> page(Handle handle, String platformId, PageRequest page) {
        long total = handle.createQuery("SELECT COUNT(*) FROM condition WHERE platform_id = :platform")
                .bind("platform", platformId)
                .mapTo(Long.class)
                .one();
        List<ConditionSummary> items = handle.createQuery("""
                        SELECT id, platform_revision, name, mode_id, created_at FROM condition
                        WHERE platform_id = :platform
                        ORDER BY created_at DESC, id DESC LIMIT :limit OFFSET :offset""")
                .bind("platform", platformId)
                .bind("limit", page.limit())
                .bind("offset", page.offset())
                .map((row, context) -> summary(row))
                .list();
        return new Page<>(items, total);
    }

    private static ConditionSummary summary(ResultSet row) throws SQLException {
        Instant createdAt = InstantBinding.read(row, "created_at");
        return new ConditionSummary(
                row.getString("id"),
                row.getInt("platform_revision"),
                row.getString("name"),
                Optional.ofNullable(row.getString("mode_id")),
                createdAt);
    }

    /** The result of a condition that was computed last; of several computed at the same moment the one stored last. */
    public Optional<StoredResult> latestResult(Handle handle, String conditionId) {
        return handle.createQuery("""
                        SELECT id, condition_id, computed_at, engine_version, platform_revision, document FROM result
                        WHERE condition_id = :condition
                        ORDER BY computed_at DESC, recorded_order DESC LIMIT 1""")
                .bind("condition", conditionId)
                .map((row, context) -> new StoredResult(
                        row.getString("id"),
                        row.getString("condition_id"),
                        InstantBinding.read(row, "computed_at"),
                        row.getString("engine_version"),
                        row.getInt("platform_revision"),
                        row.getString("document")))
                .findOne();
    }
}
