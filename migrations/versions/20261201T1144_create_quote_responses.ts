/** The client's answer, once for each revision, with what was agreed to and from where. */
import type { Knex } from "knex";

export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    CREATE TABLE IF NOT EXISTS quote_responses (
      organization_id VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      revision_id VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      link_id VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      kind VARCHAR(10) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      name VARCHAR(120) NOT NULL,
      title VARCHAR(200) NOT NULL,
      po_number VARCHAR(60) NOT NULL,
      reason TEXT NOT NULL,
      consent TEXT NOT NULL,
      snapshot_hash CHAR(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      ip VARCHAR(45) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      user_agent VARCHAR(300) NOT NULL,
      at DATETIME(3) NOT NULL,
      PRIMARY KEY (organization_id, revision_id),
      CONSTRAINT quote_responses_kind CHECK (kind IN ('accepted', 'declined')),
      CONSTRAINT quote_responses_revision FOREIGN KEY (organization_id, revision_id)
        REFERENCES quote_revisions (organization_id, id),
      CONSTRAINT quote_responses_link FOREIGN KEY (organization_id, link_id) REFERENCES quote_links (organization_id, id)
    ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci
  `);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw("DROP TABLE IF EXISTS quote_responses");
}
