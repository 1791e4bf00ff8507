import type { Finding } from '../types';
import type { GloveAnswers } from './answers';
import type { Facts } from './facts';
import { personParams } from './people';

export interface EntrantGloves {
  /** Undefined: there is no set for this person. */
  readonly gloves: GloveAnswers | undefined;
  readonly path: string;
  readonly params: Finding['params'];
}

const WORKSHEET_GLOVES = '/protectiveEquipment/gloves';

const isAnswered = (gloves: GloveAnswers) =>
  Object.values(gloves).some((answer) => answer !== undefined);

/** Something was said about some rubber gloves. */
export function isAnyGloveAnswered({ answers, people }: Facts): boolean {
  return (
    isAnswered(answers.protectiveEquipment.gloves) ||
    people.crew.some(({ gloves }) => isAnswered(gloves))
  );
}

/**
 * The gloves of each person who enters the restricted boundary: their own, or
 * those of the worksheet, which are one set for one person.
 */
export function glovesOfEntrants({ answers, people }: Facts): readonly EntrantGloves[] {
  const shared = answers.protectiveEquipment.gloves;
  let isSharedFree = isAnswered(shared);
  const takeShared = () => {
    const gloves = isSharedFree ? shared : undefined;
    isSharedFree = false;
    return gloves;
  };
  // It is not known yet who enters; someone does.
  if (people.entrants.length === 0) {
    return people.someoneEnters
      ? [{ gloves: takeShared(), path: WORKSHEET_GLOVES, params: {} }]
      : [];
  }
  return people.entrants.map((person) => {
    const params = personParams(person);
    const own = { gloves: person.gloves, path: `/crew/${person.index}/gloves`, params };
    if (isAnswered(person.gloves)) return own;
    const gloves = takeShared();
    const isWorksheets = gloves !== undefined || people.entrants.length === 1;
    return { gloves, params, path: isWorksheets ? WORKSHEET_GLOVES : own.path };
  });
}

/** The sets that there are. */
export function glovesInUse(facts: Facts) {
  return glovesOfEntrants(facts).flatMap(({ gloves, ...rest }) =>
    gloves === undefined ? [] : [{ ...rest, gloves }],
  );
}
