import { describe, expect, it } from 'vitest';
import { assess } from '@/hazard';
import { nfpa70e2024 } from '@/hazard/editions';
import { inventedEdition } from '../support/inventedEdition';
import { soundWorksheet, withPath } from '../support/soundWorksheet';

describe('a worksheet under another edition, which is data only', () => {
  const { on, content, proof } = soundWorksheet();
  const under = (edition: typeof inventedEdition, given = content) =>
    assess(given, { on, edition });

  it('keeps the name of its edition', () => {
    expect(assess(content, { on }).edition).toBe('NFPA 70E-2024');
    expect(under(inventedEdition).edition).toBe('Invented-2099');
  });

  it('is the same as before under the edition that is the default', () => {
    expect(under(nfpa70e2024)).toEqual(assess(content, { on }));
  });

  it('reads its boundaries and barricade from the tables of that edition', () => {
    expect(under(inventedEdition)).toMatchObject({
      boundaries: {
        row: '60 V to 1 kV',
        limitedFixed: { inches: 48, metres: 1.2 },
        restricted: { inches: 24, metres: 0.6 },
        citation: { standard: 'Invented standard', edition: '2099', table: 'Table 9.9' },
      },
      barricade: { inches: 48, metres: 1.2 },
    });
  });

  it('is stopped where the later tables are stricter', () => {
    expect(under(nfpa70e2024).verdict).toBe('ready');
    const { verdict, findings } = under(inventedEdition);
    expect(verdict).toBe('stop');
    // Gloves tested in September, due each month; the meter of category III.
    const stops = findings.filter(({ severity }) => severity === 'stop').map(({ code }) => code);
    expect(stops).toContain('shock.gloves-overdue');
    expect(stops).toContain('absence.meter-category');
  });

  it('has its arc flash limits from that edition', () => {
    const higher = withPath(content, '/arcFlash/availableFaultKiloamperes', 24);
    const edited = withPath(higher, '/arcFlash/equipment', 'disconnect');
    expect(under(nfpa70e2024, edited).arcFlash.method).toBe('ppe category');
    const later = under(inventedEdition, edited);
    expect(later.arcFlash.method).toBe('study needed');
    expect(later.findings).toContainEqual(
      expect.objectContaining({
        code: 'arc.study-needed',
        severity: 'stop',
        params: { limit: 'fault-current-exceeded', value: 24, allowed: 20 },
      }),
    );
  });

  it('cites that edition in every finding on NFPA 70E, at every stage', () => {
    for (const stage of ['plan', 'work'] as const) {
      const { findings, equipment, permit } = assess(content, {
        on,
        stage,
        proof: withPath(proof, '/readings', []),
        edition: inventedEdition,
      });
      const standards = [permit, ...findings, ...equipment].map(
        ({ citation }) => citation.standard,
      );
      expect(standards).not.toContain('NFPA 70E');
      expect(standards).toContain('Invented standard');
    }
  });
});
