import { describe, expect, it } from 'vitest';
import { ARC_FLASH_EQUIPMENT, ARC_FLASH_TASKS, assessArcFlash } from '@/hazard';
import type { ArcFlashEquipment } from '@/hazard';
import { nfpa70e2024 } from '@/hazard/editions';

type Arguments = Parameters<typeof assessArcFlash>[0];

/** Live work inside the narrowest limits of any row. */
const inside: Arguments = {
  task: 'energized work',
  condition: 'normal',
  equipment: 'panelboard',
  volts: 480,
  workingDistanceInches: 24,
  availableFaultKiloamperes: 10,
  clearingSeconds: 0.03,
};
const ask = (change: Partial<Arguments>) => assessArcFlash({ ...inside, ...change });
const at = (inches: number, metres: number) => ({ inches, metres });

const row1 = { ppeCategory: 1, requiredArcRatingCalPerCm2: 4, arcFlashBoundary: at(19, 0.485) };
const row2 = { ppeCategory: 2, requiredArcRatingCalPerCm2: 8, arcFlashBoundary: at(36, 0.9) };
const row3 = { ppeCategory: 2, requiredArcRatingCalPerCm2: 8, arcFlashBoundary: at(60, 1.5) };
const row4 = { ppeCategory: 4, requiredArcRatingCalPerCm2: 40, arcFlashBoundary: at(168, 4.3) };
const row5 = { ppeCategory: 4, requiredArcRatingCalPerCm2: 40, arcFlashBoundary: at(240, 6) };
const rows2And6 = { ppeCategory: 2, requiredArcRatingCalPerCm2: 8, arcFlashBoundary: at(60, 1.5) };
const nothing = { ppeCategory: null, requiredArcRatingCalPerCm2: null, arcFlashBoundary: null };

const TABLE = 'Table 130.7(C)(15)(a)';

