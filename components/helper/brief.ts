import { pathOf } from '@/hazard';
import type { Assessment, CrewMember, Distance, WorksheetContent } from '@/hazard';

/** How close one person may come, and in which way it is said. */
export type Closeness =
  | {
      kind: 'barricade' | 'limited' | 'escorted' | 'restricted' | 'inside';
      figure: Distance | null;
    }
  | { kind: 'noTouch'; figure: null }
  | { kind: 'unknown'; figure: null };

/** Whoever tests comes inside the restricted boundary, whatever was answered. */
function nearestOf(member: CrewMember, content: WorksheetContent) {
  const tests = member.id !== undefined && member.id === content.absenceTest?.byCrewId;
  const isTester =
    tests && (pathOf(content) === 'off' || content.job?.task === 'test or troubleshoot');
  // Not answered: the farthest off that anyone is kept.
  return isTester ? 'restricted' : (member.closest ?? 'outside all boundaries');
}

/** How close this person may come while it is not proved dead. */
export function closenessOf(
  member: CrewMember,
  content: WorksheetContent,
  { boundaries, barricade }: Assessment,
): Closeness {
  const nearest = nearestOf(member, content);
  if (boundaries === null || !boundaries.inTable) return { kind: 'unknown', figure: null };
  const limited = boundaries.movable ? boundaries.limitedMovable : boundaries.limitedFixed;
  const { restricted } = boundaries;
  switch (nearest) {
    case 'restricted':
      return { kind: 'inside', figure: restricted === 'avoid contact' ? null : restricted };
    case 'limited':
    case 'limited with escort':
      if (restricted === 'avoid contact' || restricted === null)
        return { kind: 'noTouch', figure: null };
      return { kind: nearest === 'limited' ? 'restricted' : 'escorted', figure: restricted };
    case 'outside limited':
      return limited === null
        ? { kind: 'unknown', figure: null }
        : { kind: 'limited', figure: limited };
    case 'outside all boundaries': {
      const farthest = barricade ?? limited;
      return farthest === null
        ? { kind: 'unknown', figure: null }
        : { kind: 'barricade', figure: farthest };
    }
  }
}

/** The arc flash boundary where it reaches beyond how close this person may come. */
export function arcFlashBeyond(closeness: Closeness, { arcFlash }: Assessment): Distance | null {
  const boundary = arcFlash.arcFlashBoundary;
  if (boundary === null || closeness.kind === 'barricade' || closeness.kind === 'unknown')
    return null;
  return boundary.inches > (closeness.figure?.inches ?? 0) ? boundary : null;
}

/** The voltage that a person can touch here, and between what. */
export function touchOf(
  { supply }: WorksheetContent,
  { touch, boundaries }: Assessment,
): { volts: number; between: 'ground' | 'wires' } | null {
  const circuit = supply?.circuitVolts;
  const volts = touch?.volts ?? circuit ?? boundaries?.volts;
  if (volts === undefined) return null;
  // 120 and 277 V stand between a phase and ground; everything higher or in between, between two phases.
  const toGround = volts === 277 || volts <= 120;
  return { volts, between: toGround ? 'ground' : 'wires' };
}

/** The kinds of grounded metal in reach; not answered counts as in reach. */
export function groundedInReach({ surroundings }: WorksheetContent) {
  const kinds = (surroundings?.groundedSurfaces ?? []).flatMap(({ kind, inReach }) =>
    kind === undefined || inReach === false ? [] : [kind],
  );
  return [...new Set(kinds)];
}

/** The other ways in which it can be live, each kind once. */
export function otherWays({ sources }: WorksheetContent) {
  const kinds = (sources ?? []).flatMap(({ kind }) => (kind === undefined ? [] : [kind]));
  return [...new Set(kinds)].filter((kind) => kind !== 'normal');
}

export const firstName = (name: string) => name.split(' ')[0] ?? name;
