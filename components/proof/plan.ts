import { requiredPairs, type Conductor, type ConductorPair, type RequiredSource } from '@/hazard';
import type { WorksheetContent } from '@/shared/worksheet';

/** A source that is read at a point, and with which currents. */
export interface SourceToRead {
  source: RequiredSource & { id: string };
  ac: boolean;
  dc: boolean;
}

/** What has to be read, as the content says; the points are named by the lead. */
export interface ReadingPlan {
  /** Null while it is not answered how many there are. */
  pointsOfWork: number | null;
  /** Points that a source names: they stand, whatever the lead calls the others. */
  fixedPoints: string[];
  phases: readonly Conductor[];
  /** Every conductor of the set, phases first. */
  conductors: Conductor[];
  pairs: readonly ConductorPair[];
  /** One circuit of a system: whichever phase it has, it is called Phase. */
  isOneCircuit: boolean;
  sourcesAt: (point: string) => SourceToRead[];
}

const reaches = ({ points }: RequiredSource, point: string) =>
  points === null || points.some((each) => each.trim() === point);

/** Works out the matrix of the test for absence of voltage. */
export function readingPlan(content: WorksheetContent): ReadingPlan {
  const required = requiredPairs(content);
  const set = required.sets[0] ?? { phases: [], pairs: [] };
  const { ownConductors, directCurrent } = required;
  const fixedPoints = [
    ...new Set(
      (content.sources ?? []).flatMap(({ points }) => (points ?? []).map((point) => point.trim())),
    ),
  ].filter((point) => point !== '');
  return {
    pointsOfWork: required.pointsOfWork,
    fixedPoints,
    phases: set.phases,
    conductors: [...new Set(set.pairs.flat())],
    pairs: set.pairs,
    isOneCircuit: required.sets.length > 1,
    sourcesAt: (point) => {
      const all = [
        ...ownConductors,
        ...directCurrent.filter(({ index }) => !ownConductors.some((own) => own.index === index)),
      ];
      return all
        .sort((one, other) => one.index - other.index)
        .flatMap((source) =>
          source.id === null || !reaches(source, point)
            ? []
            : [
                {
                  source: { ...source, id: source.id },
                  ac: ownConductors.some(({ index }) => index === source.index),
                  dc: directCurrent.some(({ index }) => index === source.index),
                },
              ],
        );
    },
  };
}

/** How many points have to be named: those that sources name, and the rest of the count. */
export function pointCount({ pointsOfWork, fixedPoints }: ReadingPlan): number {
  return Math.max(pointsOfWork ?? 1, fixedPoints.length);
}
