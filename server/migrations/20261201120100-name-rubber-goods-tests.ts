import type { Migration } from '../migrate';

export async function up({ context: { sequelize } }: Migration): Promise<void> {
  await sequelize.query(`
    -- A client names the test that it records, so that a repeated request is the same test.
    -- The default is for the release before, which names none.
    ALTER TABLE rubber_goods_tests ADD COLUMN id uuid NOT NULL DEFAULT gen_random_uuid();
    CREATE UNIQUE INDEX rubber_goods_tests_id_key ON rubber_goods_tests (id);
  `);
}

export async function down({ context: { sequelize } }: Migration): Promise<void> {
  await sequelize.query('ALTER TABLE rubber_goods_tests DROP COLUMN id');
}
