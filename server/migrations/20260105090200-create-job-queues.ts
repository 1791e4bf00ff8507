import PgBoss from 'pg-boss';
import type { Migration } from '../migrate';

const QUEUES = ['mail', 'expire-worksheets', 'nightly'];

export async function up({
  context: { sequelize, runtimeRole, ownerUrl },
}: Migration): Promise<void> {
  // The library makes its own tables; a queue is a table as well, so only the owner can make one.
  const boss = new PgBoss({
    connectionString: ownerUrl,
    supervise: false,
    schedule: false,
    max: 1,
  });
  await boss.start();
  for (const queue of QUEUES) await boss.createQueue(queue);
  await boss.stop({ graceful: false, wait: true });
  await sequelize.query(`
    GRANT USAGE ON SCHEMA pgboss TO ${runtimeRole};
    GRANT SELECT, INSERT, UPDATE, DELETE ON ALL TABLES IN SCHEMA pgboss TO ${runtimeRole};
    GRANT USAGE, SELECT ON ALL SEQUENCES IN SCHEMA pgboss TO ${runtimeRole};
    GRANT EXECUTE ON ALL FUNCTIONS IN SCHEMA pgboss TO ${runtimeRole};
  `);
}

export async function down({ context: { sequelize } }: Migration): Promise<void> {
  await sequelize.query('DROP SCHEMA pgboss CASCADE');
}
