-- Conditions with their fills and loads, and every result computed of them.

CREATE TABLE condition (
    id                VARCHAR(36)                 NOT NULL PRIMARY KEY,
    platform_id       VARCHAR(200)                NOT NULL,
    platform_revision INTEGER                     NOT NULL,
    name              VARCHAR                     NOT NULL,
    mode_id           VARCHAR(200),
    water_density     DOUBLE PRECISION            NOT NULL CHECK (water_density > 0),
    free_surface      VARCHAR(10)                 NOT NULL CHECK (free_surface IN ('ACTUAL', 'MAXIMUM')),
    document          TEXT                        NOT NULL,
    created_at        TIMESTAMP(6) WITH TIME ZONE NOT NULL,
    UNIQUE (id, platform_id, platform_revision),
    FOREIGN KEY (platform_id, platform_revision) REFERENCES platform_revision (platform_id, revision)
);

-- a platform's conditions, newest first
CREATE INDEX condition_of_platform ON condition (platform_id, created_at DESC, id DESC);

CREATE TABLE condition_fill (
    condition_id      VARCHAR(36)      NOT NULL,
    ordinal           INTEGER          NOT NULL CHECK (ordinal >= 0),
    platform_id       VARCHAR(200)     NOT NULL,
    platform_revision INTEGER          NOT NULL,
    tank_id           VARCHAR(200)     NOT NULL,
    volume            DOUBLE PRECISION NOT NULL CHECK (volume >= 0),
    density           DOUBLE PRECISION NOT NULL CHECK (density > 0),
    PRIMARY KEY (condition_id, ordinal),
    UNIQUE (condition_id, tank_id),
    FOREIGN KEY (condition_id, platform_id, platform_revision) REFERENCES condition (id, platform_id, platform_revision),
    FOREIGN KEY (platform_id, platform_revision, tank_id) REFERENCES tank (platform_id, revision, id)
);

CREATE TABLE condition_load (
    condition_id VARCHAR(36)      NOT NULL REFERENCES condition (id),
    ordinal      INTEGER          NOT NULL CHECK (ordinal >= 0),
    name         VARCHAR          NOT NULL,
    kind         VARCHAR(20)      NOT NULL CHECK (kind IN ('DECK', 'SUSPENDED', 'LINE', 'VARIABLE', 'CORRECTION')),
    area_id      VARCHAR(200),
    mass         DOUBLE PRECISION NOT NULL,
    x            DOUBLE PRECISION NOT NULL,
    y            DOUBLE PRECISION NOT NULL,
    z            DOUBLE PRECISION NOT NULL,
    footprint    DOUBLE PRECISION CHECK (footprint > 0),
    PRIMARY KEY (condition_id, ordinal),
    CHECK (mass >= 0 OR kind = 'CORRECTION')
);

CREATE TABLE result (
    id                           VARCHAR(36)                 NOT NULL PRIMARY KEY,
    recorded_order               BIGINT GENERATED ALWAYS AS IDENTITY,
    condition_id                 VARCHAR(36)                 NOT NULL REFERENCES condition (id),
    computed_at                  TIMESTAMP(6) WITH TIME ZONE NOT NULL,
    engine_version               VARCHAR(100)                NOT NULL,
    platform_id                  VARCHAR(200)                NOT NULL,
    platform_revision            INTEGER                     NOT NULL,
    mass                         DOUBLE PRECISION            NOT NULL,
    centre_x                     DOUBLE PRECISION            NOT NULL,
    centre_y                     DOUBLE PRECISION            NOT NULL,
    centre_z                     DOUBLE PRECISION            NOT NULL,
    even_keel_draft              DOUBLE PRECISION            NOT NULL,
    km_transverse                DOUBLE PRECISION            NOT NULL,
    km_longitudinal              DOUBLE PRECISION            NOT NULL,
    gm_transverse_solid          DOUBLE PRECISION            NOT NULL,
    gm_transverse_free_surface   DOUBLE PRECISION            NOT NULL,
    gm_transverse                DOUBLE PRECISION            NOT NULL,
    gm_longitudinal_solid        DOUBLE PRECISION            NOT NULL,
    gm_longitudinal_free_surface DOUBLE PRECISION            NOT NULL,
    gm_longitudinal              DOUBLE PRECISION            NOT NULL,
    gm_least                     DOUBLE PRECISION            NOT NULL,
    gm_least_azimuth             DOUBLE PRECISION            NOT NULL,
    estimated_heel               DOUBLE PRECISION,
    estimated_trim               DOUBLE PRECISION,
    draft                        DOUBLE PRECISION            NOT NULL,
    heel_angle                   DOUBLE PRECISION            NOT NULL,
    trim_angle                   DOUBLE PRECISION            NOT NULL,
    displaced_volume             DOUBLE PRECISION            NOT NULL,
    buoyancy_x                   DOUBLE PRECISION            NOT NULL,
    buoyancy_y                   DOUBLE PRECISION            NOT NULL,
    buoyancy_z                   DOUBLE PRECISION            NOT NULL,
    upright                      BOOLEAN                     NOT NULL,
    stable                       BOOLEAN                     NOT NULL,
    document                     TEXT                        NOT NULL,
    UNIQUE (id, platform_id, platform_revision),
    FOREIGN KEY (platform_id, platform_revision) REFERENCES platform_revision (platform_id, revision)
);

