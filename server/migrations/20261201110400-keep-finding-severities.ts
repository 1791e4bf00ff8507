import type { Migration } from '../migrate';

export async function up({ context: { sequelize } }: Migration): Promise<void> {
  await sequelize.query(`
    -- Code to severity, for the counts: what stands now, and what was met on the way.
    ALTER TABLE worksheets
      ADD COLUMN standing jsonb NOT NULL DEFAULT '{}',
      ADD COLUMN met jsonb NOT NULL DEFAULT '{}';
  `);
}

export async function down({ context: { sequelize } }: Migration): Promise<void> {
  await sequelize.query('ALTER TABLE worksheets DROP COLUMN standing, DROP COLUMN met');
}
