/** Mail that must go out: written with the change that causes it, sent after commit, kept when it cannot be sent. */
import type { Knex } from "knex";

export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    CREATE TABLE IF NOT EXISTS outbox (
      id VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NOT NULL PRIMARY KEY,
      organization_id VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NULL,
      unique_key VARCHAR(190) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      message JSON NOT NULL,
      recipient VARCHAR(254) NOT NULL,
      subject VARCHAR(300) NOT NULL,
      state VARCHAR(10) CHARACTER SET ascii COLLATE ascii_bin NOT NULL DEFAULT 'queued',
      attempts INT UNSIGNED NOT NULL DEFAULT 0,
      next_attempt_at DATETIME(3) NOT NULL,
      leased_until DATETIME(3) NULL,
      last_error VARCHAR(500) NULL,
      created_at DATETIME(3) NOT NULL,
      sent_at DATETIME(3) NULL,
      UNIQUE KEY outbox_key (unique_key),
      KEY outbox_due (state, next_attempt_at),
      KEY outbox_by_organization (organization_id, id),
      CONSTRAINT outbox_state CHECK (state IN ('queued', 'sent', 'refused', 'dead')),
      CONSTRAINT outbox_organization FOREIGN KEY (organization_id) REFERENCES organizations (id)
    ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci
  `);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw("DROP TABLE IF EXISTS outbox");
}
