/** People at a client. The unique key lets a project name a contact only of its own client. */
import type { Knex } from "knex";

export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    CREATE TABLE IF NOT EXISTS client_contacts (
      organization_id VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      id VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      client_id VARCHAR(30) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      position SMALLINT UNSIGNED NOT NULL,
      name VARCHAR(120) NOT NULL,
      email VARCHAR(254) NOT NULL,
      phone VARCHAR(40) NOT NULL,
      title VARCHAR(200) NOT NULL,
      PRIMARY KEY (organization_id, id),
      UNIQUE KEY client_contacts_of_client (organization_id, client_id, id),
      CONSTRAINT client_contacts_client FOREIGN KEY (organization_id, client_id)
        REFERENCES clients (organization_id, id)
    ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci
  `);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw("DROP TABLE IF EXISTS client_contacts");
}
