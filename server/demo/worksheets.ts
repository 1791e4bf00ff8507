import { v7 } from 'uuid';
import type { Meaning } from '@/shared/record';
import { fromWallClock, isoInZone, toWallClock } from '@/shared/siteTime';
import type { WorksheetContent } from '@/shared/worksheet';
import { clock } from '../clock';
import type { CurrentUser } from '../currentUser';
import { logger } from '../log';
import { RubberGoods } from '../models/RubberGoods';
import { Site } from '../models/Site';
import { Worksheet } from '../models/Worksheet';
import { WorksheetRevision } from '../models/WorksheetRevision';
import { answerQuestion } from '../services/answerQuestion';
import { askQuestion } from '../services/askQuestion';
import { closeWorksheet } from '../services/closeWorksheet';
import { createWorksheet } from '../services/createWorksheet';
import { expireWorksheets } from '../services/expireWorksheets';
import { loadCurrentUser } from '../services/loadCurrentUser';
import { proveWorksheet } from '../services/proveWorksheet';
import { currentRevision } from '../services/readRecord';
import { returnWorksheet } from '../services/returnWorksheet';
import { reviseWorksheet } from '../services/reviseWorksheet';
import { saveWorksheet } from '../services/saveWorksheet';
import { signWorksheet } from '../services/signWorksheet';
import { stopWorksheet } from '../services/stopWorksheet';
import { demoContent, demoProof, DEMO_CLOSE_OUT } from './contents';
import type { DemoJob, DemoSetting } from './contents';
import { DEMO_SCENARIOS } from './scenarios';
import type { DemoScenario, DemoStage } from './scenarios';
import { DEMO_PEOPLE, demoUser } from './seed';
import { drawnSignature } from './strokes';

const MINUTE = 60_000;
const HOUR = 60 * MINUTE;

interface Cast {
  lead: CurrentUser;
  helpers: CurrentUser[];
  supervisor: CurrentUser;
  site: Site;
  glovesId: string | undefined;
}

async function actor(name: string): Promise<CurrentUser> {
  const { id } = await demoUser(`${name}@wideberth.example`);
  const loaded = await loadCurrentUser(id);
  if (loaded === null) throw new Error(`${name} of the demo is retired.`);
  return loaded.user;
}

function pinOf({ email }: CurrentUser): string {
  return DEMO_PEOPLE.find((person) => person.email === email)?.pin ?? '';
}

async function castOf({ lead, helpers, supervisor, site }: DemoScenario): Promise<Cast> {
  const place = await Site.findOne({ where: { name: site }, rejectOnEmpty: true });
  const gloves = await RubberGoods.findOne({
    where: { siteId: place.id, kind: 'gloves', retiredAt: null },
    order: [['id', 'ASC']],
  });
  return {
    lead: await actor(lead),
    helpers: await Promise.all(helpers.map(actor)),
    supervisor: await actor(supervisor),
    site: place,
    glovesId: gloves?.id,
  };
}

/** The hours of one demo day: when it is planned for, and when each step was taken. */
interface Hours {
  start: Date;
  end: Date;
  created: Date;
  prepared: Date;
  acknowledged: Date;
  countersigned: Date;
  proved: Date;
  closed: Date;
}

function hoursFrom(start: Date): Hours {
  const at = (minutes: number) => new Date(start.getTime() + minutes * MINUTE);
  return {
    start,
    end: at(7 * 60),
    created: at(-25),
    prepared: at(2),
    acknowledged: at(5),
    countersigned: at(14),
    proved: at(24),
    closed: at(210),
  };
}

/** Today's work began half an hour ago; earlier days began at eight, site time. */
function hoursOf(daysAgo: number, timeZone: string, now: Date): Hours {
  if (daysAgo === 0) return hoursFrom(new Date(now.getTime() - 30 * MINUTE));
  const day = toWallClock(new Date(now.getTime() - daysAgo * 24 * HOUR), timeZone);
  return hoursFrom(new Date(fromWallClock({ ...day, hour: 8, minute: 0 }, timeZone)));
}

function settingOf(cast: Cast, hours: Hours): DemoSetting {
  const { site, lead, helpers, glovesId } = cast;
  const zoned = (instant: Date) => isoInZone(instant, site.timeZone);
  return {
    siteId: site.id,
    lead,
    helpers,
    glovesId,
    emergency: site.emergency,
    desk: site.deskToTell,
    startsAt: zoned(hours.start),
    endsAt: zoned(hours.end),
    on: zoned(hours.prepared),
  };
}

async function sign(worksheetId: string, meaning: Meaning, signer: CurrentUser): Promise<void> {
  const worksheet = await Worksheet.findByPk(worksheetId, { rejectOnEmpty: true });
  const { contentHash } = await currentRevision(worksheet);
  await signWorksheet(signer, worksheet, {
    id: v7(),
    meaning,
    signerId: signer.id,
    pin: pinOf(signer),
    strokes: drawnSignature(signer.name),
    contentHash,
  });
}

function at(instant: Date): void {
  clock.set(instant);
}

const ORDER: DemoStage[] = ['draft', 'briefing', 'countersign', 'in-force', 'proved'];

/** How many steps of the plan a stage stands behind. */
function depthOf({ until, demo }: DemoScenario): number {
  if (until === 'returned') return ORDER.indexOf('countersign');
  if (until === 'stopped' || until === 'expired') return ORDER.indexOf('in-force');
  if (until !== 'closed') return ORDER.indexOf(until);
  return ORDER.indexOf(demo.decision?.mode === 'energized' ? 'in-force' : 'proved');
}

