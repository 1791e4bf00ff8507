import { at } from '../distance';
import type { PpeCategoryTable, PpeRowChoice } from '../types';

/**
 * Luminaires, boxes and the like are named by no row of their own: above 240 V
 * either row 2 or row 6 could apply, so both must hold.
 */
const otherEquipment: readonly PpeRowChoice[] = [
  { upToVolts: 240, rows: [1] },
  { upToVolts: 600, rows: [2, 6] },
];

/**
 * Arc flash PPE categories for alternating current (NFPA 70E-2024 Table
 * 130.7(C)(15)(a)) and their minimum arc ratings (Table 130.7(C)(15)(c)).
 * A row holds only inside all its limits. Row 5 is remembered with 18 in and
 * with 24 in of working distance: the stricter governs.
 */
export const ppeCategories: PpeCategoryTable = {
  rows: {
    1: {
      faultKiloamperes: 25,
      clearingSeconds: 0.03,
      workingDistanceInches: 18,
      category: 1,
      arcFlashBoundary: at(19, 0.485),
      citation: 'nfpa70e.ppeCategoryRow1',
    },
    2: {
      faultKiloamperes: 25,
      clearingSeconds: 0.03,
      workingDistanceInches: 18,
      category: 2,
      arcFlashBoundary: at(36, 0.9),
      citation: 'nfpa70e.ppeCategoryRow2',
    },
    3: {
      faultKiloamperes: 65,
      clearingSeconds: 0.03,
      workingDistanceInches: 18,
      category: 2,
      arcFlashBoundary: at(60, 1.5),
      citation: 'nfpa70e.ppeCategoryRow3',
    },
    4: {
      faultKiloamperes: 42,
      clearingSeconds: 0.33,
      workingDistanceInches: 18,
      category: 4,
      arcFlashBoundary: at(168, 4.3),
      citation: 'nfpa70e.ppeCategoryRow4',
    },
    5: {
      faultKiloamperes: 35,
      clearingSeconds: 0.5,
      workingDistanceInches: 24,
      category: 4,
      arcFlashBoundary: at(240, 6),
      citation: 'nfpa70e.ppeCategoryRow5',
    },
    6: {
      faultKiloamperes: 65,
      clearingSeconds: 0.03,
      workingDistanceInches: 18,
      category: 2,
      arcFlashBoundary: at(60, 1.5),
      citation: 'nfpa70e.ppeCategoryRow6',
    },
  },
  choices: {
    panelboard: [
      { upToVolts: 240, rows: [1] },
      { upToVolts: 600, rows: [2] },
    ],
    'motor control center': [
      { upToVolts: 600, rows: [3] },
      { upToVolts: 600, rows: [4] },
    ],
    switchboard: [{ upToVolts: 600, rows: [5] }],
    luminaire: otherEquipment,
    'junction box': otherEquipment,
    disconnect: otherEquipment,
    transformer: otherEquipment,
    other: otherEquipment,
  },
  minimumArcRatingCalPerCm2: { 1: 4, 2: 8, 3: 25, 4: 40 },
  minimumArcRatingCitation: 'nfpa70e.minimumArcRating',
};
