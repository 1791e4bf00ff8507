import { describe, expect, it } from 'vitest';
import { READ_AT } from '../../../support/ruleEdits';
import type { Edits } from '../../../support/ruleTable';
import { assessBase, found, gone } from '../../../support/ruleTable';

describe('the governing reading (convention 9)', () => {
  const more = (...readings: object[]): Edits => ({
    ...Object.fromEntries(
      readings.map((entry, index) => [
        `proof/readings/${6 + index}`,
        { point: 'A1', from: 'B', to: 'G', current: 'ac', at: READ_AT, ...entry },
      ]),
    ),
  });
  const low = { lowImpedance: true };
  type Row = [title: string, readings: object[], present: number, stray: number];
  const ROWS: Row[] = [
    ['the highest counts', [{ volts: 120 }, { volts: 0 }], 1, 0],
    ['one finding for one pair', [{ volts: 120 }, { volts: 118 }], 1, 0],
    ['a low-impedance retest settles it', [{ volts: 120 }, { volts: 0, ...low }], 0, 0],
    ['a retest of 3 V settles it', [{ volts: 80 }, { volts: 3, ...low }], 0, 0],
    ['a retest that still reads', [{ volts: 120 }, { volts: 20, ...low }], 0, 1],
    ['a retest that is not the last', [{ volts: 0, ...low }, { volts: 120 }], 1, 0],
    [
      'a retest and then another reading',
      [{ volts: 120 }, { volts: 0, ...low }, { volts: 0 }],
      1,
      0,
    ],
    ['a retest higher than before', [{ volts: 10 }, { volts: 70, ...low }], 1, 0],
    [
      'lowImpedance false settles nothing',
      [{ volts: 120 }, { volts: 0, lowImpedance: false }],
      1,
      0,
    ],
    ['the pair turned round', [{ volts: 120 }, { volts: 0, from: 'G', to: 'B', ...low }], 0, 0],
    ['a retest of another pair', [{ volts: 120 }, { volts: 0, from: 'N', ...low }], 1, 0],
    ['a retest at another point', [{ volts: 120 }, { volts: 0, point: 'A2', ...low }], 1, 0],
    ['a retest of direct current', [{ volts: 120 }, { volts: 0, current: 'dc', ...low }], 1, 0],
    ['a retest of a source', [{ volts: 120 }, { volts: 0, sourceId: 's1', ...low }], 1, 0],
    ['a retest without a figure settles nothing', [{ volts: 120 }, { volts: NaN, ...low }], 1, 0],
    ['negative, by magnitude', [{ volts: -120 }], 1, 0],
    ['negative and smaller positive', [{ volts: -60 }, { volts: 20 }], 1, 0],
    ['stray, negative', [{ volts: -4 }], 0, 1],
    ['both kinds of current', [{ volts: 60 }, { volts: 60, current: 'dc' }], 2, 0],
    ['before the window, still counted', [{ volts: 120, at: '2026-12-01T06:00:00-06:00' }], 1, 0],
    ['after on, still counted', [{ volts: 20, at: '2026-12-01T11:00:00-06:00' }], 0, 1],
    ['without from, still counted', [{ volts: 120, from: gone }], 1, 0],
    ['without to, still counted', [{ volts: 120, to: gone }], 1, 0],
    ['without a point, still counted', [{ volts: 20, point: gone }], 0, 1],
    ['of a source that is not listed, still counted', [{ volts: 120, sourceId: 'x' }], 1, 0],
  ];
  it.each(ROWS)('%s', (_title, readings, present, stray) => {
    const result = assessBase('O work', more(...readings));
    expect(found(result, 'absence.voltage-present')).toHaveLength(present);
    expect(found(result, 'absence.stray-voltage')).toHaveLength(stray);
    expect(result.verdict).toBe(present + stray > 0 ? 'stop' : 'ready');
  });
});
