import { v7 } from 'uuid';
import type { Meaning } from '@/shared/record';
import { isoInZone } from '@/shared/siteTime';
import type { WorksheetContent } from '@/shared/worksheet';
import { clock } from '../clock';
import type { CurrentUser } from '../currentUser';
import { Worksheet } from '../models/Worksheet';
import { addAttachment } from '../services/addAttachment';
import { answerQuestion } from '../services/answerQuestion';
import { askQuestion } from '../services/askQuestion';
import { closeWorksheet } from '../services/closeWorksheet';
import { createWorksheet } from '../services/createWorksheet';
import { expireWorksheets } from '../services/expireWorksheets';
import { proveWorksheet } from '../services/proveWorksheet';
import { currentRevision } from '../services/readRecord';
import { returnWorksheet } from '../services/returnWorksheet';
import { reviseWorksheet } from '../services/reviseWorksheet';
import { saveWorksheet } from '../services/saveWorksheet';
import { signWorksheet } from '../services/signWorksheet';
import { stopWorksheet } from '../services/stopWorksheet';
import { STALE_AFTER_DAYS, voidStaleDrafts } from '../services/voidStaleDrafts';
import { voidWorksheet } from '../services/voidWorksheet';
import { actor, castOf, pinOf } from './cast';
import type { Cast } from './cast';
import { demoContent, demoProof, DEMO_CLOSE_OUT, liveProof } from './contents';
import type { DemoJob } from './contents';
import { HOUR, hoursFrom, hoursOf, MINUTE, settingOf } from './hours';
import type { Hours } from './hours';
import { demoPhoto } from './photos';
import type { DrawnPhoto } from './photos';
import type { DemoScenario, DemoSetback, DemoStage } from './scenarios';
import { drawnSignature } from './strokes';

/** One demo worksheet on its way. */
export interface Step {
  scenario: DemoScenario;
  cast: Cast;
  hours: Hours;
  worksheetId: string;
}

const ORDER: DemoStage[] = ['draft', 'briefing', 'countersign', 'in-force', 'proved'];
const STANDS_BEHIND: Partial<Record<DemoStage, DemoStage>> = {
  void: 'draft',
  stale: 'draft',
  returned: 'countersign',
  stopped: 'in-force',
  'still-live': 'in-force',
  expired: 'in-force',
};

/** How many steps of the plan a stage stands behind. */
function depthOf({ until, demo }: DemoScenario): number {
  const atEnd = demo.decision?.mode === 'energized' ? 'in-force' : 'proved';
  return ORDER.indexOf(until === 'closed' ? atEnd : (STANDS_BEHIND[until] ?? until));
}

const load = (worksheetId: string) => Worksheet.findByPk(worksheetId, { rejectOnEmpty: true });

