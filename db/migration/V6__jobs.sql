-- Long computations and what became of them. A run of the service is one start of one instance; it marks itself alive as long as it has
-- jobs that are not finished, so that jobs whose run has fallen silent are known to have nobody who works on them.

CREATE TABLE service_run (
    id         VARCHAR(36)                 NOT NULL PRIMARY KEY,
    started_at TIMESTAMP(6) WITH TIME ZONE NOT NULL,
    alive_at   TIMESTAMP(6) WITH TIME ZONE NOT NULL
);

CREATE TABLE job (
    id                VARCHAR(36)                 NOT NULL PRIMARY KEY,
    kind              VARCHAR(100)                NOT NULL,
    platform_id       VARCHAR(200)                NOT NULL,
    platform_revision INTEGER                     NOT NULL,
    request           TEXT                        NOT NULL,
    owner             VARCHAR(36)                 NOT NULL REFERENCES service_run (id),
    state             VARCHAR(10)                 NOT NULL CHECK (state IN ('QUEUED', 'RUNNING', 'DONE', 'FAILED', 'CANCELLED')),
    fraction          DOUBLE PRECISION            NOT NULL CHECK (fraction BETWEEN 0 AND 1),
    doing             VARCHAR,
    reason            VARCHAR,
    result            TEXT,
    created_at        TIMESTAMP(6) WITH TIME ZONE NOT NULL,
    started_at        TIMESTAMP(6) WITH TIME ZONE,
    finished_at       TIMESTAMP(6) WITH TIME ZONE,
    FOREIGN KEY (platform_id, platform_revision) REFERENCES platform_revision (platform_id, revision),
    CHECK ((reason IS NOT NULL) = (state = 'FAILED')),
    CHECK ((result IS NOT NULL) = (state = 'DONE')),
    CHECK ((finished_at IS NULL) = (state IN ('QUEUED', 'RUNNING')))
);

-- all jobs, newest first
CREATE INDEX job_age ON job (created_at DESC, id DESC);
-- a platform's jobs, newest first
CREATE INDEX job_of_platform ON job (platform_id, created_at DESC, id DESC);
-- the jobs of a run that are not finished
CREATE INDEX job_of_owner ON job (state, owner);
