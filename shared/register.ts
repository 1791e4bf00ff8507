import { z } from 'zod';
import { GLOVE_CLASSES, SYSTEMS } from '@/hazard/enumerations';
import { date, id, requiredText, text } from './text';

/** A panel with the circuits as found on the box cover. */
const panel = z.strictObject({
  name: requiredText(),
  system: z.enum(SYSTEMS).optional(),
  circuits: z.array(text()).max(200).optional(),
});
export type Panel = z.infer<typeof panel>;

const timeZone = text(64).refine(
  (zone) => {
    try {
      return new Intl.DateTimeFormat('en-US', { timeZone: zone }) !== undefined;
    } catch {
      return false;
    }
  },
  { error: 'unknown time zone', params: { code: 'time-zone' } },
);

export const siteInputSchema = z.strictObject({
  id: id.optional(),
  name: requiredText(),
  timeZone,
  address: text().optional(),
  systems: z.array(z.enum(SYSTEMS)).max(10).optional(),
  panels: z.array(panel).max(200).optional(),
  emergency: z
    .strictObject({
      contact: text().optional(),
      rescue: text().optional(),
      firstAid: text().optional(),
      aedAt: text().optional(),
    })
    .optional(),
  /** Who runs the building and is told about emergency lighting out of service. */
  deskToTell: text().optional(),
  memberIds: z.array(id).max(1000).optional(),
});
export const siteUpdateSchema = siteInputSchema
  .omit({ id: true })
  .partial()
  .extend({ retired: z.boolean().optional() });

export const siteSchema = z.object({
  id: z.string(),
  name: z.string(),
  timeZone: z.string(),
  address: z.string(),
  systems: z.array(z.enum(SYSTEMS)),
  panels: z.array(
    z.object({
      name: z.string(),
      system: z.enum(SYSTEMS).optional(),
      circuits: z.array(z.string()).optional(),
    }),
  ),
  emergency: z.object({
    contact: z.string().optional(),
    rescue: z.string().optional(),
    firstAid: z.string().optional(),
    aedAt: z.string().optional(),
  }),
  deskToTell: z.string(),
  memberIds: z.array(z.string()).optional(),
  retired: z.boolean(),
});
export type Site = z.infer<typeof siteSchema>;

export const RUBBER_GOODS_KINDS = ['gloves', 'sleeves', 'blanket', 'line hose', 'cover'] as const;
export type RubberGoodsKind = (typeof RUBBER_GOODS_KINDS)[number];

export const RETIRED_BECAUSE = ['failed test', 'damaged', 'worn out', 'lost'] as const;

const rubberGoodsTest = z.strictObject({
  testedOn: date,
  passed: z.boolean(),
  laboratory: text().optional(),
});
/** One more test of an item. One that failed retires the item. */
export const rubberGoodsTestInputSchema = rubberGoodsTest.extend({ id: id.optional() });

export const rubberGoodsInputSchema = z.strictObject({
  id: id.optional(),
  siteId: id,
  kind: z.enum(RUBBER_GOODS_KINDS),
  gloveClass: z.enum(GLOVE_CLASSES),
  serial: requiredText(),
  size: text().optional(),
  issuedOn: date.nullable().optional(),
  tests: z.array(rubberGoodsTest).min(1).max(200),
});
export const rubberGoodsUpdateSchema = rubberGoodsInputSchema
  .omit({ id: true })
  .partial()
  .extend({
    retired: z.boolean().optional(),
    retiredBecause: z.enum(RETIRED_BECAUSE).optional(),
  });

export const rubberGoodsSchema = z.object({
  id: z.string(),
  siteId: z.string(),
  kind: z.enum(RUBBER_GOODS_KINDS),
  gloveClass: z.enum(GLOVE_CLASSES),
  serial: z.string(),
  size: z.string(),
  issuedOn: z.string().nullable(),
  tests: z.array(
    z.object({ testedOn: z.string(), passed: z.boolean(), laboratory: z.string().optional() }),
  ),
  /** Of the latest test that was passed. */
  lastTestedOn: z.string(),
  dueOn: z.string(),
  inTest: z.boolean(),
  retired: z.boolean(),
  retiredBecause: z.enum(RETIRED_BECAUSE).nullable(),
});
export type RubberGoods = z.infer<typeof rubberGoodsSchema>;