async function sign(worksheetId: string, meaning: Meaning, signer: CurrentUser): Promise<void> {
  const worksheet = await load(worksheetId);
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

async function askAndAnswer({ scenario, cast, worksheetId }: Step): Promise<void> {
  const { question } = scenario;
  if (question === undefined) return;
  const worksheet = await load(worksheetId);
  const asker = await actor(question.by);
  const { row } = await askQuestion(asker, worksheet, { text: question.text });
  if (question.answer === undefined) return;
  await answerQuestion(cast.lead, worksheet, { questionId: row.id, text: question.answer });
}

async function prove({ cast, hours, worksheetId }: Step, proofOf: typeof demoProof): Promise<void> {
  clock.set(hours.proved);
  const worksheet = await load(worksheetId);
  const { content } = await currentRevision(worksheet);
  const read = new Date(hours.proved.getTime() - 2 * MINUTE);
  const proof = proofOf(content, isoInZone(read, cast.site.timeZone));
  await proveWorksheet(cast.lead, worksheet, { proof, pin: pinOf(cast.lead) });
}

/** Signs and proves so many steps of the plan. */
async function take(step: Step, depth: number, withQuestion: boolean): Promise<void> {
  const { cast, hours, worksheetId } = step;
  if (depth < 1) return;
  clock.set(hours.prepared);
  await sign(worksheetId, 'prepared', cast.lead);
  if (withQuestion) await askAndAnswer(step);
  if (depth < 2) return;
  for (const [index, helper] of cast.helpers.entries()) {
    clock.set(new Date(hours.acknowledged.getTime() + index * MINUTE));
    await sign(worksheetId, 'acknowledged', helper);
  }
  if (depth < 3) return;
  clock.set(hours.countersigned);
  await sign(worksheetId, 'countersigned', cast.supervisor);
  if (depth < 4) return;
  await prove(step, demoProof);
}

/** Signs and proves as far as the scenario goes, without asking anything again. */
export function advance(step: Step): Promise<void> {
  return take(step, depthOf(step.scenario), false);
}

async function close({ cast, hours, worksheetId }: Step): Promise<void> {
  clock.set(hours.closed);
  const pin = pinOf(cast.lead);
  await closeWorksheet(cast.lead, await load(worksheetId), { closeOut: DEMO_CLOSE_OUT, pin });
}

async function letExpire({ end }: Hours): Promise<void> {
  clock.set(new Date(end.getTime() + MINUTE));
  await expireWorksheets();
}

async function leaveStale({ created }: Hours): Promise<void> {
  clock.set(new Date(created.getTime() + (STALE_AFTER_DAYS + 1) * 24 * HOUR));
  await voidStaleDrafts();
}

/** The last act of a scenario: what its state is called by. */
async function finish(step: Step): Promise<void> {
  const { scenario, cast, hours, worksheetId } = step;
  const { until, reason = '' } = scenario;
  const [helper = cast.lead] = cast.helpers;
  switch (until) {
    case 'returned':
      clock.set(hours.countersigned);
      await returnWorksheet(cast.supervisor, { worksheetId, reason });
      return;
    case 'stopped':
      clock.set(hours.proved);
      await stopWorksheet(helper, { worksheetId, reason });
      return;
    case 'void':
      clock.set(hours.prepared);
      await voidWorksheet(cast.lead, { worksheetId, reason });
      return;
    case 'still-live':
      return prove(step, liveProof);
    case 'expired':
      return letExpire(hours);
    case 'stale':
      return leaveStale(hours);
    case 'closed':
      return close(step);
  }
}

function contentOf({ workOrder }: DemoScenario, cast: Cast, hours: Hours, job: DemoJob) {
  return demoContent(settingOf(cast, hours), { ...job, job: { ...job.job, workOrder } });
}

/** What came between, and the next revision that mends it: an hour later, or the next morning. */
async function overcome(step: Step, setback: DemoSetback): Promise<Step> {
  const { scenario, cast, hours, worksheetId } = step;
  const isReturned = setback.how === 'returned';
  await take(step, isReturned ? 2 : 3, true);
  const until = setback.how === 'still live' ? 'still-live' : setback.how;
  await finish({ ...step, scenario: { ...scenario, until, reason: setback.reason ?? '' } });
  const next = hoursFrom(new Date(hours.start.getTime() + (isReturned ? 1 : 24) * HOUR));
  clock.set(next.created);
  const { version } = await reviseWorksheet(cast.lead, worksheetId);
  const content = contentOf(scenario, cast, next, {
    ...scenario.demo,
    notes: 'Looked at again on the spot by the lead; the plan is for the new hours.',
  });
  await saveWorksheet(cast.lead, { worksheetId, version, content });
  return { ...step, hours: next };
}

export interface Photography {
  /** Photos of a scenario's plan and of its end. */
  of(scenario: DemoScenario): DrawnPhoto[];
  /** The JPEG of a drawing. */
  jpeg(photo: DrawnPhoto): Promise<Buffer>;
}

/** The photos that a scenario asks for, still to be drawn. */
export function drawingsOf({ photos, demo, site }: DemoScenario) {
  const content: WorksheetContent = {
    job: demo.job,
    supply: { system: '480Y/277', panel: 'LP-2', circuit: '14', ...demo.supply },
  };
  return (photos ?? []).map((kind) => demoPhoto(kind, { content, siteName: site }));
}

async function attach(step: Step, photography: Photography, ofCloseOut: boolean): Promise<void> {
  const { scenario, cast, worksheetId } = step;
  for (const photo of photography.of(scenario)) {
    if ((photo.section === 'closeOut') !== ofCloseOut) continue;
    const { section, caption } = photo;
    const file = await photography.jpeg(photo);
    await addAttachment(cast.lead, await load(worksheetId), { section, caption, file });
  }
}

/** Makes one demo worksheet through the same services as people use. */
export async function play(
  scenario: DemoScenario,
  now: Date,
  photography: Photography,
): Promise<void> {
  const cast = await castOf(scenario);
  const hours = hoursOf(scenario.daysAgo, cast.site.timeZone, now);
  clock.set(hours.created);
  const first = contentOf(scenario, cast, hours, scenario.first ?? scenario.demo);
  const { worksheet } = await createWorksheet(cast.lead, { content: first });
  const worksheetId = worksheet.id;
  if (scenario.first !== undefined && scenario.until !== 'stale') {
    clock.set(new Date(hours.created.getTime() + 17 * MINUTE));
    const content = contentOf(scenario, cast, hours, scenario.demo);
    await saveWorksheet(cast.lead, { worksheetId, version: 1, content });
  }
  let step: Step = { scenario, cast, hours, worksheetId };
  await attach(step, photography, false);
  for (const setback of scenario.setbacks ?? []) step = await overcome(step, setback);
  await take(step, depthOf(scenario), (scenario.setbacks ?? []).length === 0);
  if (scenario.until === 'closed') await attach(step, photography, true);
  await finish(step);
}
