/** One recipient's private link to one revision. The token itself is only in the mail. */
import type { Knex } from "knex";

export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    CREATE TABLE IF NOT EXISTS quote_links (
      organization_id VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      id VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      quote_id VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      revision_id VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      recipient_name VARCHAR(120) NOT NULL,
      recipient_email VARCHAR(254) NOT NULL,
      token_hash CHAR(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      mail_id VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      created_at DATETIME(3) NOT NULL,
      expires_at DATETIME(3) NOT NULL,
      opened_at DATETIME(3) NULL,
      revoked_at DATETIME(3) NULL,
      PRIMARY KEY (organization_id, id),
      UNIQUE KEY quote_links_token (token_hash),
      KEY quote_links_by_revision (organization_id, revision_id),
      CONSTRAINT quote_links_quote FOREIGN KEY (organization_id, quote_id) REFERENCES quotes (organization_id, id),
      CONSTRAINT quote_links_revision FOREIGN KEY (organization_id, revision_id)
        REFERENCES quote_revisions (organization_id, id)
    ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci
  `);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw("DROP TABLE IF EXISTS quote_links");
}