interface Step {
  scenario: DemoScenario;
  cast: Cast;
  hours: Hours;
  worksheetId: string;
}

async function askAndAnswer({ scenario, cast, worksheetId }: Step): Promise<void> {
  const { question } = scenario;
  if (question === undefined) return;
  const worksheet = await Worksheet.findByPk(worksheetId, { rejectOnEmpty: true });
  const asker = await actor(question.by);
  const { row } = await askQuestion(asker, worksheet, { text: question.text });
  if (question.answer === undefined) return;
  await answerQuestion(cast.lead, worksheet, { questionId: row.id, text: question.answer });
}

/** Signs and proves as far as the scenario goes. */
async function advance(step: Step, withQuestion: boolean): Promise<void> {
  const { scenario, cast, hours, worksheetId } = step;
  const depth = depthOf(scenario);
  if (depth < 1) return;
  at(hours.prepared);
  await sign(worksheetId, 'prepared', cast.lead);
  if (withQuestion) await askAndAnswer(step);
  if (depth < 2) return;
  for (const [index, helper] of cast.helpers.entries()) {
    at(new Date(hours.acknowledged.getTime() + index * MINUTE));
    await sign(worksheetId, 'acknowledged', helper);
  }
  if (depth < 3) return;
  at(hours.countersigned);
  await sign(worksheetId, 'countersigned', cast.supervisor);
  if (depth < 4) return;
  at(hours.proved);
  const worksheet = await Worksheet.findByPk(worksheetId, { rejectOnEmpty: true });
  const { content } = await currentRevision(worksheet);
  const read = new Date(hours.proved.getTime() - 2 * MINUTE);
  const proof = demoProof(content, isoInZone(read, cast.site.timeZone));
  await proveWorksheet(cast.lead, worksheet, { proof, pin: pinOf(cast.lead) });
}

async function finish({ scenario, cast, hours, worksheetId }: Step): Promise<void> {
  const { until, reason = '' } = scenario;
  const [helper = cast.lead] = cast.helpers;
  if (until === 'returned') {
    at(hours.countersigned);
    await returnWorksheet(cast.supervisor, { worksheetId, reason });
  } else if (until === 'stopped') {
    at(hours.proved);
    await stopWorksheet(helper, { worksheetId, reason });
  } else if (until === 'closed') {
    at(hours.closed);
    const worksheet = await Worksheet.findByPk(worksheetId, { rejectOnEmpty: true });
    const pin = pinOf(cast.lead);
    await closeWorksheet(cast.lead, worksheet, { closeOut: DEMO_CLOSE_OUT, pin });
  }
}

function contentOf(scenario: DemoScenario, cast: Cast, hours: Hours, job: DemoJob) {
  const { workOrder } = scenario;
  return demoContent(settingOf(cast, hours), { ...job, job: { ...job.job, workOrder } });
}

/** Makes one demo worksheet through the same services as people use. */
async function play(scenario: DemoScenario, now: Date): Promise<void> {
  const cast = await castOf(scenario);
  const hours = hoursOf(scenario.daysAgo, cast.site.timeZone, now);
  at(hours.created);
  const first = contentOf(scenario, cast, hours, scenario.first ?? scenario.demo);
  const { worksheet } = await createWorksheet(cast.lead, { content: first });
  const worksheetId = worksheet.id;
  if (scenario.first !== undefined) {
    at(new Date(hours.created.getTime() + 17 * MINUTE));
    const content = contentOf(scenario, cast, hours, scenario.demo);
    await saveWorksheet(cast.lead, { worksheetId, version: 1, content });
  }
  const step = { scenario, cast, hours, worksheetId };
  await advance(step, true);
  await finish(step);
}

function moved(content: WorksheetContent, { startsAt, endsAt }: DemoSetting): WorksheetContent {
  return { ...content, job: { ...content.job, startsAt, endsAt } };
}

/** Today's worksheet of a scenario, if people have left it as the demo made it. */
async function standing(scenario: DemoScenario): Promise<Worksheet | null> {
  const revision = await WorksheetRevision.findOne({
    where: { 'content.job.workOrder': scenario.workOrder },
    order: [
      ['createdAt', 'DESC'],
      ['revision', 'DESC'],
    ],
  });
  return revision === null ? null : Worksheet.findByPk(revision.worksheetId);
}

async function moveToToday(scenario: DemoScenario, now: Date): Promise<void> {
  const worksheet = await standing(scenario);
  if (worksheet === null || worksheet.endsAt === null || worksheet.endsAt > now) return;
  if (worksheet.state !== 'draft' && worksheet.state !== 'expired') return;
  const cast = await castOf(scenario);
  const hours = hoursOf(0, cast.site.timeZone, now);
  const worksheetId = worksheet.id;
  at(new Date(hours.start.getTime() - MINUTE));
  const draft =
    worksheet.state === 'draft' ? worksheet : await reviseWorksheet(cast.lead, worksheetId);
  const { content } = await currentRevision(draft);
  const { version } = draft;
  const today = moved(content, settingOf(cast, hours));
  await saveWorksheet(cast.lead, { worksheetId, version, content: today });
  await advance({ scenario, cast, hours, worksheetId }, false);
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

/** Makes the demo's worksheets once; on a later start it moves the open ones to today. */
export async function seedWorksheets(): Promise<void> {
  if ((await Worksheet.count()) > 0) return moveOpenWorksheetsToToday();
  await withClock(async (now) => {
    for (const scenario of DEMO_SCENARIOS) await play(scenario, now);
    at(now);
    await expireWorksheets();
  });
}
