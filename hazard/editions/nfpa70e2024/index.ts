import type { Edition } from '../types';
import { bodyImpedance } from './bodyImpedance';
import { citations } from './citations';
import { gloves } from './gloves';
import { identification } from './identification';
import { incidentEnergyBands } from './incidentEnergyBands';
import { likelihood } from './likelihood';
import { meters } from './meters';
import { ppeCategories } from './ppeCategories';
import { shockBoundariesAc } from './shockBoundariesAc';
import { shockBoundariesDc } from './shockBoundariesDc';
import { stepladders } from './stepladders';
import { systems } from './systems';

/** NFPA 70E-2024, with the regulation and the standards that it is read beside. */
export const nfpa70e2024: Edition = {
  id: 'NFPA 70E-2024',
  citations,
  shockAc: shockBoundariesAc,
  shockDc: shockBoundariesDc,
  systems,
  identification,
  likelihood,
  ppeCategories,
  incidentEnergyBands,
  labelReviewMonths: 60,
  gloves,
  meters,
  bodyImpedance,
  stepladders,
};
