-- Readings of tanks, in the batches in which they came. One figure is read, the others follow from it and the tank's calibration
-- of the revision named; "given" tells which.

CREATE TABLE sounding_batch (
    id                VARCHAR(36)                 NOT NULL PRIMARY KEY,
    platform_id       VARCHAR(200)                NOT NULL,
    platform_revision INTEGER                     NOT NULL,
    recorded_at       TIMESTAMP(6) WITH TIME ZONE NOT NULL,
    UNIQUE (id, platform_id, platform_revision),
    FOREIGN KEY (platform_id, platform_revision) REFERENCES platform_revision (platform_id, revision)
);

CREATE TABLE sounding (
    recorded_order    BIGINT GENERATED ALWAYS AS IDENTITY PRIMARY KEY,
    batch_id          VARCHAR(36)                 NOT NULL,
    platform_id       VARCHAR(200)                NOT NULL,
    platform_revision INTEGER                     NOT NULL,
    tank_id           VARCHAR(200)                NOT NULL,
    taken_at          TIMESTAMP(6) WITH TIME ZONE NOT NULL,
    given             VARCHAR(10)                 NOT NULL CHECK (given IN ('LEVEL', 'VOLUME', 'MASS', 'FRACTION')),
    level             DOUBLE PRECISION            NOT NULL,
    volume            DOUBLE PRECISION            NOT NULL CHECK (volume >= 0),
    mass              DOUBLE PRECISION            NOT NULL CHECK (mass >= 0),
    fraction          DOUBLE PRECISION            NOT NULL CHECK (fraction >= 0),
    density           DOUBLE PRECISION            NOT NULL CHECK (density > 0),
    source            VARCHAR                     NOT NULL,
    FOREIGN KEY (batch_id, platform_id, platform_revision) REFERENCES sounding_batch (id, platform_id, platform_revision),
    FOREIGN KEY (platform_id, platform_revision, tank_id) REFERENCES tank (platform_id, revision, id)
);

-- the latest reading of a tank and the history of one tank
CREATE INDEX sounding_of_tank ON sounding (platform_id, tank_id, taken_at DESC, recorded_order DESC);
-- the history of all tanks of a platform
CREATE INDEX sounding_of_platform ON sounding (platform_id, taken_at DESC, recorded_order DESC);
