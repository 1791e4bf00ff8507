import type { Migration } from '../migrate';

const APPEND_ONLY = ['events', 'seals', 'signatures', 'proofs', 'close_outs'];

export async function up({ context: { sequelize } }: Migration): Promise<void> {
  await sequelize.query(`
    CREATE FUNCTION refuse_change() RETURNS trigger LANGUAGE plpgsql AS $function$
      BEGIN
        RAISE EXCEPTION 'Rows of % are never changed', TG_TABLE_NAME USING ERRCODE = 'restrict_violation';
      END
    $function$;

    CREATE FUNCTION refuse_change_of_signed_revision() RETURNS trigger LANGUAGE plpgsql AS $function$
      BEGIN
        IF EXISTS (SELECT 1 FROM signatures
                    WHERE worksheet_id = OLD.worksheet_id AND revision = OLD.revision) THEN
          RAISE EXCEPTION 'A signed revision is never changed' USING ERRCODE = 'restrict_violation';
        END IF;
        IF TG_OP = 'DELETE' THEN RETURN OLD; END IF;
        RETURN NEW;
      END
    $function$;

    -- A photo goes with the revisions that hold it; one of the close-out with the close-out.
    CREATE FUNCTION refuse_change_of_signed_attachment() RETURNS trigger LANGUAGE plpgsql AS $function$
      BEGIN
        IF TG_OP = 'UPDATE'
           OR (OLD.section <> 'closeOut' AND EXISTS (SELECT 1 FROM signatures
                 WHERE worksheet_id = OLD.worksheet_id AND revision >= OLD.revision))
           OR (OLD.section = 'closeOut' AND EXISTS (SELECT 1 FROM close_outs
                 WHERE worksheet_id = OLD.worksheet_id)) THEN
          RAISE EXCEPTION 'A signed photo is never changed' USING ERRCODE = 'restrict_violation';
        END IF;
        RETURN OLD;
      END
    $function$;

    CREATE TRIGGER attachments_signed BEFORE UPDATE OR DELETE ON attachments
      FOR EACH ROW EXECUTE FUNCTION refuse_change_of_signed_attachment();
    CREATE TRIGGER attachments_truncate BEFORE TRUNCATE ON attachments
      FOR EACH STATEMENT EXECUTE FUNCTION refuse_change();
    CREATE TRIGGER worksheet_revisions_signed BEFORE UPDATE OR DELETE ON worksheet_revisions
      FOR EACH ROW EXECUTE FUNCTION refuse_change_of_signed_revision();
    -- Row triggers do not see TRUNCATE.
    CREATE TRIGGER worksheet_revisions_truncate BEFORE TRUNCATE ON worksheet_revisions
      FOR EACH STATEMENT EXECUTE FUNCTION refuse_change();
  `);
  for (const table of APPEND_ONLY) {
    await sequelize.query(`
      CREATE TRIGGER ${table}_unchanged BEFORE UPDATE OR DELETE ON ${table}
        FOR EACH ROW EXECUTE FUNCTION refuse_change();
      CREATE TRIGGER ${table}_truncate BEFORE TRUNCATE ON ${table}
        FOR EACH STATEMENT EXECUTE FUNCTION refuse_change();
    `);
  }
}

export async function down({ context: { sequelize } }: Migration): Promise<void> {
  for (const table of APPEND_ONLY) {
    await sequelize.query(`
      DROP TRIGGER ${table}_unchanged ON ${table};
      DROP TRIGGER ${table}_truncate ON ${table};
    `);
  }
  await sequelize.query(`
    DROP TRIGGER attachments_signed ON attachments;
    DROP TRIGGER attachments_truncate ON attachments;
    DROP TRIGGER worksheet_revisions_signed ON worksheet_revisions;
    DROP TRIGGER worksheet_revisions_truncate ON worksheet_revisions;
    DROP FUNCTION refuse_change_of_signed_attachment();
    DROP FUNCTION refuse_change_of_signed_revision();
    DROP FUNCTION refuse_change();
  `);
}
