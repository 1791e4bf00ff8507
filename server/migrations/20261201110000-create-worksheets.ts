import type { Migration } from '../migrate';

export async function up({ context: { sequelize, runtimeRole } }: Migration): Promise<void> {
  await sequelize.query(`
    CREATE EXTENSION IF NOT EXISTS unaccent WITH SCHEMA public;

    -- unaccent() is only STABLE, and a generated column wants IMMUTABLE: its
    -- dictionary never changes here. Punctuation becomes a space, or
    -- "2026-000123" and "LP-2/14" would be kept as signed numbers and paths.
    CREATE FUNCTION search_text(input text) RETURNS text
      LANGUAGE sql IMMUTABLE STRICT PARALLEL SAFE
      AS $function$
        SELECT lower(regexp_replace(
          public.unaccent('public.unaccent'::regdictionary, input),
          '[!-/:-@\\[-\`{-~\\s]+', ' ', 'g'))
      $function$;

    -- Every word is a prefix: "drivers 2026" finds what starts with both.
    CREATE FUNCTION search_query(input text) RETURNS tsquery
      LANGUAGE sql STABLE STRICT PARALLEL SAFE
      AS $function$
        SELECT to_tsquery('pg_catalog.simple', coalesce(
          (SELECT string_agg('''' || word || ''':*', ' & ')
             FROM regexp_split_to_table(trim(public.search_text(input)), ' +') AS word
            WHERE word <> ''), ''))
      $function$;

    -- One row a year, locked while a number is given out: no gaps, no doubles.
    CREATE TABLE worksheet_numbers (
      year integer PRIMARY KEY,
      last integer NOT NULL CHECK (last > 0)
    );

    CREATE TABLE worksheets (
      id              uuid PRIMARY KEY,
      number          text NOT NULL UNIQUE CHECK (number ~ '^[0-9]{4}-[0-9]{6,}$'),
      state           text NOT NULL DEFAULT 'draft' CHECK (state IN (
        'draft', 'briefing', 'countersign', 'in-force', 'returned', 'stopped', 'expired', 'void', 'closed')),
      proved          boolean NOT NULL DEFAULT false,
      revision        integer NOT NULL DEFAULT 1 CHECK (revision >= 1),
      -- Counts the saves of the content: what If-Match names.
      version         integer NOT NULL DEFAULT 1 CHECK (version >= 1),
      lead_id         uuid NOT NULL REFERENCES users (id) ON DELETE RESTRICT,
      created_by_id   uuid NOT NULL REFERENCES users (id) ON DELETE RESTRICT,
      -- Whoever wrote any of it never countersigns it.
      author_ids      uuid[] NOT NULL DEFAULT '{}',
      -- The crew of the current revision, and of every signed one: who may see it.
      crew_ids        uuid[] NOT NULL DEFAULT '{}',
      signed_crew_ids uuid[] NOT NULL DEFAULT '{}',
      site_id         uuid REFERENCES sites (id) ON DELETE RESTRICT,
      starts_at       timestamptz(3),
      ends_at         timestamptz(3),
      mode            text,
      task            text,
      system          text,
      circuit_volts   double precision,
      area            text NOT NULL DEFAULT '',
      equipment       text NOT NULL DEFAULT '',
      verdict         text NOT NULL DEFAULT 'open' CHECK (verdict IN ('stop', 'open', 'ready')),
      stop_count      integer NOT NULL DEFAULT 0,
      open_count      integer NOT NULL DEFAULT 0,
      caution_count   integer NOT NULL DEFAULT 0,
      -- Codes of the assessment as it stands, and of every stop met on the way.
      finding_codes   text[] NOT NULL DEFAULT '{}',
      met_codes       text[] NOT NULL DEFAULT '{}',
      reason          text,
      reason_by_id    uuid REFERENCES users (id) ON DELETE RESTRICT,
      reason_at       timestamptz(3),
      search_document text NOT NULL DEFAULT '',
      search          tsvector GENERATED ALWAYS AS
        (to_tsvector('pg_catalog.simple', public.search_text(search_document))) STORED,
      created_at      timestamptz(3) NOT NULL,
      updated_at      timestamptz(3) NOT NULL
    );
    CREATE INDEX worksheets_newest ON worksheets (created_at DESC, id DESC);
    CREATE INDEX worksheets_by_lead ON worksheets (lead_id, created_at DESC, id DESC);
    CREATE INDEX worksheets_by_site ON worksheets (site_id, created_at DESC, id DESC);
    CREATE INDEX worksheets_by_state ON worksheets (state, created_at DESC, id DESC);
    CREATE INDEX worksheets_search ON worksheets USING gin (search);
    CREATE INDEX worksheets_crew ON worksheets USING gin (crew_ids);
    CREATE INDEX worksheets_signed_crew ON worksheets USING gin (signed_crew_ids);
    CREATE INDEX worksheets_findings ON worksheets USING gin (finding_codes);
    CREATE INDEX worksheets_met ON worksheets USING gin (met_codes);
    -- The clock looks for these every minute.
    CREATE INDEX worksheets_to_expire ON worksheets (ends_at)
      WHERE state IN ('briefing', 'countersign', 'in-force');

    CREATE TABLE worksheet_revisions (
      worksheet_id  uuid NOT NULL REFERENCES worksheets (id) ON DELETE RESTRICT,
      revision      integer NOT NULL CHECK (revision >= 1),
      content       jsonb NOT NULL,
      content_hash  text NOT NULL CHECK (content_hash ~ '^[0-9a-f]{64}$'),
      edition       text NOT NULL,
      -- As it stood when the lead signed; null before.
      assessment    jsonb,
      -- Every stop that a saved assessment of this revision has held.
      stops_seen    jsonb NOT NULL DEFAULT '[]',
      created_by_id uuid NOT NULL REFERENCES users (id) ON DELETE RESTRICT,
      created_at    timestamptz(3) NOT NULL,
      updated_at    timestamptz(3) NOT NULL,
      PRIMARY KEY (worksheet_id, revision)
    );
    CREATE INDEX worksheet_revisions_by_hash ON worksheet_revisions (content_hash);

    CREATE TABLE questions (
      id             uuid PRIMARY KEY,
      worksheet_id   uuid NOT NULL REFERENCES worksheets (id) ON DELETE RESTRICT,
      revision       integer NOT NULL,
      text           text NOT NULL,
      asked_by_id    uuid NOT NULL REFERENCES users (id) ON DELETE RESTRICT,
      asked_at       timestamptz(3) NOT NULL,
      answer_id      uuid UNIQUE,
      answer         text,
      answered_by_id uuid REFERENCES users (id) ON DELETE RESTRICT,
      answered_at    timestamptz(3),
      CHECK ((answer IS NULL) = (answered_at IS NULL) AND (answer IS NULL) = (answered_by_id IS NULL))
    );
    CREATE INDEX questions_by_worksheet ON questions (worksheet_id, asked_at);

    CREATE TABLE attachments (
      id               uuid PRIMARY KEY,
      worksheet_id     uuid NOT NULL REFERENCES worksheets (id) ON DELETE RESTRICT,
      -- The revision it came with; later revisions keep it.
      revision         integer NOT NULL,
      section          text NOT NULL,
      caption          text NOT NULL,
      type             text NOT NULL CHECK (type IN ('image/jpeg', 'image/png', 'image/webp')),
      byte_count       integer NOT NULL CHECK (byte_count > 0),
      sha256           text NOT NULL CHECK (sha256 ~ '^[0-9a-f]{64}$'),
      -- Of the bytes as they arrived: tells a repeat from another file under the same id.
      received_sha256  text NOT NULL,
      created_by_id    uuid NOT NULL REFERENCES users (id) ON DELETE RESTRICT,
      created_at       timestamptz(3) NOT NULL
    );
    CREATE INDEX attachments_by_worksheet ON attachments (worksheet_id, id);

    -- The default of this schema gives every right on rows: taken back where it is too much.
    REVOKE DELETE ON worksheets, worksheet_revisions, worksheet_numbers, questions FROM ${runtimeRole};
    REVOKE UPDATE ON attachments FROM ${runtimeRole};
  `);
}

export async function down({ context: { sequelize } }: Migration): Promise<void> {
  await sequelize.query(`
    DROP TABLE attachments, questions, worksheet_revisions, worksheets, worksheet_numbers;
    DROP FUNCTION search_query(text);
    DROP FUNCTION search_text(text);
  `);
}
