import { z } from 'zod';
import { MODES } from '@/hazard/enumerations';
import { date, id } from './text';

/** `GET /api/insights`: whole days, both included, of the day a worksheet was made; one site or all. */
export const insightsQuerySchema = z.strictObject({
  from: date.optional(),
  to: date.optional(),
  siteId: id.optional(),
});
export type InsightsQuery = z.infer<typeof insightsQuerySchema>;

const count = z.number().int().nonnegative();
/** `YYYY-MM` on the calendar of the worksheet's site. */
const month = z.string();

/**
 * What comes back, counted in worksheets that the asking person may see. A
 * finding counts once a worksheet, however often it was met. Nobody is counted
 * by name.
 */
export const insightsSchema = z.object({
  /** All worksheets of the span: the denominator of the rates. */
  worksheets: count,
  /** Oldest first; a month without any may be left out. */
  byMonth: z.array(z.object({ month, worksheets: count, energized: count })),
  byVerdict: z.array(z.object({ verdict: z.enum(['stop', 'open', 'ready']), worksheets: count })),
  byMode: z.array(z.object({ mode: z.enum(MODES).nullable(), worksheets: count })),
  /** Most frequent first: stops met before signing or at proof, and what stands now. */
  byFinding: z.array(
    z.object({
      code: z.string(),
      severity: z.enum(['stop', 'open', 'caution']),
      worksheets: count,
      byMonth: z.array(z.object({ month, worksheets: count })),
    }),
  ),
  bySite: z.array(
    z.object({
      siteId: z.string().nullable(),
      siteName: z.string().nullable(),
      worksheets: count,
      /** Worksheets with at least one stop met, now or before it was cleared. */
      withStop: count,
    }),
  ),
  /** `reason`: one of the eight ready ones; everything in own words is `null`. */
  stopsByReason: z.array(z.object({ reason: z.string().nullable(), stops: count })),
  /** Worksheets with a governing reading of 50 V or more at proof. */
  voltageAtProof: count,
  /** Worksheets whose planned end passed before they were closed. */
  notClosedInTime: count,
});
export type Insights = z.infer<typeof insightsSchema>;
