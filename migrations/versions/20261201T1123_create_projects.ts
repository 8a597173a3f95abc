/** A job being bid. The contact, when named, belongs to the project's client. */
import type { Knex } from "knex";

export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    CREATE TABLE IF NOT EXISTS projects (
      organization_id VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      id VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      name VARCHAR(120) NOT NULL,
      number VARCHAR(40) NOT NULL,
      client_id VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      contact_id VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NULL,
      site_address JSON NOT NULL,
      altitude_m DOUBLE NOT NULL,
      due_at DATETIME(3) NULL,
      due_zone VARCHAR(64) NOT NULL,
      unit_system VARCHAR(20) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      state VARCHAR(20) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      version INT UNSIGNED NOT NULL DEFAULT 1,
      created_at DATETIME(3) NOT NULL,
      PRIMARY KEY (organization_id, id),
      KEY projects_by_due (organization_id, due_at),
      CONSTRAINT projects_state CHECK (state IN ('bidding', 'quoted', 'won', 'lost')),
      CONSTRAINT projects_client FOREIGN KEY (organization_id, client_id)
        REFERENCES clients (organization_id, id),
      CONSTRAINT projects_contact FOREIGN KEY (organization_id, client_id, contact_id)
        REFERENCES client_contacts (organization_id, client_id, id)
    ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci
  `);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw("DROP TABLE IF EXISTS projects");
}
