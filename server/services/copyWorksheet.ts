import { v7 } from 'uuid';
import type { WorksheetContent } from '@/shared/worksheet';
import type { CurrentUser } from '../currentUser';
import type { Worksheet } from '../models/Worksheet';
import { applyRegister } from './applyRegister';
import { insertWorksheet, isIdTaken, ownCreation } from './createWorksheet';
import { currentRevision } from './readRecord';

type Crew = NonNullable<WorksheetContent['crew']>;
type GloveSet = NonNullable<Crew[number]['gloves']>;

/** What the object holds without some keys; an object that holds nothing more is left out. */
function without<T extends object, K extends keyof T>(object: T | undefined, keys: readonly K[]) {
  if (object === undefined) return undefined;
  const dropped: readonly PropertyKey[] = keys;
  const kept = Object.entries(object).filter(([key]) => !dropped.includes(key));
  return kept.length === 0 ? undefined : (Object.fromEntries(kept) as Omit<T, K>);
}

/** The checks of a day are made on that day. */
function uncheckedGloves(gloves: GloveSet | undefined) {
  return without(gloves, ['airTested', 'leatherProtectors']);
}

function defined<T extends object>(object: T): T {
  const entries = Object.entries(object).filter(([, value]) => value !== undefined);
  return Object.fromEntries(entries) as T;
}

/**
 * What of a content holds for another day. Dates, permit, locks, the egress
 * notice, glove and PPE checks, the briefing and photos do not.
 */
export function copiedContent(content: WorksheetContent): WorksheetContent {
  const { egress: _egress, briefing: _briefing, ...kept } = content;
  const { protectiveEquipment, crew, sources } = kept;
  return defined({
    ...kept,
    job: without(kept.job, ['startsAt', 'endsAt']),
    decision: without(kept.decision, ['permit']),
    sources: sources?.map((source) => ({
      ...without(source, ['lockNumber', 'lockedBy', 'byCrewId']),
    })),
    protectiveEquipment:
      protectiveEquipment &&
      without(
        defined({
          ...protectiveEquipment,
          gloves: uncheckedGloves(protectiveEquipment.gloves),
        }),
        ['ready'],
      ),
    crew: crew?.map((member) => defined({ ...member, gloves: uncheckedGloves(member.gloves) })),
  });
}

/** A new draft from an earlier worksheet. A repeat with the same id gives the one that was made. */
export async function copyWorksheet(
  actor: CurrentUser,
  { worksheet, id = v7() }: { worksheet: Worksheet; id?: string | undefined },
): Promise<{ worksheet: Worksheet; created: boolean }> {
  const { leadId } = worksheet;
  const copied = copiedContent((await currentRevision(worksheet)).content);
  // Gloves tested since, a name that changed: today's register, not that of the earlier day.
  const { content } = await applyRegister({ content: copied, leadId });
  try {
    const copy = await insertWorksheet({
      id,
      leadId,
      content,
      actor,
      payload: { copiedFrom: worksheet.id },
    });
    return { worksheet: copy, created: true };
  } catch (fault) {
    if (!isIdTaken(fault)) throw fault;
    return { worksheet: await ownCreation(actor, id), created: false };
  }
}
