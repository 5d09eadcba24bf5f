-- Load plans and what comes of each of their events. Minutes are from the sequence's start.

CREATE TABLE load_plan (
    id                VARCHAR(36)                 NOT NULL PRIMARY KEY,
    platform_id       VARCHAR(200)                NOT NULL,
    platform_revision INTEGER                     NOT NULL,
    name              VARCHAR                     NOT NULL,
    condition_id      VARCHAR(36) REFERENCES condition (id),
    resumed_from      VARCHAR(36) REFERENCES load_plan (id),
    resumed_after     INTEGER CHECK (resumed_after >= 0),
    request           TEXT                        NOT NULL,
    feasible          BOOLEAN                     NOT NULL,
    limits_kept       BOOLEAN                     NOT NULL,
    document          TEXT                        NOT NULL,
    created_at        TIMESTAMP(6) WITH TIME ZONE NOT NULL,
    FOREIGN KEY (platform_id, platform_revision) REFERENCES platform_revision (platform_id, revision),
    CHECK ((resumed_from IS NULL) = (resumed_after IS NULL))
);

-- a platform's load plans, newest first
CREATE INDEX load_plan_of_platform ON load_plan (platform_id, created_at DESC, id DESC);

-- draft, heel, trim and metacentric heights are those after the event, before the ballast plan after it;
-- pumped_mass is that of the ballast plans before and after it
CREATE TABLE load_plan_event (
    load_plan_id    VARCHAR(36)      NOT NULL REFERENCES load_plan (id),
    event_number    INTEGER          NOT NULL CHECK (event_number > 0),
    kind            VARCHAR(20)      NOT NULL,
    subject         VARCHAR,
    start_minute    DOUBLE PRECISION CHECK (start_minute >= 0),
    mass            DOUBLE PRECISION NOT NULL,
    draft           DOUBLE PRECISION NOT NULL,
    heel_angle      DOUBLE PRECISION NOT NULL,
    trim_angle      DOUBLE PRECISION NOT NULL,
    gm_transverse   DOUBLE PRECISION NOT NULL,
    gm_longitudinal DOUBLE PRECISION NOT NULL,
    worst_heel      DOUBLE PRECISION NOT NULL,
    worst_trim      DOUBLE PRECISION NOT NULL,
    worst_gm        DOUBLE PRECISION NOT NULL,
    limits_kept     BOOLEAN          NOT NULL,
    pumped_mass     DOUBLE PRECISION NOT NULL CHECK (pumped_mass >= 0),
    PRIMARY KEY (load_plan_id, event_number)
);
