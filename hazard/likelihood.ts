import { requireOneOf } from './arguments';
import { citation } from './citations';
import { nfpa70e2024 } from './editions';
import type { Edition } from './editions/types';
import { ARC_FLASH_TASKS, EQUIPMENT_CONDITIONS } from './enumerations';
import type { ArcFlashTask, EquipmentCondition } from './enumerations';
import type { Citation } from './types';

/** Whether an arc flash is likely for a task and the condition of the equipment. */
export function arcFlashLikelihood(
  { task, condition }: { task: ArcFlashTask; condition: EquipmentCondition },
  edition: Edition = nfpa70e2024,
): { likely: boolean; citation: Citation } {
  const row = edition.likelihood[requireOneOf('task', task, ARC_FLASH_TASKS)];
  const likely = row.likely[requireOneOf('condition', condition, EQUIPMENT_CONDITIONS)];
  return { likely, citation: citation(row.citation, edition) };
}
