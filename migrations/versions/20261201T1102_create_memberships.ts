/** Who belongs to which company, and as what. */
import type { Knex } from "knex";

export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    CREATE TABLE IF NOT EXISTS memberships (
      organization_id VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      person_id VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      role VARCHAR(20) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      joined_at DATETIME(3) NOT NULL,
      last_seen_at DATETIME(3) NULL,
      PRIMARY KEY (organization_id, person_id),
      KEY memberships_by_person (person_id),
      CONSTRAINT memberships_role CHECK (role IN ('owner', 'estimator', 'foreman')),
      CONSTRAINT memberships_organization FOREIGN KEY (organization_id) REFERENCES organizations (id),
      CONSTRAINT memberships_person FOREIGN KEY (person_id) REFERENCES people (id)
    ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci
  `);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw("DROP TABLE IF EXISTS memberships");
}
