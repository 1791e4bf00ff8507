import { QueryTypes } from 'sequelize';
import type { WorksheetContent } from '@/shared/worksheet';
import { clock } from '../clock';
import { sequelize } from '../db';
import { logger } from '../log';
import { Site } from '../models/Site';
import { Worksheet } from '../models/Worksheet';
import { expireWorksheets } from '../services/expireWorksheets';
import { currentRevision } from '../services/readRecord';
import { reviseWorksheet } from '../services/reviseWorksheet';
import { saveWorksheet } from '../services/saveWorksheet';
import { actor, castOf, withQuickPins } from './cast';
import type { DemoSetting } from './contents';
import { hoursOf, MINUTE, settingOf } from './hours';
import { PAST_SCENARIOS } from './pastScenarios';
import { drawPhotos } from './photos';
import type { DrawnPhoto } from './photos';
import { advance, drawingsOf, play } from './play';
import type { Photography } from './play';
import { DEMO_SCENARIOS } from './scenarios';
import type { DemoScenario } from './scenarios';
import type { DemoExtent } from './seed';
import { demoTimeline } from './timeline';

function moved(content: WorksheetContent, { startsAt, endsAt }: DemoSetting): WorksheetContent {
  const permit = content.decision?.permit;
  return {
    ...content,
    job: { ...content.job, startsAt, endsAt },
    ...(permit === undefined
      ? {}
      : { decision: { ...content.decision, permit: { ...permit, validUntil: endsAt } } }),
  };
}

/** Today's worksheet of a scenario, if people have left it as the demo made it. */
async function standing({ workOrder }: DemoScenario): Promise<Worksheet | null> {
  // By the index of the search: the archive may hold a million others.
  const [found] = await sequelize.query<{ id: string }>(
    `SELECT w.id FROM worksheets w
       JOIN worksheet_revisions r ON r.worksheet_id = w.id AND r.revision = w.revision
      WHERE w.search @@ search_query($workOrder) AND r.content #>> '{job,workOrder}' = $workOrder
      ORDER BY r.created_at DESC LIMIT 1`,
    { bind: { workOrder }, type: QueryTypes.SELECT },
  );
  return found === undefined ? null : Worksheet.findByPk(found.id);
}

async function moveToToday(scenario: DemoScenario, now: Date): Promise<void> {
  const worksheet = await standing(scenario);
  if (worksheet === null || worksheet.endsAt === null || worksheet.endsAt > now) return;
  if (worksheet.state !== 'draft' && worksheet.state !== 'expired') return;
  const cast = await castOf(scenario);
  const hours = hoursOf(0, cast.site.timeZone, now);
  const worksheetId = worksheet.id;
  clock.set(new Date(hours.start.getTime() - MINUTE));
  const draft =
    worksheet.state === 'draft' ? worksheet : await reviseWorksheet(cast.lead, worksheetId);
  const { content } = await currentRevision(draft);
  const { version } = draft;
  const today = moved(content, settingOf(cast, hours));
  await saveWorksheet(cast.lead, { worksheetId, version, content: today });
  await advance({ scenario, cast, hours, worksheetId });
}

/** Runs `work` with the clock in its hands, and lets the clock run again afterwards. */
async function withClock(work: (now: Date) => Promise<void>): Promise<void> {
  const now = clock.now();
  try {
    await work(now);
  } finally {
    clock.set(null);
  }
}

/**
 * Moves the demo's open worksheets whose day is over to today: each becomes a
 * draft again with new hours and is signed as far as it was. One that cannot
 * be moved (gloves out of test by now, a person retired) stays as it is.
 */
export function moveOpenWorksheetsToToday(): Promise<void> {
  return withClock(async (now) => {
    await expireWorksheets();
    for (const scenario of DEMO_SCENARIOS.filter(({ daysAgo }) => daysAgo === 0)) {
      try {
        await moveToToday(scenario, now);
      } catch (fault) {
        const message = fault instanceof Error ? fault.message : String(fault);
        logger.warn({ workOrder: scenario.workOrder, message }, 'demo worksheet not moved');
      }
    }
  });
}

/** Nobody gets a mail about work that was over before the demo was made. */
async function forgetMails(): Promise<void> {
  await sequelize.query(`DELETE FROM pgboss.job WHERE name = 'mail' AND state = 'created'`);
}

/** Draws every photo of the scenarios while the first worksheets are made. */
function photographyOf(scenarios: readonly DemoScenario[]): Photography {
  const drawn = drawPhotos(scenarios.flatMap(drawingsOf).map(({ svg }) => svg));
  // Awaited where the first photo is needed; until then a fault has nobody to hear it.
  drawn.catch(() => undefined);
  return {
    of: drawingsOf,
    async jpeg({ svg }: DrawnPhoto) {
      const photo = (await drawn).get(svg);
      if (photo === undefined) throw new Error('A photo of the demo was not drawn.');
      return photo;
    },
  };
}

function scenariosOf(extent: DemoExtent): DemoScenario[] {
  if (extent === 'none') return [];
  return extent === 'few' ? DEMO_SCENARIOS : [...PAST_SCENARIOS, ...DEMO_SCENARIOS];
}

/** Lets the register and the worksheets of a new demo grow, day by day up to now. */
export function growDemo(extent: DemoExtent): Promise<void> {
  const scenarios = scenariosOf(extent);
  return withClock((now) =>
    withQuickPins(async () => {
      const timeline = await demoTimeline(await actor('safety'), now);
      const photography = photographyOf(scenarios);
      let isPast = true;
      for (const scenario of scenarios) {
        const { site, daysAgo } = scenario;
        if (isPast && daysAgo === 0) {
          await timeline.advance(now);
          await forgetMails();
          isPast = false;
        }
        const { timeZone } = await Site.findOne({ where: { name: site }, rejectOnEmpty: true });
        await timeline.advance(hoursOf(daysAgo, timeZone, now).created);
        await play(scenario, now, photography);
      }
      await timeline.advance(now);
      clock.set(now);
      await expireWorksheets();
    }),
  );
}
