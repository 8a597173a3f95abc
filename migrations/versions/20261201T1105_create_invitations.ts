/** An open invitation to a company, with a role. */
import type { Knex } from "knex";

export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    CREATE TABLE IF NOT EXISTS invitations (
      organization_id VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      id VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      email VARCHAR(254) NOT NULL,
      role VARCHAR(20) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      token_hash CHAR(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      invited_by VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      created_at DATETIME(3) NOT NULL,
      expires_at DATETIME(3) NOT NULL,
      accepted_at DATETIME(3) NULL,
      revoked_at DATETIME(3) NULL,
      PRIMARY KEY (organization_id, id),
      UNIQUE KEY invitations_token (token_hash),
      CONSTRAINT invitations_role CHECK (role IN ('owner', 'estimator', 'foreman')),
      CONSTRAINT invitations_organization FOREIGN KEY (organization_id) REFERENCES organizations (id),
      CONSTRAINT invitations_person FOREIGN KEY (invited_by) REFERENCES people (id)
    ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci
  `);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw("DROP TABLE IF EXISTS invitations");
}
