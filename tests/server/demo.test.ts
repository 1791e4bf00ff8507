import { Op } from 'sequelize';
import { afterAll, expect, it } from 'vitest';
import { clock } from '@/server/clock';
import { PAST_SCENARIOS } from '@/server/demo/pastScenarios';
import { DEMO_PEOPLE, seedDemo } from '@/server/demo/seed';
import { DEMO_SCENARIOS } from '@/server/demo/scenarios';
import { moveOpenWorksheetsToToday } from '@/server/demo/worksheets';
import { AttachmentRow } from '@/server/models/AttachmentRow';
import { ProofRow } from '@/server/models/ProofRow';
import { QuestionRow } from '@/server/models/QuestionRow';
import { RubberGoods } from '@/server/models/RubberGoods';
import { SignatureRow } from '@/server/models/SignatureRow';
import { Site } from '@/server/models/Site';
import { User } from '@/server/models/User';
import { Worksheet } from '@/server/models/Worksheet';
import { WorksheetRevision } from '@/server/models/WorksheetRevision';
import { loadCurrentUser } from '@/server/services/loadCurrentUser';
import { readInsights } from '@/server/services/readInsights';
import { verifyRecord } from '@/server/services/verifyRecord';
import { STOP_REASONS, strokesSchema } from '@/shared/record';

afterAll(() => clock.set(null));

async function counts(): Promise<Record<string, number>> {
  const rows = await Worksheet.findAll({ order: [['number', 'ASC']] });
  const byState: Record<string, number> = {};
  for (const { state, proved, mode } of rows) {
    const how = state === 'in-force' ? `${state} ${proved ? 'proved' : (mode ?? '')}` : state;
    byState[how] = (byState[how] ?? 0) + 1;
  }
  return byState;
}

const DEMO = {
  draft: 1,
  briefing: 1,
  countersign: 2,
  'in-force off': 1,
  'in-force proved': 1,
  'in-force energized': 1,
  returned: 1,
  stopped: 5,
  expired: 3,
  void: 4,
  closed: 40,
};

it('makes a company with worksheets in every state, all of them in order', async () => {
  await seedDemo();
  expect(await counts()).toEqual(DEMO);
  expect(await Worksheet.count()).toBe(60);
  expect(PAST_SCENARIOS.length + DEMO_SCENARIOS.length).toBe(60);
  const draft = await Worksheet.findOne({ where: { state: 'draft' }, rejectOnEmpty: true });
  expect(draft.verdict).toBe('stop');
  expect(draft.findingCodes).toContain('sources.battery-connected');
  for (const { strokes } of await SignatureRow.findAll()) {
    expect(strokesSchema.safeParse(strokes).success).toBe(true);
  }
  expect((await verifyRecord()).faults).toEqual([]);
}, 240_000);

it('holds a whole company: people, sites, rubber goods, photos, questions', async () => {
  expect(await Site.count()).toBe(6);
  // Beside them somebody whose invitation is still out.
  expect(await User.count()).toBe(DEMO_PEOPLE.length + 1);
  expect(await User.count({ where: { passwordHash: { [Op.is]: null } } })).toBe(1);
  expect(DEMO_PEOPLE).toHaveLength(14);
  expect(await RubberGoods.count()).toBe(24);
  expect(await RubberGoods.count({ where: { retiredBecause: 'failed test' } })).toBe(2);
  expect(await AttachmentRow.count()).toBeGreaterThan(40);
  expect(await QuestionRow.count()).toBeGreaterThan(4);
  expect(await WorksheetRevision.count()).toBeGreaterThan(65);
});

it('went every path, and holds a proof that stopped the work', async () => {
  const revisions = await WorksheetRevision.findAll();
  const reasons = new Set(revisions.map(({ content }) => content.decision?.reason));
  expect(reasons).toContain(undefined);
  expect(reasons).toContain('testing');
  expect(reasons).toContain('additional hazard');
  expect(reasons).toContain('below 50 V');
  const live = (await ProofRow.findAll()).filter(({ assessment }) =>
    assessment.findings.some(({ code }) => code === 'absence.voltage-present'),
  );
  expect(live).toHaveLength(2);
});

it('gives the insights something to count', async () => {
  const safety = await User.findOne({ where: { role: 'safety' }, rejectOnEmpty: true });
  const loaded = await loadCurrentUser(safety.id);
  if (loaded === null) throw new Error('safety is there');
  const insights = await readInsights(loaded.user, {});
  expect(insights.worksheets).toBe(60);
  expect(insights.byMonth.length).toBeGreaterThan(18);
  expect(insights.bySite).toHaveLength(6);
  expect(insights.voltageAtProof).toBe(2);
  expect(insights.notClosedInTime).toBe(4);
  const reasons = insights.stopsByReason.map(({ reason }) => reason).sort();
  expect(reasons).toEqual([...STOP_REASONS].sort());
});

it('keeps the full cost of the PINs that it hashed quickly for its own signatures', async () => {
  const hashes = (await User.findAll({ where: { demo: true } })).map(({ pinHash }) => pinHash);
  expect(new Set(hashes).size).toBe(14);
  const costs = hashes.map((hash) => hash?.split('$')[3]?.split(',').sort().join());
  expect(new Set(costs)).toEqual(
    new Set([
      [`m=${process.env['ARGON2_MEMORY_KIB']}`, 'p=1', `t=${process.env['ARGON2_PASSES']}`].join(),
    ]),
  );
});

it('moves the open ones to today at a later start, and leaves the rest', async () => {
  clock.set(new Date(Date.now() + 26 * 3_600_000));
  await seedDemo();
  expect(await counts()).toEqual(DEMO);
  clock.set(new Date(Date.now() + 26 * 3_600_000));
  await moveOpenWorksheetsToToday();
  expect(await counts()).toEqual(DEMO);
  expect((await verifyRecord()).faults).toEqual([]);
});
