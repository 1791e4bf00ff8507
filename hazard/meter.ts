import { requireNumber, requireOneOf } from './arguments';
import { nfpa70e2024 } from './editions';
import type { Edition } from './editions/types';
import { METER_CATEGORIES, METER_LOCATIONS } from './enumerations';
import type { MeterCategory, MeterLocation } from './enumerations';

interface MeterQuestion {
  category: MeterCategory;
  ratedVolts: number;
  /** Phase-to-phase. */
  systemVolts: number;
  location: MeterLocation;
}

/** Whether a meter may be used at a place. Its leads answer to the same marking. */
export function meterIsAdequate(
  { category, ratedVolts, systemVolts, location }: MeterQuestion,
  edition: Edition = nfpa70e2024,
): boolean {
  requireOneOf('category', category, METER_CATEGORIES);
  requireNumber('ratedVolts', ratedVolts);
  requireNumber('systemVolts', systemVolts);
  requireOneOf('location', location, METER_LOCATIONS);
  return edition.meters.admitted[location].includes(category) && ratedVolts >= systemVolts;
}
