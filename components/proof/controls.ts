import type { WorksheetContent } from '@/shared/worksheet';

export type Position = 'up' | 'down' | 'on' | 'looked';

/** One control that feeds the point: each of its positions is tried. */
export interface Control {
  key: string;
  kind: 'switch' | 'automatic' | 'none';
  /** Its place among the switches, where there is more than one. */
  number?: number;
  /** Where it is, as a traveler or a switch leg of section 3 names it. */
  name?: string;
  positions: readonly Position[];
}

const BOTH: readonly Position[] = ['up', 'down'];
/** A circuit with switches in several places has at least two. */
const LEAST_SWITCHES = 2;

/** The controls of the circuit, as section 2 and 3 describe them; what is not known counts as all of them. */
export function controlsOf({ supply, sources }: WorksheetContent, more: number): Control[] {
  const switching = supply?.switching ?? ['not known'];
  const unknown = switching.includes('not known');
  const several = unknown || switching.includes('two or more places');
  const names = (sources ?? []).flatMap(({ kind, from }) =>
    kind === 'traveler' && from !== undefined && from.trim() !== '' ? [from] : [],
  );
  const one = switching.includes('one place') ? 1 : 0;
  const base = several ? Math.max(LEAST_SWITCHES, names.length) : one;
  const count = base + more;
  const switches = Array.from({ length: count }, (_, place): Control => ({
    key: `switch-${place}`,
    kind: 'switch',
    ...(count > 1 && { number: place + 1 }),
    ...(several && names[place] !== undefined && { name: names[place] }),
    positions: BOTH,
  }));
  const automatic: Control[] =
    unknown || switching.includes('automatic')
      ? [{ key: 'automatic', kind: 'automatic', positions: ['on'] }]
      : [];
  const all = [...switches, ...automatic];
  return all.length > 0 ? all : [{ key: 'none', kind: 'none', positions: ['looked'] }];
}

export const controlPosition = (control: Control, position: Position) =>
  `${control.key}/${position}`;

/** Whether each one was put on in each of its positions. */
export function controlsDone(
  controls: readonly Control[],
  tried: Readonly<Record<string, string>>,
): boolean {
  return controls.every((control) =>
    control.positions.every((position) => controlPosition(control, position) in tried),
  );
}
