import type { Migration } from '../migrate';

export async function up({ context: { sequelize } }: Migration): Promise<void> {
  await sequelize.query(`
    -- Doubles of before stay as they are written, since nobody but the office can say which
    -- one is wrong; all but one are set aside, so that the index can be made, until they are corrected.
    ALTER TABLE rubber_goods ADD COLUMN serial_repeats boolean NOT NULL DEFAULT false;
    UPDATE rubber_goods SET serial_repeats = true
      FROM (SELECT id, row_number() OVER (
                     PARTITION BY site_id, lower(btrim(serial))
                     ORDER BY retired_at IS NOT NULL, created_at, id) AS place
              FROM rubber_goods) AS ranked
     WHERE ranked.id = rubber_goods.id AND ranked.place > 1;
    CREATE UNIQUE INDEX rubber_goods_serial_key ON rubber_goods (site_id, lower(btrim(serial)))
      WHERE NOT serial_repeats;
  `);
}

export async function down({ context: { sequelize } }: Migration): Promise<void> {
  await sequelize.query('ALTER TABLE rubber_goods DROP COLUMN serial_repeats');
}