describe('arc flash PPE categories, NFPA 70E-2024 Table 130.7(C)(15)(a)', () => {
  interface Case {
    equipment: ArcFlashEquipment;
    volts: number;
    kiloamperes: number;
    seconds: number;
    inches: number;
    expected: object;
  }
  const noNames: readonly ArcFlashEquipment[] = [
    'luminaire',
    'junction box',
    'disconnect',
    'transformer',
    'other',
  ];
  // Each case stands on the edge of all limits of its row.
  const onTheEdge: readonly Case[] = [
    ...[120, 208, 240].map((volts) => ({
      equipment: 'panelboard' as const,
      volts,
      kiloamperes: 25,
      seconds: 0.03,
      inches: 18,
      expected: row1,
    })),
    ...[240.1, 480, 600].map((volts) => ({
      equipment: 'panelboard' as const,
      volts,
      kiloamperes: 25,
      seconds: 0.03,
      inches: 18,
      expected: row2,
    })),
    ...[208, 600].flatMap((volts) => [
      {
        equipment: 'motor control center' as const,
        volts,
        kiloamperes: 65,
        seconds: 0.03,
        inches: 18,
        expected: row3,
      },
      {
        equipment: 'motor control center' as const,
        volts,
        kiloamperes: 42,
        seconds: 0.33,
        inches: 18,
        expected: row4,
      },
      {
        equipment: 'switchboard' as const,
        volts,
        kiloamperes: 35,
        seconds: 0.5,
        inches: 24,
        expected: row5,
      },
    ]),
    ...noNames.flatMap((equipment) => [
      { equipment, volts: 240, kiloamperes: 25, seconds: 0.03, inches: 18, expected: row1 },
      { equipment, volts: 240.1, kiloamperes: 25, seconds: 0.03, inches: 18, expected: rows2And6 },
      { equipment, volts: 600, kiloamperes: 25, seconds: 0.03, inches: 18, expected: rows2And6 },
    ]),
  ];

  it.each(onTheEdge)(
    '$equipment at $volts V, $kiloamperes kA, $seconds s, $inches in',
    ({ equipment, volts, kiloamperes, seconds, inches, expected }) => {
      const edge = {
        equipment,
        volts,
        availableFaultKiloamperes: kiloamperes,
        clearingSeconds: seconds,
        workingDistanceInches: inches,
      };
      expect(ask(edge)).toMatchObject({
        likely: true,
        method: 'ppe category',
        ...expected,
        findings: [],
      });
      // A hair outside any one limit is outside the row (of a center: in the other row, or none).
      const outside = [
        { ...edge, availableFaultKiloamperes: kiloamperes + 0.01 },
        { ...edge, clearingSeconds: seconds + 0.001 },
        { ...edge, workingDistanceInches: inches - 0.1 },
      ];
      for (const change of outside) {
        expect(ask(change)).not.toMatchObject(expected);
        expect(ask(change)).toMatchObject({ method: 'study needed', ...nothing });
        expect(ask(change).findings).toHaveLength(1);
        expect(ask(change).findings[0]).toMatchObject({
          code: 'arc.study-needed',
          severity: 'stop',
        });
      }
    },
  );

  it('passes from the first to the second row of a motor control center', () => {
    const center = { equipment: 'motor control center', availableFaultKiloamperes: 42 } as const;
    expect(ask({ ...center, clearingSeconds: 0.03 })).toMatchObject(row3);
    expect(ask({ ...center, clearingSeconds: 0.031 })).toMatchObject(row4);
  });

  it('cites both rows where either could apply', () => {
    const tables = ask({ equipment: 'luminaire' }).citations.map(({ table }) => table);
    expect(tables.filter((table) => table.startsWith(TABLE))).toEqual([
      `${TABLE}, panelboards above 240 V to 600 V`,
      `${TABLE}, other 600 V class`,
    ]);
    const panelboard = ask({}).citations.map(({ table }) => table);
    expect(panelboard.filter((table) => table.startsWith(TABLE))).toHaveLength(1);
  });

  it.each([600.1, 5000, 1e6])('asks for a study at %d V, whatever the equipment', (volts) => {
    for (const equipment of ARC_FLASH_EQUIPMENT) {
      const answer = ask({ equipment, volts });
      expect(answer).toMatchObject({ likely: true, method: 'study needed', ...nothing });
      expect(answer.findings).toMatchObject([
        {
          code: 'arc.study-needed',
          severity: 'stop',
          path: '/supply/system',
          params: { limit: 'voltage-outside-table', value: volts, allowed: 600 },
        },
      ]);
    }
  });

  // Two cycles are printed beside 0.03 s; a form converts them by the printed pair.
  it('compares seconds with the printed figure', () => {
    expect(ask({ clearingSeconds: 2 / 60 }).method).toBe('study needed');
  });
});

