-- Ballast plans of conditions and their moves. Times are minutes from the plan's start.

CREATE TABLE plan (
    id           VARCHAR(36)                 NOT NULL PRIMARY KEY,
    condition_id VARCHAR(36)                 NOT NULL REFERENCES condition (id),
    request      TEXT                        NOT NULL,
    feasible     BOOLEAN                     NOT NULL,
    cost         DOUBLE PRECISION            NOT NULL,
    pumped_mass  DOUBLE PRECISION            NOT NULL CHECK (pumped_mass >= 0),
    document     TEXT                        NOT NULL,
    created_at   TIMESTAMP(6) WITH TIME ZONE NOT NULL
);

-- a condition's plans, newest first
CREATE INDEX plan_of_condition ON plan (condition_id, created_at DESC, id DESC);

-- source and destination are tanks or the sea
CREATE TABLE plan_move (
    plan_id      VARCHAR(36)      NOT NULL REFERENCES plan (id),
    step         INTEGER          NOT NULL CHECK (step > 0),
    source       VARCHAR(200)     NOT NULL,
    destination  VARCHAR(200)     NOT NULL,
    mass         DOUBLE PRECISION NOT NULL CHECK (mass >= 0),
    volume       DOUBLE PRECISION NOT NULL CHECK (volume >= 0),
    pump_id      VARCHAR(200)     NOT NULL,
    start_minute DOUBLE PRECISION NOT NULL CHECK (start_minute >= 0),
    end_minute   DOUBLE PRECISION NOT NULL,
    PRIMARY KEY (plan_id, step),
    CHECK (end_minute >= start_minute),
    CHECK (source <> destination)
);
