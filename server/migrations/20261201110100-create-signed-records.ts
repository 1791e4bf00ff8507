import type { Migration } from '../migrate';

export async function up({ context: { sequelize, runtimeRole } }: Migration): Promise<void> {
  await sequelize.query(`
    CREATE TABLE signatures (
      id               uuid PRIMARY KEY,
      worksheet_id     uuid NOT NULL,
      revision         integer NOT NULL,
      meaning          text NOT NULL CHECK (meaning IN ('prepared', 'acknowledged', 'countersigned')),
      signer_id        uuid NOT NULL REFERENCES users (id) ON DELETE RESTRICT,
      -- As they stood: a later change of name or role does not rewrite a signature.
      signer_name      text NOT NULL,
      signer_role      text NOT NULL,
      entered_by_id    uuid NOT NULL REFERENCES users (id) ON DELETE RESTRICT,
      content_hash     text NOT NULL,
      edition          text NOT NULL,
      assessment_hash  text NOT NULL,
      strokes          jsonb NOT NULL,
      strokes_hash     text NOT NULL,
      method           text NOT NULL CHECK (method IN ('pin', 'device')),
      device_id        uuid REFERENCES devices (id) ON DELETE RESTRICT,
      device_signature text,
      signed_at        timestamptz(3) NOT NULL,
      received_at      timestamptz(3) NOT NULL,
      FOREIGN KEY (worksheet_id, revision) REFERENCES worksheet_revisions (worksheet_id, revision) ON DELETE RESTRICT,
      CHECK ((method = 'device') = (device_id IS NOT NULL AND device_signature IS NOT NULL)),
      -- Nobody signs twice in one revision, in whatever role.
      UNIQUE (worksheet_id, revision, signer_id)
    );
    -- One lead and one supervisor a revision: of two who countersign at once, one is late.
    CREATE UNIQUE INDEX signatures_once ON signatures (worksheet_id, revision, meaning)
      WHERE meaning IN ('prepared', 'countersigned');
    CREATE INDEX signatures_by_signer ON signatures (signer_id);

    CREATE TABLE proofs (
      id           uuid PRIMARY KEY,
      worksheet_id uuid NOT NULL,
      revision     integer NOT NULL,
      proof        jsonb NOT NULL,
      assessment   jsonb NOT NULL,
      by_id        uuid NOT NULL REFERENCES users (id) ON DELETE RESTRICT,
      by_name      text NOT NULL,
      at           timestamptz(3) NOT NULL,
      FOREIGN KEY (worksheet_id, revision) REFERENCES worksheet_revisions (worksheet_id, revision) ON DELETE RESTRICT
    );
    CREATE INDEX proofs_by_worksheet ON proofs (worksheet_id, at);

    CREATE TABLE close_outs (
      id           uuid PRIMARY KEY,
      worksheet_id uuid NOT NULL UNIQUE,
      revision     integer NOT NULL,
      close_out    jsonb NOT NULL,
      assessment   jsonb NOT NULL,
      by_id        uuid NOT NULL REFERENCES users (id) ON DELETE RESTRICT,
      by_name      text NOT NULL,
      at           timestamptz(3) NOT NULL,
      FOREIGN KEY (worksheet_id, revision) REFERENCES worksheet_revisions (worksheet_id, revision) ON DELETE RESTRICT
    );

    REVOKE UPDATE, DELETE ON signatures, proofs, close_outs FROM ${runtimeRole};
  `);
}

export async function down({ context: { sequelize } }: Migration): Promise<void> {
  await sequelize.query('DROP TABLE close_outs, proofs, signatures');
}
