import { QueryTypes } from 'sequelize';
import type { Insights, InsightsQuery } from '@/shared/insights';
import { STOP_REASONS } from '@/shared/record';
import type { CurrentUser } from '../currentUser';
import { sequelize } from '../db';
import { expireWorksheets } from './expireWorksheets';

/** The worksheets of the span that this person answers for, with their month at the site. */
const SPAN = `
  WITH span AS (
    SELECT w.*, s.name AS site_name, to_char(day.at, 'YYYY-MM') AS month,
           w.stop_count > 0 OR w.met @? '$.* ? (@ == "stop")' AS with_stop
      FROM worksheets w
      LEFT JOIN sites s ON s.id = w.site_id
     CROSS JOIN LATERAL (SELECT w.created_at AT TIME ZONE coalesce(s.time_zone, 'UTC') AS at) day
     WHERE ($all OR w.site_id = ANY($siteIds::uuid[]))
       AND ($siteId::uuid IS NULL OR w.site_id = $siteId::uuid)
       AND ($from::date IS NULL OR day.at::date >= $from::date)
       AND ($to::date IS NULL OR day.at::date <= $to::date)
  )`;

type Bind = Record<string, unknown>;

function rows<T extends object>(sql: string, bind: Bind): Promise<T[]> {
  return sequelize.query<T>(`${SPAN} ${sql}`, { bind, type: QueryTypes.SELECT });
}

interface FindingRow {
  code: string;
  rank: number;
  month: string;
  worksheets: number;
}

const SEVERITIES = ['stop', 'open', 'caution'] as const;

/** Each code once a worksheet, at the worst in which it was met there. */
async function findingsOf(bind: Bind): Promise<Insights['byFinding']> {
  const found = await rows<FindingRow>(
    `SELECT code, min(rank)::int AS rank, month, count(*)::int AS worksheets
       FROM (SELECT id, month, code, min(array_position(ARRAY['stop', 'open', 'caution'], severity)) - 1 AS rank
               FROM (SELECT id, month, e.key AS code, e.value AS severity FROM span, jsonb_each_text(standing) e
                     UNION ALL
                     SELECT id, month, e.key, e.value FROM span, jsonb_each_text(met) e) each
              GROUP BY id, month, code) once
      GROUP BY code, month ORDER BY code, month`,
    bind,
  );
  const byCode = new Map<string, Insights['byFinding'][number]>();
  for (const { code, rank, month, worksheets } of found) {
    const severity = SEVERITIES[rank] ?? 'caution';
    const entry = byCode.get(code) ?? { code, severity, worksheets: 0, byMonth: [] };
    entry.worksheets += worksheets;
    entry.byMonth.push({ month, worksheets });
    if (SEVERITIES.indexOf(severity) < SEVERITIES.indexOf(entry.severity)) {
      entry.severity = severity;
    }
    byCode.set(code, entry);
  }
  return [...byCode.values()].sort(
    (one, other) => other.worksheets - one.worksheets || (one.code < other.code ? -1 : 1),
  );
}

async function stopsOf(bind: Bind): Promise<Insights['stopsByReason']> {
  const found = await rows<{ reason: string | null; stops: number }>(
    `SELECT reason, count(*)::int AS stops
       FROM (SELECT CASE WHEN e.payload ->> 'reason' = ANY($reasons) THEN e.payload ->> 'reason' END AS reason
               FROM events e JOIN span ON span.id = e.subject_id
              WHERE e.type = 'stopped') each
      GROUP BY reason ORDER BY stops DESC, reason`,
    { ...bind, reasons: [...STOP_REASONS] },
  );
  return found;
}

async function totalsOf(bind: Bind) {
  const [totals] = await rows<Pick<Insights, 'worksheets' | 'voltageAtProof' | 'notClosedInTime'>>(
    `SELECT count(*)::int AS worksheets,
            (count(*) FILTER (WHERE met ? 'absence.voltage-present'))::int AS "voltageAtProof",
            (count(*) FILTER (WHERE EXISTS (
              SELECT 1 FROM events e WHERE e.subject_id = span.id AND e.type = 'expired')))::int
              AS "notClosedInTime"
       FROM span`,
    bind,
  );
  return totals ?? { worksheets: 0, voltageAtProof: 0, notClosedInTime: 0 };
}

/** Counts of what comes back, over the worksheets that this person answers for. People are not counted. */
export async function readInsights(
  { role, siteIds }: CurrentUser,
  { from, to, siteId }: InsightsQuery,
): Promise<Insights> {
  await expireWorksheets();
  const bind: Bind = {
    all: role === 'safety',
    siteIds,
    siteId: siteId ?? null,
    from: from ?? null,
    to: to ?? null,
  };
  return {
    ...(await totalsOf(bind)),
    byMonth: await rows(
      `SELECT month, count(*)::int AS worksheets,
              (count(*) FILTER (WHERE mode = 'energized'))::int AS energized
         FROM span GROUP BY month ORDER BY month`,
      bind,
    ),
    byVerdict: await rows(
      `SELECT verdict, count(*)::int AS worksheets FROM span GROUP BY verdict
        ORDER BY worksheets DESC, verdict`,
      bind,
    ),
    byMode: await rows(
      `SELECT mode, count(*)::int AS worksheets FROM span GROUP BY mode
        ORDER BY worksheets DESC, mode`,
      bind,
    ),
    byFinding: await findingsOf(bind),
    bySite: await rows(
      `SELECT site_id AS "siteId", site_name AS "siteName", count(*)::int AS worksheets,
              (count(*) FILTER (WHERE with_stop))::int AS "withStop"
         FROM span GROUP BY site_id, site_name ORDER BY worksheets DESC, site_name`,
      bind,
    ),
    stopsByReason: await stopsOf(bind),
  };
}
