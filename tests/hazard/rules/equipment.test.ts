import { describe, expect, it } from 'vitest';
import type { Base } from '../../support/ruleTable';
import {
  ALL,
  assessBase,
  describeRule,
  eachValue,
  found,
  gone,
  onEach,
} from '../../support/ruleTable';

const READY = 'protectiveEquipment/ready';

describe('equipment.not-at-hand (1910.335(a)(1), (a)(2); 70E 130.7)', () => {
  it.each<Base>(['O', 'T', 'W'])('%s: one finding for each item that is not at hand', (base) => {
    const ids = assessBase(base).equipment.map((item) => item.id);
    expect(new Set(ids).size).toBe(ids.length);
    for (const id of ids) {
      const result = assessBase(base, { [READY]: ids.filter((other) => other !== id) });
      expect(found(result, 'equipment.not-at-hand')).toHaveLength(1);
      const [missing] = result.findings.filter(
        (finding) => finding.code === 'equipment.not-at-hand',
      );
      expect(missing).toMatchObject({ severity: 'open' });
      expect(missing?.path).toMatch(/^\/protectiveEquipment/);
      expect(Object.values(missing?.params ?? {})).toContain(id);
      expect(result.verdict).toBe('open');
    }
  });

  it.each<[Base, unknown]>(
    (['O', 'T', 'W'] as const).flatMap((base) =>
      [gone, [], 'x', {}].map((ready): [Base, unknown] => [base, ready]),
    ),
  )('%s: ready = %j leaves every item open', (base, ready) => {
    const { equipment } = assessBase(base);
    const result = assessBase(base, { [READY]: ready });
    const severities = found(result, 'equipment.not-at-hand').map((entry) => entry.split(' ')[0]);
    expect(severities).toEqual(equipment.map(() => 'open'));
    expect(equipment.length).toBeGreaterThan(8);
  });

  it('does not take an item of another sheet for one that is asked', () => {
    const ready = assessBase('T').equipment.map((item) => item.id);
    const result = assessBase('O', { [READY]: [...ready, 'rabbit-foot'] });
    expect(found(result, 'equipment.not-at-hand').length).toBeGreaterThan(0);
  });
});

describeRule('equipment.damaged', '70E 110.2(B) Exception 1, 130.5(C)', [
  ...eachValue(ALL, 'supply/damage', [false], []),
  ...eachValue(['W', 'W work'], 'supply/damage', [true], ['stop /supply/damage']),
  ...eachValue(['O', 'T'], 'supply/damage', [true], ['caution /supply/damage']),
  ...eachValue(ALL, 'supply/damage', [gone, '', 'no', 0], ['open /supply/damage']),
  ...onEach(['O close', 'W close'], 'not at close-out', { 'supply/damage': true }, []),
]);
