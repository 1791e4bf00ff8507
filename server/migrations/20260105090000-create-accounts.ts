import type { Migration } from '../migrate';

export async function up({ context: { sequelize, runtimeRole } }: Migration): Promise<void> {
  await sequelize.query(`
    GRANT USAGE ON SCHEMA public TO ${runtimeRole};
    -- Every later table and sequence of the owner; append-only ones take rights back themselves.
    ALTER DEFAULT PRIVILEGES IN SCHEMA public
      GRANT SELECT, INSERT, UPDATE, DELETE ON TABLES TO ${runtimeRole};
    ALTER DEFAULT PRIVILEGES IN SCHEMA public GRANT USAGE, SELECT ON SEQUENCES TO ${runtimeRole};

    CREATE TABLE users (
      id                uuid PRIMARY KEY,
      name              text NOT NULL CHECK (name <> ''),
      email             text NOT NULL,
      role              text NOT NULL CHECK (role IN ('lead', 'helper', 'supervisor', 'safety')),
      -- Empty: not a qualified person, so may not cross the limited boundary alone.
      qualified_through date,
      locale            text NOT NULL DEFAULT 'en-US' CHECK (locale IN ('en-US', 'es-MX')),
      units             text NOT NULL DEFAULT 'feet' CHECK (units IN ('feet', 'metric')),
      theme             text NOT NULL DEFAULT 'system'
                        CHECK (theme IN ('system', 'light', 'dark', 'sunlight')),
      -- argon2id; empty until the invitation is used.
      password_hash     text,
      pin_hash          text,
      -- A session carries the epoch of its sign-in; raising it ends every session at once.
      session_epoch     integer NOT NULL DEFAULT 0,
      demo              boolean NOT NULL DEFAULT false,
      invited_at        timestamptz(3),
      retired_at        timestamptz(3),
      created_at        timestamptz(3) NOT NULL,
      updated_at        timestamptz(3) NOT NULL
    );
    -- One account an address, whatever its case.
    CREATE UNIQUE INDEX users_email_key ON users (lower(email));
    CREATE INDEX users_newest ON users (created_at DESC, id DESC);

    CREATE TABLE sites (
      id          uuid PRIMARY KEY,
      name        text NOT NULL CHECK (name <> ''),
      time_zone   text NOT NULL,
      address     text NOT NULL DEFAULT '',
      systems     jsonb NOT NULL DEFAULT '[]',
      panels      jsonb NOT NULL DEFAULT '[]',
      emergency   jsonb NOT NULL DEFAULT '{}',
      desk_to_tell text NOT NULL DEFAULT '',
      retired_at  timestamptz(3),
      created_at  timestamptz(3) NOT NULL,
      updated_at  timestamptz(3) NOT NULL
    );
    CREATE INDEX sites_newest ON sites (created_at DESC, id DESC);

    CREATE TABLE site_members (
      site_id uuid NOT NULL REFERENCES sites (id) ON DELETE RESTRICT,
      user_id uuid NOT NULL REFERENCES users (id) ON DELETE RESTRICT,
      PRIMARY KEY (site_id, user_id)
    );
    CREATE INDEX site_members_by_user ON site_members (user_id);

    CREATE TABLE rubber_goods (
      id              uuid PRIMARY KEY,
      site_id         uuid NOT NULL REFERENCES sites (id) ON DELETE RESTRICT,
      kind            text NOT NULL,
      glove_class     text NOT NULL CHECK (glove_class IN ('00', '0', '1', '2', '3', '4')),
      serial          text NOT NULL CHECK (serial <> ''),
      size            text NOT NULL DEFAULT '',
      issued_on       date,
      retired_at      timestamptz(3),
      retired_because text,
      created_at      timestamptz(3) NOT NULL,
      updated_at      timestamptz(3) NOT NULL
    );
    CREATE INDEX rubber_goods_by_site ON rubber_goods (site_id);
    CREATE INDEX rubber_goods_newest ON rubber_goods (created_at DESC, id DESC);

    CREATE TABLE rubber_goods_tests (
      rubber_goods_id uuid NOT NULL REFERENCES rubber_goods (id) ON DELETE RESTRICT,
      position        integer NOT NULL CHECK (position >= 0),
      tested_on       date NOT NULL,
      passed          boolean NOT NULL,
      laboratory      text,
      PRIMARY KEY (rubber_goods_id, position)
    );

    CREATE TABLE devices (
      id           uuid PRIMARY KEY,
      user_id      uuid NOT NULL REFERENCES users (id) ON DELETE RESTRICT,
      -- JWK of an ECDSA P-256 key; the private half never leaves the device.
      public_key   jsonb NOT NULL,
      label        text NOT NULL,
      created_at   timestamptz(3) NOT NULL,
      last_used_at timestamptz(3),
      revoked_at   timestamptz(3)
    );
    CREATE INDEX devices_by_user ON devices (user_id);

    CREATE TABLE password_resets (
      -- SHA-256 of the token: whoever reads the table cannot use it.
      token_hash text PRIMARY KEY,
      user_id    uuid NOT NULL REFERENCES users (id) ON DELETE RESTRICT,
      kind       text NOT NULL CHECK (kind IN ('reset', 'invitation')),
      expires_at timestamptz(3) NOT NULL,
      used_at    timestamptz(3),
      created_at timestamptz(3) NOT NULL
    );
    CREATE INDEX password_resets_by_user ON password_resets (user_id);
  `);
}

export async function down({ context: { sequelize, runtimeRole } }: Migration): Promise<void> {
  await sequelize.query(`
    DROP TABLE password_resets, devices, rubber_goods_tests, rubber_goods, site_members, sites, users;
    ALTER DEFAULT PRIVILEGES IN SCHEMA public REVOKE ALL ON TABLES FROM ${runtimeRole};
    ALTER DEFAULT PRIVILEGES IN SCHEMA public REVOKE ALL ON SEQUENCES FROM ${runtimeRole};
    REVOKE USAGE ON SCHEMA public FROM ${runtimeRole};
  `);
}
