import type { ArcFlashEquipment } from '../enumerations';
import type { Answers } from './answers';
import { isAmong } from './isAmong';

const MAY_BE_SERVICE: readonly ArcFlashEquipment[] = [
  'panelboard',
  'switchboard',
  'disconnect',
  'transformer',
];

/** Equipment that may stand at the service, where more energy is available. */
export function asksAtService({ arcFlash }: Answers): boolean {
  return isAmong(arcFlash.equipment, MAY_BE_SERVICE);
}
