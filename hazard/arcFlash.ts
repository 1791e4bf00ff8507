import { requireBoolean, requireNumber, requireOneOf } from './arguments';
import { evaluateArcFlash } from './arcFlashEvaluation';
import type { EquipmentLabel } from './content';
import { requireCalendarDate } from './dates';
import { nfpa70e2024 } from './editions';
import type { Edition } from './editions/types';
import { ARC_FLASH_EQUIPMENT } from './enumerations';
import type { ArcFlashEquipment, ArcFlashTask, EquipmentCondition } from './enumerations';
import { arcFlashLikelihood } from './likelihood';
import type { ArcFlashAssessment } from './types';

const LABEL_FIGURES = [
  'systemVolts',
  'incidentEnergyCalPerCm2',
  'workingDistanceInches',
  'minimumArcRatingCalPerCm2',
  'arcFlashBoundaryInches',
] as const;

function requireLabel(label: unknown): EquipmentLabel | undefined {
  if (label === undefined || label === null) return undefined;
  if (typeof label !== 'object') throw new RangeError('label must be what a label says');
  const printed: EquipmentLabel = label;
  for (const figure of LABEL_FIGURES) {
    if (printed[figure] !== undefined) requireNumber(`label.${figure}`, printed[figure]);
  }
  const { ofThisEquipment, ppeCategory, reviewedOn } = printed;
  if (ppeCategory !== undefined) requireOneOf('label.ppeCategory', ppeCategory, [1, 2, 3, 4]);
  if (reviewedOn !== undefined) requireCalendarDate('label.reviewedOn', reviewedOn);
  if (ofThisEquipment !== undefined) requireBoolean('label.ofThisEquipment', ofThisEquipment);
  return printed;
}

const optionalNumber = (name: string, value: number | undefined): number | undefined =>
  value === undefined ? undefined : requireNumber(name, value);

interface ArcFlashArguments {
  task: ArcFlashTask;
  condition: EquipmentCondition;
  equipment: ArcFlashEquipment;
  /** Phase-to-phase. */
  volts: number;
  workingDistanceInches: number;
  label?: EquipmentLabel | null | undefined;
  availableFaultKiloamperes?: number | undefined;
  clearingSeconds?: number | undefined;
}

/**
 * Whether an arc flash is likely, and what protects against it: by the label of
 * the equipment, else by the category table. Without a label the caller says
 * that there is none. A limit that is not given counts as outside the table.
 */
export function assessArcFlash(
  given: ArcFlashArguments,
  edition: Edition = nfpa70e2024,
): ArcFlashAssessment {
  const { task, condition } = given;
  return evaluateArcFlash(
    {
      likelihood: arcFlashLikelihood({ task, condition }, edition),
      equipment: requireOneOf('equipment', given.equipment, ARC_FLASH_EQUIPMENT),
      volts: requireNumber('volts', given.volts),
      workingDistanceInches: requireNumber('workingDistanceInches', given.workingDistanceInches),
      label: requireLabel(given.label),
      noLabel: true,
      availableFaultKiloamperes: optionalNumber(
        'availableFaultKiloamperes',
        given.availableFaultKiloamperes,
      ),
      clearingSeconds: optionalNumber('clearingSeconds', given.clearingSeconds),
    },
    edition,
  );
}
