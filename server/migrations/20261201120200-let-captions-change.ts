import type { Migration } from '../migrate';

const IS_SIGNED = `
           (OLD.section <> 'closeOut' AND EXISTS (SELECT 1 FROM signatures
                 WHERE worksheet_id = OLD.worksheet_id AND revision >= OLD.revision))
           OR (OLD.section = 'closeOut' AND EXISTS (SELECT 1 FROM close_outs
                 WHERE worksheet_id = OLD.worksheet_id))`;

export async function up({ context: { sequelize, runtimeRole } }: Migration): Promise<void> {
  await sequelize.query(`
    -- Until somebody signs, the words under a photo may be put right; nothing else of it ever changes.
    CREATE OR REPLACE FUNCTION refuse_change_of_signed_attachment() RETURNS trigger LANGUAGE plpgsql AS $function$
      BEGIN
        IF ${IS_SIGNED} THEN
          RAISE EXCEPTION 'A signed photo is never changed' USING ERRCODE = 'restrict_violation';
        END IF;
        IF TG_OP = 'DELETE' THEN RETURN OLD; END IF;
        IF to_jsonb(NEW) - 'caption' <> to_jsonb(OLD) - 'caption' THEN
          RAISE EXCEPTION 'Only the caption of a photo changes' USING ERRCODE = 'restrict_violation';
        END IF;
        RETURN NEW;
      END
    $function$;
    GRANT UPDATE (caption) ON attachments TO ${runtimeRole};
  `);
}

export async function down({ context: { sequelize, runtimeRole } }: Migration): Promise<void> {
  await sequelize.query(`
    REVOKE UPDATE (caption) ON attachments FROM ${runtimeRole};
    CREATE OR REPLACE FUNCTION refuse_change_of_signed_attachment() RETURNS trigger LANGUAGE plpgsql AS $function$
      BEGIN
        IF TG_OP = 'UPDATE' OR ${IS_SIGNED} THEN
          RAISE EXCEPTION 'A signed photo is never changed' USING ERRCODE = 'restrict_violation';
        END IF;
        RETURN OLD;
      END
    $function$;
  `);
}
