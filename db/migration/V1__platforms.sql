-- Platforms, their immutable numbered revisions, and each revision's tanks and calibration tables as rows.
-- Lengths in m, volumes in m³, masses in t, densities in t/m³, second moments in m⁴, angles in degrees, times in UTC.

CREATE TABLE platform (
    id               VARCHAR(200) NOT NULL PRIMARY KEY,
    current_revision INTEGER      NOT NULL CHECK (current_revision >= 0)
);

CREATE TABLE platform_revision (
    platform_id VARCHAR(200)                NOT NULL REFERENCES platform (id),
    revision    INTEGER                     NOT NULL CHECK (revision > 0),
    name        VARCHAR                     NOT NULL,
    tank_count  INTEGER                     NOT NULL CHECK (tank_count >= 0),
    document    TEXT                        NOT NULL,
    created_at  TIMESTAMP(6) WITH TIME ZONE NOT NULL,
    PRIMARY KEY (platform_id, revision)
);

CREATE TABLE tank (
    platform_id             VARCHAR(200)     NOT NULL,
    revision                INTEGER          NOT NULL,
    id                      VARCHAR(200)     NOT NULL,
    ordinal                 INTEGER          NOT NULL CHECK (ordinal >= 0),
    name                    VARCHAR          NOT NULL,
    purpose                 VARCHAR(20)      NOT NULL CHECK (purpose IN
        ('BALLAST', 'FUEL', 'DRILL_WATER', 'FRESH_WATER', 'MUD', 'BRINE', 'OTHER', 'VOID')),
    density                 DOUBLE PRECISION NOT NULL CHECK (density > 0),
    permeability            DOUBLE PRECISION NOT NULL CHECK (permeability > 0 AND permeability <= 1),
    pressed_up_fraction     DOUBLE PRECISION NOT NULL CHECK (pressed_up_fraction BETWEEN 0 AND 1),
    least_pumpable_fraction DOUBLE PRECISION NOT NULL CHECK (least_pumpable_fraction BETWEEN 0 AND 1),
    greatest_fraction       DOUBLE PRECISION NOT NULL CHECK (greatest_fraction BETWEEN 0 AND 1),
    locked                  BOOLEAN          NOT NULL,
    PRIMARY KEY (platform_id, revision, id),
    UNIQUE (platform_id, revision, ordinal),
    FOREIGN KEY (platform_id, revision) REFERENCES platform_revision (platform_id, revision)
);

CREATE TABLE tank_table_row (
    platform_id VARCHAR(200)     NOT NULL,
    revision    INTEGER          NOT NULL,
    tank_id     VARCHAR(200)     NOT NULL,
    ordinal     INTEGER          NOT NULL CHECK (ordinal >= 0),
    level       DOUBLE PRECISION NOT NULL,
    volume      DOUBLE PRECISION NOT NULL CHECK (volume >= 0),
    x           DOUBLE PRECISION NOT NULL,
    y           DOUBLE PRECISION NOT NULL,
    z           DOUBLE PRECISION NOT NULL,
    inertia_t   DOUBLE PRECISION NOT NULL CHECK (inertia_t >= 0),
    inertia_l   DOUBLE PRECISION NOT NULL CHECK (inertia_l >= 0),
    inertia_tl  DOUBLE PRECISION NOT NULL,
    PRIMARY KEY (platform_id, revision, tank_id, ordinal),
    FOREIGN KEY (platform_id, revision, tank_id) REFERENCES tank (platform_id, revision, id)
);
