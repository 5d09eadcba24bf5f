package org.evendraft.store;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.time.InstantSource;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.evendraft.geometry.Vec3;
import org.evendraft.platform.Condition;
import org.evendraft.platform.Fill;
import org.evendraft.platform.Load;
import org.evendraft.platform.Mode;
import org.jdbi.v3.core.JdbiException;
import org.junit.jupiter.api.Test;

/** What holds of conditions and results on every engine. */
interface ConditionContract extends StoreContract {
    private ConditionRepository conditions() {
        return new ConditionRepository(Samples.AT_NOON, Samples::newId);
    }

    private StoredCondition save(NewCondition condition) {
        return database().inTransaction(handle -> conditions().save(handle, condition, Samples.result(Samples.NOON)));
    }

    private Optional<StoredCondition> find(String platform, String id) {
        return database().read(handle -> conditions().find(handle, platform, id));
    }

    private Page<ConditionSummary> page(String platform, PageRequest page) {
        return database().read(handle -> conditions().page(handle, platform, page));
    }

    private Optional<StoredResult> latestResult(String condition) {
        return database().read(handle -> conditions().latestResult(handle, condition));
    }

    @Test
    default void aConditionComesBackAsItWasPosted() {
        String platform = Samples.storedPlatform(database());
        StoredCondition stored = save(Samples.condition(platform, "Operating, 12 June"));
        assertThat(stored)
                .isEqualTo(new StoredCondition(
                        stored.id(),
                        platform,
                        1,
                        "Operating, 12 June",
                        "{\"name\":\"Operating, 12 June\"}",
                        Samples.NOON));
        assertThat(find(platform, stored.id())).contains(stored);
        assertThat(find("another", stored.id())).isEmpty();
    }

    @Test
    default void fillsAndLoadsAreRows() {
        String id =
                save(Samples.condition(Samples.storedPlatform(database()), "A")).id();
        assertThat(Samples.rows(
                        database(), "SELECT mode_id, water_density, free_surface FROM condition WHERE id = :id", id))
                .containsExactly("null 1.024 MAXIMUM");
        assertThat(Samples.rows(
                        database(),
                        "SELECT ordinal, tank_id, volume, density FROM condition_fill WHERE condition_id = :id",
                        id))
                .containsExactly("0 SB1 210.5 0.84");
        assertThat(Samples.rows(
                        database(), "SELECT * FROM condition_load WHERE condition_id = :id ORDER BY ordinal", id))
                .containsExactly(
                        id + " 0 casing DECK pipe-deck 320.0 -10.0 4.0 37.2 125.5",
                        id + " 1 block SUSPENDED null 40.0 1.0 2.0 90.0 null");
    }

    @Test
    default void theFiguresOfAResultAreRows() {
        String id =
                save(Samples.condition(Samples.storedPlatform(database()), "A")).id();
        String ofResult = " WHERE result_id = (SELECT id FROM result WHERE condition_id = :id) ORDER BY 1";
        assertThat(Samples.rows(database(), """
                        SELECT mass, centre_x, centre_y, centre_z, even_keel_draft, km_transverse, km_longitudinal,
                            gm_transverse_solid, gm_transverse_free_surface, gm_transverse,
                            gm_longitudinal_solid, gm_longitudinal_free_surface, gm_longitudinal,
                            gm_least, gm_least_azimuth, estimated_heel, estimated_trim,
                            draft, heel_angle, trim_angle, displaced_volume, buoyancy_x, buoyancy_y, buoyancy_z,
                            upright, stable
                        FROM result WHERE condition_id = :id""", id))
                .containsExactly("31775.0 0.31 -0.41 20.5 18.4 24.0 25.0 3.5 0.5 3.0 4.5 0.25 4.25 2.75 17.5 0.7 null"
                        + " 18.5 0.75 -0.25 31000.0 0.3 -0.4 7.5 true false");
        assertThat(Samples.rows(database(), """
                        SELECT tank_id, level, volume, mass, fraction, state, x, y, z,
                            free_surface_moment_t, free_surface_moment_l FROM result_tank""" + ofResult, id))
                .containsExactly(
                        "PB1 0.0 0.0 0.0 0.0 EMPTY 1.0 2.0 3.0 0.0 0.0",
                        "SB1 4.25 210.5 176.82 0.625 SLACK 5.0 6.0 7.0 81.0 82.0");
        assertThat(Samples.rows(database(), "SELECT mark_id, reading FROM result_mark" + ofResult, id))
                .containsExactly("PF 18.25", "SA 18.75");
        assertThat(Samples.rows(
                        database(),
                        "SELECT ordinal, limit_name, attained, bound, margin, met FROM result_limit" + ofResult,
                        id))
                .containsExactly("0 maxHeel 0.75 3.0 2.25 true", "1 allowableKg 21.5 null null false");
        assertThat(Samples.rows(database(), "SELECT ordinal, sentence FROM result_warning" + ofResult, id))
                .containsExactly("0 first warning", "1 second warning");
    }