-- the latest result of a condition
CREATE INDEX result_of_condition ON result (condition_id, computed_at DESC, recorded_order DESC);

CREATE TABLE result_tank (
    result_id             VARCHAR(36)      NOT NULL,
    ordinal               INTEGER          NOT NULL CHECK (ordinal >= 0),
    platform_id           VARCHAR(200)     NOT NULL,
    platform_revision     INTEGER          NOT NULL,
    tank_id               VARCHAR(200)     NOT NULL,
    level                 DOUBLE PRECISION NOT NULL,
    volume                DOUBLE PRECISION NOT NULL CHECK (volume >= 0),
    mass                  DOUBLE PRECISION NOT NULL CHECK (mass >= 0),
    fraction              DOUBLE PRECISION NOT NULL CHECK (fraction >= 0),
    state                 VARCHAR(12)      NOT NULL CHECK (state IN ('EMPTY', 'SLACK', 'PRESSED_UP')),
    x                     DOUBLE PRECISION NOT NULL,
    y                     DOUBLE PRECISION NOT NULL,
    z                     DOUBLE PRECISION NOT NULL,
    free_surface_moment_t DOUBLE PRECISION NOT NULL,
    free_surface_moment_l DOUBLE PRECISION NOT NULL,
    PRIMARY KEY (result_id, ordinal),
    UNIQUE (result_id, tank_id),
    FOREIGN KEY (result_id, platform_id, platform_revision) REFERENCES result (id, platform_id, platform_revision),
    FOREIGN KEY (platform_id, platform_revision, tank_id) REFERENCES tank (platform_id, revision, id)
);

CREATE TABLE result_mark (
    result_id VARCHAR(36)      NOT NULL REFERENCES result (id),
    mark_id   VARCHAR(200)     NOT NULL,
    reading   DOUBLE PRECISION NOT NULL,
    PRIMARY KEY (result_id, mark_id)
);

-- bound and margin are null where a limit is not defined at the condition's draft
CREATE TABLE result_limit (
    result_id  VARCHAR(36)      NOT NULL REFERENCES result (id),
    ordinal    INTEGER          NOT NULL CHECK (ordinal >= 0),
    limit_name VARCHAR          NOT NULL,
    attained   DOUBLE PRECISION NOT NULL,
    bound      DOUBLE PRECISION,
    margin     DOUBLE PRECISION,
    met        BOOLEAN          NOT NULL,
    PRIMARY KEY (result_id, ordinal),
    CHECK ((bound IS NULL) = (margin IS NULL))
);

CREATE TABLE result_warning (
    result_id VARCHAR(36) NOT NULL REFERENCES result (id),
    ordinal   INTEGER     NOT NULL CHECK (ordinal >= 0),
    sentence  VARCHAR     NOT NULL,
    PRIMARY KEY (result_id, ordinal)
);
