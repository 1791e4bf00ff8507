import { describe, expect, it } from 'vitest';
import { assess } from '@/hazard';
import { ORDER } from '../../../support/ruleOrder';
import type { Base, Edits } from '../../../support/ruleTable';
import { assessBase, edited, expectFound, found, gone } from '../../../support/ruleTable';
import { soundWorksheet } from '../../../support/soundWorksheet';

describe('the proof rows come only at work on the off path (the three stages)', () => {
  const PROOF_CODES = ORDER.filter((code) => code.startsWith('absence.')).filter(
    (code) =>
      ![
        'absence.proximity-tester',
        'absence.meter-category',
        'absence.leads-not-inspected',
      ].includes(code),
  );
  const spoilt: Edits = {
    proof: {
      openedSources: [],
      controlsOperated: false,
      otherLiveParts: 'not guarded',
      neutralAmperes: 9,
      storedEnergy: 'not discharged',
      readings: [{ volts: 277 }],
    },
  };
  it.each<[Base, boolean]>([
    ['O work', true],
    ['T work', false],
    ['W work', false],
    ['O close', false],
  ])('%s: %s', (base, isAsked) => {
    const codes = assessBase(base, spoilt).findings.map(({ code }) => code);
    const proof = codes.filter(
      (code) =>
        PROOF_CODES.includes(code) ||
        ['sources.live-neighbor', 'sources.neutral-not-checked', 'sources.stored-energy'].includes(
          code,
        ),
    );
    expect(proof.length > 0).toBe(isAsked);
  });

  it('at the plan a proof is not read', () => {
    const { on, content } = soundWorksheet();
    expect(assess(content, { on, proof: spoilt.proof }).verdict).toBe('ready');
  });

  it('mode not answered: the rows of the off path, at work too', () => {
    const { content, ...options } = edited('O work', {
      'decision/mode': gone,
      'proof/readings': [],
    });
    expectFound(found(assess(content, options), 'absence.pairs-missing'), ['open', '?open']);
  });
});
