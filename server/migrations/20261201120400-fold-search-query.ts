import type { Migration } from '../migrate';

export async function up({ context: { sequelize } }: Migration): Promise<void> {
  // What it answers depends on its text alone. Said so, it is worked out once before the
  // plan is made, and the planner sees how few rows a selective search finds.
  await sequelize.query('ALTER FUNCTION search_query(text) IMMUTABLE');
}

export async function down({ context: { sequelize } }: Migration): Promise<void> {
  await sequelize.query('ALTER FUNCTION search_query(text) STABLE');
}
