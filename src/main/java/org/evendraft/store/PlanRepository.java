package org.evendraft.store;

import java.sql.ResultSet;
import java.sql.SQLException;
import java.time.InstantSource;
import java.util.List;
import java.util.Optional;
import java.util.function.Supplier;
import org.jdbi.v3.core.Handle;
import org.jdbi.v3.core.statement.PreparedBatch;

/** Keeps ballast plans; none is ever changed. Safe from many threads. */
public final class PlanRepository {
    private final InstantSource clock;
    private final Supplier<String> ids;

    /**
     * @param clock tells when a plan is stored
     * @param ids makes the id of a plan, a UUID
     */
    public PlanRepository(InstantSource clock, Supplier<String> ids) {
        this.clock = clock;
        this.ids = ids;
    }

    /** Stores a plan. */
    public StoredPlan save(Handle handle, NewPlan plan) {
        StoredPlan stored = new StoredPlan(
                ids.get(),
                plan.conditionId(),
                plan.requestJson(),
                plan.planJson(),
                plan.feasible(),
                plan.cost(),
                plan.pumpedMass(),
                plan.moves(),
                InstantBinding.toMicros(clock.instant()));
        insertPlan(handle, stored);
        Batch.insert(handle, """
                INSERT INTO plan_move (plan_id, step, source, destination, mass, volume, pump_id, start_minute, end_minute)
                VALUES (:plan, :step, :source, :destination, :mass, :volume, :pump, :startMinute, :endMinute)""", stored.moves(), (row, move) -> bindMove(row.bind("plan", stored.id()), move));
        return stored;
    }

    private static void insertPlan(Handle handle, StoredPlan plan) {
        handle.createUpdate("""
                        INSERT INTO plan (id, condition_id, request, feasible, cost, pumped_mass, document, created_at)
                        VALUES (:id, :condition, :request, :feasible, :cost, :pumpedMass, :document, :now)""")
                .bind("id", plan.id())
                .bind("condition", plan.conditionId())
                .bind("request", plan.requestJson())
                .bind("feasible", plan.feasible())
                .bind("cost", plan.cost())
                .bind("pumpedMass", plan.pumpedMass())
                .bind("document", plan.planJson())
                .bind("now", plan.createdAt())
                .execute();
    }

    private static void bindMove(PreparedBatch row, StoredMove move) {
        row.bind("step", move.step())
                .bind("source", move.from())
                .bind("destination", move.to())
                .bind("mass", move.mass())
                .bind("volume", move.volume())
                .bind("pump", move.pump())
                .bind("startMinute", move.startMinute())
                .bind("endMinute", move.endMinute());
    }

    /** A plan of a condition. */
    public Optional<StoredPlan> find(Handle handle, String conditionId, String id) {
        return handle.createQuery("""
                        SELECT id, condition_id, request, feasible, cost, pumped_mass, document, created_at
                        FROM plan WHERE id = :id AND condition_id = :condition""")
                .bind("id", id)
                .bind("condition", conditionId)
                .map((row, context) -> plan(row, moves(handle, id)))
                .findOne();
    }

    private static StoredPlan plan(ResultSet row, List<StoredMove> moves) throws SQLException {
        return new StoredPlan(
                row.getString("id"),
                row.getString("condition_id"),
                row.getString("request"),
                row.getString("document"),
                row.getBoolean("feasible"),
                row.getDouble("cost"),
                row.getDouble("pumped_mass"),
                moves,
                InstantBinding.read(row, "created_at"));
    }

    private static List<StoredMove> moves(Handle handle, String planId) {
        return handle.createQuery("""
                        SELECT step, source, destination, mass, volume, pump_id, start_minute, end_minute
                        FROM plan_move WHERE plan_id = :plan ORDER BY step""")
                .bind("plan", planId)
                .map((row, context) -> move(row))
                .list();
    }

    private static StoredMove move(ResultSet row) throws SQLException {
        return new StoredMove(
                row.getInt("step"),
                row.getString("source"),
                row.getString("destination"),
                row.getDouble("mass"),
                row.getDouble("volume"),
                row.getString("pump_id"),
                row.getDouble("start_minute"),
                row.getDouble("end_minute"));
    }

    /** The plans of a condition, newest first. */
    public List<PlanSummary> list(Handle handle, String conditionId) {
        return handle.createQuery("""
                        SELECT id, feasible, cost, pumped_mass, created_at FROM plan
                        WHERE condition_id = :condition ORDER BY created_at DESC, id DESC""")
                .bind("condition", conditionId)
                .map((row, context) -> new PlanSummary(
                        row.getString("id"),
                        row.getBoolean("feasible"),
                        row.getDouble("cost"),
                        row.getDouble("pumped_mass"),
                        InstantBinding.read(row, "created_at")))
                .list();
    }
}
