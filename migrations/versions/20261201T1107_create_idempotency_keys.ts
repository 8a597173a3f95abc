/** Answers already given to a request that may be sent twice. */
import type { Knex } from "knex";

export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    CREATE TABLE IF NOT EXISTS idempotency_keys (
      organization_id VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      person_id VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      request_key VARCHAR(80) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      endpoint VARCHAR(80) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      request_hash CHAR(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      status SMALLINT UNSIGNED NULL,
      answer JSON NULL,
      created_at DATETIME(3) NOT NULL,
      PRIMARY KEY (organization_id, person_id, request_key),
      KEY idempotency_keys_by_age (created_at),
      CONSTRAINT idempotency_keys_organization FOREIGN KEY (organization_id) REFERENCES organizations (id),
      CONSTRAINT idempotency_keys_person FOREIGN KEY (person_id) REFERENCES people (id)
    ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci
  `);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw("DROP TABLE IF EXISTS idempotency_keys");
}
