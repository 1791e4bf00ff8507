import { afterAll, expect, it } from 'vitest';
import { clock } from '@/server/clock';
import { seedDemo } from '@/server/demo/seed';
import { DEMO_SCENARIOS } from '@/server/demo/scenarios';
import { moveOpenWorksheetsToToday } from '@/server/demo/worksheets';
import { Worksheet } from '@/server/models/Worksheet';
import { SignatureRow } from '@/server/models/SignatureRow';
import { verifyRecord } from '@/server/services/verifyRecord';
import { strokesSchema } from '@/shared/record';

afterAll(() => clock.set(null));

async function standing(): Promise<Record<string, string[]>> {
  const rows = await Worksheet.findAll({ order: [['number', 'ASC']] });
  const byState: Record<string, string[]> = {};
  for (const { state, proved, mode } of rows) {
    const how = state === 'in-force' ? `${state} ${proved ? 'proved' : (mode ?? '')}` : state;
    byState[how] = [...(byState[how] ?? []), how];
  }
  return byState;
}
const counts = async () =>
  Object.fromEntries(Object.entries(await standing()).map(([how, list]) => [how, list.length]));

const DEMO = {
  draft: 1,
  briefing: 1,
  countersign: 2,
  'in-force off': 1,
  'in-force proved': 1,
  'in-force energized': 1,
  returned: 1,
  stopped: 1,
  expired: 1,
  closed: 2,
};

it('makes a company with worksheets in every state, all of them in order', async () => {
  await seedDemo();
  expect(await counts()).toEqual(DEMO);
  expect(await Worksheet.count()).toBe(DEMO_SCENARIOS.length);
  const draft = await Worksheet.findOne({ where: { state: 'draft' }, rejectOnEmpty: true });
  expect(draft.verdict).toBe('stop');
  expect(draft.findingCodes).toContain('sources.battery-connected');
  for (const { strokes } of await SignatureRow.findAll()) {
    expect(strokesSchema.safeParse(strokes).success).toBe(true);
  }
  expect((await verifyRecord()).faults).toEqual([]);
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
