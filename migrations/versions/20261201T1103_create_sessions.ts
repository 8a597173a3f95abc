/** A signed-in browser. The id is the SHA-256 of what the cookie holds. */
import type { Knex } from "knex";

export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    CREATE TABLE IF NOT EXISTS sessions (
      id CHAR(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL PRIMARY KEY,
      person_id VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      expires_at DATETIME(3) NOT NULL,
      created_at DATETIME(3) NOT NULL,
      ip VARCHAR(45) CHARACTER SET ascii COLLATE ascii_bin NULL,
      user_agent VARCHAR(300) NULL,
      KEY sessions_by_person (person_id),
      KEY sessions_by_expiry (expires_at),
      CONSTRAINT sessions_person FOREIGN KEY (person_id) REFERENCES people (id)
    ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci
  `);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw("DROP TABLE IF EXISTS sessions");
}
