import type { Migration } from '../migrate';

export async function up({ context: { sequelize } }: Migration): Promise<void> {
  await sequelize.query(`
    -- The shape that connect-pg-simple reads and writes.
    CREATE TABLE session (
      sid    varchar PRIMARY KEY,
      sess   json NOT NULL,
      expire timestamptz(6) NOT NULL
    );
    CREATE INDEX session_by_expire ON session (expire);
    -- The sessions of one person: to list and to end them.
    CREATE INDEX session_by_user ON session ((sess -> 'passport' ->> 'user'));

    -- The shape that rate-limiter-flexible reads and writes.
    CREATE TABLE rate_limits (
      key    varchar(255) PRIMARY KEY,
      points integer NOT NULL DEFAULT 0,
      expire bigint
    );
  `);
}

export async function down({ context: { sequelize } }: Migration): Promise<void> {
  await sequelize.query('DROP TABLE rate_limits, session');
}
