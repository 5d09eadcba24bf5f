package org.evendraft.store;

import java.time.Instant;
import java.time.InstantSource;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import java.util.UUID;
import org.evendraft.geometry.SecondMoments;
import org.evendraft.geometry.Vec3;
import org.evendraft.platform.Condition;
import org.evendraft.platform.Fill;
import org.evendraft.platform.Lightship;
import org.evendraft.platform.Load;
import org.evendraft.platform.Platform;
import org.evendraft.platform.Purpose;
import org.evendraft.platform.StabilityRules;
import org.evendraft.platform.TableRow;
import org.evendraft.platform.Tank;
import org.evendraft.stability.ConditionResult;
import org.evendraft.stability.TankState;
import org.jdbi.v3.core.Handle;

/** Small documents to store. Figures are arbitrary and all different, so that a column put in another's place is noticed. */
final class Samples {
    static final Instant NOON = Instant.parse("2026-06-12T12:00:00.123456Z");
    static final InstantSource AT_NOON = InstantSource.fixed(NOON);

    private Samples() {}

    /** An id that no other test uses. */
    static String newId() {
        return UUID.randomUUID().toString();
    }

    static Tank tank(String id, Purpose purpose, List<TableRow> table) {
        return new Tank(id, "Tank " + id, purpose, 1.025, List.of(), table, 0.97, 0.98, 0.01, 0.99, true);
    }

    /** A platform with the tanks PB1 and SB1. */
    static Platform platform(String id) {
        List<TableRow> table = List.of(
                new TableRow(0, 0, new Vec3(1, 2, 3), SecondMoments.NONE),
                new TableRow(4.5, 450, new Vec3(1.5, 2.5, 3.5), new SecondMoments(11, 12, -13)));
        return platform(id, List.of(tank("PB1", Purpose.BALLAST, table), tank("SB1", Purpose.FUEL, List.of())));
    }

    static Platform platform(String id, List<Tank> tanks) {
        Lightship lightship = new Lightship(16_500, new Vec3(0.1, 0, 26.5));
        return new Platform(
                id,
                "Platform " + id,
                1.025,
                List.of(),
                List.of(),
                lightship,
                tanks,
                List.of(),
                List.of(),
                List.of(),
                List.of(),
                List.of(),
                List.of(),
                StabilityRules.NONE,
                List.of());
    }

    /** Stores revision 1 of a platform with the tanks PB1 and SB1 and returns its id. */
    static String storedPlatform(Database database) {
        String id = newId();
        database.inTransaction(handle -> new PlatformRepository(AT_NOON)
                .save(handle, platform(id), "{\"id\":\"" + id + "\"}", OptionalInt.of(0)));
        return id;
    }

    static NewCondition condition(String platformId, String name) {
        Load casing = new Load(
                "casing",
                Load.Kind.DECK,
                Optional.of("pipe-deck"),
                320,
                new Vec3(-10, 4, 37.2),
                OptionalDouble.of(125.5));
        Load block = new Load(
                "block", Load.Kind.SUSPENDED, Optional.empty(), 40, new Vec3(1, 2, 90), OptionalDouble.empty());
        Condition condition = new Condition(
                name,
                Optional.empty(),
                1.024,
                Condition.FreeSurface.MAXIMUM,
                List.of(new Fill("SB1", 210.5, 0.84)),
                List.of(casing, block));
        return new NewCondition(platformId, 1, condition, "{\"name\":\"" + name + "\"}");
    }

    static NewResult result(Instant computedAt) {
        return new NewResult(figures(), "{\"computedAt\":\"" + computedAt + "\"}", computedAt, "1.2.3", 1);
    }

    private static ConditionResult figures() {
        ConditionResult.Gm gm = new ConditionResult.Gm(
                new ConditionResult.GmFigures(3.5, 0.5, 3.0),
                new ConditionResult.GmFigures(4.5, 0.25, 4.25),
                new ConditionResult.LeastGm(2.75, 17.5));
        ConditionResult.Floating floating = new ConditionResult.Floating(
                18.5, 0.75, -0.25, 31_000, new Vec3(0.3, -0.4, 7.5), Map.of("PF", 18.25, "SA", 18.75), true, false);
        List<ConditionResult.TankResult> tanks = List.of(
                new ConditionResult.TankResult("PB1", 0, 0, 0, 0, TankState.EMPTY, new Vec3(1, 2, 3), 0, 0),
                new ConditionResult.TankResult(
                        "SB1", 4.25, 210.5, 176.82, 0.625, TankState.SLACK, new Vec3(5, 6, 7), 81, 82));
        List<ConditionResult.LimitResult> limits = List.of(
                new ConditionResult.LimitResult("maxHeel", 0.75, 3.0, 2.25, true),
                new ConditionResult.LimitResult("allowableKg", 21.5, null, null, false));
        return new ConditionResult(
                31_775,
                new Vec3(0.31, -0.41, 20.5),
                18.4,
                new ConditionResult.Directions(24, 25),
                gm,
                new ConditionResult.Estimate(0.7, null),
                floating,
                tanks,
                limits,
                List.of("first warning", "second warning"));
    }

    /** The values of the rows that a statement selects, one text for each row. */
    static List<String> rows(Database database, String sql, String id) {
        return database.read(handle -> rows(handle, sql, id));
    }

    private static List<String> rows(Handle handle, String sql, String id) {
        return handle.createQuery(sql)
                .bind("id", id)
                .map((row, context) -> {
                    StringBuilder text = new StringBuilder();
                    for (int i = 1; i <= row.getMetaData().getColumnCount(); i++) {
                        text.append(i > 1 ? " " : "").append(row.getObject(i));
                    }
                    return text.toString();
                })
                .list();
    }
}
