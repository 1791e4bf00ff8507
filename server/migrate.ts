import { readdirSync } from 'node:fs';
import path from 'node:path';
import { setTimeout as wait } from 'node:timers/promises';
import { QueryTypes, Sequelize } from 'sequelize';
import { Umzug } from 'umzug';
import type { MigrationParams, UmzugStorage } from 'umzug';

export interface MigrationContext {
  sequelize: Sequelize;
  /** Gets rights on rows, never on the schema. Already quoted for SQL. */
  runtimeRole: string;
  ownerUrl: string;
}
export type Migration = MigrationParams<MigrationContext>;

interface MigrationModule {
  up(params: Migration): Promise<void>;
  down(params: Migration): Promise<void>;
}

const FOLDER = path.join(import.meta.dirname, 'migrations');
/** Any number will do, as long as every release uses the same. */
const ADVISORY_LOCK = 7_071_301;
const TURN_MILLISECONDS = 250;
const TURN_TRIES = 480;

/** Names of what ran, in a table made by plain SQL. */
const storage: UmzugStorage<MigrationContext> = {
  async executed({ context }) {
    await context.sequelize.query(
      'CREATE TABLE IF NOT EXISTS schema_migrations (name text PRIMARY KEY, run_at timestamptz NOT NULL DEFAULT now())',
    );
    const rows = await context.sequelize.query<{ name: string }>(
      'SELECT name FROM schema_migrations ORDER BY name',
      { type: QueryTypes.SELECT },
    );
    return rows.map((row) => row.name);
  },
  async logMigration({ name, context }) {
    await context.sequelize.query('INSERT INTO schema_migrations (name) VALUES ($name)', {
      bind: { name },
    });
  },
  async unlogMigration({ name, context }) {
    await context.sequelize.query('DELETE FROM schema_migrations WHERE name = $name', {
      bind: { name },
    });
  },
};

function migrationFiles() {
  return readdirSync(FOLDER)
    .filter((file) => /^\d{14}-.*\.ts$/.test(file))
    .sort()
    .map((file) => {
      const load = async () =>
        (await import(/* @vite-ignore */ path.join(FOLDER, file))) as MigrationModule;
      return {
        name: file.replace(/\.ts$/, ''),
        up: async (params: Migration) => (await load()).up(params),
        down: async (params: Migration) => (await load()).down(params),
      };
    });
}

/**
 * Waits until no other process migrates. It asks again and again: a statement
 * that waits for the lock would hold a snapshot, and an index that another
 * process makes CONCURRENTLY waits for every snapshot to end.
 */
async function takeTurn(sequelize: Sequelize): Promise<void> {
  for (let tries = 0; tries < TURN_TRIES; tries += 1) {
    const [answer] = await sequelize.query<{ mine: boolean }>(
      `SELECT pg_try_advisory_lock(${ADVISORY_LOCK}) AS mine`,
      { type: QueryTypes.SELECT },
    );
    if (answer?.mine === true) return;
    await wait(TURN_MILLISECONDS);
  }
  throw new Error('Another process has been migrating this database for two minutes.');
}

interface MigrateOptions {
  ownerUrl: string;
  runtimeUrl: string;
}

/** Runs `work` with the migrations of one database, while no other process can. */
async function withMigrations<T>(
  { ownerUrl, runtimeUrl }: MigrateOptions,
  work: (umzug: Umzug<MigrationContext>) => Promise<T>,
): Promise<T> {
  // One connection, so that the lock and the timeout hold for everything that runs.
  const sequelize = new Sequelize(ownerUrl, {
    dialect: 'postgres',
    logging: false,
    pool: { max: 1, min: 1, idle: 3_600_000 },
  });
  try {
    await takeTurn(sequelize);
    await sequelize.query(`SET lock_timeout = '5s'`);
    const role = decodeURIComponent(new URL(runtimeUrl).username).replaceAll('"', '""');
    const context = { sequelize, runtimeRole: `"${role}"`, ownerUrl };
    return await work(
      new Umzug({ migrations: migrationFiles(), context, storage, logger: undefined }),
    );
  } finally {
    await sequelize.close();
  }
}

/** Brings the schema up to date; answers the names of what ran. */
export function migrateUp(options: MigrateOptions): Promise<string[]> {
  return withMigrations(options, async (umzug) => (await umzug.up()).map(({ name }) => name));
}

/** Takes back this migration and every later one. Only for a database of a test. */
export function migrateDownTo(options: MigrateOptions, name: string): Promise<string[]> {
  return withMigrations(options, async (umzug) =>
    (await umzug.down({ to: name })).map((migration) => migration.name),
  );
}

/** Takes every migration back. Only for an empty database of a test. */
export function migrateDown(options: MigrateOptions): Promise<string[]> {
  return withMigrations(options, async (umzug) =>
    (await umzug.down({ to: 0 })).map(({ name }) => name),
  );
}
