import type { Migration } from '../migrate';

const INDEX = 'worksheet_revisions_by_rubber_goods';

export async function up({ context: { sequelize } }: Migration): Promise<void> {
  // It waits for every transaction that is under way, however long that takes.
  await sequelize.query('SET lock_timeout = 0');
  // An attempt that was cut off leaves an index behind that is of no use.
  await sequelize.query(`DROP INDEX CONCURRENTLY IF EXISTS ${INDEX}`);
  await sequelize.query(`
    CREATE INDEX CONCURRENTLY ${INDEX}
      ON worksheet_revisions ((content #>> '{protectiveEquipment,rubberGoodsId}'))
      WHERE content #>> '{protectiveEquipment,rubberGoodsId}' IS NOT NULL
  `);
  await sequelize.query(`SET lock_timeout = '5s'`);
}

export async function down({ context: { sequelize } }: Migration): Promise<void> {
  await sequelize.query(`DROP INDEX ${INDEX}`);
}