    @Test
    default void aLoadOfEveryKindAndAModeCanBeStored() {
        String platform = Samples.storedPlatform(database());
        List<Load> loads = new ArrayList<>();
        for (Load.Kind kind : Load.Kind.values()) {
            loads.add(new Load(kind.name(), kind, Optional.empty(), 1, Vec3.ZERO, OptionalDouble.empty()));
        }
        Load correction =
                new Load("less", Load.Kind.CORRECTION, Optional.empty(), -2, Vec3.ZERO, OptionalDouble.empty());
        loads.add(correction);
        Mode mode = new Mode(
                "operating",
                "Operating",
                Optional.empty(),
                Optional.empty(),
                List.of(),
                OptionalDouble.empty(),
                OptionalDouble.empty(),
                OptionalDouble.empty(),
                OptionalDouble.empty());
        Condition condition = new Condition(
                "all", Optional.of(mode), 1.025, Condition.FreeSurface.ACTUAL, List.of(new Fill("PB1", 1, 1)), loads);
        String id = save(new NewCondition(platform, 1, condition, "{}")).id();
        assertThat(Samples.rows(database(), "SELECT COUNT(*) FROM condition_load WHERE condition_id = :id", id))
                .containsExactly(String.valueOf(loads.size()));
        assertThat(page(platform, new PageRequest(1, 0)))
                .isEqualTo(new Page<>(
                        List.of(new ConditionSummary(id, 1, "all", Optional.of("operating"), Samples.NOON)), 1));
    }

    @Test
    default void aHundredThousandLoadsFit() {
        int count = 100_000;
        String platform = Samples.storedPlatform(database());
        Load load = new Load("sack", Load.Kind.VARIABLE, Optional.empty(), 0.025, Vec3.ZERO, OptionalDouble.empty());
        Condition condition = new Condition(
                "sacks",
                Optional.empty(),
                1.025,
                Condition.FreeSurface.ACTUAL,
                List.of(),
                Collections.nCopies(count, load));
        String id = save(new NewCondition(platform, 1, condition, "{}")).id();
        assertThat(Samples.rows(
                        database(), "SELECT COUNT(*), MAX(ordinal) FROM condition_load WHERE condition_id = :id", id))
                .containsExactly(count + " " + (count - 1));
    }

    @Test
    default void conditionsArePagedNewestFirst() {
        String platform = Samples.storedPlatform(database());
        for (int i = 0; i < 5; i++) {
            NewCondition condition = Samples.condition(platform, "c" + i);
            ConditionRepository repository =
                    new ConditionRepository(InstantSource.fixed(Samples.NOON.plusSeconds(i)), Samples::newId);
            database().inTransaction(handle -> repository.save(handle, condition, Samples.result(Samples.NOON)));
        }
        save(Samples.condition(Samples.storedPlatform(database()), "of another platform"));
        Page<String> page = page(platform, new PageRequest(2, 1)).map(ConditionSummary::name);
        assertThat(page).isEqualTo(new Page<>(List.of("c3", "c2"), 5));
    }

    @Test
    default void theLatestResultIsTheOneComputedLastAndOfEqualsTheOneStoredLast() {
        String id =
                save(Samples.condition(Samples.storedPlatform(database()), "A")).id();
        database()
                .inTransaction(
                        handle -> conditions().addResult(handle, id, Samples.result(Samples.NOON.minusSeconds(60))));
        StoredResult last =
                database().inTransaction(handle -> conditions().addResult(handle, id, Samples.result(Samples.NOON)));
        assertThat(latestResult(id))
                .contains(new StoredResult(
                        last.id(), id, Samples.NOON, "1.2.3", 1, "{\"computedAt\":\"" + Samples.NOON + "\"}"));
        assertThat(Samples.rows(database(), "SELECT id FROM result WHERE condition_id = :id", id))
                .hasSize(3);
        assertThat(latestResult("none")).isEmpty();
    }

    @Test
    default void aResultOfAnUnknownConditionIsRefused() {
        assertThatThrownBy(() -> database()
                        .inTransaction(handle -> conditions().addResult(handle, "none", Samples.result(Samples.NOON))))
                .isInstanceOf(IllegalStateException.class);
    }

    @Test
    default void ofAConditionWithAnUnknownTankNothingIsStored() {
        String platform = Samples.storedPlatform(database());
        Condition condition = new Condition(
                "bad",
                Optional.empty(),
                1.025,
                Condition.FreeSurface.ACTUAL,
                List.of(new Fill("PB1", 1, 1), new Fill("none", 1, 1)),
                List.of());
        assertThatThrownBy(() -> save(new NewCondition(platform, 1, condition, "{}")))
                .isInstanceOf(JdbiException.class);
        assertThat(page(platform, new PageRequest(1, 0)).total()).isZero();
    }
}
