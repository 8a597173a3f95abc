/** Links in mail that say who someone is: to confirm an address, to set a new password. */
import type { Knex } from "knex";

export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    CREATE TABLE IF NOT EXISTS email_tokens (
      token_hash CHAR(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL PRIMARY KEY,
      person_id VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      purpose VARCHAR(20) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      created_at DATETIME(3) NOT NULL,
      expires_at DATETIME(3) NOT NULL,
      used_at DATETIME(3) NULL,
      KEY email_tokens_by_person (person_id, purpose),
      KEY email_tokens_by_expiry (expires_at),
      CONSTRAINT email_tokens_purpose CHECK (purpose IN ('verify', 'reset')),
      CONSTRAINT email_tokens_person FOREIGN KEY (person_id) REFERENCES people (id)
    ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci
  `);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw("DROP TABLE IF EXISTS email_tokens");
}
