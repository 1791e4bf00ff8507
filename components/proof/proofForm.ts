import { v7 as newId } from 'uuid';
import { z } from 'zod';
import { OTHER_LIVE_PARTS, STORED_ENERGY, type Conductor, type Current } from '@/hazard';
import type { Proof, WorksheetContent } from '@/shared/worksheet';
import { parseNumber } from '../ui';
import { controlsDone, controlsOf } from './controls';
import { pointCount, readingPlan, type ReadingPlan } from './plan';

/** Above this a reading is kept and never overwritten: it is found, or read again at low impedance. */
export const STRAY_ABOVE_VOLTS = 3;
/** The most readings that one proof holds. */
export const MOST_READINGS = 120;

const entrySchema = z.object({
  text: z.string(),
  lowImpedance: z.boolean(),
  at: z.string(),
  /** Stands as it is; the next figure typed in its cell is a reading of its own. */
  kept: z.boolean(),
});
export type Entry = z.infer<typeof entrySchema>;

/** What the lead has entered so far, kept on the device until it is recorded. */
export const proofFormSchema = z.object({
  /** The id of the proof to be: the same post again is the same proof. */
  id: z.string(),
  tried: z.record(z.string(), z.string()),
  controls: z.record(z.string(), z.string()),
  moreSwitches: z.number(),
  provedBeforeAt: z.string().optional(),
  provedAfterAt: z.string().optional(),
  /** Names of the points as typed, by their place; without one a point is called by its number. */
  points: z.record(z.string(), z.string()),
  readings: z.record(z.string(), z.array(entrySchema)),
  neutral: z.string(),
  otherLiveParts: z.enum(OTHER_LIVE_PARTS).optional(),
  storedEnergy: z.enum(STORED_ENERGY).optional(),
});
export type ProofForm = z.infer<typeof proofFormSchema>;

export const emptyProofForm = (): ProofForm => ({
  id: newId(),
  tried: {},
  controls: {},
  moreSwitches: 0,
  points: {},
  readings: {},
  neutral: '',
});

/** One cell of the matrix. */
export interface Cell {
  /** Place of the point in the list: the lead may rename it meanwhile. */
  point: number;
  sourceId?: string;
  from?: Conductor;
  to?: Conductor;
  current: Current;
}

export function cellKey({ point, sourceId, from, to, current }: Cell): string {
  return JSON.stringify([point, sourceId ?? '', from ?? '', to ?? '', current]);
}

/** The names of the points, by their place. */
export function pointNames(form: ProofForm, plan: ReadingPlan): string[] {
  return Array.from({ length: pointCount(plan) }, (_, place) => {
    const fixed = plan.fixedPoints[place];
    if (fixed !== undefined) return fixed;
    const typed = form.points[String(place)]?.trim();
    return typed === undefined || typed === '' ? String(place + 1) : typed;
  });
}

/** Every cell that has to be filled at one point. */
export function cellsAt(place: number, name: string, plan: ReadingPlan): Cell[] {
  const circuit = plan.pairs.map(([from, to]): Cell => ({ point: place, from, to, current: 'ac' }));
  const sources = plan.sourcesAt(name).flatMap(({ source, ac, dc }): Cell[] => [
    ...(ac
      ? [...plan.phases, 'G' as const].map((to): Cell => ({
          point: place,
          sourceId: source.id,
          to,
          current: 'ac',
        }))
      : []),
    // Plus to minus: the conductors of a battery have no letter.
    ...(dc ? [{ point: place, sourceId: source.id, current: 'dc' } as const] : []),
  ]);
  return [...circuit, ...sources];
}

export function voltsOf({ text }: Pick<Entry, 'text'>): number | undefined {
  const parsed = parseNumber(text);
  return parsed.kind === 'number' ? parsed.value : undefined;
}

/** The entry that counts: the highest by magnitude, but a last one at low impedance settles it. */
export function governingEntry(entries: readonly Entry[]): Entry | undefined {
  const read = entries.filter((entry) => voltsOf(entry) !== undefined);
  const last = read.at(-1);
  if (last?.lowImpedance === true) return last;
  return read.reduce<Entry | undefined>((one, other) => {
    if (one === undefined) return other;
    return Math.abs(voltsOf(other) ?? 0) > Math.abs(voltsOf(one) ?? 0) ? other : one;
  }, undefined);
}

/** How many cells of a point hold a figure. */
export function takenAt(cells: readonly Cell[], form: ProofForm): number {
  return cells.filter((cell) =>
    (form.readings[cellKey(cell)] ?? []).some((entry) => voltsOf(entry) !== undefined),
  ).length;
}

/** Whether a cell holds text that is no number: it is neither recorded nor passed over. */
export function hasUnreadable(form: ProofForm): boolean {
  return Object.values(form.readings).some((entries) =>
    entries.some(({ text }) => parseNumber(text).kind === 'text'),
  );
}

function readingsOf(form: ProofForm, plan: ReadingPlan): NonNullable<Proof['readings']> {
  return pointNames(form, plan).flatMap((point, place) =>
    cellsAt(place, point, plan).flatMap((cell) =>
      (form.readings[cellKey(cell)] ?? []).flatMap((entry) => {
        const volts = voltsOf(entry);
        if (volts === undefined) return [];
        const { from, to, sourceId, current } = cell;
        return [
          {
            point,
            ...(from !== undefined && { from }),
            ...(to !== undefined && { to }),
            volts,
            current,
            ...(entry.lowImpedance && { lowImpedance: true }),
            ...(sourceId !== undefined && { sourceId }),
            at: entry.at,
          },
        ];
      }),
    ),
  );
}

/**
 * The proof as it stands. What is not finished is left out, so that it counts
 * as not answered: every way has to be marked, every control put on.
 */
export function proofOf(form: ProofForm, content: WorksheetContent): Proof {
  const plan = readingPlan(content);
  const sources = content.sources ?? [];
  const ids = sources.flatMap(({ id }) => (id === undefined ? [] : [id]));
  const allTried = ids.length === sources.length && ids.every((id) => id in form.tried);
  const neutral = parseNumber(form.neutral);
  const readings = readingsOf(form, plan);
  return {
    ...(allTried && { openedSources: ids }),
    ...(controlsDone(controlsOf(content, form.moreSwitches), form.controls) && {
      controlsOperated: true,
    }),
    ...(form.provedBeforeAt !== undefined && { provedBefore: true }),
    ...(form.provedAfterAt !== undefined && { provedAfter: true }),
    ...(form.otherLiveParts !== undefined && { otherLiveParts: form.otherLiveParts }),
    ...(neutral.kind === 'number' && neutral.value >= 0 && { neutralAmperes: neutral.value }),
    ...(form.storedEnergy !== undefined && { storedEnergy: form.storedEnergy }),
    ...(readings.length > 0 && { readings }),
  };
}

/** The latest moment at which something was read: `assess` may not stand before it. */
export function latestReading(proof: Proof): string | undefined {
  return (proof.readings ?? []).reduce<string | undefined>(
    (latest, { at }) =>
      at !== undefined && (latest === undefined || Date.parse(at) > Date.parse(latest))
        ? at
        : latest,
    undefined,
  );
}
