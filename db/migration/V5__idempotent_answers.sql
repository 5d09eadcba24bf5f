-- The first answer to a request that carried an idempotency key. A key is claimed by inserting its row; the answer's columns are
-- filled before the same transaction commits, so no other transaction ever sees a row without an answer.

CREATE TABLE idempotent_answer (
    idempotency_key VARCHAR(255)                NOT NULL PRIMARY KEY,
    method          VARCHAR(10)                 NOT NULL,
    path            VARCHAR                     NOT NULL,
    body_sha256     CHAR(64)                    NOT NULL,
    created_at      TIMESTAMP(6) WITH TIME ZONE NOT NULL,
    status          INTEGER CHECK (status BETWEEN 100 AND 599),
    location        VARCHAR,
    etag            VARCHAR,
    content_type    VARCHAR(200),
    body            TEXT
);

-- for forgetting old answers
CREATE INDEX idempotent_answer_age ON idempotent_answer (created_at);
