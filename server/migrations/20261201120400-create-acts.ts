import type { Migration } from '../migrate';

export async function up({ context: { sequelize, runtimeRole } }: Migration): Promise<void> {
  await sequelize.query(`
    CREATE TABLE acts (
      -- Chosen by the client: the key decides whether an act that comes again is the same one.
      id           uuid PRIMARY KEY,
      worksheet_id uuid NOT NULL REFERENCES worksheets (id) ON DELETE RESTRICT,
      act          text NOT NULL,
      actor_id     uuid NOT NULL REFERENCES users (id) ON DELETE RESTRICT,
      at           timestamptz(3) NOT NULL
    );
    REVOKE UPDATE, DELETE ON acts FROM ${runtimeRole};
  `);
}

export async function down({ context: { sequelize } }: Migration): Promise<void> {
  await sequelize.query('DROP TABLE acts');
}