describe('a limit of the table', () => {
  it('that is unknown is outside the row, and open', () => {
    const answer = ask({ availableFaultKiloamperes: undefined, clearingSeconds: undefined });
    expect(answer).toMatchObject({ method: 'study needed', ...nothing });
    expect(answer.findings).toMatchObject([
      {
        severity: 'open',
        path: '/arcFlash/availableFaultKiloamperes',
        params: { limit: 'not-answered', field: 'availableFaultKiloamperes' },
      },
      { severity: 'open', path: '/arcFlash/clearingSeconds', params: { field: 'clearingSeconds' } },
    ]);
  });

  it('that is exceeded is a stop with both figures', () => {
    const answer = ask({
      availableFaultKiloamperes: 30,
      clearingSeconds: 0.05,
      workingDistanceInches: 12,
    });
    expect(answer.findings.map(({ path, severity, params }) => [path, severity, params])).toEqual([
      [
        '/arcFlash/availableFaultKiloamperes',
        'stop',
        { limit: 'fault-current-exceeded', value: 30, allowed: 25 },
      ],
      [
        '/arcFlash/clearingSeconds',
        'stop',
        { limit: 'clearing-time-exceeded', value: 0.05, allowed: 0.03 },
      ],
      [
        '/arcFlash/workingDistanceInches',
        'stop',
        { limit: 'working-distance-short', value: 12, allowed: 18 },
      ],
    ]);
    expect(answer.findings[0]?.citation).toMatchObject({ table: '130.5', confidence: 'agreeing' });
  });

  it('that is exceeded stays a stop while another is unknown', () => {
    const { findings } = ask({ availableFaultKiloamperes: 30, clearingSeconds: undefined });
    expect(findings.map(({ severity }) => severity)).toEqual(['stop', 'open']);
  });

  it('is open while some row of a motor control center may still hold', () => {
    const center = { equipment: 'motor control center', clearingSeconds: undefined } as const;
    expect(ask({ ...center, availableFaultKiloamperes: 60 }).findings).toMatchObject([
      { severity: 'open' },
    ]);
    expect(ask({ ...center, availableFaultKiloamperes: 66 }).findings).toMatchObject([
      { severity: 'stop' },
      { severity: 'open' },
    ]);
  });
});

describe('likelihood comes first', () => {
  it('gives no figure where an arc flash is not likely', () => {
    const answer = ask({ task: 'read panel meter', availableFaultKiloamperes: 500, volts: 5000 });
    expect(answer).toMatchObject({
      likely: false,
      method: 'not likely',
      ...nothing,
      findings: [],
      citations: [{ table: 'Table 130.5(C)' }],
    });
  });

  it('turns on the condition of the equipment', () => {
    expect(ask({ task: 'operate device' }).method).toBe('not likely');
    expect(ask({ task: 'operate device', condition: 'abnormal' })).toMatchObject(row2);
  });

  it('answers for every task and equipment', () => {
    for (const task of ARC_FLASH_TASKS) {
      for (const equipment of ARC_FLASH_EQUIPMENT) {
        expect(['not likely', 'ppe category']).toContain(ask({ task, equipment }).method);
      }
    }
  });
});

describe('the row of other 600 V class equipment, NFPA 70E-2024 Table 130.7(C)(15)(a)', () => {
  // Beside the panelboard row, whose limits are narrower, its own limits show in no answer.
  it('holds up to 65 kA and 0.03 s at 18 in: category 2, 60 in (from memory)', () => {
    expect(nfpa70e2024.ppeCategories.rows[6]).toMatchObject({
      faultKiloamperes: 65,
      clearingSeconds: 0.03,
      workingDistanceInches: 18,
      category: 2,
      arcFlashBoundary: at(60, 1.5),
    });
  });
});

describe('arguments of assessArcFlash', () => {
  it.each([
    'volts',
    'workingDistanceInches',
    'availableFaultKiloamperes',
    'clearingSeconds',
  ] as const)('refuses bad figures for %s by name', (name) => {
    for (const bad of [NaN, Infinity, -1, null, '18']) {
      const call = () => ask({ [name]: bad });
      expect(call).toThrow(RangeError);
      expect(call).toThrow(new RegExp(`^${name}`));
    }
  });

  it('refuses a missing voltage and working distance, also where nothing is likely', () => {
    const task = 'read panel meter';
    expect(() => ask({ task, volts: undefined })).toThrow(/^volts/);
    expect(() => ask({ task, workingDistanceInches: undefined })).toThrow(/^workingDistanceInches/);
  });

  it('refuses what no list knows', () => {
    expect(() => ask({ task: 'juggling' as 'voltage test' })).toThrow(/^task/);
    expect(() => ask({ condition: 'fine' as 'normal' })).toThrow(/^condition/);
    expect(() => ask({ equipment: 'toaster' as 'other' })).toThrow(/^equipment/);
    expect(() => ask({ equipment: 'constructor' as 'other' })).toThrow(RangeError);
  });
});
