import { TZDate } from '@date-fns/tz';
import { assess } from '@/hazard';
import type { Assessment, Stage } from '@/hazard/types';
import type { CloseOut, Proof, WorksheetContent } from '@/shared/worksheet';

interface Question {
  content: WorksheetContent;
  at: Date;
  timeZone: string;
  stage?: Stage | undefined;
  proof?: Proof | undefined;
  closeOut?: CloseOut | undefined;
}

/** `assess` on the calendar of the site: days of gloves and training are days there. */
export function assessAt({ content, at, timeZone, stage, proof, closeOut }: Question): Assessment {
  const on = new TZDate(at, timeZone).toISOString();
  return assess(content, {
    on,
    ...(stage === undefined ? {} : { stage }),
    ...(proof === undefined ? {} : { proof }),
    ...(closeOut === undefined ? {} : { closeOut }),
  });
}
