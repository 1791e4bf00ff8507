import { nfpa70e2024 } from '@/hazard/editions';
import { at } from '@/hazard/editions/distance';
import type { Edition, EditionCitationId } from '@/hazard/editions/types';
import type { Citation } from '@/hazard';

const invented: Citation = {
  standard: 'Invented standard',
  edition: '2099',
  table: 'Table 9.9',
  confidence: 'memory',
};
const ids = Object.keys(nfpa70e2024.citations) as EditionCitationId[];

/**
 * A later edition that no one has written, stricter in every table, to show
 * that an edition is nothing but data.
 */
export const inventedEdition: Edition = {
  ...nfpa70e2024,
  id: 'Invented-2099',
  citations: Object.fromEntries(ids.map((id) => [id, invented])) as Edition['citations'],
  shockAc: {
    citation: 'nfpa70e.shockAc',
    notSpecifiedBelow: { volts: 60, row: 'below 60 V' },
    rows: [
      {
        row: '60 V to 1 kV',
        upToVolts: 1000,
        limitedMovable: at(144, 3.7),
        limitedFixed: at(48, 1.2),
        restricted: at(24, 0.6),
        citation: 'nfpa70e.shockAc',
      },
    ],
  },
  likelihood: {
    ...nfpa70e2024.likelihood,
    'read panel meter': {
      likely: { normal: false, abnormal: true },
      citation: 'nfpa70e.likelihood',
    },
  },
  ppeCategories: {
    ...nfpa70e2024.ppeCategories,
    rows: {
      ...nfpa70e2024.ppeCategories.rows,
      1: { ...nfpa70e2024.ppeCategories.rows[1], faultKiloamperes: 20 },
      2: { ...nfpa70e2024.ppeCategories.rows[2], faultKiloamperes: 20 },
      // Stricter in its distance and category than row 2, which it is joined with.
      6: {
        ...nfpa70e2024.ppeCategories.rows[6],
        faultKiloamperes: 15,
        clearingSeconds: 0.02,
        workingDistanceInches: 24,
        category: 4,
      },
    },
    choices: {
      ...nfpa70e2024.ppeCategories.choices,
      luminaire: [{ upToVolts: 600, rows: [2, 6] }],
      'junction box': [{ upToVolts: 600, rows: [6, 2] }],
    },
  },
  labelReviewMonths: 12,
  gloves: {
    ...nfpa70e2024.gloves,
    maxUseVolts: { ...nfpa70e2024.gloves.maxUseVolts, '00': 400 },
    testEveryMonths: 1,
  },
  meters: {
    ...nfpa70e2024.meters,
    admitted: { ...nfpa70e2024.meters.admitted, 'fixed wiring': ['IV'] },
  },
  bodyImpedance: {
    citation: 'iec60479',
    rows: [
      { volts: 50, p5: 1000, p50: 2000, p95: 3000 },
      { volts: 1000, p5: 1000, p50: 2000, p95: 3000 },
    ],
  },
  stepladders: { ...nfpa70e2024.stepladders, sizesFeet: [8, 12] },
};
