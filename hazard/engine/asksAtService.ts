import type { ArcFlashEquipment } from '../enumerations';
import type { Answers } from './answers';

const MAY_BE_SERVICE: readonly ArcFlashEquipment[] = [
  'panelboard',
  'switchboard',
  'disconnect',
  'transformer',
];

/** Equipment that may stand at the service, where more energy is available. */
export function asksAtService({ arcFlash }: Answers): boolean {
  return arcFlash.equipment !== undefined && MAY_BE_SERVICE.includes(arcFlash.equipment);
}
